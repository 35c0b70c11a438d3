using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.ProjectTree;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.PostBases;

public class BasePlatesTests
{
    private static readonly DesignBasis[] Bases = [DesignBases.AllowableStress, DesignBases.UsStrength, DesignBases.Eurocode];

    /// <summary>Forces and moments balance, whatever the plate and its load.</summary>
    [Property(MaxTest = 500)]
    public Property Respond_AnyLoad_IsInEquilibrium() => Prop.ForAll(Loaded(), loaded =>
    {
        var (plate, axial, moment, basis) = loaded;

        var response = BasePlates.Respond(plate, axial, moment, 0, basis);

        var pressed = response.Bearing * plate.Width * response.BlockLength;
        var scale = Math.Abs(axial) + moment / plate.RodDistance + 1;
        var aboutMiddle = pressed * (plate.Length - response.BlockLength) / 2 + (response.Tension - response.OtherTension) * plate.RodDistance;
        var tension = response.Tension + response.OtherTension;
        return (!response.IsBalanced
            || (Math.Abs(pressed - tension - axial) <= 1e-9 * scale && Math.Abs(aboutMiddle - moment) <= 1e-9 * scale * plate.Length))
            .Label($"{response}");
    });

    /// <summary>EN 1993-1-8, 6.2.5(7): C25/30, A2 = A1: 2/3·25/1.5 = 11.11 MPa; A2 = 4·A1: 22.22 MPa. Worked by hand.</summary>
    [Theory]
    [InlineData(1, 11.111111111)]
    [InlineData(4, 22.222222222)]
    [InlineData(9, 33.333333333)]
    public void Bearing_Eurocode_ByHand(double areaRatio, double expected) =>
        Assert.Equal(expected, ConcreteBearing.Strength(25e6, areaRatio, DesignBasisKind.Eurocode) / 1e6, tolerance: 1e-8);

    [Fact]
    public void Respond_MomentTooGreatForTheConcrete_IsNotBalanced()
    {
        var plate = new BasePlateInput { Length = 0.3, Width = 0.2, RodDistance = 0.11, ConcreteStrength = 25e6 };

        // q·(f + N/2)²/2 = 11.11 MPa·0.2 m·0.26²/2 = 75.1 kN·m
        Assert.True(BasePlates.Respond(plate, 0, 75e3, 0, DesignBases.Eurocode).IsBalanced);
        Assert.False(BasePlates.Respond(plate, 0, 75.2e3, 0, DesignBases.Eurocode).IsBalanced);
    }

    [Fact]
    public void Respond_NothingActs_NothingAnswers()
    {
        var response = BasePlates.Respond(new BasePlateInput(), 0, 0, 0, DesignBases.Eurocode);

        Assert.Equal((0, 0, 0, 0), (response.Tension, response.BlockLength, response.Bearing, response.ShearPerRod));
    }

    private static Arbitrary<(BasePlateInput Plate, double Axial, double Moment, DesignBasis Basis)> Loaded() => (
        from length in Generated.Numbers.From(0.2, 0.6)
        from width in Generated.Numbers.From(0.1, 0.5)
        from part in Generated.Numbers.From(0.2, 0.95)
        from axial in Gen.OneOf(Gen.Constant(0.0), Generated.Numbers.From(-200e3, 200e3, 10))
        from moment in Generated.Numbers.From(0, 60e3, 10)
        from basis in Gen.Elements(Bases)
        select (new BasePlateInput { Length = length, Width = width, RodDistance = part * length / 2 }, axial, moment, basis)).ToArbitrary();
}
