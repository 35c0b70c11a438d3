using FloodPanel.Documents.Drawings;
using PdfSharp.Drawing;

namespace FloodPanel.Documents.Pdf;

/// <summary>Ink on paper: the light colours of the screen (css/app.css, css/drawing.css), on white.</summary>
internal static class Ink
{
    /// <summary>Lines and words.</summary>
    public const uint Black = 0x16202A;

    /// <summary>Words that recede.</summary>
    public const uint Muted = 0x51606C;

    /// <summary>Thin rules.</summary>
    public const uint Rule = 0x7B8893;

    /// <summary>The band of a document that must not be built from, and what fails.</summary>
    public const uint Warning = 0xA33A00;

    /// <summary>What passes.</summary>
    public const uint Passed = 0x00704F;

    /// <summary>Share of an action's colour in its area.</summary>
    public const double ActionOpacity = 0.3;

    /// <summary>Share of the water's colour in its area.</summary>
    public const double WaterOpacity = 0.2;

    /// <summary>Colour of a line, 0xRRGGBB.</summary>
    /// <param name="role">What the line stands for.</param>
    public static uint Of(LineRole role) => role switch
    {
        LineRole.Extension => Rule,
        LineRole.Hatch => 0x93A0AA,
        LineRole.Water or LineRole.Hydrostatic => 0x0072B2,
        LineRole.Flow => 0x56B4E9,
        LineRole.Wave => 0x009E73,
        LineRole.Debris => 0xD55E00,
        LineRole.Wind => 0x6F7880,
        LineRole.LineLoad => 0xCC79A7,
        _ => Black,
    };

    /// <summary>Colour of an area, 0xRRGGBB.</summary>
    /// <param name="role">What the area stands for.</param>
    public static uint Of(FillRole role) => role switch
    {
        FillRole.Paper => 0xFFFFFF,
        FillRole.Wall => 0xF3F2EE,
        FillRole.Log => 0xE6E9EB,
        FillRole.Post => 0xB9C2C9,
        FillRole.Water or FillRole.WaterMark => 0x0072B2,
        FillRole.Hydrostatic => Of(LineRole.Hydrostatic),
        FillRole.Flow => Of(LineRole.Flow),
        FillRole.Wave => Of(LineRole.Wave),
        FillRole.Debris => Of(LineRole.Debris),
        FillRole.Wind => Of(LineRole.Wind),
        FillRole.LineLoad => Of(LineRole.LineLoad),
        _ => Black,
    };

    internal static double Opacity(FillRole role) => role switch
    {
        FillRole.Water => WaterOpacity,
        FillRole.Hydrostatic or FillRole.Flow or FillRole.Wave or FillRole.Debris or FillRole.Wind or FillRole.LineLoad
            => ActionOpacity,
        _ => 1,
    };

    internal static XColor Color(uint rgb, double opacity = 1) =>
        XColor.FromArgb((int)Math.Round(255 * opacity), (int)(rgb >> 16), (int)(rgb >> 8 & 0xFF), (int)(rgb & 0xFF));
}
