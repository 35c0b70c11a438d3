using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Documents.Drawings;

/// <summary>What a drawing is made from.</summary>
/// <param name="Project">The project: its levels, datum and the title block.</param>
/// <param name="Result">The calculation of the opening.</param>
/// <param name="Library">The materials and profiles that the project may name.</param>
/// <param name="Units">The reader's units.</param>
/// <param name="Revision">The revision in the title block.</param>
public sealed record DrawingInput(
    Project Project, OpeningResult Result, Library Library, UnitSystem Units, string Revision)
{
    internal Opening Opening => Result.Opening;

    internal Barrier Barrier => Result.Opening.Barrier;

    internal int LogCount => Barrier.Logs.TotalCount;

    /// <summary>Height above the sill of each joint of the stack, from 0 to the top of the barrier [m].</summary>
    internal double[] LogEdges => [0, .. Result.Cases[0].Logs.Where(log => log.Bay == 1).Select(log => log.Top)];

    internal double Rake => double.DegreesToRadians(Opening.RakeDegrees);

    /// <summary>Design flood level above the sill [m].</summary>
    internal double FloodHeight => Result.DesignFloodLevel - Opening.SillLevel;

    /// <summary>Height that the barrier should have above the sill [m].</summary>
    internal double RequiredHeight => FloodHeight + Project.Site.Freeboard;

    /// <summary>Outside ground above the sill [m], usually negative or 0.</summary>
    internal double GroundHeight => (Opening.GroundLevel ?? Opening.SillLevel) - Opening.SillLevel;

    internal string Length(double value) => Calculation.Units.FormatNumber(value, Dimension.Length, Units);

    internal string LengthWithUnit(double value) => Calculation.Units.Format(value, Dimension.Length, Units);

    /// <summary>A size of a cross-section with its unit and without idle zeros, "200 mm".</summary>
    internal string Size(double value)
    {
        var number = Calculation.Units.FormatNumber(value, Dimension.SectionLength, Units);
        var trimmed = number.Contains('.') ? number.TrimEnd('0').TrimEnd('.') : number;
        return $"{trimmed} {Calculation.Units.Of(Dimension.SectionLength, Units).Symbol}";
    }

    internal string Format(double value, Dimension dimension) => Calculation.Units.Format(value, dimension, Units);
}
