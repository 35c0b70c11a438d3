using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using MudBlazor;

namespace FloodPanel.Web.Pages.Openings;

public sealed partial class OpeningsPage
{
    [Inject]
    public required Library Library { get; init; }

    [Inject]
    public required IDialogService Dialogs { get; init; }

    [Inject]
    public required ISnackbar Snackbar { get; init; }

    [Inject]
    public required NavigationManager Navigation { get; init; }

    private async Task AddAsync()
    {
        var dialog = await Dialogs.ShowAsync<AddOpeningDialog>("Add opening", new DialogParameters<AddOpeningDialog>
        {
            { d => d.Project, Project },
            { d => d.Units, Units },
        });
        if (await dialog.Result is { Canceled: false, Data: Opening opening })
        {
            Editor.Change($"Add {opening.Name}", p => p with { Openings = p.Openings.Add(opening) });
            Navigation.NavigateTo(ProjectAddress.Bench(Id, opening.Id));
        }
    }

    private void Duplicate(Opening opening)
    {
        var name = $"{opening.Name} (copy)";
        var copy = opening with { Id = OpeningProposal.IdFor(Project, name), Name = name };
        Editor.Change($"Duplicate {opening.Name}", p => p with { Openings = p.Openings.Insert(IndexOf(opening) + 1, copy) });
    }

    private void Move((Opening Opening, int By) move)
    {
        var (from, to) = (IndexOf(move.Opening), IndexOf(move.Opening) + move.By);
        if (to >= 0 && to < Project.Openings.Count)
        {
            Editor.Change($"Move {move.Opening.Name}", p => p with { Openings = p.Openings.RemoveAt(from).Insert(to, move.Opening) });
        }
    }

    private void Delete(Opening opening)
    {
        var index = IndexOf(opening);
        Editor.Change($"Delete {opening.Name}", p => p with { Openings = p.Openings.RemoveAt(index) });
        Snackbar.Add($"“{opening.Name}” deleted.", Severity.Normal, options =>
        {
            options.Action = "Undo";
            options.OnClick = _ => InvokeAsync(() => PutBack(opening, index));
        });
    }

    // Not the editor's undo: other edits may have come after the deletion, and they are to stay.
    private void PutBack(Opening opening, int index)
    {
        if (Project.Openings.All(o => o.Id != opening.Id))
        {
            Editor.Change($"Put back {opening.Name}",
                p => p with { Openings = p.Openings.Insert(Math.Min(index, p.Openings.Count), opening) });
        }
    }

    private int IndexOf(Opening opening)
    {
        for (var i = 0; i < Project.Openings.Count; i++)
        {
            if (Project.Openings[i].Id == opening.Id)
            {
                return i;
            }
        }

        throw new InvalidOperationException($"Opening {opening.Id} is not in the project.");
    }
}
