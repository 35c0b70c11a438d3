using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;

namespace FloodPanel.Calculation.Tests.Published;

/// <summary>
/// EN 10219-2 (cold formed) and EN 10210-2 (hot finished), tables of square and rectangular hollow sections, and the AISC
/// Steel Construction Manual, Table 1-12 and 1-11: A, I, W_el, W_pl as printed. Corner radii for the properties, from
/// memory: EN 10219-2, outer 2·t and inner 1·t up to 6 mm, 2.5·t and 1.5·t to 10 mm, 3·t and 2·t above; EN 10210-2,
/// outer 1.5·t and inner 1·t; AISC, outer 2·t and inner 1·t with the design wall, 0.93 of the nominal one. That hundreds of printed
/// digits follow from them is the evidence for the radii.
/// </summary>
public class HollowSectionTablesTests
{
    /// <summary>EN 10219-2, read in a public transcription of its tables (cm², cm⁴, cm³).</summary>
    [Theory]
    [InlineData(90, 90, 6, 19.23, 220.48, 48.99, 59.54)]
    [InlineData(100, 100, 3, 11.41, 177.05, 35.41, 41.21)]
    [InlineData(100, 100, 5, 18.36, 271.10, 54.22, 64.59)]
    [InlineData(100, 100, 6.3, 22.25, 314.17, 62.83, 76.38)]
    [InlineData(100, 100, 8, 27.24, 365.94, 73.19, 91.05)]
    [InlineData(120, 120, 5, 22.36, 485.47, 80.91, 95.45)]
    [InlineData(120, 120, 8, 33.64, 676.88, 112.81, 137.81)]
    [InlineData(140, 140, 6, 31.23, 920.43, 131.49, 155.33)]
    public void En10219_ReadInATranscription(double height, double depth, double wall, double area, double inertia, double elastic, double plastic) =>
        Agrees(ColdFormed(height, depth, wall), (area, 0.005), (inertia, 0.0051), (elastic, 0.005), (plastic, 0.005));

    /// <summary>EN 10219-2, from memory, to three figures.</summary>
    [Theory]
    [InlineData(50, 50, 4, 6.95, 23.7, 9.49, 11.7)]
    [InlineData(50, 100, 5, 13.4, 158, 31.6, 40.8)]
    [InlineData(80, 120, 5, 18.4, 353, 58.9, 72.4)]
    [InlineData(150, 150, 8, 43.2, 1412, 188, 226)]
    [InlineData(200, 200, 10, 72.6, 4251, 425, 508)]
    public void En10219_FromMemory(double height, double depth, double wall, double area, double inertia, double elastic, double plastic) =>
        Agrees(ColdFormed(height, depth, wall), (area, Half(area)), (inertia, Half(inertia)), (elastic, Half(elastic)), (plastic, Half(plastic)));

    /// <summary>EN 10210-2, 40 to 60 mm read in a public transcription of its tables, the others from memory.</summary>
    [Theory]
    [InlineData(40, 40, 4, 5.59, 11.8, 5.91, 7.44)]
    [InlineData(50, 50, 3.2, 5.88, 21.2, 8.49, 10.2)]
    [InlineData(50, 50, 5, 8.73, 28.9, 11.6, 14.5)]
    [InlineData(60, 60, 5, 10.7, 53.3, 17.8, 21.9)]
    [InlineData(60, 60, 6.3, 13.1, 61.6, 20.5, 26.0)]
    [InlineData(80, 80, 5, 14.7, 137, 34.2, 41.1)]
    [InlineData(100, 100, 5, 18.7, 279, 55.9, 66.4)]
    [InlineData(50, 100, 5, 13.7, 167, 33.3, 42.6)]
    [InlineData(150, 150, 8, 44.8, 1491, 199, 237)]
    [InlineData(100, 200, 8, 44.8, 2234, 223, 282)]
    [InlineData(200, 200, 10, 74.9, 4471, 447, 531)]
    public void En10210_Table(double height, double depth, double wall, double area, double inertia, double elastic, double plastic) =>
        Agrees(HotFinished(height, depth, wall), (area, Half(area)), (inertia, Half(inertia)), (elastic, Half(elastic)), (plastic, Half(plastic)));

    /// <summary>AISC Manual, 15th ed., from memory: HSS by their sides and design wall in inches; in², in⁴, in³.</summary>
    [Theory]
    [InlineData(3, 3, 0.174, 1.89, 2.46, 1.64, 1.97)]
    [InlineData(4, 4, 0.233, 3.37, 7.80, 3.90, 4.69)]
    [InlineData(4, 4, 0.349, 4.78, 10.3, 5.13, 6.39)]
    [InlineData(4, 6, 0.233, 4.30, 20.9, 6.96, 8.53)]
    [InlineData(6, 6, 0.233, 5.24, 28.6, 9.54, 11.2)]
    [InlineData(4, 8, 0.233, 5.24, 42.5, 10.6, 13.3)]
    public void AiscHss_Table(double height, double depth, double wall, double area, double inertia, double elastic, double plastic)
    {
        var section = SectionProperties.Of(new RectangularTube { Height = height, Depth = depth, Wall = wall, CornerRadius = 2 * wall });

        Assert.Equal(area, section.Area, tolerance: Half(area));
        Assert.Equal(inertia, section.Inertia, tolerance: Half(inertia));
        Assert.Equal(elastic, section.Modulus, tolerance: Half(elastic));
        Assert.Equal(plastic, section.PlasticModulus, tolerance: Half(plastic));
    }

    private static RectangularTube ColdFormed(double height, double depth, double wall)
    {
        var corner = wall <= 6 ? 2 : wall <= 10 ? 2.5 : 3;
        return new() { Height = height / 1000, Depth = depth / 1000, Wall = wall / 1000, CornerRadius = corner * wall / 1000 };
    }

    private static RectangularTube HotFinished(double height, double depth, double wall) =>
        new() { Height = height / 1000, Depth = depth / 1000, Wall = wall / 1000, CornerRadius = 1.5 * wall / 1000, InnerRadius = wall / 1000 };

    private static void Agrees(
        RectangularTube tube, (double Value, double Half) area, (double Value, double Half) inertia, (double Value, double Half) elastic, (double Value, double Half) plastic)
    {
        var section = SectionProperties.Of(tube);

        Assert.Equal(area.Value, section.Area * 1e4, tolerance: area.Half);
        Assert.Equal(inertia.Value, section.Inertia * 1e8, tolerance: inertia.Half);
        Assert.Equal(elastic.Value, section.Modulus * 1e6, tolerance: elastic.Half);
        Assert.Equal(plastic.Value, section.PlasticModulus * 1e6, tolerance: plastic.Half);
    }

    /// <summary>Half a unit of the third figure; of the last one where four stand before the point.</summary>
    private static double Half(double printed) => printed < 10 ? 0.005 : printed < 100 ? 0.05 : 0.5;
}
