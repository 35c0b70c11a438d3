using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Sections;

/// <summary>Slenderness limits of a flat part of aluminium over ε, and the constants of its effective thickness.</summary>
/// <param name="Beta1">β₁/ε, limit of class 1 [-].</param>
/// <param name="Beta2">β₂/ε, limit of class 2 [-].</param>
/// <param name="Beta3">β₃/ε, limit of class 3 [-].</param>
/// <param name="C1">C₁ of the effective thickness [-].</param>
/// <param name="C2">C₂ of the effective thickness [-].</param>
/// <remarks>Source: EN 1999-1-1:2007, Tables 6.2 and 6.3 (from memory; ρ_c is exactly 1 at β₃ in all eight rows).</remarks>
public sealed record EurocodeSlenderness(double Beta1, double Beta2, double Beta3, double C1, double C2)
{
    /// <summary>The row of a part.</summary>
    /// <param name="buckling">Buckling class of the alloy.</param>
    /// <param name="isWelded">True beside a weld.</param>
    /// <param name="isOutstand">True for a part held at one edge.</param>
    public static EurocodeSlenderness Of(BucklingClass buckling, bool isWelded, bool isOutstand) => (buckling, isWelded, isOutstand) switch
    {
        (BucklingClass.A, false, false) => new(11, 16, 22, 32, 220),
        (BucklingClass.A, true, false) => new(9, 13, 18, 29, 198),
        (BucklingClass.B, false, false) => new(13, 16.5, 18, 29, 198),
        (BucklingClass.B, true, false) => new(10, 13.5, 15, 25, 150),
        (BucklingClass.A, false, true) => new(3, 4.5, 6, 10, 24),
        (BucklingClass.A, true, true) => new(2.5, 4, 5, 9, 20),
        (BucklingClass.B, false, true) => new(3.5, 4.5, 5, 9, 20),
        _ => new(3, 3.5, 4, 8, 16),
    };

    /// <summary>Class of a part, 1 to 4.</summary>
    /// <param name="relative">β/ε [-], ≥ 0.</param>
    public int Class(double relative) => relative <= Beta1 ? 1 : relative <= Beta2 ? 2 : relative <= Beta3 ? 3 : 4;

    /// <summary>ρ_c = C₁/(β/ε) − C₂/(β/ε)², effective over full thickness; 1 up to class 3.</summary>
    /// <param name="relative">β/ε [-], ≥ 0.</param>
    /// <returns>ρ_c [-], above 0 and at most 1.</returns>
    public double EffectiveThickness(double relative)
    {
        Guard.NonNegative(relative);
        return Class(relative) < 4 ? 1 : C1 / relative - C2 / (relative * relative);
    }
}
