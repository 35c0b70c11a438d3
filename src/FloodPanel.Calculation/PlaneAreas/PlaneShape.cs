namespace FloodPanel.Calculation.PlaneAreas;

/// <summary>A point of a plane: x across, s up the slope.</summary>
/// <param name="X">x, across [m].</param>
/// <param name="S">s, up the slope [m].</param>
public readonly record struct PlanePoint(double X, double S);

/// <summary>The shape of a plane area. Its lowest point stands at s = 0.</summary>
public abstract record PlaneShape;

/// <summary>A circle.</summary>
/// <param name="Diameter">D [m], > 0.</param>
public sealed record CircleShape(double Diameter) : PlaneShape;

/// <summary>A segment of a circle: what a chord cuts off.</summary>
/// <param name="Diameter">D, of the circle [m], > 0.</param>
/// <param name="Height">t, height of the segment [m], above 0 and below D.</param>
/// <param name="ChordBelow">True when the chord is its lower side.</param>
public sealed record SegmentShape(double Diameter, double Height, bool ChordBelow) : PlaneShape;

/// <summary>A trapezoid symmetrical about its middle; a triangle when one side has no width, a rectangle when both are alike.</summary>
/// <param name="Bottom">a, width of the lower side [m], ≥ 0.</param>
/// <param name="Top">b, width of the upper side [m], ≥ 0.</param>
/// <param name="Height">t, along the slope [m], > 0.</param>
public sealed record TrapezoidShape(double Bottom, double Top, double Height) : PlaneShape;

/// <summary>A polygon that does not cut itself.</summary>
/// <param name="Corners">Its corners in order, either way round; 3 to 30.</param>
public sealed record PolygonShape(ValueList<PlanePoint> Corners) : PlaneShape;
