using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

/// <summary>NDS Supplement, Tables 4A, 4B and 4D, reference design values in psi: F_b, F_v, F_c⊥, E. All from memory.</summary>
public class NdsReferenceValuesTests
{
    private static readonly Library Delivered = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    [Theory]
    [InlineData("nds-dfl-ss", 1500, 180, 625, 1.9e6)]
    [InlineData("nds-dfl-no1", 1000, 180, 625, 1.7e6)]
    [InlineData("nds-dfl-no2", 900, 180, 625, 1.6e6)]
    [InlineData("nds-sp-no1-2x4", 1500, 175, 565, 1.6e6)]
    [InlineData("nds-sp-no1-2x6", 1350, 175, 565, 1.6e6)]
    [InlineData("nds-sp-no1-2x8", 1250, 175, 565, 1.6e6)]
    [InlineData("nds-sp-no1-2x10", 1050, 175, 565, 1.6e6)]
    [InlineData("nds-sp-no1-2x12", 1000, 175, 565, 1.6e6)]
    [InlineData("nds-sp-no2-2x4", 1100, 175, 565, 1.4e6)]
    [InlineData("nds-sp-no2-2x6", 1000, 175, 565, 1.4e6)]
    [InlineData("nds-sp-no2-2x8", 925, 175, 565, 1.4e6)]
    [InlineData("nds-sp-no2-2x10", 800, 175, 565, 1.4e6)]
    [InlineData("nds-sp-no2-2x12", 750, 175, 565, 1.4e6)]
    [InlineData("nds-dfl-no1-beams", 1350, 170, 625, 1.6e6)]
    [InlineData("nds-dfl-no1-posts", 1200, 170, 625, 1.6e6)]
    [InlineData("nds-sp-no1-5x5", 1350, 165, 375, 1.5e6)]
    [InlineData("nds-sp-no2-5x5", 850, 165, 375, 1.2e6)]
    public void Grade_ReferenceValuesInPsi(string id, double bending, double shear, double acrossGrain, double modulus)
    {
        var entry = Delivered.Materials[id];

        Assert.Equal(bending, Psi(entry.Item.BendingStrength), tolerance: 0.05);
        Assert.Equal(shear, Psi(entry.Item.ShearStrength), tolerance: 0.05);
        Assert.Equal(acrossGrain, Psi(entry.Item.CrossCompression), tolerance: 0.05);
        Assert.Equal(modulus, Psi(entry.Item.ElasticModulus), tolerance: 1000);
        Assert.Equal((StrengthReference.NdsReference, "memory"), (entry.Item.Reference, entry.Evidence));
    }

    /// <summary>Only these are reference values; a characteristic strength adjusted by the factors of the NDS would be unsafe.</summary>
    [Fact]
    public void Reference_EveryOtherMaterial_IsCharacteristic() => Assert.All(
        Delivered.Materials.Values,
        m => Assert.Equal(m.Id.StartsWith("nds-", StringComparison.Ordinal), m.Item.Reference == StrengthReference.NdsReference));

    private static double Psi(double? stress) => 1000 * Units.FromSI(stress!.Value, Dimension.Stress, UnitSystem.USCustomary);
}
