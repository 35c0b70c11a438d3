using FloodPanel.Calculation.Anchors;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Verification;

/// <summary>Anchors in concrete: worked examples of a design guide after ACI 318-19, and a pair near an edge after EN 1992-4.</summary>
internal static class AnchorRows
{
    private const string Guide = "AISC Design Guide 1, 3rd ed., Example 4.7-";
    private const string Derived = "Two anchors near an edge, EN 1992-4, C25/30 cracked";
    private const string RoundedAreas = "the guide carries rounded areas on";
    private const double Inch = AciAnchors.Inch;
    private const double Kip = 1000 * AciAnchors.Pound;
    private const double Ksi = 1000 * AciAnchors.Psi;
    private const double Concrete = 4 * Ksi;
    private const double Cast = 0.70;

    public static IEnumerable<VerificationRow> Rows() => [.. Tension(), .. Edge(), .. Bending(), .. Pair()];

    private static VerificationRow[] Tension()
    {
        var four = BreakoutBody.Of(new(2, 4 * Inch, 4 * Inch, null, null, null, null, 40 * Inch), 2, 15 * Inch);
        var beside = BreakoutBody.Of(new(2, 8.5 * Inch, 60 * Inch, 10.75 * Inch, null, null, null, 40 * Inch), 1, 12 * Inch);
        var row = BreakoutBody.Of(new(2, 6 * Inch, 60 * Inch, null, null, null, null, 40 * Inch), 1, 12 * Inch);
        return
        [
            new($"{Guide}3", "steel of a rod of 7/8 in, 36/58 ksi", "kip", "26.8", 0.462 * AciAnchors.Ultimate(36 * Ksi, 58 * Ksi) / Ksi, Evidence.Read),
            new($"{Guide}3", "pullout of a hook of 2.63 in", "kip", "8.28", AciAnchors.HookPullout(2.63 * Inch, 0.875 * Inch, Concrete, cracked: true) / Kip, Evidence.Read),
            new($"{Guide}3", "basic cone, 15 in deep", "kip", "92.3", AciAnchors.BasicBreakout(AnchorKind.Headed, 15 * Inch, Concrete) / Kip, Evidence.Read),
            new($"{Guide}3", "cone of four rods at 4 in, design", "kip", "76.3", Cast * Cone(four), Evidence.Read, 0.005, RoundedAreas),
            new($"{Guide}5", "cone of two rods beside an edge, design", "kip", "38.6", Cast * Cone(beside), Evidence.Read, 0.003, RoundedAreas),
            new($"{Guide}9", "cone of two rods at 6 in, design", "kip", "51.7", Cast * Cone(row), Evidence.Read, 0.006, RoundedAreas),
            new($"{Guide}9", "pullout of a head of 1.50 in²", "kip", "33.6", Cast * AciAnchors.HeadedPullout(1.50 * Inch * Inch, Concrete, cracked: true) / Kip, Evidence.Read),
        ];
    }

    private static VerificationRow[] Edge()
    {
        var body = EdgeBody.Of(2, 4 * Inch, 12 * Inch, null, null, 18 * Inch);
        return
        [
            new($"{Guide}4", "area that two rods break off an edge 12 in away", "in²", "720", body.Area / (Inch * Inch), Evidence.Read),
            new($"{Guide}4", "basic edge breakout in shear", "kip", "23.7", AciAnchors.BasicEdge(12 * Inch, 6 * Inch, 0.75 * Inch, Concrete) / Kip, Evidence.Read),
            new($"{Guide}4", "edge breakout, design", "kip", "18.4", Cast * AciAnchors.Edge(body, 6 * Inch, 0.75 * Inch, Concrete, cracked: true) / Kip, Evidence.Read),
        ];
    }

    private static VerificationRow[] Bending()
    {
        var rod = RodBending.Of(73.2 / 4 * Kip, 38.0 / 4 * Kip, 1.125 * Inch, 1 * Inch, 0.375 * Inch, 58 * Ksi);
        return
        [
            new($"{Guide}6", "rod of 1-1/8 in under welded washers: tension and bending", "ksi", "42.2", rod.Total / Ksi, Evidence.Read),
            new($"{Guide}6", "strength beside the shear", "ksi", "26.5", rod.Allowed / Ksi, Evidence.Read),
        ];
    }

    private static VerificationRow[] Pair()
    {
        const double depth = 0.11, diameter = 0.012, concrete = 25e6;
        var body = BreakoutBody.Of(new(2, 0.14, 1, 0.15, null, null, null, 0.2), 1, depth);
        var edge = EdgeBody.Of(2, 0.14, 0.15, null, null, 0.2);
        var cone = EurocodeAnchors.Cone(body, EurocodeAnchors.ConeConstant(AnchorKind.PostInstalled, cracked: true), concrete, 0);
        var shear = EurocodeAnchors.Edge(edge, EurocodeAnchors.BearingLength(depth, diameter), diameter, concrete, cracked: true);
        return
        [
            new(Derived, "cone, characteristic", "kN", "58.74", Printed.Kilo(cone), Evidence.Derived),
            new(Derived, "cone, design", "kN", "39.2", Printed.Kilo(cone / EurocodeAnchors.ConcreteFactor), Evidence.Derived),
            new(Derived, "edge in shear, design", "kN", "21.1", Printed.Kilo(shear / EurocodeAnchors.ConcreteFactor), Evidence.Derived),
            new(Derived, "pry-out, design", "kN", "78.3", Printed.Kilo(EurocodeAnchors.PryoutFactor(depth) * cone / EurocodeAnchors.ConcreteFactor), Evidence.Derived),
        ];
    }

    private static double Cone(BreakoutBody body) => AciAnchors.Breakout(body, AnchorKind.Headed, Concrete, cracked: true, 0) / Kip;
}
