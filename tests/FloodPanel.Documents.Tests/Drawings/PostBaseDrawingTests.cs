using FloodPanel.Calculation;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public class PostBaseDrawingTests
{
    /// <summary>The typed distance is what its dimension spans, at the scale of the drawing.</summary>
    [Theory]
    [InlineData("raker", "posts.raker.headHeight", 0.9)]
    [InlineData("raker", "posts.raker.footDistance", 0.8)]
    [InlineData("raker-on-a-raked-post", "posts.raker.footDistance", 1.6)]
    [InlineData("base-plate", "basePlate.length", 0.3)]
    [InlineData("base-plate", "basePlate.width", 0.2)]
    [InlineData("base-plate", "basePlate.rodDistance", 0.11)]
    [InlineData("base-plate-bar", "basePlate.length", 0.12)]
    public void Draw_Dimension_SpansWhatIsTyped(string name, string field, double metres)
    {
        var scene = Scene(name);

        var line = Assert.Single(scene.Shapes.OfType<Mark>(), mark => mark.Field == field).Parts.OfType<Line>().Single(l => l.Role == LineRole.Dimension);

        var length = Math.Abs(line.To.X - line.From.X) + Math.Abs(line.To.Y - line.From.Y);
        Assert.Equal(1000 * metres / scene.ScaleDenominator, length, 1e-9);
    }

    [Theory]
    [InlineData("base-plate", "Base plate 300 mm by 200 mm, 20 mm thick, 4 rods.")]
    [InlineData("base-plate-tube", "Base plate 300 mm by 200 mm, 20 mm thick, 2 rods.")]
    public void Plate_Description_SaysItsSizes(string name, string words) => Assert.Equal(words, Scene(name).Description);

    /// <summary>The force that the check finds stands in the words; a raker that no formula covers says so.</summary>
    [Fact]
    public void Raker_Words_SayWhatItTakes()
    {
        var input = Openings.Input("raker", UnitSystem.SI);
        var force = input.Result.Cases[0].Posts[0].Others.Single(c => c.Name == "raker-compression").Demand;

        Assert.Contains($"{Units.Format(force, Dimension.Force, UnitSystem.SI)} along the raker", Scene("raker").Description, StringComparison.Ordinal);
        Assert.Contains("the force in the raker is not checked", Scene("raker-far-foot").Description, StringComparison.Ordinal);
    }

    [Fact]
    public void Of_NeitherEntered_NoDrawing()
    {
        var input = Openings.Input("door", UnitSystem.SI);

        Assert.Empty(RakerDrawing.Of(input));
        Assert.Empty(BasePlatePlan.Of(input));
    }

    private static Scene Scene(string name)
    {
        var input = Openings.Input(name, UnitSystem.SI);
        return Assert.Single(RakerDrawing.Of(input).Concat(BasePlatePlan.Of(input)));
    }
}
