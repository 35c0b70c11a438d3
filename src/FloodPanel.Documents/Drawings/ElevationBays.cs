namespace FloodPanel.Documents.Drawings;

/// <summary>The bays of an elevation, and which of them are left out of a long one.</summary>
internal static class ElevationBays
{
    /// <summary>From this scale on, 1:n, a long barrier shows too little.</summary>
    private const int TooSmall = 200;

    /// <summary>Left edge and width of each bay [m] from the left reveal.</summary>
    public static IReadOnlyList<(double Left, double Width)> Of(DrawingInput input)
    {
        var left = 0.0;
        var bays = new List<(double, double)>();
        foreach (var width in input.Barrier.Bays)
        {
            bays.Add((left, width));
            left += width + (input.Barrier.Posts?.Width ?? 0);
        }

        return bays;
    }

    /// <summary>The bays to leave out: as few as the larger scale asks for; null when all are shown.</summary>
    /// <param name="input">What to draw.</param>
    /// <param name="height">Height shown [m].</param>
    /// <param name="roomWide">Room on the sheet [mm].</param>
    /// <param name="roomHigh">Room on the sheet [mm].</param>
    /// <param name="gap">Width of a break on the sheet [mm].</param>
    public static BayCut? Cut(DrawingInput input, double height, double roomWide, double roomHigh, double gap)
    {
        var bays = Of(input);
        var width = input.Opening.ClearWidth;
        var whole = DrawingScale.Fit(width, height, roomWide, roomHigh);
        if (whole < TooSmall || bays.Count < 5)
        {
            return null;
        }

        var last = bays[^1];
        double Shown(int first) => bays[first].Left + width - (bays[^2].Left + bays[^2].Width);
        var scale = DrawingScale.Fit(Shown(2), height, roomWide - gap, roomHigh);
        if (scale >= whole)
        {
            return null;
        }

        var first = 2;
        while (first + 1 < bays.Count - 2 && Shown(first + 1) * DrawingScale.PerMetre(scale) <= roomWide - gap)
        {
            first++;
        }

        return new BayCut(first, bays.Count - 2, bays[first].Left, last.Left - (input.Barrier.Posts?.Width ?? 0), gap);
    }
}
