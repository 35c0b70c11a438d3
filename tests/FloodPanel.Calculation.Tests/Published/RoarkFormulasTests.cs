using FloodPanel.Calculation.Posts;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Roark's Formulas for Stress and Strain, Table 8.1 (case number from memory, formulas checked by integration):
/// cantilever under a load rising from nothing at the fixed end to w₀ at the free end.
/// </summary>
public class RoarkFormulasTests
{
    /// <summary>V = w₀·l/2, M = w₀·l²/3, y = 11·w₀·l⁴/(120·E·I), with w₀ = 9 kN/m, l = 2 m, E·I = 300 kN·m².</summary>
    [Fact]
    public void Cantilever_LoadRisingToTip_BaseAndTip()
    {
        var post = Stretch.Beam(elasticModulus: 200e9, inertia: 1.5e-6);
        var diagram = Stretch.Of(0, 2, 0, 6_000);

        var response = Cantilever.Respond(diagram, post, tributary: 1.5, length: 2, cosRake: 1);

        Hand.Equal(9_000, response.BaseShear);
        Hand.Equal(12_000, response.BaseMoment);
        Hand.Equal(0.044, response.TipDeflection);
    }
}
