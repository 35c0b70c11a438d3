using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.Actions.Waves;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.Logs;
using FloodPanel.Calculation.Posts;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;

namespace FloodPanel.Calculation;

/// <summary>An opening resolved to the numbers that a load case needs. Base SI; heights from the sill.</summary>
public sealed class OpeningModel
{
    private readonly Member[] logs;
    private readonly double[] slopes;
    private readonly double[] logHeights;
    private LogStrength[]? logStrengths;

    /// <summary>Resolves an opening.</summary>
    /// <param name="site">Levels and water.</param>
    /// <param name="opening">An opening without problems, see <see cref="Validation"/>.</param>
    /// <param name="basis">The design basis.</param>
    /// <param name="library">The materials and profiles it may name.</param>
    public OpeningModel(Site site, Opening opening, DesignBasis basis, Library library)
    {
        var (stack, posts) = (opening.Barrier.Logs, opening.Barrier.Posts);
        (Site, Opening, Basis) = (site, opening, basis);
        Factors = basis.For(site.FloodZone);
        UnitWeight = Hydrostatic.UnitWeight(site.WaterDensity);
        RetainedDepth = FloodLevels.Depth(site.DesignFloodLevel, opening.SillLevel);

        // The same level on both sides may come with a micrometre of rounding: it must not turn into reverse head.
        var behind = FloodLevels.Depth(opening.ProtectedSideLevel ?? opening.SillLevel, opening.SillLevel);
        ProtectedDepth = Math.Max(0, Math.Min(behind, RetainedDepth));
        ClearWidth = opening.ClearWidth;
        Flow = opening.Actions.Flow;
        Wind = opening.Actions.Wind;
        Line = opening.Actions.Line;
        Rake = double.DegreesToRadians(opening.RakeDegrees);
        CosRake = Math.Cos(Rake);
        Runs = LogRun.Of(stack, basis, library);
        logs = [.. Runs.SelectMany(run => Enumerable.Repeat(run.Log, run.Count))];
        logHeights = [.. logs.Select(log => log.Section.Height)];
        slopes = Slopes(Runs);
        EndBearing = stack.EndBearing;
        Bays = opening.Barrier.Bays;
        if (posts is not null && Bays.Count > 1)
        {
            Post = Member.Of(posts.Material, posts.Profile, posts.DeflectionLimit, basis, library);
            PostWidth = posts.Width;
            PlateMaterial = opening.Barrier.BasePlate is { } plate ? library.Find(plate.Material) : null;
            Raker = posts.Raker is { } raker ? RakerModel.Of(raker, Rake, basis, library) : null;
        }

        GuideMaterial = opening.Barrier.Guides is { } guides ? library.Find(guides.Material) : null;
        var groundDepth = FloodLevels.Depth(site.DesignFloodLevel, opening.GroundLevel ?? opening.SillLevel);
        Wave = WaveModel.Of(opening.Actions.Wave, UnitWeight, RetainedDepth, groundDepth, Height);
        Debris = DebrisModel.Of(
            opening.Actions.Debris, [.. Runs.Select(run => run.Log)], UnitWeight, RetainedDepth, Height, [.. Bays.Select(bay => bay + EndBearing)]);
        Cases = CaseDiagram.CasesOf(this);
    }

    /// <summary>Levels and water.</summary>
    public Site Site { get; }

    /// <summary>The opening as entered.</summary>
    public Opening Opening { get; }

    /// <summary>The design basis.</summary>
    public DesignBasis Basis { get; }

    /// <summary>The load cases of the opening, in the order in which they are shown.</summary>
    public ValueList<CaseKind> Cases { get; }

    /// <summary>Load factors of the basis in the flood zone.</summary>
    public LoadFactors Factors { get; }

    /// <summary>γ, unit weight of water [N/m³].</summary>
    public double UnitWeight { get; }

    /// <summary>h, design flood level less sill level [m]; negative when the sill stays dry.</summary>
    public double RetainedDepth { get; }

    /// <summary>h', depth of water on the protected side [m], ≥ 0, and no more than h where there is any.</summary>
    public double ProtectedDepth { get; }

    /// <summary>Clear width of the opening [m].</summary>
    public double ClearWidth { get; }

    /// <summary>Moving water, or null.</summary>
    public FlowInput? Flow { get; }

    /// <summary>Waves, or null.</summary>
    public WaveModel? Wave { get; }

