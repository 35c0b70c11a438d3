using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation.Footings;

/// <summary>What a load case puts on a footing, and how that came about.</summary>
/// <param name="Total">The loads.</param>
/// <param name="Resultant">R, horizontal resultant of the pressures, or a line load [N per metre of width].</param>
/// <param name="Height">z_R, its height [m].</param>
/// <param name="Impact">Debris, or nothing.</param>
internal sealed record FootingLoads(FootingLoad Total, double Resultant, double Height, ConcentratedForce Impact)
{
    /// <summary>The unfactored loads of a case over the clear width; a raked face keeps its horizontal share, its weight of water is left out.</summary>
    public static FootingLoads Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        var line = CaseForces.LineLoad(model, kind);
        var resultant = line?.Characteristic ?? numbers.Diagram.Force;
        var height = line?.Height ?? numbers.Diagram.CentreOfPressure ?? 0;
        var impact = kind == CaseKind.Debris && model.Debris is { } debris
            ? CaseForces.Impact(model, debris.Force(debris.GreatestBay))
            : default;
        var (depth, behind) = kind switch
        {
            CaseKind.BrimFull => (model.Height, 0.0),
            CaseKind.Wind or CaseKind.Line => (0.0, 0.0),
            _ => (Math.Max(0, model.RetainedDepth), Math.Min(model.ProtectedDepth, Math.Max(0, model.RetainedDepth))),
        };
        var horizontal = resultant * model.ClearWidth + impact.Characteristic;
        var moment = resultant * model.ClearWidth * height + impact.Characteristic * impact.Height;
        return new(new(model.ClearWidth, horizontal, moment, model.UnitWeight, depth, behind), resultant, height, impact);
    }

    /// <summary>H_0 and M_0.</summary>
    public void Write(StepList steps)
    {
        steps.Given("R", Resultant, Dimension.LineForce);
        steps.Given("z_R", Height, Dimension.Length);
        var isStruck = Impact.Characteristic != 0;
        if (isStruck)
        {
            steps.Given("F", Impact.Characteristic, Dimension.Force);
            steps.Given("z_F", Impact.Height, Dimension.Length);
        }

        steps.Add("H_0", isStruck ? "R·ℓ + F" : "R·ℓ", Total.Horizontal, Dimension.Force);
        steps.Add("M_0", isStruck ? "R·ℓ·z_R + F·z_F" : "R·ℓ·z_R", Total.Moment, Dimension.Moment);
    }
}
