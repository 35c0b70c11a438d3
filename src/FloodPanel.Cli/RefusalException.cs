namespace FloodPanel.Cli;

/// <summary>Why nothing can be calculated, in one sentence for standard error.</summary>
internal sealed class RefusalException(string message) : Exception(message);
