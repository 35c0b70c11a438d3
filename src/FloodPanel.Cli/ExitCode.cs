namespace FloodPanel.Cli;

/// <summary>What the program returns to its caller.</summary>
internal static class ExitCode
{
    /// <summary>Every opening is adequate.</summary>
    public const int Adequate = 0;

    /// <summary>An opening is inadequate or incomplete, or there is none.</summary>
    public const int NotAdequate = 1;

    /// <summary>Nothing could be calculated; one line on standard error says why.</summary>
    public const int Refused = 2;
}
