using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Covers;

/// <summary>The calculation of one cover.</summary>
/// <param name="Cover">The cover as entered.</param>
/// <param name="Depth">h_0, depth of its lowest point below the design flood level [m]; not above zero where it stays dry.</param>
/// <param name="Response">What the plate feels under the unfactored water; null where it stays dry or no method covers it.</param>
/// <param name="Fasteners">Number of fasteners along the edges that are held [-].</param>
/// <param name="Checks">Its checks.</param>
/// <param name="Workings">How its figures that are no checks came about.</param>
/// <param name="Gaps">What to enter before the verdict can be complete, and what no method covers.</param>
/// <param name="Notes">Cautions.</param>
public sealed record CoverResult(
    Cover Cover,
    double Depth,
    PlateResponse? Response,
    int Fasteners,
    IReadOnlyList<Check> Checks,
    IReadOnlyList<Working> Workings,
    IReadOnlyList<Note> Gaps,
    IReadOnlyList<Note> Notes)
{
    /// <summary>The check with the greatest utilisation; null without checks.</summary>
    public Check? Governing => Checks.MaxBy(check => check.Utilisation);

    /// <summary>Adequate, inadequate or incomplete.</summary>
    public VerdictKind Kind => Checks.Any(check => !check.Passes) ? VerdictKind.Inadequate
        : Gaps.Count > 0 ? VerdictKind.Incomplete
        : VerdictKind.Adequate;

    /// <summary>The verdict in a sentence.</summary>
    public Sentence Sentence => (Kind, Governing) switch
    {
        (VerdictKind.Incomplete, null) => new($"Incomplete. Nothing is checked yet."),
        (VerdictKind.Incomplete, { } worst) => new($"Incomplete. Of what is checked, {Named(worst)} governs, at {worst.Utilisation:0.00} of the allowable."),
        (_, null) => new($"Adequate. The design flood does not reach this cover."),
        (VerdictKind.Inadequate, { Utilisation: < 1.005 } worst) => new($"Inadequate. {worst.Title} governs, at just over 1.00 of the allowable."),
        (var kind, { } worst) => new($"{kind}. {worst.Title} governs, at {worst.Utilisation:0.00} of the allowable."),
    };

    private static string Named(Check check) => char.ToLowerInvariant(check.Title[0]) + check.Title[1..];
}
