using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>A cross-section to scale with its dimensions; the water presses from the left.</summary>
public static class ProfileDrawing
{
    private static readonly Sheet Paper = new(70, 60, 3.0);

    /// <summary>Draws a cross-section.</summary>
    /// <param name="profile">A profile without problems.</param>
    /// <param name="family">What it is made of, for its hatching; null where that is not known.</param>
    /// <param name="units">The reader's units.</param>
    /// <param name="key">Key of the form field of the profile, to which the dimensions point; null without a form.</param>
    public static Scene Draw(Profile profile, MaterialFamily? family, UnitSystem units, string? key)
    {
        var u = Paper.TextSize;
        var (left, right, top, bottom) = (4.2 * u, Paper.Width - Paper.Margin, Paper.Margin, Paper.Height - 5.2 * u);
        var scale = DrawingScale.Fit(profile.Depth, profile.Height, right - left, bottom - top);
        var perMetre = Math.Min(DrawingScale.PerMetre(scale), Math.Min((right - left) / profile.Depth, (bottom - top) / profile.Height));
        var (x, y) = ((left + right) / 2, top + profile.Height * perMetre / 2);
        var parts = Thicknesses(profile);
        var height = top + Math.Max(profile.Height * perMetre + (parts.Length > 0 ? 5.2 : 3) * u, FigureRoom(profile, perMetre, units));
        SheetPoint At(SheetPoint p) => new(x + p.X * perMetre, y - p.Y * perMetre);
        var sketch = new Sketch(Paper);
        sketch.Add(Sketch.Box(0, 0, Paper.Width, height, FillRole.Paper, null));
        Body(sketch, profile, family, At);
        string? Field(string leaf) => key is null ? null : $"{key}.{leaf}";
        var (low, high) = (At(new(-profile.Depth / 2, -profile.Height / 2)), At(new(profile.Depth / 2, profile.Height / 2)));
        sketch.Add(DimensionMarks.Vertical(
            Paper, Label("Height", profile.Height, units, Field("height")), low.Y, high.Y, Math.Max(low.X - 1.4 * u, 1.8 * u), low.X - 0.5));
        sketch.Add(DimensionMarks.Horizontal(
            Paper, Label("Depth", profile.Depth, units, Field("depth")), low.X, high.X, low.Y + 1.9 * u, low.Y + 0.5));
        Parts(sketch, height - Paper.Margin, [.. parts.Select(part => (part.Name, part.Value, Field(part.Leaf)))], units);
        return new Scene("Cross-section", Description(profile, units), Paper.Width, height, scale, sketch.Shapes, []);
    }

    /// <summary>The figure of a flat profile's height stands under its dimension line.</summary>
    private static double FigureRoom(Profile profile, double perMetre, UnitSystem units) =>
        profile.Height * perMetre + Sketch.Width(Units.Format(profile.Height, Dimension.SectionLength, units), Paper.TextSize, TextRole.Normal) + 2 * Paper.TextSize;

    private static void Body(Sketch sketch, Profile profile, MaterialFamily? family, Func<SheetPoint, SheetPoint> at)
    {
        var (outer, holes) = ProfileOutline.Of(profile);
        SheetPoint[] edge = [.. outer.Select(at)];
        if (profile is GivenProperties)
        {
            sketch.Add(new Polyline([.. edge, edge[0]], LineRole.Hidden));
            return;
        }

        sketch.Add(new Polygon(edge, FillRole.Log, null));
        sketch.Add(Hatching.Cut(family ?? MaterialFamily.Steel, edge));
        sketch.Add(new Polygon(edge, null, LineRole.Outline));
        sketch.Add(holes.Select(hole => new Polygon([.. hole.Select(at)], FillRole.Paper, LineRole.Outline)));
    }

    /// <summary>Thicknesses and radii in a line under the drawing, each of them pointing to its field.</summary>
    private static void Parts(Sketch sketch, double baseline, IReadOnlyList<(string Name, double Value, string? Field)> parts, UnitSystem units)
    {
        var x = Paper.Margin;
        foreach (var (name, value, field) in parts)
        {
            var words = $"{name} {Units.Format(value, Dimension.SectionLength, units)}";
            sketch.Add(new Mark(MarkKind.Dimension, words, field, null,
                [new Text(words, new(x, baseline), Paper.SmallText, TextAnchor.Start, TextRole.Muted)]));
            x += Sketch.Width(words, Paper.SmallText, TextRole.Muted) + 0.9 * Paper.TextSize;
        }
    }

    private static (string Name, double Value, string Leaf)[] Thicknesses(Profile profile) => profile switch
    {
        HollowRectangle hollow => [("face", hollow.Face, "face"), (FormattableString.Invariant($"{hollow.Webs} webs"), hollow.Web, "web")],
        RectangularTube { OuterCorner: > 0 } tube =>
            [("wall", tube.Wall, "wall"), ("radius", tube.OuterCorner, "cornerRadius"), ("inside", tube.InnerCorner, "innerRadius")],
        RectangularTube tube => [("wall", tube.Wall, "wall")],
        ISection section => [("flange", section.Flange, "flange"), ("web", section.Web, "web")],
        _ => [],
    };

    private static DimensionLabel Label(string name, double value, UnitSystem units, string? field)
    {
        var figure = Units.Format(value, Dimension.SectionLength, units);
        return new(field, $"{name} {figure}", [figure], Overflow.Before);
    }

    private static string Description(Profile profile, UnitSystem units) =>
        string.Join(", ", new[] { ("Height", profile.Height), ("depth", profile.Depth) }
            .Concat(Thicknesses(profile).Select(part => (part.Name, part.Value)))
            .Select(part => $"{part.Item1} {Units.Format(part.Item2, Dimension.SectionLength, units)}")) + ".";
}
