using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>How the pressures of waves came about.</summary>
internal static class WaveWorking
{
    public static Working Of(WaveInput input, WaveSetting setting) => input switch
    {
        _ when !(setting.GroundDepth > 0) => Dry(setting),
        BreakingWaveInput breaking => Breaking(breaking, setting),
        NonBreakingWaveInput regular => NonBreaking(regular, setting),
        _ => throw new ArgumentOutOfRangeException(nameof(input), input, "is not a kind of wave"),
    };

    private static Working Dry(WaveSetting setting) => new(
        "No wave: outside ground stays dry", "Levels in the project's datum",
        [new("h_g", "", setting.GroundDepth, Dimension.Length)]);

    private static Working Breaking(BreakingWaveInput wave, WaveSetting setting)
    {
        var (weight, depth) = (setting.UnitWeight, setting.GroundDepth);
        var coefficient = BreakingWave.PressureCoefficient(wave.RiskCategory);
        var (toStillWater, toCrest) = BreakingWave.Pressure(coefficient, weight, depth, setting.Ground);
        var steps = new StepList(12);
        steps.UnitWeight(weight);
        steps.Given("d_s", depth, Dimension.Length);
        steps.Add("H_b", "0.78·d_s", BreakingWave.HeightRatio * depth, Dimension.Length);
        steps.Given("C_p", coefficient, Dimension.Ratio);
        steps.Add("F", "1.1·C_p·γ·d_s² + 2.42·γ·d_s²", (1.1 * coefficient + 2.42) * weight * depth * depth, Dimension.LineForce);
        steps.Add("p_g", "1.2·γ·d_s", toStillWater.AtBottom, Dimension.Pressure);
        steps.Add("p_max", "(C_p + 1.2)·γ·d_s", toStillWater.AtTop, Dimension.Pressure);
        steps.Given("z_g", setting.Ground, Dimension.Length);
        steps.Add("z_c", "z_g + 2.2·d_s", toCrest.Top, Dimension.Length);
        return new("Pressure of breaking waves beyond still water: p_g at the ground, p_max at still water, 0 at z_c", BreakingWave.Source, steps.Done());
    }

    private static Working NonBreaking(NonBreakingWaveInput wave, WaveSetting setting)
    {
        var steps = new StepList(32);
        var goda = setting.Goda(wave);
        Length(steps, wave, setting, goda);
        Limit(steps, wave, setting);
        steps.Given("β", double.DegreesToRadians(wave.AngleDegrees), Dimension.Angle);
        steps.Add("α_1", "0.6 + (2·k·h_g/sinh(2·k·h_g))²/2", goda.Alpha1, Dimension.Ratio);
        steps.Add("α_2", "min((h_b − h_g)/(3·h_b)·(H_max/h_g)², 2·h_g/H_max)", goda.Alpha2, Dimension.Ratio);
        steps.Add("α_3", "1/cosh(k·h_g)", goda.Alpha3, Dimension.Ratio);
        steps.Add("η", "0.75·(1 + cos(β))·H_max", goda.Crest, Dimension.Length);
        steps.Add("p_1", "(1 + cos(β))/2·(α_1 + α_2·cos(β)²)·γ·H_max", goda.AtStillWater, Dimension.Pressure);
        steps.Add("p_3", "α_3·p_1", goda.AtFoot, Dimension.Pressure);
        Compare(steps, wave, setting, goda);
        return new(
            "Pressure of waves beyond still water: p_3 at the ground, p_1 at still water, 0 at η above it; Sainflou for comparison",
            $"{GodaWave.Source}; {SainflouWave.Source}", steps.Done());
    }

    /// <summary>k is a root, so the line after it shows that it gives back the period.</summary>
    private static void Length(StepList steps, NonBreakingWaveInput wave, WaveSetting setting, GodaWave goda)
    {
        steps.UnitWeight(setting.UnitWeight);
        steps.Given("h_g", setting.GroundDepth, Dimension.Length);
        steps.Given("H_max", wave.Height, Dimension.Length);
        steps.Given("k", goda.WaveNumber, Dimension.WaveNumber);
        steps.Add("T", "2·π/√(g·k·tanh(k·h_g))", wave.Period, Dimension.Time);
        steps.Add("L", "2·π/k", 2 * Math.PI / goda.WaveNumber, Dimension.Length);
        steps.Add("L_0", "g·T²/(2·π)", Dispersion.DeepWaterLength(wave.Period), Dimension.Length);
    }

    private static void Limit(StepList steps, NonBreakingWaveInput wave, WaveSetting setting)
    {
        var seaward = GodaWave.SeawardDepth(setting.GroundDepth, wave.Height, wave.BedSlope);
        steps.Given("m", wave.BedSlope, Dimension.Ratio);
        steps.Add("h_b", "h_g + 5·H_max/1.8·m", seaward, Dimension.Length);
        steps.Add(
            "H_lim", "0.17·L_0·(1 − 1/exp(1.5·π·h_b/L_0·(1 + 15·m^(4/3))))",
            GodaWave.DepthLimit(wave.Period, seaward, wave.BedSlope), Dimension.Length);
    }

    private static void Compare(StepList steps, NonBreakingWaveInput wave, WaveSetting setting, GodaWave goda)
    {
        var depth = setting.GroundDepth;
        var sainflou = SainflouWave.Of(wave.Height, goda.WaveNumber, depth, setting.UnitWeight);
        steps.Add(
            "F_Goda", "(p_1 + p_3)/2·h_g + p_1·η/2",
            (goda.AtStillWater + goda.AtFoot) / 2 * depth + goda.AtStillWater * goda.Crest / 2, Dimension.LineForce);
        steps.Add("δ_0", "π·H_max²/(L·tanh(k·h_g))", sainflou.SetUp, Dimension.Length);
        steps.Add("p_S2", "γ·H_max/cosh(k·h_g)", sainflou.AtFoot, Dimension.Pressure);
        steps.Add("p_S1", "(p_S2 + γ·h_g)·(H_max + δ_0)/(h_g + H_max + δ_0)", sainflou.AtStillWater, Dimension.Pressure);
        steps.Add("F_Sainflou", "p_S1·(H_max + δ_0)/2 + (p_S1 + p_S2)/2·h_g", sainflou.CrestForce, Dimension.LineForce);
    }
}
