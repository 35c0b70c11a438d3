namespace FloodPanel.Documents.Drawings;

/// <summary>Where everything of an elevation stands on its sheet.</summary>
internal sealed record ElevationLayout
{
    public required Sheet Sheet { get; init; }

    public required int Scale { get; init; }

    /// <summary>x = 0 at the left reveal, z = 0 at the sill.</summary>
    public required Projection Projection { get; init; }

    /// <summary>Height of the sheet as drawn [mm].</summary>
    public required double Height { get; init; }

    /// <summary>Width of wall shown beside the opening [mm].</summary>
    public required double Pier { get; init; }

    /// <summary>True when the opening is cut off above the water, so that a larger scale fits.</summary>
    public required bool IsBroken { get; init; }

    /// <summary>Ground as shown above the sill [m]; ground far below is drawn nearer.</summary>
    public required double Ground { get; init; }

    /// <summary>Sheet y of the upper edge of the wall [mm].</summary>
    public required double Top { get; init; }

    /// <summary>Sheet y of the lower edge of the view, the ground or the sill [mm].</summary>
    public required double Bottom { get; init; }

    /// <summary>Sheet x of the outer edges of the wall [mm].</summary>
    public required double Left { get; init; }

    /// <summary>Sheet x of the outer edges of the wall [mm].</summary>
    public required double Right { get; init; }

    /// <summary>Sheet y kept inside the view.</summary>
    public double Shown(double z) => Math.Clamp(Projection.Y(z), Top, Bottom);

    /// <summary>Lowest and highest z that is drawn [m], apart from the head of the opening; what lies beyond is off scale.</summary>
    public static (double Low, double High) Reach(DrawingInput input)
    {
        var extent = Math.Max(input.Result.BarrierHeight, input.Opening.ClearHeight);
        var highest = Math.Max(Math.Max(input.FloodHeight, input.RequiredHeight), input.GroundHeight);
        var high = Math.Min(Math.Max(input.Result.BarrierHeight, highest), 1.6 * extent);
        return (Math.Clamp(Math.Min(0, input.GroundHeight), -extent, 0), high);
    }

    /// <summary>The layout; less of the wall is shown where that makes room for a larger scale.</summary>
    public static ElevationLayout For(DrawingInput input, Sheet sheet, double levelColumn)
    {
        var wide = With(2.4 * sheet.TextSize, input, sheet, levelColumn);
        var narrow = With(1.3 * sheet.TextSize, input, sheet, levelColumn);
        return narrow.Scale < wide.Scale ? narrow : wide;
    }

    private static ElevationLayout With(double pier, DrawingInput input, Sheet sheet, double levelColumn)
    {
        var u = sheet.TextSize;
        var opening = input.Opening;
        var (low, needed) = Reach(input);
        var ground = Math.Clamp(input.GroundHeight, low, needed);

        var (lintel, head) = (1.6 * u, sheet.Margin + 2.0 * u);
        var dimensions = 2 * sheet.Row + 0.4 * u;
        var foot = 1.6 + DimensionRows(input, sheet) + sheet.TitleHeight + 0.7 * u;
        var roomWide = sheet.Width - 2 * sheet.Margin - dimensions - 2 * pier - levelColumn;
        var roomHigh = sheet.Height - head - lintel - foot;

        var (whole, cut) = (Math.Max(opening.ClearHeight, needed), needed * 1.12);
        var wholeScale = DrawingScale.Fit(opening.ClearWidth, whole - low, roomWide, roomHigh);
        var cutScale = DrawingScale.Fit(opening.ClearWidth, cut - low, roomWide, roomHigh);
        var broken = cutScale < wholeScale && cut < 0.85 * opening.ClearHeight;
        var high = broken ? cut : whole;
        var bayCut = ElevationBays.Cut(input, high - low, roomWide, roomHigh, 3.4 * u);
        var width = opening.ClearWidth - (bayCut is null ? 0 : bayCut.ToX - bayCut.FromX);
        var gap = bayCut?.Gap ?? 0;
        var scale = DrawingScale.Fit(width, high - low, roomWide - gap, roomHigh);

        var perMetre = DrawingScale.PerMetre(scale);
        var content = Math.Max((high - low) * perMetre, 6 * 1.32 * u - lintel);
        var height = sheet.Trim ? Math.Min(sheet.Height, head + lintel + content + foot) : sheet.Height;
        var spareHigh = Math.Max(0, height - head - lintel - foot - (high - low) * perMetre);
        var spareWide = Math.Max(0, roomWide - gap - width * perMetre);
        var left = sheet.Margin + dimensions + spareWide / 2;
        var top = head + spareHigh / 2;
        return new ElevationLayout
        {
            Sheet = sheet,
            Scale = scale,
            Projection = new Projection(left + pier, top + lintel + high * perMetre, perMetre, bayCut),
            Height = height,
            Pier = pier,
            IsBroken = broken,
            Ground = ground,
            Top = top,
            Bottom = top + lintel + (high - low) * perMetre,
            Left = left,
            Right = left + 2 * pier + gap + width * perMetre,
        };
    }

    /// <summary>Distance of the rows of dimensions below the ground [mm]: bays and posts, and the clear width; one row for one bay.</summary>
    public static (double First, double Second) RowsBelow(DrawingInput input, Sheet sheet)
    {
        var first = 1.4 * sheet.TextSize + 1.6;
        return (first, input.Barrier.Bays.Count > 1 ? first + 2.5 * sheet.TextSize : first);
    }

    private static double DimensionRows(DrawingInput input, Sheet sheet) => RowsBelow(input, sheet).Second - 1.6;
}
