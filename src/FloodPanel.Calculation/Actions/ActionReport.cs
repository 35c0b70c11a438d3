using FloodPanel.Calculation.Cases;

namespace FloodPanel.Calculation.Actions;

/// <summary>Each action of a case by itself: pieces, resultant and how its pressures came about.</summary>
internal static class ActionReport
{
    public static ActionResult[] Of(OpeningModel model, CaseKind kind) =>
        [.. CaseDiagram.ActionsOf(model, kind).Select(action => Result(model, kind, action))];

    private static ActionResult Result(OpeningModel model, CaseKind kind, ActionKind action)
    {
        var diagram = new PressureDiagram();
        CaseDiagram.Add(diagram, model, kind, action);
        var (line, title) = (CaseForces.LineLoad(model, kind), $"Unfactored resultant of the {Name(action)}");
        return new(
            action,
            diagram.Pieces.ToArray(),
            line?.Characteristic ?? diagram.Force / model.CosRake,
            line?.Height ?? diagram.CentreOfPressure,
            CaseDiagram.Factor(model.Factors, kind),
            Working(model, kind, action),
            line is { } force ? DiagramWorking.Resultant(title, force) : DiagramWorking.Resultant(title, diagram, model.Rake),
            action == ActionKind.Debris ? CaseForces.Impact(model, model.Debris!.Force(model.Debris.GreatestBay)) : null);
    }

    private static Working Working(OpeningModel model, CaseKind kind, ActionKind action) => action switch
    {
        ActionKind.Hydrostatic => StillWaterWorking.Of(model, kind),
        ActionKind.Flow => FlowWorking.Of(model),
        ActionKind.Wave => model.Wave!.Working,
        ActionKind.Debris => model.Debris!.Working(model.Debris.GreatestBay),
        ActionKind.Wind => new(
            "Pressure of wind on the dry barrier", "Typed by the user; wind code of the place",
            [new("p", "", model.Wind!.Pressure, Dimension.Pressure)]),
        ActionKind.Line => new(
            "Line load on the dry barrier", "Typed by the user",
            [
                new("F", "", model.Line!.Force, Dimension.LineForce),
                new("z_F", "", Math.Min(model.Line.Height, model.Height), Dimension.Length),
            ]),
        _ => throw new ArgumentOutOfRangeException(nameof(action), action, "is not an action"),
    };

    private static string Name(ActionKind action) => action switch
    {
        ActionKind.Hydrostatic => "still water",
        ActionKind.Line => "line load",
        _ => action.ToString().ToLowerInvariant(),
    };
}
