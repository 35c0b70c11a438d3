using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>On a telephone nothing stands beside the screen.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class NarrowScreenTests : IDisposable
{
    /// <summary>Each page of the project, and what shows that its content has come.</summary>
    private static readonly (string Tab, string Landmark)[] Tabs = [("Site", "level-sum"), ("Openings", "openings"), ("Garage entrance", "ladder")];

    private readonly string dataFolder = Directory.CreateTempSubdirectory("floodpanel-narrow-").FullName;

    public void Dispose() => Directory.Delete(dataFolder, recursive: true);

    [Theory]
    [InlineData(ColorScheme.Light)]
    [InlineData(ColorScheme.Dark)]
    public async Task Pages_400Wide_NothingScrollsSideways(ColorScheme scheme)
    {
        Assert.SkipWhen(Chromium.Path is null, Chromium.Missing);
        using var playwright = await Playwright.CreateAsync();
        await using var browser = await Chromium.StartAsync(playwright);
        using var app = await AppProcess.StartAsync(dataFolder);
        var page = await browser.NewPageAsync(new() { ViewportSize = new() { Width = 400, Height = 800 }, ColorScheme = scheme });
        var watch = new PageWatch(page, app.Address);
        var desk = new Desk(page, app.Address);

        await desk.OpenProjectsAsync();
        await AssertFitsAsync(page, "Projects");
        await desk.OpenProjectAsync("Sallow Reach boat workshop");
        foreach (var (tab, landmark) in Tabs)
        {
            await desk.TabAsync(tab);
            await page.GetByTestId(landmark).WaitForAsync();
            await AssertFitsAsync(page, tab);
        }

        Assert.Empty(watch.Complaints);
        Assert.Empty(app.Faults);
    }

    // The screen as a whole, and the part of it below the bars, which scrolls by itself.
    private static async Task AssertFitsAsync(IPage page, string name)
    {
        var excess = await page.EvaluateAsync<int[]>(
            "() => [document.scrollingElement, document.querySelector('main')].map(e => e.scrollWidth - e.clientWidth)");

        Assert.True(excess is [0, 0], $"{name} is wider than a screen of 400 pixels: the page by {excess[0]}, its main part by {excess[1]}.");
    }
}
