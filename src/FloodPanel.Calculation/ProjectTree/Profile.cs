namespace FloodPanel.Calculation.ProjectTree;

/// <summary>A cross-section by library id or by shape.</summary>
public abstract record ProfileChoice;

/// <summary>A profile of the library.</summary>
/// <param name="Id">Identifier in the library.</param>
public sealed record LibraryProfile(string Id) : ProfileChoice;

/// <summary>
/// A cross-section by shape. For a log, height is its size along the stack; for a post, across the opening.
/// Depth is the size in the direction of the water.
/// </summary>
public abstract record Profile : ProfileChoice
{
    /// <summary>Height [m], > 0.</summary>
    public double Height { get; init; }

    /// <summary>Depth, in the direction of the water [m], > 0.</summary>
    public double Depth { get; init; }
}

/// <summary>Solid rectangle.</summary>
public sealed record Rectangle : Profile;

/// <summary>Two faces across the load and webs along it, the two outer webs included.</summary>
public sealed record HollowRectangle : Profile
{
    /// <summary>Thickness of each of the two faces, wet and dry [m], > 0.</summary>
    public double Face { get; init; }

    /// <summary>Thickness of each web [m], > 0.</summary>
    public double Web { get; init; }

    /// <summary>Number of webs [-], ≥ 2.</summary>
    public int Webs { get; init; } = 2;
}

/// <summary>Rectangular tube of one wall thickness.</summary>
public sealed record RectangularTube : Profile
{
    /// <summary>t, wall thickness [m], > 0.</summary>
    public double Wall { get; init; }

    /// <summary>r_o, radius of the outer corners [m], ≥ 0; null for sharp corners.</summary>
    public double? CornerRadius { get; init; }

    /// <summary>r_i, radius of the inner corners [m], ≥ 0; null for the outer one less the wall.</summary>
    public double? InnerRadius { get; init; }

    /// <summary>r_o, radius of the outer corners as it counts [m].</summary>
    public double OuterCorner => CornerRadius ?? 0;

    /// <summary>r_i, radius of the inner corners as it counts [m].</summary>
    public double InnerCorner => InnerRadius ?? Math.Max(0, OuterCorner - Wall);
}

/// <summary>I-section, web along the load, sharp corners.</summary>
public sealed record ISection : Profile
{
    /// <summary>Flange thickness [m], > 0.</summary>
    public double Flange { get; init; }

    /// <summary>Web thickness [m], > 0.</summary>
    public double Web { get; init; }
}

/// <summary>A section whose properties are given by its maker.</summary>
public sealed record GivenProperties : Profile
{
    /// <summary>A, area [m²], > 0.</summary>
    public double Area { get; init; }

    /// <summary>I, second moment of area for bending in the direction of the water [m⁴], > 0.</summary>
    public double Inertia { get; init; }

    /// <summary>W, elastic section modulus [m³], > 0.</summary>
    public double Modulus { get; init; }

    /// <summary>W_pl, plastic section modulus [m³], > 0.</summary>
    public double PlasticModulus { get; init; }

    /// <summary>A_v, shear area [m²], > 0.</summary>
    public double ShearArea { get; init; }
}
