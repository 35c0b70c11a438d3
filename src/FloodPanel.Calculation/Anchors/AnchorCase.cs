using FloodPanel.Calculation.PostBases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>The anchors of one post under one load case.</summary>
/// <param name="Input">The anchors as entered.</param>
/// <param name="Plate">The plate that they hold.</param>
/// <param name="Tension">T, of the row on the flood side [N].</param>
/// <param name="OtherTension">T_2, of the row on the protected side [N]; above zero only where both rows pull.</param>
/// <param name="Shear">V, of the plate [N].</param>
/// <param name="Scale">n_a, from the level of the design basis to strength level [-].</param>
internal sealed record AnchorCase(
    AnchorInput Input, BasePlateInput Plate, double Tension, double OtherTension, double Shear, double Scale)
{
    /// <summary>From service loads to strength level, where ACI 318 meets allowable stress design (common practice in product evaluations).</summary>
    public const double ServiceToStrength = 1.6;

    public AnchorLayout Layout { get; } = AnchorLayout.Of(Input, Plate);

    public int PerRow => Plate.RodsPerRow;

    /// <summary>Rows that pull: 1, or 2 where nothing bears on the concrete.</summary>
    public int Rows => OtherTension > 0 ? 2 : 1;

    /// <summary>Anchors that take shear: all, or the row on the protected side.</summary>
    public int InShear => Input.SharedShear ? 2 * PerRow : PerRow;

    /// <summary>N_g, of all anchors that pull [N].</summary>
    public double GroupTension => Scale * (Tension + OtherTension);

    /// <summary>N, of one anchor in the row that pulls more [N].</summary>
    public double RodTension => Scale * Tension / PerRow;

    /// <summary>V_g, of all anchors [N].</summary>
    public double GroupShear => Scale * Shear;

    /// <summary>V, of one anchor that takes shear [N].</summary>
    public double RodShear => Scale * Shear / InShear;

    /// <summary>e_N, of the tension between two rows that pull [m].</summary>
    public double Eccentricity => Rows == 1 ? 0 : Plate.RodDistance * (Tension - OtherTension) / (Tension + OtherTension);

    public static AnchorCase Of(OpeningModel model, CaseEvaluation numbers, int post)
    {
        var (barrier, response) = (model.Opening.Barrier, numbers.Posts[post]);
        var plate = barrier.BasePlate!;
        var anchors = barrier.Anchors!;
        var forces = BasePlates.Respond(
            plate, -(response.Prop?.Uplift ?? 0), response.BaseMoment, response.BaseShear, model.Basis);
        var scale = anchors.Method == AnchorMethod.Aci318 && model.Basis.Kind == DesignBasisKind.AllowableStress ? ServiceToStrength : 1;
        return new(anchors, plate, forces.Tension, forces.OtherTension, Math.Abs(response.BaseShear), scale);
    }

    /// <summary>N_g and, with two rows, e_N.</summary>
    public void WriteGroupTension(StepList steps)
    {
        WriteScale(steps);
        steps.Given("T", Tension, Dimension.Force);
        if (Rows == 1)
        {
            steps.Add("N_g", "n_a·T", GroupTension, Dimension.Force);
            return;
        }

        steps.Given("T_2", OtherTension, Dimension.Force);
        steps.Add("N_g", "n_a·(T + T_2)", GroupTension, Dimension.Force);
        steps.Given("f", Plate.RodDistance, Dimension.SectionLength);
        steps.Add("e_N", "f·(T − T_2)/(T + T_2)", Eccentricity, Dimension.SectionLength);
    }

    /// <summary>N of one anchor.</summary>
    public void WriteRodTension(StepList steps)
    {
        WriteScale(steps);
        steps.Given("T", Tension, Dimension.Force);
        steps.Given("n", PerRow, Dimension.Count);
        steps.Add("N", "n_a·T/n", RodTension, Dimension.Force);
    }

    /// <summary>V_g of all anchors.</summary>
    public void WriteGroupShear(StepList steps)
    {
        WriteScale(steps);
        steps.Given("V_b", Shear, Dimension.Force);
        steps.Add("V_g", "n_a·V_b", GroupShear, Dimension.Force);
    }

    /// <summary>V of one anchor.</summary>
    public void WriteRodShear(StepList steps)
    {
        WriteScale(steps);
        steps.Given("V_b", Shear, Dimension.Force);
        steps.Given("n_V", InShear, Dimension.Count);
        steps.Add("V", "n_a·V_b/n_V", RodShear, Dimension.Force);
    }

    private void WriteScale(StepList steps) => steps.Given("n_a", Scale, Dimension.Ratio);
}
