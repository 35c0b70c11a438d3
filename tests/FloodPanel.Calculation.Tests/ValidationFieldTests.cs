using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests;

/// <summary>Every numeric input is held to the limits of its own field, at its own path.</summary>
public class ValidationFieldTests
{
    private static readonly NonBreakingWaveInput Wave = new() { Height = 0.3, Period = 3 };

    private static readonly GivenProperties Given = new()
    {
        Height = 0.2,
        Depth = 0.1,
        Area = 1e-3,
        Inertia = 1e-6,
        Modulus = 2e-5,
        PlasticModulus = 3e-5,
        ShearArea = 1e-3,
    };

    private static readonly (string Path, Field Field, Func<double, Project> With)[] Inputs =
    [
        ("site.waterDensity", Fields.WaterDensity, v => Refused.With((Site s) => s with { WaterDensity = v })),
        ("site.annualProbability", Fields.AnnualProbability, v => Refused.With((Site s) => s with { AnnualProbability = v })),
        ("site.designStillWaterLevel", Fields.DesignStillWaterLevel, v => Refused.With((Site s) => s with { DesignStillWaterLevel = v })),
        ("site.surge", Fields.Surge, v => Refused.With((Site s) => s with { Surge = v })),
        ("site.climateAllowance", Fields.ClimateAllowance, v => Refused.With((Site s) => s with { ClimateAllowance = v })),
        ("site.climateRatePerYear", Fields.ClimateRate, v => Refused.With((Site s) => s with { ClimateRatePerYear = v })),
        ("site.designLifeYears", Fields.DesignLife, v => Refused.With((Site s) => s with { DesignLifeYears = v })),
        ("site.freeboard", Fields.Freeboard, v => Refused.With((Site s) => s with { Freeboard = v })),
        ("site.levels[0].annualProbability", Fields.LevelProbability, v => Refused.With((Site s) => s with { Levels = [new(v, 1)] })),
        ("site.levels[0].level", Fields.LevelValue, v => Refused.With((Site s) => s with { Levels = [new(0.1, v)] })),
        ("openings[0].sillLevel", Fields.SillLevel, v => Refused.With((Opening o) => o with { SillLevel = v })),
        ("openings[0].groundLevel", Fields.GroundLevel, v => Refused.With((Opening o) => o with { GroundLevel = v })),
        ("openings[0].clearWidth", Fields.ClearWidth, v => Refused.With((Opening o) => o with { ClearWidth = v })),
        ("openings[0].clearHeight", Fields.ClearHeight, v => Refused.With((Opening o) => o with { ClearHeight = v })),
        ("openings[0].rake", Fields.Rake, v => Refused.With((Opening o) => o with { RakeDegrees = v })),
        ("openings[0].protectedSideLevel", Fields.ProtectedSideLevel, v => Refused.With((Opening o) => o with { ProtectedSideLevel = v })),
        ("openings[0].actions.flow.velocity", Fields.FlowVelocity, v => Refused.With(new ActionSet { Flow = new() { Velocity = v } })),
        ("openings[0].actions.flow.shapeCoefficient", Fields.ShapeCoefficient, v => Refused.With(new ActionSet { Flow = new() { ShapeCoefficient = v } })),
        ("openings[0].actions.wave.height", Fields.WaveHeight, v => Refused.With(new ActionSet { Wave = Wave with { Height = v } })),
        ("openings[0].actions.wave.period", Fields.WavePeriod, v => Refused.With(new ActionSet { Wave = Wave with { Period = v } })),
        ("openings[0].actions.wave.angle", Fields.WaveAngle, v => Refused.With(new ActionSet { Wave = Wave with { AngleDegrees = v } })),
        ("openings[0].actions.wave.bedSlope", Fields.BedSlope, v => Refused.With(new ActionSet { Wave = Wave with { BedSlope = v } })),
        ("openings[0].actions.debris.mass", Fields.DebrisMass, v => Refused.With(new ActionSet { Debris = new() { Mass = v } })),
        ("openings[0].actions.debris.velocity", Fields.DebrisVelocity, v => Refused.With(new ActionSet { Debris = new() { Velocity = v } })),
        ("openings[0].actions.debris.stoppingTime", Fields.StoppingTime, v => Refused.With(new ActionSet { Debris = new() { StoppingTime = v } })),
        ("openings[0].actions.debris.coefficients.importance", Fields.DebrisCoefficient, v => Debris(new() { Importance = v })),
        ("openings[0].actions.debris.coefficients.orientation", Fields.DebrisCoefficient, v => Debris(new() { Orientation = v })),
        ("openings[0].actions.debris.coefficients.depth", Fields.DebrisCoefficient, v => Debris(new() { Depth = v })),
        ("openings[0].actions.debris.coefficients.blockage", Fields.DebrisCoefficient, v => Debris(new() { Blockage = v })),
        ("openings[0].actions.debris.coefficients.response", Fields.DebrisCoefficient, v => Debris(new() { Response = v })),
        ("openings[0].actions.wind.pressure", Fields.WindPressure, v => Refused.With(new ActionSet { Wind = new() { Pressure = v } })),
        ("openings[0].actions.line.force", Fields.LineLoadForce, v => Refused.With(new ActionSet { Line = new() { Force = v } })),
        ("openings[0].actions.line.height", Fields.LineLoadHeight, v => Refused.With(new ActionSet { Line = new() { Height = v } })),
        ("openings[0].barrier.logs.endBearing", Fields.EndBearing, v => Refused.With((LogStack l) => l with { EndBearing = v })),
        ("openings[0].barrier.logs.deflectionLimit", Fields.LogDeflectionLimit, v => Refused.With((LogStack l) => l with { DeflectionLimit = v })),
        ("openings[0].barrier.logs.fittingClearance", Fields.FittingClearance, v => Refused.With((LogStack l) => l with { FittingClearance = v })),
        ("openings[0].barrier.bays[1]", Fields.BayWidth, v => Refused.With((Barrier b) => b with { Bays = [2.1, v] })),
        ("openings[0].barrier.posts.width", Fields.PostWidth, v => Refused.With((PostSet p) => p with { Width = v })),
        ("openings[0].barrier.posts.deflectionLimit", Fields.PostDeflectionLimit, v => Refused.With((PostSet p) => p with { DeflectionLimit = v })),
        ("openings[0].barrier.logs.material.density", Fields.MaterialDensity, v => LogMaterial(m => m with { Density = v })),
        ("openings[0].barrier.logs.material.elasticModulus", Fields.ElasticModulus, v => LogMaterial(m => m with { ElasticModulus = v })),
        ("openings[0].barrier.logs.material.bendingStrength", Fields.BendingStrength, v => LogMaterial(m => m with { BendingStrength = v })),
        ("openings[0].barrier.logs.material.shearStrength", Fields.ShearStrength, v => LogMaterial(m => m with { ShearStrength = v })),
        ("openings[0].barrier.logs.material.allowableBending", Fields.AllowableBending, v => LogMaterial(m => m with { AllowableBending = v })),
        ("openings[0].barrier.logs.material.allowableShear", Fields.AllowableShear, v => LogMaterial(m => m with { AllowableShear = v })),
        ("openings[0].barrier.posts.material.density", Fields.MaterialDensity, v => Refused.With((PostSet p) => p with { Material = SampleProject.Steel with { Density = v } })),
        ("openings[0].barrier.logs.profile.height", Fields.ProfileHeight, v => LogProfile(Given with { Height = v })),
        ("openings[0].barrier.logs.profile.depth", Fields.ProfileDepth, v => LogProfile(Given with { Depth = v })),
        ("openings[0].barrier.logs.profile.area", Fields.Area, v => LogProfile(Given with { Area = v })),
        ("openings[0].barrier.logs.profile.inertia", Fields.Inertia, v => LogProfile(Given with { Inertia = v })),
        ("openings[0].barrier.logs.profile.modulus", Fields.Modulus, v => LogProfile(Given with { Modulus = v })),
        ("openings[0].barrier.logs.profile.plasticModulus", Fields.PlasticModulus, v => LogProfile(Given with { PlasticModulus = v })),
        ("openings[0].barrier.logs.profile.shearArea", Fields.ShearArea, v => LogProfile(Given with { ShearArea = v })),
        ("openings[0].barrier.logs.profile.face", Fields.Face, v => LogProfile(new HollowRectangle { Height = 1, Depth = 2, Face = v, Web = 0.01 })),
        ("openings[0].barrier.logs.profile.web", Fields.Web, v => LogProfile(new HollowRectangle { Height = 2, Depth = 1, Face = 0.01, Web = v })),
        ("openings[0].barrier.logs.profile.wall", Fields.Wall, v => LogProfile(new RectangularTube { Height = 2, Depth = 2, Wall = v })),
        ("openings[0].barrier.logs.profile.cornerRadius", Fields.CornerRadius, v => LogProfile(new RectangularTube { Height = 2, Depth = 2, Wall = 0.4, CornerRadius = v })),
        ("openings[0].barrier.logs.profile.innerRadius", Fields.InnerRadius, v => LogProfile(new RectangularTube { Height = 2, Depth = 2, Wall = 0.4, InnerRadius = v })),
        ("openings[0].barrier.posts.profile.flange", Fields.Flange, v => Refused.With((PostSet p) => p with { Profile = new ISection { Height = 1, Depth = 2, Flange = v, Web = 0.01 } })),
        ("openings[0].barrier.posts.profile.web", Fields.Web, v => Refused.With((PostSet p) => p with { Profile = new ISection { Height = 1, Depth = 2, Flange = 0.01, Web = v } })),
    ];

