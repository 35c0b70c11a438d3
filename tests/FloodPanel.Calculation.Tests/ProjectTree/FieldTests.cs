using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.ProjectTree;

public class FieldTests
{
    private static readonly Field Closed = new("gap", "Gap", Dimension.Length, 0.3048, 3.048, "");

    private static readonly Field Open = Closed with { Minimum = 0, MinimumExcluded = true };

    [Theory]
    [InlineData(0.3048)]
    [InlineData(3.048)]
    public void Refusal_AtEitherLimit_Accepted(double value) => Assert.Null(Closed.Refusal(value));

    [Fact]
    public void Refusal_BelowTheLeast_NamesFieldValueAndRangeInBothSystems()
    {
        var sentence = Closed.Refusal(0.3)!;

        Assert.Equal("Gap is 0.3 m; allowed is 0.305 m to 3.048 m.", sentence.In(UnitSystem.SI));
        Assert.Equal("Gap is 0.984251969 ft; allowed is 1.00 ft to 10.00 ft.", sentence.In(UnitSystem.USCustomary));
    }

    [Fact]
    public void Refusal_AtAnExcludedLeast_SaysAbove() =>
        Assert.Equal("Gap is 0 m; allowed is above 0.000 m and at most 3.048 m.", Open.Refusal(0)!.In(UnitSystem.SI));

    /// <summary>A value that rounds to the limit must not be refused as the limit itself.</summary>
    [Fact]
    public void Refusal_JustAboveTheGreatest_ShowsTheDifference() =>
        Assert.StartsWith("Gap is 3.0480001 m;", Closed.Refusal(3.0480001)!.In(UnitSystem.SI), StringComparison.Ordinal);

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void Refusal_NotFinite_Refused(double value)
    {
        Assert.NotNull(Closed.Refusal(value));
        Assert.NotNull(Open.Refusal(value));
    }

    [Fact]
    public void Allowed_ClosedAndOpen_InWords()
    {
        Assert.Equal("from 1.00 ft to 10.00 ft", Closed.Allowed.In(UnitSystem.USCustomary));
        Assert.Equal("above 0.000 m and at most 3.048 m", Open.Allowed.In(UnitSystem.SI));
    }

    /// <summary>Every field of the project: finite limits in order, a label, a sentence of help, and each limit on its own side.</summary>
    [Fact]
    public void Fields_All_AcceptTheirLimitsAndRefuseBeyond()
    {
        var fields = typeof(Fields).GetProperties().Select(p => (Field)p.GetValue(null)!).ToArray();

        Assert.NotEmpty(fields);
        Assert.All(fields, field =>
        {
            Assert.True(double.IsFinite(field.Minimum) && field.Minimum < field.Maximum && double.IsFinite(field.Maximum));
            Assert.Equal(field.MinimumExcluded, field.Refusal(field.Minimum) is not null);
            Assert.Null(field.Refusal(field.Maximum));
            Assert.NotNull(field.Refusal(Math.BitDecrement(field.Minimum)));
            Assert.NotNull(field.Refusal(Math.BitIncrement(field.Maximum)));
            Assert.NotNull(field.Refusal(double.NaN));
            Assert.NotNull(field.Refusal(double.PositiveInfinity));
            Assert.Contains(field.Label, field.Refusal(double.NaN)!.In(UnitSystem.USCustomary), StringComparison.Ordinal);
            Assert.EndsWith(".", field.Help, StringComparison.Ordinal);
        });
    }
}
