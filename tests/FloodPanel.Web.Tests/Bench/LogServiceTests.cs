using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class LogServiceTests : BenchContext
{
    private LogStack Logs => Editor.Project.Openings[0].Barrier.Logs;

    [Fact]
    public void Joint_On_ChecksTravelAndSeal()
    {
        var page = Open("garage");
        page.Find("[data-testid='switch-logs.joint']").Change(true);

        Field(page, "logs.joint.travel").Input("4");
        Field(page, "logs.joint.sealCompression").Input("2.5");

        Assert.Equal(new LogJoint { Travel = 0.004, SealCompression = 0.0025 }, Logs.Joint);
        Assert.Contains(
            Editor.Result.Openings[0].Cases[0].Logs[0].Others, c => c is { Name: "log-end-seal", Capacity: 0.0025 });
    }

    [Fact]
    public void Joint_SwitchedOffAndOn_IsWhatItWas()
    {
        var page = Open("garage");
        page.Find("[data-testid='switch-logs.joint']").Change(true);
        Field(page, "logs.joint.travel").Input("4");

        page.Find("[data-testid='switch-logs.joint']").Change(false);
        Assert.Null(Logs.Joint);
        page.Find("[data-testid='switch-logs.joint']").Change(true);

        Assert.Equal(0.004, Logs.Joint!.Travel);
    }

    /// <summary>Duration stands there for timber only, and changes the design stress by k_mod.</summary>
    [Fact]
    public void Timber_LongerDuration_LowersTheDesignStress()
    {
        var page = Open("garage");
        Assert.Empty(page.FindAll("[data-testid='switch-logs.timber']"));
        Editor.Do(new("timber", p => p with
        {
            DesignBasis = DesignBasisKind.Eurocode,
            Openings = [p.Openings[0] with { Barrier = p.Openings[0].Barrier with { Logs = Logs with { Material = new LibraryMaterial("c24") } } }],
        }));

        page.Find("[data-testid='switch-logs.timber']").Change(true);
        Choose(page, "logs.timber.duration", "Up to two months");

        Assert.Equal(LoadDuration.MediumTerm, Logs.Timber!.Duration);
    }
}
