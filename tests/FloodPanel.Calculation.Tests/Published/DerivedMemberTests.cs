using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Guides;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Worked examples of members, derived and recomputed outside this code; no document prints them. Water of
/// 9.81 kN/m³.
/// </summary>
public class DerivedMemberTests
{
    private static readonly double UnitWeight = Hydrostatic.UnitWeight(9810 / 9.80665);

    /// <summary>Ribs of 3, 2.5 and 3 mm; only their sum counts.</summary>
    private static readonly HollowRectangle RibbedLog =
        new() { Height = 0.2, Depth = 0.05, Face = 0.003, Web = 0.0085 / 3, Webs = 3 };

    /// <summary>Ribbed log 200 × 50, faces 3 mm: A 1574 mm², I 723 939 mm⁴, W 28 958 mm³, W_pl 32 314 mm³.</summary>
    [Fact]
    public void SectionProperties_RibbedLog_ToTheMillimetre()
    {
        var section = SectionProperties.Of(RibbedLog);

        Assert.Equal(1_574, section.Area * 1e6, tolerance: 0.5);
        Assert.Equal(723_939, section.Inertia * 1e12, tolerance: 0.5);
        Assert.Equal(28_958, section.Modulus * 1e9, tolerance: 0.5);
        Assert.Equal(32_314, section.PlasticModulus * 1e9, tolerance: 0.5);
    }

    /// <summary>The same log under 1.6 kN/m over 1.5 m, E = 70 GPa: 0.45 kN·m, 1.2 kN, 2.08 mm; elastic M_Rd 4.21 kN·m with f_o = 160 MPa.</summary>
    [Fact]
    public void LogResponse_RibbedLog_MomentShearDeflectionAndResistance()
    {
        var alloy = new Material { Family = MaterialFamily.Aluminium, Density = 2700, ElasticModulus = 70e9, BendingStrength = 160e6 };
        var log = new Member(
            alloy, RibbedLog, SectionProperties.Of(RibbedLog), DesignStress.Bending(alloy, DesignBases.Eurocode), null, 200);

        var response = LogResponse.Of(new(1_600, 1_600), span: 1.5, log);

        Assert.Equal(0.45, response.Moment / 1000, tolerance: 0.005);
        Assert.Equal(1.2, response.Shear / 1000, tolerance: 0.05);
        Assert.Equal(2.08, response.Deflection * 1000, tolerance: 0.005);
        Assert.Equal(4.21, log.MomentResistance / 1000, tolerance: 0.005);
    }

    /// <summary>The same log, skin 3 mm between ribs 95.75 mm apart under 8 kPa: p·b²/8 = 9.17 N·mm/mm, 6.1 MPa; sealed it floats with +56.4 N/m, see HoldDownTests.</summary>
    [Fact]
    public void SkinCheck_RibbedLog_StressBetweenRibs()
    {
        var stress = SkinCheck.Stress(8_000, ThinWalls.Of(RibbedLog)!.FacePart, 0.003, isOutstand: false);

        Assert.Equal(9.17, stress * 0.003 * 0.003 / 6, tolerance: 0.005);
        Assert.Equal(6.1, stress / 1e6, tolerance: 0.05);
    }

    /// <summary>Post, 1.2 m of fresh water, tributary 2.0 m, no strut: 23.54 kN/m at the sill, V 14.13 kN, M 5.65 kN·m.</summary>
    [Fact]
    public void Cantilever_PostUnderFreshWater_BaseShearAndMoment()
    {
        var diagram = PressureDiagram.Of(Hydrostatic.Side(UnitWeight, 1.2, height: 1.2, factor: 1));

        var response = Cantilever.Respond(diagram, Stretch.Beam(210e9, 4e-6), tributary: 2.0, length: 1.2, cosRake: 1);

        Assert.Equal(23.54, 2.0 * diagram.At(0) / 1000, tolerance: 0.005);
        Assert.Equal(14.13, response.BaseShear / 1000, tolerance: 0.005);
        Assert.Equal(5.65, response.BaseMoment / 1000, tolerance: 0.005);
    }

    /// <summary>
    /// Guide of logs of 3.0 m span under 1.2 m of water: 17.66 kN/m at the sill, 10.59 kN in all. The peak belongs to
    /// a log of no height; logs of 0.1 mm come within 0.001 kN/m of it.
    /// </summary>
    [Fact]
    public void GuideReaction_ThreeMetreLogs_PeakAtTheSillAndTotal()
    {
        const int logs = 12_000;
        var diagram = PressureDiagram.Of(Hydrostatic.Side(UnitWeight, 1.2, height: 1.2, factor: 1));
        var loads = Enumerable.Range(0, logs).Select(i => diagram.Within(i * 1.2 / logs, (i + 1) * 1.2 / logs)).ToArray();

        var response = GuideReaction.Of(loads, tributary: 1.5, logHeights: [.. Enumerable.Repeat(1.2 / logs, logs)]);

        Assert.Equal(17.66, response.PeakLineReaction / 1000, tolerance: 0.005);
        Assert.Equal(10.59, response.Reaction / 1000, tolerance: 0.005);
    }
}
