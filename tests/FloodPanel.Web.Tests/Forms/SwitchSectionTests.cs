using Bunit;
using FloodPanel.Web.Shared.Forms;
using MudBlazor.Services;

namespace FloodPanel.Web.Tests.Forms;

public class SwitchSectionTests : BunitContext
{
    public SwitchSectionTests()
    {
        Services.AddMudServices();
        JSInterop.Mode = JSRuntimeMode.Loose;
    }

    [Fact]
    public void Render_Off_ShowsTheTitleOnly()
    {
        var section = Show(on: false);

        Assert.Contains("Flow", section.Find("label").TextContent);
        Assert.Empty(section.FindAll(".inside"));
        Assert.Empty(section.FindAll(".picture"));
    }

    [Fact]
    public void Render_On_ShowsFieldsAndDrawing()
    {
        var section = Show(on: true);

        Assert.Single(section.FindAll(".inside"));
        Assert.Single(section.FindAll(".picture"));
    }

    [Fact]
    public void Switch_Moved_RaisesTheNewState()
    {
        var states = new List<bool>();
        var section = Show(on: false, states);

        section.Find("input[type=checkbox]").Change(true);

        Assert.Equal([true], states);
    }

    [Fact]
    public void Switch_HasTheTestIdOfItsKey()
    {
        var section = Show(on: false);

        Assert.Single(section.FindAll("[data-testid=switch-flow]"));
    }

    private IRenderedComponent<SwitchSection> Show(bool on, List<bool>? states = null) =>
        Render<SwitchSection>(p => p.Add(s => s.Title, "Flow").Add(s => s.FieldKey, "flow").Add(s => s.On, on)
            .Add(s => s.OnChanged, s => states?.Add(s))
            .AddChildContent("<i class=\"inside\"></i>").Add(s => s.Drawing, "<i class=\"picture\"></i>"));
}
