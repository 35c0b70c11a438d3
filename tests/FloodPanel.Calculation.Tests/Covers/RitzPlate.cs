using FloodPanel.Calculation.Covers;
using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Tests.Covers;

/// <summary>
/// The same plate by least energy: polynomials down, sines across, no differential equation solved and no condition set at a free
/// edge, which the energy finds by itself. Shares nothing with Lévy's series but the sines.
/// </summary>
internal sealed class RitzPlate(double height, double width, double poisson, PlateEdge top, PlatePressure pressure)
{
    private const int Degree = 22;
    private const int LastSine = 59;

    /// <summary>D·w and the moments down and across.</summary>
    public (double Bulge, double Down, double Across) At(double x, double y)
    {
        var (bulge, down, across) = (0.0, 0.0, 0.0);
        for (var m = 1; m <= LastSine; m += 2)
        {
            var alpha = m * Math.PI / width;
            var factors = Solve(alpha, 4 / (m * Math.PI));
            var (value, second) = (0.0, 0.0);
            for (var k = 0; k < Degree; k++)
            {
                var shape = Shape(k, x);
                value += factors[k] * shape.Value;
                second += factors[k] * shape.Second;
            }

            var sine = Math.Sin(alpha * y);
            bulge += value * sine;
            down -= (second - poisson * alpha * alpha * value) * sine;
            across -= (poisson * second - alpha * alpha * value) * sine;
        }

        return (bulge, down, across);
    }

    private Vector<double> Solve(double alpha, double loadFactor)
    {
        var energy = Matrix<double>.Build.Dense(Degree, Degree);
        var load = Vector<double>.Build.Dense(Degree);
        var square = alpha * alpha;
        foreach (var (x, weight) in Places())
        {
            var shapes = Enumerable.Range(0, Degree).Select(k => Shape(k, x)).ToArray();
            for (var i = 0; i < Degree; i++)
            {
                var f = shapes[i];
                load[i] += weight * loadFactor * pressure.At(x) * f.Value;
                for (var j = 0; j < Degree; j++)
                {
                    var g = shapes[j];
                    energy[i, j] += weight * ((f.Second - square * f.Value) * (g.Second - square * g.Value)
                        + (1 - poisson) * square * (f.Value * g.Second + f.Second * g.Value + 2 * f.First * g.First));
                }
            }
        }

        return energy.Solve(load);
    }

    /// <summary>Gauss points above and below the water line.</summary>
    private IEnumerable<(double X, double Weight)> Places()
    {
        const int points = 40;
        foreach (var (from, to) in new[] { (0, pressure.Start), (pressure.Start, height) })
        {
            var rule = new MathNet.Numerics.Integration.GaussLegendreRule(from, to, points);
            for (var i = 0; i < points && to > from; i++)
            {
                yield return (rule.GetAbscissa(i), rule.GetWeight(i));
            }
        }
    }

    /// <summary>A Legendre polynomial times what makes it vanish on the supported edges.</summary>
    private (double Value, double First, double Second) Shape(int k, double x)
    {
        var t = 2 * x / height - 1;
        var scale = 2 / height;
        var (p, p1, p2) = Legendre(k, t);
        var (e, e1, e2) = top == PlateEdge.Free ? (1 - t, -1.0, 0.0) : (1 - t * t, -2 * t, -2.0);
        return (p * e, scale * (p1 * e + p * e1), scale * scale * (p2 * e + 2 * p1 * e1 + p * e2));
    }

    private static (double Value, double First, double Second) Legendre(int k, double t)
    {
        var (before, now) = ((0.0, 0.0, 0.0), (Value: 1.0, First: 0.0, Second: 0.0));
        for (var n = 0; n < k; n++)
        {
            var (a, b, c) = before;
            var next = (
                ((2 * n + 1) * t * now.Value - n * a) / (n + 1),
                ((2 * n + 1) * (now.Value + t * now.First) - n * b) / (n + 1),
                ((2 * n + 1) * (2 * now.First + t * now.Second) - n * c) / (n + 1));
            (before, now) = (now, next);
        }

        return now;
    }
}
