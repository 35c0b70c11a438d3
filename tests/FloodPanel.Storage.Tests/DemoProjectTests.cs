using System.Text;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage.Tests;

public class DemoProjectTests
{
    private readonly byte[] file = File.ReadAllBytes(Path.Combine(LibraryFiles.DeliveredFolder, "demo-project.json"));
    private readonly Library library = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    [Fact]
    public void Demo_Delivered_HasNoProblems() => Assert.Empty(Example.Read(file).Validate(library));

    [Fact]
    public void Demo_Delivered_IsAsTheProgramWritesIt() =>
        Assert.Equal(Encoding.UTF8.GetString(file), Encoding.UTF8.GetString(ProjectFileWriter.Write(Example.Read(file))));

    /// <summary>What a newcomer opens first shows each verdict, on barriers that are neither idle nor absurd.</summary>
    [Fact]
    public void Demo_Calculated_ShowsEveryVerdictOnRealisticBarriers()
    {
        var openings = Design.Run(Example.Read(file), library).Openings;

        Assert.Equal(
            [VerdictKind.Adequate, VerdictKind.Inadequate, VerdictKind.Incomplete],
            openings.Select(o => o.Verdict.Kind).Distinct().Order());
        Assert.Equal("freeboard", openings.Single(o => o.Verdict.Kind == VerdictKind.Inadequate).Verdict.Governing!.Check);
        Assert.All(
            openings.Where(o => o.Verdict.Kind != VerdictKind.Inadequate),
            o => Assert.InRange(o.Verdict.Governing!.Utilisation, 0.4, 0.95));
    }

    [Fact]
    public void Demo_Calculated_CoverIsAdequateAndNotIdle()
    {
        var cover = Assert.Single(Design.Run(Example.Read(file), library).Covers);

        Assert.Equal(VerdictKind.Adequate, cover.Kind);
        Assert.InRange(cover.Governing!.Utilisation, 0.4, 0.95);
    }
}
