using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>Yield and design stress that a section works with in bending.</summary>
/// <param name="Yield">f_k, characteristic yield [Pa], > 0.</param>
/// <param name="Design">f_b, design or allowable bending stress [Pa], > 0.</param>
/// <param name="Formula">f_b from f_k as written; empty where f_b was typed.</param>
internal sealed record BendingStress(double Yield, double Design, string Formula)
{
    /// <summary>Null where the yield or the design stress is missing. A typed allowable wins, but beside a weld.</summary>
    public static BendingStress? Of(Member member, DesignBasis basis, bool isWeldAffected)
    {
        if (isWeldAffected && member.Material.Family == MaterialFamily.Aluminium)
        {
            return member.Material.WeldedYield is { } welded && basis.For(MaterialFamily.Aluminium) is { } rule
                ? new(welded, rule.Factor * welded, rule.Formula)
                : null;
        }

        return member.Material.BendingStrength is { } yield && member.Bending is { } stress
            ? new(yield, stress.Value, stress.Formula)
            : null;
    }

    /// <summary>The steps f_k and f_b.</summary>
    public void Tell(StepList steps)
    {
        steps.Given("f_k", Yield, Dimension.Stress);
        steps.Add("f_b", Formula, Design, Dimension.Stress);
    }
}
