using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench.Loads;

/// <summary>A floating object that strikes the barrier.</summary>
public sealed partial class DebrisFields
{
    protected override string What => "debris";

    protected override DebrisInput First => new() { Velocity = Opening.Actions.Flow?.Velocity ?? 1 };

    protected override DebrisInput? Of(ActionSet actions) => actions.Debris;

    protected override ActionSet With(ActionSet actions, DebrisInput? action) => actions with { Debris = action };

    private Task ChangeCoefficients(string what, Func<DebrisCoefficients, DebrisCoefficients> apply) =>
        Change<DebrisInput>(what, d => d with { Coefficients = apply(d.Coefficients) });

    private string Product(DebrisCoefficients coefficients) =>
        Calculation.Units.Format(DebrisImpact.WithoutResponse(coefficients), Dimension.Ratio, Units);
}
