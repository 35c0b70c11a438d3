using FloodPanel.Calculation.Materials;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Logs;

/// <summary>What a log resists besides bending and shear as a beam; the same under each load case.</summary>
internal sealed class LogStrength
{
    public LogStrength(Member log, LogStack stack, DesignBasis basis)
    {
        (Log, Joint) = (log, stack.Joint);
        Bearing = stack.EndBearing - stack.FittingClearance;
        (EndBearing, Clearance) = (stack.EndBearing, stack.FittingClearance);
        Walls = ThinWalls.Of(log.Profile);
        Buckling = LocalBuckling.Of(log, basis);
        Seat = SeatResistance.Of(log, basis, Bearing);
        Across = LogStress.Across(log.Material, stack, basis);
        AcrossSource = $"Contact area alone, no spread; {Across?.Source}";
        Cross = LogStress.Cross(log.Material, stack);
        Combined = basis.Kind == DesignBasisKind.Eurocode && log.Material.Family == MaterialFamily.Aluminium ? 1.2 : 1;
    }

    public Member Log { get; }

    public LogJoint? Joint { get; }

    /// <summary>Flat parts; null for a solid log or one given by its properties.</summary>
    public ThinWalls? Walls { get; }

    public LocalBucklingResult Buckling { get; }

    /// <summary>Webs at the end; null where they are not to be checked.</summary>
    public SeatResistance? Seat { get; }

    /// <summary>Timber across the grain, or null.</summary>
    public DesignStress? Across { get; }

    /// <summary>Source of <see cref="Across"/>, as printed.</summary>
    public string AcrossSource { get; }

    /// <summary>Composite across its fibres, or null.</summary>
    public DesignStress? Cross { get; }

    /// <summary>C, square of the ratio of combined stress to f that local yielding allows [-] (EN 1999-1-1, 6.2.1: 1.2, from memory; else 1).</summary>
    public double Combined { get; }

    public double EndBearing { get; }

    public double Clearance { get; }

    /// <summary>N = e − c, what bears when the log is pushed to its other end [m].</summary>
    public double Bearing { get; }
}
