namespace FloodPanel.Calculation.Actions.Debris;

/// <summary>First natural period of a log, dry and with the water that it must move.</summary>
public static class NaturalPeriod
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "First mode of a simply supported beam; added mass of a plate in still water, Blevins, Formulas for Natural Frequency and Mode Shape (from memory)";

    /// <summary>T = 2·L²/π·√(m/(E·I)), first natural period of a simply supported beam [s].</summary>
    /// <param name="lineMass">m, mass per length [kg/m], > 0.</param>
    /// <param name="stiffness">E·I [N·m²], > 0.</param>
    /// <param name="span">L, effective span [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not finite and above zero.</exception>
    /// <remarks>Limits: bending deformation only, no rotary inertia: right for slender logs.</remarks>
    public static double Of(double lineMass, double stiffness, double span)
    {
        Guard.Positive(lineMass);
        Guard.Positive(stiffness);
        Guard.Positive(span);

        return 2 * span * span / Math.PI * Math.Sqrt(lineMass / stiffness);
    }

    /// <summary>m_w = π·ρ·t²/4, water moved along with a log per length [kg/m].</summary>
    /// <param name="density">ρ, water density [kg/m³], > 0.</param>
    /// <param name="logHeight">t, height of the log [m], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is not finite and above zero.</exception>
    /// <remarks>
    /// That of a plate with water on both sides. Here it stands on one side only, but the neighbouring logs confine it,
    /// so the whole is taken as an estimate; the response is taken dry as well, and the larger counts.
    /// </remarks>
    public static double AddedMass(double density, double logHeight)
    {
        Guard.Positive(density);
        Guard.Positive(logHeight);

        return Math.PI * density * logHeight * logHeight / 4;
    }
}
