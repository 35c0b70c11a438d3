using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Aluminum Association, Aluminum Design Manual 2020, Part VII: allowable stresses at yield for building-type
/// structures, safety factor 1.65. Read in a stored copy.
/// </summary>
public class AluminumDesignManualTests
{
    /// <summary>Compressive yield 35 ksi (6061-T6) and 25 ksi (6063-T6); printed allowables 21.2 and 15.2 ksi.</summary>
    [Theory]
    [InlineData(35, 21.2)]
    [InlineData(25, 15.2)]
    public void PartVII_Extrusions_AllowableStressAtYield(double yieldKsi, double printedKsi)
    {
        var alloy = new Material
        {
            Family = MaterialFamily.Aluminium,
            BendingStrength = Units.ToSI(yieldKsi, Dimension.Stress, UnitSystem.USCustomary),
        };

        var stress = DesignStress.Bending(alloy, DesignBases.AllowableStress)!.Value;

        Assert.Equal(printedKsi, Units.FromSI(stress, Dimension.Stress, UnitSystem.USCustomary), tolerance: 0.05);
    }
}
