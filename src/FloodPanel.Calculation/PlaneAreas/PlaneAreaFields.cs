using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>The numeric inputs of a plane area with their limits.</summary>
public static class PlaneAreaFields
{
    /// <summary>Most corners of a polygon.</summary>
    public const int MostCorners = 30;

    /// <summary>CircleShape.Diameter and SegmentShape.Diameter.</summary>
    public static Field Diameter { get; } = new("diameter", "Diameter", Dimension.Length, 0, 50, "Of the circle.", true);

    /// <summary>Height of a shape along the slope.</summary>
    public static Field Height { get; } = new("height", "Height", Dimension.Length, 0, 50, "Along the slope.", true);

    /// <summary>TrapezoidShape.Bottom.</summary>
    public static Field Bottom { get; } = new("bottom", "Lower side", Dimension.Length, 0, 100, "Width of the lower side; nothing makes a triangle.");

    /// <summary>TrapezoidShape.Top.</summary>
    public static Field Top { get; } = new("top", "Upper side", Dimension.Length, 0, 100, "Width of the upper side; nothing makes a triangle.");

    /// <summary>PlanePoint.X.</summary>
    public static Field Across { get; } = new("x", "Across", Dimension.Length, -100, 100, "To the right of any point.");

    /// <summary>PlanePoint.S.</summary>
    public static Field Up { get; } = new("s", "Up", Dimension.Length, -100, 100, "Up the slope from any point.");

    /// <summary>PlaneAreaInput.InclinationDegrees.</summary>
    public static Field Inclination { get; } = new("inclination", "Inclination", Dimension.Degrees, 1, 90, "Angle of the plane to the horizontal; 90° is a wall.");

    /// <summary>PlaneAreaInput.Depth.</summary>
    public static Field Depth { get; } = new("depth", "Depth of the lowest point", Dimension.Length, 0, 50, "Below the water, vertically.", true);
}
