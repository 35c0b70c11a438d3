namespace FloodPanel.Calculation.Covers;

/// <summary>A level line across a rectangular plate: the terms of its series there, worked out once for every place on it.</summary>
internal sealed class PlateRow
{
    private readonly LevyTerm[] terms;
    private readonly Derivatives[] at;
    private readonly double width;
    private readonly double poisson;
    private readonly double pressure;
    private readonly double rise;

    public PlateRow(LevyTerm[] terms, double x, double width, double poisson, PlatePressure load)
    {
        (this.terms, this.width, this.poisson, pressure, rise) = (terms, width, poisson, load.At(x), load.RiseAt(x));
        var spent = Array.FindIndex(terms, term => term.IsSpent(x));
        at = new Derivatives[spent < 0 ? terms.Length : spent];
        for (var i = 0; i < at.Length; i++)
        {
            at[i] = terms[i].At(x);
        }
    }

    /// <summary>D·w [N·m²].</summary>
    public double Bulge(double y)
    {
        var strip = ((y - 2 * width) * y * y + width * width * width) * y / 24;
        return pressure * strip + Sum((term, d) => term.Sag * d.Value * Math.Sin(term.Alpha * y));
    }

    /// <summary>Moments per width [N·m/m].</summary>
    public PlateMoments Moments(double y)
    {
        var (down, across) = (0.0, pressure * (y - width) * y / 2);
        for (var i = 0; i < at.Length; i++)
        {
            var bend = terms[i].Bend * Math.Sin(terms[i].Alpha * y);
            down += bend * at[i].Second;
            across -= bend * at[i].Value;
        }

        return new(-(down + poisson * across), -(across + poisson * down), -(1 - poisson) * Twist(y));
    }

    /// <summary>D·∂²w/∂x∂y [N].</summary>
    public double Twist(double y)
    {
        var strip = ((4 * y - 6 * width) * y * y + width * width * width) / 24;
        return rise * strip + Sum((term, d) => term.Bend * d.First * Math.Cos(term.Alpha * y));
    }

    /// <summary>D·(∂³w/∂x³ + (2 − ν)·∂³w/∂x∂y²) [N/m].</summary>
    public double Shear(double y) => (2 - poisson) * rise * (y - width) * y / 2
        + Sum((term, d) => term.Shear * Math.Sin(term.Alpha * y) * (d.Third - (2 - poisson) * d.First));

    /// <summary>Reaction of either side edge against the pressure [N/m].</summary>
    public double SideReaction() =>
        pressure * width / 2 + Sum((term, d) => term.Shear * (d.Value - (2 - poisson) * d.Second));

    /// <summary>On an edge the terms alternate or fade slowly: the mean of the last two sums is nearer than either.</summary>
    private double Sum(Func<LevyTerm, Derivatives, double> part)
    {
        var (sum, last) = (0.0, 0.0);
        for (var i = 0; i < at.Length; i++)
        {
            last = part(terms[i], at[i]);
            sum += last;
        }

        return sum - last / 2;
    }
}
