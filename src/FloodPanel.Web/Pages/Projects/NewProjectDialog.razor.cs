using Microsoft.AspNetCore.Components;
using MudBlazor;

namespace FloodPanel.Web.Pages.Projects;

public sealed partial class NewProjectDialog
{
    private string name = "";

    [CascadingParameter]
    public required IMudDialogInstance Dialog { get; set; }

    private void Create()
    {
        if (name.Trim() is { Length: > 0 } given)
        {
            Dialog.Close(given);
        }
    }
}
