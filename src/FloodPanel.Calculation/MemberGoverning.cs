namespace FloodPanel.Calculation;

/// <summary>What governs one member over all cases.</summary>
/// <param name="Member">"log", "post" or "guide"; for another part its name, "footing".</param>
/// <param name="Number">Log from the bottom or post from the left, from 1; 0 for others.</param>
/// <param name="Bay">Bay from the left, from 1; 0 but for logs.</param>
/// <param name="Side">"left" or "right" for a guide, else empty.</param>
/// <param name="Case">The load case.</param>
/// <param name="Check">The check that is used most; null for a guide without inputs.</param>
/// <param name="Reaction">Greatest design reaction of a guide [N]; 0 for others.</param>
/// <param name="Part">Needed check that a part belongs to, "anchors"; empty for logs, posts and guide reactions.</param>
public sealed record MemberGoverning(
    string Member, int Number, int Bay, string Side, CaseResult Case, Check? Check, double Reaction, string Part = "")
{
    /// <summary>The governing case and check of every member: logs bay by bay from the lowest, posts, parts, guides without checks.</summary>
    /// <param name="result">The result of an opening.</param>
    /// <remarks>A member without any check, for want of a stress and of a judged deflection, has no row.</remarks>
    public static IReadOnlyList<MemberGoverning> Of(OpeningResult result)
    {
        var rows = new List<MemberGoverning>();
        for (var i = 0; i < result.Cases[0].Logs.Count; i++)
        {
            Add(rows, result.Cases, c => c.Logs[i].Checks, (c, check) => new("log", c.Logs[i].Index, c.Logs[i].Bay, "", c, check, 0));
        }

        for (var i = 0; i < result.Cases[0].Posts.Count; i++)
        {
            Add(rows, result.Cases, c => c.Posts[i].Checks, (c, check) => new("post", c.Posts[i].Index, 0, "", c, check, 0));
        }

        foreach (var (part, member) in result.Cases.SelectMany(c => c.Parts).Select(p => (p.Check, p.Member)).Distinct())
        {
            Add(
                rows, result.Cases,
                c => c.Parts.Where(p => p.Check == part && p.Member == member).SelectMany(p => p.Checks),
                (c, check) => new(member, 0, 0, "", c, check, 0, part));
        }

        for (var i = 0; i < result.Cases[0].Guides.Count; i++)
        {
            if (result.Cases.Any(c => c.Parts.Any(p => p.Check == NeededChecks.Guides && p.Checks.Count > 0)))
            {
                continue;
            }

            var worst = result.Cases.MaxBy(c => c.Guides[i].Reaction)!;
            rows.Add(new("guide", 0, 0, worst.Guides[i].Side, worst, null, worst.Guides[i].Reaction));
        }

        return rows;
    }

    private static void Add(
        List<MemberGoverning> rows,
        IReadOnlyList<CaseResult> cases,
        Func<CaseResult, IEnumerable<Check>> checks,
        Func<CaseResult, Check, MemberGoverning> row)
    {
        var all = cases.SelectMany(c => checks(c).Select(check => (Case: c, Check: check))).ToArray();
        if (all.Length > 0)
        {
            var (@case, check) = all.MaxBy(pair => (pair.Check.MayGovern, pair.Check.Utilisation));
            rows.Add(row(@case, check));
        }
    }
}
