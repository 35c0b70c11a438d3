using System.Globalization;

namespace FloodPanel.Calculation.Verification;

/// <summary>How a published figure is known.</summary>
public enum Evidence
{
    /// <summary>Read in a stored copy of the source.</summary>
    Read,

    /// <summary>Read in a text that cites the source.</summary>
    Secondary,

    /// <summary>Derived or recomputed outside this code; no document prints it.</summary>
    Derived,

    /// <summary>From memory: to be checked against the source.</summary>
    Memory,
}

/// <summary>One figure that the calculation is held against.</summary>
/// <param name="Source">Where it is published.</param>
/// <param name="Quantity">What it is.</param>
/// <param name="Unit">Its unit as published; empty for a pure number.</param>
/// <param name="Published">The figure as printed: its digits set the allowed difference.</param>
/// <param name="Computed">What this calculation gives, in the same unit.</param>
/// <param name="Evidence">How the published figure is known.</param>
/// <param name="Explained">Relative difference that the remark explains [-]; 0 for none.</param>
/// <param name="Remark">Why the figures differ; empty where they agree to half the last printed digit.</param>
public sealed record VerificationRow(
    string Source, string Quantity, string Unit, string Published, double Computed, Evidence Evidence, double Explained = 0, string Remark = "")
{
    /// <summary>The published figure as a number.</summary>
    public double PublishedValue => double.Parse(Published, NumberStyles.Float, CultureInfo.InvariantCulture);

    /// <summary>Computed less published.</summary>
    public double Difference => Computed - PublishedValue;

    /// <summary>Half a unit of the last printed digit, and what the remark explains.</summary>
    public double Allowed => 0.5 * Math.Pow(10, -Decimals) + Explained * Math.Abs(PublishedValue);

    /// <summary>True when the difference is within what is allowed; rounding of binary fractions aside.</summary>
    public bool Agrees => Math.Abs(Difference) <= Allowed * (1 + 1e-9);

    /// <summary>The computed figure with one digit more than the published one.</summary>
    public string ComputedShown => Shown(Computed);

    /// <summary>The difference with one digit more than the published figure.</summary>
    public string DifferenceShown => Shown(Math.Round(Difference, Decimals + 1) + 0.0);

    private int Decimals => Published.IndexOf('.') is >= 0 and var point ? Published.Length - point - 1 : 0;

    private string Shown(double value) =>
        value.ToString("F" + (Decimals + 1).ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
