using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.Guides;

public class GuideNotesTests
{
    [Theory]
    [InlineData(WallKind.ReinforcedConcrete, null)]
    [InlineData(WallKind.Masonry, "guide-fasteners-masonry")]
    [InlineData(WallKind.CavityMasonry, "guide-fasteners-masonry")]
    [InlineData(WallKind.TimberFrame, "guide-fasteners-frame")]
    [InlineData(WallKind.SteelFrame, "guide-fasteners-frame")]
    public void Notes_GuidesOnAWall_WarnOfItsFasteners(WallKind wall, string? code) => Assert.Equal(
        code is null ? [] : [code],
        Codes(Refused.With((Opening o) => o with { Wall = wall, Barrier = o.Barrier with { Guides = SampleGuides.Reveal } })));

    [Fact]
    public void Notes_NoGuides_NothingAboutThem() =>
        Assert.Empty(Codes(Refused.With((Opening o) => o with { Wall = WallKind.Masonry })));

    /// <summary>End bearing 40 mm; in a reveal the load 30 mm from its surface, 20 mm from a base of 10 mm.</summary>
    [Theory]
    [InlineData(GuideMounting.DryFace, 0.0199, true)]
    [InlineData(GuideMounting.DryFace, 0.02, false)]
    [InlineData(GuideMounting.DryFace, 0, false)]
    [InlineData(GuideMounting.Reveal, 0.0199, true)]
    [InlineData(GuideMounting.Reveal, 0.02, false)]
    [InlineData(GuideMounting.Reveal, 0, true)]
    public void Notes_LipLever_ShorterThanFromTheLoadToTheRoot(GuideMounting mounting, double lever, bool noted)
    {
        var guides = SampleGuides.Reveal with { Mounting = mounting, LipLever = lever, LoadOffset = mounting == GuideMounting.Reveal ? 0.03 : 0.04 };

        Assert.Equal(noted ? ["guide-lip-lever"] : [], Codes(SampleGuides.With(guides)));
    }

    /// <summary>End bearing 40 mm, holes of 12 mm: the load at least 32 mm from the fasteners on a face.</summary>
    [Theory]
    [InlineData(GuideMounting.DryFace, 0.0319, true)]
    [InlineData(GuideMounting.DryFace, 0.0321, false)]
    [InlineData(GuideMounting.Reveal, 0.02, false)]
    public void Notes_LogsOverTheFasteners_OnAFace(GuideMounting mounting, double offset, bool noted) => Assert.Equal(
        noted ? ["guide-over-fasteners"] : [],
        Codes(SampleGuides.With(SampleGuides.Reveal with { Mounting = mounting, LoadOffset = offset })));

    /// <summary>Strip 40 mm from the fasteners.</summary>
    [Theory]
    [InlineData(0.04, true)]
    [InlineData(0.041, false)]
    public void Notes_WetFace_FastenersUnloadedWhileNothingTips(double offset, bool noted) => Assert.Equal(
        noted ? ["guide-wet-face"] : [],
        Codes(SampleGuides.With(SampleGuides.Reveal with { Mounting = GuideMounting.WetFace, LoadOffset = offset })));

    private static IEnumerable<string> Codes(Project project) => SampleProject.Result(project).Notes
        .Select(note => note.Code).Where(code => code.StartsWith("guide-", StringComparison.Ordinal));
}
