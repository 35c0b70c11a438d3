using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Water;
using FloodPanel.Documents.Drawings;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Levels;

/// <summary>The optional table of levels by probability, and the level between them at the design probability.</summary>
public sealed partial class LevelTable
{
    private Site? drawn;
    private UnitSystem drawnUnits;
    private MarkupString drawing;

    [Parameter, EditorRequired]
    public required Site Site { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<ValueList<LevelPoint>> OnChange { get; set; }

    [Parameter, EditorRequired]
    public required EventCallback<LevelPoint> OnUse { get; set; }

    [Parameter, EditorRequired]
    public required Func<string, Sentence?> ProblemAt { get; set; }

    private LevelCurve? Curve => LevelCurve.Of(Site.Levels);

    private MarkupString Drawing
    {
        get
        {
            if (drawn != Site || drawnUnits != Units)
            {
                drawing = new MarkupString(SvgWriter.WriteText(LevelCurveDrawing.Draw(Curve!, Site, Units)));
                (drawn, drawnUnits) = (Site, Units);
            }

            return drawing;
        }
    }

    // What is taken over is what is read: to the millimetre.
    private static double Rounded(double level) => Math.Round(level, 3);

    private string Length(double value) => Calculation.Units.Format(value, Dimension.Length, Units);

    private string Chance(double value) => Calculation.Units.FormatTyped(new(value, Dimension.Probability), Units);

    private Task Add() => OnChange.InvokeAsync(Site.Levels.Add(NextPoint()));

    // A first row is the design level itself; each further one is twice as rare and so stands no lower.
    private LevelPoint NextPoint()
    {
        if (Site.Levels.Count == 0)
        {
            return new(Site.AnnualProbability, Site.DesignStillWaterLevel);
        }

        var rarest = Site.Levels.MinBy(p => p.AnnualProbability)!;
        return rarest with { AnnualProbability = Math.Max(rarest.AnnualProbability / 2, Fields.LevelProbability.Minimum) };
    }

    private Task Set(int index, LevelPoint point) => OnChange.InvokeAsync(Site.Levels.SetItem(index, point));

    private Task Remove(int index) => OnChange.InvokeAsync(Site.Levels.RemoveAt(index));
}
