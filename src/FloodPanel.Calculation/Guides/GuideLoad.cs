using FloodPanel.Calculation.Actions;

namespace FloodPanel.Calculation.Guides;

/// <summary>Design load on a guide along its length: each log presses evenly over its height.</summary>
public sealed class GuideLoad
{
    private readonly double[] edges;
    private readonly double[] steady;
    private readonly double[] impacts;

    private GuideLoad(double[] edges, double[] steady, double[] impacts, double force) =>
        (this.edges, this.steady, this.impacts, Force) = (edges, steady, impacts, force);

    /// <summary>Number of logs [-].</summary>
    public int LogCount => steady.Length;

    /// <summary>H, length of the guide along the face [m].</summary>
    public double Length => edges[^1];

    /// <summary>F, design force of debris, which strikes once [N]; 0 without debris.</summary>
    public double Force { get; }

    /// <summary>n = w·(b/2 + e)/t of each log, with the share P/t of an impact beside it.</summary>
    /// <param name="logLoads">w, line load of each log from the bottom [N/m].</param>
    /// <param name="tributary">b/2 + e, half of the clear bay and the end bearing [m].</param>
    /// <param name="logHeights">t, height of each log along the guide [m], > 0.</param>
    /// <param name="impact">Debris, or nothing.</param>
    public static GuideLoad Of(
        ReadOnlySpan<FactoredLoad> logLoads, double tributary, ReadOnlySpan<double> logHeights, GuideImpact impact = default)
    {
        var edges = new double[logLoads.Length + 1];
        var (steady, impacts) = (new double[logLoads.Length], new double[logLoads.Length]);
        for (var log = 0; log < logLoads.Length; log++)
        {
            edges[log + 1] = edges[log] + logHeights[log];
            steady[log] = logLoads[log].Design * tributary / logHeights[log];
            impacts[log] = impact.On(log, logHeights[log]) / logHeights[log];
        }

        return new(edges, steady, impacts, impact.Force);
    }

    /// <summary>Distance of a log's lower edge from the lower end [m]; the count of logs gives the top.</summary>
    /// <param name="log">From the bottom, from 0.</param>
    public double Edge(int log) => edges[log];

    /// <summary>True where debris may strike the log.</summary>
    /// <param name="log">From the bottom, from 0.</param>
    public bool IsStruck(int log) => impacts[log] != 0;

    /// <summary>l, length of a log that lies within a stretch [m], ≥ 0.</summary>
    /// <param name="log">From the bottom, from 0.</param>
    /// <param name="from">Lower end of the stretch [m].</param>
    /// <param name="to">Upper end of the stretch [m].</param>
    public double Within(int log, double from, double to) => Math.Max(0, Math.Min(to, edges[log + 1]) - Math.Max(from, edges[log]));

    /// <summary>R = Σ n·l + min(F, Σ P·l/t), load on a stretch [N]: the steady line load integrated, and debris where it presses hardest on it.</summary>
    /// <param name="from">Lower end of the stretch [m].</param>
    /// <param name="to">Upper end of the stretch [m].</param>
    public double Over(double from, double to)
    {
        var (sum, struck) = (0.0, 0.0);
        for (var log = 0; log < steady.Length; log++)
        {
            var length = Within(log, from, to);
            sum += steady[log] * length;
            struck += impacts[log] * length;
        }

        return sum + Math.Min(Force, struck);
    }
}
