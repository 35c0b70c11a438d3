using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.ProjectTree;

/// <summary>The dock: clear width 4.3 m, two bays of 2.1 m, a post of 100 mm, end bearings of 40 mm.</summary>
public class BarrierValidationTests
{
    [Theory]
    [InlineData(4.299)]
    [InlineData(4.301)]
    public void Bays_WithinAMillimetreOfTheClearWidth_Accepted(double clearWidth) =>
        Refused.Not(Refused.With((Opening o) => o with { ClearWidth = clearWidth }));

    [Fact]
    public void Bays_WiderThanTheClearWidth_RefusedWithTheDifference() => Refused.Once(
        Refused.With((Opening o) => o with { ClearWidth = 4.298 }),
        "openings[0].barrier.bays",
        "Clear bays and posts add up to 4.300 m, 2.0 mm more than the clear width, 4.298 m; allowed is a difference of 1.0 mm.",
        "Clear bays and posts add up to 14.11 ft, 0.079 in more than the clear width, 14.10 ft; allowed is a difference of 0.039 in.");

    [Fact]
    public void Bays_NarrowerThanTheClearWidth_RefusedWithTheDifference() => Refused.Once(
        Refused.With((Opening o) => o with { ClearWidth = 4.4 }),
        "openings[0].barrier.bays",
        "Clear bays and posts add up to 4.300 m, 100.0 mm less than the clear width, 4.400 m; allowed is a difference of 1.0 mm.",
        "Clear bays and posts add up to 14.11 ft, 3.937 in less than the clear width, 14.44 ft; allowed is a difference of 0.039 in.");

    [Theory]
    [InlineData(0)]
    [InlineData(51)]
    public void Bays_NoneOrTooMany_Refused(int count) => Refused.Once(
        Refused.With((Barrier b) => b with { Bays = Enumerable.Repeat(0.05, count).ToValueList() }),
        "openings[0].barrier.bays",
        $"There are {count} bays; allowed is 1 to 50.",
        $"There are {count} bays; allowed is 1 to 50.");

    [Fact]
    public void Bays_Fifty_Accepted()
    {
        var width = 50 * 0.5 + 49 * 0.1;

        Refused.Not(Refused.With((Opening o) => o with
        {
            ClearWidth = width,
            Barrier = o.Barrier with { Bays = Enumerable.Repeat(0.5, 50).ToValueList() },
        }));
    }

    [Fact]
    public void Posts_MissingBetweenBays_Refused() => Refused.Once(
        Refused.With((Barrier b) => b with { Posts = null }),
        "openings[0].barrier.posts",
        "There are 2 bays and no posts; posts stand between bays, so describe them or leave one bay.",
        "There are 2 bays and no posts; posts stand between bays, so describe them or leave one bay.");

    [Fact]
    public void Posts_OneBayWithoutThem_Accepted() =>
        Refused.Not(Refused.With((Barrier b) => b with { Posts = null, Bays = [4.3] }));

    [Fact]
    public void EndBearing_TwoAsWideAsThePost_Accepted() =>
        Refused.Not(Refused.With((LogStack l) => l with { EndBearing = 0.05 }));

    [Fact]
    public void EndBearing_TwoWiderThanThePost_RefusedAtThePost() => Refused.Once(
        Refused.With((LogStack l) => l with { EndBearing = 0.0501 }),
        "openings[0].barrier.posts.width",
        "Post width is 100 mm; allowed is at least two end bearings, 100.2 mm together.",
        "Post width is 3.93700787 in; allowed is at least two end bearings, 3.94488189 in together.");

    [Fact]
    public void FittingClearance_AsLongAsTheBearing_Refused()
    {
        Refused.Not(Refused.With((LogStack l) => l with { FittingClearance = 0.039 }));
        Refused.Once(
            Refused.With((LogStack l) => l with { FittingClearance = 0.04 }),
            "openings[0].barrier.logs.fittingClearance",
            "Fitting clearance is 40.0 mm; allowed is less than the end bearing, 40.0 mm, or a log can slip out of its guide.",
            "Fitting clearance is 1.575 in; allowed is less than the end bearing, 1.575 in, or a log can slip out of its guide.");
    }

    [Fact]
    public void ByOthers_NeededChecks_AcceptedAndFreeboardRefused()
    {
        Refused.Not(Refused.With((Barrier b) => b with { ByOthers = NeededChecks.MayBeByOthers.Select(c => new DesignedByOthers(c, "", "")).ToValueList() }));
        Refused.Once(
            Refused.With((Barrier b) => b with { ByOthers = [new("anchors", "", ""), new("freeboard", "N", "R")] }),
            "openings[0].barrier.byOthers[1].check",
            "Check is \"freeboard\"; allowed is one of logs, posts, base-plates, anchors, guides, supporting-wall.",
            "Check is \"freeboard\"; allowed is one of logs, posts, base-plates, anchors, guides, supporting-wall.");
    }
}
