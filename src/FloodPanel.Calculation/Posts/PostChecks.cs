using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Posts;

/// <summary>The checks of a post as a cantilever from its base, and the same working where there is nothing to check against.</summary>
internal static class PostChecks
{
    private const string UnitLoad = "Beam statics (unit-load theorem)";

    /// <summary>What a post stands in.</summary>
    /// <param name="Diagram">Pressure normal to the face.</param>
    /// <param name="Post">The post.</param>
    /// <param name="Tributary">b_t, width of face that loads the post [m].</param>
    /// <param name="Length">ℓ, length of the post [m].</param>
    /// <param name="Rake">θ [rad].</param>
    /// <param name="Force">F, a force on the post [N].</param>
    /// <param name="Basis">The design basis.</param>
    /// <param name="Raker">The raker; null for none.</param>
    internal readonly record struct Setting(
        PressureDiagram Diagram, Member Post, double Tributary, double Length, double Rake, ConcentratedForce Force, DesignBasis Basis, RakerModel? Raker)
    {
        public bool HasForce => Force.Characteristic != 0;

        /// <summary>The load along the post, with the factors of the design basis.</summary>
        public SlopeLoad Load => new(Diagram, Force, Tributary, Math.Cos(Rake), IsDesign: true);
    }

    /// <summary>Bending: M = b_t·Σγ·w·z/cos θ + γ_F·F·z_F/cos θ against M_R = f_b·W; null without a design bending stress.</summary>
    public static Check? Bending(in PostResponse response, Setting setting)
    {
        if (setting.Post.Bending is not { } stress)
        {
            return null;
        }

        var steps = MomentSteps(response, setting);
        steps.Stress("f_b", stress);
        steps.Given("W", setting.Post.Section.Modulus, Dimension.SectionModulus);
        steps.Add("M_R", "f_b·W", setting.Post.MomentResistance, Dimension.Moment);
        steps.Add("u", "M/M_R", response.Bending, Dimension.Ratio);
        return new(
            "post-bending", "Post bending", Source(setting, setting.Post.BendingSource + PostNotes.BesideBending(setting.Post)), Dimension.Moment,
            response.PeakMoment, setting.Post.MomentResistance, steps.Done());
    }

    /// <summary>Shear: V = b_t·Σγ·w + γ_F·F against V_R = f_v·A_v; null without a design shear stress.</summary>
    public static Check? Shear(in PostResponse response, Setting setting)
    {
        if (setting.Post.Shear is not { } stress)
        {
            return null;
        }

        var steps = ShearSteps(response, setting);
        steps.Stress("f_v", stress);
        steps.Given("A_v", setting.Post.Section.ShearArea, Dimension.SectionArea);
        steps.Add("V_R", "f_v·A_v", setting.Post.ShearResistance, Dimension.Force);
        steps.Add("u", "V/V_R", response.ShearUse, Dimension.Ratio);
        return new(
            "post-shear", "Post shear", Source(setting, setting.Post.ShearSource + PostNotes.BesideShear(setting.Post, setting.Basis)), Dimension.Force,
            response.PeakShear, setting.Post.ShearResistance, steps.Done());
    }

    /// <summary>Deflection of the tip, unfactored, against ℓ/n.</summary>
    public static Check Deflection(in PostResponse response, Setting setting)
    {
        var limit = setting.Length / setting.Post.DeflectionLimit;
        var steps = DeflectionSteps(response, setting);
        steps.Given("n", setting.Post.DeflectionLimit, Dimension.Count);
        steps.Add("δ_lim", "ℓ/n", limit, Dimension.Deflection);
        steps.Add("u", "δ/δ_lim", response.DeflectionUse, Dimension.Ratio);
        return new(
            "post-deflection", "Post deflection", $"{(setting.Raker is null ? UnitLoad : PropResponse.Source)}; limit chosen by the user",
            Dimension.Deflection, response.TipDeflection, limit, steps.Done());
    }

    /// <summary>How the moment came about, where no bending check tells it.</summary>
    public static Working Moment(in PostResponse response, Setting setting) =>
        new(setting.Raker is null ? "Moment at the base of the post" : "Moment in the post", Source(setting, Cantilever.Source), MomentSteps(response, setting).Done());

    /// <summary>How the shear force came about, where no shear check tells it.</summary>
    public static Working ShearForce(in PostResponse response, Setting setting) =>
        new(setting.Raker is null ? "Shear force at the base of the post" : "Shear force in the post", Source(setting, Cantilever.Source), ShearSteps(response, setting).Done());

    /// <summary>How the deflection came about, where it is not judged.</summary>
    public static Working DeflectionOnly(in PostResponse response, Setting setting) =>
        new(
            setting.Raker is null ? "Deflection of the tip of the post" : "Deflection of the post",
            setting.Raker is null ? UnitLoad : PropResponse.Source,
            DeflectionSteps(response, setting).Done());

    private static string Source(Setting setting, string source) => setting.Raker is null ? source : $"{PropResponse.Source}; {source}";

