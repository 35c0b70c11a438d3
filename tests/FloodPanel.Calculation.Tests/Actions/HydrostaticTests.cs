using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Tests.Actions;

public class HydrostaticTests
{
    [Theory]
    [InlineData(989.9)]
    [InlineData(1400.1)]
    [InlineData(double.NaN)]
    public void UnitWeight_DensityOutOfRange_Throws(double density) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Hydrostatic.UnitWeight(density));

    /// <summary>g = 9.80665 m/s² exactly, standard gravity.</summary>
    [Fact]
    public void UnitWeight_FreshWater_StandardGravity() => Hand.Equal(9_806.65, Hydrostatic.UnitWeight(1000));

    [Theory]
    [InlineData(0)]
    [InlineData(-0.4)]
    public void Side_NoDepth_NoHeightAndNoForce(double depth)
    {
        var piece = Hydrostatic.Side(10_000, depth, height: 1, factor: 1);

        Assert.Equal(0, piece.Height);
        Assert.Equal(0, piece.Force);
    }

    [Fact]
    public void Side_HigherThanTheBarrier_Trapezoid()
    {
        var piece = Hydrostatic.Side(10_000, depth: 1.5, height: 1, factor: 1.35);

        Assert.Equal(new PressurePiece(0, 1, 15_000, 5_000, 1.35), piece);
    }
}
