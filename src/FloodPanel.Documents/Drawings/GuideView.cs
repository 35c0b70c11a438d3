using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>The plan section of a guide on its sheet: the largest scale at which it and its dimensions fit.</summary>
internal sealed class GuideView
{
    /// <summary>Greatest height of the section itself [mm].</summary>
    private const double MostHigh = 105;

    /// <summary>Rows of dimensions right of the section [-].</summary>
    private const double RowsAfter = 2.4;

    private readonly double perMetre;
    private readonly double originX;
    private readonly double originY;

    public GuideView(Sheet sheet, GuidePlan plan, GuideMounting mounting)
    {
        (Sheet, Plan, Mounting) = (sheet, plan, mounting);
        var (left, right) = (plan.Corners.Min(p => p.X), plan.Corners.Max(p => p.X));
        var (bottom, top) = (plan.Corners.Min(p => p.Y), plan.Corners.Max(p => p.Y));
        var (before, above, below) = RowsBeside(mounting);
        var (start, end) = ((before + 0.8) * sheet.Row, sheet.Width - RowsAfter * sheet.Row);
        Scale = DrawingScale.Fit(right - left, top - bottom, end - start, MostHigh);
        perMetre = DrawingScale.PerMetre(Scale);
        Top = sheet.Margin + 2 * sheet.TextSize + above * sheet.Row;
        Bottom = Top + (top - bottom) * perMetre;
        Height = Bottom + (below + 1.2) * sheet.Row + sheet.TitleHeight;
        originX = (start + end) / 2 - (left + right) / 2 * perMetre;
        originY = Top + top * perMetre;
    }

    public Sheet Sheet { get; }

    public GuidePlan Plan { get; }

    public GuideMounting Mounting { get; }

    /// <summary>n in the scale 1:n.</summary>
    public int Scale { get; }

    /// <summary>Height of the sheet that the view needs [mm].</summary>
    public double Height { get; }

    /// <summary>Upper edge of what is drawn [mm].</summary>
    public double Top { get; }

    /// <summary>Lower edge of what is drawn [mm].</summary>
    public double Bottom { get; }

    public SheetPoint At(PlanSpot spot) => new(originX + spot.X * perMetre, originY - spot.Y * perMetre);

    public SheetPoint[] All(PlanSpot[] spots) => [.. spots.Select(At)];

    /// <summary>The column of vertical dimensions right of the section [mm].</summary>
    public double After => At(new(Plan.LogRight, 0)).X + 1.3 * Sheet.Row;

    /// <summary>A row of horizontal dimensions above the section, the lowest 1 [mm].</summary>
    public double Above(int row) => Top - row * Sheet.Row + 0.4 * Sheet.Row;

    /// <summary>A row of horizontal dimensions below the section, the highest 1 [mm].</summary>
    public double Below(int row) => Bottom + row * Sheet.Row - 0.2 * Sheet.Row;

    /// <summary>A column of vertical dimensions left of the section, the nearest 1 [mm].</summary>
    public double Before(int column) => At(new(Plan.Corners.Min(p => p.X), 0)).X - column * Sheet.Row + 0.4 * Sheet.Row;

    /// <summary>Rows of dimensions left of, above and below the section, see <see cref="GuideDimensions"/>.</summary>
    private static (int Before, int Above, int Below) RowsBeside(GuideMounting mounting) => mounting switch
    {
        GuideMounting.WetFace => (1, 3, 2),
        GuideMounting.DryFace => (1, 3, 3),
        _ => (3, 2, 1),
    };
}
