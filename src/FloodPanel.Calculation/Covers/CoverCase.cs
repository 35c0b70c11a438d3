using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Covers;

/// <summary>A cover resolved to numbers under the water of the design flood.</summary>
internal sealed class CoverCase
{
    private readonly double floodLevel;

    public CoverCase(Site site, Cover cover, DesignBasis basis, Library library)
    {
        (Cover, floodLevel) = (cover, site.DesignFloodLevel);
        Material = library.Find(cover.Material) ?? throw new ArgumentException("the library does not hold the material", nameof(cover));
        Factor = basis.For(site.FloodZone).FloodSide;
        UnitWeight = Hydrostatic.UnitWeight(site.WaterDensity);
        Depth = FloodLevels.Depth(floodLevel, Lowest);
        if (Depth > 0 && IsCovered)
        {
            Plate = Solve();
        }
    }

    public Cover Cover { get; }

    public Material Material { get; }

    public double UnitWeight { get; }

    /// <summary>γ_F on the water.</summary>
    public double Factor { get; }

    /// <summary>h_0 of the lowest point.</summary>
    public double Depth { get; }

    public bool IsFlat => Cover.Position == CoverPosition.Flat;

    public double Height => Cover.Plate switch
    {
        RectangleCover rectangle => rectangle.Height,
        CircleCover circle => circle.Diameter,
        _ => throw new InvalidOperationException("not a plate"),
    };

    /// <summary>True where the water line crosses the plate.</summary>
    public bool IsPartlyWet => !IsFlat && Depth > 0 && Depth < Height;

    /// <summary>False for a rectangle so long that its series is not tested.</summary>
    public bool IsCovered => Cover.Plate is not RectangleCover { Height: var height, Width: var width }
        || height / width is >= RectangularPlate.LeastRatio and <= RectangularPlate.GreatestRatio;

    /// <summary>True where the rim cannot turn.</summary>
    public bool IsClamped => Cover.Plate is CircleCover { Support: CircleSupport.Clamped };

    /// <summary>What the plate feels under the unfactored water; null where it stays dry or its shape is not covered.</summary>
    public PlateResponse? Plate { get; }

    /// <summary>q_k = γ·h_0, greatest pressure, unfactored.</summary>
    public double Pressure => UnitWeight * Depth;

    /// <summary>Design value of q.</summary>
    public double DesignPressure => Factor * Pressure;

    /// <summary>The length that coefficients refer to: shorter side, free edge, radius.</summary>
    public double Reference => Cover.Plate switch
    {
        RectangleCover { Support: RectangleSupport.ThreeEdges } rectangle => rectangle.Width,
        RectangleCover rectangle => Math.Min(rectangle.Width, rectangle.Height),
        _ => Height / 2,
    };

    /// <summary>Its symbol.</summary>
    public string ReferenceSymbol => Cover.Plate is CircleCover ? "r" : "b";

    /// <summary>The span that the limit of deflection refers to.</summary>
    public double Span => Cover.Plate is CircleCover ? Height : Reference;

    /// <summary>Its symbol.</summary>
    public string SpanSymbol => Cover.Plate is CircleCover ? "D" : "b";

    /// <summary>Lines from the levels to q, the greatest pressure: design value, or unfactored as q_k.</summary>
    public void ExplainPressure(StepList steps, bool isDesign)
    {
        steps.UnitWeight(UnitWeight);
        steps.Given("z_w", floodLevel, Dimension.Length);
        if (Cover.Plate is CircleCover && !IsFlat)
        {
            steps.Given("z_m", Cover.Level, Dimension.Length);
            steps.Given("D", Height, Dimension.Length);
            steps.Add("h_0", "z_w − z_m + D/2", Depth, Dimension.Length);
        }
        else
        {
            steps.Given("z_0", Cover.Level, Dimension.Length);
            steps.Add("h_0", "z_w − z_0", Depth, Dimension.Length);
        }

        if (isDesign)
        {
            steps.Given("γ_F", Factor, Dimension.Ratio);
            steps.Add("q", "γ_F·γ·h_0", DesignPressure, Dimension.Pressure);
        }
        else
        {
            steps.Add("q_k", "γ·h_0", Pressure, Dimension.Pressure);
        }
    }

    /// <summary>Lines of the length that coefficients refer to.</summary>
    public void ExplainReference(StepList steps)
    {
        if (Cover.Plate is RectangleCover rectangle)
        {
            steps.Given("B", rectangle.Width, Dimension.Length);
            steps.Given("A", rectangle.Height, Dimension.Length);
            steps.Add("b", rectangle.Support == RectangleSupport.ThreeEdges ? "B" : "min(A, B)", Reference, Dimension.Length);
            return;
        }

        if (IsFlat)
        {
            steps.Given("D", Height, Dimension.Length);
        }

        steps.Add("r", "D/2", Reference, Dimension.Length);
    }

    private double Lowest => Cover.Plate is CircleCover circle && !IsFlat ? Cover.Level - circle.Diameter / 2 : Cover.Level;

    private PlateResponse Solve()
    {
        var water = IsFlat ? PlatePressure.Uniform(Pressure) : PlatePressure.Water(UnitWeight, Depth - Height);
        if (Cover.Plate is RectangleCover rectangle)
        {
            var top = rectangle.Support == RectangleSupport.ThreeEdges ? PlateEdge.Free : PlateEdge.Supported;
            return new RectangularPlate(rectangle.Height, rectangle.Width, Cover.PoissonRatio, top, PlateEdge.Supported, water).Worst();
        }

        // Above the water line a straight run down from nothing at the top lies above the true pressure everywhere.
        var (atTop, atBottom) = (water.AtTop, Pressure);
        return new CircularPlate(Height / 2, Cover.PoissonRatio, IsClamped, (atTop + atBottom) / 2, (atBottom - atTop) / Height).Worst();
    }
}
