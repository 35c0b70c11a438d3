using MathNet.Numerics.LinearAlgebra;

namespace FloodPanel.Calculation.Covers;

/// <summary>Value and derivatives of a function by η = α·x.</summary>
internal readonly record struct Derivatives(double Value, double First, double Second, double Third)
{
    public static Derivatives operator +(Derivatives a, Derivatives b) =>
        new(a.Value + b.Value, a.First + b.First, a.Second + b.Second, a.Third + b.Third);

    /// <summary>(A + B·s)·e^−s of the distance s = ±η from a place; to the left of it the odd derivatives change sign.</summary>
    public static Derivatives Decay(double a, double b, double distance, bool leftward)
    {
        var (decay, sign) = (Math.Exp(-distance), leftward ? -1 : 1);
        var value = a + b * distance;
        return new(value * decay, sign * (b - value) * decay, (value - 2 * b) * decay, sign * (3 * b - value) * decay);
    }
}

/// <summary>
/// One term X(x)·sin(α·y) of Lévy's series: the part that the edges above and below, and the bend of the pressure at the
/// water line, add to the bending across. X is scaled by D·α⁴·n·π/4, so that it measures a pressure.
/// </summary>
internal sealed class LevyTerm
{
    private readonly double height;
    private readonly double start;
    private readonly double kink;
    private readonly double[] ends = new double[4];

    public LevyTerm(int order, double height, double width, double poisson, (PlateEdge Top, PlateEdge Bottom) edges, PlatePressure pressure)
    {
        this.height = height;
        Order = order;
        Alpha = order * Math.PI / width;
        Sag = 4 / (order * Math.PI * Math.Pow(Alpha, 4));
        Bend = Sag * Alpha * Alpha;
        Shear = Bend * Alpha;
        start = pressure.Start;

        // The strips across follow the pressure and bend with it at the water line; the plate itself does not.
        kink = start > 0 ? pressure.Rise / (4 * Alpha) : 0;
        Solve(poisson, edges, pressure);
    }

    /// <summary>n, odd.</summary>
    public int Order { get; }

    /// <summary>α = n·π/b [1/m].</summary>
    public double Alpha { get; }

    /// <summary>4/(n·π·α⁴), by which X becomes D·w.</summary>
    public double Sag { get; }

    /// <summary>4/(n·π·α²), by which the second derivative becomes a moment.</summary>
    public double Bend { get; }

    /// <summary>4/(n·π·α), by which the third derivative becomes a shear force.</summary>
    public double Shear { get; }

    /// <summary>X and its derivatives by α·x.</summary>
    public Derivatives At(double x)
    {
        var (down, up) = (Alpha * x, Alpha * (height - x));
        var sum = Derivatives.Decay(ends[0], ends[1], down, leftward: false) + Derivatives.Decay(ends[2], ends[3], up, leftward: true);
        return kink == 0 ? sum : sum + Kink(x);
    }

    /// <summary>True where this and every later term have died away from the edges and the water line.</summary>
    public bool IsSpent(double x)
    {
        const double spent = 36;
        var nearest = Math.Min(x, height - x);
        return Alpha * (kink == 0 ? nearest : Math.Min(nearest, Math.Abs(x - start))) > spent;
    }

    /// <summary>The smooth bend at the water line: its slope jumps by −k/α there, the rest is continuous.</summary>
    private Derivatives Kink(double x) => Derivatives.Decay(3 * kink, kink, Alpha * Math.Abs(x - start), leftward: x < start);

    private void Solve(double poisson, (PlateEdge Top, PlateEdge Bottom) edges, PlatePressure pressure)
    {
        var equations = Matrix<double>.Build.Dense(4, 4);
        var known = Vector<double>.Build.Dense(4);
        Edge(0, 0, edges.Top);
        Edge(2, height, edges.Bottom);
        equations.Solve(known).ToArray().CopyTo(ends, 0);

        void Edge(int row, double x, PlateEdge edge)
        {
            for (var i = 0; i < 4; i++)
            {
                ends[i] = 1;
                var (first, second) = Conditions(End(x), edge, poisson);
                (equations[row, i], equations[row + 1, i]) = (first, second);
                ends[i] = 0;
            }

            var given = new Derivatives(pressure.At(x), pressure.RiseAt(x) / Alpha, 0, 0);
            var (one, two) = Conditions(kink == 0 ? given : given + Kink(x), edge, poisson);
            (known[row], known[row + 1]) = (-one, -two);
        }

        Derivatives End(double x) => Derivatives.Decay(ends[0], ends[1], Alpha * x, leftward: false)
            + Derivatives.Decay(ends[2], ends[3], Alpha * (height - x), leftward: true);
    }

    /// <summary>What must vanish: deflection and moment of a supported edge, moment and Kirchhoff's shear of a free one.</summary>
    private static (double First, double Second) Conditions(Derivatives x, PlateEdge edge, double poisson) => edge == PlateEdge.Free
        ? (x.Second - poisson * x.Value, x.Third - (2 - poisson) * x.First)
        : (x.Value, x.Second - poisson * x.Value);
}
