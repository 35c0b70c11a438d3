using Bunit;
using FloodPanel.Calculation.Verification;
using FloodPanel.Web.Pages.Verification;
using MudBlazor.Services;

namespace FloodPanel.Web.Tests.Pages;

public class VerificationPageTests : BunitContext
{
    [Fact]
    public void Render_Table_ShowsEveryRowWithItsFigures()
    {
        Services.AddMudServices();
        JSInterop.Mode = JSRuntimeMode.Loose;

        var page = Render<VerificationPage>();

        var rows = VerificationTable.Rows();
        Assert.Equal(rows.Count, page.FindAll("[data-testid=verification] tbody tr:not(.group)").Count);
        Assert.Contains($"All {rows.Count} agree.", page.Markup, StringComparison.Ordinal);
        var debris = page.FindAll("tbody tr").First(r => r.TextContent.Contains("C_D 0.75, concrete wall", StringComparison.Ordinal));
        Assert.Contains("3405", debris.TextContent, StringComparison.Ordinal);
    }
}
