using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Anchors;

/// <summary>Bodies of concrete by hand, and which of them a row that pulls or pushes meets.</summary>
public class AnchorBodyTests
{
    private static readonly AnchorLayout Far = new(3, 0.2, 0.24, null, null, null, null, 0.5);

    private static readonly AnchorInput Headed = new() { Method = AnchorMethod.Aci318, Kind = AnchorKind.Headed, HeadArea = 500e-6, Depth = 0.2 };

    private static readonly BasePlateInput Plate = new() { RodDistance = 0.12, RodsPerRow = 2, ConcreteStrength = 28e6 };

    /// <summary>Three anchors 0.2 m apart, 0.1 m deep: nearer than 3·h_ef they share a body 0.7 m long.</summary>
    [Fact]
    public void Body_NearAnchors_IsShared()
    {
        var body = BreakoutBody.Of(Far, 1, 0.1);

        Assert.Equal(3, body.Count);
        Hand.Equal(0.7 * 0.3, body.Area);
    }

    /// <summary>Further apart each tears out its own, and the one with the nearest edge is the weakest.</summary>
    [Fact]
    public void Body_DistantAnchors_NearestToAnEdgeAlone()
    {
        var body = BreakoutBody.Of(Far with { Spacing = 0.31, Right = 0.12 }, 1, 0.1);

        Assert.Equal(1, body.Count);
        Hand.Equal(0.27 * 0.3, body.Area);
        Hand.Equal(0.94, body.EdgeFactor);
    }

    [Fact]
    public void Body_DistantRows_FirstRowWithTheNearerEdge()
    {
        var body = BreakoutBody.Of(Far with { RowSpacing = 0.31, Protected = 0.12 }, 2, 0.1);

        Assert.Equal(1, body.Rows);
        Hand.Equal(0.7 * 0.27, body.Area);
    }

    /// <summary>Edges of 0.12, 0.15 and 0.18 m are nearer than 1.5·0.2 m: h′ = max(0.18/1.5, 0.2/3) = 0.12 m.</summary>
    [Fact]
    public void Body_ThreeNearEdges_DepthIsReduced()
    {
        var body = BreakoutBody.Of(Far with { Flood = 0.12, Left = 0.15, Right = 0.18 }, 1, 0.2);

        Hand.Equal(0.12, body.Depth);
        Hand.Equal((0.15 + 0.18 + 0.4) * (0.12 + 0.18), body.Area);
    }

    /// <summary>A row of 0.31 m spacing at 0.1 m from an edge: one anchor, its side edge 0.12 m away, 0.12 + 0.15 m wide.</summary>
    [Fact]
    public void EdgeBody_DistantAnchors_NearestToASideAlone()
    {
        var body = EdgeBody.Of(3, 0.31, 0.1, 0.12, null, 0.5);

        Assert.Equal(1, body.Count);
        Hand.Equal(0.27 * 0.15, body.Area);
    }

    /// <summary>Sides of 0.2 and 0.15 m and a thickness of 0.24 m are less than 1.5·0.3 m: c_1 = max(0.2/1.5, 0.24/1.5, 0.2/3) = 0.16 m.</summary>
    [Fact]
    public void EdgeBody_NarrowAndThin_EdgeIsReduced()
    {
        var body = EdgeBody.Of(2, 0.2, 0.3, 0.2, 0.15, 0.24);

        Hand.Equal(0.16, body.EdgeDistance);
        Hand.Equal((0.2 + 0.2 + 0.15) * 0.24, body.Area);
    }

    /// <summary>A raker may turn the moment round: then the row on the protected side pulls, near its own edge.</summary>
    [Fact]
    public void Tension_MomentTurned_TearsOutTheOtherRow()
    {
        var anchors = Headed with { EdgeProtected = 0.1 };
        double Capacity(bool turned) => Checks(anchors, new(20e3, 0, 5e3, PullsProtectedRow: turned), DesignBasisKind.UsStrength, "anchor-breakout").Capacity;

        // 1.5·h_ef is 0.3 m: ψ_ed = 0.7 + 0.3·0.1/0.3 = 0.8 and 0.4 of 0.6 m of the body; the flood row stands 0.34 m away, out of reach.
        Hand.Equal(0.8 * 0.4 / 0.6, Capacity(true) / Capacity(false));
    }