    /// <summary>Floating debris, or null.</summary>
    public DebrisModel? Debris { get; }

    /// <summary>Wind on the dry barrier, or null.</summary>
    public WindInput? Wind { get; }

    /// <summary>A line load on the dry barrier, or null.</summary>
    public LineInput? Line { get; }

    /// <summary>θ, angle of the face from the vertical [rad].</summary>
    public double Rake { get; }

    /// <summary>cos θ [-].</summary>
    public double CosRake { get; }

    /// <summary>The groups of equal logs, the lowest first.</summary>
    public IReadOnlyList<LogRun> Runs { get; }

    /// <summary>Number of logs in a stack [-].</summary>
    public int LogCount => logs.Length;

    /// <summary>Height of each log along the face, the lowest first [m].</summary>
    public ReadOnlySpan<double> LogHeights => logHeights;

    /// <summary>A log of the stack.</summary>
    /// <param name="index">Position in the stack from 0.</param>
    public Member LogMember(int index) => logs[index];

    /// <summary>What a log resists besides bending and shear; worked out when first asked for.</summary>
    internal LogStrength LogStrength(int index)
    {
        logStrengths ??= [.. Runs.SelectMany(run =>
            Enumerable.Repeat(new LogStrength(run.Log, Opening.Barrier.Logs, Basis), run.Count))];
        return logStrengths[index];
    }

    /// <summary>e, length of log that bears at each end [m].</summary>
    public double EndBearing { get; }

    /// <summary>Clear bays from left to right [m].</summary>
    public ValueList<double> Bays { get; }

    /// <summary>The posts; null when there is one bay.</summary>
    public Member? Post { get; }

    /// <summary>The raker of each post; null when there is none.</summary>
    public RakerModel? Raker { get; }

    /// <summary>Material of the base plates; null when there are none.</summary>
    public Material? PlateMaterial { get; }

    /// <summary>Width of a post across the opening [m].</summary>
    public double PostWidth { get; }

    /// <summary>What the guides are made of; null where none are entered.</summary>
    public Material? GuideMaterial { get; }

    /// <summary>Number of posts [-].</summary>
    public int PostCount => Bays.Count - 1;

    /// <summary>Length of the barrier along its face [m].</summary>
    public double FaceLength => slopes[LogCount];

    /// <summary>H, vertical height of the barrier [m].</summary>
    public double Height => FaceLength * CosRake;

    /// <summary>Height z of the lower edge of a log [m].</summary>
    /// <param name="index">Position in the stack from 0; the count of logs gives the top of the barrier.</param>
    public double EdgeHeight(int index) => slopes[index] * CosRake;

    /// <summary>The log that stands at a height, from 0: bottom ≤ z below its top; the top log at the top of the barrier.</summary>
    /// <param name="z">Height above the sill [m], 0 to <see cref="Height"/>.</param>
    public int LogAt(double z)
    {
        var index = 0;
        while (index < LogCount - 1 && z >= EdgeHeight(index + 1))
        {
            index++;
        }

        return index;
    }

    /// <summary>L, effective span of a bay: clear bay and one end bearing [m].</summary>
    /// <param name="bay">Bay from 0.</param>
    public double Span(int bay) => Bays[bay] + EndBearing;

    /// <summary>Width of face that loads a post: half of each clear bay beside it and its own width [m].</summary>
    /// <param name="post">Post from 0.</param>
    public double PostTributary(int post) => (Bays[post] + Bays[post + 1]) / 2 + PostWidth;

    /// <summary>Width of face that loads a guide: half of the clear bay and the end bearing [m].</summary>
    /// <param name="bay">Bay from 0, the first or the last.</param>
    public double GuideTributary(int bay) => Bays[bay] / 2 + EndBearing;

    /// <summary>Distance of each joint from the sill along the face; multiplied where logs are equal, so that no rounding adds up.</summary>
    private static double[] Slopes(IReadOnlyList<LogRun> runs)
    {
        var slopes = new double[1 + runs.Sum(run => run.Count)];
        var (next, from) = (0, 0.0);
        foreach (var (_, count, log) in runs)
        {
            for (var i = 1; i <= count; i++)
            {
                slopes[next + i] = from + i * log.Section.Height;
            }

            (next, from) = (next + count, slopes[next + count]);
        }

        return slopes;
    }
}
