using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>The moment that a thin-walled section carries with regard to its walls.</summary>
/// <param name="Moment">M_R [N·m], > 0.</param>
/// <param name="Source">Method, clause and class or range, as printed.</param>
/// <param name="Steps">The working, from f_k to M_R.</param>
public sealed record WallResistance(double Moment, string Source, IReadOnlyList<CalculationStep> Steps);

/// <summary>What local buckling makes of a section: a resistance, or why there is none; neither where no wall can buckle.</summary>
/// <param name="Resistance">The resistance, or null.</param>
/// <param name="Gap">What to enter, or what no method covers; null where there is nothing to say.</param>
public sealed record LocalBucklingResult(WallResistance? Resistance, Note? Gap);

/// <summary>Bending resistance of logs and posts with local buckling of the compressed face and of the webs, by design basis.</summary>
/// <remarks>
/// Aluminium by EN 1999-1-1 or the Aluminum Design Manual, steel by EN 1993-1-1 or AISC 360, each under its own basis. Solid
/// sections and timber have no wall that buckles. Limits: sections symmetrical about mid-depth, bent in the direction of the water.
/// </remarks>
public static class LocalBuckling
{
    /// <summary>The resistance of a member.</summary>
    /// <param name="member">A log or post.</param>
    /// <param name="basis">The design basis.</param>
    /// <param name="isWeldAffected">True when the section lies beside a weld: aluminium then has its welded yield and limits.</param>
    public static LocalBucklingResult Of(Member member, DesignBasis basis, bool isWeldAffected = false)
    {
        if (member.Material.Family == MaterialFamily.Timber || member.Profile is Rectangle)
        {
            return new(null, null);
        }

        if (ThinWalls.Of(member.Profile) is not { } walls)
        {
            return Gap("buckling-profile", new(
                $"Local buckling is not covered for a profile given by its properties: they say nothing about its walls. Enter it by its shape, or have its maker confirm the moment it carries."));
        }

        if (member.Material.Family == MaterialFamily.Composite)
        {
            return Gap("buckling-composite", new(
                $"Local buckling and crushing of hollow composite profiles are not covered: take both from the maker's tests."));
        }

        if (BendingStress.Of(member, basis, isWeldAffected) is not { } stress)
        {
            return member.Bending is null ? new(null, null) : Gap("buckling-strength", new(
                $"Walls not checked for buckling: enter the yield{(isWeldAffected ? " beside a weld" : "")} of the {member.Material.Family.ToString().ToLowerInvariant()} too."));
        }

        return (member.Material.Family, basis.Kind) switch
        {
            (MaterialFamily.Aluminium, DesignBasisKind.Eurocode) => new(EurocodeAluminium.Bending(member, walls, stress, isWeldAffected), null),
            (MaterialFamily.Aluminium, _) => new(UsAluminium.Bending(member, walls, stress, basis.Kind, isWeldAffected), null),
            (_, DesignBasisKind.Eurocode) => SteelWalls.ByEurocode(member, walls, stress),
            _ => SteelWalls.ByAisc(member, walls, stress),
        };
    }

    internal static LocalBucklingResult Gap(string code, Sentence text) => new(null, new(code, text));
}
