using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>A plane area under water: a hatch, a pipe mouth, an odd gap.</summary>
public sealed record PlaneAreaInput
{
    /// <summary>Its shape.</summary>
    public PlaneShape Shape { get; init; } = new CircleShape(0.6);

    /// <summary>θ, angle of the plane to the horizontal [degrees], above 0 to 90.</summary>
    public double InclinationDegrees { get; init; } = 90;

    /// <summary>h, depth of the lowest point below the water [m], > 0.</summary>
    public double Depth { get; init; } = 1;

    /// <summary>ρ, water density [kg/m³], 990 to 1400.</summary>
    public double WaterDensity { get; init; } = 1000;
}

/// <summary>The load of still water on a plane area.</summary>
/// <param name="WettedArea">A, below the water line [m²].</param>
/// <param name="Force">F, normal to the plane [N].</param>
/// <param name="CentroidDepth">h_c, depth of the centroid of the wetted area [m].</param>
/// <param name="Centroid">Centroid of the wetted area.</param>
/// <param name="CentreOfPressure">Where the resultant acts.</param>
/// <param name="CentreOfPressureDepth">Depth of the centre of pressure [m].</param>
/// <param name="WaterLine">s_w, of the water line [m].</param>
/// <param name="Submerged">True when the whole area is below the water.</param>
/// <param name="Working">How they came about.</param>
public sealed record PlaneAreaResult(
    double WettedArea,
    double Force,
    double CentroidDepth,
    PlanePoint Centroid,
    PlanePoint CentreOfPressure,
    double CentreOfPressureDepth,
    double WaterLine,
    bool Submerged,
    Working Working);

/// <summary>Resultant and centre of pressure of still water on any plane area.</summary>
public static class PlaneArea
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "Hydrostatics, first principles";

    /// <summary>What cannot be calculated; empty when everything can.</summary>
    /// <param name="input">The area.</param>
    public static IReadOnlyList<InputProblem> Validate(PlaneAreaInput input) => PlaneAreaValidation.Problems(input);

    /// <summary>Calculates a plane area.</summary>
    /// <param name="input">An area without problems, see <see cref="Validate"/>.</param>
    /// <exception cref="ArgumentException">The area has problems.</exception>
    /// <remarks>
    /// y is measured down the slope from the water line. Limits: still water on one side, air on the other; pressure of the
    /// air is the same on both.
    /// </remarks>
    public static PlaneAreaResult Evaluate(PlaneAreaInput input)
    {
        if (Validate(input) is [var problem, ..])
        {
            throw new ArgumentException($"has problems, the first at {problem.Path}: {problem.Message}", nameof(input));
        }

        var sine = Math.Sin(double.DegreesToRadians(input.InclinationDegrees));
        var outline = Outline.Of(input.Shape);
        var waterLine = input.Depth / sine;
        var submerged = waterLine >= outline.Top;
        var moments = outline.Below(submerged ? double.PositiveInfinity : waterLine);
        var (x, s) = (moments.Across / moments.Area, moments.Up / moments.Area);
        var down = waterLine - s;
        var inertia = moments.UpUp - moments.Area * s * s;
        var product = moments.AcrossUp - moments.Area * x * s;
        var force = Hydrostatic.UnitWeight(input.WaterDensity) * down * sine * moments.Area;
        var centre = new PlanePoint(x - product / (down * moments.Area), s - inertia / (down * moments.Area));
        var figures = new PlaneAreaFigures(sine, waterLine, moments.Area, x, s, inertia, product, force, centre, submerged);
        return new(
            moments.Area, force, down * sine, new(x, s), centre, (waterLine - centre.S) * sine, waterLine, submerged,
            PlaneAreaWorking.Of(input, figures));
    }
}
