using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>What one published method gives for the same object.</summary>
/// <param name="Method">The method.</param>
/// <param name="Force">F [N].</param>
/// <param name="Source">Where it stands, and how it is known.</param>
public sealed record DebrisEstimate(string Method, double Force, string Source);

/// <summary>How widely published methods differ for the same object: the engineer chooses with open eyes.</summary>
public static class DebrisComparison
{
    private const double Foot = 0.3048;

    /// <summary>100 lb/ft on a strip 1 ft high: special impact [N/m].</summary>
    private static readonly double SpecialImpactLoad = Units.ToSI(100, Dimension.LineForce, UnitSystem.USCustomary);

    private const string Fema = "FEMA P-55 (2011), Eq. 8.9 (secondary source)";

    /// <summary>F_i = W·V·C_D·C_B·C_Str, FEMA's form [N].</summary>
    /// <param name="mass">m, mass of the object [kg], ≥ 0; W = m·g.</param>
    /// <param name="velocity">V, velocity of the object [m/s], ≥ 0.</param>
    /// <param name="depthAndBlockage">C_D·C_B [-], ≥ 0.</param>
    /// <param name="structure">C_Str [s/ft]: 0.2 timber pile or masonry column, 0.4 concrete pile, 0.8 concrete wall.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is negative or not finite.</exception>
    /// <remarks>Source: FEMA P-55 (2011), Eq. 8.9 (secondary source). C_Str is in s/ft: 1 s/ft is 3.281 s/m.</remarks>
    public static double FemaForce(double mass, double velocity, double depthAndBlockage, double structure)
    {
        Guard.NonNegative(mass);
        Guard.NonNegative(velocity);
        Guard.NonNegative(depthAndBlockage);
        Guard.NonNegative(structure);

        return mass * Physics.Gravity * velocity * depthAndBlockage * structure / Foot;
    }

    /// <summary>F = m·V/Δt, a mass stopped evenly [N].</summary>
    /// <param name="mass">m [kg], ≥ 0.</param>
    /// <param name="velocity">V [m/s], ≥ 0.</param>
    /// <param name="stoppingTime">Δt [s], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    public static double EvenStop(double mass, double velocity, double stoppingTime)
    {
        Guard.NonNegative(mass);
        Guard.NonNegative(velocity);
        Guard.Positive(stoppingTime);

        return mass * velocity / stoppingTime;
    }

    /// <summary>V = √(g·d_s)/2, the velocity that FEMA's form takes where none is known [m/s].</summary>
    /// <param name="depth">d_s, still-water depth above ground [m], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The depth is negative or not finite.</exception>
    /// <remarks>Source: FEMA P-55 (2011), remark to Eq. 8.9 (secondary source): half the upper bound of Eq. 8.2.</remarks>
    public static double FemaVelocity(double depth) => VelocityEstimate.Upper(depth) / 2;

    /// <summary>F = 1.46 kN/m·L, special impact over a span, on a strip 0.3 m high [N].</summary>
    /// <param name="span">L, effective span of a log [m], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The span is negative or not finite.</exception>
    /// <remarks>
    /// Source: Colorado Flood Proofing Manual (1983), p. 49, and US ordinances after EP 1165-2-314: 100 lb/ft. It takes no
    /// object into account, and is spread: at mid-span it bends a log as half of it would in one point.
    /// </remarks>
    public static double SpecialImpact(double span)
    {
        Guard.NonNegative(span);

        return SpecialImpactLoad * span;
    }

    /// <summary>The same object by each method, with its own depth and blockage coefficients.</summary>
    /// <param name="input">The object.</param>
    /// <param name="force">F used here, on the log that feels it most [N].</param>
    /// <param name="groundDepth">d_s, still-water depth above ground [m]; null leaves out what follows from it.</param>
    /// <param name="span">L, effective span of the log [m], ≥ 0; null leaves out what follows from it.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    public static IReadOnlyList<DebrisEstimate> Of(
        DebrisInput input, double force, double? groundDepth = null, double? span = null)
    {
        var (mass, velocity) = (input.Mass, input.Velocity);
        var depthAndBlockage = input.Coefficients.Depth * input.Coefficients.Blockage;
        List<DebrisEstimate> estimates =
        [
            new("Used here: half-sine impulse with the coefficients above", force, DebrisImpact.Source),
            new("The same with C_I·C_O·R_max = 1", DebrisImpact.Force(mass, velocity, input.StoppingTime, depthAndBlockage), DebrisImpact.Source),
            new("Concrete wall, C_Str 0.8 s/ft", FemaForce(mass, velocity, depthAndBlockage, 0.8), Fema),
            new("Concrete pile or frame, C_Str 0.4 s/ft", FemaForce(mass, velocity, depthAndBlockage, 0.4), Fema),
            new("Timber pile or masonry column, C_Str 0.2 s/ft", FemaForce(mass, velocity, depthAndBlockage, 0.2), Fema),
            new("Stopped evenly in 0.30 s", EvenStop(mass, velocity, 0.30), "IS 16475:2016, from its 4.5 kN for 450 kg at 3 m/s (derived)"),
            new("Stopped evenly in 0.5 s", EvenStop(mass, velocity, 0.5), "US ordinances after EP 1165-2-314"),
            new("Stopped evenly in 1 s", EvenStop(mass, velocity, 1), "Early US practice (FEMA critical-facilities guide)"),
        ];
        if (groundDepth is { } depth)
        {
            var own = FemaVelocity(Math.Max(0, depth));
            estimates.Insert(3, new("Concrete wall, at FEMA's own velocity √(g·d_s)/2", FemaForce(mass, own, depthAndBlockage, 0.8), Fema));
        }

        if (span is { } length)
        {
            estimates.Add(new("Special impact, spread over the span", SpecialImpact(length), "US ordinances after EP 1165-2-314; Colorado Flood Proofing Manual (1983), p. 49"));
        }

        return estimates;
    }
}
