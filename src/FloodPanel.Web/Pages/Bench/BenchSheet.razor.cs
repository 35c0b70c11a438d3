using FloodPanel.Documents.Drawings;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The opening in elevation and in section, on its sheet.</summary>
public sealed partial class BenchSheet
{
    private (DrawingInput?, string?, bool) drawn;
    private MarkupString elevation;
    private MarkupString section;
    private (string Title, MarkupString Drawing)[] details = [];
    private bool changed;

    /// <summary>What to draw.</summary>
    [Parameter, EditorRequired]
    public DrawingInput Input { get; set; } = null!;

    /// <summary>The load case of the section.</summary>
    [Parameter, EditorRequired]
    public string Case { get; set; } = "";

    /// <summary>True when the drawing is of an earlier state.</summary>
    [Parameter]
    public bool Stale { get; set; }

    // A drawing is made anew only when something on it may have changed; a save or an opened figure leaves it alone.
    protected override void OnParametersSet()
    {
        var same = drawn.Item1 is { } before && Matches(before, Input);
        changed = !same || drawn.Item2 != Case || drawn.Item3 != Stale;
        if (!same)
        {
            elevation = new MarkupString(SvgWriter.WriteText(ElevationDrawing.Draw(Input)));
            details = [.. DetailDrawings.Of(Input).Select(scene => (scene.Title, new MarkupString(SvgWriter.WriteText(scene))))];
        }

        if (!same || drawn.Item2 != Case)
        {
            section = new MarkupString(SvgWriter.WriteText(SectionDrawing.Draw(Input, Case, withReadings: true)));
        }

        drawn = (Input, Case, Stale);
    }

    protected override bool ShouldRender() => changed;

    // "Footing, design flood" is found as "footing".
    private static string NameOf(string title) => title.Split(',')[0].ToLowerInvariant().Replace(' ', '-');

    private static bool Matches(DrawingInput before, DrawingInput now) =>
        ReferenceEquals(before.Result, now.Result) && before.Units == now.Units && before.Revision == now.Revision
        && ReferenceEquals(before.Project, now.Project);
}
