namespace FloodPanel.Documents.Drawings;

/// <summary>Moves labels apart along a line, each as little as possible.</summary>
internal static class Spread
{
    /// <summary>
    /// Places with at least the spacing between them and the least sum of squared moves (pooling neighbours that
    /// violate the order), within the range.
    /// </summary>
    /// <param name="wanted">Wanted places, ascending.</param>
    /// <param name="spacing">Least distance between two places.</param>
    /// <param name="least">Least place allowed.</param>
    /// <param name="most">Greatest place allowed.</param>
    public static double[] Apart(IReadOnlyList<double> wanted, double spacing, double least, double most)
    {
        // With i·spacing taken off, the places need only not decrease.
        var pools = new List<(double Sum, int Count)>();
        for (var i = 0; i < wanted.Count; i++)
        {
            pools.Add((wanted[i] - i * spacing, 1));
            while (pools.Count > 1 && Mean(pools[^2]) > Mean(pools[^1]))
            {
                var merged = (pools[^2].Sum + pools[^1].Sum, pools[^2].Count + pools[^1].Count);
                pools.RemoveRange(pools.Count - 2, 2);
                pools.Add(merged);
            }
        }

        var last = most - (wanted.Count - 1) * spacing;
        return
        [
            .. pools.SelectMany(p => Enumerable.Repeat(Math.Max(least, Math.Min(Mean(p), last)), p.Count))
                .Select((offset, i) => offset + i * spacing),
        ];
    }

    private static double Mean((double Sum, int Count) pool) => pool.Sum / pool.Count;
}
