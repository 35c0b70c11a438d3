using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// Hatching by what a thing is made of, so that a sheet reads in black and white. Patterns are fixed to the sheet,
/// not to the area: they run on across neighbouring areas.
/// </summary>
internal static class Hatching
{
    private const double Course = 2.2;
    private const double Brick = 6.4;

    /// <summary>A wall seen from outside.</summary>
    public static Hatch WallInView(WallKind wall, IReadOnlyList<SheetPoint> area) => new(
        wall switch
        {
            WallKind.Masonry or WallKind.CavityMasonry => [.. Brickwork(area)],
            WallKind.TimberFrame => [.. Family(area, 90, 2.4)],
            WallKind.SteelFrame => [.. Family(area, 90, 3.0), .. Family(area, 90, 3.0, 0.7)],
            _ => [.. Stipple(area)],
        },
        LineRole.Hatch);

    /// <summary>Concrete, in view or cut.</summary>
    public static Hatch Concrete(IReadOnlyList<SheetPoint> area) => new([.. Stipple(area)], LineRole.Hatch);

    /// <summary>A solid member that is cut.</summary>
    public static Hatch Cut(MaterialFamily family, IReadOnlyList<SheetPoint> area) => new(
        family switch
        {
            MaterialFamily.Timber => [.. Family(area, 28, 0.55)],
            MaterialFamily.Composite => [.. Family(area, 45, 0.8), .. Family(area, 135, 0.8)],
            _ => [.. Family(area, 45, 1.2), .. Family(area, 45, 1.2, 0.35)],
        },
        LineRole.Hatch);

    /// <summary>Earth below a surface from left to right.</summary>
    public static Hatch Earth(double fromX, double toX, double y)
    {
        var strokes = new List<Segment>();
        for (var x = Math.Ceiling(fromX / 3.6) * 3.6; x + 1.5 <= toX; x += 3.6)
        {
            for (var i = 0; i < 3; i++)
            {
                var start = x + 0.7 * i;
                if (start - 1.1 >= fromX)
                {
                    strokes.Add(new Segment(new(start, y + 0.3), new(start - 1.1, y + 1.4)));
                }
            }
        }

        return new Hatch(strokes, LineRole.Hatch);
    }

    /// <summary>The pressure of an action: each has its own direction.</summary>
    public static Hatch Pressure(ActionKind kind, IReadOnlyList<SheetPoint> area) => new(
        kind switch
        {
            ActionKind.Hydrostatic => [.. Family(area, 0, 1.1)],
            ActionKind.Flow => [.. Family(area, 45, 1.1)],
            ActionKind.Wave => [.. Family(area, 135, 1.1)],
            ActionKind.Debris => [.. Family(area, 45, 1.5), .. Family(area, 135, 1.5)],
            ActionKind.Wind => [.. Family(area, 90, 1.1)],
            _ => [.. Family(area, 0, 1.5), .. Family(area, 90, 1.5)],
        },
        Line(kind));

    /// <summary>The line of an action.</summary>
    public static LineRole Line(ActionKind kind) => kind switch
    {
        ActionKind.Hydrostatic => LineRole.Hydrostatic,
        ActionKind.Flow => LineRole.Flow,
        ActionKind.Wave => LineRole.Wave,
        ActionKind.Debris => LineRole.Debris,
        ActionKind.Wind => LineRole.Wind,
        _ => LineRole.LineLoad,
    };

    /// <summary>The area of an action.</summary>
    public static FillRole Fill(ActionKind kind) => kind switch
    {
        ActionKind.Hydrostatic => FillRole.Hydrostatic,
        ActionKind.Flow => FillRole.Flow,
        ActionKind.Wave => FillRole.Wave,
        ActionKind.Debris => FillRole.Debris,
        ActionKind.Wind => FillRole.Wind,
        _ => FillRole.LineLoad,
    };

    private static IEnumerable<Segment> Family(
        IReadOnlyList<SheetPoint> area, double degrees, double spacing, double shift = 0)
    {
        var (sin, cos) = Math.SinCos(double.DegreesToRadians(degrees));
        var across = area.Select(p => p.Y * cos - p.X * sin).ToArray();
        var along = area.Select(p => p.X * cos + p.Y * sin).ToArray();
        var (start, end) = (along.Min() - 1, along.Max() + 1);
        for (var k = Math.Ceiling((across.Min() - shift) / spacing); k * spacing + shift <= across.Max(); k++)
        {
            var offset = k * spacing + shift;
            var line = new Segment(
                new(start * cos - offset * sin, start * sin + offset * cos),
                new(end * cos - offset * sin, end * sin + offset * cos));
            foreach (var piece in PolygonCut.Inside(line, area))
            {
                yield return piece;
            }
        }
    }

    private static IEnumerable<Segment> Brickwork(IReadOnlyList<SheetPoint> area)
    {
        var joints = new List<Segment>();
        var (left, right) = (area.Min(p => p.X), area.Max(p => p.X));
        for (var row = Math.Floor(area.Min(p => p.Y) / Course); row * Course <= area.Max(p => p.Y); row++)
        {
            var shift = row % 2 == 0 ? 0 : Brick / 2;
            for (var k = Math.Ceiling((left - shift) / Brick); k * Brick + shift <= right; k++)
            {
                var x = k * Brick + shift;
                joints.Add(new Segment(new(x, row * Course), new(x, (row + 1) * Course)));
            }
        }

        return Family(area, 0, Course).Concat(joints.SelectMany(j => PolygonCut.Inside(j, area)));
    }

    private static IEnumerable<Segment> Stipple(IReadOnlyList<SheetPoint> area)
    {
        const double cell = 1.7;
        for (var row = (int)Math.Floor(area.Min(p => p.Y) / cell); row * cell <= area.Max(p => p.Y); row++)
        {
            for (var column = (int)Math.Floor(area.Min(p => p.X) / cell); column * cell <= area.Max(p => p.X); column++)
            {
                var chance = Scatter(column, row);
                var place = new SheetPoint((column + 0.2 + 0.6 * chance) * cell, (row + 0.2 + 0.6 * Scatter(row, column)) * cell);
                if (chance > 0.72)
                {
                    foreach (var piece in Stone(place).SelectMany(side => PolygonCut.Inside(side, area)))
                    {
                        yield return piece;
                    }
                }
                else if (PolygonCut.Contains(area, place))
                {
                    yield return new Segment(place, place with { X = place.X + 0.14 });
                }
            }
        }
    }

    private static Segment[] Stone(SheetPoint place)
    {
        var (a, b, c) = (place, new SheetPoint(place.X + 0.8, place.Y + 0.2), new SheetPoint(place.X + 0.3, place.Y - 0.6));
        return [new(a, b), new(b, c), new(c, a)];
    }

    /// <summary>A fixed number from 0 to 1 for a cell, without visible order.</summary>
    private static double Scatter(int column, int row)
    {
        unchecked
        {
            var hash = (uint)column * 2654435761u ^ (uint)row * 2246822519u;
            hash = (hash ^ hash >> 15) * 3266489917u;
            return (hash ^ hash >> 13) % 1000 / 1000.0;
        }
    }
}
