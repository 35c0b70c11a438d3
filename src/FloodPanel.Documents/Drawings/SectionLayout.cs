using FloodPanel.Calculation;

namespace FloodPanel.Documents.Drawings;

/// <summary>Where everything of a section stands on its sheet.</summary>
internal sealed record SectionLayout
{
    public required Sheet Sheet { get; init; }

    public required int Scale { get; init; }

    /// <summary>x = 0 at the foot of the flood-side face, z = 0 at the sill.</summary>
    public required Projection Projection { get; init; }

    /// <summary>Height of the sheet as drawn [mm].</summary>
    public required double Height { get; init; }

    /// <summary>Ground as shown above the sill [m].</summary>
    public required double Ground { get; init; }

    /// <summary>Sheet x of the left edge of the view [mm].</summary>
    public required double Left { get; init; }

    /// <summary>Sheet x where the sill begins on the flood side [mm].</summary>
    public required double Nose { get; init; }

    /// <summary>Sheet x of the protected side's outermost point of the barrier [mm].</summary>
    public required double BarrierRight { get; init; }

    /// <summary>Sheet x of the right edge of the view [mm].</summary>
    public required double Right { get; init; }

    /// <summary>Sheet y of the highest level shown [mm].</summary>
    public required double Top { get; init; }

    /// <summary>Sheet y of the lowest level shown [mm].</summary>
    public required double Bottom { get; init; }

    /// <summary>Sheet x of the right edge of the pressure figure [mm]; of the dimensions when there is none.</summary>
    public required double FigureRight { get; init; }

    public double Shown(double z) => Math.Clamp(Projection.Y(z), Top, Bottom);

    /// <summary>Lowest and highest z that is drawn [m]; what lies beyond is off scale.</summary>
    public static (double Low, double High) Reach(DrawingInput input, SectionWater water)
    {
        var barrier = input.Result.BarrierHeight;
        var highest = Math.Max(Math.Max(water.FloodSide ?? 0, input.RequiredHeight), input.GroundHeight);
        return (Math.Clamp(Math.Min(0, input.GroundHeight), -1.2 * barrier, 0), Math.Clamp(highest, barrier, 2 * barrier));
    }

    public static SectionLayout For(
        DrawingInput input, SectionWater water, CaseResult? pressures, Sheet sheet, double levelColumn)
    {
        var u = sheet.TextSize;
        var stack = new LogSection(input);
        var (low, high) = Reach(input, water);
        var ground = Math.Clamp(input.GroundHeight, low, high);

        var head = sheet.Margin + 2.2 * u + (pressures is null ? 0 : PressureFigure.LegendHeight(sheet, input, pressures));
        var foot = sheet.TitleHeight + 3.4 * u;
        var (floodSide, protectedSide) = (5.0 * u, water.ProtectedSide > 0 ? 4.6 * u : 3.0 * u);
        var dimensions = 0.9 * u + 2 * sheet.Row;
        var figure = pressures is null ? 0 : 1.6 * u + PressureFigure.Width(sheet, input, pressures);
        var roomWide = sheet.Width - 2 * sheet.Margin - levelColumn - floodSide - protectedSide - dimensions - figure;
        int Scale() => DrawingScale.Fit(stack.Right - stack.Left, high - low, roomWide, sheet.Height - head - foot);
        head += FreeboardAbove(input, sheet, DrawingScale.PerMetre(Scale()) * (high - input.RequiredHeight));
        var scale = Scale();

        var perMetre = DrawingScale.PerMetre(scale);
        var content = Math.Max((high - low) * perMetre, 5 * 1.32 * u);
        var height = sheet.Trim ? Math.Min(sheet.Height, head + content + foot) : sheet.Height;
        var spareHigh = Math.Max(0, height - head - foot - (high - low) * perMetre);
        var spareWide = Math.Max(0, roomWide - (stack.Right - stack.Left) * perMetre);
        var left = sheet.Margin + levelColumn + 0.25 * spareWide;
        var faceX = left + floodSide - stack.Left * perMetre;
        var top = head + spareHigh / 2;
        var barrierRight = faceX + stack.Right * perMetre;
        var right = barrierRight + protectedSide + 0.25 * spareWide;
        return new SectionLayout
        {
            Sheet = sheet,
            Scale = scale,
            Projection = new Projection(faceX, top + high * perMetre, perMetre),
            Height = height,
            Ground = ground,
            Left = left,
            Nose = left + floodSide - 1.3 * u,
            BarrierRight = barrierRight,
            Right = right,
            Top = top,
            Bottom = top + (high - low) * perMetre,
            FigureRight = pressures is null ? right + dimensions : sheet.Width - sheet.Margin,
        };
    }

    /// <summary>Room [mm] for the figure of a freeboard too small to hold it: it stands above.</summary>
    private static double FreeboardAbove(DrawingInput input, Sheet sheet, double alreadyThere)
    {
        var figure = Sketch.Width(input.Length(input.Project.Site.Freeboard), sheet.TextSize, TextRole.Normal);
        return Math.Max(0, figure + 2.4 - 2.2 * sheet.TextSize - Math.Max(0, alreadyThere));
    }
}

/// <summary>Water in a section, above the sill [m]; null where there is none.</summary>
/// <param name="FloodSide">On the flood side.</param>
/// <param name="ProtectedSide">On the protected side, 0 when dry.</param>
/// <param name="IsDesignFlood">True when the flood side stands at the design flood level.</param>
internal sealed record SectionWater(double? FloodSide, double ProtectedSide, bool IsDesignFlood)
{
    public static SectionWater In(DrawingInput input, string caseName) => caseName switch
    {
        "brim-full" => new(input.Result.BarrierHeight, 0, false),
        "wind" or "line" => new(null, 0, false),
        _ => new(input.FloodHeight, input.Result.ProtectedDepth, true),
    };
}
