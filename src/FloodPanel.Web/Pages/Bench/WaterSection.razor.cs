using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>What acts on the barrier: the levels of the site, flow, and actions that only the file knows.</summary>
public sealed partial class WaterSection
{
    private FlowInput remembered = new() { Velocity = 1 };

    /// <summary>The site.</summary>
    [Parameter, EditorRequired]
    public Site Site { get; set; } = null!;

    /// <summary>Address of the page of the site.</summary>
    [Parameter, EditorRequired]
    public string SiteAddress { get; set; } = "";

    protected override object? Besides => Site;

    private IEnumerable<(string Name, string Title, Func<Opening, Opening> Remove)> NotComputed
    {
        get
        {
            var actions = Opening.Actions;
            if (actions.Wave is not null)
            {
                yield return ("wave", "Waves", o => o with { Actions = o.Actions with { Wave = null } });
            }

            if (actions.Debris is not null)
            {
                yield return ("debris", "Debris", o => o with { Actions = o.Actions with { Debris = null } });
            }

            if (actions.Wind is not null)
            {
                yield return ("wind", "Wind", o => o with { Actions = o.Actions with { Wind = null } });
            }

            if (actions.Line is not null)
            {
                yield return ("line", "Line load", o => o with { Actions = o.Actions with { Line = null } });
            }
        }
    }

    private string Level(double value) => Calculation.Units.Format(value, Dimension.Length, Units);

    // Switched off and on again, the flow is what it was.
    private Task SwitchFlow(bool on)
    {
        remembered = Opening.Actions.Flow ?? remembered;
        var flow = on ? remembered : null;
        return Edit("flow", o => o with { Actions = o.Actions with { Flow = flow } });
    }

    private Task EditFlow(string what, Func<FlowInput, FlowInput> apply) => Edit(what, o =>
        o.Actions.Flow is { } flow ? o with { Actions = o.Actions with { Flow = apply(flow) } } : o);
}
