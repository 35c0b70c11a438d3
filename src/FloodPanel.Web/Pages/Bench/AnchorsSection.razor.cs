using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The anchors of the base plates; without posts there are none.</summary>
public sealed partial class AnchorsSection
{
    private static readonly AnchorInput Usual = new();
    private static readonly AnchorMethod[] Methods = Enum.GetValues<AnchorMethod>();
    private static readonly AnchorKind[] Kinds = Enum.GetValues<AnchorKind>();

    private AnchorInput remembered = Usual;

    protected override object? Shown => (Barrier.Anchors, Barrier.Posts is null, Barrier.Bays.Count);

    private static string Name(AnchorMethod method) => method switch
    {
        AnchorMethod.Approval => "Approval values",
        AnchorMethod.Aci318 => "ACI 318-19",
        AnchorMethod.En1992 => "EN 1992-4",
        _ => throw new ArgumentOutOfRangeException(nameof(method), method, null),
    };

    private static string Name(AnchorKind kind) => kind switch
    {
        AnchorKind.Headed => "Cast in, headed",
        AnchorKind.Hooked => "Cast in, hooked",
        AnchorKind.PostInstalled => "Drilled",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, null),
    };

    private static Dictionary<string, object?> Named(string field) => new() { ["data-testid"] = $"anchors-{field}" };

    // Switched off and on again, it is what it was.
    private Task Switch(bool on)
    {
        remembered = Barrier.Anchors ?? remembered;
        var anchors = on ? remembered : null;
        return EditBarrier("anchors", b => b with { Anchors = anchors });
    }

    private Task Change(string what, Func<AnchorInput, AnchorInput> apply) =>
        EditBarrier(what, b => b.Anchors is { } anchors ? b with { Anchors = apply(anchors) } : b);
}
