using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

/// <summary>
/// EN 10025-2, EN 1993-1-1 Table 3.1 and EN 1993-1-4 Table 2.1 in MPa, and ASTM grades in ksi. Read: S235 and S355 up
/// to 16 mm, A572 and A992 in AISC Design Guide 1; the rest from memory, and marked so in the library.
/// </summary>
public class SteelGradesTests
{
    private static readonly Library Delivered = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    [Theory]
    [InlineData("s235", 235, 360, "read")]
    [InlineData("s235-16-40", 225, 360, "memory")]
    [InlineData("s235-40-80", 215, 360, "memory")]
    [InlineData("s275", 275, 430, "memory")]
    [InlineData("s275-16-40", 265, 410, "memory")]
    [InlineData("s275-40-80", 255, 410, "memory")]
    [InlineData("s355", 355, 490, "read")]
    [InlineData("s355-16-40", 345, 470, "memory")]
    [InlineData("s355-40-80", 335, 470, "memory")]
    [InlineData("s235h", 235, 360, "memory")]
    [InlineData("s275h", 275, 430, "memory")]
    [InlineData("s355h", 355, 510, "memory")]
    [InlineData("en-1-4301-strip", 230, 540, "memory")]
    [InlineData("en-1-4301-plate", 210, 520, "memory")]
    [InlineData("en-1-4401-strip", 240, 530, "memory")]
    [InlineData("en-1-4401-plate", 220, 520, "memory")]
    [InlineData("en-1-4404-strip", 240, 530, "memory")]
    [InlineData("en-1-4404-plate", 220, 520, "memory")]
    public void EuropeanGrade_YieldAndUltimate(string id, double yield, double ultimate, string evidence)
    {
        var entry = Delivered.Materials[id];

        Assert.Equal(yield, entry.Item.BendingStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(ultimate, entry.Item.UltimateStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(evidence, entry.Evidence);
    }

    [Theory]
    [InlineData("astm-a36", 36, 58, "memory")]
    [InlineData("astm-a500-b", 46, 58, "memory")]
    [InlineData("astm-a500-c", 50, 62, "memory")]
    [InlineData("astm-a572-50", 50, 65, "read")]
    [InlineData("astm-a992", 50, 65, "read")]
    [InlineData("astm-304", 30, 75, "memory")]
    [InlineData("astm-316", 30, 75, "memory")]
    public void AmericanGrade_YieldAndUltimateInKsi(string id, double yield, double ultimate, string evidence)
    {
        var entry = Delivered.Materials[id];

        Assert.Equal(yield, Ksi(entry.Item.BendingStrength), tolerance: 0.001);
        Assert.Equal(ultimate, Ksi(entry.Item.UltimateStrength), tolerance: 0.001);
        Assert.Equal(evidence, entry.Evidence);
    }

    private static double Ksi(double? stress) => Units.FromSI(stress!.Value, Dimension.Stress, UnitSystem.USCustomary);
}
