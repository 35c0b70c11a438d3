using System.Collections.Concurrent;
using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>Everything that a page should not do: errors in its console, answers that failed, requests to other machines.</summary>
internal sealed class PageWatch
{
    private readonly Uri own;
    private readonly ConcurrentQueue<string> complaints = [];

    public PageWatch(IPage page, Uri own)
    {
        this.own = own;
        page.Console += (_, message) => Note(message.Type == "error", $"console: {message.Text}");
        page.PageError += (_, error) => Note(true, $"error: {error}");
        page.Request += (_, request) => Note(IsForeign(request.Url), $"request to {request.Url}");
        page.WebSocket += (_, socket) => Note(IsForeign(socket.Url), $"connection to {socket.Url}");
        page.Response += (_, response) => Note(response.Status >= 400, $"{response.Status} from {response.Url}");
    }

    public IReadOnlyCollection<string> Complaints => complaints;

    private void Note(bool applies, string complaint)
    {
        if (applies)
        {
            complaints.Enqueue(complaint);
        }
    }

    private bool IsForeign(string url) =>
        new Uri(url) is { Scheme: not ("data" or "blob") } uri && (uri.Host != own.Host || uri.Port != own.Port);
}
