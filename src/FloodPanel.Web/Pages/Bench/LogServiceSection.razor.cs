using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>Tightness of the logs, and what timber and composites among them endure.</summary>
public sealed partial class LogServiceSection
{
    private static readonly LoadDuration[] Durations = Enum.GetValues<LoadDuration>();

    private LogJoint joint = new();
    private TimberService timber = new();
    private CompositeService composite = new();

    protected override object? Shown => Barrier.Logs;

    /// <summary>Materials, to see the families of the logs.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    private static string Name(LoadDuration duration) => duration switch
    {
        LoadDuration.Permanent => "More than ten years",
        LoadDuration.LongTerm => "Up to ten years",
        LoadDuration.MediumTerm => "Up to two months",
        LoadDuration.ShortTerm => "Up to a week",
        _ => "Up to ten minutes",
    };

    private bool Has(MaterialFamily family) => Barrier.Logs.Groups.Any(g => Library.Find(g.Material)?.Family == family);

    // Each switched off and on again is what it was.
    private Task SwitchJoint(bool on)
    {
        joint = Barrier.Logs.Joint ?? joint;
        var chosen = on ? joint : null;
        return EditLogs("joints and seals", l => l with { Joint = chosen });
    }

    private Task SwitchTimber(bool on)
    {
        timber = Barrier.Logs.Timber ?? timber;
        var chosen = on ? timber : null;
        return EditLogs("timber duration", l => l with { Timber = chosen });
    }

    private Task SwitchComposite(bool on)
    {
        composite = Barrier.Logs.Composite ?? composite;
        var chosen = on ? composite : null;
        return EditLogs("composite factors", l => l with { Composite = chosen });
    }

    private Task ChangeJoint(string what, Func<LogJoint, LogJoint> apply) =>
        EditLogs(what, l => l.Joint is { } old ? l with { Joint = apply(old) } : l);

    private Task ChangeTimber(string what, Func<TimberService, TimberService> apply) =>
        EditLogs(what, l => l.Timber is { } old ? l with { Timber = apply(old) } : l);

    private Task ChangeComposite(string what, Func<CompositeService, CompositeService> apply) =>
        EditLogs(what, l => l.Composite is { } old ? l with { Composite = apply(old) } : l);
}
