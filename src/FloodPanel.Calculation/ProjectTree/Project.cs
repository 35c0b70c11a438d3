namespace FloodPanel.Calculation.ProjectTree;

/// <summary>Everything the user has said about one job: the only input of the calculation, and what is stored.</summary>
public sealed record Project
{
    /// <summary>Name of the job, not empty.</summary>
    public string Name { get; init; } = "";

    /// <summary>The office's own reference for the job.</summary>
    public string Reference { get; init; } = "";

    /// <summary>Who the job is for.</summary>
    public string Client { get; init; } = "";

    /// <summary>Where the building stands.</summary>
    public string Address { get; init; } = "";

    /// <summary>The engineer responsible, as printed over the signature line.</summary>
    public string Engineer { get; init; } = "";

    /// <summary>The rule set for factors on loads and strengths.</summary>
    public DesignBasisKind DesignBasis { get; init; } = DesignBasisKind.AllowableStress;

    /// <summary>A copy of a design basis, edited for this project; null where the standard one applies.</summary>
    public DesignBasis? OwnBasis { get; init; }

    /// <summary>Ids of library entries whose figures, marked as from memory, the user has checked and confirmed.</summary>
    public ValueList<string> Confirmed { get; init; } = [];

    /// <summary>Levels and water.</summary>
    public Site Site { get; init; } = new();

    /// <summary>The gaps to be closed.</summary>
    public ValueList<Opening> Openings { get; init; } = [];

    /// <summary>Plates over vents, hatches and odd gaps.</summary>
    public ValueList<Cover> Covers { get; init; } = [];
}

/// <summary>The rule set for factors on loads and strengths.</summary>
public enum DesignBasisKind
{
    /// <summary>Allowable stress design: service loads against reduced strengths.</summary>
    AllowableStress,

    /// <summary>US strength design (load and resistance factors).</summary>
    UsStrength,

    /// <summary>Eurocode partial factors.</summary>
    Eurocode,
}
