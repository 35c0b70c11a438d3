using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench.Loads;

/// <summary>Lower and upper bound of the velocity, estimated from the depth; a click takes one over.</summary>
public sealed partial class VelocityBounds
{
    /// <summary>Still water above outside ground [m].</summary>
    [Parameter, EditorRequired]
    public double Depth { get; set; }

    /// <summary>Name for tests.</summary>
    [Parameter, EditorRequired]
    public string TestId { get; set; } = "";

    /// <summary>Raised with the velocity taken [m/s].</summary>
    [Parameter, EditorRequired]
    public EventCallback<double> OnTake { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    // What is taken over is what is read: two decimals.
    private double Lower => Math.Round(VelocityEstimate.Lower(Depth), 2);

    private double Upper => Math.Round(VelocityEstimate.Upper(Depth), 2);

    private string Words(double velocity) => Calculation.Units.Format(velocity, Dimension.Velocity, Units);
}
