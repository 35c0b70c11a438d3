namespace FloodPanel.Calculation.Logs;

/// <summary>Where a log stands and what it feels.</summary>
/// <param name="Response">What the log feels.</param>
/// <param name="ClearBay">b, clear width of the bay [m].</param>
/// <param name="EndBearing">e, length of log that bears at each end [m].</param>
/// <param name="Log">The log.</param>
public record LogSetting(LogResponse Response, double ClearBay, double EndBearing, Member Log)
{
    /// <summary>L = b + e, effective span [m].</summary>
    public double Span => ClearBay + EndBearing;
}
