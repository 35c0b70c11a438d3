using FloodPanel.Calculation;
using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Tests.Drawings;

public class DrawingTests
{
    private static readonly Sheet Small = new(88, 66, 2.2, Trim: true);

    public static TheoryData<string, UnitSystem> Cases()
    {
        var cases = new TheoryData<string, UnitSystem>();
        foreach (var name in Openings.Names)
        {
            cases.Add(name, UnitSystem.SI);
            cases.Add(name, UnitSystem.USCustomary);
        }

        return cases;
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Draw_AnyOpening_NoTextOverlapsText(string name, UnitSystem units)
    {
        foreach (var (view, scene) in Scenes(name, units))
        {
            var boxes = TextBox.Of(scene);

            for (var i = 0; i < boxes.Count; i++)
            {
                for (var j = i + 1; j < boxes.Count; j++)
                {
                    Assert.False(boxes[i].Overlaps(boxes[j]), $"{view}: {boxes[i]} meets {boxes[j]}");
                }
            }
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Draw_AnyOpening_NothingLeavesTheSheet(string name, UnitSystem units)
    {
        // The frame stands at 0.25 mm, and words do not touch it.
        const double clear = 0.7;
        foreach (var (view, scene) in Scenes(name, units))
        {
            foreach (var box in TextBox.Of(scene))
            {
                Assert.True(
                    box.Left >= clear && box.Right <= scene.Width - clear && box.Top >= clear && box.Bottom <= scene.Height - clear,
                    $"{view}: {box} leaves {scene.Width} x {scene.Height}");
            }

            foreach (var point in Points(scene.Shapes))
            {
                Assert.True(
                    point.X >= -0.01 && point.X <= scene.Width + 0.01 && point.Y >= -0.01 && point.Y <= scene.Height + 0.01,
                    $"{view}: {point} leaves {scene.Width} x {scene.Height}");
            }
        }
    }

    internal static IEnumerable<(string View, Scene Scene)> Scenes(string name, UnitSystem units)
    {
        var input = Openings.Input(name, units);
        foreach (var sheet in new[] { Sheet.Bench, Small })
        {
            yield return ($"elevation {sheet.Width}", ElevationDrawing.Draw(input, sheet));
            yield return ($"section without pressures {sheet.Width}", SectionDrawing.Draw(input, "design-flood", sheet, withPressures: false));
        }

        yield return ("owner's sheet", OpeningSheet.Draw(input, new Sheet(174, 61, 2.25)));
        yield return ("section", SectionDrawing.Draw(input, "design-flood"));
        yield return ("section brim-full", SectionDrawing.Draw(input, "brim-full"));
        foreach (var detail in DetailDrawings.Of(input))
        {
            yield return (detail.Title, detail);
        }
    }

    private static IEnumerable<SheetPoint> Points(IEnumerable<Shape> shapes) => shapes.SelectMany(s => s switch
    {
        Line line => [line.From, line.To],
        Polyline run => run.Points,
        Polygon area => area.Points,
        Hatch hatch => hatch.Segments.SelectMany(p => new[] { p.From, p.To }),
        Mark mark => Points(mark.Parts),
        _ => [],
    });
}
