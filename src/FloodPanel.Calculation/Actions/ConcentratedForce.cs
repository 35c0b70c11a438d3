namespace FloodPanel.Calculation.Actions;

/// <summary>A force at one height: debris [N], or a line load [N per metre of width]. Normal to the face.</summary>
/// <param name="Characteristic">Unfactored force.</param>
/// <param name="Factor">γ_F, load factor of the design basis [-].</param>
/// <param name="Height">z, height above the sill [m].</param>
public readonly record struct ConcentratedForce(double Characteristic, double Factor, double Height)
{
    /// <summary>Factored force.</summary>
    public double Design => Factor * Characteristic;

    /// <summary>The same force taken over a width, [N] from [N/m].</summary>
    /// <param name="width">The width [m].</param>
    internal ConcentratedForce Over(double width) => this with { Characteristic = Characteristic * width };
}
