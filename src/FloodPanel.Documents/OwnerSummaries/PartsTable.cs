using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Documents.Reports;

namespace FloodPanel.Documents.OwnerSummaries;

/// <summary>Logs and posts of every opening in one plain table; bays whose logs are alike share a row.</summary>
internal static class PartsTable
{
    public static Table Of(ProjectResult result, Library library, UnitSystem units)
    {
        // A saw is set in inches where feet are the unit of the site.
        var cutting = units == UnitSystem.SI ? Dimension.Length : Dimension.SectionLength;
        string Unit(Dimension dimension) => Units.Of(dimension, units).Symbol;
        return new Table(
            [
                new Column("Opening", 47),
                new Column("Bays", 22),
                new Column("Logs in each", 22, IsNumber: true),
                new Column("Log height", 20, IsNumber: true, Unit(Dimension.SectionLength)),
                new Column("Cutting length", 25, IsNumber: true, Unit(cutting)),
                new Column("Mass of a log", 24, IsNumber: true, Unit(Dimension.Mass)),
                new Column("Posts", 13, IsNumber: true),
            ],
            [.. result.Openings.SelectMany(o => Rows(o, library, units, cutting))]);
    }

    private static IEnumerable<IReadOnlyList<string>> Rows(
        OpeningResult opening, Library library, UnitSystem units, Dimension cutting)
    {
        var alike = opening.Schedule.GroupBy(row => (
            row.Count,
            Height: HeightOf(opening, row, library),
            Length: Units.FormatNumber(row.CuttingLength, cutting, units),
            Mass: Units.FormatNumber(row.Mass, Dimension.Mass, units)));
        var isFirst = true;
        foreach (var group in alike)
        {
            yield return
            [
                isFirst ? opening.Opening.Name : "",
                Bays([.. group.Select(row => row.Bay)]),
                group.Key.Count.ToString(CultureInfo.InvariantCulture),
                group.Key.Height is { } known ? Plain(Units.FormatNumber(known, Dimension.SectionLength, units)) : "–",
                group.Key.Length,
                group.Key.Mass,
                isFirst ? Posts(opening.Opening.Barrier.Bays.Count - 1) : "",
            ];
            isFirst = false;
        }
    }

    /// <summary>Height of the logs of a row [m]; null where the library does not hold their profile.</summary>
    private static double? HeightOf(OpeningResult opening, LogSchedule row, Library library)
    {
        var first = 1;
        foreach (var group in opening.Opening.Barrier.Logs.Groups)
        {
            if (first == row.FirstLog)
            {
                return library.Find(group.Profile)?.Height;
            }

            first += group.Count;
        }

        return null;
    }

    private static string Posts(int count) => count == 0 ? "none" : count.ToString(CultureInfo.InvariantCulture);

    /// <summary>Without idle zeros: "200" for "200.0".</summary>
    private static string Plain(string number) => number.Contains('.') ? number.TrimEnd('0').TrimEnd('.') : number;

    /// <summary>"1 to 12", "1, 3 and 4".</summary>
    private static string Bays(IReadOnlyList<int> bays)
    {
        string Number(int bay) => bay.ToString(CultureInfo.InvariantCulture);
        var isRun = bays.Count > 2 && bays[^1] - bays[0] == bays.Count - 1;
        return isRun ? $"{Number(bays[0])} to {Number(bays[^1])}" : OwnerAdvice.List(bays.Select(Number));
    }
}
