using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Drawings;

/// <summary>
/// Names by which the marks of a drawing say which field of the project file sets them: the leaf of its path, with
/// its parent before it where the leaf alone is not unique.
/// </summary>
public static class FieldKeys
{
    /// <summary>Clear width of the opening.</summary>
    public static string ClearWidth => Fields.ClearWidth.Key;

    /// <summary>Clear height of the opening.</summary>
    public static string ClearHeight => Fields.ClearHeight.Key;

    /// <summary>Sill level.</summary>
    public static string SillLevel => Fields.SillLevel.Key;

    /// <summary>Outside ground level.</summary>
    public static string GroundLevel => Fields.GroundLevel.Key;

    /// <summary>Water level on the protected side.</summary>
    public static string ProtectedSideLevel => Fields.ProtectedSideLevel.Key;

    /// <summary>Rake.</summary>
    public static string Rake => Fields.Rake.Key;

    /// <summary>Number of logs.</summary>
    public static string LogCount => Fields.LogCount.Key;

    /// <summary>Depth of a log in the direction of the water.</summary>
    public static string LogDepth => "logs.profile.depth";

    /// <summary>Width of a post.</summary>
    public static string PostWidth => "posts.width";

    /// <summary>Design still-water level of the site.</summary>
    public static string DesignStillWaterLevel => Fields.DesignStillWaterLevel.Key;

    /// <summary>Freeboard of the site.</summary>
    public static string Freeboard => Fields.Freeboard.Key;

    /// <summary>Clear width of a bay, "bays[0]" for the first from the left.</summary>
    /// <param name="index">Bay from the left, from 0.</param>
    public static string Bay(int index) => FormattableString.Invariant($"{Fields.BayWidth.Key}[{index}]");
}
