using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>Ties fields and dimensions together: pointing at one lights the other, a click on a dimension goes to its field.</summary>
public sealed partial class FieldPointing : IAsyncDisposable
{
    private ElementReference place;
    private IJSObjectReference? pointing;

    [Inject]
    public required IJSRuntime JS { get; init; }

    protected override bool ShouldRender() => false;

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            await using var module = await JS.InvokeAsync<IJSObjectReference>("import", $"./{Assets["js/pointing.js"]}");
            pointing = await module.InvokeAsync<IJSObjectReference>("listen", place);
        }
    }

    public async ValueTask DisposeAsync()
    {
        if (pointing is null)
        {
            return;
        }

        try
        {
            await pointing.InvokeVoidAsync("stop");
            await pointing.DisposeAsync();
        }
        catch (JSDisconnectedException)
        {
            // The browser is gone, and its listeners with it.
        }
    }
}
