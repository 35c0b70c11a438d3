namespace FloodPanel.Calculation.Tests.Steps;

/// <summary>Powers of metre, kilogram and second in a unit.</summary>
internal readonly record struct Exponents(int Metre, int Kilogram, int Second)
{
    public static Exponents None => default;

    private static Exponents Force => new(1, 1, -2);

    public static Exponents Of(Dimension dimension) => dimension switch
    {
        Dimension.Ratio or Dimension.Count or Dimension.Probability or Dimension.Years or Dimension.Degrees or Dimension.Angle => None,
        Dimension.Length or Dimension.SectionLength or Dimension.Deflection or Dimension.LengthPerYear => new(1, 0, 0),
        Dimension.Volume => new(3, 0, 0),
        Dimension.FlowRate => new(3, 0, -1),
        Dimension.LeakRate => new(2, 0, -1),
        Dimension.RainIntensity => new(1, 0, -1),
        Dimension.Area => new(2, 0, 0),
        Dimension.AreaInertia => new(4, 0, 0),
        Dimension.SectionArea => new(2, 0, 0),
        Dimension.SectionModulus => new(3, 0, 0),
        Dimension.SecondMoment => new(4, 0, 0),
        Dimension.Velocity => new(1, 0, -1),
        Dimension.Acceleration => new(1, 0, -2),
        Dimension.Time => new(0, 0, 1),
        Dimension.WaveNumber => new(-1, 0, 0),
        Dimension.Mass => new(0, 1, 0),
        Dimension.LineMass => new(-1, 1, 0),
        Dimension.Density => new(-3, 1, 0),
        Dimension.UnitWeight => Force - new Exponents(3, 0, 0),
        Dimension.Force => Force,
        Dimension.LineForce => Force - new Exponents(1, 0, 0),
        Dimension.Moment => Force + new Exponents(1, 0, 0),
        Dimension.Stiffness => Force + new Exponents(2, 0, 0),
        Dimension.Pressure or Dimension.Stress or Dimension.ElasticModulus => Force - new Exponents(2, 0, 0),
        _ => throw new ArgumentOutOfRangeException(nameof(dimension), dimension, "has no exponents here"),
    };

    public static Exponents operator +(Exponents a, Exponents b) =>
        new(a.Metre + b.Metre, a.Kilogram + b.Kilogram, a.Second + b.Second);

    public static Exponents operator -(Exponents a, Exponents b) =>
        new(a.Metre - b.Metre, a.Kilogram - b.Kilogram, a.Second - b.Second);

    public static Exponents operator *(Exponents a, int power) =>
        new(a.Metre * power, a.Kilogram * power, a.Second * power);

    /// <summary>Those of a square root; refused where a power is odd.</summary>
    public Exponents Half() => Metre % 2 == 0 && Kilogram % 2 == 0 && Second % 2 == 0
        ? new(Metre / 2, Kilogram / 2, Second / 2)
        : throw new FormatException($"no square root of {this}");
}
