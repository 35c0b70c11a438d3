using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

/// <summary>EN 13706-3:2002, Table 1, read in a public reproduction: E of the full section, flexural strength axial and transverse, interlaminar shear strength.</summary>
public class En13706Tests
{
    [Theory]
    [InlineData("en13706-e23", 23, 240, 100, 25)]
    [InlineData("en13706-e17", 17, 170, 70, 15)]
    public void Table1_Grade_StiffnessAndStrengths(string id, double modulus, double bending, double acrossFibres, double shear)
    {
        var composite = LibraryFiles.Load(LibraryFiles.DeliveredFolder).Materials[id].Item;

        Assert.Equal(modulus, composite.ElasticModulus / 1e9, tolerance: 1e-9);
        Assert.Equal(bending, composite.BendingStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(acrossFibres, composite.CrossStrength!.Value / 1e6, tolerance: 1e-9);
        Assert.Equal(shear, composite.ShearStrength!.Value / 1e6, tolerance: 1e-9);
    }
}
