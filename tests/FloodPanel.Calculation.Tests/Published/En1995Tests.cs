using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// EN 1995-1-1: X_d = k_mod·X_k/γ_M (2.4.1) with k_mod = 0.70 (Table 3.1, solid timber, service class 3, short term)
/// and γ_M = 1.30 (Table 2.3); strengths of EN 338:2016, Tables 1 and 3. Figures read in public transcriptions; the
/// quotients worked by hand.
/// </summary>
public class En1995Tests
{
    /// <summary>C16 16 and 3.2, C24 24 and 4.0, D30 30 and 3.9 MPa.</summary>
    [Theory]
    [InlineData(16, 3.2, 8.62, 1.72)]
    [InlineData(24, 4.0, 12.92, 2.15)]
    [InlineData(30, 3.9, 16.15, 2.10)]
    public void Section241_StrengthClasses_DesignStrengths(
        double bendingMpa, double shearMpa, double designBendingMpa, double designShearMpa)
    {
        var timber = new Material
        {
            Family = MaterialFamily.Timber,
            BendingStrength = bendingMpa * 1e6,
            ShearStrength = shearMpa * 1e6,
        };

        var bending = DesignStress.Bending(timber, DesignBases.Eurocode)!.Value / 1e6;
        var shear = DesignStress.Shear(timber, DesignBases.Eurocode)!.Value / 1e6;

        Assert.Equal(designBendingMpa, bending, tolerance: 0.005);
        Assert.Equal(designShearMpa, shear, tolerance: 0.005);
    }
}
