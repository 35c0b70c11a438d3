namespace FloodPanel.Documents.Drawings;

/// <summary>The scales of ISO 5455, with 1:25 as is usual in building.</summary>
public static class DrawingScale
{
    private static readonly int[] Denominators = [1, 2, 5, 10, 20, 25, 50, 100, 200, 500, 1000, 2000, 5000];

    /// <summary>Room [mm] that may be missing: a sheet cut to the height of its drawing still holds it.</summary>
    private const double Slack = 1e-6;

    /// <summary>n of the largest scale 1:n at which something fits; the smallest scale there is when none does.</summary>
    /// <param name="width">Width of the thing [m].</param>
    /// <param name="height">Height of the thing [m].</param>
    /// <param name="roomWide">Room on the sheet [mm].</param>
    /// <param name="roomHigh">Room on the sheet [mm].</param>
    public static int Fit(double width, double height, double roomWide, double roomHigh)
    {
        foreach (var denominator in Denominators)
        {
            var perMetre = PerMetre(denominator);
            if (width * perMetre <= roomWide + Slack && height * perMetre <= roomHigh + Slack)
            {
                return denominator;
            }
        }

        return Denominators[^1];
    }

    /// <summary>Millimetres on the sheet for a metre.</summary>
    /// <param name="denominator">n in the scale 1:n.</param>
    public static double PerMetre(int denominator) => 1000.0 / denominator;
}

/// <summary>From the opening to the sheet.</summary>
/// <param name="OriginX">Where x = 0 stands on the sheet [mm].</param>
/// <param name="SillY">Where z = 0 stands on the sheet [mm].</param>
/// <param name="PerMetre">Millimetres on the sheet for a metre.</param>
/// <param name="Cut">The stretch of x that is left out, or null.</param>
internal readonly record struct Projection(double OriginX, double SillY, double PerMetre, BayCut? Cut = null)
{
    public double X(double x)
    {
        if (Cut is not { } cut || x <= cut.FromX)
        {
            return OriginX + x * PerMetre;
        }

        var along = Math.Min(1, (x - cut.FromX) / (cut.ToX - cut.FromX));
        return OriginX + cut.FromX * PerMetre + along * cut.Gap + Math.Max(0, x - cut.ToX) * PerMetre;
    }

    public double Y(double z) => SillY - z * PerMetre;

    public SheetPoint At(double x, double z) => new(X(x), Y(z));
}

/// <summary>Bays left out of the elevation of a long barrier, so that the others can be seen.</summary>
/// <param name="First">First bay left out, from 0.</param>
/// <param name="Last">Last bay left out, from 0.</param>
/// <param name="FromX">Where the stretch left out begins [m].</param>
/// <param name="ToX">Where it ends [m].</param>
/// <param name="Gap">Width of the break on the sheet [mm].</param>
internal sealed record BayCut(int First, int Last, double FromX, double ToX, double Gap)
{
    public int Count => Last - First + 1;

    public bool Omits(int bay) => bay >= First && bay <= Last;
}
