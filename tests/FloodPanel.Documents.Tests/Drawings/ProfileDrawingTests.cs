using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Tests.Drawings;

public class ProfileDrawingTests
{
    public static TheoryData<Profile> Profiles =>
    [
        new Rectangle { Height = 0.225, Depth = 0.1 },
        new HollowRectangle { Height = 0.25, Depth = 0.12, Face = 0.004, Web = 0.0035, Webs = 4 },
        new RectangularTube { Height = 0.1, Depth = 0.2, Wall = 0.008 },
        new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.005, CornerRadius = 0.0075, InnerRadius = 0.005 },
        new RectangularTube { Height = 0.1, Depth = 0.1, Wall = 0.012, CornerRadius = 0.036 },
        new ISection { Height = 0.14, Depth = 0.14, Flange = 0.012, Web = 0.007 },
        new GivenProperties { Height = 0.2, Depth = 0.1, Area = 1e-3, Inertia = 1e-6, Modulus = 2e-5, PlasticModulus = 3e-5, ShearArea = 5e-4 },
        new Rectangle { Height = 2, Depth = 0.02 },
        new Rectangle { Height = 0.02, Depth = 2 },
    ];

    [Theory]
    [MemberData(nameof(Profiles))]
    public void Draw_AnyProfile_StaysOnTheSheetWithItsDimensions(Profile profile)
    {
        foreach (var units in Enum.GetValues<UnitSystem>())
        {
            var scene = ProfileDrawing.Draw(profile, MaterialFamily.Aluminium, units, "logs.profile");

            Assert.All(scene.Shapes.SelectMany(Points), p =>
            {
                Assert.InRange(p.X, -0.01, scene.Width + 0.01);
                Assert.InRange(p.Y, -0.01, scene.Height + 0.01);
            });
            var fields = scene.Shapes.OfType<Mark>().Select(mark => mark.Field).ToList();
            Assert.Contains("logs.profile.height", fields);
            Assert.Contains("logs.profile.depth", fields);
            Assert.Contains(Units.Format(profile.Height, Dimension.SectionLength, units), SvgWriter.WriteText(scene), StringComparison.Ordinal);
        }
    }

    /// <summary>The area inside the drawn edges is that of the section: an arc is sixteen straight pieces, so that a round tube is a thousandth or two short.</summary>
    [Theory]
    [MemberData(nameof(Profiles))]
    public void Draw_AnyProfile_IsDrawnTrueToScale(Profile profile)
    {
        if (profile is GivenProperties)
        {
            return;
        }

        var scene = ProfileDrawing.Draw(profile, null, UnitSystem.SI, null);

        var perMetre = 1000.0 / scene.ScaleDenominator;
        var outer = scene.Shapes.OfType<Polygon>().Single(p => p.Fill == FillRole.Log);
        var holes = scene.Shapes.OfType<Polygon>().Where(p => p is { Fill: FillRole.Paper, Outline: LineRole.Outline });
        var drawn = (Area(outer) - holes.Sum(Area)) / (perMetre * perMetre);
        Assert.Equal(1, drawn / SectionProperties.Of(profile).Area, tolerance: 0.003);
    }

    private static double Area(Polygon polygon) => Math.Abs(polygon.Points.Zip(polygon.Points.Skip(1).Append(polygon.Points[0]))
        .Sum(side => side.First.X * side.Second.Y - side.Second.X * side.First.Y)) / 2;

    private static IEnumerable<SheetPoint> Points(Shape shape) => shape switch
    {
        Line line => [line.From, line.To],
        Polygon area => area.Points,
        Polyline run => run.Points,
        Mark mark => mark.Parts.SelectMany(Points),
        Text text => Ends(text),
        _ => [],
    };

    private static SheetPoint[] Ends(Text text)
    {
        var width = FontFile.Regular.Width(text.Words, text.Size);
        var from = text.Anchor switch { TextAnchor.End => -width, TextAnchor.Middle => -width / 2, _ => 0 };
        return text.Upward
            ? [text.Baseline with { Y = text.Baseline.Y - from }, text.Baseline with { Y = text.Baseline.Y - from - width }]
            : [text.Baseline with { X = text.Baseline.X + from }, text.Baseline with { X = text.Baseline.X + from + width }];
    }
}
