using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// National Design Specification for Wood Construction, Table 2.3.2 and Supplement, Tables 4A and 4D: adjustment of reference
/// values. Two months 1.15 and the wet service factors 0.85 and 0.97 read in public text, the others from memory.
/// </summary>
public class NdsTests
{
    private const double Psi = 6894.757293168;
    private const double Inch = 0.0254;

    [Theory]
    [InlineData(LoadDuration.Permanent, 0.9)]
    [InlineData(LoadDuration.LongTerm, 1.0)]
    [InlineData(LoadDuration.MediumTerm, 1.15)]
    [InlineData(LoadDuration.ShortTerm, 1.25)]
    [InlineData(LoadDuration.Instantaneous, 1.6)]
    public void Table232_Durations_Factor(LoadDuration duration, double printed) =>
        Assert.Equal(printed, TimberFactors.Duration(duration));

    /// <summary>C_M 0.85 on bending of lumber 2 to 4 in thick, 1.0 where F_b·C_F is at most 1150 psi and for timbers from 5 in; 0.97 and 1.0 on shear.</summary>
    [Theory]
    [InlineData(1200, 1.0, 3.5, 0.85, 0.97)]
    [InlineData(1000, 1.2, 1.5, 0.85, 0.97)]
    [InlineData(1150, 1.0, 3.5, 1.0, 0.97)]
    [InlineData(1500, 1.0, 5.5, 1.0, 1.0)]
    public void Supplement_WetService_Factors(double referencePsi, double sizeFactor, double leastInches, double bending, double shear)
    {
        Assert.Equal(bending, TimberFactors.WetBending(referencePsi * Psi, sizeFactor, leastInches * Inch));
        Assert.Equal(shear, TimberFactors.WetShear(leastInches * Inch));
    }

    /// <summary>Worked by hand: F_b 1200 psi, C_F 1.2, seven days: 1200·1.25·0.85·1.2 = 1530 psi; F_v 180 psi: 180·1.25·0.97 = 218.25 psi.</summary>
    [Fact]
    public void Plank_SevenDaysWet_AdjustedValues()
    {
        var lumber = new Material
        {
            Family = MaterialFamily.Timber,
            BendingStrength = 1200 * Psi,
            ShearStrength = 180 * Psi,
            CrossCompression = 625 * Psi,
            Reference = StrengthReference.NdsReference,
        };
        var profile = new Rectangle { Height = 9.25 * Inch, Depth = 2.5 * Inch };
        var stack = new LogStack { Timber = new() { SizeFactor = 1.2 } };

        Assert.Equal(1530, LogStress.Bending(lumber, profile, stack, DesignBases.AllowableStress)!.Value / Psi, tolerance: 1e-9);
        Assert.Equal(218.25, LogStress.Shear(lumber, profile, stack, DesignBases.AllowableStress)!.Value / Psi, tolerance: 1e-9);
        Assert.Equal(0.67 * 625, LogStress.Across(lumber, stack, DesignBases.AllowableStress)!.Value / Psi, tolerance: 1e-9);
    }

    [Fact]
    public void ReferenceValues_OtherBasesOrNoDuration_AreNotCovered()
    {
        var lumber = new Material { Family = MaterialFamily.Timber, BendingStrength = 1200 * Psi, Reference = StrengthReference.NdsReference };
        var (profile, chosen) = (new Rectangle { Height = 0.2, Depth = 0.05 }, new LogStack { Timber = new() });

        Assert.Null(LogStress.Bending(lumber, profile, new LogStack(), DesignBases.AllowableStress));
        Assert.Null(LogStress.Bending(lumber, profile, chosen, DesignBases.Eurocode));
        Assert.Null(LogStress.Bending(lumber, profile, chosen, DesignBases.UsStrength));
        Assert.Null(DesignStress.Bending(lumber, DesignBases.Eurocode));
    }
}
