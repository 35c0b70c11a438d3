using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Reports;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.OwnerSummaries;

/// <summary>The page that a property owner understands: what is protected, with what, and what to expect of it.</summary>
public static class OwnerSummary
{
    /// <summary>Name of the calculation's note that every document prints.</summary>
    private const string SafetyNote = "calculation-aid";

    private const double FigureText = 2.25;
    private const double FigureHeight = 58;

    /// <summary>Composes the summary. Nothing is calculated here.</summary>
    /// <param name="result">The calculation of the project.</param>
    /// <param name="library">The materials and profiles that the project may name.</param>
    /// <param name="units">The owner's units; US customary units go on US Letter.</param>
    /// <param name="revision">Revision of the project.</param>
    /// <param name="date">Date of the summary.</param>
    public static Report Compose(ProjectResult result, Library library, UnitSystem units, int revision, DateOnly date)
    {
        var project = result.Project;
        var paper = units == UnitSystem.SI ? Paper.A4 : Paper.Letter;
        var dated = date.ToString("d MMMM yyyy", CultureInfo.InvariantCulture);
        var revised = FormattableString.Invariant($"Revision {revision}");
        var name = Wording.OneLine(project.Name);
        return new Report(
            new ReportProperties(
                $"Flood barrier summary: {name}", Wording.OneLine(project.Engineer),
                "What is protected against flooding, to what level, and with what",
                "flood barrier, stop-logs, owner's summary", date),
            paper,
            "Flood barrier summary",
            Band(result),
            (name, $"{revised}, {dated}"),
            [
                new Heading($"Flood barrier summary: {name}", 1),
                new Facts(
                [
                    ("Client", project.Client), ("Address", project.Address), ("Reference", project.Reference),
                    ("Engineer", project.Engineer), ("Issue", $"{revised}, {dated}"),
                ]),
                .. Protection(result, units),
                .. Parts(result, library, units),
                .. CoversTable.Of(result, units),
                .. OwnerAdvice.WhatToExpect(result, units),
                .. result.Openings.Select(o => Opening(result.Project, o, library, units, revision, paper)),
                .. Cautions(result, units),
                new Together([new Paragraph(SafetyWords(result, units), ParagraphKind.Strong), new SignatureLines(project.Engineer)]),
            ]);
    }

    private static Band? Band(ProjectResult result)
    {
        var open = result.Openings.Count(o => o.Verdict.Kind != VerdictKind.Adequate);
        var covers = result.Covers.Count(c => c.Kind != VerdictKind.Adequate);
        if (result.Openings.Count == 0 && covers == 0)
        {
            return new Band("Not for construction", "No opening has been entered yet");
        }

        string[] reasons = [.. Open("barrier", open, result.Openings.Count), .. Open("cover", covers, result.Covers.Count)];
        return reasons.Length == 0 ? null : new Band("Not for construction", string.Join("; ", reasons));
    }

    private static IEnumerable<string> Open(string what, int open, int all)
    {
        if (open > 0)
        {
            yield return all == 1
                ? $"The {what} is not shown to be adequate"
                : FormattableString.Invariant($"{open} of {all} {what}s are not shown to be adequate");
        }
    }

    private static IEnumerable<Block> Protection(ProjectResult result, UnitSystem units)
    {
        yield return new Heading("What is protected, and to what level", 2);
        yield return new Paragraph(OwnerAdvice.Level(result.Project.Site, result.Openings.Count, units));
        if (result.Openings.Count == 0)
        {
            yield return new Paragraph("No opening has been entered yet.");
            yield break;
        }

        var unit = Units.Of(Dimension.Length, units).Symbol;
        string Length(double value) => Units.FormatNumber(value, Dimension.Length, units);
        yield return new Table(
            [
                new Column("Opening", 47),
                new Column("Clear width", 22, IsNumber: true, unit),
                new Column("Sill level", 18, IsNumber: true, unit),
                new Column("Water above sill", 29, IsNumber: true, unit),
                new Column("Barrier above sill", 30, IsNumber: true, unit),
                new Column("Verdict", 23),
            ],
            [
                .. result.Openings.Select(o => (IReadOnlyList<string>)
                [
                    o.Opening.Name, Length(o.Opening.ClearWidth), Length(o.Opening.SillLevel),
                    o.RetainedDepth > 0 ? Length(o.RetainedDepth) : "none", Length(o.BarrierHeight), o.Verdict.Kind.ToString(),
                ]),
            ]);
    }

    private static Together Opening(
        Project project, OpeningResult opening, Library library, UnitSystem units, int revision, Paper paper)
    {
        var input = new DrawingInput(project, opening, library, units, revision.ToString(CultureInfo.InvariantCulture));
        return new Together(
        [
            new Heading(opening.Opening.Name, 2),
            OwnerAdvice.Verdict(opening, units),
            .. LoadWords.Of(opening, units),
            new Figure(OpeningSheet.Draw(input, new Sheet(paper.ContentWidth, FigureHeight, FigureText))),
        ]);
    }

    private static IEnumerable<Block> Parts(ProjectResult result, Library library, UnitSystem units) =>
        result.Openings.Count == 0 ? [] : [new Heading("Logs and posts", 2), PartsTable.Of(result, library, units)];

    private static IEnumerable<Block> Cautions(ProjectResult result, UnitSystem units)
    {
        var cautions = result.Openings
            .SelectMany(o => o.Notes.Where(n => n.Code != SafetyNote).Select(n => (o.Opening.Name, Words: n.Text.In(units))))
            .Concat(result.Covers.SelectMany(c => c.Gaps.Concat(c.Notes).Select(n => (c.Cover.Name, Words: n.Text.In(units)))))
            .GroupBy(c => c.Words)
            .Select(group => result.Openings.Count == 1 && result.Covers.Count == 0
                ? group.Key
                : $"{string.Join(", ", group.Select(c => OwnerAdvice.ShortName(c.Name)))}: {group.Key}")
            .ToArray();
        if (cautions.Length > 0)
        {
            yield return new Heading("Cautions", 2);
        }

        foreach (var caution in cautions)
        {
            yield return new Paragraph(caution, ParagraphKind.Item);
        }
    }

    private static string SafetyWords(ProjectResult result, UnitSystem units) =>
        result.Openings.SelectMany(o => o.Notes).FirstOrDefault(n => n.Code == SafetyNote)?.Text.In(units)
        ?? "This is a calculation aid. It must be checked by a licensed engineer and follow local codes. "
            + "A barrier can fail or be overtopped: people leave when told to.";
}
