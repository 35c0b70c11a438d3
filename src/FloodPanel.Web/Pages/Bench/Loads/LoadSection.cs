using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench.Loads;

/// <summary>One action of an opening, behind a switch. Switched off and on again it is what it was.</summary>
/// <typeparam name="T">The action as entered.</typeparam>
public abstract class LoadSection<T> : FormSection
    where T : class
{
    private T? remembered;

    /// <summary>The site.</summary>
    [Parameter, EditorRequired]
    public Site Site { get; set; } = null!;

    protected override object? Shown => (Of(Opening.Actions), Opening.GroundLevel, Opening.SillLevel);

    protected override object? Besides => Site;

    /// <summary>Still water above outside ground [m]; 0 where the ground stays dry.</summary>
    protected double GroundDepth =>
        Math.Max(0, FloodLevels.Depth(Site.DesignFloodLevel, Opening.GroundLevel ?? Opening.SillLevel));

    /// <summary>What the action is called in the undo list, "flow".</summary>
    protected abstract string What { get; }

    /// <summary>What a first switch brings.</summary>
    protected abstract T First { get; }

    protected abstract T? Of(ActionSet actions);

    protected abstract ActionSet With(ActionSet actions, T? action);

    protected Task Switch(bool on)
    {
        remembered = Of(Opening.Actions) ?? remembered;
        return Set(What, on ? remembered ?? First : null);
    }

    protected Task Set(string what, T? action) =>
        Edit(what, o => o with { Actions = With(o.Actions, action) });

    /// <summary>Changes the action as it stands when the edit is made; nothing where it has been switched off.</summary>
    protected Task Change<TKind>(string what, Func<TKind, T> apply)
        where TKind : class, T => Edit(what, o =>
            Of(o.Actions) is TKind action ? o with { Actions = With(o.Actions, apply(action)) } : o);
}