    /// <summary>A base that is pushed back breaks the flood edge, not the protected one.</summary>
    [Fact]
    public void Shear_PushedBack_BreaksTheFloodEdge()
    {
        var anchors = Headed with { EdgeProtected = 0.1, EdgeFlood = 0.4 };
        double Capacity(bool back) => Checks(anchors, new(0, 0, 5e3, PushesBack: back), DesignBasisKind.UsStrength, "anchor-edge-shear").Capacity;

        Assert.True(Capacity(true) > 2 * Capacity(false));
    }

    /// <summary>ψ_cp = max(c_min, 1.5·h_ef)/c_ac of drilled anchors in concrete that does not crack: 0.15/0.25.</summary>
    [Fact]
    public void Splitting_DrilledUncracked_WeakensTheBody()
    {
        var body = BreakoutBody.Of(Far with { Left = 0.12 }, 1, 0.1);

        Hand.Equal(0.6, AciAnchors.SplittingFactor(body, 0.25));
        Assert.Equal(1, AciAnchors.SplittingFactor(body, null));
        Assert.Equal(1, AciAnchors.SplittingFactor(BreakoutBody.Of(Far, 1, 0.1), 0.25));
    }

    /// <summary>EN 1992-4: c_cr,sp 0.3 m instead of 1.5·0.1 m: a body of (0.4 + 0.6)·0.6 m over 0.36 m², of the weaker of cone and pull-out, 20 kN.</summary>
    [Fact]
    public void Splitting_Eurocode_WeakerOfConeAndPullout()
    {
        var drilled = new AnchorInput
        {
            Method = AnchorMethod.En1992,
            Depth = 0.1,
            Spacing = 0.4,
            Pullout = 20e3,
            Cracked = false,
            CriticalEdge = 0.3,
        };
        var check = Checks(drilled, new(30e3, 0, 0), DesignBasisKind.Eurocode, "anchor-splitting");

        Hand.Equal((1.0 * 0.6 / 0.36) * 20e3 / 1.5, check.Capacity);
    }

    /// <summary>Near a corner: a quarter of 1 + c_2/c_1 (ACI 318-19, 17.6.4.1.1) and 0.7 + 0.3·c_2/(2·c_1) (EN 1992-4, 7.2.1.8); nothing far from it.</summary>
    [Theory]
    [InlineData(0.1, 0.5, 0.85)]
    [InlineData(0.2, 0.75, 1)]
    [InlineData(0.3, 1, 1)]
    public void Corner_OfAFace_WeakensIt(double other, double aci, double eurocode)
    {
        Hand.Equal(aci, AciAnchors.CornerFactor(0.1, other));
        Hand.Equal(eurocode, EurocodeAnchors.CornerFactor(0.1, other));
        Assert.Equal((1, 1), (AciAnchors.CornerFactor(0.1, null), EurocodeAnchors.CornerFactor(0.1, null)));
    }

    /// <summary>12 d to 24 mm, then 8 d or 300 mm; grout without a lever arm up to half a diameter and from 30 MPa.</summary>
    [Fact]
    public void Eurocode_BearingLengthAndGrout_AtTheirLimits()
    {
        Hand.Equal(0.24, EurocodeAnchors.BearingLength(0.5, 0.02));
        Hand.Equal(0.3, EurocodeAnchors.BearingLength(0.5, 0.03));
        Hand.Equal(0.32, EurocodeAnchors.BearingLength(0.5, 0.04));
        Assert.True(EurocodeAnchors.BearsDirectly(0.01, 0.02, 30e6));
        Assert.False(EurocodeAnchors.BearsDirectly(0.011, 0.02, 30e6));
        Assert.False(EurocodeAnchors.BearsDirectly(0.01, 0.02, 29e6));
        Assert.True(EurocodeAnchors.BearsDirectly(0, 0.02, 20e6));
    }

    private static Check Checks(AnchorInput anchors, AnchorDemand demand, DesignBasisKind basis, string name) =>
        AnchorResistance.Checks(anchors, Plate, demand, basis).First(c => c.Name == name);
}
