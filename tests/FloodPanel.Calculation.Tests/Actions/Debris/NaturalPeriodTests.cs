using FloodPanel.Calculation.Actions.Debris;
using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Tests.Actions.Debris;

/// <summary>The first period of a simply supported log against beam elements, which share nothing with the closed form.</summary>
public class NaturalPeriodTests
{
    /// <summary>Twelve elements with consistent mass come within 1e-5 of the exact first mode.</summary>
    [Theory]
    [InlineData(3.6, 43_500, 1.64)]
    [InlineData(45, 120_000, 2.4)]
    public void Of_SimplySupported_AsBeamElements(double lineMass, double stiffness, double span) =>
        Assert.Equal(1, NaturalPeriod.Of(lineMass, stiffness, span) / ByElements(lineMass, stiffness, span), tolerance: 1e-5);

    /// <summary>π·ρ·t²/4: a log of 0.2 m in fresh water moves 31.4 kg/m.</summary>
    [Fact]
    public void AddedMass_TwentyCentimetres_ByHand() => Hand.Equal(Math.PI * 10, NaturalPeriod.AddedMass(1000, 0.2));

    [Theory]
    [InlineData(0, 1, 1)]
    [InlineData(1, 0, 1)]
    [InlineData(1, 1, 0)]
    [InlineData(1, 1, double.NaN)]
    public void Of_OutOfRange_Throws(double lineMass, double stiffness, double span) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => NaturalPeriod.Of(lineMass, stiffness, span));

    [Theory]
    [InlineData(0, 0.2)]
    [InlineData(1000, 0)]
    [InlineData(1000, double.NaN)]
    public void AddedMass_OutOfRange_Throws(double density, double height) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => NaturalPeriod.AddedMass(density, height));

    private static double ByElements(double lineMass, double stiffness, double span)
    {
        const int count = 12;
        var l = span / count;
        var size = 2 * count + 2;
        var (k, m) = (Matrix<double>.Build.Dense(size, size), Matrix<double>.Build.Dense(size, size));
        for (var i = 0; i < count; i++)
        {
            for (var row = 0; row < 4; row++)
            {
                for (var column = 0; column < 4; column++)
                {
                    k[2 * i + row, 2 * i + column] += stiffness * Stiffness(l)[row, column];
                    m[2 * i + row, 2 * i + column] += lineMass * Mass(l)[row, column];
                }
            }
        }

        // Both ends held, free to turn: the deflections of the first and the last node go.
        int[] free = [1, .. Enumerable.Range(2, size - 4), size - 1];
        var (stiff, mass) = (Free(k, free), Free(m, free));
        var least = (mass.Inverse() * stiff).Evd().EigenValues.Min(value => value.Real);
        return 2 * Math.PI / Math.Sqrt(least);
    }

    private static Matrix<double> Free(Matrix<double> all, int[] free) =>
        Matrix<double>.Build.Dense(free.Length, free.Length, (row, column) => all[free[row], free[column]]);

    private static double[,] Stiffness(double l) => new[,]
    {
        { 12 / (l * l * l), 6 / (l * l), -12 / (l * l * l), 6 / (l * l) },
        { 6 / (l * l), 4 / l, -6 / (l * l), 2 / l },
        { -12 / (l * l * l), -6 / (l * l), 12 / (l * l * l), -6 / (l * l) },
        { 6 / (l * l), 2 / l, -6 / (l * l), 4 / l },
    };

    private static double[,] Mass(double l) => new[,]
    {
        { 156 * l / 420, 22 * l * l / 420, 54 * l / 420, -13 * l * l / 420 },
        { 22 * l * l / 420, 4 * l * l * l / 420, 13 * l * l / 420, -3 * l * l * l / 420 },
        { 54 * l / 420, 13 * l * l / 420, 156 * l / 420, -22 * l * l / 420 },
        { -13 * l * l / 420, -3 * l * l * l / 420, -22 * l * l / 420, 4 * l * l * l / 420 },
    };
}
