using System.Globalization;
using System.Text;
using System.Xml.Linq;
using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// Writes a scene as SVG for the browser: a view box in millimetres, a class for each role and no colours; those
/// come from css/drawing.css.
/// </summary>
public static class SvgWriter
{
    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";

    /// <summary>The scene as an svg element.</summary>
    /// <param name="scene">The scene.</param>
    public static XElement Write(Scene scene) => new(
        Svg + "svg",
        new XAttribute("class", "fp-drawing"),
        new XAttribute("viewBox", $"0 0 {Number(scene.Width)} {Number(scene.Height)}"),
        new XAttribute("role", "img"),
        new XAttribute("aria-label", Wording.OneLine($"{scene.Title}. {scene.Description}")),
        scene.Shapes.Select(Element));

    /// <summary>The scene as text, without line breaks.</summary>
    /// <param name="scene">The scene.</param>
    public static string WriteText(Scene scene) => Write(scene).ToString(SaveOptions.DisableFormatting);

    private static XElement Element(Shape shape) => shape switch
    {
        Line line => Stroked(Path(Points([line.From, line.To])), line.Role, "fp-line"),
        Polyline run => Stroked(Path(Points(run.Points)), run.Role, "fp-line"),
        Hatch hatch => Stroked(Path(Segments(hatch.Segments)), hatch.Role, "fp-line fp-hatch"),
        Polygon area => Area(area),
        Text text => Words(text),
        Mark mark => Group(mark),
        _ => throw new InvalidOperationException($"The shape {shape.GetType().Name} has no SVG form."),
    };

    private static XElement Group(Mark mark)
    {
        var group = new XElement(Svg + "g", new XAttribute("class", $"fp-mark fp-mark-{Name(mark.Kind)}"));
        if (mark.Field is { } field)
        {
            group.Add(new XAttribute("data-field", field));
        }

        if (mark.Part is { } part)
        {
            group.Add(new XAttribute("data-part", part));
        }

        group.Add(new XElement(Svg + "title", Wording.OneLine(mark.Name)), mark.Parts.Select(Element));
        return group;
    }

    private static XElement Area(Polygon area)
    {
        var path = Path(Points(area.Points) + "Z");
        var fill = area.Fill is { } role ? $"fp-area fp-fill-{Name(role)}" : "fp-open";
        return area.Outline is { } edge
            ? Stroked(path, edge, fill)
            : With(path, new XAttribute("class", fill));
    }

    private static XElement Stroked(XElement path, LineRole role, string classes)
    {
        With(path, new XAttribute("class", $"{classes} fp-{Name(role)}"));
        With(path, new XAttribute("stroke-width", Number(LineWeights.Of(role))));
        return role == LineRole.Hidden
            ? With(path, new XAttribute("stroke-dasharray", string.Join(' ', LineWeights.HiddenDash.Select(Number))))
            : path;
    }

    private static XElement Words(Text text)
    {
        var element = new XElement(
            Svg + "text",
            new XAttribute("class", text.Role switch
            {
                TextRole.Muted => "fp-text fp-text-muted",
                TextRole.Strong => "fp-text fp-text-strong",
                _ => "fp-text",
            }),
            new XAttribute("font-size", Number(text.Size)),
            new XAttribute("text-anchor", Name(text.Anchor)));
        var (x, y) = (Number(text.Baseline.X), Number(text.Baseline.Y));
        if (text.Upward)
        {
            element.Add(new XAttribute("transform", $"translate({x} {y}) rotate(-90)"));
        }
        else
        {
            element.Add(new XAttribute("x", x), new XAttribute("y", y));
        }

        element.Add(Wording.OneLine(text.Words));
        return element;
    }

    private static XElement Path(string data) => new(Svg + "path", new XAttribute("d", data));

    private static XElement With(XElement element, XAttribute attribute)
    {
        element.Add(attribute);
        return element;
    }

    private static string Points(IEnumerable<SheetPoint> points) =>
        "M" + string.Join('L', points.Select(p => $"{Number(p.X)} {Number(p.Y)}"));

    private static string Segments(IEnumerable<Segment> segments)
    {
        var path = new StringBuilder();
        foreach (var (from, to) in segments)
        {
            path.Append(CultureInfo.InvariantCulture, $"M{Number(from.X)} {Number(from.Y)}L{Number(to.X)} {Number(to.Y)}");
        }

        return path.ToString();
    }

    private static string Number(double value) => value.ToString("0.##", CultureInfo.InvariantCulture);

    /// <summary>"WaterMark" as "water-mark".</summary>
    private static string Name<T>(T role) where T : struct, Enum
    {
        var name = new StringBuilder();
        foreach (var letter in role.ToString())
        {
            if (char.IsUpper(letter) && name.Length > 0)
            {
                name.Append('-');
            }

            name.Append(char.ToLowerInvariant(letter));
        }

        return name.ToString();
    }
}
