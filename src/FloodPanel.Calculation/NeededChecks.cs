namespace FloodPanel.Calculation;

/// <summary>Names of the checks that a barrier needs before it can be called adequate, as written in files.</summary>
public static class NeededChecks
{
    /// <summary>Stop-logs: bending, shear, deflection.</summary>
    public const string Logs = "logs";

    /// <summary>Posts: bending, shear, deflection. Needed where there are posts.</summary>
    public const string Posts = "posts";

    /// <summary>Base plates of the posts. Needed where there are posts.</summary>
    public const string BasePlates = "base-plates";

    /// <summary>Anchors of base plates and guides.</summary>
    public const string Anchors = "anchors";

    /// <summary>Guides at both ends.</summary>
    public const string Guides = "guides";

    /// <summary>The wall that receives the guides.</summary>
    public const string SupportingWall = "supporting-wall";

    /// <summary>Height of the barrier above the design flood level. Always made here, never by others.</summary>
    public const string Freeboard = "freeboard";

    /// <summary>The checks that may be declared to be designed by others, in the order in which they are shown.</summary>
    public static ValueList<string> MayBeByOthers { get; } = [Logs, Posts, BasePlates, Anchors, Guides, SupportingWall];

    /// <summary>The name on screens and documents, "base plates".</summary>
    /// <param name="check">A name as written in files.</param>
    public static string Title(string check) => check.Replace('-', ' ');
}
