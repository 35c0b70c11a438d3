using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>The optional table of levels by probability.</summary>
public sealed partial class LevelTable
{
    [Parameter, EditorRequired]
    public required Site Site { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<ValueList<LevelPoint>> OnChange { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<LevelPoint> OnUse { get; set; }

    [Parameter, EditorRequired]
    public required Func<string, Sentence?> ProblemAt { get; set; }

    private Task Add() => OnChange.InvokeAsync(
        Site.Levels.Add(new LevelPoint(Site.AnnualProbability, Site.DesignStillWaterLevel)));

    private Task Set(int index, LevelPoint point) => OnChange.InvokeAsync(Site.Levels.SetItem(index, point));

    private Task Remove(int index) => OnChange.InvokeAsync(Site.Levels.RemoveAt(index));
}
