using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Posts;

/// <summary>
/// A post held by a raker, by direct stiffness: a beam element from the base to the head, the raker a spring k = E·A/L·cos²φ at the head, the part
/// above hanging on the head by its shear and moment. The loads of the element stand on its nodes by its shape functions, so that these are exact;
/// between them moments, shears and deflections follow by integration.
/// </summary>
public sealed class ProppedPost
{
    /// <summary>Points along the post at which its greatest moment and deflection are looked for.</summary>
    private const int Points = 120;

    private readonly SlopeLoad load;
    private readonly double length;
    private readonly double stiffness;
    private readonly double head;

    private ProppedPost(SlopeLoad load, double length, double stiffness, double head, double headForce, double baseRotation)
    {
        (this.load, this.length, this.stiffness, this.head) = (load, length, stiffness, head);
        (HeadForce, BaseRotation) = (headForce, baseRotation);
    }

    /// <summary>R, force of the raker on the post against n [N]; 0 where its play is not used up.</summary>
    public double HeadForce { get; }

    /// <summary>Rotation at the base [rad]; 0 where it is fixed.</summary>
    public double BaseRotation { get; }

    /// <summary>Solves the post.</summary>
    /// <param name="load">The load.</param>
    /// <param name="length">ℓ [m].</param>
    /// <param name="stiffness">E·I of the post [N·m²].</param>
    /// <param name="raker">The raker, its head no higher than the post.</param>
    /// <param name="isPinned">True for a base that turns.</param>
    /// <remarks>Source: beam elements with cubic shape functions. Limits: bending deformation only; a load that pushes towards the protected side.</remarks>
    public static ProppedPost Solve(SlopeLoad load, double length, double stiffness, RakerModel raker, bool isPinned)
    {
        ArgumentNullException.ThrowIfNull(raker);
        var head = Math.Min(raker.Head, length);
        if (!(load.Between(0, double.PositiveInfinity).First > 0))
        {
            return new(load, length, stiffness, head, 0, 0);
        }

        var (all, forces) = Assemble(load, head, stiffness, raker);

        // With a base that turns, play only leans the whole post over.
        forces[forces.Count - 1] = isPinned ? 0 : raker.Play;
        var held = isPinned ? 1 : 2;
        var moved = all.SubMatrix(held, all.RowCount - held, held, all.RowCount - held)
            .LU().Solve(forces.SubVector(held, forces.Count - held));
        var force = moved[^1] * stiffness;

        // A raker that is not reached does not pull; a base that turns always reaches it.
        return isPinned || force > 0
            ? new(load, length, stiffness, head, force, isPinned ? moved[0] + raker.Play / head : 0)
            : new(load, length, stiffness, head, 0, 0);
    }

    /// <summary>M(s), tension on the wet side positive [N·m].</summary>
    /// <param name="s">Distance from the base along the post [m].</param>
    public double Moment(double s)
    {
        var above = load.Between(s, double.PositiveInfinity);
        return above.First - s * above.Zero - HeadForce * Math.Max(0, head - s);
    }

    /// <summary>V(s) just above s [N].</summary>
    /// <param name="s">Distance from the base along the post [m].</param>
    public double Shear(double s) => load.Between(s, double.PositiveInfinity).Zero - (s < head ? HeadForce : 0);

    /// <summary>v(s), towards the protected side [m].</summary>
    /// <param name="s">Distance from the base along the post [m].</param>
    public double Deflection(double s)
    {
        var (below, above) = (load.Between(0, s), load.Between(s, double.PositiveInfinity));
        var bent = 3 * s * below.Second - below.Third + s * s * (3 * above.First - s * above.Zero) - HeadForce * Influence(s, head);
        return bent / (6 * stiffness) + BaseRotation * s;
    }

