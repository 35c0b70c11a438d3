using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Generated;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests;

/// <summary>The dock: flood level 4.45 m, sill 3.6 m, barrier 1.2 m, clear height 2.6 m.</summary>
public class CautionsTests
{
    [Fact]
    public void Notes_NothingSpecial_WhatLogsAndPostsLackAndTheSafetyWords()
    {
        var notes = Notes((LogStack l) => l with { Sealed = false });

        Assert.Equal(["buckling-strength", "post-buckling-strength", "post-lateral", "calculation-aid"], notes.Select(n => n.Code));
        var note = notes[^1];
        Assert.Equal(
            "This is a calculation aid. It must be checked by a licensed engineer and follow local codes. A barrier can fail or be overtopped: people leave when told to.",
            note.Text.ToString());
    }

    /// <summary>Sill as high as the flood, though 4.1 + 0.25 + 0.1 falls short of 4.45 in binary fractions.</summary>
    [Theory]
    [InlineData(4.45, true)]
    [InlineData(4.6, true)]
    [InlineData(4.449, false)]
    public void SillDry_FloodNotAboveTheSill(double sill, bool noted) =>
        AssertNote("sill-dry", noted, (Opening o) => o with { SillLevel = sill });

    [Theory]
    [InlineData(3.25, false)]
    [InlineData(3.2491, false)]
    [InlineData(3.2489, true)]
    public void Overtopped_FloodMoreThanAMillimetreOverTheTop(double sill, bool noted) =>
        AssertNote("overtopped", noted, (Opening o) => o with { SillLevel = sill });

    /// <summary>Six times 0.2 is a little more than 1.2 in binary fractions.</summary>
    [Theory]
    [InlineData(1.2, false)]
    [InlineData(1.1991, false)]
    [InlineData(1.1989, true)]
    public void TallerThanOpening_MoreThanAMillimetre(double clearHeight, bool noted) =>
        AssertNote("taller-than-opening", noted, (Opening o) => o with { ClearHeight = clearHeight });

    [Fact]
    public void TallerThanOpening_Sentence_InBothSystems()
    {
        var text = Note("taller-than-opening", (Opening o) => o with { ClearHeight = 0.9144 })!.Text;

        Assert.Equal("The barrier, 1.200 m high, is taller than the clear height of the opening, 0.914 m: check that the top logs can be placed.", text.In(UnitSystem.SI));
        Assert.Equal("The barrier, 3.94 ft high, is taller than the clear height of the opening, 3.00 ft: check that the top logs can be placed.", text.In(UnitSystem.USCustomary));
    }

    [Theory]
    [InlineData(3.05, false)]
    [InlineData(3.06, true)]
    public void FlowDetailedAnalysis_AboveTheLimit(double velocity, bool noted) => AssertNote(
        "flow-detailed-analysis", noted, (Opening o) => o with { Actions = new() { Flow = new() { Velocity = velocity } } });

    /// <summary>Masonry 0.9 m (USACE 1985), cavity masonry 0.6 m (CLG/Defra 2007), frames as soon as there is water; concrete never.</summary>
    [Theory]
    [InlineData(WallKind.Masonry, 0.9, false)]
    [InlineData(WallKind.Masonry, 0.901, true)]
    [InlineData(WallKind.CavityMasonry, 0.6, false)]
    [InlineData(WallKind.CavityMasonry, 0.601, true)]
    [InlineData(WallKind.TimberFrame, 0, false)]
    [InlineData(WallKind.TimberFrame, 0.001, true)]
    [InlineData(WallKind.SteelFrame, 0.001, true)]
    [InlineData(WallKind.ReinforcedConcrete, 1.1, false)]
    public void WallDepth_DepthAgainstTheWall(WallKind wall, double depth, bool noted) => AssertNote(
        "wall-depth", noted, (Opening o) => o with { Wall = wall, SillLevel = 4.45 - depth });

    /// <summary>The wall feels the water down to the outside ground, not to the sill.</summary>
    [Fact]
    public void WallDepth_GroundBelowTheSill_MeasuredFromTheGround()
    {
        var note = Note("wall-depth", (Opening o) => o with { Wall = WallKind.Masonry, GroundLevel = 3.45 })!;

        Assert.StartsWith("1.000 m of water stands against an unreinforced masonry wall; about 0.900 m", note.Text.ToString(), StringComparison.Ordinal);
    }

