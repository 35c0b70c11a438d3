using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Parts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Footings;

/// <summary>The footing under a load case, with unfactored loads against safety factors.</summary>
internal static class FootingReport
{
    private const string Usual = "factors typed by the user; usual values in USACE EM 1110-2-2502, EM 1110-2-2100 and FEMA P-259";

    public static IEnumerable<PartResult> Of(OpeningModel model, CaseKind kind, CaseEvaluation numbers)
    {
        if (model.Opening.Barrier.Footing is not { } footing)
        {
            return [];
        }

        var load = FootingLoads.Of(model, kind, numbers);
        var state = FootingStability.Of(footing, load.Total);
        return [new(NeededChecks.SupportingWall, "footing", [.. Checks(footing, load, state)], [])];
    }

    public static IEnumerable<PartGap> Gaps(OpeningModel model)
    {
        if (model.Opening.Barrier.Footing is not { } footing)
        {
            yield break;
        }

        if (string.IsNullOrWhiteSpace(footing.Source))
        {
            yield return new(NeededChecks.SupportingWall, new("footing-source-missing", new(
                $"The footing rests on ground values without a source: enter where friction, adhesion and bearing pressure come from.")));
        }

        if (model.Basis.Kind == DesignBasisKind.Eurocode)
        {
            yield return new(NeededChecks.SupportingWall, new("footing-not-covered", new(
                $"The footing is checked with safety factors, as in American practice; a design with the partial factors of EN 1997-1 is not covered here: declare it designed by others.")));
        }
    }

    private static IEnumerable<Check> Checks(FootingInput footing, FootingLoads load, FootingStability state)
    {
        // One that floats presses on nothing: its flotation fails, and the rest has no meaning.
        if (state.Vertical > 0)
        {
            yield return Sliding(footing, load, state);
            yield return Eccentricity(footing, load, state);
        }

        yield return Overturning(footing, load, state);
        if (state.Vertical > 0 && Near(footing, state) > 0)
        {
            yield return Bearing(footing, load, state);
        }

        if (state.Load.Depth > 0)
        {
            yield return Flotation(footing, load, state);
        }

        if (state.Load.Depth > state.Load.Behind)
        {
            yield return Creep(footing, state.Load);
        }
    }

    private static Check Sliding(FootingInput footing, FootingLoads load, FootingStability state)
    {
        var resistance = (footing.Friction * state.Vertical + footing.Adhesion * state.Contact * state.Load.Length) / footing.SlidingFactor;
        var steps = FootingSteps.Vertical(footing, load, state);
        FootingSteps.Driving(steps, state);
        steps.Given("µ", footing.Friction, Dimension.Ratio);
        steps.Given("c_a", footing.Adhesion, Dimension.Pressure);
        steps.Given("n_s", footing.SlidingFactor, Dimension.Ratio);
        steps.Add("H_R", "(µ·N + c_a·c·ℓ)/n_s", resistance, Dimension.Force);
        return Closed("footing-sliding", "Sliding", Dimension.Force, "H/H_R", state.Driving, resistance, steps);
    }

    private static Check Overturning(FootingInput footing, FootingLoads load, FootingStability state)
    {
        var resistance = state.Resisting / footing.OverturningFactor;
        var steps = FootingSteps.Vertical(footing, load, state);
        FootingSteps.Moments(steps, state);
        steps.Given("n_o", footing.OverturningFactor, Dimension.Ratio);
        steps.Add("M_R", "M_r/n_o", resistance, Dimension.Moment);
        return Closed("footing-overturning", "Overturning, ratio of moments", Dimension.Moment, "M_o/M_R", state.Overturning, resistance, steps);
    }

