using FloodPanel.Calculation;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Layout;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web;

public sealed partial class App
{
    [CascadingParameter]
    public required HttpContext Context { get; init; }

    private UnitSystem Units => RememberedSettings.Units(Context.Request.Cookies);

    private ThemeChoice Theme => RememberedSettings.Theme(Context.Request.Cookies);

    private bool SystemIsDark => RememberedSettings.SystemIsDark(Context.Request.Cookies);

    private string ThemeClass =>
        Theme == ThemeChoice.Dark || (Theme == ThemeChoice.System && SystemIsDark) ? "fp-theme-dark" : "fp-theme-light";

    // A page with a form is not drawn before it is connected: what is typed into a dead form would be lost.
    private IComponentRenderMode Mode =>
        new InteractiveServerRenderMode(prerender: !Context.Request.Path.StartsWithSegments("/projects"));
}
