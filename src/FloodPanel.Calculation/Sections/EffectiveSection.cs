namespace FloodPanel.Calculation.Sections;

/// <summary>A section whose compressed face and compressed half of the webs count with less than their thickness.</summary>
/// <param name="RemovedFace">ΔA_f, area left out of the face [m²].</param>
/// <param name="RemovedWeb">ΔA_w, area left out of the webs [m²].</param>
/// <param name="Shift">Shift of the neutral axis away from the compressed face [m], ≥ 0.</param>
/// <param name="Inertia">I_eff about the shifted axis [m⁴].</param>
/// <param name="Modulus">W_eff for the compressed edge [m³].</param>
public readonly record struct EffectiveSection(double RemovedFace, double RemovedWeb, double Shift, double Inertia, double Modulus)
{
    /// <summary>The effective section.</summary>
    /// <param name="section">The full section.</param>
    /// <param name="walls">Its walls.</param>
    /// <param name="face">ρ_f, effective over full thickness of the face [-], above 0 and at most 1.</param>
    /// <param name="web">ρ_w, the same of the compressed half of the webs [-].</param>
    /// <remarks>
    /// Source: statics of plane areas; thickness is taken off evenly about the middle of the wall (EN 1999-1-1, 6.2.5.2). Limits:
    /// the compressed half of the webs is that of the full section, no iteration on the shift.
    /// </remarks>
    public static EffectiveSection Of(SectionProperties section, ThinWalls walls, double face, double web)
    {
        Guard.InRange(face, 0, 1);
        Guard.InRange(web, 0, 1);
        var (t, width, half) = (walls.FaceThickness, walls.FaceParts * walls.FacePart, walls.WebDepth / 2);
        var removedFace = (1 - face) * width * t;
        var removedWeb = (1 - web) * walls.Webs * walls.WebThickness * half;
        var (faceArm, webArm) = ((section.Depth - t) / 2, half / 2);
        var area = section.Area - removedFace - removedWeb;
        var shift = (removedFace * faceArm + removedWeb * webArm) / area;
        var inertia = section.Inertia
            - removedFace * faceArm * faceArm - width * t * t * t * (1 - face * face * face) / 12
            - removedWeb * (webArm * webArm + half * half / 12)
            - area * shift * shift;
        return new(removedFace, removedWeb, shift, inertia, inertia / (section.Depth / 2 + shift));
    }
}
