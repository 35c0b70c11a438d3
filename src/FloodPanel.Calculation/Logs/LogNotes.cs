using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Logs;

/// <summary>What is not checked of the logs for want of an optional input, and what no method covers.</summary>
internal static class LogNotes
{
    /// <summary>A wall too slender to yield: no method here covers it, so that the logs have no complete result.</summary>
    private const string Slender = "buckling-slender";

    public static IEnumerable<Note> Of(OpeningModel model) =>
        Strengths(model).SelectMany(strength => Of(strength, model)).DistinctBy(note => note.Code).Where(note => note.Code != Slender);

    public static IEnumerable<PartGap> Gaps(OpeningModel model) => Strengths(model)
        .Select(strength => strength.Buckling.Gap)
        .OfType<Note>()
        .Where(note => note.Code == Slender)
        .Take(1)
        .Select(note => new PartGap(NeededChecks.Logs, note));

    private static IEnumerable<LogStrength> Strengths(OpeningModel model) => model.Runs.Select(run => model.LogStrength(run.First - 1));

    private static IEnumerable<Note> Of(LogStrength strength, OpeningModel model)
    {
        var (material, stack) = (strength.Log.Material, model.Opening.Barrier.Logs);
        if (strength.Buckling.Gap is { } gap)
        {
            yield return gap with { Text = new($"Logs: {gap.Text}") };
        }

        if (material is { Family: MaterialFamily.Timber, Reference: StrengthReference.NdsReference } && stack.Timber is null)
        {
            yield return new("timber-duration", new(
                $"Reference values of the NDS need the duration of the load: choose it under Timber in the form of the logs."));
        }

        if (material.Family == MaterialFamily.Timber && strength.Across is null && strength.Log.Bending is not null)
        {
            yield return new("timber-bearing", new(
                $"The seat of the timber logs is not checked: enter the compression across the grain of the material, under a basis that covers it."));
        }

        if (material.Family == MaterialFamily.Composite && strength.Walls is not null && strength.Cross is null)
        {
            yield return new("skin-composite", new(
                $"The skin of the composite logs between webs is not checked: enter the strength across the fibres, and the factors on it under Composite in the form of the logs."));
        }
    }
}
