using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Logs;

/// <summary>What a log feels and how far that goes towards what it may carry.</summary>
/// <param name="LineLoad">w, design line load [N/m].</param>
/// <param name="Moment">M, design moment at mid-span [N·m].</param>
/// <param name="Shear">V, design shear force at the support [N].</param>
/// <param name="Deflection">δ, unfactored deflection at mid-span [m].</param>
/// <param name="Bending">Utilisation in bending [-]; 0 when the stress is missing, see <see cref="Member.IsComplete"/>.</param>
/// <param name="ShearUse">Utilisation in shear [-]; 0 when the stress is missing.</param>
/// <param name="DeflectionUse">Utilisation of the deflection limit [-].</param>
public readonly record struct LogResponse(
    double LineLoad,
    double Moment,
    double Shear,
    double Deflection,
    double Bending,
    double ShearUse,
    double DeflectionUse)
{
    /// <summary>The response of a simply supported log under a uniform line load.</summary>
    /// <param name="load">Line load [N/m].</param>
    /// <param name="span">L, effective span [m], > 0.</param>
    /// <param name="log">The log.</param>
    public static LogResponse Of(FactoredLoad load, double span, Member log)
    {
        var moment = SimpleBeam.Moment(load.Design, span);
        var shear = SimpleBeam.Shear(load.Design, span);
        var deflection = SimpleBeam.Deflection(load.Characteristic, span, log.Stiffness);
        return new(
            load.Design,
            moment,
            shear,
            deflection,
            moment / log.MomentResistance,
            shear / log.ShearResistance,
            deflection / (span / log.DeflectionLimit));
    }
}
