using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;
using MudBlazor;

namespace FloodPanel.Web.Pages.Projects;

public sealed partial class NewProjectDialog
{
    private string name = "";
    private Sentence? problem;

    [CascadingParameter]
    public required IMudDialogInstance Dialog { get; set; }

    private void Create()
    {
        if (name.Trim() is { Length: > 0 } given)
        {
            Dialog.Close(given);
        }
        else
        {
            problem = new($"Project name is empty; give the project a name.");
        }
    }
}
