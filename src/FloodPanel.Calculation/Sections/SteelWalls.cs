namespace FloodPanel.Calculation.Sections;

/// <summary>Bending of steel sections by the class of their walls; walls of class 4, or slender ones, are not covered.</summary>
internal static class SteelWalls
{
    /// <summary>EN 1993-1-1, Table 5.2 (from memory): M_R = f_b·W_pl in classes 1 and 2, f_b·W in class 3; ε = √(235 MPa/f_y).</summary>
    public static LocalBucklingResult ByEurocode(Member member, ThinWalls walls, BendingStress stress)
    {
        var epsilon = Math.Sqrt(235e6 / stress.Yield);
        double[] limits = walls.IsOutstand ? [9, 10, 14] : [33, 38, 42];
        double[] webLimits = [72, 83, 124];
        var face = Class(walls.FaceSlenderness / epsilon, limits);
        var web = Class(walls.WebSlenderness / epsilon, webLimits);
        if (Math.Max(face, web) == 4)
        {
            return NotCovered("EN 1993-1-1, Table 5.2");
        }

        var steps = WallSteps.Begin(walls, stress);
        steps.Given("f_ref", 235e6, Dimension.Stress);
        steps.Add("ε", "√(f_ref/f_k)", epsilon, Dimension.Ratio);
        steps.Add("β_f", "λ_f/ε", walls.FaceSlenderness / epsilon, Dimension.Ratio);
        steps.Add("β_w", "λ_w/ε", walls.WebSlenderness / epsilon, Dimension.Ratio);
        return Moment(
            member, stress, steps, Math.Max(face, web) < 3,
            FormattableString.Invariant($"EN 1993-1-1, Table 5.2 and 6.2.5 (limits from memory): face of class {face}, webs of class {web}"));
    }

    /// <summary>
    /// AISC 360, Table B4.1b (from memory): compact f_b·W_pl; not compact f_b·W, which is the least that F3 and F7 give there.
    /// </summary>
    public static LocalBucklingResult ByAisc(Member member, ThinWalls walls, BendingStress stress)
    {
        var root = Math.Sqrt(member.Material.ElasticModulus / stress.Yield);
        double[] limits = walls.IsOutstand ? [0.38, 0.38, 1.0] : [1.12, 1.12, 1.40];
        double[] webLimits = walls.IsOutstand ? [3.76, 3.76, 5.70] : [2.42, 2.42, 5.70];
        var face = Class(walls.FaceSlenderness / root, limits);
        var web = Class(walls.WebSlenderness / root, webLimits);
        if (Math.Max(face, web) == 4)
        {
            return NotCovered("AISC 360, Table B4.1b");
        }

        var steps = WallSteps.Begin(walls, stress);
        steps.Given("E", member.Material.ElasticModulus, Dimension.ElasticModulus);
        steps.Add("r", "√(E/f_k)", root, Dimension.Ratio);
        steps.Add("β_f", "λ_f/r", walls.FaceSlenderness / root, Dimension.Ratio);
        steps.Add("β_w", "λ_w/r", walls.WebSlenderness / root, Dimension.Ratio);
        return Moment(
            member, stress, steps, Math.Max(face, web) < 3,
            $"AISC 360, Table B4.1b and chapter F (limits from memory): face {Word(face)}, webs {Word(web)}");
    }

    private static int Class(double relative, double[] limits) => 1 + limits.Count(limit => relative > limit);

    private static string Word(int number) => number < 3 ? "compact" : "noncompact";

    private static LocalBucklingResult Moment(Member member, BendingStress stress, StepList steps, bool isPlastic, string source)
    {
        var (symbol, modulus) = isPlastic ? ("W_pl", member.Section.PlasticModulus) : ("W", member.Section.Modulus);
        steps.Given(symbol, modulus, Dimension.SectionModulus);
        steps.Add("M_R", $"f_b·{symbol}", stress.Design * modulus, Dimension.Moment);
        return new(new(stress.Design * modulus, source, steps.Done()), null);
    }

    private static LocalBucklingResult NotCovered(string where) => LocalBuckling.Gap("buckling-slender", new(
        $"Steel walls so slender that they buckle before they yield (beyond the last limit of {where}) are not covered: use thicker walls, or have them designed by others."));
}
