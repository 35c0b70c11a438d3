namespace FloodPanel.Calculation.Cases;

/// <summary>A named set of actions that act together.</summary>
public enum CaseKind
{
    /// <summary>Still water at the design flood level, and flow.</summary>
    DesignFlood,

    /// <summary>Still water and waves; flow too unless the wave method already includes it.</summary>
    Wave,

    /// <summary>The design flood and the impact of floating debris.</summary>
    Debris,

    /// <summary>Still water at the top of the barrier, the protected side dry.</summary>
    BrimFull,

    /// <summary>Wind alone on the dry barrier.</summary>
    Wind,

    /// <summary>A line load alone on the dry barrier.</summary>
    Line,
}

/// <summary>Names of the cases.</summary>
public static class CaseNames
{
    /// <summary>The name in files, "design-flood".</summary>
    /// <param name="kind">The case.</param>
    public static string InFiles(CaseKind kind) => kind switch
    {
        CaseKind.DesignFlood => "design-flood",
        CaseKind.Wave => "wave",
        CaseKind.Debris => "debris",
        CaseKind.BrimFull => "brim-full",
        CaseKind.Wind => "wind",
        CaseKind.Line => "line",
        _ => throw new ArgumentOutOfRangeException(nameof(kind), kind, "is not a case"),
    };

    /// <summary>The name in sentences, "design flood".</summary>
    /// <param name="name">The name in files.</param>
    public static string InWords(string name) => name switch
    {
        "brim-full" => "brim-full",
        "line" => "line load",
        _ => name.Replace('-', ' '),
    };
}