    private static StepList MomentSteps(in PostResponse response, Setting setting)
    {
        var steps = Forces(setting, withArms: true);
        var count = setting.Diagram.Pieces.Length;
        var toSlope = setting.Rake == 0 ? "" : "/cos(θ)";
        var distributed = count == 0 ? "" : $"b_t·({PieceSymbols.Sum(count, n => $"γ_{n}·w_{n}·z_{n}")}){toSlope}";
        AddForce(steps, setting, withFactor: true);
        var formula = DiagramWorking.Joined(distributed, setting.HasForce ? $"γ_F·F·z_F{toSlope}" : "");
        if (response.Prop is not { } prop)
        {
            steps.Add("M", formula, response.BaseMoment, Dimension.Moment);
            return steps;
        }

        steps.Add("M_0", formula, prop.CantileverMoment, Dimension.Moment);
        RakerSteps.Moment(steps, prop, setting.Raker!, setting.Post, setting.Load);
        return steps;
    }

    private static StepList ShearSteps(in PostResponse response, Setting setting)
    {
        var steps = Forces(setting, withArms: false);
        var count = setting.Diagram.Pieces.Length;
        AddForce(steps, setting, withFactor: true);
        var distributed = count == 0 ? "" : $"b_t·({PieceSymbols.SumOfDesignForces(count)})";
        var formula = DiagramWorking.Joined(distributed, setting.HasForce ? "γ_F·F" : "");
        if (response.Prop is not { } prop)
        {
            steps.Add("V", formula, response.BaseShear, Dimension.Force);
            return steps;
        }

        steps.Add("V_0", formula, prop.CantileverShear, Dimension.Force);
        RakerSteps.Shear(steps, prop, setting.Load, Math.Min(setting.Raker!.Head, setting.Length));
        return steps;
    }

    private static StepList DeflectionSteps(in PostResponse response, Setting setting)
    {
        if (setting.Raker is not null)
        {
            return ProppedDeflection(response, setting);
        }

        var toSlope = 1 / Math.Cos(setting.Rake);
        var steps = new StepList(40);
        DiagramWorking.AddRake(steps.Steps, setting.Rake);
        steps.Given("b_t", setting.Tributary, Dimension.Length);
        steps.Given("ℓ", setting.Length, Dimension.Length);
        var pieces = setting.Diagram.Pieces;
        for (var i = 0; i < pieces.Length; i++)
        {
            AddTip(steps, PieceSymbols.At(i), pieces[i], setting.Rake, Cantilever.TipIntegral(pieces[i], setting.Length, toSlope));
        }

        var tip = pieces.Length == 0 ? "" : $"b_t·({PieceSymbols.Sum(pieces.Length, n => $"J_{n}")})";
        if (setting.HasForce)
        {
            AddForce(steps, setting, withFactor: false);
            steps.Add("s_F", setting.Rake == 0 ? "z_F" : "z_F/cos(θ)", setting.Force.Height * toSlope, Dimension.Length);
            tip = DiagramWorking.Joined(tip, "F·s_F²·(3·ℓ − s_F)");
        }

        steps.Given("E", setting.Post.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", setting.Post.Section.Inertia, Dimension.SecondMoment);
        steps.Add("δ", tip.Length == 0 ? "" : $"({tip})/(6·E·I)", response.TipDeflection, Dimension.Deflection);
        return steps;
    }

    /// <summary>The greatest deflection along the post comes from the stiffness solution as it is.</summary>
    private static StepList ProppedDeflection(in PostResponse response, Setting setting)
    {
        var steps = new StepList(5);
        steps.Given("ℓ", setting.Length, Dimension.Length);
        steps.Given("δ", response.TipDeflection, Dimension.Deflection);
        return steps;
    }

    private static StepList Forces(Setting setting, bool withArms)
    {
        var steps = new StepList(40);
        DiagramWorking.AddRake(steps.Steps, setting.Rake);
        steps.Given("b_t", setting.Tributary, Dimension.Length);
        DiagramWorking.AddForces(steps.Steps, setting.Diagram.Pieces, setting.Rake, withArms, withFactors: true);
        return steps;
    }

    /// <summary>F and its height, and its factor where that matters.</summary>
    private static void AddForce(StepList steps, Setting setting, bool withFactor)
    {
        if (!setting.HasForce)
        {
            return;
        }

        steps.Given("F", setting.Force.Characteristic, Dimension.Force);
        steps.Given("z_F", setting.Force.Height, Dimension.Length);
        if (withFactor)
        {
            steps.Given("γ_F", setting.Force.Factor, Dimension.Ratio);
        }
    }

    private static void AddTip(
        StepList steps, PieceSymbols symbols, in PressurePiece piece, double rake, double tipIntegral)
    {
        steps.Given(symbols.From, piece.Bottom, Dimension.Length);
        steps.Given(symbols.To, piece.Top, Dimension.Length);
        steps.Given(symbols.AtFrom, piece.AtBottom, Dimension.Pressure);
        steps.Given(symbols.AtTo, piece.AtTop, Dimension.Pressure);
        steps.Add(symbols.Second, symbols.SecondFormula, piece.SecondMoment, Dimension.Moment);
        steps.Add(symbols.Third, symbols.ThirdFormula, piece.ThirdMoment, Dimension.Stiffness);
        steps.Add(
            symbols.Tip, rake == 0 ? symbols.VerticalTipFormula : symbols.TipFormula, tipIntegral, Dimension.Stiffness);
    }
}