    /// <summary>A log of 10 cm² cut to 2.17 m by its density: 22.8, 23.2, 30.6 and 30.8 kg about the limits of 23 and 30.67 kg.</summary>
    [Theory]
    [InlineData(10_500, null)]
    [InlineData(10_700, "log-two-people")]
    [InlineData(14_100, "log-two-people")]
    [InlineData(14_200, "log-too-heavy")]
    public void Lifting_MassOfALog_OnePersonTwoPeopleOrGear(double density, string? code)
    {
        var profile = new GivenProperties { Height = 0.2, Depth = 0.1, Area = 1e-3, Inertia = 1e-6, Modulus = 2e-5, PlasticModulus = 3e-5, ShearArea = 1e-3 };

        var codes = Notes((LogStack l) => l with { Profile = profile, Material = SampleProject.Aluminium with { Density = density } })
            .Select(n => n.Code).Where(c => c.StartsWith("log-", StringComparison.Ordinal));

        Assert.Equal(code is null ? [] : [code], codes);
    }

    [Fact]
    public void ByOthersUnnamed_EachDeclarationWithoutNameOrReference()
    {
        var notes = Notes((Barrier b) => b with { ByOthers = [new("anchors", "N", ""), new("guides", "N", "R"), new("supporting-wall", "", "R")] });

        Assert.Equal(
            [
                "Declared designed by others without a name and a reference: anchors. Enter both, or the check stays missing.",
                "Declared designed by others without a name and a reference: supporting wall. Enter both, or the check stays missing.",
            ],
            notes.Where(n => n.Code == "by-others-unnamed").Select(n => n.Text.ToString()));
    }

    [Theory]
    [InlineData(null, null, "bending and shear")]
    [InlineData(null, 1e6, "bending")]
    [InlineData(1e6, null, "shear")]
    public void StrengthMissing_SaysWhich(double? bending, double? shear, string what)
    {
        var timber = new Material { Family = MaterialFamily.Timber, Density = 500, ElasticModulus = 11e9, AllowableBending = bending, AllowableShear = shear };

        var notes = Notes((LogStack l) => l with { Material = timber });

        Assert.Equal(
            $"The logs have no design {what} stress: enter an allowable stress, or a strength that the design basis covers for timber.",
            notes.Single(n => n.Code == "strength-missing").Text.ToString());
    }

    /// <summary>Each code exactly where its condition holds, whatever the opening.</summary>
    [Property(MaxTest = 200, Arbitrary = [typeof(Scenarios)])]
    public void Notes_AnyOpening_EachCodeWhereItApplies(Scenario scenario)
    {
        var (opening, result) = (scenario.Opening, scenario.Result);
        var (depth, height, actions) = (result.RetainedDepth, result.BarrierHeight, opening.Actions);
        var codes = result.Notes.Select(n => n.Code).ToArray();
        int Count(string code) => codes.Count(c => c == code);

        Assert.Equal(depth <= 0, codes.Contains("sill-dry"));
        Assert.Equal(depth > height + 0.001, codes.Contains("overtopped"));
        Assert.Equal(height > opening.ClearHeight + 0.001, codes.Contains("taller-than-opening"));
        Assert.Equal(actions.Flow is { Velocity: > 3.05 }, codes.Contains("flow-detailed-analysis"));
        Assert.Equal(opening.Barrier.ByOthers.Count(d => d.Name.Length == 0 || d.Reference.Length == 0), Count("by-others-unnamed"));
        Assert.Equal(result.Schedule.Max(s => s.Mass) > 92.0 / 3, codes.Contains("log-too-heavy"));
        Assert.Equal(result.Schedule.Max(s => s.Mass) is > 23 and <= 92.0 / 3, codes.Contains("log-two-people"));
        Assert.Equal(1, Count("calculation-aid"));
        Assert.Equal("calculation-aid", codes[^1]);
    }

    private static void AssertNote(string code, bool noted, Func<Opening, Opening> change) =>
        Assert.Equal(noted, Note(code, change) is not null);

    private static Note? Note(string code, Func<Opening, Opening> change) =>
        SampleProject.Result(Refused.With(change)).Notes.SingleOrDefault(n => n.Code == code);

    private static IReadOnlyList<Note> Notes(Func<LogStack, LogStack> change) => SampleProject.Result(Refused.With(change)).Notes;

    private static IReadOnlyList<Note> Notes(Func<Barrier, Barrier> change) => SampleProject.Result(Refused.With(change)).Notes;
}
