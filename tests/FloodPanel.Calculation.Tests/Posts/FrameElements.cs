using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Tests.Posts;

/// <summary>
/// An own plane frame by dense stiffness: a post of equal frame elements (along, across, rotation at each node) and a raker as a bar from the node
/// at its head to a fixed foot. Loads stand on the nodes by three Gauss points and the shape functions. It knows nothing of springs, of cos² or of
/// closed integrals.
/// </summary>
internal static class FrameElements
{
    /// <summary>The post is all but rigid along itself, as the calculation takes it to be.</summary>
    private const double AlongOverRaker = 1e4;

    /// <summary>Force in the raker (compression), base shear, base moment, greatest deflection normal to the post, tension at the base.</summary>
    public sealed record Outcome(double Raker, double Shear, double Moment, double Deflection, double Uplift);

    /// <summary>Solves the frame.</summary>
    /// <param name="load">q(s), normal to the post.</param>
    /// <param name="length">Length of the post.</param>
    /// <param name="stiffness">E·I of the post.</param>
    /// <param name="rake">Angle of the post from the vertical, its top towards the raker.</param>
    /// <param name="headNode">Node of the head.</param>
    /// <param name="foot">Horizontal distance of the foot from the base.</param>
    /// <param name="axial">E·A of the raker; 0 for none.</param>
    /// <param name="isPinned">True for a base that turns.</param>
    /// <param name="count">Elements.</param>
    public static Outcome Solve(
        Func<double, double> load, double length, double stiffness, double rake, int headNode, double foot, double axial, bool isPinned, int count)
    {
        var size = length / count;
        var degrees = 3 * (count + 1);
        var all = Matrix<double>.Build.Dense(degrees, degrees);
        var forces = Vector<double>.Build.Dense(degrees);
        for (var i = 0; i < count; i++)
        {
            AddElement(all, forces, 3 * i, load, i * size, size, stiffness, AlongOverRaker * Math.Max(axial, stiffness / (length * length)));
        }

        // Head and foot in the axes of the post: s along it, n normal to it.
        var (headS, sin, cos) = (headNode * size, Math.Sin(rake), Math.Cos(rake));
        var (alongFoot, acrossFoot) = (foot * sin - headS, foot * cos);
        var bar = Math.Sqrt(alongFoot * alongFoot + acrossFoot * acrossFoot);
        double[] direction = [alongFoot / bar, acrossFoot / bar];
        for (var row = 0; row < 2; row++)
        {
            for (var column = 0; column < 2; column++)
            {
                all[3 * headNode + row, 3 * headNode + column] += axial / bar * direction[row] * direction[column];
            }
        }

        int[] held = isPinned ? [0, 1] : [0, 1, 2];
        int[] free = [.. Enumerable.Range(0, degrees).Except(held)];
        var reduced = Matrix<double>.Build.Dense(free.Length, free.Length, (r, c) => all[free[r], free[c]]);
        var solved = reduced.LU().Solve(Vector<double>.Build.Dense(free.Length, i => forces[free[i]]));
        var moved = Vector<double>.Build.Dense(degrees);
        for (var i = 0; i < free.Length; i++)
        {
            moved[free[i]] = solved[i];
        }

        var atBase = all.SubMatrix(0, 3, 0, degrees) * moved - forces.SubVector(0, 3);
        var shortened = direction[0] * moved[3 * headNode] + direction[1] * moved[3 * headNode + 1];
        var greatest = Enumerable.Range(0, count + 1).Max(node => Math.Abs(moved[3 * node + 1]));
        return new(axial / bar * shortened, -atBase[1], -atBase[2], greatest, -atBase[0]);
    }

    private static void AddElement(
        Matrix<double> all, Vector<double> forces, int at, Func<double, double> load, double start, double l, double stiffness, double along)
    {
        var bending = BeamElements.ElementStiffness(l) * stiffness;
        int[] across = [at + 1, at + 2, at + 4, at + 5];
        var loads = BeamElements.NodalLoads(load, start, l);
        for (var row = 0; row < 4; row++)
        {
            forces[across[row]] += loads[row];
            for (var column = 0; column < 4; column++)
            {
                all[across[row], across[column]] += bending[row, column];
            }
        }

        all[at, at] += along / l;
        all[at + 3, at + 3] += along / l;
        all[at, at + 3] -= along / l;
        all[at + 3, at] -= along / l;
    }
}
