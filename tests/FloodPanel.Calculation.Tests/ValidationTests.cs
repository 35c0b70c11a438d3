using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests;

public class ValidationTests
{
    [Theory]
    [InlineData("")]
    [InlineData("   ")]
    public void Validate_NameEmpty_Refused(string name) => Refused.Once(
        SampleProject.Project with { Name = name },
        "name",
        "Project name is empty; give the project a name.",
        "Project name is empty; give the project a name.");

    [Theory]
    [InlineData("")]
    [InlineData("loading dock")]
    [InlineData("dock_1")]
    [InlineData("tür")]
    public void Validate_IdOfOtherSigns_Refused(string id) => Refused.Once(
        Refused.With((Opening o) => o with { Id = id }),
        "openings[0].id",
        $"Id is \"{id}\"; allowed are 1 to 60 letters, digits and hyphens.",
        $"Id is \"{id}\"; allowed are 1 to 60 letters, digits and hyphens.");

    [Theory]
    [InlineData(60, true)]
    [InlineData(61, false)]
    public void IsIdentifier_Length_UpToSixty(int length, bool allowed) =>
        Assert.Equal(allowed, Validation.IsIdentifier(new string('a', length)));

    [Fact]
    public void Validate_SameIdTwice_RefusedAtTheSecond() => Refused.Once(
        SampleProject.Project with { Openings = [SampleProject.Dock, SampleProject.Dock] },
        "openings[1].id",
        "Id \"dock\" is used by an earlier opening; each needs its own.",
        "Id \"dock\" is used by an earlier opening; each needs its own.");

    [Fact]
    public void Validate_NoOpenings_Accepted() => Refused.Not(SampleProject.Project with { Openings = [] });

    /// <summary>The design flood level is 4.45 m.</summary>
    [Fact]
    public void Validate_SillMoreThanTwentyMetresBelowTheFlood_Refused()
    {
        Refused.Not(Refused.With((Opening o) => o with { SillLevel = -15.55 }));
        Refused.Once(
            Refused.With((Opening o) => o with { SillLevel = -15.5501 }),
            "openings[0].sillLevel",
            "Sill level is -15.550 m, 20.0001 m below the design flood level, 4.450 m; allowed is up to 20.000 m below it.",
            "Sill level is -51.02 ft, 65.617126 ft below the design flood level, 14.60 ft; allowed is up to 65.62 ft below it.");
    }

    [Fact]
    public void Validate_WaterBehindAboveTheFlood_Refused()
    {
        Refused.Not(Refused.With((Opening o) => o with { ProtectedSideLevel = 4.45 }));
        Refused.Not(Refused.With((Opening o) => o with { ProtectedSideLevel = 4.4500009 }));
        Refused.Once(
            Refused.With((Opening o) => o with { ProtectedSideLevel = 4.4501 }),
            "openings[0].protectedSideLevel",
            "Protected-side water level is 4.4501 m, above the design flood level, 4.45 m; allowed is up to that level, because reverse head is not covered.",
            "Protected-side water level is 14.6000656 ft, above the design flood level, 14.5997375 ft; allowed is up to that level, because reverse head is not covered.");
    }

    /// <summary>All of them, as they stand in the file: the project, the site, then each opening from top to bottom.</summary>
    [Fact]
    public void Validate_SeveralProblems_AllInTheOrderOfTheFile()
    {
        var site = SampleProject.Project.Site with
        {
            WaterDensity = 900,
            Freeboard = double.NaN,
            Levels = [new(0.5, 3), new(2, double.NaN)],
        };
        var opening = SampleProject.Dock with
        {
            Id = "?",
            SillLevel = -30,
            ClearHeight = 0,
            RakeDegrees = 61,
            ProtectedSideLevel = 5,
            Actions = new() { Flow = new() { Velocity = -1, ShapeCoefficient = 1 }, Wind = new() { Pressure = -1 } },
            Barrier = SampleProject.Dock.Barrier with
            {
                Logs = SampleProject.Dock.Barrier.Logs with { Count = 0, EndBearing = 0.06 },
                Bays = [2.1, double.NaN],
                ByOthers = [new("paint", "", "")],
            },
        };

        var problems = new Project { Site = site, Openings = [opening, SampleProject.Dock with { Id = "dock", ClearWidth = -1 }] }
            .Validate(Library.Empty);

        Assert.Equal(
            [
                "name", "site.waterDensity", "site.freeboard", "site.levels[1].annualProbability", "site.levels[1].level",
                "openings[0].id", "openings[0].sillLevel", "openings[0].clearHeight", "openings[0].rake",
                "openings[0].protectedSideLevel", "openings[0].actions.flow.velocity", "openings[0].actions.flow.shapeCoefficient",
                "openings[0].actions.wind.pressure", "openings[0].barrier.logs.count", "openings[0].barrier.bays[1]",
                "openings[0].barrier.posts.width", "openings[0].barrier.byOthers[0].check",
                "openings[1].clearWidth",
            ],
            problems.Select(p => p.Path));
    }
}
