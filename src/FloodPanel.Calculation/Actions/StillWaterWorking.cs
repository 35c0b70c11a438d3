using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation.Actions;

/// <summary>How the pressure of still water came about.</summary>
internal static class StillWaterWorking
{
    public static Working Of(OpeningModel model, CaseKind kind)
    {
        var steps = new StepList(8);
        steps.UnitWeight(model.UnitWeight);
        if (kind == CaseKind.BrimFull)
        {
            steps.Given("H", model.Height, Dimension.Length);
            steps.Add("p_sill", "γ·H", model.UnitWeight * model.Height, Dimension.Pressure);
            return new("Pressure of still water at the top of the barrier", Hydrostatic.Source, steps.Done());
        }

        var (depth, behind) = (model.RetainedDepth, model.ProtectedDepth);
        steps.Given("h", depth, Dimension.Length);
        steps.Given("h′", behind, Dimension.Length);
        steps.Add("p_flood", "γ·max(0, h)", model.UnitWeight * Math.Max(0, depth), Dimension.Pressure);
        steps.Add("p_protected", "γ·h′", model.UnitWeight * behind, Dimension.Pressure);
        steps.Add(
            "p_sill", "p_flood − p_protected", model.UnitWeight * (Math.Max(0, depth) - behind), Dimension.Pressure);
        return new("Pressure of still water at the sill", Hydrostatic.Source, steps.Done());
    }
}
