using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Leakage;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Reports;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.OwnerSummaries;

/// <summary>The sentences of the owner's summary.</summary>
internal static class OwnerAdvice
{
    private const double ShortNameWidth = 60;

    /// <summary>The level of protection and how it came about.</summary>
    public static string Level(Site site, int openings, UnitSystem units)
    {
        string Length(double value) => Units.Format(value, Dimension.Length, units);
        var chance = (100 * site.AnnualProbability).ToString("0.####", CultureInfo.InvariantCulture);
        List<string> added = [];
        if (site.Surge > 0)
        {
            added.Add($"{Length(site.Surge)} for surge");
        }

        if (site.TotalClimateAllowance > 0)
        {
            added.Add($"{Length(site.TotalClimateAllowance)} for the climate to come");
        }

        var allowances = added.Count == 0 ? "" : $", with {string.Join(" and ", added)} added";
        var (subject, stands) = openings == 1 ? ("The barrier is", "It should stand") : ("The barriers are", "They should stand");
        var freeboard = site.Freeboard > 0 ? $" {stands} {Length(site.Freeboard)} higher than that." : "";
        return $"{subject} meant for water up to {Length(site.DesignFloodLevel)}, the design flood level. That is still water at "
            + $"{Length(site.DesignStillWaterLevel)}, which has a chance of {chance} % of being exceeded in any one year{allowances}."
            + $"{freeboard} Levels are in {Wording.OneLine(site.Datum)}.";
    }

    /// <summary>The verdict on one opening, with what is missing and what others design.</summary>
    public static VerdictLine Verdict(OpeningResult result, UnitSystem units)
    {
        var verdict = result.Verdict;
        var others = result.Opening.Barrier.ByOthers
            .Where(d => !string.IsNullOrWhiteSpace(d.Name) && !string.IsNullOrWhiteSpace(d.Reference))
            .Select(d => $"{NeededChecks.Title(d.Check)} ({Wording.OneLine(d.Name)}, {Wording.OneLine(d.Reference)})")
            .ToArray();
        var lead = verdict.Kind switch
        {
            VerdictKind.Adequate when others.Length > 0 => "Every check made here has passed; the rest is designed by others, who are named.",
            VerdictKind.Adequate => "Every check that this barrier needs has passed.",
            VerdictKind.Inadequate => "This barrier must not be built as it stands: a check fails.",
            _ => "This barrier must not be built from this summary yet: checks are still to be made.",
        };
        List<string> words = [verdict.Sentence.In(units)];
        if (others.Length > 0)
        {
            words.Add($"Designed by others: {List(others)}.");
        }

        return new VerdictLine(verdict.Kind, lead, string.Join(' ', words));
    }

    /// <summary>What an owner should know before the water comes.</summary>
    public static IEnumerable<Block> WhatToExpect(ProjectResult result, UnitSystem units)
    {
        var one = result.Openings.Count == 1;
        yield return new Heading("What to expect", 2);
        yield return Item("Put the " + (one ? "barrier" : "barriers") + " up before the water comes. Practise it, and note how long it takes and how many people it needs.");
        yield return Item("Some water leaks past every barrier. Keep a pump ready on the dry side, and know where it can pump to.");
        foreach (var opening in result.Openings)
        {
            if (opening.Leakage is { } leakage)
            {
                yield return Item(Pump(opening.Opening, leakage, units));
            }
        }

        yield return Item("Water also finds other ways in: drains, vents, cavities, floors and walls. A barrier closes only its own opening.");
        yield return Item("Water higher than the barrier flows over it. A barrier can also fail, at once and without warning.");
        yield return Item("Leave when you are told to. A barrier protects property; nobody should stay because it stands.");
    }

    private static string Pump(Opening opening, LeakageResult leakage, UnitSystem units)
    {
        string Flow(double value) => Units.Format(value, Dimension.FlowRate, units);
        var rain = leakage.Rain > 0 ? $" and {Flow(leakage.Rain)} of rain behind it" : "";
        return $"{ShortName(opening.Name)}: about {Flow(leakage.Leak)} through the seals{rain}; the pump should take at least {Flow(leakage.Pump)}.";
    }

    /// <summary>A name cut to a part of a line.</summary>
    public static string ShortName(string name) => Wording.Shorten(name, FontFile.Regular, 3.3, ShortNameWidth);

    /// <summary>"a, b and c".</summary>
    public static string List(IEnumerable<string> words)
    {
        var items = words.ToArray();
        return items.Length < 2 ? string.Concat(items) : $"{string.Join(", ", items[..^1])} and {items[^1]}";
    }

    private static Paragraph Item(string words) => new(words, ParagraphKind.Item);
}
