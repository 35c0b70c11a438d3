namespace FloodPanel.Calculation.Verification;

/// <summary>Units as sources print them.</summary>
internal static class Printed
{
    public const double Foot = 0.3048;

    public static double Kilo(double value) => value / 1e3;

    public static double Psf(double pressure) => US(pressure, Dimension.Pressure);

    public static double PoundsPerFoot(double force) => US(force, Dimension.LineForce);

    public static double Pounds(double force) => US(force, Dimension.Force);

    /// <summary>γ [N/m³] from lb/ft³.</summary>
    public static double PerCubicFoot(double pounds) => Units.ToSI(pounds, Dimension.UnitWeight, UnitSystem.USCustomary);

    public static double US(double value, Dimension dimension) => Units.FromSI(value, dimension, UnitSystem.USCustomary);
}
