using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Tests.Posts;

/// <summary>
/// A cantilever as equal beam elements, solved by dense stiffness: deflection and rotation at each node, with the
/// load of an element put on its nodes by its shape functions. Shares nothing with the closed integrals.
/// </summary>
internal static class BeamElements
{
    private static readonly double[] GaussPoints = [-Math.Sqrt(0.6), 0, Math.Sqrt(0.6)];
    private static readonly double[] GaussWeights = [5.0 / 9, 8.0 / 9, 5.0 / 9];

    /// <summary>Tip deflection, base shear and base moment under a line load q(s).</summary>
    public static (double Tip, double Shear, double Moment) Cantilever(
        Func<double, double> load, double length, double stiffness, int count)
    {
        var size = length / count;
        var all = Matrix<double>.Build.Dense(2 * count + 2, 2 * count + 2);
        var forces = Vector<double>.Build.Dense(2 * count + 2);
        var element = ElementStiffness(size) * stiffness;
        for (var i = 0; i < count; i++)
        {
            for (var row = 0; row < 4; row++)
            {
                for (var column = 0; column < 4; column++)
                {
                    all[2 * i + row, 2 * i + column] += element[row, column];
                }
            }

            var loads = NodalLoads(load, i * size, size);
            for (var row = 0; row < 4; row++)
            {
                forces[2 * i + row] += loads[row];
            }
        }

        var free = all.SubMatrix(2, 2 * count, 2, 2 * count);
        var moved = free.Cholesky().Solve(forces.SubVector(2, 2 * count));
        var atBase = all.SubMatrix(0, 2, 2, 2 * count) * moved - forces.SubVector(0, 2);
        return (moved[2 * count - 2], -atBase[0], -atBase[1]);
    }

    public static Matrix<double> ElementStiffness(double l) => Matrix<double>.Build.DenseOfArray(new[,]
    {
        { 12 / (l * l * l), 6 / (l * l), -12 / (l * l * l), 6 / (l * l) },
        { 6 / (l * l), 4 / l, -6 / (l * l), 2 / l },
        { -12 / (l * l * l), -6 / (l * l), 12 / (l * l * l), -6 / (l * l) },
        { 6 / (l * l), 2 / l, -6 / (l * l), 4 / l },
    });

    public static double[] NodalLoads(Func<double, double> load, double start, double l)
    {
        var loads = new double[4];
        for (var point = 0; point < 3; point++)
        {
            var x = (1 + GaussPoints[point]) / 2;
            var weighted = load(start + x * l) * GaussWeights[point] * l / 2;
            loads[0] += weighted * (1 - 3 * x * x + 2 * x * x * x);
            loads[1] += weighted * l * (x - 2 * x * x + x * x * x);
            loads[2] += weighted * (3 * x * x - 2 * x * x * x);
            loads[3] += weighted * l * (x * x * x - x * x);
        }

        return loads;
    }
}
