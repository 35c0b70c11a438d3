using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PostBases;

/// <summary>One base plate under one load case: what the post brings, and what the plate makes of it.</summary>
internal sealed class PlateSetting
{
    public PlateSetting(OpeningModel model, PostResponse post)
    {
        Plate = model.Opening.Barrier.BasePlate!;
        Material = model.PlateMaterial!;
        Post = model.Post!;
        Basis = model.Basis;
        (Moment, Shear, Uplift) = (Math.Abs(post.BaseMoment), Math.Abs(post.BaseShear), post.Uplift);
        Response = BasePlates.Respond(Plate, -Uplift, Moment, Shear, Basis);
    }

    public BasePlateInput Plate { get; }

    public Material Material { get; }

    public Member Post { get; }

    public DesignBasis Basis { get; }

    /// <summary>M [N·m].</summary>
    public double Moment { get; }

    /// <summary>V [N].</summary>
    public double Shear { get; }

    /// <summary>T_u, uplift by a raker [N]; negative where it presses down.</summary>
    public double Uplift { get; }

    /// <summary>The uplift, where there is any: pressing down spares a weld.</summary>
    public double Lift => Math.Max(0, Uplift);

    public BasePlateResponse Response { get; }

    /// <summary>q = f_max·B [N/m].</summary>
    public double PerLength => Response.BearingStrength * Plate.Width;

    /// <summary>r = f + N/2, from the rods to the edge that presses [m].</summary>
    public double Reach => Plate.RodDistance + Plate.Length / 2;

    /// <summary>M_f = M − T_u·f, moment about the rods that pull [N·m].</summary>
    public double AboutRods => Moment - Uplift * Plate.RodDistance;

    /// <summary>M, T_u and f.</summary>
    public StepList Forces()
    {
        var steps = new StepList(30);
        steps.Given("M", Moment, Dimension.Moment);
        steps.Given("T_u", Uplift, Dimension.Force);
        steps.Given("f", Plate.RodDistance, Dimension.SectionLength);
        return steps;
    }

    /// <summary>f_max, q, r and M_f after the forces.</summary>
    public void Bearing(StepList steps)
    {
        steps.Given("f_c", Plate.ConcreteStrength, Dimension.Stress);
        steps.Given("a_c", Plate.AreaRatio, Dimension.Ratio);
        steps.Add("f_max", ConcreteBearing.Formula(Basis.Kind), Response.BearingStrength, Dimension.Stress);
        steps.Given("N_p", Plate.Length, Dimension.SectionLength);
        steps.Given("B", Plate.Width, Dimension.SectionLength);
        steps.Add("q", "f_max·B", PerLength, Dimension.LineForce);
        steps.Add("r", "f + N_p/2", Reach, Dimension.SectionLength);
        steps.Add("M_f", "M − T_u·f", AboutRods, Dimension.Moment);
    }

    /// <summary>All lines up to Y and T.</summary>
    public StepList UntilTension()
    {
        var steps = Forces();
        if (Response.Kind == BearingKind.AllTension)
        {
            steps.Add("T", "T_u/2 + M/(2·f)", Response.Tension, Dimension.Force);
            return steps;
        }

        Bearing(steps);
        if (Response.Kind == BearingKind.NoTension)
        {
            steps.Add("Y", "N_p + 2·M/T_u", Response.BlockLength, Dimension.SectionLength);
            steps.Add("f_p", "(0 − T_u)/(B·Y)", Response.Bearing, Dimension.Stress);
            return steps;
        }

        if (Response.IsBalanced)
        {
            steps.Add("Y", "r − √(r² − 2·M_f/q)", Response.BlockLength, Dimension.SectionLength);
            steps.Add("f_p", Response.BlockLength > 0 ? "f_max" : "", Response.Bearing, Dimension.Stress);
            steps.Add("T", "max(0, q·Y + T_u)", Response.Tension, Dimension.Force);
        }
        else
        {
            steps.Add("Y", "r", Response.BlockLength, Dimension.SectionLength);
            steps.Add("T", "max(0, M_f/(r/2) + T_u)", Response.Tension, Dimension.Force);
        }

        return steps;
    }
}
