using System.Globalization;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Reports;

namespace FloodPanel.Documents.OwnerSummaries;

/// <summary>The covers of a project in one plain table; nothing where there are none.</summary>
internal static class CoversTable
{
    public static IEnumerable<Block> Of(ProjectResult result, UnitSystem units)
    {
        if (result.Covers.Count == 0)
        {
            yield break;
        }

        yield return new Heading("Covers", 2);
        yield return new Table(
            [
                new Column("Cover", 55),
                new Column("Size", 34, Unit: Units.Of(Dimension.Length, units).Symbol),
                new Column("Thickness", 22, IsNumber: true, Units.Of(Dimension.SectionLength, units).Symbol),
                new Column("Fasteners", 20, IsNumber: true),
                new Column("Water above it", 24, IsNumber: true, Units.Of(Dimension.Length, units).Symbol),
                new Column("Verdict", 24),
            ],
            [.. result.Covers.Select(cover => Row(cover, units))]);
    }

    private static string[] Row(CoverResult result, UnitSystem units)
    {
        string Length(double value) => Units.FormatNumber(value, Dimension.Length, units);
        var size = result.Cover.Plate switch
        {
            RectangleCover plate => $"{Length(plate.Width)} × {Length(plate.Height)}",
            CircleCover plate => $"{Length(plate.Diameter)}, round",
            _ => throw new ArgumentOutOfRangeException(nameof(result), result.Cover.Plate, "is not a plate"),
        };
        return
        [
            result.Cover.Name, size, Units.FormatNumber(result.Cover.Thickness, Dimension.SectionLength, units),
            result.Fasteners.ToString(CultureInfo.InvariantCulture), result.Depth > 0 ? Length(result.Depth) : "none", result.Kind.ToString(),
        ];
    }
}
