using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Anchors;

/// <summary>A group of anchors under one load case.</summary>
/// <param name="Input">The anchors as entered.</param>
/// <param name="Plate">The plate that they hold.</param>
/// <param name="Demand">What they must take.</param>
/// <param name="Scale">n_a, from the level of the design basis to strength level [-].</param>
internal sealed record AnchorCase(AnchorInput Input, BasePlateInput Plate, AnchorDemand Demand, double Scale)
{
    private double Tension => Demand.Tension;

    private double OtherTension => Demand.OtherTension;

    /// <summary>V, of the plate, at the level of the design basis [N].</summary>
    public double Shear => Demand.Shear;

    public bool PushesBack => Demand.PushesBack;

    public AnchorLayout Layout { get; } = AnchorLayout.Of(Input, Plate);

    /// <summary>The layout with the row that pulls more on its flood side.</summary>
    public AnchorLayout Pulling => Demand.PullsProtectedRow ? Layout.Turned : Layout;

    /// <summary>The layout with the edge that the shear points at on its protected side.</summary>
    public AnchorLayout Pushing => PushesBack ? Layout.Turned : Layout;

    /// <summary>f'c or f_ck that counts [Pa].</summary>
    public double Concrete => Input.Method == AnchorMethod.Aci318 ? AciAnchors.Concrete(Input.Kind, Plate.ConcreteStrength) : Plate.ConcreteStrength;

    /// <summary>c_ac or c_cr,sp, where splitting counts: in concrete that does not crack, drilled under ACI 318 [m]; else null.</summary>
    public double? CriticalEdge =>
        Input.Cracked || (Input.Method == AnchorMethod.Aci318 && Input.Kind != AnchorKind.PostInstalled) ? null : Input.CriticalEdge;

    public int PerRow => Plate.RodsPerRow;

    /// <summary>Rows that pull: 1, or 2 where nothing bears on the concrete.</summary>
    public int Rows => OtherTension > 0 ? 2 : 1;

    /// <summary>Rows that take shear: both, or the one nearest the edge that it points at.</summary>
    public int ShearRows => Input.SharedShear ? 2 : 1;

    /// <summary>Anchors that take shear [-].</summary>
    public int InShear => ShearRows * PerRow;

    /// <summary>N, of one anchor in the row that pulls more [N].</summary>
    public double RodTension => Scale * Tension / PerRow;

    /// <summary>V_g, of all anchors [N].</summary>
    public double GroupShear => Scale * Shear;

    /// <summary>V, of one anchor that takes shear [N].</summary>
    public double RodShear => Scale * Shear / InShear;

    /// <summary>e_N, of the tension between two rows that pull [m].</summary>
    public double Eccentricity => Rows == 1 ? 0 : Plate.RodDistance * (Tension - OtherTension) / (Tension + OtherTension);

    /// <summary>N_g, on the anchors that share a body [N].</summary>
    public double TensionOn(BreakoutBody body) =>
        Scale * body.Layout.PerRow / PerRow * (body.Rows == 2 ? Tension + OtherTension : Tension);

    /// <summary>e_N, of the tension on the anchors that share a body [m].</summary>
    public double EccentricityOn(BreakoutBody body) => body.Rows == 1 ? 0 : Eccentricity;

    /// <summary>N_g and, with two rows, e_N.</summary>
    public void WriteTensionOn(BreakoutBody body, StepList steps)
    {
        WriteScale(steps);
        steps.Given("T", Tension, Dimension.Force);
        var share = "";
        if (body.Layout.PerRow < PerRow)
        {
            steps.Given("n", PerRow, Dimension.Count);
            share = "/n";
        }

        if (body.Rows == 1)
        {
            steps.Add("N_g", $"n_a·T{share}", TensionOn(body), Dimension.Force);
            return;
        }

        steps.Given("T_2", OtherTension, Dimension.Force);
        steps.Add("N_g", $"n_a·(T + T_2){share}", TensionOn(body), Dimension.Force);
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

    /// <summary>V of one anchor.</summary>
    public void WriteRodShear(StepList steps)
    {
        WriteScale(steps);
        steps.Given("V_b", Shear, Dimension.Force);
        steps.Given("n_V", InShear, Dimension.Count);
        steps.Add("V", "n_a·V_b/n_V", RodShear, Dimension.Force);
    }

    /// <summary>V_m of m anchors that share a body, each with its share.</summary>
    public double WriteShearOf(int count, StepList steps)
    {
        WriteRodShear(steps);
        steps.Given("m", count, Dimension.Count);
        steps.Add("V_m", "m·V", count * RodShear, Dimension.Force);
        return count * RodShear;
    }

    /// <summary>V_m of m anchors at the edge ahead, whose row is taken to carry the whole: it breaks off first.</summary>
    public double WriteShearAhead(int count, StepList steps)
    {
        WriteScale(steps);
        steps.Given("V_b", Shear, Dimension.Force);
        steps.Given("n", PerRow, Dimension.Count);
        steps.Given("m", count, Dimension.Count);
        steps.Add("V_m", "n_a·V_b·m/n", GroupShear * count / PerRow, Dimension.Force);
        return GroupShear * count / PerRow;
    }

    private void WriteScale(StepList steps) => steps.Given("n_a", Scale, Dimension.Ratio);
}
