using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class WallAndFootingTests : BenchContext
{
    private Opening Opening => Editor.Project.Openings[0];

    [Fact]
    public void Wall_ResistanceAndSource_CompletesTheWall()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-wall]").Change(true);
        Assert.NotNull(page.Find("[data-testid=note-wall-resistance-missing]"));

        Field(page, "wall.totalResistance").Input("40");
        Field(page, "wall.source").Input("Drawing W-1");

        Assert.Equal(40e3, Opening.WallBehind!.TotalResistance!.Value, 1e-6);
        Assert.Empty(page.FindAll("[data-testid=note-wall-resistance-missing], [data-testid=note-wall-source-missing]"));
        page.Find("[data-testid='use-supporting-wall-left-wall-wall-reaction']").Click();
        Assert.Contains("Drawing W-1", page.Find("[data-testid=working]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Wall_SwitchedOffAndOn_IsWhatItWas()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-wall]").Change(true);
        Choose(page, "wall.measure", "Published depth");

        page.Find("[data-testid=switch-wall]").Change(false);
        Assert.Null(Opening.WallBehind);
        page.Find("[data-testid=switch-wall]").Change(true);

        Assert.Equal(WallMeasure.PublishedDepth, Opening.WallBehind!.Measure);
    }

    [Fact]
    public void Footing_On_ShowsDrawingChecksAndCaution()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-footing]").Change(true);

        Assert.Contains("Footing, design flood", page.Find("[data-testid='detail-footing']").TextContent, StringComparison.Ordinal);
        Assert.NotNull(page.Find("[data-testid=part-supporting-wall-footing-footing-sliding]"));
        Assert.NotNull(page.Find("[data-testid=note-ground-values]"));

        Field(page, "footing.width").Input("2.8");

        Assert.Equal(2.8, Opening.Barrier.Footing!.Width);
    }

    [Fact]
    public void Footing_BarrierBeyondIt_IsRefusedInWords()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-footing]").Change(true);

        Field(page, "footing.barrierFromFloodEdge").Input("2");

        Assert.Contains("allowed is up to the footing width", page.Find("[data-testid=bench-form]").TextContent, StringComparison.Ordinal);
    }
}
