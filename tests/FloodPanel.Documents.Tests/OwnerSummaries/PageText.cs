using UglyToad.PdfPig.Content;
using UglyToad.PdfPig.Core;

namespace FloodPanel.Documents.Tests.OwnerSummaries;

/// <summary>The runs of letters of a page, each drawn by one command, with the boxes that they fill.</summary>
internal static class PageText
{
    /// <summary>Boxes may touch by this much [pt]: rounding of the page's numbers.</summary>
    private const double Touch = 0.3;

    public static void AssertNoOverlap(Page page)
    {
        var runs = Runs(page);
        for (var i = 0; i < runs.Count; i++)
        {
            for (var j = i + 1; j < runs.Count; j++)
            {
                Assert.False(Overlap(runs[i].Box, runs[j].Box), $"page {page.Number}: \"{runs[i].Words}\" meets \"{runs[j].Words}\"");
            }
        }
    }

    private static List<(string Words, PdfRectangle Box)> Runs(Page page) =>
    [
        .. page.Letters.Where(l => !string.IsNullOrWhiteSpace(l.Value)).GroupBy(l => l.TextSequence).Select(run => (
            string.Concat(run.Select(l => l.Value)),
            new PdfRectangle(
                run.Min(l => Left(l.BoundingBox)), run.Min(l => Low(l.BoundingBox)),
                run.Max(l => Right(l.BoundingBox)), run.Max(l => High(l.BoundingBox))))),
    ];

    private static bool Overlap(PdfRectangle a, PdfRectangle b) =>
        a.Left < b.Right - Touch && b.Left < a.Right - Touch && a.Bottom < b.Top - Touch && b.Bottom < a.Top - Touch;

    // Words that read upward have turned boxes.
    private static double Left(PdfRectangle box) => Corners(box).Min(p => p.X);

    private static double Right(PdfRectangle box) => Corners(box).Max(p => p.X);

    private static double Low(PdfRectangle box) => Corners(box).Min(p => p.Y);

    private static double High(PdfRectangle box) => Corners(box).Max(p => p.Y);

    private static PdfPoint[] Corners(PdfRectangle box) => [box.TopLeft, box.TopRight, box.BottomLeft, box.BottomRight];
}