    public static TheoryData<string> Paths => [.. Inputs.Select(i => i.Path)];

    [Theory]
    [MemberData(nameof(Paths))]
    public void Validate_BeyondTheLimits_RefusedOnceInTheWordsOfTheField(string path)
    {
        var (_, field, with) = Inputs.Single(i => i.Path == path);
        var least = field.MinimumExcluded ? field.Minimum : Math.BitDecrement(field.Minimum);
        double[] refused =
            [least, Math.BitIncrement(field.Maximum), double.NaN, double.PositiveInfinity, double.NegativeInfinity];

        Assert.All(refused, value =>
        {
            var expected = new InputProblem(path, field.Refusal(value)!);
            Assert.Single(with(value).Validate(Library.Empty), problem => problem == expected);
        });
    }

    [Theory]
    [MemberData(nameof(Paths))]
    public void Validate_AtTheLimits_NotRefusedByTheField(string path)
    {
        var (_, field, with) = Inputs.Single(i => i.Path == path);
        var least = field.MinimumExcluded ? Math.BitIncrement(field.Minimum) : field.Minimum;

        Assert.All([least, field.Maximum], value => Assert.DoesNotContain(
            with(value).Validate(Library.Empty),
            problem => problem.Path == path && problem.Message.ToString().Contains($"{field.Label} is", StringComparison.Ordinal)
                && problem.Message.ToString().Contains(field.Allowed.ToString().Replace("from ", "", StringComparison.Ordinal), StringComparison.Ordinal)));
    }

