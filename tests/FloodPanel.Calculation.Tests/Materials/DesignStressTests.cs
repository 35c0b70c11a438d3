using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Materials;

public class DesignStressTests
{
    private static readonly Material Steel = new()
    {
        Family = MaterialFamily.Steel,
        BendingStrength = 275e6,
        ShearStrength = 158e6,
    };

    [Fact]
    public void Bending_StrengthWithARule_StrengthTimesItsFactor()
    {
        var stress = DesignStress.Bending(Steel, DesignBases.UsStrength)!;

        Hand.Equal(247.5e6, stress.Value);
        Assert.Equal(275e6, stress.Strength);
        Assert.Equal("0.90·f_k", stress.Formula);
    }

    [Fact]
    public void Shear_StrengthWithARule_StrengthTimesItsFactor() =>
        Hand.Equal(158e6 / 1.67, DesignStress.Shear(Steel, DesignBases.AllowableStress)!.Value);

    [Fact]
    public void Bending_AllowableTyped_WinsAsItIs()
    {
        var stress = DesignStress.Bending(Steel with { AllowableBending = 99e6 }, DesignBases.Eurocode)!;

        Assert.Equal(99e6, stress.Value);
        Assert.Null(stress.Strength);
        Assert.Empty(stress.Formula);
        Assert.Contains("typed", stress.Source, StringComparison.Ordinal);
    }

    [Fact]
    public void Bending_FamilyWithoutARule_NoneButAnAllowable()
    {
        var timber = Steel with { Family = MaterialFamily.Timber };

        Assert.Null(DesignStress.Bending(timber, DesignBases.AllowableStress));
        Assert.NotNull(DesignStress.Bending(timber with { AllowableBending = 10e6 }, DesignBases.AllowableStress));
    }

    [Fact]
    public void Shear_NoStrength_None()
    {
        Assert.Null(DesignStress.Shear(Steel with { ShearStrength = null }, DesignBases.Eurocode));
        Assert.NotNull(DesignStress.Bending(Steel with { ShearStrength = null }, DesignBases.Eurocode));
    }
}
