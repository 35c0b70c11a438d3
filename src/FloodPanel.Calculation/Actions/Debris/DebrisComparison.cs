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

    /// <summary>The same object by each method, with its own depth and blockage coefficients.</summary>
    /// <param name="input">The object.</param>
    /// <param name="force">F used here, on the log that feels it most [N].</param>
    public static IReadOnlyList<DebrisEstimate> Of(DebrisInput input, double force)
    {
        var (mass, velocity) = (input.Mass, input.Velocity);
        var depthAndBlockage = input.Coefficients.Depth * input.Coefficients.Blockage;
        return
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
    }
}
