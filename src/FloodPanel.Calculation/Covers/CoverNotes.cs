using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Covers;

/// <summary>What is missing from a cover, and cautions about it.</summary>
internal static class CoverNotes
{
    /// <summary>True for materials that are alike in all directions, as the theory of plates takes them.</summary>
    public static bool IsAlike(Material material) => material.Family is MaterialFamily.Aluminium or MaterialFamily.Steel;

    /// <summary>The tension of a fastener with its source; null while one of them is missing.</summary>
    public static double? TypedTension(Cover cover) =>
        string.IsNullOrWhiteSpace(cover.Fasteners.Source) ? null : cover.Fasteners.Tension;

    /// <summary>What to enter, and what no method here covers; nothing for a cover that stays dry.</summary>
    public static IEnumerable<Note> Gaps(CoverCase cover, DesignStress? allowed)
    {
        if (cover.Depth <= 0)
        {
            yield break;
        }

        if (!cover.IsCovered)
        {
            yield return new("cover-shape", new(
                $"Not covered: a plate more than ten times as long as it is wide. Divide it, or design it as strips."));
            yield break;
        }

        if (!IsAlike(cover.Material))
        {
            yield return new("cover-material", new(
                $"Not covered: bending of a plate of {cover.Material.Family.ToString().ToLowerInvariant()}, which is not alike in all directions. Choose steel or aluminium, or have the plate designed by others."));
        }
        else if (allowed is null)
        {
            yield return new("cover-stress", new(
                $"The plate has no design bending stress: enter an allowable stress, or a strength that the design basis covers for {cover.Material.Family.ToString().ToLowerInvariant()}."));
        }

        if (!CoverTension.IsKnown(cover))
        {
            yield return new("cover-fixing-lever", new($"Enter the fixing lever: without it nobody can say how the fasteners keep the clamped rim from turning."));
        }

        if (CoverTension.Pulls(cover) && TypedTension(cover.Cover) is null)
        {
            yield return cover.Cover.Fasteners.Tension is null
                ? new("cover-tension", new($"Enter the tension that one fastener may take, with its source."))
                : new("cover-tension-source", new($"Enter where the tension of the fasteners comes from: an approval, a standard or tests."));
        }
    }

    /// <summary>Cautions, each only where it applies.</summary>
    public static IEnumerable<Note> Of(CoverCase cover)
    {
        if (cover.Depth <= 0)
        {
            yield return new("cover-dry", new($"The design flood stands no higher than the lowest point of this cover."));
            yield break;
        }

        if (cover.Plate is { } plate && IsAlike(cover.Material) && CoverChecks.DeflectionOf(cover, plate) is var bulge && bulge > cover.Cover.Thickness / 2)
        {
            yield return new("cover-large-deflection", new(
                $"The plate moves {new Quantity(bulge, Dimension.Deflection)}, more than half of its thickness: the theory of small deflections ends there (Roark's Formulas, flat plates). Stress and deflection are then less than shown, but the rim is pulled inward, which its fasteners must hold."));
        }

        if (cover.IsPartlyWet)
        {
            FormattableString words = cover.Cover.Plate is CircleCover
                ? $"The water line crosses the plate: its pressure is taken to run straight from nothing at the top of the circle, more than the true one everywhere."
                : (FormattableString)$"The water line crosses the plate: nothing presses above it, and the pressure below is taken as it is.";
            yield return new("cover-partly-wet", new(words));
        }

        if (cover.IsClamped)
        {
            yield return new("cover-clamped", new($"A rim counts as clamped only where seat and flange are stiff against the plate; else take it as supported."));
        }

        if (cover.Cover.Pressing == CoverPressing.Seating)
        {
            yield return new("cover-seating", new(
                $"Water presses the plate onto its seat: fasteners hold corners, gasket and handling. Water from behind, and lifting of a plate that lies flat, are not in this check."));
        }
    }
}
