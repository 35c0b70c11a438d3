namespace FloodPanel.Calculation.Tests;

public class CheckTests
{
    [Theory]
    [InlineData(0, 10, 0, true)]
    [InlineData(9.9, 10, 0.99, true)]
    [InlineData(10, 10, 1, true)]
    [InlineData(10.000001, 10, 1.0000001, false)]
    [InlineData(-1, 10, -0.1, false)]
    public void Utilisation_DemandOverCapacity_PassesFromZeroToOne(double demand, double capacity, double utilisation, bool passes)
    {
        var check = Of(demand, capacity);

        Assert.Equal(utilisation, check.Utilisation, tolerance: 1e-15);
        Assert.Equal(passes, check.Passes);
    }

    [Theory]
    [InlineData(1, 0)]
    [InlineData(0, 0)]
    [InlineData(1, -5)]
    [InlineData(1, double.NaN)]
    public void Utilisation_NothingResists_InfiniteAndFails(double demand, double capacity)
    {
        var check = Of(demand, capacity);

        Assert.Equal(double.PositiveInfinity, check.Utilisation);
        Assert.False(check.Passes);
    }

    [Fact]
    public void Passes_DemandNotANumber_Fails() => Assert.False(Of(double.NaN, 10).Passes);

    [Theory]
    [InlineData(false, 9, true)]
    [InlineData(false, 11, true)]
    [InlineData(true, 9, false)]
    [InlineData(true, 11, true)]
    public void MayGovern_RuleOfDetailing_OnlyWhenItIsBroken(bool isDetailing, double demand, bool governs) =>
        Assert.Equal(governs, (Of(demand, 10) with { IsDetailing = isDetailing }).MayGovern);

    private static Check Of(double demand, double capacity) => new("c", "C", "s", Dimension.Force, demand, capacity, []);
}
