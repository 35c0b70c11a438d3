using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Posts;

/// <summary>The checks of a post as a cantilever from its base.</summary>
internal static class PostChecks
{
    /// <summary>What a post stands in.</summary>
    /// <param name="Diagram">Pressure normal to the face.</param>
    /// <param name="Post">The post.</param>
    /// <param name="Tributary">b_t, width of face that loads the post [m].</param>
    /// <param name="Length">ℓ, length of the post [m].</param>
    /// <param name="Rake">θ [rad].</param>
    internal readonly record struct Setting(
        PressureDiagram Diagram, Member Post, double Tributary, double Length, double Rake);

    /// <summary>Bending: M = b_t·Σγ·w·z/cos θ against M_R = f_b·W; null without a design bending stress.</summary>
    public static Check? Bending(in PostResponse response, Setting setting)
    {
        if (setting.Post.Bending is not { } stress)
        {
            return null;
        }

        var steps = Forces(setting, withArms: true);
        var count = setting.Diagram.Pieces.Length;
        var terms = PieceSymbols.Sum(count, n => $"γ_{n}·w_{n}·z_{n}");
        var formula = count == 0 ? "" : setting.Rake == 0 ? $"b_t·({terms})" : $"b_t·({terms})/cos(θ)";
        steps.Add("M", formula, response.BaseMoment, Dimension.Moment);
        steps.Stress("f_b", stress);
        steps.Given("W", setting.Post.Section.Modulus, Dimension.SectionModulus);
        steps.Add("M_R", "f_b·W", setting.Post.MomentResistance, Dimension.Moment);
        steps.Add("u", "M/M_R", response.Bending, Dimension.Ratio);
        return new(
            "post-bending", "Post bending", setting.Post.BendingSource, Dimension.Moment,
            response.BaseMoment, setting.Post.MomentResistance, steps.Done());
    }

    /// <summary>Shear: V = b_t·Σγ·w against V_R = f_v·A_v; null without a design shear stress.</summary>
    public static Check? Shear(in PostResponse response, Setting setting)
    {
        if (setting.Post.Shear is not { } stress)
        {
            return null;
        }

        var steps = Forces(setting, withArms: false);
        var count = setting.Diagram.Pieces.Length;
        var formula = count == 0 ? "" : $"b_t·({PieceSymbols.SumOfDesignForces(count)})";
        steps.Add("V", formula, response.BaseShear, Dimension.Force);
        steps.Stress("f_v", stress);
        steps.Given("A_v", setting.Post.Section.ShearArea, Dimension.SectionArea);
        steps.Add("V_R", "f_v·A_v", setting.Post.ShearResistance, Dimension.Force);
        steps.Add("u", "V/V_R", response.ShearUse, Dimension.Ratio);
        return new(
            "post-shear", "Post shear", setting.Post.ShearSource, Dimension.Force,
            response.BaseShear, setting.Post.ShearResistance, steps.Done());
    }

    /// <summary>Deflection of the tip, unfactored, against ℓ/n.</summary>
    public static Check Deflection(in PostResponse response, Setting setting)
    {
        var (post, length) = (setting.Post, setting.Length);
        var toSlope = 1 / Math.Cos(setting.Rake);
        var steps = new StepList(40);
        DiagramWorking.AddRake(steps.Steps, setting.Rake);
        steps.Given("b_t", setting.Tributary, Dimension.Length);
        steps.Given("ℓ", length, Dimension.Length);
        var pieces = setting.Diagram.Pieces;
        for (var i = 0; i < pieces.Length; i++)
        {
            AddTip(steps, PieceSymbols.At(i), pieces[i], setting.Rake, Cantilever.TipIntegral(pieces[i], length, toSlope));
        }

        var formula = pieces.Length == 0 ? "" : $"b_t·({PieceSymbols.Sum(pieces.Length, n => $"J_{n}")})/(6·E·I)";
        var limit = length / post.DeflectionLimit;
        steps.Given("E", post.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Given("I", post.Section.Inertia, Dimension.SecondMoment);
        steps.Add("δ", formula, response.TipDeflection, Dimension.Deflection);
        steps.Given("n", post.DeflectionLimit, Dimension.Count);
        steps.Add("δ_lim", "ℓ/n", limit, Dimension.Deflection);
        steps.Add("u", "δ/δ_lim", response.DeflectionUse, Dimension.Ratio);
        return new(
            "post-deflection", "Post deflection", "Beam statics (unit-load theorem); limit chosen by the user",
            Dimension.Deflection, response.TipDeflection, limit, steps.Done());
    }

    private static StepList Forces(Setting setting, bool withArms)
    {
        var steps = new StepList(40);
        DiagramWorking.AddRake(steps.Steps, setting.Rake);
        steps.Given("b_t", setting.Tributary, Dimension.Length);
        DiagramWorking.AddForces(steps.Steps, setting.Diagram.Pieces, setting.Rake, withArms, withFactors: true);
        return steps;
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
