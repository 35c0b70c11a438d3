namespace FloodPanel.Calculation.ProjectTree;

/// <summary>The stop-logs, posts and declarations that close an opening.</summary>
public sealed record Barrier
{
    /// <summary>The stack of stop-logs, the same in each bay.</summary>
    public LogStack Logs { get; init; } = new();

    /// <summary>Clear width of each bay from left to right [m], seen from the flood side; posts stand between them.</summary>
    public ValueList<double> Bays { get; init; } = [];

    /// <summary>The posts between the bays; null when there is one bay.</summary>
    public PostSet? Posts { get; init; }

    /// <summary>The plate under each post; null when there is none to be checked here.</summary>
    public BasePlateInput? BasePlate { get; init; }

    /// <summary>The anchors of each base plate; null where nobody has entered them.</summary>
    public AnchorInput? Anchors { get; init; }

    /// <summary>The guides at both ends; null where nobody has entered them.</summary>
    public GuideSet? Guides { get; init; }

    /// <summary>A footing or sill beam under the barrier, or null.</summary>
    public FootingInput? Footing { get; init; }

    /// <summary>Checks declared to be made by somebody else.</summary>
    public ValueList<DesignedByOthers> ByOthers { get; init; } = [];
}

/// <summary>A stack of stop-logs: equal ones, and beneath them groups of others where the water presses harder.</summary>
public sealed record LogStack
{
    /// <summary>What the logs are made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>Cross-section of a log; height along the stack, depth in the direction of the water.</summary>
    public ProfileChoice Profile { get; init; } = new Rectangle();

    /// <summary>Number of these logs [-], 1 to 100; with those beneath, no more than 100.</summary>
    public int Count { get; init; } = 1;

    /// <summary>Length of log that bears at each end [m], > 0.</summary>
    public double EndBearing { get; init; } = 0.04;

    /// <summary>n in the deflection limit span / n [-], > 0.</summary>
    public double DeflectionLimit { get; init; } = 200;

    /// <summary>Total end play taken off the cutting length so that the log slides into its guides [m], ≥ 0.</summary>
    public double FittingClearance { get; init; } = 0.01;

    /// <summary>True when no water gets inside a hollow log: it floats more than one that fills.</summary>
    public bool Sealed { get; init; } = true;

    /// <summary>q_seal, upward push of the bottom seal per length [N/m], ≥ 0.</summary>
    public double SealPreload { get; init; }

    /// <summary>Other logs beneath these, the lowest group first; none where all are equal.</summary>
    public ValueList<LogGroup> Below { get; init; } = [];

    /// <summary>Joints between logs and seals at their ends; null where tightness is not checked.</summary>
    public LogJoint? Joint { get; init; }

    /// <summary>What timber logs endure; null leaves the factor of the design basis as it is.</summary>
    public TimberService? Timber { get; init; }

    /// <summary>Factors on composite logs; null where none are chosen, so that only typed stresses count.</summary>
    public CompositeService? Composite { get; init; }

    /// <summary>Number of logs in the whole stack [-].</summary>
    public int TotalCount => Count + Below.Sum(group => group.Count);

    /// <summary>The groups of equal logs from the bottom, these logs last.</summary>
    public IEnumerable<LogGroup> Groups => Below.Append(new LogGroup { Material = Material, Profile = Profile, Count = Count });
}

/// <summary>Equal logs that follow each other in a stack.</summary>
public sealed record LogGroup
{
    /// <summary>What the logs are made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>Cross-section of a log; height along the stack, depth in the direction of the water.</summary>
    public ProfileChoice Profile { get; init; } = new Rectangle();

    /// <summary>Number of logs [-], 1 to 100.</summary>
    public int Count { get; init; } = 1;
}

/// <summary>The posts between bays, all alike.</summary>
public sealed record PostSet
{
    /// <summary>What the posts are made of.</summary>
    public MaterialChoice Material { get; init; } = new Material();

    /// <summary>Cross-section of a post; height across the opening, depth in the direction of the water.</summary>
    public ProfileChoice Profile { get; init; } = new RectangularTube();

    /// <summary>Width that a post takes out of the opening [m], > 0.</summary>
    public double Width { get; init; } = 0.1;

    /// <summary>n in the deflection limit post length / n [-], > 0.</summary>
    public double DeflectionLimit { get; init; } = 100;

    /// <summary>True when a post of aluminium is welded at its base, where it then has the strength beside a weld only.</summary>
    public bool WeldedBase { get; init; }

    /// <summary>A strut on the dry side of each post; null when there is none.</summary>
    public RakerInput? Raker { get; init; }
}

/// <summary>A needed check that somebody else makes.</summary>
/// <param name="Check">Name of the check, one of <see cref="NeededChecks"/>.</param>
/// <param name="Name">Who designs it; empty until known.</param>
/// <param name="Reference">Their drawing or calculation; empty until known.</param>
public sealed record DesignedByOthers(string Check, string Name, string Reference);
