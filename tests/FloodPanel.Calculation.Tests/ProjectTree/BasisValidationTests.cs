using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.ProjectTree;

public class BasisValidationTests
{
    private static readonly DesignBasis Own = DesignBases.AllowableStress with { Title = "Adjusted" };

    [Fact]
    public void OwnBasis_CopyOfTheNamedOne_Accepted() => Refused.Not(With(Own));

    [Theory]
    [InlineData(0.1, true)]
    [InlineData(5, true)]
    [InlineData(0.0999, false)]
    [InlineData(5.001, false)]
    [InlineData(double.NaN, false)]
    public void OwnBasis_LoadFactor_WithinItsLimits(double factor, bool allowed)
    {
        var problems = With(Own with { Coastal = Own.Coastal with { Wind = factor } }).Validate(Library.Empty);

        Assert.Equal(allowed ? [] : ["ownBasis.coastal.wind"], problems.Select(p => p.Path));
    }

    [Fact]
    public void OwnBasis_StrengthFactors_EachNamedByItsPath()
    {
        var rules = Own.Strengths.SetItem(0, Own.Strengths[0] with { Multiplier = 0, Divisor = 11 });

        var problems = With(Own with { Strengths = rules }).Validate(Library.Empty);

        Assert.Equal(["ownBasis.strengths[0].multiplier", "ownBasis.strengths[0].divisor"], problems.Select(p => p.Path));
    }

    [Fact]
    public void OwnBasis_FamilyTwice_Refused()
    {
        var problems = With(Own with { Strengths = Own.Strengths.Add(Own.Strengths[0]) }).Validate(Library.Empty);

        Assert.Equal("ownBasis.strengths[2].family", Assert.Single(problems).Path);
    }

    [Fact]
    public void OwnBasis_WithoutTitleOrOfAnotherKind_Refused()
    {
        Assert.Equal("ownBasis.title", Assert.Single(With(Own with { Title = " " }).Validate(Library.Empty)).Path);
        Assert.Equal("ownBasis", Assert.Single(With(DesignBases.Eurocode).Validate(Library.Empty)).Path);
    }

    [Fact]
    public void Evaluate_OwnBasisWithAProblem_Throws() =>
        Assert.Throws<ArgumentException>(() => Design.Run(With(Own with { Inland = Own.Inland with { Line = 0 } }), Library.Empty));

    private static Project With(DesignBasis own) => SampleProject.Project with { OwnBasis = own };
}
