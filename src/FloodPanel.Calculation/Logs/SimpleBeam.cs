namespace FloodPanel.Calculation.Logs;

/// <summary>A simply supported beam of span L under a uniform line load w or a force P.</summary>
public static class SimpleBeam
{
    /// <summary>Source of the formulas, as printed.</summary>
    public const string Source = "Beam statics, simply supported, uniform load";

    /// <summary>M = w·L²/8, moment at mid-span [N·m].</summary>
    /// <param name="lineLoad">w [N/m].</param>
    /// <param name="span">L [m].</param>
    public static double Moment(double lineLoad, double span) => lineLoad * span * span / 8;

    /// <summary>V = w·L/2, shear force at the support [N].</summary>
    /// <param name="lineLoad">w [N/m].</param>
    /// <param name="span">L [m].</param>
    public static double Shear(double lineLoad, double span) => lineLoad * span / 2;

    /// <summary>δ = 5·w·L⁴/(384·E·I), deflection at mid-span [m]; shear deformation not included.</summary>
    /// <param name="lineLoad">w [N/m].</param>
    /// <param name="span">L [m].</param>
    /// <param name="stiffness">E·I [N·m²], > 0.</param>
    public static double Deflection(double lineLoad, double span, double stiffness) =>
        5 * lineLoad * span * span * span * span / (384 * stiffness);

    /// <summary>θ = w·L³/(24·E·I), rotation at the support [rad].</summary>
    /// <param name="lineLoad">w [N/m].</param>
    /// <param name="span">L [m].</param>
    /// <param name="stiffness">E·I [N·m²], > 0.</param>
    public static double EndRotation(double lineLoad, double span, double stiffness) =>
        lineLoad * span * span * span / (24 * stiffness);

    /// <summary>θ = P·L²/(16·E·I), rotation at the support under a force at mid-span [rad].</summary>
    /// <param name="force">P [N].</param>
    /// <param name="span">L [m].</param>
    /// <param name="stiffness">E·I [N·m²], > 0.</param>
    public static double PointEndRotation(double force, double span, double stiffness) =>
        force * span * span / (16 * stiffness);

    /// <summary>M = P·L/4, moment at mid-span under a force there [N·m].</summary>
    /// <param name="force">P [N].</param>
    /// <param name="span">L [m].</param>
    public static double PointMoment(double force, double span) => force * span / 4;

    /// <summary>δ = P·L³/(48·E·I), deflection at mid-span under a force there [m]; shear deformation not included.</summary>
    /// <param name="force">P [N].</param>
    /// <param name="span">L [m].</param>
    /// <param name="stiffness">E·I [N·m²], > 0.</param>
    public static double PointDeflection(double force, double span, double stiffness) =>
        force * span * span * span / (48 * stiffness);
}
