using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

/// <summary>
/// EN 338:2016, Tables 1 and 3, read in a public transcription: f_m,k, f_v,k and f_c,90,k in MPa, E_0,mean in GPa, ρ_k
/// and ρ_mean in kg/m³.
/// </summary>
public class En338Tests
{
    private static readonly Library Delivered = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    [Theory]
    [InlineData("c14", 14, 3.0, 2.0, 7, 290, 350)]
    [InlineData("c16", 16, 3.2, 2.2, 8, 310, 370)]
    [InlineData("c18", 18, 3.4, 2.2, 9, 320, 380)]
    [InlineData("c20", 20, 3.6, 2.3, 9.5, 330, 400)]
    [InlineData("c22", 22, 3.8, 2.4, 10, 340, 410)]
    [InlineData("c24", 24, 4.0, 2.5, 11, 350, 420)]
    [InlineData("c27", 27, 4.0, 2.5, 11.5, 360, 430)]
    [InlineData("c30", 30, 4.0, 2.7, 12, 380, 460)]
    [InlineData("c35", 35, 4.0, 2.7, 13, 390, 470)]
    [InlineData("c40", 40, 4.0, 2.8, 14, 400, 480)]
    [InlineData("c45", 45, 4.0, 2.9, 15, 410, 490)]
    [InlineData("c50", 50, 4.0, 3.0, 16, 430, 520)]
    [InlineData("d18", 18, 3.5, 4.8, 9.5, 475, 570)]
    [InlineData("d24", 24, 3.7, 4.9, 10, 485, 580)]
    [InlineData("d27", 27, 3.8, 5.1, 10.5, 510, 610)]
    [InlineData("d30", 30, 3.9, 5.3, 11, 530, 640)]
    [InlineData("d35", 35, 4.1, 5.4, 12, 540, 650)]
    [InlineData("d40", 40, 4.2, 5.5, 13, 550, 660)]
    [InlineData("d45", 45, 4.4, 5.8, 13.5, 580, 700)]
    [InlineData("d50", 50, 4.5, 6.2, 14, 620, 740)]
    [InlineData("d55", 55, 4.7, 6.6, 15.5, 660, 790)]
    [InlineData("d60", 60, 4.8, 10.5, 17, 700, 840)]
    [InlineData("d65", 65, 5.0, 11.3, 18.5, 750, 900)]
    [InlineData("d70", 70, 5.0, 12.0, 20, 800, 960)]
    public void Class_StrengthsStiffnessAndDensities(
        string id, double bending, double shear, double acrossGrain, double modulus, double characteristicDensity, double density)
    {
        var timber = Delivered.Materials[id].Item;

        Assert.Equal(bending, timber.BendingStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(shear, timber.ShearStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(acrossGrain, timber.CrossCompression!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(modulus, timber.ElasticModulus / 1e9, tolerance: 1e-9);
        Assert.Equal(characteristicDensity, timber.CharacteristicDensity);
        Assert.Equal(density, timber.Density);
    }

    /// <summary>
    /// EN 384 (from memory), from which EN 338 has the values that are not graded: G = E/16; f_c,90,k = 0.007·ρ_k for
    /// softwood, 0.010·ρ_k for hardwood below 700 kg/m³ and 0.015·ρ_k from there on; mean density about 1.2·ρ_k. EN 338
    /// rounds each to two figures.
    /// </summary>
    [Fact]
    public void EveryClass_FollowsTheRelationsOfEn384()
    {
        var classes = Delivered.Materials.Values.Where(m => m.Source.StartsWith("EN 338", StringComparison.Ordinal)).ToList();

        Assert.Equal(24, classes.Count);
        Assert.All(classes, entry =>
        {
            var timber = entry.Item;
            var density = timber.CharacteristicDensity!.Value;
            var factor = entry.Id[0] == 'c' ? 0.007 : density < 700 ? 0.010 : 0.015;
            Assert.Equal(timber.ElasticModulus / 16, timber.ShearModulus!.Value, tolerance: 10e6);
            Assert.Equal(factor * density, timber.CrossCompression!.Value / 1e6, tolerance: 0.055);
            Assert.Equal(1.2 * density, timber.Density, tolerance: 10);
        });
    }
}
