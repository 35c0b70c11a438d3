namespace FloodPanel.Web.Shared.Results;

/// <summary>Which figure of a page has its working open. The page cascades one; the figures on it open themselves.</summary>
public sealed class OpenFigure
{
    /// <summary>The figure that is open; null when none is.</summary>
    public FigureKey? Key { get; private set; }

    /// <summary>Raised when another figure is opened, or the open one is closed.</summary>
    public event Action? Changed;

    /// <summary>Opens a figure; closes it when it is open already.</summary>
    public void Toggle(FigureKey key) => Show(key == Key ? null : key);

    /// <summary>Opens a figure, or closes the open one with null.</summary>
    public void Show(FigureKey? key)
    {
        if (key != Key)
        {
            Key = key;
            Changed?.Invoke();
        }
    }
}
