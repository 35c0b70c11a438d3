namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>Sainflou's fully reflected regular wave, the linearised diagram. Shown beside Goda's for comparison; not a load case.</summary>
/// <param name="SetUp">δ_0, rise of the mean level at the wall [m].</param>
/// <param name="AtStillWater">p_1, wave pressure at still water with the crest at the wall [Pa].</param>
/// <param name="AtFoot">p_2, wave pressure at the foot, crest or trough [Pa].</param>
/// <param name="AtTrough">p_3, missing pressure at the trough [Pa].</param>
/// <param name="CrestForce">Wave force with the crest at the wall, without still water [N/m].</param>
public readonly record struct SainflouWave(
    double SetUp, double AtStillWater, double AtFoot, double AtTrough, double CrestForce)
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "Sainflou 1928; USACE EM 1110-2-1100, Table VI-5-52 (p_3 from memory)";

    /// <summary>The diagram of a wave.</summary>
    /// <param name="height">H, incident wave height [m], > 0.</param>
    /// <param name="waveNumber">k, wave number [rad/m], > 0.</param>
    /// <param name="depth">h, still-water depth at the wall [m], > 0.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³], > 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// δ_0 = π·H²/L·coth kh; p_2 = γ·H/cosh kh; p_1 = (p_2 + γ·h)·(H + δ_0)/(h + H + δ_0); p_3 = γ·(H − δ_0).
    /// Limits: regular, fully reflected, non-breaking.
    /// </remarks>
    public static SainflouWave Of(double height, double waveNumber, double depth, double unitWeight)
    {
        Guard.Positive(height);
        Guard.Positive(waveNumber);
        Guard.Positive(depth);
        Guard.Positive(unitWeight);

        var kh = waveNumber * depth;
        var setUp = height * height * waveNumber / (2 * Math.Tanh(kh));
        var crest = height + setUp;
        var foot = unitWeight * height / Math.Cosh(kh);
        var still = (foot + unitWeight * depth) * crest / (depth + crest);
        return new(setUp, still, foot, unitWeight * (height - setUp), still * crest / 2 + (still + foot) * depth / 2);
    }
}
