namespace FloodPanel.Calculation.Parts;

/// <summary>A part of the barrier besides its logs and posts, under one load case.</summary>
/// <param name="Check">The needed check that it belongs to, one of <see cref="NeededChecks"/>.</param>
/// <param name="Member">Which part, "post 1", "left guide", "footing".</param>
/// <param name="Checks">Its checks.</param>
/// <param name="Workings">How its figures that are no checks came about.</param>
public sealed record PartResult(string Check, string Member, IReadOnlyList<Check> Checks, IReadOnlyList<Working> Workings);

/// <summary>Why a needed check has no result.</summary>
/// <param name="Check">The needed check, one of <see cref="NeededChecks"/>.</param>
/// <param name="Note">What to enter, or what no method covers.</param>
public sealed record PartGap(string Check, Note Note);
