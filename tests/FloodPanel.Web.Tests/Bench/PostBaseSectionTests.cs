using Bunit;
using FloodPanel.Calculation;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Web.Tests.Bench;

public class PostBaseSectionTests : BenchContext
{
    private Barrier Barrier => Editor.Project.Openings[0].Barrier;

    [Fact]
    public void Raker_SwitchedOn_StandsAtThreeQuartersAndPropsThePost()
    {
        var page = Open("garage");
        var alone = Editor.ResultFor("garage")!.Cases[0].Posts[0].BaseMoment;

        page.Find("[data-testid='switch-posts.raker']").Change(true);

        var result = Editor.ResultFor("garage")!;
        Assert.Equal(0.75 * result.BarrierHeight, Barrier.Posts!.Raker!.HeadHeight, tolerance: 0.01);
        Assert.Equal(Barrier.Posts.Raker.HeadHeight, Barrier.Posts.Raker.FootDistance, tolerance: 1e-9);
        Assert.True(result.Cases[0].Posts[0].BaseMoment < alone);
        Assert.Contains("Post and raker", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void Raker_OffAndOn_IsWhatItWas()
    {
        var page = Open("garage");
        page.Find("[data-testid='switch-posts.raker']").Change(true);
        Field(page, "posts.raker.headHeight").Input("0.5");
        Field(page, "posts.raker.play").Input("2");

        page.Find("[data-testid='switch-posts.raker']").Change(false);
        Assert.Null(Barrier.Posts!.Raker);
        page.Find("[data-testid='switch-posts.raker']").Change(true);

        Assert.Equal((0.5, 0.002), (Barrier.Posts!.Raker!.HeadHeight, Barrier.Posts.Raker.Play));
    }

    [Fact]
    public void Raker_HeadAboveTheBarrier_SaysSoAtTheField()
    {
        var page = Open("garage");
        page.Find("[data-testid='switch-posts.raker']").Change(true);

        Field(page, "posts.raker.headHeight").Input("5");

        Assert.Contains("allowed is up to the top of the barrier", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public void Plate_SwitchedOn_FitsThePostAndIsDrawn()
    {
        var page = Open("garage");

        page.Find("[data-testid='switch-basePlate']").Change(true);

        var post = Editor.ResultFor("garage")!.Opening.Barrier.Posts!;
        var plate = Barrier.BasePlate!;
        Assert.Equal(post.Material, plate.Material);
        Assert.InRange(plate.RodDistance, 0, plate.Length / 2);
        Assert.Empty(Editor.Problems);
        Assert.Contains("Base plate in plan", page.Markup, StringComparison.Ordinal);
        Assert.Contains(Editor.ResultFor("garage")!.Cases[0].Parts, part => part.Check == NeededChecks.BasePlates);
    }

    [Fact]
    public void Plate_ThicknessTyped_ChangesItsUse()
    {
        var page = Open("garage");
        page.Find("[data-testid='switch-basePlate']").Change(true);
        var before = Pressed();

        Field(page, "basePlate.thickness").Input("40");

        Assert.Equal(before / 2, Pressed(), tolerance: 1e-9);

        double Pressed() => Editor.ResultFor("garage")!.Cases[0].Parts
            .First(p => p.Check == NeededChecks.BasePlates).Checks.Single(c => c.Name == "base-plate-pressed").Utilisation;
    }

    [Fact]
    public void Weld_Missing_StandsAmongWhatIsStillToEnter()
    {
        var page = Open("garage");

        page.Find("[data-testid='switch-basePlate']").Change(true);

        Assert.Contains(
            "The weld between post and base plate has no size: enter its leg.", page.Find("[data-testid=gaps]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Door_WithoutPosts_NoSection() => Assert.Empty(Open("door").FindAll("[aria-label='Raker and base plate']"));
}
