using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Logs;

/// <summary>What a log feels and how far that goes towards what it may carry.</summary>
/// <param name="Load">w, line load, spread evenly [N/m].</param>
/// <param name="Point">P, share of a debris impact [N]; at mid-span for the moment, at the support for the shear.</param>
/// <param name="Moment">M, design moment at mid-span [N·m].</param>
/// <param name="Shear">V, design shear force at the support [N].</param>
/// <param name="Deflection">δ, unfactored deflection at mid-span [m].</param>
/// <param name="Bending">Utilisation in bending [-]; 0 when the stress is missing, see <see cref="Member.IsComplete"/>.</param>
/// <param name="ShearUse">Utilisation in shear [-]; 0 when the stress is missing.</param>
/// <param name="DeflectionUse">Utilisation of the deflection limit [-]; 0 when deflection is not judged.</param>
public readonly record struct LogResponse(
    FactoredLoad Load,
    FactoredLoad Point,
    double Moment,
    double Shear,
    double Deflection,
    double Bending,
    double ShearUse,
    double DeflectionUse)
{
    /// <summary>w, design line load [N/m].</summary>
    public double LineLoad => Load.Design;

    /// <summary>The response of a simply supported log.</summary>
    /// <param name="load">w, line load [N/m].</param>
    /// <param name="span">L, effective span [m], > 0.</param>
    /// <param name="log">The log.</param>
    /// <param name="point">P, share of a debris impact [N].</param>
    /// <param name="judgesDeflection">False where the deflection is reported and not judged.</param>
    public static LogResponse Of(
        FactoredLoad load, double span, Member log, FactoredLoad point = default, bool judgesDeflection = true)
    {
        var moment = SimpleBeam.Moment(load.Design, span) + SimpleBeam.PointMoment(point.Design, span);
        var shear = SimpleBeam.Shear(load.Design, span) + point.Design;
        var deflection = SimpleBeam.Deflection(load.Characteristic, span, log.Stiffness)
            + SimpleBeam.PointDeflection(point.Characteristic, span, log.Stiffness);
        return new(
            load,
            point,
            moment,
            shear,
            deflection,
            moment / log.MomentResistance,
            shear / log.ShearResistance,
            judgesDeflection ? deflection / (span / log.DeflectionLimit) : 0);
    }
}
