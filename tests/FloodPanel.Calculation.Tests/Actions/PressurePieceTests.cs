using FloodPanel.Calculation.Actions;
using FsCheck;
using FsCheck.Xunit;
using MathNet.Numerics.Integration;

namespace FloodPanel.Calculation.Tests.Actions;

public class PressurePieceTests
{
    /// <summary>p = 6 − 2·z between 1 and 2, by hand: ∫p = 3, ∫p·z = 13/3, ∫p·z² = 6.5, ∫p·z³ = 10.1.</summary>
    [Fact]
    public void Integrals_StraightPressure_ByHand()
    {
        var piece = new PressurePiece(1, 2, 4, 2, 1);

        Hand.Equal(3, piece.Force);
        Hand.Equal(13.0 / 3, piece.FirstMoment);
        Hand.Equal(6.5, piece.SecondMoment);
        Hand.Equal(10.1, piece.ThirdMoment);
    }

    [Property]
    public void Integrals_AnyPiece_AgreeWithQuadrature(NormalFloat bottom, NormalFloat height, NormalFloat atBottom, NormalFloat atTop)
    {
        var from = bottom.Get % 10;
        var piece = new PressurePiece(from, from + 0.01 + Math.Abs(height.Get % 10), atBottom.Get % 1e4, atTop.Get % 1e4, 1);
        var scale = (Math.Abs(piece.AtBottom) + Math.Abs(piece.AtTop)) * piece.Height;
        var reach = Math.Max(Math.Abs(piece.Bottom), Math.Abs(piece.Top));

        double Quadrature(int power) =>
            GaussLegendreRule.Integrate(z => piece.At(z) * Math.Pow(z, power), piece.Bottom, piece.Top, order: 5);

        Assert.Equal(Quadrature(0), piece.Force, tolerance: 1e-12 * scale);
        Assert.Equal(Quadrature(1), piece.FirstMoment, tolerance: 1e-12 * scale * reach);
        Assert.Equal(Quadrature(2), piece.SecondMoment, tolerance: 1e-12 * scale * Math.Pow(reach, 2));
        Assert.Equal(Quadrature(3), piece.ThirdMoment, tolerance: 1e-12 * scale * Math.Pow(reach, 3));
    }

    [Fact]
    public void At_EndsInsideAndOutside_StraightLineThenNothing()
    {
        var piece = new PressurePiece(1, 3, 100, 300, 1);

        Assert.Equal([0, 100, 200, 300, 0], new[] { 0.999, 1, 2, 3, 3.001 }.Select(piece.At));
    }

    /// <summary>Parts keep the line of pressure and the factor.</summary>
    [Theory]
    [InlineData(1.5, 2, 1.5, 2, 150, 200)]
    [InlineData(0, 2, 1, 2, 100, 200)]
    [InlineData(2, 9, 2, 3, 200, 300)]
    [InlineData(0, 9, 1, 3, 100, 300)]
    public void Within_Band_CutsThePiece(double bottom, double top, double from, double to, double atFrom, double atTo)
    {
        var part = new PressurePiece(1, 3, 100, 300, 1.35).Within(bottom, top);

        Assert.Equal(new PressurePiece(from, to, atFrom, atTo, 1.35), part);
    }

    [Theory]
    [InlineData(0, 0.5)]
    [InlineData(3, 4)]
    [InlineData(4, 5)]
    public void Within_BandThatDoesNotMeetIt_NoHeightAndNoForce(double bottom, double top)
    {
        var part = new PressurePiece(1, 3, 100, 300, 1).Within(bottom, top);

        Assert.Equal(0, part.Height);
        Assert.Equal(0, part.Force);
    }
}
