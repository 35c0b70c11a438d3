namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Finds problems in a barrier and in how it fits its opening.</summary>
internal static class BarrierValidation
{
    /// <summary>Bays and posts may miss the clear width by this much [m].</summary>
    private const double FitTolerance = 0.001;

    private const int MostBays = 50;

    public static void Validate(Opening opening, string openingPath, ProblemList problems, Library library)
    {
        var (barrier, path) = (opening.Barrier, $"{openingPath}.barrier");
        var logs = barrier.Logs;
        ChoiceValidation.Material(logs.Material, $"{path}.logs.material", problems, library);
        ChoiceValidation.Profile(logs.Profile, $"{path}.logs.profile", problems, library);
        problems.Check(Fields.LogCount, logs.Count, $"{path}.logs");
        Below(logs, $"{path}.logs", problems, library);
        problems.Check(Fields.EndBearing, logs.EndBearing, $"{path}.logs");
        problems.Check(Fields.LogDeflectionLimit, logs.DeflectionLimit, $"{path}.logs");
        problems.Check(Fields.FittingClearance, logs.FittingClearance, $"{path}.logs");
        problems.Check(Fields.SealPreload, logs.SealPreload, $"{path}.logs");
        LogServiceValidation.Validate(logs, $"{path}.logs", problems);
        if (logs.FittingClearance >= logs.EndBearing && logs.EndBearing > 0)
        {
            problems.Add($"{path}.logs.fittingClearance", $"Fitting clearance is {Section(logs.FittingClearance)}; allowed is less than the end bearing, {Section(logs.EndBearing)}, or a log can slip out of its guide.");
        }

        Bays(opening, path, problems);
        if (barrier.Posts is { } posts)
        {
            Posts(barrier, posts, $"{path}.posts", problems, library);
        }

        PostBaseValidation.Validate(opening, path, problems, library);
        AnchorValidation.Validate(barrier.Anchors, $"{path}.anchors", problems);
        GuideValidation.Validate(barrier, path, problems, library);
        if (barrier.Footing is { } footing)
        {
            FootingValidation.Validate(footing, $"{path}.footing", problems);
        }

        ByOthers(barrier, path, problems);
    }

    private static void Below(LogStack logs, string path, ProblemList problems, Library library)
    {
        var allowed = Fields.LogCount.Allows(logs.Count);
        for (var i = 0; i < logs.Below.Count; i++)
        {
            var (group, at) = (logs.Below[i], $"{path}.below[{i}]");
            ChoiceValidation.Material(group.Material, $"{at}.material", problems, library);
            ChoiceValidation.Profile(group.Profile, $"{at}.profile", problems, library);
            problems.Check(Fields.LogCount, group.Count, at);
            allowed &= Fields.LogCount.Allows(group.Count);
        }

        if (allowed && !Fields.LogCount.Allows(logs.TotalCount))
        {
            problems.Add($"{path}.below", $"The stack has {logs.TotalCount} logs; allowed is {Fields.LogCount.Maximum} in all.");
        }
    }

    private static void Bays(Opening opening, string path, ProblemList problems)
    {
        var (bays, posts) = (opening.Barrier.Bays, opening.Barrier.Posts);
        if (bays.Count is < 1 or > MostBays)
        {
            problems.Add($"{path}.bays", $"There are {bays.Count} bays; allowed is 1 to {MostBays}.");
            return;
        }

        var allowed = posts is null || Fields.PostWidth.Allows(posts.Width);
        for (var i = 0; i < bays.Count; i++)
        {
            allowed &= problems.CheckAt(Fields.BayWidth, bays[i], $"{path}.bays[{i}]");
        }

        if (bays.Count > 1 && posts is null)
        {
            problems.Add($"{path}.posts", $"There are {bays.Count} bays and no posts; posts stand between bays, so describe them or leave one bay.");
            return;
        }

        // A width that is refused itself says nothing about the sum.
        if (!allowed || !Fields.ClearWidth.Allows(opening.ClearWidth))
        {
            return;
        }

        var filled = bays.Sum() + (bays.Count - 1) * (posts?.Width ?? 0);
        var gap = Math.Abs(filled - opening.ClearWidth);
        if (gap > FitTolerance + 1e-9)
        {
            var differs = filled > opening.ClearWidth ? "more" : "less";
            problems.Add($"{path}.bays", $"Clear bays and posts add up to {Length(filled)}, {Section(gap)} {differs} than the clear width, {Length(opening.ClearWidth)}; allowed is a difference of {Section(FitTolerance)}.");
        }
    }

    private static void Posts(Barrier barrier, PostSet posts, string path, ProblemList problems, Library library)
    {
        ChoiceValidation.Material(posts.Material, $"{path}.material", problems, library);
        ChoiceValidation.Profile(posts.Profile, $"{path}.profile", problems, library);
        problems.Check(Fields.PostWidth, posts.Width, path);
        problems.Check(Fields.PostDeflectionLimit, posts.DeflectionLimit, path);
        var bearings = 2 * barrier.Logs.EndBearing;
        if (barrier.Bays.Count > 1 && bearings > posts.Width + 1e-9)
        {
            problems.Add($"{path}.width", $"Post width is {Section(posts.Width):typed}; allowed is at least two end bearings, {Section(bearings):typed} together.");
        }
    }

    private static void ByOthers(Barrier barrier, string path, ProblemList problems)
    {
        for (var i = 0; i < barrier.ByOthers.Count; i++)
        {
            var check = barrier.ByOthers[i].Check;
            if (!NeededChecks.MayBeByOthers.Contains(check))
            {
                problems.Add($"{path}.byOthers[{i}].check", $"Check is \"{check}\"; allowed is one of {string.Join(", ", NeededChecks.MayBeByOthers)}.");
            }
        }
    }

    private static Quantity Length(double value) => new(value, Dimension.Length);

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}
