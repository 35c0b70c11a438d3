using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.Actions.Waves;
using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Handling;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Walls;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation;

/// <summary>Cautions and results not covered, each only where it applies.</summary>
public static class Cautions
{
    /// <summary>Printed wherever a result is printed.</summary>
    public static Note CalculationAid { get; } = new("calculation-aid", new(
        $"This is a calculation aid. It must be checked by a licensed engineer and follow local codes. A barrier can fail or be overtopped: people leave when told to."));

    internal static List<Note> Of(
        Site site, Opening opening, OpeningModel model, IReadOnlyList<LogSchedule> schedule, IReadOnlyList<HoldDownResult> holdDowns)
    {
        var notes = new List<Note>();
        notes.AddRange(LevelNotes.Of(site));
        Levels(notes, site, opening, model);
        Flowing(notes, model);
        if (model.Wave is { } wave)
        {
            notes.AddRange(WaveNotes.Of(wave, model.Rake));
        }

        if (model.Debris is { } debris)
        {
            notes.AddRange(DebrisNotes.Of(debris));
        }

        Strengths(notes, NeededChecks.Logs, model.Runs.Select(run => run.Log).FirstOrDefault(log => !log.IsComplete) ?? model.Runs[0].Log);
        notes.AddRange(LogNotes.Of(model));
        if (model.Post is { } post)
        {
            Strengths(notes, NeededChecks.Posts, post);
            notes.AddRange(PostNotes.Of(post, model.Basis));
        }

        if (opening.Barrier.Guides is { } guides)
        {
            notes.AddRange(GuideNotes.Of(opening, guides));
        }

        Declarations(notes, opening);
        if (opening.Leakage is { BackFlowClosed: false })
        {
            notes.Add(new("back-flow-open", new(
                $"Nobody has confirmed that water cannot come back behind the barrier through drains, vents and cavities: check each way, and close it or fit a valve.")));
        }

        notes.AddRange(AnchorReport.Notes(opening));
        Lifting(notes, schedule);
        Floating(notes, holdDowns);
        Walls(notes, opening.Wall, WallDepth.Against(site, opening));
        if (opening.Barrier.Footing is not null)
        {
            notes.Add(new("ground-values", new(
                $"The footing stands on values of the ground that a geotechnical engineer must confirm; drains, scour and passing pipes under it are not in the calculation.")));
        }

        notes.Add(CalculationAid);
        return notes;
    }

    private static void Levels(List<Note> notes, Site site, Opening opening, OpeningModel model)
    {
        var (depth, height) = (model.RetainedDepth, model.Height);
        if (depth <= 0)
        {
            notes.Add(new("sill-dry", new(
                $"The design flood level, {Length(site.DesignFloodLevel)}, does not rise above the sill, {Length(opening.SillLevel)}: no water stands against the barrier in the design flood.")));
        }

        if (depth > height + FloodLevels.HeightTolerance)
        {
            notes.Add(new("overtopped", new(
                $"The design flood stands {Length(depth - height)} above the top of the barrier: water flows over it.")));
        }

        if (height > opening.ClearHeight + FloodLevels.HeightTolerance)
        {
            notes.Add(new("taller-than-opening", new(
                $"The barrier, {Length(height)} high, is taller than the clear height of the opening, {Length(opening.ClearHeight)}: check that the top logs can be placed.")));
        }
    }

    private static void Flowing(List<Note> notes, OpeningModel model)
    {
        if (model.Flow is { Velocity: > Flow.SurchargeVelocityLimit } flow)
        {
            notes.Add(new("flow-detailed-analysis", new(
                $"Flow of {new Quantity(flow.Velocity, Dimension.Velocity)} is above {new Quantity(Flow.SurchargeVelocityLimit, Dimension.Velocity)}: the method asks for a detailed analysis. The drag shown is an estimate.")));
        }
    }

    private static void Strengths(List<Note> notes, string check, Member member)
    {
        if (member.IsComplete)
        {
            return;
        }

        var what = member.Bending is null && member.Shear is null ? "bending and shear" : member.Bending is null ? "bending" : "shear";
        notes.Add(new("strength-missing", new(
            $"The {check} have no design {what} stress: enter an allowable stress, or a strength that the design basis covers for {member.Material.Family.ToString().ToLowerInvariant()}.")));
    }

    private static void Declarations(List<Note> notes, Opening opening)
    {
        foreach (var declaration in opening.Barrier.ByOthers.Where(d => !VerdictRules.IsNamed(d)))
        {
            notes.Add(new("by-others-unnamed", new(
                $"Declared designed by others without a name and a reference: {NeededChecks.Title(declaration.Check)}. Enter both, or the check stays missing.")));
        }
    }

    private static void Lifting(List<Note> notes, IReadOnlyList<LogSchedule> schedule)
    {
        var heaviest = schedule.Max(row => row.Mass);
        if (heaviest > LogHandling.TwoPeople)
        {
            notes.Add(new("log-too-heavy", new(
                $"A log weighs {Mass(heaviest)} without fittings, more than two people should lift ({Mass(LogHandling.TwoPeople)}): use lifting gear, shorter bays or a lighter profile.")));
        }
        else if (heaviest > LogHandling.OnePerson)
        {
            notes.Add(new("log-two-people", new(
                $"A log weighs {Mass(heaviest)} without fittings, more than one person should lift ({Mass(LogHandling.OnePerson)}): plan for two.")));
        }
    }

    private static void Floating(List<Note> notes, IReadOnlyList<HoldDownResult> holdDowns)
    {
        var greatest = holdDowns.Max(row => row.DesignForce);
        if (greatest > 0)
        {
            notes.Add(new("logs-float", new(
                $"Under water the stack wants to float: hold each down with {new Quantity(greatest, Dimension.Force)}, half at each end, before the water comes.")));
        }
    }

    private static void Walls(List<Note> notes, WallKind wall, double depth)
    {
        if (WallDepth.Limit(wall) is { } limit && depth > limit.Depth)
        {
            notes.Add(new("wall-depth", new(
                $"{Length(depth)} of water stands against {WallDepth.Name(wall)}; about {Length(limit.Depth)} is the published limit without damage. Holding water higher can bring the wall down.")));
        }
        else if (wall is WallKind.TimberFrame or WallKind.SteelFrame && depth > 0)
        {
            notes.Add(new("wall-depth", new(
                $"{Length(depth)} of water stands against a framed wall, which carries less than masonry: have the wall checked before water is held against it.")));
        }
    }

    private static Quantity Length(double value) => new(value, Dimension.Length);

    private static Quantity Mass(double value) => new(value, Dimension.Mass);
}
