using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Posts;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// AISC, Steel Construction Manual, Table 3-23, beam formulas (case numbers from memory, formulas checked by
/// integration). The expected values are the formulas worked with round figures.
/// </summary>
public class AiscManualTests
{
    /// <summary>Case 1, simple beam, uniform load: M = w·l²/8 with w = 6 kN/m, l = 2.5 m.</summary>
    [Fact]
    public void Case1_UniformLoad_Moment() => Hand.Equal(4687.5, SimpleBeam.Moment(6000, 2.5));

    /// <summary>Case 1: R = V = w·l/2.</summary>
    [Fact]
    public void Case1_UniformLoad_Reaction() => Hand.Equal(7500, SimpleBeam.Shear(6000, 2.5));

    /// <summary>Case 1: Δ = 5·w·l⁴/(384·E·I) with E·I = 50 kN·m²: 5·6000·39.0625/19.2e6.</summary>
    [Fact]
    public void Case1_UniformLoad_Deflection() =>
        Hand.Equal(0.06103515625, SimpleBeam.Deflection(6000, 2.5, 50_000));

    /// <summary>Case 7, simple beam, force at mid-span: M = P·l/4, Δ = P·l³/(48·E·I), with P = 8 kN, l = 3 m, E·I = 50 kN·m².</summary>
    [Fact]
    public void Case7_ForceAtMidSpan_MomentAndDeflection()
    {
        Hand.Equal(6_000, SimpleBeam.PointMoment(8_000, 3));
        Hand.Equal(0.09, SimpleBeam.PointDeflection(8_000, 3, 50_000));
    }

    /// <summary>Case 18, cantilever, load increasing uniformly to the fixed end: V = w·l/2, M = w·l²/6, Δ = w·l⁴/30EI.</summary>
    [Fact]
    public void Case18_TriangularLoad_BaseAndTip()
    {
        var post = Stretch.Beam(elasticModulus: 200e9, inertia: 1e-6);
        var diagram = Stretch.Of(0, 1.2, 12_000, 0);

        var response = Cantilever.Respond(diagram, post, tributary: 2, length: 1.2, cosRake: 1);

        Hand.Equal(14_400, response.BaseShear);
        Hand.Equal(5_760, response.BaseMoment);
        Hand.Equal(24_000 * 2.0736 / 6e6, response.TipDeflection);
    }

    /// <summary>Case 19, cantilever, uniform load: V = w·l, M = w·l²/2, Δ = w·l⁴/8EI.</summary>
    [Fact]
    public void Case19_UniformLoad_BaseAndTip()
    {
        var post = Stretch.Beam(elasticModulus: 200e9, inertia: 1e-6);
        var diagram = Stretch.Of(0, 1.2, 12_000, 12_000);

        var response = Cantilever.Respond(diagram, post, tributary: 2, length: 1.2, cosRake: 1);

        Hand.Equal(28_800, response.BaseShear);
        Hand.Equal(17_280, response.BaseMoment);
        Hand.Equal(24_000 * 2.0736 / 1.6e6, response.TipDeflection);
    }
}
