using System.Globalization;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared;

/// <summary>Demand over capacity as a bar with the limit marked, and as a number.</summary>
public sealed partial class UtilisationBar
{
    // The bar reaches a little past the limit, so that what is over it shows as over it.
    private const double Limit = 80;

    [Parameter, EditorRequired]
    public required double Value { get; set; }

    private string Length => Math.Clamp(Value * Limit, 0, 100).ToString("0.#", CultureInfo.InvariantCulture);

    private string Text => Value switch
    {
        double.PositiveInfinity => "∞",
        >= 10 => Value.ToString("0.0", CultureInfo.InvariantCulture),
        // Rounding must not hide which side of the limit it is on.
        > 1 and < 1.005 => Value.ToString("0.0000", CultureInfo.InvariantCulture),
        _ => Value.ToString("0.00", CultureInfo.InvariantCulture),
    };
}
