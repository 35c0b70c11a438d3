using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.Handling;
using FloodPanel.Calculation.Leakage;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation;

/// <summary>The calculation of a project: never stored, always made anew from the inputs.</summary>
/// <param name="Project">The inputs.</param>
/// <param name="Openings">One result for each opening, in their order.</param>
/// <param name="Covers">One result for each cover, in their order.</param>
public sealed record ProjectResult(Project Project, IReadOnlyList<OpeningResult> Openings, IReadOnlyList<CoverResult> Covers);

/// <summary>May the barrier be used as it stands?</summary>
public enum VerdictKind
{
    /// <summary>Every needed check ran and passed.</summary>
    Adequate,

    /// <summary>A check failed.</summary>
    Inadequate,

    /// <summary>No check failed, but one that is needed has no result.</summary>
    Incomplete,
}

/// <summary>The check that governs.</summary>
/// <param name="Check">Name of the check, "log-bending".</param>
/// <param name="Case">Name of the load case; null for a check outside the cases.</param>
/// <param name="Utilisation">Demand / capacity [-].</param>
/// <param name="Member">Where it stands, "log 1 in bay 2"; empty for the barrier as a whole.</param>
public sealed record Governing(string Check, string? Case, double Utilisation, string Member);

/// <summary>A caution or a result that a method does not cover.</summary>
/// <param name="Code">Fixed name, "flow-detailed-analysis".</param>
/// <param name="Text">A sentence for the reader.</param>
public sealed record Note(string Code, Sentence Text);

/// <summary>The verdict on one opening.</summary>
/// <param name="Kind">Adequate, inadequate or incomplete.</param>
/// <param name="Missing">Needed checks without a result, by name.</param>
/// <param name="Governing">The check that governs; null when none has a result.</param>
/// <param name="Sentence">The verdict in one or two sentences.</param>
public sealed record Verdict(VerdictKind Kind, IReadOnlyList<string> Missing, Governing? Governing, Sentence Sentence);

/// <summary>The calculation of one opening.</summary>
public sealed record OpeningResult
{
    /// <summary>The opening as entered.</summary>
    public required Opening Opening { get; init; }

    /// <summary>Design flood level [m, project datum].</summary>
    public required double DesignFloodLevel { get; init; }

    /// <summary>h, design flood level less sill level [m]; negative when the sill stays dry.</summary>
    public required double RetainedDepth { get; init; }

    /// <summary>h', water above the sill on the protected side [m]; 0 when dry.</summary>
    public required double ProtectedDepth { get; init; }

    /// <summary>H, vertical height of the barrier [m].</summary>
    public required double BarrierHeight { get; init; }

    /// <summary>How the levels came about.</summary>
    public required Working Levels { get; init; }

    /// <summary>Load cases, the design flood first.</summary>
    public required IReadOnlyList<CaseResult> Cases { get; init; }

    /// <summary>Barrier height against the required height.</summary>
    public required Check Freeboard { get; init; }

    /// <summary>Cutting length and mass of the logs, one row for each kind of log in each bay.</summary>
    public required IReadOnlyList<LogSchedule> Schedule { get; init; }

    /// <summary>Hold-down against buoyancy, one row for each bay.</summary>
    public required IReadOnlyList<HoldDownResult> HoldDowns { get; init; }

    /// <summary>Leakage, rain and pump; null where nobody asks.</summary>
    public LeakageResult? Leakage { get; init; }

    /// <summary>The verdict.</summary>
    public required Verdict Verdict { get; init; }

    /// <summary>What to enter before the verdict can be complete, and what no method covers; nothing for parts designed by others.</summary>
    public IReadOnlyList<PartGap> Gaps { get; init; } = [];

    /// <summary>Cautions and results not covered.</summary>
    public required IReadOnlyList<Note> Notes { get; init; }
}

/// <summary>One load case of an opening.</summary>
public sealed record CaseResult
{
    /// <summary>Which case.</summary>
    public required CaseKind Kind { get; init; }

    /// <summary>Fixed name, "design-flood".</summary>
    public string Name => CaseNames.InFiles(Kind);

    /// <summary>Load factor of the design basis on the flood side, or on the case's own action [-].</summary>
    public required double Factor { get; init; }

    /// <summary>Unfactored resultant [N per metre of width], normal to the face.</summary>
    public required double Resultant { get; init; }

    /// <summary>Height z of the resultant above the sill [m]; null when there is no resultant.</summary>
    public required double? CentreOfPressure { get; init; }

    /// <summary>How the resultant and its height came about.</summary>
    public required Working ResultantWorking { get; init; }

    /// <summary>The actions of the case, in the order in which they are stacked.</summary>
    public required IReadOnlyList<ActionResult> Actions { get; init; }

    /// <summary>The logs, bay by bay from left to right, the lowest log first.</summary>
    public required IReadOnlyList<LogResult> Logs { get; init; }

    /// <summary>The posts from left to right.</summary>
    public required IReadOnlyList<PostResult> Posts { get; init; }

    /// <summary>The guides, left and right.</summary>
    public required IReadOnlyList<GuideResult> Guides { get; init; }

    /// <summary>Base plates, anchors, guides, walls and footings, as far as they have inputs.</summary>
    public IReadOnlyList<PartResult> Parts { get; init; } = [];
}

