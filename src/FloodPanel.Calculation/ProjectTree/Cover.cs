namespace FloodPanel.Calculation.ProjectTree;

/// <summary>A plate that covers a vent, a hatch or an odd gap, held by fasteners round its rim.</summary>
public sealed record Cover
{
    /// <summary>Name of the cover, "Cellar vent".</summary>
    public string Name { get; init; } = "";

    /// <summary>Outline and how its edge is held.</summary>
    public CoverPlate Plate { get; init; } = new RectangleCover();

    /// <summary>How it stands.</summary>
    public CoverPosition Position { get; init; }

    /// <summary>Level of its lower edge, of the middle of a circle, or of a plate that lies flat [m, project datum].</summary>
    public double Level { get; init; }

    /// <summary>What the plate is made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>t, thickness [m], > 0.</summary>
    public double Thickness { get; init; } = 0.006;

    /// <summary>ν, Poisson's ratio [-], 0 to 0.49.</summary>
    public double PoissonRatio { get; init; } = 0.3;

    /// <summary>n in the limit span / n [-]: of the shorter side, of the free edge, or of the diameter.</summary>
    public double DeflectionLimit { get; init; } = 200;

    /// <summary>Which way the water presses it.</summary>
    public CoverPressing Pressing { get; init; }

    /// <summary>What holds it round its rim.</summary>
    public CoverFasteners Fasteners { get; init; } = new();
}

/// <summary>Outline of a cover between the lines on which it is held.</summary>
public abstract record CoverPlate;

/// <summary>A rectangle.</summary>
public sealed record RectangleCover : CoverPlate
{
    /// <summary>B, width [m], > 0.</summary>
    public double Width { get; init; } = 0.6;

    /// <summary>A, height, or length where it lies flat [m], > 0.</summary>
    public double Height { get; init; } = 0.4;

    /// <summary>Which edges are held.</summary>
    public RectangleSupport Support { get; init; }
}

/// <summary>A circle.</summary>
public sealed record CircleCover : CoverPlate
{
    /// <summary>D, diameter [m], > 0.</summary>
    public double Diameter { get; init; } = 0.6;

    /// <summary>How its edge is held.</summary>
    public CircleSupport Support { get; init; }
}

/// <summary>Which edges of a rectangular cover are held; those that are can turn.</summary>
public enum RectangleSupport
{
    /// <summary>All four.</summary>
    FourEdges,

    /// <summary>All but the upper one.</summary>
    ThreeEdges,
}

/// <summary>How the edge of a circular cover is held.</summary>
public enum CircleSupport
{
    /// <summary>It can turn.</summary>
    Supported,

    /// <summary>It cannot turn.</summary>
    Clamped,
}

/// <summary>How a cover stands.</summary>
public enum CoverPosition
{
    /// <summary>Upright: the pressure grows with depth.</summary>
    Upright,

    /// <summary>Flat: the pressure is the same all over.</summary>
    Flat,
}

/// <summary>Which way the water presses a cover.</summary>
public enum CoverPressing
{
    /// <summary>Onto its seat, which takes the pressure.</summary>
    Seating,

    /// <summary>Off its seat: the fasteners take the pressure.</summary>
    Unseating,
}

/// <summary>Fasteners along the edges that are held, with the value of their approval.</summary>
public sealed record CoverFasteners
{
    /// <summary>p, greatest distance between fasteners along an edge [m], > 0; they are spaced evenly.</summary>
    public double Pitch { get; init; } = 0.15;

    /// <summary>n_g, line load by which the gasket pushes the plate away [N/m], ≥ 0.</summary>
    public double GasketLoad { get; init; }

    /// <summary>e, from the fasteners to the line on which a clamped rim bears [m], > 0, or null; it makes the fixing moment.</summary>
    public double? FixingLever { get; init; }

    /// <summary>T_R, tension that one fastener may take: allowable load, design strength or design resistance [N], > 0, or null.</summary>
    public double? Tension { get; init; }

    /// <summary>Where <see cref="Tension"/> comes from.</summary>
    public string Source { get; init; } = "";
}
