using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

public sealed class LibraryFilesTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("floodpanel-library-").FullName;

    public LibraryFilesTests()
    {
        foreach (var file in Directory.GetFiles(LibraryFiles.DeliveredFolder))
        {
            File.Copy(file, Path.Combine(folder, Path.GetFileName(file)));
        }
    }

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void Load_Delivered_HoldsTheIdsOfTheFileFormat()
    {
        var library = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

        Assert.NotNull(library.Find(new LibraryMaterial("en-aw-6005a-t6")));
        Assert.NotNull(library.Find(new LibraryMaterial("s275")));
        Assert.All(library.Materials.Values, m => Assert.NotEmpty(m.Source));
    }

    /// <summary>Von Mises: shear yield = yield / √3, which the file rounds down to 0.01 MPa; the US standards take 0.6 of the yield.</summary>
    [Fact]
    public void Load_Delivered_ShearStrengthOfMetalsFollowsFromTheYield()
    {
        var metals = LibraryFiles.Load(folder).Materials.Values.Where(m => m.Item.Family is MaterialFamily.Aluminium or MaterialFamily.Steel).ToList();
        var (american, european) = (metals.Where(m => m.Source.Contains("shear: 0.6 of")).ToList(), metals.Where(m => m.Source.Contains("shear: yield/√3")).ToList());

        Assert.Equal(metals.Count, american.Count + european.Count);
        Assert.All(european, m => Assert.InRange(m.Item.BendingStrength!.Value / Math.Sqrt(3) - m.Item.ShearStrength!.Value, 0, 0.01e6));
        Assert.All(american, m => Assert.Equal(0.6 * m.Item.BendingStrength!.Value, m.Item.ShearStrength!.Value, tolerance: 200));
    }

    /// <summary>Figures of another family would be taken for real by a check.</summary>
    [Fact]
    public void Load_Delivered_EachFamilyHasItsOwnFigures() => Assert.All(LibraryFiles.Load(folder).Materials.Values.Select(m => m.Item), m =>
    {
        Assert.Equal(m.Family is MaterialFamily.Aluminium or MaterialFamily.Steel, m.UltimateStrength is not null);
        Assert.Equal(m.Family == MaterialFamily.Aluminium, m.WeldedYield is not null && m.WeldedUltimate is not null);
        Assert.Equal(m.Family == MaterialFamily.Timber, m.CrossCompression is not null);
        Assert.Equal(m.Family == MaterialFamily.Composite, m.CrossStrength is not null);
        Assert.True(m.UltimateStrength is null || m.UltimateStrength > m.BendingStrength);
        Assert.True(m.WeldedYield is null || (m.WeldedYield < m.BendingStrength && m.WeldedUltimate < m.UltimateStrength && m.WeldedYield < m.WeldedUltimate));
    });

    [Fact]
    public void Load_Delivered_EveryProfileCouldHaveBeenTyped() => Assert.All(LibraryFiles.Load(folder).Profiles.Values, entry =>
    {
        var logs = new LogStack { Material = Example.EveryFigure, Profile = entry.Item };
        var opening = new Opening { Id = "door", ClearWidth = 1, ClearHeight = 1, Barrier = new Barrier { Logs = logs, Bays = [1] } };
        var problems = new Project { Name = "one", Openings = [opening] }.Validate(Library.Empty);
        Assert.DoesNotContain(problems, problem => problem.Path.Contains("profile", StringComparison.Ordinal));
    });

    /// <summary>EN 10219-2 and EN 10210-2, corner radii for section properties (from memory); AISC, twice the design wall.</summary>
    [Fact]
    public void Load_Delivered_StandardTubesHaveTheRadiiOfTheirStandard()
    {
        var profiles = LibraryFiles.Load(folder).Profiles.Values.Where(p => p.Evidence != "invented").ToList();

        Assert.True(profiles.Count > 100);
        Assert.All(profiles, entry =>
        {
            var tube = Assert.IsType<RectangularTube>(entry.Item);
            var (outer, inner) = entry.Id[..2] switch
            {
                "hf" => (1.5, 1.0),
                "hs" => (2.0, 1.0),
                _ => tube.Wall <= 0.006 ? (2.0, 1.0) : tube.Wall <= 0.010 ? (2.5, 1.5) : (3.0, 2.0),
            };
            Assert.Equal(outer * tube.Wall, tube.CornerRadius!.Value, tolerance: 1e-6);
            Assert.Equal(inner * tube.Wall, tube.InnerCorner, tolerance: 1e-6);
            Assert.True(entry.FromMemory);
        });
    }

    [Fact]
    public void Load_ProfileInMillimetres_IsInMetres()
    {
        var log = Assert.IsType<HollowRectangle>(LibraryFiles.Load(folder).Profiles["log-200-80"].Item);

        Assert.Equal(0.2, log.Height, tolerance: 1e-12);
        Assert.Equal(0.08, log.Depth, tolerance: 1e-12);
        Assert.Equal(0.003, log.Face, tolerance: 1e-12);
        Assert.Equal(3, log.Webs);
    }

    [Theory]
    [InlineData("materials.csv", "d40,D40 hardwood,timber,660,", "d40,D40 hardwood,timber,-660,", "materials.csv, line 70: density_kg_m3 is \"-660\"; allowed is a number above 0 kg/m³ and at most 25000 kg/m³.")]
    [InlineData("materials.csv", "d40,D40 hardwood,timber,660,", "d40,D40 hardwood,timber,NaN,", "materials.csv, line 70: density_kg_m3 is \"NaN\"; allowed is a number above 0 kg/m³ and at most 25000 kg/m³.")]
    [InlineData("materials.csv", "d40,D40 hardwood,timber,", "d40,D40 hardwood,wood,", "materials.csv, line 70: family is \"wood\"; allowed is \"aluminium\", \"steel\", \"timber\" or \"composite\".")]
    [InlineData("materials.csv", "d40,D40 hardwood", "c24,D40 hardwood", "materials.csv, line 70: id is \"c24\" again; allowed is once.")]
    [InlineData("materials.csv", "d40,D40 hardwood", "D 40,D40 hardwood", "materials.csv, line 70: id is \"D 40\"; allowed are small letters, digits and hyphens.")]
    [InlineData("materials.csv", "d40,D40 hardwood", "d40,", "materials.csv, line 70: title is empty; needed is text.")]
    [InlineData("materials.csv", "d40,", "d40,,", "materials.csv, line 70: the row has 20 fields; needed are 19.")]
    [InlineData("profiles.csv", "log-200-80,Hollow log 200 × 80,hollow-rectangle,200,80,3,3,3,,", "log-200-80,Hollow log 200 × 80,hollow-rectangle,200,80,3,3,3.5,,", "profiles.csv, line 4: webs is \"3.5\"; allowed is a whole number from 2 to 50.")]
    [InlineData("profiles.csv", "log-200-80,Hollow log 200 × 80,hollow-rectangle,200,80,3,3,3,,", "log-200-80,Hollow log 200 × 80,hollow-rectangle,200,80,3,3,3,9,", "profiles.csv, line 4: wall_mm is \"9\"; this shape has none, the field must be empty.")]
    [InlineData("profiles.csv", "log-200-80,Hollow log 200 × 80,hollow-rectangle", "log-200-80,Hollow log 200 × 80,round", "profiles.csv, line 4: shape is \"round\"; allowed is \"rectangle\", \"hollow-rectangle\", \"rectangular-tube\", \"i-section\" or \"properties\".")]
    public void Load_BadRow_IsRefusedWithFileLineAndField(string file, string good, string bad, string expected)
    {
        Spoil(file, good, bad);

        var problems = Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems;

        Assert.Contains(expected, problems);
    }

    [Fact]
    public void Load_EvidenceOfAnotherWord_IsRefused()
    {
        Spoil("profiles.csv", ",invented", ",guessed");

        var problems = Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems;

        Assert.Equal("profiles.csv, line 2: evidence is \"guessed\"; allowed is read, derived, memory, invented.", problems[0]);
    }

    [Fact]
    public void Load_OtherColumns_IsRefused()
    {
        Spoil("materials.csv", "density_kg_m3", "density_lb_ft3");

        var problem = Assert.Single(Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems);

        Assert.StartsWith("materials.csv, line 1: the columns are \"id,title,family,density_lb_ft3,", problem);
    }

    [Fact]
    public void Load_FileMissing_IsRefused()
    {
        File.Delete(Path.Combine(folder, "profiles.csv"));

        var problem = Assert.Single(Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems);

        Assert.StartsWith($"profiles.csv cannot be read in the data folder {folder}: ", problem);
    }

    [Fact]
    public void Load_QuoteWithoutEnd_IsRefused()
    {
        File.AppendAllText(Path.Combine(folder, "profiles.csv"), "x,\"never closed");

        var problem = Assert.Single(Assert.Throws<LibraryFileException>(() => LibraryFiles.Load(folder)).Problems);

        Assert.StartsWith("profiles.csv is not a table of comma-separated values: ", problem);
    }

    private void Spoil(string file, string good, string bad)
    {
        var path = Path.Combine(folder, file);
        var text = File.ReadAllText(path);
        Assert.Contains(good, text, StringComparison.Ordinal);
        File.WriteAllText(path, text.Replace(good, bad, StringComparison.Ordinal));
    }
}
