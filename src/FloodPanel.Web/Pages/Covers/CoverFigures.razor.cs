using FloodPanel.Calculation;
using FloodPanel.Calculation.Covers;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Documents.Drawings;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Covers;

/// <summary>The drawing of a cover, its verdict, and its checks with workings that open.</summary>
public sealed partial class CoverFigures
{
    private MarkupString drawing;
    private (CoverResult?, Site?, UnitSystem) drawn;

    [Parameter, EditorRequired]
    public required CoverResult Result { get; set; }

    [Parameter, EditorRequired]
    public required Site Site { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    protected override void OnParametersSet()
    {
        if (drawn != (Result, Site, Units))
        {
            drawn = (Result, Site, Units);
            drawing = new MarkupString(SvgWriter.WriteText(CoverDrawing.Draw(Result, Site, Units)));
        }
    }

    private string Shown(double value, Dimension dimension) => Calculation.Units.Format(value, dimension, Units);
}
