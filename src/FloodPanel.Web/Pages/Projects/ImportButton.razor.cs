using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Microsoft.JSInterop;

namespace FloodPanel.Web.Pages.Projects;

/// <summary>Takes project files by button, or dropped anywhere on the page.</summary>
public sealed partial class ImportButton : IAsyncDisposable
{
    private const string InputId = "import-files";
    private const string AreaId = "drop-files";
    private const int MostFiles = 50;

    private IJSObjectReference? drop;

    [Inject]
    public required IJSRuntime JS { get; init; }

    [Parameter, EditorRequired]
    public required EventCallback<IReadOnlyList<IBrowserFile>> OnFiles { get; set; }

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            var module = await JS.InvokeAsync<IJSObjectReference>("import", $"./{Assets["js/drop-files.js"]}");
            drop = await module.InvokeAsync<IJSObjectReference>("listen", InputId, AreaId);
            await module.DisposeAsync();
        }
    }

    private Task Chosen(InputFileChangeEventArgs chosen) => OnFiles.InvokeAsync(chosen.GetMultipleFiles(MostFiles));

    public async ValueTask DisposeAsync()
    {
        if (drop is not null)
        {
            try
            {
                await drop.InvokeVoidAsync("stop");
                await drop.DisposeAsync();
            }
            catch (JSDisconnectedException)
            {
                // The browser is gone, and its listeners with it.
            }
        }
    }
}
