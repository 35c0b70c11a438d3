using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests;

/// <summary>Short ways to say a piece of pressure and a member of a given stiffness.</summary>
internal static class Stretch
{
    /// <summary>A diagram of one unfactored piece.</summary>
    public static PressureDiagram Of(double bottom, double top, double atBottom, double atTop) =>
        PressureDiagram.Of(new PressurePiece(bottom, top, atBottom, atTop, 1));

    /// <summary>A member of stiffness E·I and nothing else known.</summary>
    public static Member Beam(double elasticModulus, double inertia, double deflectionLimit = 100) => new(
        new Material { Density = 7850, ElasticModulus = elasticModulus },
        new Rectangle { Height = 0.1, Depth = 0.1 },
        new SectionProperties(0.1, 0.1, 0.002, inertia, 2 * inertia / 0.1, 2.3 * inertia / 0.1, 0.001),
        null,
        null,
        deflectionLimit);
}
