using FloodPanel.Calculation.Actions;

namespace FloodPanel.Documents.Drawings;

/// <summary>A place on the sheet [mm]: x to the right, y downward from the top left corner.</summary>
/// <param name="X">To the right [mm].</param>
/// <param name="Y">Downward [mm].</param>
public readonly record struct SheetPoint(double X, double Y);

/// <summary>A drawing: plain shapes on a sheet, in millimetres at a true scale, the same for every writer.</summary>
/// <param name="Title">What is shown, "Elevation from the flood side".</param>
/// <param name="Description">What is shown, in a sentence for those who cannot see it.</param>
/// <param name="Width">Width of the sheet [mm].</param>
/// <param name="Height">Height of the sheet [mm].</param>
/// <param name="ScaleDenominator">n in the scale 1:n.</param>
/// <param name="Shapes">From back to front.</param>
/// <param name="Legend">The actions shown, in the order in which they are stacked.</param>
public sealed record Scene(
    string Title,
    string Description,
    double Width,
    double Height,
    int ScaleDenominator,
    IReadOnlyList<Shape> Shapes,
    IReadOnlyList<ActionKind> Legend);

/// <summary>One thing on the sheet.</summary>
public abstract record Shape;

/// <summary>A straight line.</summary>
/// <param name="From">Start.</param>
/// <param name="To">End.</param>
/// <param name="Role">What it stands for.</param>
public sealed record Line(SheetPoint From, SheetPoint To, LineRole Role) : Shape;

/// <summary>An open run of lines.</summary>
/// <param name="Points">Its corners.</param>
/// <param name="Role">What it stands for.</param>
public sealed record Polyline(IReadOnlyList<SheetPoint> Points, LineRole Role) : Shape;

/// <summary>A closed area.</summary>
/// <param name="Points">Its corners.</param>
/// <param name="Fill">What the area stands for; null for none.</param>
/// <param name="Outline">What its edge stands for; null for none.</param>
public sealed record Polygon(IReadOnlyList<SheetPoint> Points, FillRole? Fill, LineRole? Outline) : Shape;

/// <summary>Hatching: many short lines of one kind, already cut to the area that they fill.</summary>
/// <param name="Segments">The lines.</param>
/// <param name="Role">What they stand for.</param>
public sealed record Hatch(IReadOnlyList<Segment> Segments, LineRole Role) : Shape;

/// <summary>A piece of a straight line.</summary>
/// <param name="From">Start.</param>
/// <param name="To">End.</param>
public readonly record struct Segment(SheetPoint From, SheetPoint To);

/// <summary>Where words stand relative to their place.</summary>
public enum TextAnchor
{
    /// <summary>They begin there.</summary>
    Start,

    /// <summary>They are centred there.</summary>
    Middle,

    /// <summary>They end there.</summary>
    End,
}

/// <summary>A line of words.</summary>
/// <param name="Words">The words.</param>
/// <param name="Baseline">Place of the anchor on the baseline.</param>
/// <param name="Size">Font size [mm].</param>
/// <param name="Anchor">Where they stand relative to their place.</param>
/// <param name="Role">What they stand for.</param>
/// <param name="Upward">True when they read from the bottom up.</param>
public sealed record Text(
    string Words, SheetPoint Baseline, double Size, TextAnchor Anchor, TextRole Role, bool Upward = false) : Shape;

/// <summary>What a mark is.</summary>
public enum MarkKind
{
    /// <summary>A dimension: extension lines, dimension line, ticks, figure.</summary>
    Dimension,

    /// <summary>A level: leader, triangle, figure, name.</summary>
    Level,

    /// <summary>A log.</summary>
    Log,

    /// <summary>A post.</summary>
    Post,

    /// <summary>A guide.</summary>
    Guide,

    /// <summary>The pressure of one action.</summary>
    Action,

    /// <summary>The resultant: arrow, figure.</summary>
    Resultant,

    /// <summary>Height and pressure of one strip of the diagram, seen only under the pointer.</summary>
    Reading,
}

/// <summary>Shapes that belong together and can be pointed at.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Name">Its name and figure, "Clear width 3.300 m".</param>
/// <param name="Field">The field of the project file that sets it, one of <see cref="FieldKeys"/>; null when none does.</param>
/// <param name="Part">Which one it is, "bay-2-log-1"; null where there is but one.</param>
/// <param name="Parts">Its shapes.</param>
public sealed record Mark(MarkKind Kind, string Name, string? Field, string? Part, IReadOnlyList<Shape> Parts) : Shape;
