using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Calculation.Parts;
using FloodPanel.Web.Shared.Results;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Results;

public class PartTableTests : BunitContext
{
    [Fact]
    public void Parts_ThatCarryTheSame_ShareTheirRows()
    {
        var table = Table(Part("left guide", 4), Part("right guide", 4));

        Assert.Contains("Guides, left guide, right guide", table.Find(".part-head").TextContent, StringComparison.Ordinal);
        Assert.Single(table.FindAll("[data-testid^='part-guides']"));
    }

    [Fact]
    public void Parts_ThatDiffer_HaveRowsOfTheirOwn()
    {
        var table = Table(Part("left guide", 4), Part("right guide", 12));

        Assert.Equal(2, table.FindAll(".part-head").Count);
        Assert.Contains("fails", table.Find("[data-testid=part-guides-right-guide-guide-lip-bending]").ClassName, StringComparison.Ordinal);
        Assert.Equal(["0.40", "1.20"], table.FindAll("[data-testid^='use-guides']").Select(b => b.TextContent));
    }

    private static PartResult Part(string member, double demand) => new(
        NeededChecks.Guides, member,
        [new Check("guide-lip-bending", "Bending of the lip", "By hand", Dimension.Force, demand, 10, [new("N", "", demand, Dimension.Force)])], []);

    private IRenderedComponent<PartTable> Table(params PartResult[] parts)
    {
        var loadCase = Design.Run(Examples.Mill, Examples.Library).Openings[0].Cases[0] with { Parts = parts };
        return Render<PartTable>(p => p.Add(t => t.Case, loadCase).AddCascadingValue(new OpenFigure()));
    }
}
