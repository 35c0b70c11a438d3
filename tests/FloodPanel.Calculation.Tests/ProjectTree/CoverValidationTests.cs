using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Tests.Covers;

namespace FloodPanel.Calculation.Tests.ProjectTree;

public class CoverValidationTests
{
    private static readonly RectangleCover Rectangle = new();

    private static readonly (string Path, Field Field, Func<double, Cover> With)[] Inputs =
    [
        ("plate.width", CoverFields.Width, v => SampleCovers.Vent with { Plate = Rectangle with { Width = v } }),
        ("plate.height", CoverFields.Height, v => SampleCovers.Vent with { Plate = Rectangle with { Height = v } }),
        ("plate.diameter", CoverFields.Diameter, v => SampleCovers.Vent with { Plate = new CircleCover { Diameter = v } }),
        ("level", CoverFields.Level, v => SampleCovers.Vent with { Level = v }),
        ("thickness", CoverFields.Thickness, v => SampleCovers.Vent with { Thickness = v }),
        ("poissonRatio", CoverFields.PoissonRatio, v => SampleCovers.Vent with { PoissonRatio = v }),
        ("deflectionLimit", CoverFields.DeflectionLimit, v => SampleCovers.Vent with { DeflectionLimit = v }),
        ("fasteners.pitch", CoverFields.Pitch, v => SampleCovers.Vent.WithFasteners(f => f with { Pitch = v })),
        ("fasteners.gasketLoad", CoverFields.GasketLoad, v => SampleCovers.Vent.WithFasteners(f => f with { GasketLoad = v })),
        ("fasteners.fixingLever", CoverFields.FixingLever, v => SampleCovers.Vent.WithFasteners(f => f with { FixingLever = v })),
        ("fasteners.tension", CoverFields.Tension, v => SampleCovers.Vent.WithFasteners(f => f with { Tension = v })),
    ];

    public static TheoryData<string> Paths => [.. Inputs.Select(i => i.Path)];

    [Theory]
    [MemberData(nameof(Paths))]
    public void Validate_BeyondTheLimits_RefusedOnceInTheWordsOfTheField(string leaf)
    {
        var (_, field, with) = Inputs.Single(i => i.Path == leaf);
        var least = field.MinimumExcluded ? field.Minimum : Math.BitDecrement(field.Minimum);

        Assert.All([least, Math.BitIncrement(field.Maximum), double.NaN, double.PositiveInfinity], value =>
        {
            var expected = new InputProblem($"covers[0].{leaf}", field.Refusal(value)!);
            Assert.Equal(expected, Assert.Single(With(with(value)).Validate(Library.Empty)));
        });
    }

    [Fact]
    public void Validate_SampleCovers_NoProblems() =>
        Refused.Not(SampleCovers.Project with { Covers = [SampleCovers.Hatch, SampleCovers.Vent] });

    [Fact]
    public void Validate_NameEmpty_Refused() => Refused.Once(
        With(SampleCovers.Vent with { Name = " " }), "covers[0].name",
        "Name of the cover is empty; give it one that says where it is.", "Name of the cover is empty; give it one that says where it is.");

    [Fact]
    public void Validate_FarBelowTheWater_Refused() => Refused.Once(
        With(SampleCovers.Vent with { Level = -10.5 }), "covers[0].level",
        "Level is -10.500 m, 20.5 m below the design flood level, 10.000 m; allowed is up to 20.000 m below it.",
        "Level is -34.45 ft, 67.2572178 ft below the design flood level, 32.81 ft; allowed is up to 65.62 ft below it.");

    [Fact]
    public void Evaluate_CoverWithAProblem_Refused() =>
        Assert.Throws<ArgumentException>(() => SampleCovers.Evaluate(SampleCovers.Vent with { Thickness = 0 }));

    private static Project With(Cover cover) => SampleCovers.Project with { Covers = [cover] };
}
