using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using FloodPanel.Documents.Drawings;
using FloodPanel.Documents.Reports;
using FloodPanel.Documents.Typography;
using PdfSharp.Drawing;
using PdfSharp.Pdf;

namespace FloodPanel.Documents.Pdf;

/// <summary>Writes a report as a PDF: only the layout is here.</summary>
internal static class PdfReportWriter
{
    private const double BandTop = 9;
    private const double BandHeight = 7;
    private const double Small = 2.8;

    public static byte[] Write(Report report)
    {
        var blocks = new BlockStrips(report.Paper);
        var pages = Pagination.Place([.. report.Blocks.SelectMany(blocks.Of)], report.Paper.Top, report.Paper.Bottom);
        using var document = new PdfDocument();
        Describe(document, report);
        for (var i = 0; i < pages.Count; i++)
        {
            var page = document.AddPage();
            page.Width = XUnit.FromMillimeter(report.Paper.Width);
            page.Height = XUnit.FromMillimeter(report.Paper.Height);
            using var graphics = XGraphics.FromPdfPage(page);
            var canvas = new Canvas(graphics);
            DrawFrame(canvas, report, FormattableString.Invariant($"Page {i + 1} of {pages.Count}"));
            foreach (var (strip, top) in pages[i])
            {
                strip.Draw(canvas, top);
            }
        }

        using var stream = new MemoryStream();
        document.Save(stream);
        return RepeatableBytes.Of(stream.ToArray());
    }

    private static void Describe(PdfDocument document, Report report)
    {
        var (properties, date) = (report.Properties, report.Properties.Date.ToDateTime(TimeOnly.MinValue, DateTimeKind.Utc));
        document.Info.Title = properties.Title;
        document.Info.Author = properties.Author;
        document.Info.Subject = properties.Subject;
        document.Info.Keywords = properties.Keywords;
        document.Info.Creator = "FloodPanel";
        document.Info.CreationDate = date;
        document.Info.ModificationDate = date;
        document.Language = "en";
        document.ViewerPreferences.DisplayDocTitle = true;

        // Equal content gives equal files: the identifier is that of the content, not a random one.
        var content = string.Create(CultureInfo.InvariantCulture, $"{properties} {report.Paper} {report.Band} {report.Footer}");
        var id = Encoding.Latin1.GetString(SHA256.HashData(Encoding.UTF8.GetBytes(content)).AsSpan(0, 16));
        document.Internals.FirstDocumentID = id;
        document.Internals.SecondDocumentID = id;
    }

    private static void DrawFrame(Canvas canvas, Report report, string pageWords)
    {
        var paper = report.Paper;
        if (report.Band is { } band)
        {
            canvas.Area(paper.Side, BandTop, paper.ContentWidth, BandHeight, Ink.Warning);
            var baseline = BandTop + BandHeight - 2.2;
            canvas.Words(band.Words, paper.Side + 2.5, baseline, FontFile.Semibold, 4.2, 0xFFFFFF);
            canvas.Words(
                band.Reason, paper.Width - paper.Side - 2.5, baseline, FontFile.Regular, 3.1, 0xFFFFFF, TextAnchor.End);
        }
        else
        {
            canvas.Words(report.Header, paper.Side, BandTop + BandHeight - 2.2, FontFile.Regular, Small, Ink.Muted);
            canvas.Line(paper.Side, BandTop + BandHeight, paper.Width - paper.Side, BandTop + BandHeight, Ink.Rule, 0.18);
        }

        var foot = paper.Height - 10;
        var right = paper.Width - paper.Side;
        canvas.Line(paper.Side, foot - 4, right, foot - 4, Ink.Rule, 0.18);
        canvas.Words(
            Wording.Shorten(report.Footer.Left, FontFile.Regular, Small, 0.4 * paper.ContentWidth), paper.Side, foot,
            FontFile.Regular, Small, Ink.Muted);
        canvas.Words(
            report.Footer.Middle, paper.Side + 0.62 * paper.ContentWidth, foot, FontFile.Regular, Small, Ink.Muted,
            TextAnchor.Middle);
        canvas.Words(pageWords, right, foot, FontFile.Regular, Small, Ink.Muted, TextAnchor.End);
    }
}