/// <summary>One action in a case.</summary>
/// <param name="Kind">The action.</param>
/// <param name="Pieces">Its unfactored pressure over height; pieces that overlap add up.</param>
/// <param name="Resultant">Unfactored resultant [N per metre of width]; 0 for debris, which is a force by itself.</param>
/// <param name="CentreOfPressure">Height z of the resultant [m]; null when there is none.</param>
/// <param name="Factor">Load factor of the design basis on the flood side [-].</param>
/// <param name="Working">How the pressures, or the force, came about.</param>
/// <param name="ResultantWorking">How the resultant and its height came about.</param>
/// <param name="Impact">Debris: the force [N] and the height at which posts and guides take it; else null.</param>
public sealed record ActionResult(
    ActionKind Kind,
    IReadOnlyList<PressurePiece> Pieces,
    double Resultant,
    double? CentreOfPressure,
    double Factor,
    Working Working,
    Working ResultantWorking,
    ConcentratedForce? Impact = null);

/// <summary>One log in one bay under one case. A check is null where its inputs are missing.</summary>
public sealed record LogResult
{
    /// <summary>Position in the stack, 1 = lowest.</summary>
    public required int Index { get; init; }

    /// <summary>Bay from the left, from 1.</summary>
    public required int Bay { get; init; }

    /// <summary>Height z of the bottom edge [m].</summary>
    public required double Bottom { get; init; }

    /// <summary>Height z of the top edge [m].</summary>
    public required double Top { get; init; }

    /// <summary>w, design line load [N/m].</summary>
    public required double LineLoad { get; init; }

    /// <summary>P, design share of a debris impact [N]; 0 where none strikes.</summary>
    public required double PointLoad { get; init; }

    /// <summary>M, design moment [N·m].</summary>
    public required double Moment { get; init; }

    /// <summary>V, design shear force [N].</summary>
    public required double Shear { get; init; }

    /// <summary>Unfactored deflection at mid-span [m].</summary>
    public required double Deflection { get; init; }

    /// <summary>How the line load came about.</summary>
    public required Working LineLoadWorking { get; init; }

    /// <summary>Bending check, or null.</summary>
    public Check? BendingCheck { get; init; }

    /// <summary>Shear check, or null.</summary>
    public Check? ShearCheck { get; init; }

    /// <summary>Deflection check, or null where the deflection is reported and not judged.</summary>
    public Check? DeflectionCheck { get; init; }

    /// <summary>How the moment came about; null where the bending check tells it.</summary>
    public Working? MomentWorking { get; init; }

    /// <summary>How the shear force came about; null where the shear check tells it.</summary>
    public Working? ShearWorking { get; init; }

    /// <summary>How the deflection came about; null where the deflection check tells it.</summary>
    public Working? DeflectionWorking { get; init; }

    /// <summary>Further checks: what the section, its seat and its joints must stand.</summary>
    public IReadOnlyList<Check> Others { get; init; } = [];

    /// <summary>The checks that have a result.</summary>
    public IEnumerable<Check> Checks => new[] { BendingCheck, ShearCheck, DeflectionCheck }.OfType<Check>().Concat(Others);
}

/// <summary>One post under one case. A check is null where its inputs are missing.</summary>
public sealed record PostResult
{
    /// <summary>Post from the left, from 1.</summary>
    public required int Index { get; init; }

    /// <summary>Design shear at the base [N], normal to the face.</summary>
    public required double BaseShear { get; init; }

    /// <summary>Design moment at the base [N·m].</summary>
    public required double BaseMoment { get; init; }

    /// <summary>Unfactored deflection of the tip [m].</summary>
    public required double TipDeflection { get; init; }

    /// <summary>Bending check, or null.</summary>
    public Check? BendingCheck { get; init; }

    /// <summary>Shear check, or null.</summary>
    public Check? ShearCheck { get; init; }

    /// <summary>Deflection check, or null where the deflection is reported and not judged.</summary>
    public Check? DeflectionCheck { get; init; }

    /// <summary>How the moment came about; null where the bending check tells it.</summary>
    public Working? MomentWorking { get; init; }

    /// <summary>How the shear force came about; null where the shear check tells it.</summary>
    public Working? ShearWorking { get; init; }

    /// <summary>How the deflection came about; null where the deflection check tells it.</summary>
    public Working? DeflectionWorking { get; init; }

    /// <summary>Further checks: interaction, stability, welded base.</summary>
    public IReadOnlyList<Check> Others { get; init; } = [];

    /// <summary>The checks that have a result.</summary>
    public IEnumerable<Check> Checks => new[] { BendingCheck, ShearCheck, DeflectionCheck }.OfType<Check>().Concat(Others);
}

/// <summary>One guide under one case.</summary>
/// <param name="Side">"left" or "right", seen from the flood side.</param>
/// <param name="Reaction">Design reaction of the whole stack [N].</param>
/// <param name="PeakLineReaction">Greatest design reaction of one log per length of guide [N/m].</param>
/// <param name="Working">How they came about.</param>
public sealed record GuideResult(string Side, double Reaction, double PeakLineReaction, Working Working);

/// <summary>Cutting length and mass of equal logs of one bay.</summary>
/// <param name="Bay">Bay from the left, from 1.</param>
/// <param name="FirstLog">Position of the lowest of them in the stack, 1 = lowest of all.</param>
/// <param name="Count">Number of logs [-].</param>
/// <param name="CuttingLength">Length to cut [m].</param>
/// <param name="Mass">Mass of one log, profile only [kg].</param>
/// <param name="Working">How they came about.</param>
public sealed record LogSchedule(int Bay, int FirstLog, int Count, double CuttingLength, double Mass, Working Working);
