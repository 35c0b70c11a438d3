using FloodPanel.Calculation.Actions.Debris;
using MathNet.Numerics.OdeSolvers;
using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Response spectrum of an undamped oscillator under a half-sine pulse (structural dynamics, first principles): closed
/// values worked out outside this code, and the oscillator itself followed in time by MathNet's Runge-Kutta rule.
/// </summary>
public class HalfSineSpectrumTests
{
    [Theory]
    [InlineData(0.1, 0.396)]
    [InlineData(0.3, 1.102)]
    [InlineData(0.5, 1.571)]
    [InlineData(0.8, 1.768)]
    [InlineData(1.0, 1.732)]
    [InlineData(1.4, 1.550)]
    public void HalfSine_Ratio_ClosedValue(double ratio, double response) =>
        Assert.Equal(response, ResponseRatio.HalfSine(ratio), tolerance: 0.0005);

    /// <summary>u″ + ω²·u = ω²·sin(π·t/Δt) during the pulse, free after it; T_n = 1. Steps of 1/2000 leave 1e-4.</summary>
    [Theory]
    [InlineData(0.05)]
    [InlineData(0.25)]
    [InlineData(0.499)]
    [InlineData(0.501)]
    [InlineData(0.77)]
    [InlineData(1.6)]
    [InlineData(2.3)]
    [InlineData(4.9)]
    public void HalfSine_Ratio_AsTheOscillatorItself(double pulse)
    {
        const double squared = 4 * Math.PI * Math.PI;
        var end = pulse + 1.5;
        var steps = (int)(2000 * end);

        var path = RungeKutta.FourthOrder(Vector<double>.Build.Dense(2), 0, end, steps, (t, state) => Vector<double>.Build.DenseOfArray(
        [
            state[1],
            squared * ((t < pulse ? Math.Sin(Math.PI * t / pulse) : 0) - state[0]),
        ]));

        Assert.Equal(path.Max(state => Math.Abs(state[0])), ResponseRatio.HalfSine(pulse), tolerance: 2e-4);
    }

    /// <summary>A pulse that lasts long is followed as if it were still: the response tends to 1, however long.</summary>
    [Theory]
    [InlineData(50)]
    [InlineData(1e6)]
    [InlineData(1e15)]
    public void HalfSine_VeryLongPulse_TendsToOne(double ratio) =>
        Assert.InRange(ResponseRatio.HalfSine(ratio), 1 - 1e-6, 1 + 1.1 / (2 * ratio) + 1e-9);

    /// <summary>Several peaks: each is tried here, one by one, where the function goes to the greatest.</summary>
    [Theory]
    [InlineData(1.51)]
    [InlineData(2.5)]
    [InlineData(4.9)]
    [InlineData(13.37)]
    public void HalfSine_ManyPeaks_GreatestOfAll(double ratio) => Hand.Equal(
        Enumerable.Range(1, (int)(ratio + 0.5)).Max(n => 2 * ratio / (2 * ratio - 1) * Math.Sin(2 * Math.PI * n / (2 * ratio + 1))),
        ResponseRatio.HalfSine(ratio));

    /// <summary>Both sides meet at π/2.</summary>
    [Theory]
    [InlineData(0.5 - 2e-7)]
    [InlineData(0.5 - 1e-8)]
    [InlineData(0.5)]
    [InlineData(0.5 + 2e-7)]
    public void HalfSine_AroundOneHalf_Continuous(double ratio) =>
        Assert.Equal(Math.PI / 2, ResponseRatio.HalfSine(ratio), tolerance: 1e-6);

    [Fact]
    public void HalfSine_NoDuration_NoResponse() => Assert.Equal(0, ResponseRatio.HalfSine(0));

    [Theory]
    [InlineData(-0.1)]
    [InlineData(double.NaN)]
    public void Ratio_Negative_Throws(double ratio)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ResponseRatio.HalfSine(ratio));
        Assert.Throws<ArgumentOutOfRangeException>(() => ResponseRatio.Of(ratio));
    }
}
