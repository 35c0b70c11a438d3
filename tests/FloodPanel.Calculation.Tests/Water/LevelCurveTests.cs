using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Water;

public class LevelCurveTests
{
    private static readonly ValueList<LevelPoint> Table = [new(0.01, 10.85), new(0.1, 10.38), new(0.002, 11.16)];

    /// <summary>y = −ln(−ln(1 − p)), by hand: 4.60015 at 1 in 100, 2.25037 at 1 in 10, 0.36651 at 1 in 2.</summary>
    [Theory]
    [InlineData(0.01, 4.60015)]
    [InlineData(0.1, 2.25037)]
    [InlineData(0.5, 0.36651)]
    public void Variate_Probability_ByHand(double probability, double variate) =>
        Assert.Equal(variate, LevelCurve.Variate(probability), tolerance: 0.000005);

    [Theory]
    [InlineData(0)]
    [InlineData(1)]
    [InlineData(-0.1)]
    [InlineData(double.NaN)]
    public void Variate_NoProbability_Throws(double probability) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => LevelCurve.Variate(probability));

    /// <summary>1 in 50: y 3.90194, from 2.25037 and 4.60015: 10.38 + 0.47·0.70286.</summary>
    [Fact]
    public void At_BetweenTwoLevels_StraightOnTheVariate() =>
        Assert.Equal(10.71035, LevelCurve.Of(Table)!.At(0.02)!.Value, tolerance: 0.00001);

    [Fact]
    public void At_KnownLevels_AreThemselves() =>
        Assert.All(Table, point => Assert.Equal(point.Level, LevelCurve.Of(Table)!.At(point.AnnualProbability)!.Value, tolerance: 1e-12));

    [Theory]
    [InlineData(0.1001)]
    [InlineData(0.0019)]
    public void At_OutsideTheTable_NothingIsExtrapolated(double probability) => Assert.Null(LevelCurve.Of(Table)!.At(probability));

    [Fact]
    public void Of_FewerThanTwoOrFallingLevels_NoCurve()
    {
        Assert.Null(LevelCurve.Of([]));
        Assert.Null(LevelCurve.Of([new(0.01, 10)]));
        Assert.Null(LevelCurve.Of([new(0.01, 10), new(0.01, 11)]));
        Assert.Null(LevelCurve.Of([new(0.01, 10), new(0.1, 10.1)]));
        Assert.Null(LevelCurve.Of([new(0.01, double.NaN), new(0.1, 9)]));
    }

    /// <summary>Rarer water never stands lower.</summary>
    [Property(MaxTest = 200)]
    public Property At_RarerProbability_NeverLower()
    {
        var probabilities = Gen.Choose(20, 1000).Select(n => n / 10_000.0).ToArbitrary();
        return Prop.ForAll(probabilities, probabilities, (a, b) =>
        {
            var curve = LevelCurve.Of(Table)!;
            return curve.At(Math.Max(a, b)) <= curve.At(Math.Min(a, b)) + 1e-12;
        });
    }

    [Fact]
    public void DesignLevel_WithTable_ShowsTheInterpolation()
    {
        var site = SampleProject.Project.Site with { Levels = Table, AnnualProbability = 0.02, DesignStillWaterLevel = 10.71 };

        var steps = FloodLevels.DesignLevel(site).Steps;

        Assert.Equal(10.71035, steps.Single(s => s.Symbol == "z_p").Value, tolerance: 0.00001);
        Assert.Empty(Steps.StepAudit.Complaints("levels", steps));
        Assert.Contains("Gumbel", FloodLevels.DesignLevel(site).Source, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0.02, 10.73)]
    [InlineData(0.2, 10.71)]
    public void DesignLevel_NotThatOfTheTable_ShowsNoInterpolation(double probability, double level)
    {
        var site = SampleProject.Project.Site with { Levels = Table, AnnualProbability = probability, DesignStillWaterLevel = level };

        Assert.Equal(["z_swl", "s", "c", "z_dfl"], FloodLevels.DesignLevel(site).Steps.Select(s => s.Symbol));
    }

    /// <summary>0.7 · 0.01 is one bit below 0.007: typed as 0.7 % the chance is still that of the table.</summary>
    [Fact]
    public void At_ChanceTypedInPerCent_IsTheKnownLevel()
    {
        var curve = LevelCurve.Of([new(0.1, 10.38), new(0.007, 10.9)])!;

        Assert.Equal(10.9, curve.At(0.7 * 0.01)!.Value, tolerance: 1e-7);
        Assert.Null(LevelCurve.Of([new(0.007, 10.38), new(0.7 * 0.01, 10.9)]));
    }

    [Theory]
    [InlineData(0.02, 10.71, null)]
    [InlineData(0.02, 10.73, "level-differs-from-table")]
    [InlineData(0.2, 10.71, "level-outside-table")]
    public void Notes_DesignLevelAndTable_WhereTheyDoNotGoTogether(double probability, double level, string? code)
    {
        var project = SampleProject.Project;
        var site = project.Site with { Levels = Table, AnnualProbability = probability, DesignStillWaterLevel = level };
        var opening = project.Openings[0] with { SillLevel = level - 0.5 };

        var codes = Design.Evaluate(project with { Site = site, Openings = [opening] }, opening, Library.Empty).Notes
            .Select(n => n.Code).Where(c => c.StartsWith("level-", StringComparison.Ordinal));

        Assert.Equal(code is null ? [] : [code], codes);
    }
}
