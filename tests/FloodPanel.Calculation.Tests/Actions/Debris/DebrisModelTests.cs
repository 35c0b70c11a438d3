using FloodPanel.Calculation.Actions.Debris;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using FloodPanel.Calculation.Tests.Steps;

namespace FloodPanel.Calculation.Tests.Actions.Debris;

/// <summary>Debris resolved for one opening: where it strikes, what each bay feels, and how that came about.</summary>
public class DebrisModelTests
{
    private const double Gamma = 9_806.65;

    /// <summary>A plank of 0.2 m by 50 mm: I = 0.2·0.05³/12 = 2.083333e-6 m⁴, 27 kg/m in aluminium.</summary>
    private static readonly Member Plank = Log(0.2);

    private static readonly DebrisInput Input = new() { Mass = 450, Velocity = 1.5 };

    [Fact]
    public void Of_NoDebris_Null() => Assert.Null(DebrisModel.Of(null, [Plank], Gamma, 0.9, 1.2, [2]));

    [Theory]
    [InlineData(0.9, 0.9)]
    [InlineData(1.2, 1.2)]
    [InlineData(1.5, 1.2)]
    [InlineData(-0.1, 0)]
    public void StrikeHeight_Depth_WaterLineOrTop(double depth, double height) => Assert.Equal(height, Model(Input, depth).StrikeHeight);

    [Theory]
    [InlineData(0.9, 0, true)]
    [InlineData(0.9, 1.049, true)]
    [InlineData(0.9, 1.051, false)]
    [InlineData(0.001, 0, true)]
    [InlineData(0, 0, false)]
    [InlineData(-0.1, 0, false)]
    public void Strikes_LowerEdge_BelowTheReachOfTheObject(double depth, double bottom, bool strikes) =>
        Assert.Equal(strikes, Model(Input, depth).Strikes(bottom));

    [Theory]
    [InlineData(0.2, 2.0 / 3)]
    [InlineData(0.3, 1)]
    [InlineData(0.45, 1)]
    public void LogShare_LogHeight_ShareOfThePatch(double height, double share) =>
        Hand.Equal(share, DebrisModel.Share(height));

    [Fact]
    public void Force_SillDry_None() => Assert.Equal(0, Model(Input, 0).Force(0));

    [Fact]
    public void Force_ResponseTyped_SameInEachBay()
    {
        var model = Model(Input with { Coefficients = new() { Response = 1 } }, 0.9);

        Hand.Equal(Math.PI * 450 * 1.5 / 0.06, model.Force(0));
        Assert.Equal(model.Force(0), model.Force(1));
    }

    /// <summary>
    /// Bay of 2 m, by hand: E·I = 145 833 N·m², T_d = 8/π·√(27/145 833) = 0.034649 s, r = 0.86583, R_d = 1.8;
    /// with 31.416 kg/m of water T_w = 0.050966 s, r = 0.58863, R_w = 1.5 + 0.2·0.8863 = 1.67726. Bay of 4 m: four times
    /// the period: r = 0.21646 and 0.14716, R_d = 0.8 + 0.3·0.1646 = 0.84937.
    /// </summary>
    [Fact]
    public void Force_ResponseOfTheLog_FollowsTheSpanAndTheLargerCounts()
    {
        var model = Model(Input, 0.9);

        Assert.Equal(1.8 * Math.PI * 450 * 1.5 / 0.06, model.Force(0), tolerance: 0.5);
        Assert.Equal(0.84937 * Math.PI * 450 * 1.5 / 0.06, model.Force(1), tolerance: 1);
        Assert.Equal(0, model.GreatestBay);
        Assert.Equal(1.67726, model.Working(0).Steps.Single(s => s.Symbol == "R_w").Value, tolerance: 1e-4);
    }

    /// <summary>Stops that put the ratio on either side of 1/2, between rows, on the last row and far beyond it.</summary>
    [Theory]
    [InlineData(0.001)]
    [InlineData(0.0123)]
    [InlineData(0.03)]
    [InlineData(0.045)]
    [InlineData(0.1)]
    [InlineData(5)]
    public void Working_AnyStop_EveryLineHoldsAndEndsInTheForce(double stop)
    {
        var model = Model(Input with { StoppingTime = stop, Coefficients = new() { Orientation = 0.8, Depth = 0.75 } }, 0.9);

        foreach (var bay in new[] { 0, 1 })
        {
            var working = model.Working(bay);

            Assert.Empty(StepAudit.Complaints(working.Title, working.Steps));
            Assert.Equal(model.Force(bay), working.Steps[^1].Value);
            Assert.Contains("Blevins", working.Source, StringComparison.Ordinal);
        }
    }

    /// <summary>The table stands beside the exact spectrum, and is never far from it: 0.1, half a unit of its digit and what lies between rows.</summary>
    [Fact]
    public void Working_ResponseOfTheLog_HeldAgainstTheExactSpectrum()
    {
        var steps = Model(Input, 0.9).Working(0).Steps;

        double Of(string symbol) => steps.Single(s => s.Symbol == symbol).Value;
        Assert.Equal(Of("S_d"), Of("R_d"), tolerance: 0.1);
        Assert.Equal(Of("S_w"), Of("R_w"), tolerance: 0.1);
        Assert.Equal(Math.Max(Of("R_d"), Of("R_w")), Of("R_max"));
    }

    [Fact]
    public void Notes_ForceAboveZeroOrSillDry_None()
    {
        Assert.Empty(DebrisNotes.Of(Model(Input, 0.9)));
        Assert.Empty(DebrisNotes.Of(Model(Input with { Velocity = 0 }, 0)));
    }

    [Fact]
    public void Notes_CoefficientsAtZero_NamedAsWithoutEffect()
    {
        var input = Input with { Coefficients = new() { Depth = DebrisTables.ShallowDepth(0.3), Blockage = 0 } };

        var note = Assert.Single(DebrisNotes.Of(Model(input, 0.9)));

        Assert.Equal("debris-without-effect", note.Code);
        Assert.StartsWith("With depth coefficient and screening at 0, debris puts no force", note.Text.ToString(), StringComparison.Ordinal);
    }

    private static DebrisModel Model(DebrisInput input, double depth) => DebrisModel.Of(input, [Plank], Gamma, depth, 1.2, [2, 4])!;

    private static Member Log(double height)
    {
        var profile = new Rectangle { Height = height, Depth = 0.05 };
        return new(SampleProject.Aluminium, profile, SectionProperties.Of(profile), null, null, 200);
    }
}
