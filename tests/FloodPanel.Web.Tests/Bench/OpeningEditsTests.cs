using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Pages.Bench;

namespace FloodPanel.Web.Tests.Bench;

public class OpeningEditsTests
{
    [Fact]
    public void WithClearWidth_EvenBays_ShareTheNewWidth()
    {
        var wider = OpeningEdits.WithClearWidth(Examples.Garage, 4.1);

        Assert.Equal([2.0, 2.0], wider.Barrier.Bays);
        Assert.Empty(Problems(wider));
    }

    [Fact]
    public void WithClearWidth_OneBay_IsTheWholeWidth()
    {
        var wider = OpeningEdits.WithClearWidth(Examples.Door, 1.35);

        Assert.Equal([1.35], wider.Barrier.Bays);
    }

    [Fact]
    public void WithClearWidth_UnevenBays_AreLeftForTheUser()
    {
        var uneven = Examples.Garage with { Barrier = Examples.Garage.Barrier with { Bays = [1.2, 2.0] } };

        var wider = OpeningEdits.WithClearWidth(uneven, 4.1);

        Assert.Equal([1.2, 2.0], wider.Barrier.Bays);
    }

    [Fact]
    public void WithPostWidth_EvenBays_MakeRoom()
    {
        var thicker = OpeningEdits.WithPostWidth(Examples.Garage, 0.2);

        Assert.Equal([1.55, 1.55], thicker.Barrier.Bays);
        Assert.Equal(0.2, thicker.Barrier.Posts!.Width);
    }

    [Fact]
    public void WithBays_WidthThatDoesNotDivide_FillsTheOpeningExactly()
    {
        var three = OpeningEdits.WithBays(Examples.Garage with { ClearWidth = 3.3 }, 3, new PostSet());

        Assert.Equal([1.033, 1.033, 1.034], three.Barrier.Bays);
        Assert.Empty(Problems(three));
    }

    [Fact]
    public void WithBays_One_HasNoPosts()
    {
        var one = OpeningEdits.WithBays(Examples.Garage, 1, new PostSet());

        Assert.Null(one.Barrier.Posts);
        Assert.Equal([3.3], one.Barrier.Bays);
    }

    [Fact]
    public void WithBays_FirstPosts_FitTheLogs()
    {
        var wide = Examples.Door.WithLogs(logs => logs with { EndBearing = 0.08 });

        var two = OpeningEdits.WithBays(wide, 2, OpeningEdits.FirstPosts(wide));

        Assert.Equal(0.16, two.Barrier.Posts!.Width);
        Assert.Equal(Examples.Aluminium, two.Barrier.Posts.Material);
        Assert.Empty(Problems(two));
    }

    [Fact]
    public void EvenOut_WithoutRoomForBays_ChangesNothing()
    {
        var narrow = Examples.Garage with { ClearWidth = 0.1 };

        Assert.Equal(narrow, OpeningEdits.EvenOut(narrow));
    }

    [Fact]
    public void Declare_Checks_KeepTheirOrderAndReplaceThemselves()
    {
        var opening = OpeningEdits.Declare(Examples.Door, NeededChecks.Guides, new(NeededChecks.Guides, "A", "1"));
        opening = OpeningEdits.Declare(opening, NeededChecks.Anchors, new(NeededChecks.Anchors, "B", "2"));

        opening = OpeningEdits.Declare(opening, NeededChecks.Guides, new(NeededChecks.Guides, "C", "3"));

        Assert.Equal([new(NeededChecks.Anchors, "B", "2"), new DesignedByOthers(NeededChecks.Guides, "C", "3")], opening.Barrier.ByOthers);
        Assert.Empty(OpeningEdits.Declare(OpeningEdits.Declare(opening, NeededChecks.Guides, null), NeededChecks.Anchors, null).Barrier.ByOthers);
    }

    private static IReadOnlyList<InputProblem> Problems(Opening opening) =>
        (Examples.Mill with { Openings = [opening] }).Validate(Library.Empty);
}
