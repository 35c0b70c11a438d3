using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>The force of a floating object that is stopped.</summary>
public static class DebrisImpact
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "ASCE 7, C5.4.5: F = π·m·V·C/(2·Δt), a half-sine impulse";

    /// <summary>Height of the patch on which the object strikes [m] (ASCE 7: 1 ft × 1 ft).</summary>
    public const double PatchHeight = 0.30;

    /// <summary>F = π·m·V·C/(2·Δt), impact force [N].</summary>
    /// <param name="mass">m, mass of the object [kg], ≥ 0.</param>
    /// <param name="velocity">V, velocity of the object [m/s], ≥ 0.</param>
    /// <param name="stoppingTime">Δt, time in which it is stopped [s], > 0.</param>
    /// <param name="coefficient">C, product of the coefficients [-], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// Source: ASCE 7, C5.4.5 with W = m·g: the peak of a half-sine pulse of duration Δt whose impulse is m·V. Limits:
    /// one object that strikes normal to the face; ice and floating debris dams are loads of their own.
    /// </remarks>
    public static double Force(double mass, double velocity, double stoppingTime, double coefficient)
    {
        Guard.NonNegative(mass);
        Guard.NonNegative(velocity);
        Guard.Positive(stoppingTime);
        Guard.NonNegative(coefficient);

        return Math.PI * mass * velocity * coefficient / (2 * stoppingTime);
    }

    /// <summary>C_I·C_O·C_D·C_B, product of the coefficients without the response [-].</summary>
    /// <param name="coefficients">The coefficients.</param>
    public static double WithoutResponse(DebrisCoefficients coefficients) =>
        coefficients.Importance * coefficients.Orientation * coefficients.Depth * coefficients.Blockage;
}
