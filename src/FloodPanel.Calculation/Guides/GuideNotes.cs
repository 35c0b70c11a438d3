using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Guides;

/// <summary>Cautions about guides and their fasteners.</summary>
internal static class GuideNotes
{
    /// <summary>Lengths that agree to this are equal [m].</summary>
    private const double Rounding = 1e-9;

    /// <summary>The notes of a barrier with guides.</summary>
    /// <remarks>Tests in masonry: NCMA TEK 12-3C (2013): at least five to ASTM E488, allowable load 20 % of their mean.</remarks>
    public static IEnumerable<Note> Of(Opening opening, GuideSet guides)
    {
        if (opening.Wall is WallKind.Masonry or WallKind.CavityMasonry)
        {
            yield return new("guide-fasteners-masonry", new(
                $"The guides are fastened to masonry: values of an approval hold for its own kind of brick. Common practice is to pull fasteners in this wall, at least five; NCMA TEK 12-3C allows a fifth of the mean."));
        }

        if (opening.Wall is WallKind.TimberFrame or WallKind.SteelFrame)
        {
            yield return new("guide-fasteners-frame", new(
                $"The guides are fastened to a framed wall: fasteners must reach its frame, not its cladding alone."));
        }

        var half = opening.Barrier.Logs.EndBearing / 2;
        var least = guides.Mounting == GuideMounting.Reveal ? Math.Max(half, guides.LoadOffset - guides.BaseThickness)
            : guides.LipLever > 0 ? half : 0;
        if (guides.LipLever < least - Rounding)
        {
            yield return new("guide-lip-lever", new(
                $"Lip lever is {Section(guides.LipLever)}; a log presses in the middle of its bearing, {Section(least)} from the root of the lip."));
        }

        if (guides.Mounting != GuideMounting.Reveal && guides.LoadOffset - half < guides.Fasteners.HoleDiameter)
        {
            yield return new("guide-over-fasteners", new(
                $"The logs bear to {Section(guides.LoadOffset - half)} from the fasteners of their guides: nothing is left for their heads."));
        }

        if (guides.Mounting == GuideMounting.WetFace && GuideStatics.Of(guides).Tension == 0)
        {
            yield return new("guide-wet-face", new(
                $"Water presses the guides onto the wall: their fasteners are not loaded by it and only hold them in place. Handling, debris that pulls and water from behind are not covered."));
        }
    }

    private static Quantity Section(double value) => new(value, Dimension.SectionLength);
}
