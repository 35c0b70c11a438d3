using Bunit;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Pages.Projects;
using FloodPanel.Web.Tests.Editing;
using Microsoft.AspNetCore.Components;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;
using MudBlazor.Services;

namespace FloodPanel.Web.Tests.Pages;

/// <summary>Pages on a store of their own, with the library that is delivered.</summary>
public abstract class PageContext : BunitContext
{
    private readonly string folder = Directory.CreateTempSubdirectory("floodpanel-pages-").FullName;

    protected PageContext()
    {
        StoreSetup.Open(folder);
        JSInterop.Mode = JSRuntimeMode.Loose;
        Services.AddMudServices();
        Services.AddSingleton<TimeProvider>(Time);
        Services.AddFloodPanelStorage(folder);
        Services.AddSingleton(LibraryFiles.Load(LibraryFiles.DeliveredFolder));
        Services.AddSingleton<ProjectImport>();
        Services.AddSingleton<OpenEditors>();
        Services.AddSingleton(s => ProjectAccess.To(s.GetRequiredService<ProjectStore>()));
        Services.AddSingleton<ScreenSettings>();
        Services.AddSingleton<ProjectEditor>();
        SetRendererInfo(new RendererInfo("Server", isInteractive: true));
    }

    protected ManualTime Time { get; } = new();

    protected ProjectStore Store => Services.GetRequiredService<ProjectStore>();

    protected ProjectEditor Editor => Services.GetRequiredService<ProjectEditor>();

    protected ScreenSettings Settings => Services.GetRequiredService<ScreenSettings>();

    protected NavigationManager Navigation => Services.GetRequiredService<NavigationManager>();

    protected async Task<Guid> PutAsync(Project project) => (await Store.CreateAsync(project)).Id;

    protected Task<IReadOnlyList<ProjectSummary>> ListAsync() => Store.ListAsync(cancellation: Xunit.TestContext.Current.CancellationToken);

    protected Task<StoredProject?> OpenAsync(Guid id) => Store.OpenAsync(id, Xunit.TestContext.Current.CancellationToken);

    protected IRenderedComponent<PageHost> Show<TPage>(Action<ComponentParameterCollectionBuilder<TPage>>? parameters = null)
        where TPage : IComponent =>
        Render<PageHost>(host => host.AddChildContent(parameters ?? (_ => { })));

    protected override void Dispose(bool disposing)
    {
        base.Dispose(disposing);
        SqliteConnection.ClearAllPools();
        Directory.Delete(folder, recursive: true);
    }
}
