namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The joints between logs and the seals at their ends, as far as tightness is to be checked.</summary>
public sealed record LogJoint
{
    /// <summary>How far neighbouring logs may bend apart at mid-span before the tongue or seal between them opens [m], > 0.</summary>
    public double Travel { get; init; } = 0.005;

    /// <summary>Compression of the seal at each end of a log [m], > 0, or null where it is not to be checked.</summary>
    public double? SealCompression { get; init; }
}

/// <summary>How long the greatest load acts on timber.</summary>
public enum LoadDuration
{
    /// <summary>More than ten years.</summary>
    Permanent,

    /// <summary>Up to ten years.</summary>
    LongTerm,

    /// <summary>Up to two months.</summary>
    MediumTerm,

    /// <summary>Up to a week.</summary>
    ShortTerm,

    /// <summary>Moments, up to ten minutes.</summary>
    Instantaneous,
}

/// <summary>What timber logs have to endure: wet, for a time.</summary>
public sealed record TimberService
{
    /// <summary>How long the greatest load acts.</summary>
    public LoadDuration Duration { get; init; } = LoadDuration.ShortTerm;

    /// <summary>C_F, size factor on the NDS reference bending value [-], 0.5 to 1.5; without effect elsewhere.</summary>
    public double SizeFactor { get; init; } = 1;
}

/// <summary>Factors on the strengths of a composite, by the design standard that its user follows.</summary>
public sealed record CompositeService
{
    /// <summary>γ_M, material factor, or safety factor under allowable stress [-], 1 to 10.</summary>
    public double MaterialFactor { get; init; } = 3;

    /// <summary>η_c, conversion factor for moisture, temperature and duration [-], above 0 and at most 1.</summary>
    public double ConversionFactor { get; init; } = 0.5;
}
