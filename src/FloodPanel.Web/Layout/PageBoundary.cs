using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Rendering;

namespace FloodPanel.Web.Layout;

/// <summary>
/// Keeps a fault of one page to that page. The project lives outside of it, in the editor, so that everything
/// typed is still there when the page is drawn anew.
/// </summary>
public sealed class PageBoundary : ErrorBoundaryBase
{
    [Inject]
    public required ILogger<PageBoundary> Logger { get; init; }

    protected override Task OnErrorAsync(Exception exception)
    {
        Log.PageFailed(Logger, exception);
        return Task.CompletedTask;
    }

    protected override void BuildRenderTree(RenderTreeBuilder builder)
    {
        if (CurrentException is null)
        {
            builder.AddContent(0, ChildContent);
        }
        else
        {
            builder.OpenComponent<PageFault>(1);
            builder.AddComponentParameter(2, nameof(PageFault.OnRetry), EventCallback.Factory.Create(this, Recover));
            builder.CloseComponent();
        }
    }
}
