using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// A derived example by EN 1992-4 (its formulas from memory), without a published counterpart: two anchors in tension near an edge, C25/30 cracked,
/// k_1 7.7, h_ef 110, s 140, c_1 150 mm, d 12 mm, M12-8.8 of 84.3 mm², concrete 200 mm thick.
/// </summary>
public class DerivedAnchorTests
{
    private static readonly AnchorLayout Pair = new(2, 0.140, 10, 0.150, null, null, null, 0.2);

    [Fact]
    public void Cone_TwoAnchorsNearAnEdge_AsDerived()
    {
        var body = BreakoutBody.Of(Pair, rows: 1, 0.110);
        var strength = EurocodeAnchors.Cone(body, EurocodeAnchors.ConeConstant(AnchorKind.PostInstalled, cracked: true), 25e6, 0);

        Assert.Equal(44.42, EurocodeAnchors.BasicCone(7.7, 0.110, 25e6) / 1000, tolerance: 0.005);
        Assert.Equal(108_900, body.SingleArea * 1e6, tolerance: 0.5);
        Assert.Equal(148_050, body.Area * 1e6, tolerance: 0.5);
        Assert.Equal(0.973, body.EdgeFactor, tolerance: 0.0005);
        Assert.Equal(58.74, strength / 1000, tolerance: 0.01);
        Assert.Equal(39.2, strength / 1.5 / 1000, tolerance: 0.05);
        Assert.Equal(117.5, EurocodeAnchors.PryoutFactor(0.110) * strength / 1000, tolerance: 0.05);
    }

    [Fact]
    public void Edge_TwoAnchors_AsDerived()
    {
        var body = EdgeBody.Of(2, 0.140, 0.150, null, null, 0.2);
        var (alpha, beta) = EurocodeAnchors.EdgeExponents(0.150, 0.110, 0.012);
        var strength = EurocodeAnchors.Edge(body, 0.110, 0.012, 25e6, cracked: true);

        Assert.Equal(0.0856, alpha, tolerance: 0.00005);
        Assert.Equal(0.0603, beta, tolerance: 0.00005);
        Assert.Equal(25.65, EurocodeAnchors.BasicEdge(0.150, 0.110, 0.012, 25e6, cracked: true) / 1000, tolerance: 0.005);
        Assert.Equal(101_250, body.SingleArea * 1e6, tolerance: 0.5);
        Assert.Equal(118_000, body.Area * 1e6, tolerance: 0.5);
        Assert.Equal(1.061, body.ThicknessFactor, tolerance: 0.0005);
        Assert.Equal(31.7, strength / 1000, tolerance: 0.05);
        Assert.Equal(21.1, strength / 1.5 / 1000, tolerance: 0.05);
    }

    [Fact]
    public void Steel_M12Grade88_AsDerived()
    {
        Assert.Equal(45.0, 84.3e-6 * 800e6 / EurocodeAnchors.SteelFactorInTension(640e6, 800e6) / 1000, tolerance: 0.05);
        Assert.Equal(27.0, EurocodeAnchors.SteelShearShare(800e6, ductile: true) * 84.3e-6 * 800e6 / EurocodeAnchors.SteelFactorInShear(640e6, 800e6) / 1000, tolerance: 0.05);
    }
}