    /// <summary>The resultant so near the middle that the share of base that is asked for stays in compression.</summary>
    private static Check Eccentricity(FootingInput footing, FootingLoads load, FootingStability state)
    {
        var demand = Math.Abs(footing.Width / 2 - state.ResultantFromToe);
        var allowed = footing.Width / 2 - footing.ContactShare * footing.Width / 3;
        var steps = Resultant(footing, load, state);
        steps.Add("e", "max(B/2 − x, x − B/2)", demand, Dimension.Length);
        steps.Given("s", footing.ContactShare, Dimension.Ratio);
        steps.Add("e_lim", "B/2 − s·B/3", allowed, Dimension.Length);
        return Closed(
            "footing-eccentricity", "Overturning, place of the resultant", Dimension.Length, "e/e_lim", demand, allowed, steps);
    }

    private static Check Bearing(FootingInput footing, FootingLoads load, FootingStability state)
    {
        var near = Near(footing, state);
        var pressure = BearingPressure.Of(state.Vertical / state.Load.Length, state.ResultantFromToe, footing.Width);
        var steps = Resultant(footing, load, state);
        steps.Add("x_n", "min(x, B − x)", near, Dimension.Length);
        steps.Add(
            "q", near < footing.Width / 3 ? "2·N/(3·x_n·ℓ)" : "N/(B·ℓ)·(4 − 6·x_n/B)", pressure.Greatest, Dimension.Pressure);
        steps.Given("q_a", footing.AllowableBearing, Dimension.Pressure);
        return Closed(
            "footing-bearing", "Bearing pressure", Dimension.Pressure, "q/q_a", pressure.Greatest, footing.AllowableBearing, steps,
            BearingPressure.Source);
    }

    private static Check Flotation(FootingInput footing, FootingLoads load, FootingStability state)
    {
        var demand = Math.Max(0, state.Uplift - state.WaterOnHeel - state.WaterOnToe);
        var capacity = state.Weight / footing.FlotationFactor;
        var steps = FootingSteps.Vertical(footing, load, state);
        steps.Add("U_net", "max(0, U − W_h − W_t)", demand, Dimension.Force);
        steps.Given("n_f", footing.FlotationFactor, Dimension.Ratio);
        steps.Add("W_R", "W/n_f", capacity, Dimension.Force);
        return Closed("footing-flotation", "Flotation", Dimension.Force, "U_net/W_R", demand, capacity, steps);
    }

    private static Check Creep(FootingInput footing, FootingLoad load)
    {
        var demand = LaneCreep.Least(footing.Soil) * (load.Depth - load.Behind);
        var path = LaneCreep.Path(footing.Width, footing.Thickness, footing.CutOff);
        var steps = new StepList(10);
        steps.Given("B", footing.Width, Dimension.Length);
        steps.Given("D", footing.Thickness, Dimension.Length);
        steps.Given("D_c", footing.CutOff, Dimension.Length);
        steps.Add("L_w", "2·D + 2·D_c + B/3", path, Dimension.Length);
        steps.Given("C_L", LaneCreep.Least(footing.Soil), Dimension.Ratio);
        steps.Given("h", load.Depth, Dimension.Length);
        steps.Given("h_d", load.Behind, Dimension.Length);
        steps.Add("L_req", "C_L·(h − h_d)", demand, Dimension.Length);
        steps.Add("u", "L_req/L_w", demand / path, Dimension.Ratio);
        return new("footing-creep", "Seepage, weighted creep path", LaneCreep.Source, Dimension.Length, demand, path, steps.Done());
    }

    private static double Near(FootingInput footing, FootingStability state) =>
        Math.Min(state.ResultantFromToe, footing.Width - state.ResultantFromToe);

    private static StepList Resultant(FootingInput footing, FootingLoads load, FootingStability state)
    {
        var steps = FootingSteps.Vertical(footing, load, state);
        FootingSteps.Moments(steps, state);
        steps.Add("x", "(M_r − M_o)/N", state.ResultantFromToe, Dimension.Length);
        return steps;
    }

    /// <summary>The check with its utilisation as the last step.</summary>
    private static Check Closed(
        string name, string title, Dimension dimension, string ratio, double demand, double capacity, StepList steps, string method = FootingStability.Source)
    {
        var check = new Check(name, title, $"{method}; {Usual}", dimension, demand, capacity, steps.Done());
        steps.Add("u", ratio, check.Utilisation, Dimension.Ratio);
        return check;
    }
}
