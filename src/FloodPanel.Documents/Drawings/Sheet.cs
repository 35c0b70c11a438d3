namespace FloodPanel.Documents.Drawings;

/// <summary>The paper that a drawing is laid out on. Everything on it is measured in text sizes.</summary>
/// <param name="Width">Width [mm].</param>
/// <param name="Height">Greatest height [mm].</param>
/// <param name="TextSize">Size of figures [mm].</param>
/// <param name="Trim">True when the sheet may be cut to the height that the drawing needs.</param>
public sealed record Sheet(double Width, double Height, double TextSize, bool Trim = false)
{
    /// <summary>The sheet on the Bench: figures are legible from 500 pixels of width.</summary>
    public static Sheet Bench { get; } = new(140, 98, 3.0);

    /// <summary>Size of names beside figures [mm].</summary>
    public double SmallText => 0.88 * TextSize;

    /// <summary>Size of the headings in the title block [mm].</summary>
    public double TinyText => 0.78 * TextSize;

    /// <summary>Distance from the edge of the sheet to anything on it [mm].</summary>
    public double Margin => 0.8 * TextSize;

    /// <summary>Height of the title block [mm].</summary>
    public double TitleHeight => 2.9 * TextSize;

    /// <summary>Distance between rows of dimensions [mm].</summary>
    public double Row => 2.0 * TextSize;
}
