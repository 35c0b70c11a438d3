using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation.Tests.Water;

/// <summary>Risk over a number of years, 1 − (1 − p)ⁿ (common practice); figures recomputed outside this code.</summary>
public class ExceedanceRiskTests
{
    [Theory]
    [InlineData(0.01, 30, 26.0)]
    [InlineData(0.01, 50, 39.5)]
    [InlineData(0.01, 100, 63.4)]
    [InlineData(0.002, 50, 9.5)]
    [InlineData(0.02, 25, 39.7)]
    public void Of_Years_PerCent(double probability, double years, double percent) =>
        Assert.Equal(percent, 100 * ExceedanceRisk.Of(probability, years), tolerance: 0.05);

    [Theory]
    [InlineData(0.01, 30, "about 1 in 4 over 30 years")]
    [InlineData(0.01, 50, "about 2 in 5 over 50 years")]
    [InlineData(0.01, 100, "about 2 in 3 over 100 years")]
    [InlineData(0.002, 50, "about 1 in 10 over 50 years")]
    [InlineData(0.02, 30, "about 1 in 2 over 30 years")]
    [InlineData(0.0002, 30, "about 1 in 170 over 30 years")]
    [InlineData(0.5, 10, "almost certain over 10 years")]
    [InlineData(0.01, 1, "about 1 in 100 in a year")]
    [InlineData(0, 30, "none over 30 years")]
    public void InWords_Risk_AsItIsSaid(double probability, double years, string words) =>
        Assert.Equal(words, ExceedanceRisk.InWords(probability, years));

    [Theory]
    [InlineData(-0.01, 30)]
    [InlineData(1.01, 30)]
    [InlineData(double.NaN, 30)]
    [InlineData(0.01, -1)]
    [InlineData(0.01, double.PositiveInfinity)]
    public void Of_OutOfRange_Throws(double probability, double years) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ExceedanceRisk.Of(probability, years));

    /// <summary>0.10 as a lump and 5 mm a year for 40 years: 0.30 m above still water at 4.10 + 0.25.</summary>
    [Fact]
    public void DesignFloodLevel_LumpAndRate_AddUp()
    {
        var site = SampleProject.Project.Site with { ClimateRatePerYear = 0.005, DesignLifeYears = 40 };

        Hand.Equal(0.30, site.TotalClimateAllowance);
        Hand.Equal(4.65, site.DesignFloodLevel);
        Assert.Empty(Steps.StepAudit.Complaints("levels", FloodLevels.DesignLevel(site).Steps));
        Hand.Equal(4.65, FloodLevels.DesignLevel(site).Steps[^1].Value);
    }

    [Fact]
    public void Levels_ThatCannotBe_AreRefusedAtTheirRow()
    {
        Assert.Equal(["site.levels[1].annualProbability"], Paths(new(0.01, 10), new(0.01, 10.2)));
        Assert.Equal(["site.levels[1].annualProbability"], Paths(new(0.007, 10), new(0.7 * 0.01, 10.2)));
        Assert.Equal(["site.levels[1].level"], Paths(new(0.01, 10), new(0.1, 10.2)));
        Assert.Equal(["site.levels[1].level"], Paths(new(0.1, 10), new(0.01, 9.9)));
        Assert.Equal(["site.levels[0].annualProbability"], Paths(new(2, 10), new(0.01, 9.9)));
        Assert.Empty(Paths(new(0.1, 10), new(0.01, 10)));
    }

    private static IEnumerable<string> Paths(params LevelPoint[] levels)
    {
        var project = SampleProject.Project;
        return (project with { Site = project.Site with { Levels = levels.ToValueList() } }).Validate(Library.Empty).Select(p => p.Path);
    }
}
