using System.Globalization;
using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>What an engineer does at the screen.</summary>
internal sealed class Desk(IPage page, Uri address)
{
    public IPage Page => page;

    /// <summary>The list is drawn before the page is connected; it can be used once it is live.</summary>
    public async Task OpenProjectsAsync()
    {
        await page.GotoAsync(address.ToString());
        await page.Locator("[data-live]").WaitForAsync();
    }

    /// <summary>A project by its name in the list.</summary>
    public async Task OpenProjectAsync(string name)
    {
        await OpenProjectsAsync();
        await page.GetByRole(AriaRole.Link, new() { Name = name }).ClickAsync();
        await page.GetByTestId("save-state").WaitForAsync();
    }

    public async Task NewProjectAsync(string name)
    {
        await OpenProjectsAsync();
        await DialogAsync("New project");
        await TypeAsync("projectName", name);
        await SubmitAsync();
        await page.GetByTestId("save-state").WaitForAsync();
    }

    public async Task AddOpeningAsync(string name, string sillLevel, string clearWidth, string clearHeight)
    {
        await TabAsync("Openings");
        await DialogAsync("Add opening");
        await TypeAsync("openingName", name);
        await TypeAsync("sillLevel", sillLevel);
        await TypeAsync("clearWidth", clearWidth);
        await TypeAsync("clearHeight", clearHeight);
        await page.GetByTestId("proposal").GetByText("Proposed").WaitForAsync();
        await SubmitAsync();
        await page.GetByTestId("verdict-banner").WaitForAsync();
    }

    /// <summary>One of the pages of the project: Site, Openings, or an opening by its name.</summary>
    public async Task TabAsync(string name)
    {
        await page.Locator("nav.tabs").GetByText(name, new() { Exact = true }).ClickAsync();
        await page.Locator("nav.tabs a.active").GetByText(name, new() { Exact = true }).WaitForAsync();
    }

    public Task TypeAsync(string field, string text) => Field(field).FillAsync(text);

    public async Task ChooseAsync(string field, string label) => await Field(field).SelectOptionAsync(new SelectOptionValue { Label = label });

    /// <summary>What a list shows as chosen.</summary>
    public Task<string> ChosenAsync(string field) => Field(field).EvaluateAsync<string>("list => list.selectedOptions[0].text");

    public async Task<double> NumberAsync(string field) => double.Parse(await Field(field).InputValueAsync(), CultureInfo.InvariantCulture);

    public Task<string> TextAsync(string field) => Field(field).InputValueAsync();

    /// <summary>"adequate", "inadequate" or "incomplete".</summary>
    public Task WaitForVerdictAsync(string kind) => page.Locator($"[data-testid=verdict-banner][data-kind={kind}]").WaitForAsync();

    public Task WaitUntilSavedAsync() => page.Locator("[data-testid=save-state][data-step=Saved]").WaitForAsync();

    private ILocator Field(string field) => page.GetByTestId($"field-{field}");

    private async Task DialogAsync(string button)
    {
        await page.GetByRole(AriaRole.Button, new() { Name = button, Exact = true }).First.ClickAsync();
        await page.GetByRole(AriaRole.Dialog).WaitForAsync();
    }

    private async Task SubmitAsync()
    {
        var dialog = page.GetByRole(AriaRole.Dialog);
        await dialog.Locator("button[type=submit]").ClickAsync();
        try
        {
            await dialog.WaitForAsync(new() { State = WaitForSelectorState.Detached, Timeout = 10_000 });
        }
        catch (TimeoutException e)
        {
            throw new InvalidOperationException($"The dialog stays open and says: {await dialog.InnerTextAsync()}", e);
        }
    }
}
