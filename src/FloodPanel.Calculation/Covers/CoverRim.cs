using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Covers;

/// <summary>A place on a plate, seen from the flood side.</summary>
/// <param name="Across">From the left edge, or the left end of a circle [m].</param>
/// <param name="Up">From the lowest point [m].</param>
public readonly record struct RimPlace(double Across, double Up);

/// <summary>Where the fasteners of a cover stand.</summary>
public static class CoverRim
{
    private const int LeastOnCircle = 3;

    /// <summary>Places of the fasteners: at the corners, and evenly between them at no more than the pitch.</summary>
    /// <param name="cover">A cover without problems.</param>
    public static IReadOnlyList<RimPlace> Of(Cover cover)
    {
        var pitch = cover.Fasteners.Pitch;
        return cover.Plate switch
        {
            RectangleCover rectangle => [.. Rectangle(rectangle, pitch)],
            CircleCover circle => [.. Circle(circle.Diameter, pitch)],
            _ => throw new ArgumentOutOfRangeException(nameof(cover), cover.Plate, "is not a plate"),
        };
    }

    private static IEnumerable<RimPlace> Rectangle(RectangleCover plate, double pitch)
    {
        var (across, up) = (Spaces(plate.Width, pitch), Spaces(plate.Height, pitch));
        for (var i = 0; i <= across; i++)
        {
            yield return new(plate.Width * i / across, 0);
            if (plate.Support == RectangleSupport.FourEdges)
            {
                yield return new(plate.Width * i / across, plate.Height);
            }
        }

        var last = plate.Support == RectangleSupport.FourEdges ? up - 1 : up;
        for (var i = 1; i <= last; i++)
        {
            yield return new(0, plate.Height * i / up);
            yield return new(plate.Width, plate.Height * i / up);
        }
    }

    private static IEnumerable<RimPlace> Circle(double diameter, double pitch)
    {
        var count = Math.Max(LeastOnCircle, Spaces(Math.PI * diameter, pitch));
        for (var i = 0; i < count; i++)
        {
            var (sine, cosine) = Math.SinCos(2 * Math.PI * i / count);
            yield return new(diameter / 2 * (1 + sine), diameter / 2 * (1 + cosine));
        }
    }

    // A length that is a whole number of pitches but for rounding takes no further fastener.
    private static int Spaces(double length, double pitch) => Math.Max(1, (int)Math.Ceiling(length / pitch - 1e-9));
}
