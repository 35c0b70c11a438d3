namespace FloodPanel.Calculation;

/// <summary>What a number measures, and so how <see cref="Units"/> prints and reads it.</summary>
public enum Dimension
{
    /// <summary>A pure number, printed to three figures.</summary>
    Ratio,

    /// <summary>A pure number that counts.</summary>
    Count,

    /// <summary>Chance in a year, 0 to 1.</summary>
    Probability,

    /// <summary>Number of years.</summary>
    Years,

    /// <summary>Rise of a level in a year [m per year]: mm/year / in/year.</summary>
    LengthPerYear,

    /// <summary>Angle in degrees, as in the project file.</summary>
    Degrees,

    /// <summary>Angle in radians; printed in degrees.</summary>
    Angle,

    /// <summary>Level, width, span or height of an opening: m / ft.</summary>
    Length,

    /// <summary>Size of a cross-section, a clearance: mm / in.</summary>
    SectionLength,

    /// <summary>Deflection: mm / in, to three figures.</summary>
    Deflection,

    /// <summary>Area of a cross-section: cm² / in².</summary>
    SectionArea,

    /// <summary>Area of a surface under water: m² / ft².</summary>
    Area,

    /// <summary>Second moment of a surface under water: m⁴ / ft⁴.</summary>
    AreaInertia,

    /// <summary>Volume of water: L / gal.</summary>
    Volume,

    /// <summary>Flow of water: L/h / gal/h.</summary>
    FlowRate,

    /// <summary>Leakage per length of seal [m³/s per m]: L/h per m / gal/h per ft.</summary>
    LeakRate,

    /// <summary>Rain [m/s]: mm/h / in/h.</summary>
    RainIntensity,

    /// <summary>Section modulus: cm³ / in³.</summary>
    SectionModulus,

    /// <summary>Second moment of area: cm⁴ / in⁴.</summary>
    SecondMoment,

    /// <summary>Velocity: m/s / ft/s.</summary>
    Velocity,

    /// <summary>Acceleration: m/s² / ft/s².</summary>
    Acceleration,

    /// <summary>Time: s.</summary>
    Time,

    /// <summary>Wave number: rad/m / rad/ft.</summary>
    WaveNumber,

    /// <summary>Mass: kg / lb.</summary>
    Mass,

    /// <summary>Mass per length: kg/m / lb/ft.</summary>
    LineMass,

    /// <summary>Density: kg/m³ / lb/ft³.</summary>
    Density,

    /// <summary>Weight per volume: kN/m³ / lbf/ft³.</summary>
    UnitWeight,

    /// <summary>Force: kN / lbf.</summary>
    Force,

    /// <summary>Force per length: kN/m / lbf/ft.</summary>
    LineForce,

    /// <summary>Moment: kN·m / lbf·ft.</summary>
    Moment,

    /// <summary>Bending stiffness: kN·m² / lbf·ft².</summary>
    Stiffness,

    /// <summary>Pressure of water or wind: kPa / psf.</summary>
    Pressure,

    /// <summary>Stress and strength of materials: MPa / ksi.</summary>
    Stress,

    /// <summary>Elastic modulus: GPa / ksi.</summary>
    ElasticModulus,
}

/// <summary>The two systems of units of screens and documents.</summary>
public enum UnitSystem
{
    /// <summary>m, mm, kN, kPa.</summary>
    SI,

    /// <summary>ft, in, lbf, psf.</summary>
    USCustomary,
}

/// <summary>A number in base SI with what it measures.</summary>
/// <param name="Value">The number [base SI].</param>
/// <param name="Dimension">What it measures.</param>
public readonly record struct Quantity(double Value, Dimension Dimension);
