using FloodPanel.Calculation;
using FloodPanel.Calculation.PlaneAreas;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.PlaneAreas;

/// <summary>The dimensions of a shape.</summary>
public sealed partial class ShapeFields
{
    private static readonly bool[] Sides = [true, false];

    /// <summary>The shape.</summary>
    [Parameter, EditorRequired]
    public PlaneShape Shape { get; set; } = null!;

    /// <summary>What cannot be calculated.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Raised with a changed shape.</summary>
    [Parameter, EditorRequired]
    public EventCallback<PlaneShape> OnChange { get; set; }

    private static string SideWords(bool below) => below ? "Below" : "Above";

    private Sentence? ProblemAt(string path) => Problems.FirstOrDefault(p => p.Path == path)?.Message;

    private Task Set(PlaneShape shape) => OnChange.InvokeAsync(shape);

    private Task SetCorner(PolygonShape polygon, int index, PlanePoint corner) =>
        Set(new PolygonShape(polygon.Corners.SetItem(index, corner)));

    // Half way to the next corner, so that the outline stays what it is.
    private Task Insert(PolygonShape polygon, int index)
    {
        var (from, to) = (polygon.Corners[index], polygon.Corners[(index + 1) % polygon.Corners.Count]);
        return Set(new PolygonShape(polygon.Corners.Insert(index + 1, new((from.X + to.X) / 2, (from.S + to.S) / 2))));
    }

    private Task Remove(PolygonShape polygon, int index) => Set(new PolygonShape(polygon.Corners.RemoveAt(index)));
}
