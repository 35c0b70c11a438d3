using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

/// <summary>
/// EN 1999-1-1:2007 (+A1), Table 3.2b, extruded profiles: f_o, f_u, f_o,haz and f_u,haz in MPa, the ratios
/// ρ_o,haz = f_o,haz/f_o and ρ_u,haz = f_u,haz/f_u as the table prints them in columns of their own, and the buckling
/// class. Read in a copy of the table, but EN AW-6082, which is from memory.
/// </summary>
public class En1999StrengthsTests
{
    private static readonly Library Delivered = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    [Theory]
    [InlineData("en-aw-6060-t5", 120, 160, 50, 80, 0.42, 0.50, BucklingClass.B)]
    [InlineData("en-aw-6060-t5-25", 100, 140, 50, 80, 0.50, 0.57, BucklingClass.B)]
    [InlineData("en-aw-6060-t6", 140, 170, 60, 100, 0.43, 0.59, BucklingClass.A)]
    [InlineData("en-aw-6060-t64", 120, 180, 60, 100, 0.50, 0.56, BucklingClass.A)]
    [InlineData("en-aw-6060-t66-3", 160, 215, 65, 110, 0.41, 0.51, BucklingClass.A)]
    [InlineData("en-aw-6060-t66", 150, 195, 65, 110, 0.43, 0.56, BucklingClass.A)]
    [InlineData("en-aw-6061-t6", 240, 260, 115, 175, 0.48, 0.67, BucklingClass.A)]
    [InlineData("en-aw-6063-t5", 130, 175, 60, 100, 0.46, 0.57, BucklingClass.B)]
    [InlineData("en-aw-6063-t5-25", 110, 160, 60, 100, 0.55, 0.63, BucklingClass.B)]
    [InlineData("en-aw-6063-t6", 160, 195, 65, 110, 0.41, 0.56, BucklingClass.A)]
    [InlineData("en-aw-6063-t66", 200, 245, 75, 130, 0.38, 0.53, BucklingClass.A)]
    [InlineData("en-aw-6063-t66-25", 180, 225, 75, 130, 0.42, 0.58, BucklingClass.A)]
    [InlineData("en-aw-6005a-t6-open-5", 225, 270, 115, 165, 0.51, 0.61, BucklingClass.A)]
    [InlineData("en-aw-6005a-t6-open-10", 215, 260, 115, 165, 0.53, 0.63, BucklingClass.A)]
    [InlineData("en-aw-6005a-t6-open", 200, 250, 115, 165, 0.58, 0.66, BucklingClass.A)]
    [InlineData("en-aw-6005a-t6-hollow-5", 215, 255, 115, 165, 0.53, 0.65, BucklingClass.A)]
    [InlineData("en-aw-6005a-t6", 200, 250, 115, 165, 0.58, 0.66, BucklingClass.A)]
    [InlineData("en-aw-6082-t6", 250, 290, 125, 185, 0.50, 0.64, BucklingClass.A)]
    [InlineData("en-aw-6082-t6-15", 260, 310, 125, 185, 0.48, 0.60, BucklingClass.A)]
    [InlineData("en-aw-6082-t5", 230, 270, 125, 185, 0.54, 0.69, BucklingClass.B)]
    public void Table32b_Row_StrengthsRatiosAndClass(
        string id, double yield, double ultimate, double weldedYield, double weldedUltimate, double yieldRatio, double ultimateRatio, BucklingClass buckling)
    {
        var alloy = Delivered.Materials[id].Item;

        Assert.Equal(yield, alloy.BendingStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(ultimate, alloy.UltimateStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(weldedYield, alloy.WeldedYield!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(weldedUltimate, alloy.WeldedUltimate!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(yieldRatio, alloy.WeldedYield.Value / alloy.BendingStrength.Value, tolerance: 0.005 + 1e-9);
        Assert.Equal(ultimateRatio, alloy.WeldedUltimate.Value / alloy.UltimateStrength.Value, tolerance: 0.005 + 1e-9);
        Assert.Equal(buckling, alloy.BucklingClass);
    }

    /// <summary>A hollow profile takes a lower row than an open one of the same thickness.</summary>
    [Fact]
    public void Table32b_6005A_HollowIsBelowOpen() => Assert.True(
        Delivered.Materials["en-aw-6005a-t6-hollow-5"].Item.BendingStrength < Delivered.Materials["en-aw-6005a-t6-open-5"].Item.BendingStrength);

    [Fact]
    public void Table32b_6082_IsMarkedAsFromMemory() => Assert.All(
        Delivered.Materials.Values,
        m => Assert.True(!m.Id.StartsWith("en-aw-", StringComparison.Ordinal) || (m.Evidence == "memory") == m.Id.Contains("6082")));
}
