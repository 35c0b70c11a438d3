using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class MaterialFiguresTests : BenchContext
{
    private Material Material => (Material)Editor.Project.Openings[0].Barrier.Logs.Material;

    [Theory]
    [InlineData("Aluminium", "ultimateStrength,weldedYield,weldedUltimate,bucklingClass")]
    [InlineData("Steel", "ultimateStrength")]
    [InlineData("Timber", "strengthReference,crossCompression,characteristicDensity,shearModulus")]
    [InlineData("Composite", "shearModulus,crossStrength")]
    public void Family_Chosen_ShowsItsFiguresOnly(string family, string figures)
    {
        var page = OpenOwn();

        Choose(page, "logs.material.family", family);

        string[] all = ["ultimateStrength", "weldedYield", "weldedUltimate", "bucklingClass", "strengthReference", "crossCompression", "characteristicDensity", "shearModulus", "crossStrength"];
        Assert.Equal(
            figures.Split(',').Order(),
            all.Where(name => page.FindAll($"[data-field='logs.material.{name}']").Count > 0).Order());
    }

    [Fact]
    public void Figures_Typed_AreInTheProject()
    {
        var page = OpenOwn();
        Choose(page, "logs.material.family", "Aluminium");

        Field(page, "logs.material.ultimateStrength").Input("245");
        Choose(page, "logs.material.bucklingClass", "A");

        Assert.Equal(245e6, Material.UltimateStrength!.Value, 1e-3);
        Assert.Equal(BucklingClass.A, Material.BucklingClass);
    }

    private IRenderedComponent<Web.Pages.Bench.BenchPage> OpenOwn()
    {
        var page = Open("garage");
        Choose(page, "logs.material", "Own figures");
        return page;
    }
}
