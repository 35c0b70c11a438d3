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
            Editor.ResultFor(Editor.Project.Openings[0].Id)!.Cases[0].Logs[0].Others, c => c is { Name: "log-end-seal", Capacity: 0.0025 });
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

    [Fact]
    public void Timber_IsThere_HasADurationToChoose()
    {
        var page = Open("garage");
        Assert.Empty(page.FindAll("[data-testid='switch-logs.timber']"));
        Choose(page, "logs.material", "Own figures");
        Choose(page, "logs.material.family", "Timber");

        page.Find("[data-testid='switch-logs.timber']").Change(true);
        Choose(page, "logs.timber.duration", "Up to two months");
        Field(page, "logs.timber.sizeFactor").Input("1.2");

        Assert.Equal(new TimberService { Duration = LoadDuration.MediumTerm, SizeFactor = 1.2 }, Logs.Timber);
    }

    [Fact]
    public void Composite_IsThere_HasFactorsToEnter()
    {
        var page = Open("garage");
        Choose(page, "logs.material", "Own figures");
        Choose(page, "logs.material.family", "Composite");

        page.Find("[data-testid='switch-logs.composite']").Change(true);
        Field(page, "logs.composite.materialFactor").Input("2");
        Field(page, "logs.composite.conversionFactor").Input("0.6");

        Assert.Equal(new CompositeService { MaterialFactor = 2, ConversionFactor = 0.6 }, Logs.Composite);
    }
}
