using FloodPanel.Calculation.Verification;

namespace FloodPanel.Calculation.Tests;

/// <summary>The table that a checking engineer is shown is itself a test: every row must agree.</summary>
public class VerificationTableTests
{
    public static TheoryData<string, string> Rows { get; } =
        new(VerificationTable.Rows().Select(row => (row.Source, row.Quantity)));

    [Theory]
    [MemberData(nameof(Rows))]
    public void Row_EachSourceAndQuantity_AgreesToHalfTheLastPrintedDigitOrIsExplained(string source, string quantity)
    {
        var row = VerificationTable.Rows().Single(r => r.Source == source && r.Quantity == quantity);

        Assert.True(row.Agrees, $"published {row.Published}, computed {row.Computed:R}, allowed {row.Allowed:R}");
        Assert.Equal(row.Explained > 0, row.Remark.Length > 0);
    }

    [Theory]
    [InlineData("0.300", 0.3004, true)]
    [InlineData("0.300", 0.30051, false)]
    [InlineData("800", 800.49, true)]
    [InlineData("800", 800.51, false)]
    public void Agrees_PrintedDigits_SetWhatIsAllowed(string published, double computed, bool agrees) =>
        Assert.Equal(agrees, new VerificationRow("", "", "", published, computed, Evidence.Derived).Agrees);

    [Fact]
    public void Agrees_ExplainedDifference_IsAllowedBesides()
    {
        var row = new VerificationRow("", "", "", "100", 101, Evidence.Read, Explained: 0.006, "rounded in the source");

        Assert.True(row.Agrees);
        Assert.False((row with { Computed = 101.2 }).Agrees);
    }
}
