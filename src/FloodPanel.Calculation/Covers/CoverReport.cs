using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Covers;

/// <summary>Checks of a cover, what is missing, and cautions.</summary>
internal static class CoverReport
{
    public static CoverResult Of(Site site, Cover cover, DesignBasis basis, Library library)
    {
        var model = new CoverCase(site, cover, basis, library);
        var fasteners = CoverRim.Of(cover).Count;
        Note[] notes = [.. CoverNotes.Of(model)];
        if (model.Plate is not { } plate)
        {
            return new(cover, model.Depth, null, fasteners, [], [], [.. CoverNotes.Gaps(model, null)], notes);
        }

        var allowed = CoverNotes.IsAlike(model.Material) ? DesignStress.Bending(model.Material, basis) : null;
        var checks = new List<Check>();
        var workings = new List<Working>();
        if (allowed is not null)
        {
            checks.Add(CoverChecks.Bending(model, plate, allowed));
        }

        if (CoverNotes.IsAlike(model.Material))
        {
            checks.Add(CoverChecks.Deflection(model, plate));
        }

        if (CoverTension.Pulls(model) && CoverTension.IsKnown(model))
        {
            if (CoverNotes.TypedTension(cover) is { } tension)
            {
                checks.Add(CoverTension.Check(model, plate, tension));
            }
            else
            {
                workings.Add(CoverTension.Working(model, plate));
            }
        }

        return new(cover, model.Depth, plate, fasteners, checks, workings, [.. CoverNotes.Gaps(model, allowed)], notes);
    }
}
