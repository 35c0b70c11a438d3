using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Posts;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Cantilever closed forms that no table at hand prints, derived by superposition and checked by integration outside
/// this code. Post 1.5 m, E·I = 250 kN·m², tributary width 2 m.
/// </summary>
public class DerivedBeamTests
{
    private const double Stiffness = 250_000;
    private const double Length = 1.5;

    /// <summary>Uniform w = 8 kN/m from the base to h = 0.9 m: V = w·h, M = w·h²/2, δ = w·h⁴/8EI + (H − h)·w·h³/6EI.</summary>
    [Fact]
    public void Respond_UniformToPartHeight_BaseAndTip()
    {
        var (w, h) = (8_000.0, 0.9);

        var response = Respond(Stretch.Of(0, h, w / 2, w / 2));

        Hand.Equal(7_200, response.BaseShear);
        Hand.Equal(3_240, response.BaseMoment);
        Hand.Equal((w * Math.Pow(h, 4) / 8 + (Length - h) * w * Math.Pow(h, 3) / 6) / Stiffness, response.TipDeflection);
    }

    /// <summary>Hydrostatic w₀ = 20 kN/m at the base to nothing at h: V = w₀·h/2, M = w₀·h²/6, δ = w₀·h⁴/30EI + (H − h)·w₀·h³/24EI.</summary>
    [Theory]
    [InlineData(1.5, 15_000, 7_500)]
    [InlineData(0.9, 9_000, 2_700)]
    public void Respond_HydrostaticLoad_BaseAndTip(double h, double shear, double moment)
    {
        const double w = 20_000;

        var response = Respond(Stretch.Of(0, h, w / 2, 0));

        Hand.Equal(shear, response.BaseShear);
        Hand.Equal(moment, response.BaseMoment);
        Hand.Equal((w * Math.Pow(h, 4) / 30 + (Length - h) * w * Math.Pow(h, 3) / 24) / Stiffness, response.TipDeflection);
    }

    /// <summary>Trapezoid 18 kN/m at the base to 6 kN/m at the top: V = (w_b + w_t)·H/2, M = (w_b + 2·w_t)·H²/6.</summary>
    [Fact]
    public void Respond_TrapezoidalLoad_BaseAndTip()
    {
        var response = Respond(Stretch.Of(0, Length, 9_000, 3_000));

        Hand.Equal(18_000, response.BaseShear);
        Hand.Equal(11_250, response.BaseMoment);
        Hand.Equal((6_000 * 5.0625 / 8 + 12_000 * 5.0625 / 30) / Stiffness, response.TipDeflection);
    }

    /// <summary>A slope length of 1.5 m raked by 60° stands 0.75 m high: the same pressures over half the height do the same.</summary>
    [Fact]
    public void Respond_RakedSixtyDegrees_SameAsAlongTheSlope()
    {
        var post = Stretch.Beam(elasticModulus: 250e9, inertia: 1e-6);

        var response = Cantilever.Respond(Stretch.Of(0, Length / 2, 9_000, 3_000), post, 2, Length, cosRake: 0.5);

        Hand.Equal(18_000, response.BaseShear);
        Hand.Equal(11_250, response.BaseMoment);
        Hand.Equal((6_000 * 5.0625 / 8 + 12_000 * 5.0625 / 30) / Stiffness, response.TipDeflection);
    }

    private static PostResponse Respond(PressureDiagram diagram) =>
        Cantilever.Respond(diagram, Stretch.Beam(elasticModulus: 250e9, inertia: 1e-6), tributary: 2, Length, cosRake: 1);
}
