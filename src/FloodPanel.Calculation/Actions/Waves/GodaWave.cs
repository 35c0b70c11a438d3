using MathNet.Numerics.RootFinding;

namespace FloodPanel.Calculation.Actions.Waves;

/// <summary>Depths at a wall under waves [m].</summary>
/// <param name="Wall">h, depth in front of the wall, > 0.</param>
/// <param name="Foot">h′, depth of the foot of the wall, > 0.</param>
/// <param name="Berm">d, depth over the berm, > 0; h where there is none.</param>
/// <param name="Seaward">h_b, depth five significant wave heights seaward, > 0.</param>
public readonly record struct WaveDepths(double Wall, double Foot, double Berm, double Seaward);

/// <summary>Goda's pressures of non-breaking and breaking irregular waves on a vertical wall, without the still water.</summary>
/// <param name="WaveNumber">k, wave number [rad/m].</param>
/// <param name="Alpha1">α_1 [-], 0.6 in deep to 1.1 in shallow water.</param>
/// <param name="Alpha2">α_2 [-], the share of a sloping bed or a berm.</param>
/// <param name="Alpha3">α_3, pressure at the foot over that at still water [-].</param>
/// <param name="Crest">η*, height above still water to which pressure reaches [m].</param>
/// <param name="AtStillWater">p_1, pressure at still water [Pa].</param>
/// <param name="AtFoot">p_3, pressure at the foot [Pa].</param>
public readonly record struct GodaWave(
    double WaveNumber, double Alpha1, double Alpha2, double Alpha3, double Crest, double AtStillWater, double AtFoot)
{
    /// <summary>Source of the method, as printed.</summary>
    public const string Source = "Goda 1974; USACE EM 1110-2-1100, Table VI-5-53 (vertical wall, λ = 1); depth limit from memory";

    /// <summary>H_max/H_s, design over significant wave height [-].</summary>
    public const double DesignHeightRatio = 1.8;

    /// <summary>H_b/L_0, steepest wave before it breaks in deep water [-], in Goda's breaker formula.</summary>
    private const double HighestSteepness = 0.17;

    /// <summary>Of the greatest height [m].</summary>
    private const double Accuracy = 1e-10;

    /// <summary>
    /// Steepest bed, rise over run [-], 1 in 10. The data behind the breaker formula end there (Y. Goda, Reanalysis of
    /// regular and random breaking wave statistics, Coastal Engineering Journal 52, 2010, abstract), and on steeper beds
    /// waves plunge onto the wall with impulses that the pressure formula does not hold (from memory).
    /// </summary>
    public const double SteepestBed = 0.1;

    /// <summary>The pressures of a wave.</summary>
    /// <param name="height">H_max, design wave height [m], > 0.</param>
    /// <param name="period">T, wave period [s], > 0.</param>
    /// <param name="angle">β, between wave direction and the normal to the wall [rad], 0 to π/2, as given: not turned towards the normal.</param>
    /// <param name="unitWeight">γ, unit weight of water [N/m³], > 0.</param>
    /// <param name="depths">The depths at the wall.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// η* = 0.75·(1 + cos β)·H_max; α_1 = 0.6 + (2kh/sinh 2kh)²/2; α_2 = min((h_b − d)/(3h_b)·(H_max/d)², 2d/H_max);
    /// α_3 = 1 − h′/h·(1 − 1/cosh kh); p_1 = (1 + cos β)/2·(α_1 + α_2·cos²β)·γ·H_max; p_3 = α_3·p_1. Linear between.
    /// Limits: vertical wall without a caisson's modification factors; waves up to <see cref="DepthLimit"/> on beds
    /// up to <see cref="SteepestBed"/>.
    /// </remarks>
    public static GodaWave Of(double height, double period, double angle, double unitWeight, WaveDepths depths)
    {
        Guard.Positive(height);
        Guard.InRange(angle, 0, Math.PI / 2);
        Guard.Positive(unitWeight);
        Guard.Positive(depths.Foot);
        Guard.Positive(depths.Berm);
        Guard.Positive(depths.Seaward);

        var (wall, foot, berm, seaward) = depths;
        var waveNumber = Dispersion.WaveNumber(period, wall);
        var kh = waveNumber * wall;
        var shallow = 2 * kh / Math.Sinh(2 * kh);
        var alpha1 = 0.6 + shallow * shallow / 2;
        var alpha2 = Math.Min((seaward - berm) / (3 * seaward) * (height / berm) * (height / berm), 2 * berm / height);
        var alpha3 = 1 - foot / wall * (1 - 1 / Math.Cosh(kh));
        var cosine = Math.Cos(angle);
        var atStillWater = (1 + cosine) / 2 * (alpha1 + alpha2 * cosine * cosine) * unitWeight * height;
        return new(waveNumber, alpha1, alpha2, alpha3, 0.75 * (1 + cosine) * height, atStillWater, alpha3 * atStillWater);
    }

    /// <summary>h_b = h + 5·H_s·m, depth five significant wave heights seaward [m].</summary>
    /// <param name="depth">h, depth in front of the wall [m], > 0.</param>
    /// <param name="height">H_max, design wave height [m], > 0.</param>
    /// <param name="bedSlope">m, slope of the bed, rise over run [-], ≥ 0.</param>
    public static double SeawardDepth(double depth, double height, double bedSlope) =>
        depth + 5 * height / DesignHeightRatio * bedSlope;

    /// <summary>H_b, wave height that a depth seaward lets through [m].</summary>
    /// <param name="period">T, wave period [s], > 0.</param>
    /// <param name="seawardDepth">h_b, depth five significant wave heights seaward [m], > 0.</param>
    /// <param name="bedSlope">m, slope of the bed, rise over run [-], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>Source: Goda (from memory): H_b = 0.17·L_0·(1 − exp(−1.5·π·h_b/L_0·(1 + 15·m^(4/3)))).</remarks>
    public static double DepthLimit(double period, double seawardDepth, double bedSlope)
    {
        Guard.Positive(seawardDepth);
        Guard.NonNegative(bedSlope);

        var length = Dispersion.DeepWaterLength(period);
        return HighestSteepness * length
            * (1 - Math.Exp(-1.5 * Math.PI * seawardDepth / length * (1 + 15 * Math.Pow(bedSlope, 4.0 / 3))));
    }

    /// <summary>Greatest wave height at a wall: the one that is as high as its own depth limit [m].</summary>
    /// <param name="period">T, wave period [s], > 0.</param>
    /// <param name="depth">h, depth in front of the wall [m], > 0.</param>
    /// <param name="bedSlope">m, slope of the bed, rise over run [-], ≥ 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is out of range or not finite.</exception>
    /// <remarks>
    /// On a slope a higher wave is measured in deeper water, h_b, so that its limit is higher too. The limit less the
    /// height is concave in the height, positive for none and not positive at 0.17·L_0: it crosses zero once. A wave is
    /// below its own limit exactly when it is below this height.
    /// </remarks>
    public static double GreatestHeight(double period, double depth, double bedSlope)
    {
        var highest = HighestSteepness * Dispersion.DeepWaterLength(period);
        var scale = DepthLimit(period, depth, bedSlope);
        return Brent.FindRoot(
            height => (DepthLimit(period, SeawardDepth(depth, height, bedSlope), bedSlope) - height) / scale, 0, highest, Accuracy);
    }

    /// <summary>p_4, pressure at a height above still water [Pa]; 0 above η*.</summary>
    /// <param name="height">h_c, height above still water [m], ≥ 0.</param>
    public double At(double height) => Math.Max(0, AtStillWater * (1 - height / Crest));
}
