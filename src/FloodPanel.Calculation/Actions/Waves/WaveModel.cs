using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>The waves at one opening, resolved to pressures on the barrier. Heights from the sill.</summary>
public sealed class WaveModel
{
    private readonly PressurePiece[] pieces;

    private WaveModel(WaveInput input, WaveSetting setting, double crest, double? greatestHeight, params ReadOnlySpan<PressurePiece> shape)
    {
        Input = input;
        Setting = setting;
        CrestHeight = crest;
        GreatestHeight = greatestHeight;
        pieces = IsCovered ? Cut(shape, setting) : [];
    }

    /// <summary>The waves as entered.</summary>
    public WaveInput Input { get; }

    /// <summary>Height of the crest above the sill [m].</summary>
    public double CrestHeight { get; }

    /// <summary>Greatest wave height that the method takes here [m]; null where the depth itself sets the wave.</summary>
    public double? GreatestHeight { get; }

    /// <summary>
    /// False when the wave is higher than the depth allows, or the bed steeper than the method's: then there is no wave
    /// load, and no case.
    /// </summary>
    public bool IsCovered => !(Input is NonBreakingWaveInput wave && (wave.Height > GreatestHeight || IsTooSteep));

    /// <summary>True when the bed is steeper than the method of non-breaking waves allows.</summary>
    public bool IsTooSteep => Input is NonBreakingWaveInput { BedSlope: > GodaWave.SteepestBed } && !IsDry;

    /// <summary>True when outside ground stays dry, so that no wave reaches the opening.</summary>
    public bool IsDry => !(Setting.GroundDepth > 0);

    /// <summary>True when the method's total is the design value, so that flow is left out beside it.</summary>
    public bool IncludesFlow => Input is BreakingWaveInput;

    /// <summary>How the pressures came about.</summary>
    public Working Working => WaveWorking.Of(Input, Setting);

    internal WaveSetting Setting { get; }

    /// <summary>Resolves waves.</summary>
    /// <param name="input">The waves, or null.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³].</param>
    /// <param name="retainedDepth">h, still-water depth above the sill [m].</param>
    /// <param name="groundDepth">h_g, still-water depth above outside ground [m].</param>
    /// <param name="height">H, vertical height of the barrier [m].</param>
    /// <returns>The waves; null when there are none.</returns>
    /// <remarks>
    /// Depths are measured from outside ground, which mostly stands at or below the sill. Where it stands above, the
    /// pressure at the ground is taken down to the sill, without the dynamic part, which is safe.
    /// </remarks>
    public static WaveModel? Of(WaveInput? input, double unitWeight, double retainedDepth, double groundDepth, double height)
    {
        var setting = new WaveSetting(unitWeight, retainedDepth, groundDepth, height);
        return input switch
        {
            null => null,
            _ when !(groundDepth > 0) => new(input, setting, retainedDepth, null),
            BreakingWaveInput breaking => Breaking(breaking, setting),
            NonBreakingWaveInput regular => NonBreaking(regular, setting),
            _ => throw new ArgumentOutOfRangeException(nameof(input), input, "is not a kind of wave"),
        };
    }

    /// <summary>Adds the wave's pressure on the barrier beyond that of still water.</summary>
    internal void AddTo(PressureDiagram diagram, double factor)
    {
        foreach (ref readonly var piece in pieces.AsSpan())
        {
            diagram.Add(piece with { Factor = factor });
        }
    }

    private static WaveModel Breaking(BreakingWaveInput wave, WaveSetting setting)
    {
        var coefficient = BreakingWave.PressureCoefficient(wave.RiskCategory);
        var (toStillWater, toCrest) = BreakingWave.Pressure(coefficient, setting.UnitWeight, setting.GroundDepth, setting.Ground);
        return new(wave, setting, toCrest.Top, null, Below(setting, toStillWater.AtBottom), toStillWater, toCrest);
    }

    private static WaveModel NonBreaking(NonBreakingWaveInput wave, WaveSetting setting)
    {
        var (depth, still) = (setting.GroundDepth, setting.RetainedDepth);
        var goda = setting.Goda(wave);
        return new(
            wave,
            setting,
            still + goda.Crest,
            GodaWave.GreatestHeight(wave.Period, depth, wave.BedSlope),
            Below(setting, goda.AtFoot),
            new(setting.Ground, still, goda.AtFoot, goda.AtStillWater, 1),
            new(still, still + goda.Crest, goda.AtStillWater, 0, 1));
    }

    /// <summary>Between the sill and ground that stands above it.</summary>
    private static PressurePiece Below(WaveSetting setting, double pressure) =>
        new(0, Math.Max(0, setting.Ground), pressure, pressure, 1);

    private static PressurePiece[] Cut(ReadOnlySpan<PressurePiece> shape, WaveSetting setting)
    {
        var cut = new List<PressurePiece>(shape.Length);
        foreach (ref readonly var piece in shape)
        {
            if (piece.Height > 0 && piece.Top > 0 && piece.Bottom < setting.Height)
            {
                cut.Add(piece.Within(0, setting.Height));
            }
        }

        return [.. cut];
    }
}

/// <summary>Water and barrier that waves meet; heights from the sill.</summary>
/// <param name="UnitWeight">γ [N/m³].</param>
/// <param name="RetainedDepth">h, still water above the sill [m].</param>
/// <param name="GroundDepth">h_g, still water above outside ground [m].</param>
/// <param name="Height">H, vertical height of the barrier [m].</param>
internal readonly record struct WaveSetting(double UnitWeight, double RetainedDepth, double GroundDepth, double Height)
{
    /// <summary>Height of outside ground above the sill [m].</summary>
    public double Ground => RetainedDepth - GroundDepth;

    /// <summary>Goda's pressures without a mound: h = h′ = d = h_g.</summary>
    public GodaWave Goda(NonBreakingWaveInput wave) => GodaWave.Of(
        wave.Height,
        wave.Period,
        double.DegreesToRadians(wave.AngleDegrees),
        UnitWeight,
        new(GroundDepth, GroundDepth, GroundDepth, GodaWave.SeawardDepth(GroundDepth, wave.Height, wave.BedSlope)));
}