    /// <summary>The greatest |M| and where it stands: at the base, at the head, or between points where the shear changes its sign.</summary>
    public (double Moment, double At) PeakMoment()
    {
        var best = (Moment: Math.Abs(Moment(0)), At: 0.0);
        Take(head);
        for (var i = 0; i < Points; i++)
        {
            var (from, to) = (head * i / Points, head * (i + 1) / Points);
            if (Math.Sign(Shear(from)) != Math.Sign(Shear(to - 1e-9 * head)))
            {
                Take(ZeroShear(from, to));
            }
        }

        return best;

        void Take(double s)
        {
            if (Math.Abs(Moment(s)) > best.Moment)
            {
                best = (Math.Abs(Moment(s)), s);
            }
        }
    }

    /// <summary>The greatest |V|: at the base or on either side of the head, for a load of one direction.</summary>
    public double PeakShear() => Math.Max(
        Math.Abs(Shear(0)), Math.Max(Math.Abs(Shear(head)), Math.Abs(Shear(head) - HeadForce)));

    /// <summary>The greatest |v|, a parabola through the highest point and its neighbours.</summary>
    public double PeakDeflection()
    {
        var deflections = new double[Points + 1];
        var highest = 0;
        for (var i = 0; i <= Points; i++)
        {
            deflections[i] = Math.Abs(Deflection(length * i / Points));
            highest = deflections[i] > deflections[highest] ? i : highest;
        }

        if (highest is 0 or Points)
        {
            return deflections[highest];
        }

        var (left, middle, right) = (deflections[highest - 1], deflections[highest], deflections[highest + 1]);
        var curvature = left - 2 * middle + right;
        return curvature < 0 ? middle - (right - left) * (right - left) / (8 * curvature) : middle;
    }

    private double ZeroShear(double from, double to)
    {
        var sign = Math.Sign(Shear(from));
        for (var i = 0; i < 60; i++)
        {
            var middle = (from + to) / 2;
            (from, to) = Math.Sign(Shear(middle)) == sign ? (middle, to) : (from, middle);
        }

        return from;
    }

    /// <summary>6·E·I times the deflection at s under a unit force at t.</summary>
    private static double Influence(double s, double t) => s <= t ? s * s * (3 * t - s) : t * t * (3 * s - t);

    /// <summary>
    /// Stiffness and loads over E·I, and a last line for the raker: v at the head less R/k is the play. Its flexibility, not its stiffness, so
    /// that a stiff raker costs no digits.
    /// </summary>
    private static (Matrix<double> Stiffness, Vector<double> Forces) Assemble(SlopeLoad load, double head, double stiffness, RakerModel raker)
    {
        const int atHead = 2, last = 4;
        var all = Matrix<double>.Build.Dense(last + 1, last + 1);
        var forces = Vector<double>.Build.Dense(last + 1);
        (all[last, atHead], all[atHead, last], all[last, last]) = (1, 1, -stiffness / raker.Stiffness);
        AddStiffness(all, head);
        AddLoads(forces, head, load.Between(0, head));
        var above = load.Between(head, double.PositiveInfinity);
        forces[atHead] += above.Zero;
        forces[atHead + 1] += above.First - head * above.Zero;
        forces.Divide(stiffness, forces);
        return (all, forces);
    }

    private static void AddStiffness(Matrix<double> all, double l)
    {
        var (force, turn, near, far) = (12 / (l * l * l), 6 / (l * l), 4 / l, 2 / l);
        double[,] element =
        {
            { force, turn, -force, turn },
            { turn, near, -turn, far },
            { -force, -turn, force, -turn },
            { turn, far, -turn, near },
        };
        for (var row = 0; row < 4; row++)
        {
            for (var column = 0; column < 4; column++)
            {
                all[row, column] += element[row, column];
            }
        }
    }

    /// <summary>∫q·N ds of the four cubic shape functions, from the moments of the load about the base.</summary>
    private static void AddLoads(Vector<double> forces, double l, LoadMoments about)
    {
        var (first, second, third) = (about.First / l, about.Second / (l * l), about.Third / (l * l * l));
        forces[0] += about.Zero - 3 * second + 2 * third;
        forces[1] += l * (first - 2 * second + third);
        forces[2] += 3 * second - 2 * third;
        forces[3] += l * (third - second);
    }
}
