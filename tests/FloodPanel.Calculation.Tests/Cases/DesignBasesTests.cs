using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Cases;

public class DesignBasesTests
{
    public static TheoryData<DesignBasisKind, FloodZone> Rows => new MatrixTheoryData<DesignBasisKind, FloodZone>(
        Enum.GetValues<DesignBasisKind>(), Enum.GetValues<FloodZone>());

    [Theory]
    [MemberData(nameof(Rows))]
    public void For_BasisAndZone_LoadFactorsOfTheTable(DesignBasisKind kind, FloodZone zone)
    {
        Assert.Equal(HandFactors.Of(kind, zone), Of(kind).For(zone));
    }

    /// <summary>
    /// ADM 2020 1.65 and 0.90 (the latter from memory), AISC 360 1.67 and 0.90, EN 1999-1-1 1.10 and EN 1993-1-1 1.00
    /// (from memory), EN 1995-1-1 0.70/1.30.
    /// </summary>
    [Theory]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Aluminium, 1 / 1.65)]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Steel, 1 / 1.67)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Aluminium, 0.90)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Steel, 0.90)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Aluminium, 1 / 1.10)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Steel, 1.00)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Timber, 0.70 / 1.30)]
    public void For_FamilyCovered_StrengthFactor(DesignBasisKind kind, MaterialFamily family, double factor) =>
        Hand.Equal(factor, Of(kind).For(family)!.Factor);

    [Theory]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Timber)]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Composite)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Timber)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Composite)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Composite)]
    public void For_FamilyNotCovered_NoRule(DesignBasisKind kind, MaterialFamily family) =>
        Assert.Null(Of(kind).For(family));

    [Theory]
    [InlineData(1, 1.65, "f_k/1.65")]
    [InlineData(0.9, 1, "0.90·f_k")]
    [InlineData(1, 1, "f_k/1.00")]
    [InlineData(0.7, 1.3, "0.70·f_k/1.30")]
    [InlineData(0.625, 1.175, "0.625·f_k/1.175")]
    public void Formula_Rule_AsWritten(double multiplier, double divisor, string formula) =>
        Assert.Equal(formula, new StrengthRule(MaterialFamily.Steel, multiplier, divisor, "").Formula);

    [Fact]
    public void BasisOf_OwnCopy_WinsOverTheNamedOne()
    {
        var own = DesignBases.Eurocode with { Title = "Own" };

        Assert.Same(DesignBases.UsStrength, Library.Empty.BasisOf(new() { DesignBasis = DesignBasisKind.UsStrength }));
        Assert.Same(own, Library.Empty.BasisOf(new() { DesignBasis = DesignBasisKind.Eurocode, OwnBasis = own }));
    }

    /// <summary>Each log's design load is the flood side and the protected side, each with its factor of the table.</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void LineLoad_AnyOpening_FactoredByTheTable(Scenario scenario)
    {
        var cos = scenario.Model.CosRake;
        Assert.All(scenario.Result.Cases, @case =>
        {
            var water = new HandWater(scenario, @case.Name);
            Assert.All(@case.Logs.Where(_ => water.Knows), log =>
            {
                var design = water.Integral(water.Design, log.Bottom, log.Top) / cos;
                var terms = water.Integral(water.Terms, log.Bottom, log.Top) / cos;
                Assert.Equal(design, log.LineLoad, tolerance: 1e-11 * terms);
            });
        });
    }

    private static DesignBasis Of(DesignBasisKind kind) => DesignBases.Standard.Single(b => b.Kind == kind);
}
