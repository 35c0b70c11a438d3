using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Web.Pages.PlaneAreas;
using MudBlazor.Services;

namespace FloodPanel.Web.Tests.Pages;

public class PlaneAreasPageTests : BunitContext
{
    public PlaneAreasPageTests()
    {
        Services.AddMudServices();
        JSInterop.Mode = JSRuntimeMode.Loose;
    }

    /// <summary>D 0.6 m with its lowest point 1.4 m down: 9806.65·1.1·π·0.09 = 3.05 kN, 1.1 + 0.0225/1.1 m deep.</summary>
    [Fact]
    public void Type_Depth_ForceCentreDrawingAndStepsFollow()
    {
        var page = Show();

        Field(page, "depth").Input("1.4");

        Assert.Equal("3.05 kN", page.Find("[data-testid=plane-force]").TextContent);
        Assert.Equal("1.120 m", page.Find("[data-testid=plane-centre]").TextContent);
        Assert.NotNull(page.Find("[data-testid=plane-drawing] svg"));
        Assert.Contains("π·D²/4", page.Find("[data-testid=plane-steps]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Shape_OtherAndBack_KeepsWhatWasTyped()
    {
        var page = Show();
        Field(page, "diameter").Input("0.8");

        Choose(page, "Trapezoid");
        Assert.Equal("1.2", Field(page, "top").GetAttribute("value"));
        Choose(page, "Circle");

        Assert.Equal("0.8", Field(page, "diameter").GetAttribute("value"));
    }

    [Fact]
    public void Polygon_CornersCross_SaysWhichSidesAndKeepsTheLastResult()
    {
        var page = Show();
        Choose(page, "Polygon");
        var before = page.Find("[data-testid=plane-force]").TextContent;

        Field(page, "corners[2].x").Input("-1");

        Assert.Contains("The side from corner", page.Find("[data-testid=problem-corners]").TextContent, StringComparison.Ordinal);
        Assert.Equal(before, page.Find("[data-testid=plane-force]").TextContent);
        Assert.Single(page.FindAll(".results.stale"));
    }

    [Fact]
    public void Polygon_CornerAddedAndRemoved_KeepsTheArea()
    {
        var page = Show();
        Choose(page, "Polygon");
        var before = page.Find("[data-testid=plane-force]").TextContent;

        page.Find("[data-testid=corner-1] button").Click();
        Assert.Equal(5, page.FindAll(".corner").Count);
        Assert.Equal(before, page.Find("[data-testid=plane-force]").TextContent);
        page.FindAll("[data-testid=corner-2] button")[1].Click();

        Assert.Equal(4, page.FindAll(".corner").Count);
    }

    [Fact]
    public void Units_US_FiguresInPoundsAndFeet()
    {
        var page = Render<PlaneAreasPage>(p => p.AddCascadingValue(UnitSystem.USCustomary));

        Assert.EndsWith("lbf", page.Find("[data-testid=plane-force]").TextContent, StringComparison.Ordinal);
        Assert.EndsWith("ft", page.Find("[data-testid=plane-centre]").TextContent, StringComparison.Ordinal);
    }

    private IRenderedComponent<PlaneAreasPage> Show() => Render<PlaneAreasPage>(p => p.AddCascadingValue(UnitSystem.SI));

    private static AngleSharp.Dom.IElement Field(IRenderedComponent<PlaneAreasPage> page, string key) =>
        page.Find($"[data-testid='field-{key}']");

    private static void Choose(IRenderedComponent<PlaneAreasPage> page, string shape)
    {
        var option = Field(page, "shape").QuerySelectorAll("option").First(o => o.TextContent == shape);
        Field(page, "shape").Change(option.GetAttribute("value"));
    }
}
