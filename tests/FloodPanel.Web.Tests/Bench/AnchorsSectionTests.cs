using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class AnchorsSectionTests : BenchContext
{
    private AnchorInput? Anchors => Editor.Project.Openings[0].Barrier.Anchors;

    [Fact]
    public void OneBay_NoPosts_NoSection()
    {
        var page = Open(Examples.Door.Id);

        Assert.Empty(page.FindAll("[data-testid=switch-anchors]"));
    }

    [Fact]
    public void Switch_On_AsksForWhatIsMissing()
    {
        var page = Open("garage");

        page.Find("[data-testid=switch-anchors]").Change(true);

        Assert.NotNull(Anchors);
        Assert.NotNull(page.Find("[data-testid=note-anchors-no-plate]"));
        Assert.NotNull(page.Find("[data-testid=note-anchor-installation]"));
    }

    [Theory]
    [InlineData("Cast in, headed", "anchors.headArea", "anchors.hookLength,anchors.pullout,anchors.source")]
    [InlineData("Cast in, hooked", "anchors.hookLength", "anchors.headArea,anchors.pullout,anchors.source")]
    [InlineData("Drilled", "anchors.pullout", "anchors.headArea,anchors.hookLength")]
    public void Kind_Chosen_ShowsItsFieldsOnly(string kind, string shown, string hidden)
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-anchors]").Change(true);
        Choose(page, "anchors.method", "ACI 318-19");

        Choose(page, "anchors.kind", kind);

        Assert.NotEmpty(page.FindAll($"[data-field='{shown}']"));
        Assert.All(hidden.Split(','), key => Assert.Empty(page.FindAll($"[data-field='{key}']")));
    }

    /// <summary>Splitting counts where the concrete does not crack: for drilled anchors, and for all under EN 1992-4.</summary>
    [Theory]
    [InlineData("ACI 318-19", "Drilled", true)]
    [InlineData("ACI 318-19", "Cast in, headed", false)]
    [InlineData("EN 1992-4", "Cast in, headed", true)]
    public void Uncracked_Chosen_AsksForTheCriticalEdge(string method, string kind, bool asks)
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-anchors]").Change(true);
        Choose(page, "anchors.method", method);
        Choose(page, "anchors.kind", kind);
        Assert.Empty(page.FindAll("[data-field='anchors.criticalEdge']"));

        page.Find("[data-testid=anchors-cracked]").Change(false);

        Assert.False(Anchors!.Cracked);
        Assert.Equal(asks, page.FindAll("[data-field='anchors.criticalEdge']").Count > 0);
    }

    [Fact]
    public void Values_Typed_AreInTheProjectAndSurviveOffAndOn()
    {
        var page = Open("garage");
        page.Find("[data-testid=switch-anchors]").Change(true);
        Field(page, "anchors.tensionResistance").Input("25");
        Field(page, "anchors.edgeProtected").Input("180");
        Field(page, "anchors.source").Input("Approval A-7");
        var before = Anchors;

        page.Find("[data-testid=switch-anchors]").Change(false);
        page.Find("[data-testid=switch-anchors]").Change(true);

        Assert.Equal(before, Anchors);
        Assert.Equal((25e3, 0.18), (Anchors!.TensionResistance!.Value, Anchors.EdgeProtected!.Value));
    }
}
