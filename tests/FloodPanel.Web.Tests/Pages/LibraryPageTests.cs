using Bunit;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Web.Pages.LibraryTables;
using Microsoft.Extensions.DependencyInjection;
using MudBlazor.Services;

namespace FloodPanel.Web.Tests.Pages;

public class LibraryPageTests : BunitContext
{
    private readonly Calculation.Library library = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    public LibraryPageTests()
    {
        Services.AddMudServices();
        Services.AddSingleton(library);
        JSInterop.Mode = JSRuntimeMode.Loose;
    }

    [Fact]
    public void Materials_EachHasItsSourceAndItsMark()
    {
        var page = Render<LibraryPage>();

        Assert.Equal(library.Materials.Count, page.FindAll("[data-testid=materials] tbody tr").Count);
        Assert.All(library.Materials.Values, entry =>
        {
            var row = page.Find($"[data-testid=row-{entry.Id}]").TextContent;
            Assert.Contains(entry.Source, row, StringComparison.Ordinal);
            Assert.Contains(entry.FromMemory ? "From memory" : entry.Evidence, row, StringComparison.Ordinal);
        });
    }

    [Fact]
    public void Family_Chosen_LeavesItsMaterialsOnly()
    {
        var page = Render<LibraryPage>();

        Choose(page, "library.family", "Timber");

        Assert.Equal(
            library.Materials.Values.Count(m => m.Item.Family == Calculation.ProjectTree.MaterialFamily.Timber),
            page.FindAll("[data-testid=materials] tbody tr").Count);
    }

    [Fact]
    public void Profile_Chosen_IsDrawnWithItsSource()
    {
        var page = Render<LibraryPage>();
        page.Find("[data-testid='field-library.table'] label:nth-child(2) input").Change(true);
        Assert.Equal(library.Profiles.Count, page.FindAll("[data-testid=profiles] tbody tr").Count);

        page.Find("[data-testid=row-cf-100-100-5] button").Click();

        var row = page.Find("[data-testid=row-cf-100-100-5]");
        Assert.NotNull(row.QuerySelector("svg"));
        Assert.Contains("EN 10219-2", row.TextContent, StringComparison.Ordinal);
        Assert.Contains("14.4", row.TextContent, StringComparison.Ordinal);
    }

    private static void Choose(IRenderedComponent<LibraryPage> page, string key, string words)
    {
        var field = page.Find($"[data-testid='field-{key}']");
        field.Change(field.QuerySelectorAll("option").First(o => o.TextContent == words).GetAttribute("value"));
    }
}
