using FloodPanel.Calculation.Covers;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells, 2nd ed. (1959), ν = 0.3. Table 8 (uniform pressure) and Tables 10 to 13
/// (hydrostatic pressure): the figures were recomputed by Lévy series outside this code, with the digits that the tables print; that
/// they are those of the book is from memory.
/// </summary>
public class TimoshenkoPlateTests
{
    /// <summary>w = α·q·a⁴/D, M = β·q·a² and β₁·q·a² at the centre, a the shorter side.</summary>
    [Theory]
    [InlineData(1, 0.00406, 0.0479, 0.0479)]
    [InlineData(1.1, 0.00487, 0.0555, 0.0493)]
    [InlineData(1.2, 0.00565, 0.0627, 0.0501)]
    [InlineData(1.3, 0.00639, 0.0694, 0.0503)]
    [InlineData(1.4, 0.00708, 0.0755, 0.0502)]
    [InlineData(1.5, 0.00772, 0.0812, 0.0498)]
    [InlineData(1.6, 0.00831, 0.0862, 0.0493)]
    [InlineData(1.7, 0.00884, 0.0908, 0.0486)]
    [InlineData(1.8, 0.00932, 0.0948, 0.0479)]
    [InlineData(1.9, 0.00974, 0.0985, 0.0471)]
    [InlineData(2, 0.01013, 0.1017, 0.0464)]
    [InlineData(2.5, 0.0115, 0.1129, 0.043)]
    [InlineData(3, 0.01223, 0.1189, 0.0406)]
    [InlineData(4, 0.01282, 0.1235, 0.0384)]
    [InlineData(5, 0.01297, 0.1246, 0.0377)]
    [InlineData(10, 0.01302, 0.125, 0.0375)]
    public void Table8_UniformPressure_Centre(double ratio, double deflection, double shortMoment, double longMoment)
    {
        var plate = Plate(height: ratio, width: 1, PlatePressure.Uniform(1));

        var moments = plate.Moments(ratio / 2, 0.5);

        Assert.Equal(deflection, plate.Bulge(ratio / 2, 0.5), tolerance: 0.5e-5);
        Assert.Equal(shortMoment, moments.Across, tolerance: 0.5e-4);
        Assert.Equal(longMoment, moments.Down, tolerance: 0.5e-4);
    }

    /// <summary>The same plates lying on their longer side: across and down change places.</summary>
    [Theory]
    [InlineData(1, 0.00406, 0.0479, 0.0479)]
    [InlineData(1.1, 0.00487, 0.0555, 0.0493)]
    [InlineData(1.2, 0.00565, 0.0627, 0.0501)]
    [InlineData(1.3, 0.00639, 0.0694, 0.0503)]
    [InlineData(1.4, 0.00708, 0.0755, 0.0502)]
    [InlineData(1.5, 0.00772, 0.0812, 0.0498)]
    [InlineData(1.6, 0.00831, 0.0862, 0.0493)]
    [InlineData(1.7, 0.00884, 0.0908, 0.0486)]
    [InlineData(1.8, 0.00932, 0.0948, 0.0479)]
    [InlineData(1.9, 0.00974, 0.0985, 0.0471)]
    [InlineData(2, 0.01013, 0.1017, 0.0464)]
    [InlineData(2.5, 0.0115, 0.1129, 0.043)]
    [InlineData(3, 0.01223, 0.1189, 0.0406)]
    [InlineData(4, 0.01282, 0.1235, 0.0384)]
    [InlineData(5, 0.01297, 0.1246, 0.0377)]
    [InlineData(10, 0.01302, 0.125, 0.0375)]
    public void Table8_LyingPlate_SameFigures(double ratio, double deflection, double shortMoment, double longMoment)
    {
        var plate = Plate(height: 1, width: ratio, PlatePressure.Uniform(1));

        var moments = plate.Moments(0.5, ratio / 2);

        Assert.Equal(deflection, plate.Bulge(0.5, ratio / 2), tolerance: 0.5e-5);
        Assert.Equal(shortMoment, moments.Down, tolerance: 0.5e-4);
        Assert.Equal(longMoment, moments.Across, tolerance: 0.5e-4);
    }

