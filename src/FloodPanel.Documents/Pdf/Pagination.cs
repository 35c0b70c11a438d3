namespace FloodPanel.Documents.Pdf;

/// <summary>Puts strips on pages.</summary>
internal static class Pagination
{
    /// <summary>Pages from first to last, at least one.</summary>
    /// <param name="strips">The strips in their order.</param>
    /// <param name="top">Where the content of a page begins [mm].</param>
    /// <param name="bottom">Where it ends [mm].</param>
    public static IReadOnlyList<IReadOnlyList<Placed>> Place(IReadOnlyList<Strip> strips, double top, double bottom)
    {
        var pages = new List<IReadOnlyList<Placed>>();
        var page = new List<Placed>();
        var y = top;
        foreach (var group in Groups(strips))
        {
            if (page.Count > 0 && y + Height(group, isFirst: false) > bottom)
            {
                pages.Add(page);
                page = [];
                y = top;
            }

            foreach (var strip in group)
            {
                // A group higher than a page is broken where it has to be.
                if (page.Count > 0 && y + strip.SpaceBefore + strip.Height > bottom)
                {
                    pages.Add(page);
                    page = [];
                    y = top;
                }

                if (page.Count == 0 && strip.Head is { } head)
                {
                    page.Add(new Placed(head, y));
                    y += head.Height;
                }

                y += page.Count == 0 ? 0 : strip.SpaceBefore;
                page.Add(new Placed(strip, y));
                y += strip.Height;
            }
        }

        pages.Add(page);
        return pages;
    }

    /// <summary>Runs of strips that stay together.</summary>
    private static IEnumerable<List<Strip>> Groups(IReadOnlyList<Strip> strips)
    {
        var group = new List<Strip>();
        foreach (var strip in strips)
        {
            group.Add(strip);
            if (!strip.StaysWithNext)
            {
                yield return group;
                group = [];
            }
        }

        if (group.Count > 0)
        {
            yield return group;
        }
    }

    private static double Height(List<Strip> group, bool isFirst) =>
        group.Sum(s => s.Height + s.SpaceBefore) - (isFirst ? group[0].SpaceBefore : 0);
}
