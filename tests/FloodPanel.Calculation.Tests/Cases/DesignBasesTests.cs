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
        var (floodSide, protectedSide, brimFull) = HandFactors.Of(kind, zone);

        var factors = DesignBases.Of(kind).For(zone);

        Assert.Equal(new LoadFactors(floodSide, protectedSide, brimFull), factors);
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
        Hand.Equal(factor, DesignBases.Of(kind).For(family)!.Factor);

    [Theory]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Timber)]
    [InlineData(DesignBasisKind.AllowableStress, MaterialFamily.Composite)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Timber)]
    [InlineData(DesignBasisKind.UsStrength, MaterialFamily.Composite)]
    [InlineData(DesignBasisKind.Eurocode, MaterialFamily.Composite)]
    public void For_FamilyNotCovered_NoRule(DesignBasisKind kind, MaterialFamily family) =>
        Assert.Null(DesignBases.Of(kind).For(family));

    [Fact]
    public void Of_UnknownKind_Throws() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => DesignBases.Of((DesignBasisKind)9));

    /// <summary>Each log's design load is the flood side and the protected side, each with its factor of the table.</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void LineLoad_AnyOpening_FactoredByTheTable(Scenario scenario)
    {
        var cos = scenario.Model.CosRake;
        Assert.All(scenario.Result.Cases, @case =>
        {
            var water = new HandWater(scenario, @case.Name);
            Assert.All(@case.Logs, log =>
            {
                var design = water.Integral(water.Design, log.Bottom, log.Top) / cos;
                var terms = water.Integral(z => water.FloodSide(z) + water.ProtectedSide(z) + water.Flow(z), log.Bottom, log.Top) / cos;
                Assert.Equal(design, log.LineLoad, tolerance: 1e-11 * terms);
            });
        });
    }
}
