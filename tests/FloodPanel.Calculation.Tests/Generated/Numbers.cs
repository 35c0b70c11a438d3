using FsCheck;
using FsCheck.Fluent;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Numbers as they are typed.</summary>
internal static class Numbers
{
    /// <summary>A number in a range, in steps: a tenth of a millimetre for lengths.</summary>
    public static Gen<double> From(double least, double greatest, double step = 1e-4) =>
        Gen.Choose(0, (int)Math.Round((greatest - least) / step)).Select(i => Math.Round(least + i * step, 10));

    /// <summary>The same number with a chance, else nothing.</summary>
    public static Gen<double?> Perhaps(Gen<double> number) =>
        Gen.OneOf(number.Select(n => (double?)n), Gen.Constant<double?>(null));
}
