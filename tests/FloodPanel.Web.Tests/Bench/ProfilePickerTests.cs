using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class ProfilePickerTests : BenchContext
{
    private Profile Profile => (Profile)Editor.Project.Openings[0].Barrier.Logs.Profile;

    [Fact]
    public void Tube_RadiiTyped_AreInTheProjectAndInTheDrawing()
    {
        var page = Open("garage");
        Choose(page, "logs.profile", "Own dimensions");
        Choose(page, "logs.profile.shape", "Rectangular tube");

        Field(page, "logs.profile.cornerRadius").Input("9");
        Field(page, "logs.profile.innerRadius").Input("7");

        var tube = Assert.IsType<RectangularTube>(Profile);
        Assert.Equal(0.009, tube.CornerRadius!.Value, tolerance: 1e-9);
        Assert.Equal(0.007, tube.InnerRadius!.Value, tolerance: 1e-9);
        Assert.Contains("radius 9.0 mm", page.Find("[data-testid='picked-logs.profile'] [data-testid=profile-drawing]").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void OwnDimensions_ShowEveryPropertyOfTheSection()
    {
        var page = Open("garage");

        Choose(page, "logs.profile", "Own dimensions");

        var figures = page.Find("[data-testid='picked-logs.profile'] [data-testid=profile-figures]").TextContent;
        Assert.All(["Area", "Second moment", "Elastic modulus", "Plastic modulus", "Shear area", "Mass per length"], name => Assert.Contains(name, figures, StringComparison.Ordinal));
    }
}
