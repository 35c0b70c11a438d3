using System.Globalization;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>A utilisation as a bar against its limit.</summary>
public sealed partial class UseBar
{
    private const double LimitAt = 80;

    /// <summary>Demand over capacity [-].</summary>
    [Parameter, EditorRequired]
    public double Utilisation { get; set; }

    /// <summary>True where the check fails.</summary>
    [Parameter, EditorRequired]
    public bool Fails { get; set; }

    private string Width => Math.Clamp(Utilisation * LimitAt, 0, 100).ToString("0.#", CultureInfo.InvariantCulture);
}
