using System.Globalization;
using Bunit;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Pages.Bench;
using FloodPanel.Web.Tests.Editing;
using Microsoft.Extensions.DependencyInjection;
using MudBlazor.Services;

namespace FloodPanel.Web.Tests.Bench;

/// <summary>The Bench with an editor on a store in memory and the real calculation.</summary>
public abstract class BenchContext : BunitContext
{
    private readonly Guid id;

    protected BenchContext()
    {
        var time = new ManualTime();
        var store = new MemoryStore(time);
        id = store.Put(Examples.Mill);
        Services.AddMudServices();
        Services.AddSingleton<TimeProvider>(time);
        Services.AddSingleton(store.Access);
        Services.AddSingleton(Examples.Library);
        Services.AddSingleton<OpenEditors>();
        Services.AddScoped<ScreenSettings>();
        Services.AddScoped<ProjectEditor>();
        JSInterop.Mode = JSRuntimeMode.Loose;
        JSInterop.SetupModule(invocation => invocation.Identifier == "import").SetupModule("listen", _ => true);
    }

    protected Guid Id => id;

    protected ProjectEditor Editor => Services.GetRequiredService<ProjectEditor>();

    protected IRenderedComponent<BenchPage> Open(string opening) =>
        Render<BenchPage>(p => p.Add(b => b.Id, Id).Add(b => b.OpeningId, opening));

    protected static AngleSharp.Dom.IElement Field(IRenderedComponent<BenchPage> page, string key) =>
        page.Find($"[data-testid='field-{key}']");

    protected static void Choose(IRenderedComponent<BenchPage> page, string key, string words)
    {
        var option = Field(page, key).QuerySelectorAll("option").First(o => o.TextContent == words);
        Field(page, key).Change(option.GetAttribute("value"));
    }

    protected static string Text(IRenderedComponent<BenchPage> page, string name) => page.Find($"[data-testid={name}]").TextContent;

    protected static double Number(IRenderedComponent<BenchPage> page, string name) =>
        double.Parse(Text(page, name), CultureInfo.InvariantCulture);
}