    /// <summary>From nothing at the upper edge to q₀ at the lower one, a the height: at the centre, and the greatest on the middle line.</summary>
    [Theory]
    [InlineData(0.25, 3e-05, 0.0012, 0.0039, 3e-05, 0.0025, 0.0051)]
    [InlineData(0.3333, 8e-05, 0.0023, 0.0066, 9e-05, 0.0042, 0.008)]
    [InlineData(0.4, 0.00015, 0.0034, 0.009, 0.00017, 0.0059, 0.0105)]
    [InlineData(0.5, 0.00032, 0.0058, 0.0127, 0.00034, 0.0088, 0.014)]
    [InlineData(0.6, 0.00056, 0.0088, 0.0161, 0.00059, 0.0121, 0.0172)]
    [InlineData(0.6667, 0.00076, 0.0111, 0.018, 0.00079, 0.0144, 0.019)]
    [InlineData(0.7, 0.00087, 0.0123, 0.0189, 0.0009, 0.0156, 0.0198)]
    [InlineData(0.8, 0.00123, 0.0161, 0.0212, 0.00126, 0.0194, 0.0219)]
    [InlineData(0.9, 0.00163, 0.02, 0.0228, 0.00165, 0.0232, 0.0235)]
    [InlineData(1, 0.00203, 0.0239, 0.0239, 0.00205, 0.027, 0.0246)]
    [InlineData(1.1, 0.00243, 0.0277, 0.0247, 0.00246, 0.0306, 0.0252)]
    [InlineData(1.2, 0.00283, 0.0313, 0.025, 0.00285, 0.0341, 0.0255)]
    [InlineData(1.3, 0.0032, 0.0347, 0.0252, 0.00322, 0.0373, 0.0256)]
    [InlineData(1.4, 0.00354, 0.0378, 0.0251, 0.00356, 0.0403, 0.0256)]
    [InlineData(1.5, 0.00386, 0.0406, 0.0249, 0.00388, 0.043, 0.0254)]
    [InlineData(1.6, 0.00415, 0.0431, 0.0246, 0.00417, 0.0454, 0.0251)]
    [InlineData(1.7, 0.00442, 0.0454, 0.0243, 0.00444, 0.0476, 0.0247)]
    [InlineData(1.8, 0.00466, 0.0474, 0.0239, 0.00467, 0.0496, 0.0244)]
    [InlineData(1.9, 0.00487, 0.0492, 0.0236, 0.00489, 0.0513, 0.024)]
    [InlineData(2, 0.00506, 0.0508, 0.0232, 0.00508, 0.0529, 0.0236)]
    [InlineData(2.5, 0.00575, 0.0565, 0.0215, 0.00576, 0.0583, 0.0219)]
    [InlineData(3, 0.00612, 0.0594, 0.0203, 0.00613, 0.0612, 0.0208)]
    [InlineData(4, 0.00641, 0.0617, 0.0192, 0.00642, 0.0634, 0.0197)]
    [InlineData(5, 0.00649, 0.0623, 0.0189, 0.0065, 0.064, 0.0194)]
    public void Tables10To13_Hydrostatic_CentreAndGreatest(
        double ratio, double centre, double centreDown, double centreAcross, double deflection, double down, double across)
    {
        var plate = Plate(height: 1, width: ratio, new(0, 0, 1));
        var line = Enumerable.Range(0, 401).Select(i => i / 400.0).ToArray();

        var moments = plate.Moments(0.5, ratio / 2);

        Assert.Equal(centre, plate.Bulge(0.5, ratio / 2), tolerance: 0.5e-5);
        Assert.Equal(centreDown, moments.Down, tolerance: 0.5e-4);
        Assert.Equal(centreAcross, moments.Across, tolerance: 0.5e-4);
        Assert.Equal(deflection, line.Max(x => plate.Bulge(x, ratio / 2)), tolerance: 0.5e-5);
        Assert.Equal(down, line.Max(x => plate.Moments(x, ratio / 2).Down), tolerance: 0.5e-4);
        Assert.Equal(across, line.Max(x => plate.Moments(x, ratio / 2).Across), tolerance: 0.5e-4);
    }

    /// <summary>Corners of a square under uniform pressure: R = 0.065·q·a² each (Table 8, from memory).</summary>
    [Fact]
    public void Table8_SquarePlate_CornerForce()
    {
        var plate = Plate(1, 1, PlatePressure.Uniform(1));

        Assert.Equal(0.065, plate.TopCornerHold, tolerance: 0.0005);
        Assert.Equal(0.065, plate.BottomCornerHold, tolerance: 0.0005);
    }

    private static RectangularPlate Plate(double height, double width, PlatePressure pressure) =>
        new(height, width, 0.3, PlateEdge.Supported, PlateEdge.Supported, pressure);
}
