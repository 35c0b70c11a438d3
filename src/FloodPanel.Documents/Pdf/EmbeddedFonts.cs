using FloodPanel.Documents.Typography;
using PdfSharp.Drawing;
using PdfSharp.Fonts;

namespace FloodPanel.Documents.Pdf;

/// <summary>Hands our own fonts to the PDF library, which knows a regular and a bold face: ours are regular and semibold.</summary>
internal sealed class EmbeddedFonts : IFontResolver
{
    private const string Family = "Source Sans 3";

    private static readonly Lock Gate = new();

    /// <summary>A font of a size [mm].</summary>
    public static XFont Font(FontFile file, double size)
    {
        lock (Gate)
        {
            GlobalFontSettings.FontResolver ??= new EmbeddedFonts();
        }

        var style = file == FontFile.Semibold ? XFontStyleEx.Bold : XFontStyleEx.Regular;
        return new XFont(Family, size * Canvas.PointsPerMillimetre, style, XPdfFontOptions.UnicodeDefault);
    }

    public FontResolverInfo? ResolveTypeface(string familyName, bool isBold, bool isItalic) =>
        familyName == Family ? new FontResolverInfo((isBold ? FontFile.Semibold : FontFile.Regular).Name) : null;

    public byte[]? GetFont(string faceName) =>
        faceName == FontFile.Semibold.Name ? FontFile.Semibold.Data : FontFile.Regular.Data;
}
