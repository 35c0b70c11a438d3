using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Web.Pages.Openings;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Pages;

public class OpeningProposalTests
{
    private static readonly Library Delivered = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    // Design flood level 12.35 m and freeboard 0.20 m: the required top stands at 12.55 m.
    private static readonly Project Empty = Examples.Mill with { Openings = [] };

    [Theory]
    [InlineData(11.40, 0.9)]
    [InlineData(11.40, 2.5)]
    [InlineData(11.40, 2.6)]
    [InlineData(11.40, 3.3)]
    [InlineData(11.00, 5.0)]
    [InlineData(11.73, 7.777)]
    [InlineData(12.50, 1.0)]
    [InlineData(13.00, 1.0)]
    public void For_UsualOpening_FitsReachesTheTopAndHolds(double sill, double width)
    {
        var opening = OpeningProposal.For(Empty, Delivered, new OpeningBasics("Garage door", sill, width, 2.1));

        var project = Empty with { Openings = [opening] };
        Assert.Empty(project.Validate(Delivered));
        var result = Design.Evaluate(project, opening, Delivered);
        Assert.NotEqual(VerdictKind.Inadequate, result.Verdict.Kind);
        Assert.True(result.Freeboard.Passes);
        Assert.All(opening.Barrier.Bays, bay => Assert.InRange(bay, 0.05, OpeningProposal.WidestBay + 0.001));
    }

    [Fact]
    public void For_HighWater_TakesNoMoreLogsThanReachTheTop()
    {
        var opening = OpeningProposal.For(Empty, Delivered, new OpeningBasics("Door", 11.40, 1.0, 2.1));

        var height = Delivered.Find(opening.Barrier.Logs.Profile)!.Height;
        Assert.InRange(opening.Barrier.Logs.Count * height, 1.15 - 0.001, 1.15 + height);
    }

    [Fact]
    public void For_WiderThanABay_HasOnePostLessThanBays()
    {
        var opening = OpeningProposal.For(Empty, Delivered, new OpeningBasics("Garage door", 11.40, 5.4, 2.1));

        Assert.Equal(3, opening.Barrier.Bays.Count);
        var posts = Assert.IsType<PostSet>(opening.Barrier.Posts);
        Assert.Equal(5.4, opening.Barrier.Bays.Sum() + 2 * posts.Width, tolerance: 1e-6);
    }

    [Fact]
    public void For_MoreWaterThanTheLibraryHolds_ProposesTheStrongestAndLeavesTheVerdictToTheBench()
    {
        var deep = Empty with { Site = Empty.Site with { DesignStillWaterLevel = 25 } };

        var opening = OpeningProposal.For(deep, Delivered, new OpeningBasics("Gate", 11.40, 2.4, 14));

        Assert.Empty((deep with { Openings = [opening] }).Validate(Delivered));
        Assert.Equal(VerdictKind.Inadequate, Design.Evaluate(deep, opening, Delivered).Verdict.Kind);
    }

    [Fact]
    public void For_EmptyLibrary_KeepsWhatWasTyped()
    {
        var opening = OpeningProposal.For(Empty, Library.Empty, new OpeningBasics("Door", 11.4, 1.1, 2.1));

        Assert.Equal(("Door", 11.4, 1.1, 2.1), (opening.Name, opening.SillLevel, opening.ClearWidth, opening.ClearHeight));
    }

    [Theory]
    [InlineData("Garage door", "garage-door")]
    [InlineData("  Tür № 3 / Hof ", "t-r-3-hof")]
    [InlineData("門", "opening")]
    [InlineData("Front door", "front-door-2")]
    public void IdFor_Name_IsAnIdentifierOfItsOwn(string name, string expected)
    {
        var project = Empty with { Openings = [new Opening { Id = "front-door" }] };

        var id = OpeningProposal.IdFor(project, name);

        Assert.Equal(expected, id);
        Assert.True(Validation.IsIdentifier(id));
    }

    [Fact]
    public void Describe_TwoBays_SaysOnePost()
    {
        var opening = OpeningProposal.For(Empty, Delivered, new OpeningBasics("Garage door", 11.40, 3.3, 2.1));

        var words = OpeningProposal.Describe(Empty, Delivered, opening);

        Assert.StartsWith("Retained depth 0.950 m. Proposed: ", words.ToString(), StringComparison.Ordinal);
        Assert.Contains("in 2 bays of 1.600 m with 1 post between.", words.ToString(), StringComparison.Ordinal);
        Assert.Contains("ft", words.In(UnitSystem.USCustomary), StringComparison.Ordinal);
    }
}
