using FloodPanel.Calculation.Materials;

namespace FloodPanel.Calculation.Covers;

/// <summary>The checks of a cover. Coefficients are those of its own plate under its own pressure, in the form of Roark's tables.</summary>
internal static class CoverChecks
{
    private const string Rectangle = "Coefficients of this plate and pressure by Lévy's series, Timoshenko and Woinowsky-Krieger, articles 30 to 36 and 41";
    private const string Circle = "Coefficients of this plate and pressure in closed form, Timoshenko and Woinowsky-Krieger, articles 16 and 63";

    /// <summary>Where the coefficients come from.</summary>
    public static string Theory(CoverCase cover) => cover.Cover.Plate is ProjectTree.RectangleCover ? Rectangle : Circle;

    /// <summary>Bending stress at the surface: σ = β·q·b²/t².</summary>
    public static Check Bending(CoverCase cover, PlateResponse plate, DesignStress allowed)
    {
        var (b, thickness) = (cover.ReferenceSymbol, cover.Cover.Thickness);
        var stress = cover.Factor * 6 * plate.Moment / (thickness * thickness);
        var steps = new StepList(20);
        cover.ExplainPressure(steps, isDesign: true);
        cover.ExplainReference(steps);
        steps.Given("ν", cover.Cover.PoissonRatio, Dimension.Ratio);
        steps.Given("β", 6 * plate.Moment / (cover.Pressure * cover.Reference * cover.Reference), Dimension.Ratio);
        steps.Given("t", thickness, Dimension.SectionLength);
        steps.Add("σ", $"β·q·{b}²/t²", stress, Dimension.Stress);
        steps.Stress("f_b", allowed);
        steps.Add("u", "σ/f_b", stress / allowed.Value, Dimension.Ratio);
        return new("cover-bending", "Bending of the plate", $"{Theory(cover)}; {allowed.Source}", Dimension.Stress, stress, allowed.Value, steps.Done());
    }

    /// <summary>Deflection, unfactored: δ = α·q_k·b⁴/(E·t³).</summary>
    public static Check Deflection(CoverCase cover, PlateResponse plate)
    {
        var (deflection, limit) = (DeflectionOf(cover, plate), cover.Span / cover.Cover.DeflectionLimit);
        var (b, modulus, thickness) = (cover.ReferenceSymbol, cover.Material.ElasticModulus, cover.Cover.Thickness);
        var steps = new StepList(20);
        cover.ExplainPressure(steps, isDesign: false);
        cover.ExplainReference(steps);
        steps.Given("ν", cover.Cover.PoissonRatio, Dimension.Ratio);
        steps.Given("α", deflection * modulus * Math.Pow(thickness, 3) / (cover.Pressure * Math.Pow(cover.Reference, 4)), Dimension.Ratio);
        steps.Given("E", modulus, Dimension.ElasticModulus);
        steps.Given("t", thickness, Dimension.SectionLength);
        steps.Add("δ", $"α·q_k·{b}⁴/(E·t³)", deflection, Dimension.Deflection);
        steps.Given("n", cover.Cover.DeflectionLimit, Dimension.Count);
        steps.Add("δ_lim", $"{cover.SpanSymbol}/n", limit, Dimension.Deflection);
        steps.Add("u", "δ/δ_lim", deflection / limit, Dimension.Ratio);
        return new("cover-deflection", "Deflection of the plate", $"{Theory(cover)}; limit chosen by the user", Dimension.Deflection, deflection, limit, steps.Done());
    }

    /// <summary>δ = w·D/D with D = E·t³/(12·(1 − ν²)) [m].</summary>
    public static double DeflectionOf(CoverCase cover, PlateResponse plate)
    {
        var poisson = cover.Cover.PoissonRatio;
        return plate.Bulge * 12 * (1 - poisson * poisson) / (cover.Material.ElasticModulus * Math.Pow(cover.Cover.Thickness, 3));
    }
}
