namespace FloodPanel.Calculation.Covers;

/// <summary>
/// A rectangular plate whose side edges are supported, under a pressure that grows straight with depth, by Lévy's series. The
/// bending of strips across is taken in closed form and the series adds what the edges above and below change, so that
/// it dies away quickly inside the plate. x down from the upper edge, y across from the left one.
/// </summary>
/// <remarks>
/// Source: Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells, 2nd ed. (1959), articles 30 to 36 and 41 (from memory; the
/// tables of articles 30 and 31 are recomputed and held against Roark). Limits: thin isotropic plate, small deflections, edges that do
/// not move out of their plane, corners held down; aspect ratio <see cref="LeastRatio"/> to <see cref="GreatestRatio"/>.
/// </remarks>
public sealed class RectangularPlate
{
    /// <summary>Least height over width for which the series is tested [-].</summary>
    public const double LeastRatio = 0.1;

    /// <summary>Greatest height over width for which the series is tested [-].</summary>
    public const double GreatestRatio = 10;

    /// <summary>Terms are added until the next changes a reaction in the middle of an edge by less, in parts of pressure times width.</summary>
    private const double Tolerance = 1e-5;

    private readonly LevyTerm[] terms;
    private readonly PlatePressure pressure;
    private readonly double poisson;

    /// <summary>Solves the plate.</summary>
    /// <param name="height">a [m], > 0.</param>
    /// <param name="width">b [m], > 0.</param>
    /// <param name="poisson">ν [-], 0 to 0.49.</param>
    /// <param name="top">The upper edge.</param>
    /// <param name="bottom">The lower edge.</param>
    /// <param name="pressure">The pressure; it begins to grow above the lower edge.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite, or the aspect ratio is outside the limits.</exception>
    public RectangularPlate(double height, double width, double poisson, PlateEdge top, PlateEdge bottom, PlatePressure pressure)
    {
        Guard.Positive(height);
        Guard.Positive(width);
        Guard.InRange(height / width, LeastRatio * (1 - 1e-9), GreatestRatio * (1 + 1e-9), "height / width");
        Guard.InRange(poisson, 0, 0.49);
        Guard.NonNegative(pressure.AtTop);
        Guard.InRange(pressure.Start, 0, height);
        Guard.NonNegative(pressure.Rise);

        (Height, Width, Top, Bottom) = (height, width, top, bottom);
        (this.poisson, this.pressure) = (poisson, pressure);
        var list = new List<LevyTerm>();
        for (var order = 1; list.Count == 0 || 8 / Math.Pow(list[^1].Order * Math.PI, 2) > Tolerance; order += 2)
        {
            list.Add(new(order, height, width, poisson, (top, bottom), pressure));
        }

        terms = [.. list];
    }

    /// <summary>a [m].</summary>
    public double Height { get; }

    /// <summary>b [m].</summary>
    public double Width { get; }

    /// <summary>The upper edge.</summary>
    public PlateEdge Top { get; }

    /// <summary>The lower edge.</summary>
    public PlateEdge Bottom { get; }

    /// <summary>Where the pressure begins, down from the upper edge [m].</summary>
    public double WaterLine => pressure.Start;

    /// <summary>What the plate feels most.</summary>
    public PlateResponse Worst() => PlateSearch.Of(this);

    /// <summary>D·w, deflection times stiffness [N·m²], positive with the pressure.</summary>
    /// <param name="x">Down from the upper edge [m].</param>
    /// <param name="y">Across from the left edge [m].</param>
    public double Bulge(double x, double y) => Row(x).Bulge(y);

    /// <summary>Moments per width.</summary>
    /// <param name="x">Down from the upper edge [m].</param>
    /// <param name="y">Across from the left edge [m].</param>
    public PlateMoments Moments(double x, double y) => Row(x).Moments(y);

    /// <summary>Reaction of the lower edge against the pressure [N/m]; meaningless where it is free.</summary>
    /// <param name="y">Across from the left edge [m].</param>
    public double BottomReaction(double y) => Row(Height).Shear(y);

    /// <summary>Reaction of the upper edge against the pressure [N/m]; 0 where it is free.</summary>
    /// <param name="y">Across from the left edge [m].</param>
    public double TopReaction(double y) => -Row(0).Shear(y);

    /// <summary>Reaction of either side edge against the pressure [N/m].</summary>
    /// <param name="x">Down from the upper edge [m].</param>
    public double SideReaction(double x) => Row(x).SideReaction();

    /// <summary>Force that holds each of the two upper corners down, with the pressure [N]; negative where it pushes back.</summary>
    public double TopCornerHold => 2 * (1 - poisson) * Row(0).Twist(0);

    /// <summary>Force that holds each of the two lower corners down, with the pressure [N]; negative where it pushes back.</summary>
    public double BottomCornerHold => -2 * (1 - poisson) * Row(Height).Twist(0);

    internal PlateRow Row(double x) => new(terms, x, Width, poisson, pressure);
}
