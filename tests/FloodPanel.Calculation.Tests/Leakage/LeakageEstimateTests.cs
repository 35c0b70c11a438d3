using FloodPanel.Calculation.Leakage;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Steps;

namespace FloodPanel.Calculation.Tests.Leakage;

/// <summary>The dock: 4.3 m clear, two bays of 2.1 m, 0.85 m of water on a vertical face.</summary>
public class LeakageEstimateTests
{
    private const double LitrePerHour = 1e-3 / 3600;

    /// <summary>By width 4.3 m; by wetted seal 2·(2.1 + 2·0.85) = 7.6 m.</summary>
    [Theory]
    [InlineData(LeakConvention.Width, 4.3)]
    [InlineData(LeakConvention.Seal, 7.6)]
    public void Evaluate_OneLitrePerHourAndMetre_TimesTheLengthOfTheConvention(LeakConvention convention, double length)
    {
        var leakage = Of(new() { Convention = convention, Rate = LitrePerHour })!;

        Hand.Equal(length * LitrePerHour, leakage.Leak);
        Hand.Equal(4.3, leakage.WidthLength);
        Hand.Equal(7.6, leakage.SealLength);
    }

    /// <summary>4.3 L/h and 900 L/h of rain (20 m², 0.9, 50 mm/h): pump 1.5 times 904.3 L/h; 100 L fill in 398 s.</summary>
    [Fact]
    public void Evaluate_WithRain_PumpAndTimeToFill()
    {
        var leakage = Of(new() { Rate = LitrePerHour, RainIntensity = 0.05 / 3600, RainArea = 20, SumpVolume = 0.1 })!;

        Hand.Equal(900 * LitrePerHour, leakage.Rain);
        Hand.Equal(1.5 * 904.3 * LitrePerHour, leakage.Pump);
        Hand.Equal(100 / 904.3 * 3600, leakage.TimeToFill!.Value);
        Assert.Empty(StepAudit.Complaints("leakage", leakage.Working.Steps));
        Assert.Equal(leakage.Pump, leakage.Working.Steps[^1].Value);
    }

    /// <summary>A face raked by 60° has sides twice as long as the water is deep; overtopped, the barrier's own height counts.</summary>
    [Fact]
    public void SealLength_RakedFace_AlongTheFace()
    {
        var raked = SampleProject.Dock with { RakeDegrees = 60 };

        Hand.Equal(2 * (2.1 + 2 * 1.2), Of(new(), raked)!.SealLength);
    }

    [Fact]
    public void Evaluate_SillDry_NothingLeaks()
    {
        var dry = Of(new() { SumpVolume = 1 }, SampleProject.Dock with { SillLevel = 4.6 })!;

        Assert.Equal((0, 0, 0, null), (dry.Leak, dry.Pump, dry.WidthLength, dry.TimeToFill));
    }

    [Fact]
    public void Evaluate_NotAskedFor_Nothing() => Assert.Null(SampleProject.Result(SampleProject.Project).Leakage);

    [Theory]
    [InlineData(true, false)]
    [InlineData(false, true)]
    public void Notes_BackFlow_UntilSomebodyHasConfirmed(bool closed, bool noted)
    {
        var dock = SampleProject.Dock with { Leakage = new() { BackFlowClosed = closed } };

        var notes = SampleProject.Result(SampleProject.Project with { Openings = [dock] }).Notes;

        Assert.Equal(noted, notes.Any(n => n.Code == "back-flow-open"));
    }

    [Fact]
    public void Validate_OutOfRange_NamesEachField()
    {
        var leakage = new LeakageInput { Rate = -1, RainIntensity = 1, RainArea = -1, RunoffCoefficient = 1.1, SumpVolume = -1, PumpMargin = 0.9 };

        var paths = (SampleProject.Project with { Openings = [SampleProject.Dock with { Leakage = leakage }] }).Validate(Library.Empty).Select(p => p.Path);

        Assert.Equal(
            ["rate", "rainIntensity", "rainArea", "runoffCoefficient", "sumpVolume", "pumpMargin"],
            paths.Select(p => p.Replace("openings[0].leakage.", "", StringComparison.Ordinal)));
    }

    /// <summary>0.08 gal/h per ft is about 1 L/h per m (ANSI/FM 2510, from memory).</summary>
    [Fact]
    public void LeakRates_AmericanFigure_AboutOneLitre() => Assert.Equal(
        LeakRates.All.Single(r => r.Convention == LeakConvention.Seal).Rate / LitrePerHour,
        Units.ToSI(0.08, Dimension.LeakRate, UnitSystem.USCustomary) / LitrePerHour, tolerance: 0.05);

    private static LeakageResult? Of(LeakageInput input, Opening? opening = null) => SampleProject.Result(
        SampleProject.Project with { Openings = [(opening ?? SampleProject.Dock) with { Leakage = input }] }).Leakage;
}
