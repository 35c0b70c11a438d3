using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Cases;

/// <summary>Which cases an opening has, which actions make up a case, and with which factors.</summary>
public static class CaseDiagram
{
    private static readonly ActionKind[] Actions = Enum.GetValues<ActionKind>();

    /// <summary>The cases of an opening, in the order in which they are shown.</summary>
    /// <param name="model">The opening.</param>
    /// <remarks>
    /// The design flood and the brim-full case always exist, the others where their leading action is present. A wave
    /// that its method does not cover has no case: a note names the limit and the verdict misses the wave.
    /// </remarks>
    public static ValueList<CaseKind> CasesOf(OpeningModel model)
    {
        var cases = new List<CaseKind>(6) { CaseKind.DesignFlood };
        AddIf(model.Wave is { IsCovered: true }, CaseKind.Wave);
        AddIf(model.Debris is not null, CaseKind.Debris);
        cases.Add(CaseKind.BrimFull);
        AddIf(model.Wind is not null, CaseKind.Wind);
        AddIf(model.Line is not null, CaseKind.Line);
        return cases.ToValueList();

        void AddIf(bool exists, CaseKind kind)
        {
            if (exists)
            {
                cases.Add(kind);
            }
        }
    }

    /// <summary>The actions of a case, in the order in which they are stacked.</summary>
    /// <param name="model">The opening.</param>
    /// <param name="kind">A case that the opening has.</param>
    public static IEnumerable<ActionKind> ActionsOf(OpeningModel model, CaseKind kind) =>
        Actions.Where(action => Acts(model, kind, action));

    /// <summary>Load factor of a case on the actions of the flood side, or on its own action [-].</summary>
    /// <param name="factors">Load factors of the basis.</param>
    /// <param name="kind">The case.</param>
    public static double Factor(LoadFactors factors, CaseKind kind) => kind switch
    {
        CaseKind.BrimFull => factors.BrimFull,
        CaseKind.Debris => factors.Debris,
        CaseKind.Wind => factors.Wind,
        CaseKind.Line => factors.Line,
        _ => factors.FloodSide,
    };

    /// <summary>Fills a diagram with the distributed actions of a case.</summary>
    /// <param name="diagram">The diagram; what it held is dropped.</param>
    /// <param name="model">The opening.</param>
    /// <param name="kind">The case.</param>
    internal static void Fill(PressureDiagram diagram, OpeningModel model, CaseKind kind)
    {
        diagram.Clear();
        foreach (var action in Actions)
        {
            if (Acts(model, kind, action))
            {
                Add(diagram, model, kind, action);
            }
        }
    }

    /// <summary>Adds the pressure of one action of a case; nothing for debris and a line load, which are no pressure.</summary>
    /// <param name="diagram">The diagram to add to.</param>
    /// <param name="model">The opening.</param>
    /// <param name="kind">The case.</param>
    /// <param name="action">An action of the case.</param>
    internal static void Add(PressureDiagram diagram, OpeningModel model, CaseKind kind, ActionKind action)
    {
        var factor = Factor(model.Factors, kind);
        switch (action)
        {
            case ActionKind.Hydrostatic:
                Hydrostatics(diagram, model, kind, factor);
                break;
            case ActionKind.Flow:
                FlowPressure(diagram, model, factor);
                break;
            case ActionKind.Wave:
                model.Wave!.AddTo(diagram, factor);
                break;
            case ActionKind.Wind:
                diagram.Add(new(0, model.Height, model.Wind!.Pressure, model.Wind.Pressure, factor));
                break;
        }
    }

    private static bool Acts(OpeningModel model, CaseKind kind, ActionKind action) => action switch
    {
        ActionKind.Hydrostatic => kind is not (CaseKind.Wind or CaseKind.Line),
        ActionKind.Flow => model.Flow is not null && kind switch
        {
            CaseKind.DesignFlood or CaseKind.Debris => true,
            CaseKind.Wave => !model.Wave!.IncludesFlow,
            _ => false,
        },
        ActionKind.Wave => kind == CaseKind.Wave,
        ActionKind.Debris => kind == CaseKind.Debris,
        ActionKind.Wind => kind == CaseKind.Wind,
        ActionKind.Line => kind == CaseKind.Line,
        _ => false,
    };

    /// <summary>The design depth on both sides, or water to the top and nothing behind.</summary>
    private static void Hydrostatics(PressureDiagram diagram, OpeningModel model, CaseKind kind, double factor)
    {
        var brimFull = kind == CaseKind.BrimFull;
        var depth = brimFull ? model.Height : model.RetainedDepth;
        diagram.Add(Hydrostatic.Side(model.UnitWeight, depth, model.Height, factor));
        if (!brimFull && model.ProtectedDepth > 0)
        {
            var behind = Hydrostatic.Side(model.UnitWeight, model.ProtectedDepth, model.Height, model.Factors.ProtectedSide);
            diagram.Add(behind.Opposite());
        }
    }

    private static void FlowPressure(PressureDiagram diagram, OpeningModel model, double factor)
    {
        var wetted = Math.Min(model.RetainedDepth, model.Height);
        if (!(wetted > 0))
        {
            return;
        }

        var flow = model.Flow!;
        var pressure = Flow.Pressure(flow.Velocity, flow.ShapeCoefficient, model.UnitWeight, model.ClearWidth, wetted);
        diagram.Add(new(0, wetted, pressure, pressure, factor));
    }
}
