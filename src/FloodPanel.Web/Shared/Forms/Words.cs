using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Shared.Forms;

/// <summary>What the choices of the project are called on screens.</summary>
public static class Words
{
    /// <summary>Name of a wall.</summary>
    public static string Of(WallKind wall) => wall switch
    {
        WallKind.ReinforcedConcrete => "Reinforced concrete",
        WallKind.Masonry => "Masonry",
        WallKind.CavityMasonry => "Cavity masonry",
        WallKind.TimberFrame => "Timber frame",
        WallKind.SteelFrame => "Steel frame",
        _ => throw new ArgumentOutOfRangeException(nameof(wall), wall, null),
    };

    /// <summary>Name of a ground.</summary>
    public static string OfSoil(CreepSoil soil) => soil switch
    {
        CreepSoil.VeryFineSandOrSilt => "Very fine sand or silt",
        CreepSoil.FineSand => "Fine sand",
        CreepSoil.MediumSand => "Medium sand",
        CreepSoil.CoarseSand => "Coarse sand",
        CreepSoil.FineGravel => "Fine gravel",
        CreepSoil.MediumGravel => "Medium gravel",
        CreepSoil.CoarseGravel => "Coarse gravel with cobbles",
        CreepSoil.Boulders => "Boulders, cobbles, gravel",
        CreepSoil.SoftClay => "Soft clay",
        CreepSoil.MediumClay => "Medium clay",
        CreepSoil.HardClay => "Hard clay",
        CreepSoil.Hardpan => "Hardpan",
        _ => throw new ArgumentOutOfRangeException(nameof(soil), soil, null),
    };

    /// <summary>Name of a material family.</summary>
    public static string Of(MaterialFamily family) => family switch
    {
        MaterialFamily.Aluminium => "Aluminium",
        MaterialFamily.Steel => "Steel",
        MaterialFamily.Timber => "Timber",
        MaterialFamily.Composite => "Composite",
        _ => throw new ArgumentOutOfRangeException(nameof(family), family, null),
    };

    /// <summary>Name of a design basis.</summary>
    public static string Of(DesignBasisKind basis) => basis switch
    {
        DesignBasisKind.AllowableStress => "Allowable stress",
        DesignBasisKind.UsStrength => "US strength design",
        DesignBasisKind.Eurocode => "Eurocode",
        _ => throw new ArgumentOutOfRangeException(nameof(basis), basis, null),
    };

    /// <summary>Name of a flood zone.</summary>
    public static string Of(FloodZone zone) => zone switch
    {
        FloodZone.Inland => "Inland",
        FloodZone.CoastalA => "Coastal A",
        FloodZone.CoastalHighHazard => "Coastal high hazard",
        _ => throw new ArgumentOutOfRangeException(nameof(zone), zone, null),
    };

    /// <summary>Name of a system of units.</summary>
    public static string Of(UnitSystem units) => units switch
    {
        UnitSystem.SI => "SI",
        UnitSystem.USCustomary => "US",
        _ => throw new ArgumentOutOfRangeException(nameof(units), units, null),
    };

    /// <summary>The verdict in a word.</summary>
    public static string Of(VerdictKind verdict) => verdict switch
    {
        VerdictKind.Adequate => "Adequate",
        VerdictKind.Inadequate => "Inadequate",
        VerdictKind.Incomplete => "Incomplete",
        _ => throw new ArgumentOutOfRangeException(nameof(verdict), verdict, null),
    };

    /// <summary>Name of an action.</summary>
    public static string Of(ActionKind action) => action switch
    {
        ActionKind.Hydrostatic => "Still water",
        ActionKind.Flow => "Flow",
        ActionKind.Wave => "Waves",
        ActionKind.Debris => "Debris",
        ActionKind.Wind => "Wind",
        ActionKind.Line => "Line load",
        _ => throw new ArgumentOutOfRangeException(nameof(action), action, null),
    };

    /// <summary>Name of the shape of a profile.</summary>
    public static string Of(Profile profile) => OfShape(profile.GetType());

    /// <summary>Name of a shape, by its type.</summary>
    public static string OfShape(Type shape) => shape.Name switch
    {
        nameof(Rectangle) => "Rectangle",
        nameof(HollowRectangle) => "Hollow, with webs",
        nameof(RectangularTube) => "Rectangular tube",
        nameof(ISection) => "I-section",
        nameof(GivenProperties) => "Given properties",
        _ => throw new ArgumentOutOfRangeException(nameof(shape), shape, null),
    };

    /// <summary>The check without its member: "bending" of "log-bending".</summary>
    public static string CheckOnly(string name) => name[(name.IndexOf('-') + 1)..].Replace('-', ' ');

    /// <summary>Name of a load case, by its name in files.</summary>
    public static string OfCase(string name) => Capitalised(CaseNames.InWords(name));

    /// <summary>A name of the file format, "design-flood", as words, "Design flood".</summary>
    public static string FromName(string name) => Capitalised(name.Replace('-', ' '));

    private static string Capitalised(string words) =>
        words.Length == 0 ? "" : char.ToUpperInvariant(words[0]) + words[1..];
}
