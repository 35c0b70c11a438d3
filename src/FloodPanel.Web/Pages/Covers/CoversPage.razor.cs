using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using MudBlazor;

namespace FloodPanel.Web.Pages.Covers;

public sealed partial class CoversPage
{
    private int selected;
    private int editing;

    [Inject]
    public required Library Library { get; init; }

    [Inject]
    public required ISnackbar Snackbar { get; init; }

    private ValueList<Cover> Covers => Project.Covers;

    // An undo may have taken the selected one away.
    private int Selected => Math.Clamp(selected, 0, Covers.Count - 1);

    private string? ProblemIn(int index)
    {
        var path = LiveResults.PathOfCover(index);
        var problem = Editor.Problems.FirstOrDefault(p => p.Path.StartsWith(path, StringComparison.Ordinal))
            ?? Editor.Problems.FirstOrDefault(p => p.Path.StartsWith("site", StringComparison.Ordinal))
            ?? Editor.Problems.FirstOrDefault(p => p.Path.StartsWith("ownBasis", StringComparison.Ordinal));
        return problem?.Message.In(Units);
    }

    private void Select(int index) => selected = index;

    private void Add()
    {
        var cover = FirstCover.For(Project, Library);
        Editor.Change($"Add {cover.Name}", p => p with { Covers = p.Covers.Add(cover) });
        selected = Covers.Count - 1;
    }

    private void Edit(CoverEdit edit)
    {
        var index = Selected;
        Editor.Change($"{edit.What} of {Covers[index].Name}", p => index < p.Covers.Count ? p with { Covers = p.Covers.SetItem(index, edit.Apply(p.Covers[index])) } : p);
    }

    private void Duplicate(int index)
    {
        var copy = Covers[index] with { Name = $"{Covers[index].Name} (copy)" };
        Editor.Change($"Duplicate {Covers[index].Name}", p => p with { Covers = p.Covers.Insert(index + 1, copy) });
        selected = index + 1;
    }

    private void Delete(int index)
    {
        var cover = Covers[index];
        Editor.Change($"Delete {cover.Name}", p => p with { Covers = p.Covers.RemoveAt(index) });
        selected = Math.Max(0, index <= selected ? selected - 1 : selected);
        editing++;
        Snackbar.Add($"“{cover.Name}” deleted.", Severity.Normal, options =>
        {
            options.Action = "Undo";
            options.OnClick = _ => InvokeAsync(() => PutBack(cover, index));
        });
    }

    // Not the editor's undo: other edits may have come after the deletion, and they are to stay.
    private void PutBack(Cover cover, int index)
    {
        Editor.Change($"Put back {cover.Name}", p => p with { Covers = p.Covers.Insert(Math.Min(index, p.Covers.Count), cover) });
        selected = Math.Min(index, Covers.Count - 1);
        editing++;
    }
}
