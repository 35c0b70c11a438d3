using FloodPanel.Calculation;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public class GuideDrawingTests
{
    /// <summary>The typed distance is what its dimension spans, at the scale of the drawing.</summary>
    [Theory]
    [InlineData("guide-reveal", "guides.fasteners.edgeDistance", 0.1)]
    [InlineData("guide-reveal", "guides.loadOffset", 0.03)]
    [InlineData("guide-dry-face", "guides.loadOffset", 0.13)]
    [InlineData("guide-dry-face", "guides.bearingDistance", 0.08)]
    [InlineData("guide-wet-face-tipping", "guides.loadOffset", 0.15)]
    [InlineData("guide-wet-face-tipping", "guides.lipThickness", 0.012)]
    public void Draw_Dimension_SpansWhatIsTyped(string name, string field, double metres)
    {
        var scene = Scene(name);

        var line = Assert.Single(scene.Shapes.OfType<Mark>(), mark => mark.Field == field).Parts.OfType<Line>().Single(l => l.Role == LineRole.Dimension);

        var length = Math.Abs(line.To.X - line.From.X) + Math.Abs(line.To.Y - line.From.Y);
        Assert.Equal(1000 * metres / scene.ScaleDenominator, length, 1e-9);
    }

    [Theory]
    [InlineData("guide-wet-face", "on the wet face of the wall")]
    [InlineData("guide-dry-face", "on the dry face of the wall")]
    [InlineData("guide-reveal", "in the reveal")]
    public void Draw_EachMounting_SaysWhereTheGuideIs(string name, string words) =>
        Assert.Contains(words, Scene(name).Description, StringComparison.Ordinal);

    /// <summary>A lip that lies on the wall has no lever.</summary>
    [Fact]
    public void Draw_LipOnTheWall_NoLever()
    {
        Assert.DoesNotContain(Scene("guide-wet-face").Shapes.OfType<Mark>(), mark => mark.Field == "guides.lipLever");
        Assert.Contains(Scene("guide-reveal").Shapes.OfType<Mark>(), mark => mark.Field == "guides.lipLever");
    }

    [Fact]
    public void Of_NoGuides_NoDrawing() => Assert.Empty(GuideDrawing.Of(Openings.Input("door", UnitSystem.SI)));

    private static Scene Scene(string name) => Assert.Single(GuideDrawing.Of(Openings.Input(name, UnitSystem.SI)));
}
