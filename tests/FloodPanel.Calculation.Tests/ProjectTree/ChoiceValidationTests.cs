using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.ProjectTree;

public class ChoiceValidationTests
{
    private const string Path = "openings[0].barrier.logs.profile";

    [Fact]
    public void Material_NotInTheLibrary_Refused() => Refused.Once(
        Refused.With((LogStack l) => l with { Material = new LibraryMaterial("oak") }),
        "openings[0].barrier.logs.material",
        "Material is \"oak\", which the library does not hold; choose one it holds or give the figures.",
        "Material is \"oak\", which the library does not hold; choose one it holds or give the figures.");

    [Fact]
    public void Profile_NotInTheLibrary_Refused() => Refused.Once(
        Refused.With((PostSet p) => p with { Profile = new LibraryProfile("h100") }),
        "openings[0].barrier.posts.profile",
        "Profile is \"h100\", which the library does not hold; choose one it holds or give the dimensions.",
        "Profile is \"h100\", which the library does not hold; choose one it holds or give the dimensions.");

    [Fact]
    public void Choices_InTheLibrary_Accepted()
    {
        var library = new Library(
            [new("oak", "Oak", SampleProject.Aluminium, "", "invented")],
            [new("h100", "H", new Rectangle { Height = 0.1, Depth = 0.1 }, "", "invented")],
            DesignBases.Standard);
        var project = Refused.With((LogStack l) => l with { Material = new LibraryMaterial("oak"), Profile = new LibraryProfile("h100") });

        Assert.Empty(project.Validate(library));
    }

    [Fact]
    public void Profile_TwoFacesAsDeepAsTheLog_Refused()
    {
        Refused.Not(WithLog(Hollow with { Face = 0.044 }));
        Refused.Once(
            WithLog(Hollow with { Face = 0.045 }),
            $"{Path}.face",
            "Two faces together are 90.0 mm; allowed is less than the depth, 90.0 mm.",
            "Two faces together are 3.543 in; allowed is less than the depth, 3.543 in.");
    }

    [Fact]
    public void Profile_WebsAsHighAsTheLog_Refused()
    {
        Refused.Not(WithLog(Hollow with { Web = 0.049, Webs = 4 }));
        Refused.Once(
            WithLog(Hollow with { Web = 0.05, Webs = 4 }),
            $"{Path}.web",
            "The webs together are 200.0 mm; allowed is less than the height, 200.0 mm.",
            "The webs together are 7.874 in; allowed is less than the height, 7.874 in.");
    }

    [Fact]
    public void Profile_TubeWallsAsWideAsItsSmallerSide_Refused()
    {
        Refused.Not(WithLog(new RectangularTube { Height = 0.2, Depth = 0.09, Wall = 0.044 }));
        Refused.Once(
            WithLog(new RectangularTube { Height = 0.2, Depth = 0.09, Wall = 0.045 }),
            $"{Path}.wall",
            "Two walls together are 90.0 mm; allowed is less than the smaller side, 90.0 mm.",
            "Two walls together are 3.543 in; allowed is less than the smaller side, 3.543 in.");
    }

    [Fact]
    public void Profile_TubeCornersWithinItsSides_Accepted()
    {
        Refused.Not(WithLog(new RectangularTube { Height = 0.2, Depth = 0.09, Wall = 0.006, CornerRadius = 0.044 }));
        Refused.Not(WithLog(new RectangularTube { Height = 0.2, Depth = 0.09, Wall = 0.006, CornerRadius = 0.009, InnerRadius = 0.006 }));
    }

    [Fact]
    public void Profile_TubeCornerOfHalfItsSmallerSide_Refused() => Refused.Once(
        WithLog(new RectangularTube { Height = 0.2, Depth = 0.09, Wall = 0.006, CornerRadius = 0.045 }),
        $"{Path}.cornerRadius",
        "The outer corner radius is 45.0 mm; allowed is less than half the smaller side, 45.0 mm.",
        "The outer corner radius is 1.772 in; allowed is less than half the smaller side, 1.772 in.");

    [Theory]
    [InlineData(0.02, 0.01, "The inner corner radius is 10.0 mm; allowed is at least the outer radius less the wall, 14.0 mm.")]
    [InlineData(0.02, 0.04, "The inner corner radius is 40.0 mm; allowed is less than half the hollow, 39.0 mm.")]
    public void Profile_TubeInnerCornerThatLeavesNoEvenWall_Refused(double outer, double inner, string sentence)
    {
        var problem = Assert.Single(WithLog(new RectangularTube { Height = 0.2, Depth = 0.09, Wall = 0.006, CornerRadius = outer, InnerRadius = inner })
            .Validate(Library.Empty));

        Assert.Equal(($"{Path}.innerRadius", sentence), (problem.Path, problem.Message.ToString()));
    }

    [Fact]
    public void Profile_FlangesAndWebThatDoNotFit_BothRefused()
    {
        var problems = WithLog(new ISection { Height = 0.1, Depth = 0.1, Flange = 0.05, Web = 0.1 }).Validate(Library.Empty);

        Assert.Equal([$"{Path}.flange", $"{Path}.web"], problems.Select(p => p.Path));
        Assert.Equal("Two flanges together are 100.0 mm; allowed is less than the depth, 100.0 mm.", problems[0].Message.ToString());
        Assert.Equal("The web is 100.0 mm; allowed is less than the height, 100.0 mm.", problems[1].Message.ToString());
    }

    private static HollowRectangle Hollow => (HollowRectangle)SampleProject.Dock.Barrier.Logs.Profile;

    private static Project WithLog(Profile profile) => Refused.With((LogStack l) => l with { Profile = profile });
}
