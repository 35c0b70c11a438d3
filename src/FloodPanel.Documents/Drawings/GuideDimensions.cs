using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>Dimensions of a guide in plan, the shortest nearest to it; each is tied to its field.</summary>
internal static class GuideDimensions
{
    /// <summary>From the end of a dimension to a figure beyond it, and from a figure to the edge of the sheet [mm].</summary>
    private const double Beside = 1.2;

    public static IEnumerable<Mark> Of(GuideView view, DrawingInput input, GuideSet guides)
    {
        var typed = new Typed(input, guides);
        return guides.Mounting == GuideMounting.Reveal ? InTheReveal(view, typed, guides) : OnAFace(view, typed, guides);
    }

    private static IEnumerable<Mark> InTheReveal(GuideView view, Typed typed, GuideSet guides)
    {
        var (bearing, half, wall, lip) = (guides.BearingDistance, guides.BearingWidth / 2, -GuidePlan.WallShown, view.Plan.Lip.Upper);
        return
        [
            Upright(view, typed.Strip, bearing - half, bearing + half, view.Before(1), wall),
            Upright(view, typed.Bearing, 0, bearing, view.Before(2), wall, Overflow.Before),
            Upright(view, typed.Edge, 0, guides.Fasteners.EdgeDistance, view.Before(3), wall),
            Lip(view, typed),
            .. Lever(view, typed, guides, view.Above(1), lip),
            Level(view, typed.Load, 0, guides.LoadOffset, view.Above(2), lip),
            Level(view, typed.Base, 0, guides.BaseThickness, view.Below(1), view.Plan.Guide[0].Y, Overflow.Before),
        ];
    }

    private static IEnumerable<Mark> OnAFace(GuideView view, Typed typed, GuideSet guides)
    {
        var isDry = guides.Mounting == GuideMounting.DryFace;
        var (bearing, half) = (isDry ? -guides.BearingDistance : guides.BearingDistance, guides.BearingWidth / 2);
        var (wall, log) = (view.Plan.Wall[2].Y, isDry ? view.Plan.Lip.Upper : view.Plan.Log.Lower);
        double WallRow(int row) => isDry ? view.Below(row) : view.Above(row);
        double LogRow(int row) => isDry ? view.Above(row) : view.Below(row);
        return
        [
            Level(view, typed.Strip, bearing - half, bearing + half, WallRow(1), wall, Overflow.Before),
            Level(view, typed.Bearing, Math.Min(0, bearing), Math.Max(0, bearing), WallRow(2), wall, Overflow.Before),
            Level(view, typed.Edge, 0, guides.Fasteners.EdgeDistance, WallRow(3), wall),
            .. Lever(view, typed, guides, LogRow(1), log),
            Level(view, typed.Load, 0, guides.LoadOffset, LogRow(2), log),
            Lip(view, typed),
            Upright(view, typed.Base, isDry ? 0 : -guides.BaseThickness, isDry ? guides.BaseThickness : 0, view.Before(1), view.Plan.Guide[0].X),
        ];
    }

    /// <summary>Nothing to draw where the lip lies on the wall.</summary>
    private static IEnumerable<Mark> Lever(GuideView view, Typed typed, GuideSet guides, double row, double edge) =>
        guides.LipLever == 0 ? [] : [Level(view, typed.Lever, guides.LoadOffset - guides.LipLever, guides.LoadOffset, row, edge)];

    private static Mark Lip(GuideView view, Typed typed) =>
        Upright(
            view, typed.Lip, view.Plan.Lip.Lower, view.Plan.Lip.Upper, view.After, view.Plan.Lip.Right,
            view.Mounting == GuideMounting.DryFace ? Overflow.Before : Overflow.After);

    private static Mark Level(
        GuideView view, DimensionLabel label, double from, double to, double y, double edge, Overflow overflow = Overflow.After)
    {
        var (left, right) = (view.At(new(from, 0)).X, view.At(new(to, 0)).X);
        return DimensionMarks.Horizontal(
            view.Sheet, label with { Overflow = Side(view, label, overflow, left, view.Sheet.Width - right) }, left, right, y, view.At(new(0, edge)).Y);
    }

    private static Mark Upright(
        GuideView view, DimensionLabel label, double from, double to, double x, double edge, Overflow overflow = Overflow.After)
    {
        var (low, high) = (view.At(new(0, from)).Y, view.At(new(0, to)).Y);
        var floor = view.Height - view.Sheet.TitleHeight;
        return DimensionMarks.Vertical(
            view.Sheet, label with { Overflow = Side(view, label, overflow, floor - low, high) }, low, high, x, view.At(new(edge, 0)).X);
    }

    /// <summary>A figure that does not fit between its ticks stands where the sheet has room for it.</summary>
    private static Overflow Side(GuideView view, DimensionLabel label, Overflow wanted, double before, double after)
    {
        var needs = Sketch.Width(label.Figures[^1], view.Sheet.TextSize, TextRole.Normal) + 2 * Beside;
        return wanted == Overflow.Before ? before >= needs ? Overflow.Before : Overflow.After
            : after >= needs ? Overflow.After : Overflow.Before;
    }

    /// <summary>The labels of what is typed.</summary>
    private sealed class Typed(DrawingInput input, GuideSet guides)
    {
        public DimensionLabel Strip => Of(GuideFields.BearingWidth, "strip", guides.BearingWidth);

        public DimensionLabel Bearing => Of(GuideFields.BearingDistance, "bearing", guides.BearingDistance);

        public DimensionLabel Edge => Of(GuideFields.EdgeDistance, "edge", guides.Fasteners.EdgeDistance, "fasteners.");

        public DimensionLabel Lip => Of(GuideFields.LipThickness, "lip", guides.LipThickness);

        public DimensionLabel Lever => Of(GuideFields.LipLever, "lever", guides.LipLever);

        public DimensionLabel Load => Of(GuideFields.LoadOffset, "load", guides.LoadOffset);

        public DimensionLabel Base => Of(GuideFields.BaseThickness, "base", guides.BaseThickness);

        private DimensionLabel Of(Field field, string word, double value, string parent = "") => new(
            $"guides.{parent}{field.Key}", $"{field.Label} {input.Size(value)}", [$"{word} {input.Size(value)}"]);
    }
}
