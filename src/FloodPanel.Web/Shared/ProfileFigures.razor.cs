using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Documents.Drawings;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared;

/// <summary>A cross-section drawn to scale, with its properties for bending in the direction of the water.</summary>
public sealed partial class ProfileFigures
{
    private (Profile?, MaterialFamily?, UnitSystem, string?) drawn;
    private SectionProperties section;
    private MarkupString drawing;

    /// <summary>The cross-section, without problems.</summary>
    [Parameter, EditorRequired]
    public Profile Profile { get; set; } = null!;

    /// <summary>What it is made of, for hatching and mass; null where that is not known.</summary>
    [Parameter]
    public Material? Material { get; set; }

    /// <summary>Key of the form field of the profile, to which the dimensions point; null without a form.</summary>
    [Parameter]
    public string? Key { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    protected override void OnParametersSet()
    {
        var now = (Profile, Material?.Family, Units, Key);
        if (now != drawn)
        {
            drawn = now;
            section = SectionProperties.Of(Profile);
            drawing = new MarkupString(SvgWriter.WriteText(ProfileDrawing.Draw(Profile, Material?.Family, Units, Key)));
        }
    }

    // Number and unit stay on one line.
    private string Shown(double value, Dimension dimension) =>
        Calculation.Units.Format(value, dimension, Units).Replace(' ', '\u00A0');
}
