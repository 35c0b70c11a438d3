using FloodPanel.Calculation;
using FloodPanel.Calculation.Actions.Debris;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench.Loads;

/// <summary>A coefficient on the debris force: its number, and the words of its table.</summary>
public sealed partial class DebrisCoefficientField
{
    /// <summary>What it stands for.</summary>
    [Parameter, EditorRequired]
    public string Label { get; set; } = "";

    /// <summary>Its name in the project file.</summary>
    [Parameter, EditorRequired]
    public string Leaf { get; set; } = "";

    /// <summary>The coefficient [-].</summary>
    [Parameter, EditorRequired]
    public double Value { get; set; }

    /// <summary>The rows of its table.</summary>
    [Parameter, EditorRequired]
    public ValueList<DebrisChoice> Choices { get; set; } = [];

    /// <summary>Where the table stands.</summary>
    [Parameter, EditorRequired]
    public string Source { get; set; } = "";

    /// <summary>Raised with a new coefficient.</summary>
    [Parameter, EditorRequired]
    public EventCallback<double> OnChange { get; set; }

    private IReadOnlyList<double> Values => [.. Choices.Select(c => c.Value).Distinct()];

    private string WordsOf(double value) => Choices.First(c => c.Value == value).Words;
}
