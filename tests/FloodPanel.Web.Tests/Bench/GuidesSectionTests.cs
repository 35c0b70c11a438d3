using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Pages.Bench;

namespace FloodPanel.Web.Tests.Bench;

public class GuidesSectionTests : BenchContext
{
    private GuideSet? Guides => Editor.Project.Openings.Single(o => o.Id == "door").Barrier.Guides;

    [Fact]
    public void Switch_On_ShowsDrawingChecksAndWhatToEnter()
    {
        var page = Open("door");
        Assert.Empty(page.FindAll("[data-testid=detail-guide-in-plan]"));

        page.Find("[data-testid=switch-guides]").Change(true);

        Assert.Equal(GuideMounting.Reveal, Guides!.Mounting);
        Assert.NotNull(page.Find("[data-testid=detail-guide-in-plan]"));
        Assert.NotNull(page.Find("[data-testid=part-guides-left-guide-guide-lip-bending]"));
        Assert.NotNull(page.Find("[data-testid=note-guide-fasteners-values]"));
        Assert.NotNull(page.Find("[data-testid=note-guides-wall-bearing]"));
    }

    [Fact]
    public void Values_AllWithTheirSources_CompleteGuidesAndAnchors()
    {
        var page = Open("door");
        page.Find("[data-testid=switch-guides]").Change(true);

        Field(page, "guides.wallBearing").Input("5");
        Field(page, "guides.wallBearingSource").Input("Engineer's letter");
        Field(page, "guides.fasteners.tension").Input("9");
        Field(page, "guides.fasteners.shear").Input("12");
        Field(page, "guides.fasteners.minimumEdge").Input("80");
        Field(page, "guides.fasteners.minimumSpacing").Input("100");
        Field(page, "guides.fasteners.source").Input("Approval 12/345 (invented)");

        Assert.Empty(page.FindAll("[data-testid^=note-guide-fasteners], [data-testid^=note-guides]"));
        page.Find("[data-testid=use-anchors-left-guide-fastener-interaction]").Click();
        Assert.Contains("Approval 12/345 (invented)", page.Find("[data-testid=working]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Mounting_OfUntouchedGuides_BringsTheFirstDimensionsOfTheOther()
    {
        var page = Open("door");
        page.Find("[data-testid=switch-guides]").Change(true);

        Mount(page, "Dry face");

        Assert.Equal(FirstGuides.Of(Examples.Door.Barrier, Examples.Library, DesignBasisKind.AllowableStress, GuideMounting.DryFace), Guides);
        Assert.Contains("pulls the guide off", Text(page, "guide-way"), StringComparison.Ordinal);
        Assert.DoesNotContain(page.FindAll("[data-testid^=part-anchors-left-guide]"), row => row.TextContent.Contains("Shear", StringComparison.Ordinal));
    }

    [Fact]
    public void Mounting_OfTypedGuides_KeepsWhatWasTyped()
    {
        var page = Open("door");
        page.Find("[data-testid=switch-guides]").Change(true);
        Field(page, "guides.lipThickness").Input("11");

        Mount(page, "Wet face");

        Assert.Equal(0.011, Guides!.LipThickness, 1e-12);
        Assert.Equal(GuideMounting.WetFace, Guides.Mounting);
    }

    [Fact]
    public void Switch_OffAndOn_IsWhatItWas()
    {
        var page = Open("door");
        page.Find("[data-testid=switch-guides]").Change(true);
        Field(page, "guides.fasteners.pitch").Input("180");

        page.Find("[data-testid=switch-guides]").Change(false);
        Assert.Null(Guides);
        page.Find("[data-testid=switch-guides]").Change(true);

        Assert.Equal(0.18, Guides!.Fasteners.Pitch, 1e-12);
    }

    [Fact]
    public void BearingDistance_PastTheArris_IsRefusedInWords()
    {
        var page = Open("door");
        page.Find("[data-testid=switch-guides]").Change(true);

        Field(page, "guides.bearingDistance").Input("95");

        Assert.Contains("or it reaches past the arris", page.Find("[data-testid=bench-form]").TextContent, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(GuideMounting.WetFace)]
    [InlineData(GuideMounting.DryFace)]
    [InlineData(GuideMounting.Reveal)]
    public void FirstGuides_AnyMounting_HaveNoProblemsAndNoStrengths(GuideMounting mounting)
    {
        var guides = FirstGuides.Of(Examples.Door.Barrier, Examples.Library, DesignBasisKind.Eurocode, mounting);
        var project = Editor.Project with { Name = "First guides", Openings = [Examples.Door with { Barrier = Examples.Door.Barrier with { Guides = guides } }] };

        Assert.Empty(project.Validate(Examples.Library));
        Assert.Null(guides.WallBearing);
        Assert.Null(guides.Fasteners.Tension);
        Assert.Equal(DesignBasisKind.Eurocode, guides.Fasteners.ValuesFor);
    }

    private static void Mount(IRenderedComponent<BenchPage> page, string words) => Field(page, "guides.mounting")
        .QuerySelectorAll("label").Single(label => label.TextContent.Contains(words, StringComparison.Ordinal)).QuerySelector("input")!.Change(true);
}
