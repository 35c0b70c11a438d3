using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>On a telephone nothing stands beside the screen.</summary>
[Collection(Chromium.OneAtATime)]
public sealed class NarrowScreenTests : IDisposable
{
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
        foreach (var tab in new[] { "Site", "Openings", "Garage entrance" })
        {
            await desk.TabAsync(tab);
            await AssertFitsAsync(page, tab);
        }

        Assert.Empty(watch.Complaints);
    }

    private static async Task AssertFitsAsync(IPage page, string name)
    {
        var width = await page.EvaluateAsync<int>("document.scrollingElement.scrollWidth");

        Assert.True(width <= 400, $"{name} is {width} pixels wide on a screen of 400.");
    }
}
