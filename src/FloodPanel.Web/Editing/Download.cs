using Microsoft.JSInterop;

namespace FloodPanel.Web.Editing;

public static class Download
{
    /// <summary>Lets the browser download an address of ours; the sentence when the server refuses, else null.</summary>
    public static ValueTask<string?> DownloadAsync(this IJSRuntime js, string address) =>
        js.InvokeAsync<string?>("floodpanel.download", address);
}
