using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests.ProjectTree;

/// <summary>The dock: six logs of 200 mm, 1.2 m high.</summary>
public class ActionValidationTests
{
    [Fact]
    public void Line_AtTheTopOfTheBarrier_Accepted() => Refused.Not(WithLineAt(1.2));

    [Fact]
    public void Line_AboveTheTopOfTheBarrier_Refused() => Refused.Once(
        WithLineAt(1.25),
        "openings[0].actions.line.height",
        "Line load height is 1.25 m; allowed is up to the top of the barrier, 1.200 m.",
        "Line load height is 4.10104987 ft; allowed is up to the top of the barrier, 3.94 ft.");

    /// <summary>Raked by 60°, 1.2 m of logs stand 0.6 m high.</summary>
    [Theory]
    [InlineData(0.6, true)]
    [InlineData(0.62, false)]
    public void Line_OnARakedFace_MeasuredUpright(double height, bool allowed)
    {
        var project = Refused.With((Opening o) => o with { RakeDegrees = 60, Actions = new() { Line = new() { Height = height } } });

        Assert.Equal(allowed, project.Validate(Library.Empty).Count == 0);
    }

    [Fact]
    public void Line_LogsThatAreRefusedThemselves_SaysNothingMore()
    {
        var project = Refused.With((Opening o) => o with
        {
            Actions = new() { Line = new() { Height = 1 } },
            Barrier = o.Barrier with { Logs = o.Barrier.Logs with { Count = -3 } },
        });

        Assert.Equal(["openings[0].barrier.logs.count"], project.Validate(Library.Empty).Select(p => p.Path));
    }

    private static Project WithLineAt(double height) => Refused.With(new ActionSet { Line = new() { Force = 740, Height = height } });
}
