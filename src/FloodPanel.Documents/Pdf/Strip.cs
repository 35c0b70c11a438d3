namespace FloodPanel.Documents.Pdf;

/// <summary>A part of a page that is never split.</summary>
/// <param name="Height">Height [mm].</param>
/// <param name="Draw">Draws it with its upper edge at a height on the page [mm].</param>
internal sealed record Strip(double Height, Action<Canvas, double> Draw)
{
    /// <summary>Blank space above it, left out at the head of a page [mm].</summary>
    public double SpaceBefore { get; init; }

    /// <summary>True when it must not stand last on a page.</summary>
    public bool StaysWithNext { get; init; }

    /// <summary>What is drawn above it when it stands first on a page: the head of its table.</summary>
    public Strip? Head { get; init; }
}

/// <summary>A strip and where it stands on its page [mm].</summary>
internal readonly record struct Placed(Strip Strip, double Top);
