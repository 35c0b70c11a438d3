using FloodPanel.Web.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace FloodPanel.Web.Layout;

public sealed partial class UndoButtons : IAsyncDisposable
{
    private DotNetObjectReference<UndoButtons>? self;
    private IJSObjectReference? keys;

    [Inject]
    public required IJSRuntime JS { get; init; }

    [Parameter, EditorRequired]
    public required ProjectEditor Editor { get; set; }

    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (firstRender)
        {
            self = DotNetObjectReference.Create(this);
            var module = await JS.InvokeAsync<IJSObjectReference>("import", $"./{Assets["js/undo-keys.js"]}");
            keys = await module.InvokeAsync<IJSObjectReference>("listen", self);
            await module.DisposeAsync();
        }
    }

    [JSInvokable]
    public void Undo() => Editor.Undo();

    [JSInvokable]
    public void Redo() => Editor.Redo();

    private static string Tip(string verb, string? what, string key) => what is null ? $"{verb} ({key})" : $"{verb}: {what} ({key})";

    public async ValueTask DisposeAsync()
    {
        self?.Dispose();
        if (keys is not null)
        {
            try
            {
                await keys.InvokeVoidAsync("stop");
                await keys.DisposeAsync();
            }
            catch (JSDisconnectedException)
            {
                // The browser is gone, and its listener with it.
            }
        }
    }
}