    /// <summary>Whole numbers: logs, webs and risk category.</summary>
    [Theory]
    [InlineData(0, false)]
    [InlineData(1, true)]
    [InlineData(100, true)]
    [InlineData(101, false)]
    public void Validate_LogCount_OneToAHundred(int count, bool allowed) =>
        AssertRefusal(Refused.With((LogStack l) => l with { Count = count }), "openings[0].barrier.logs.count", allowed);

    [Theory]
    [InlineData(1, false)]
    [InlineData(2, true)]
    [InlineData(50, true)]
    [InlineData(51, false)]
    public void Validate_Webs_TwoToFifty(int webs, bool allowed) => AssertRefusal(
        LogProfile(new HollowRectangle { Height = 0.2, Depth = 0.09, Face = 0.003, Web = 0.001, Webs = webs }),
        "openings[0].barrier.logs.profile.webs",
        allowed);

    [Theory]
    [InlineData(0, false)]
    [InlineData(1, true)]
    [InlineData(4, true)]
    [InlineData(5, false)]
    public void Validate_RiskCategory_OneToFour(int category, bool allowed) => AssertRefusal(
        Refused.With(new ActionSet { Wave = new BreakingWaveInput { RiskCategory = category } }),
        "openings[0].actions.wave.riskCategory",
        allowed);

    private static void AssertRefusal(Project project, string path, bool allowed)
    {
        var problems = project.Validate(Library.Empty);

        Assert.Equal(allowed ? [] : [path], problems.Select(p => p.Path));
    }

    private static Project Debris(DebrisCoefficients coefficients) =>
        Refused.With(new ActionSet { Debris = new() { Coefficients = coefficients } });

    private static Project LogMaterial(Func<Material, Material> change) =>
        Refused.With((LogStack l) => l with { Material = change(SampleProject.Aluminium) });

    private static Project LogProfile(Profile profile) => Refused.With((LogStack l) => l with { Profile = profile });
}
