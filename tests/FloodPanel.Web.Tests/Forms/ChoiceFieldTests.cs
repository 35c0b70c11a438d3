using Bunit;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Shared.Forms;

namespace FloodPanel.Web.Tests.Forms;

public class ChoiceFieldTests : BunitContext
{
    [Fact]
    public void Render_ThreeOptions_AreButtonsOfOneGroup()
    {
        var field = Show(DesignBasisKind.Eurocode, Enum.GetValues<DesignBasisKind>(), Words.Of);

        var group = field.Find("[role=radiogroup]");
        Assert.Equal("Choice", field.Find($"#{group.GetAttribute("aria-labelledby")}").TextContent);
        Assert.Equal(3, field.FindAll("input[type=radio]").Count);
        Assert.True(field.FindAll("input[type=radio]")[2].HasAttribute("checked"));
    }

    [Fact]
    public void Choose_Button_RaisesTheOption()
    {
        var chosen = new List<DesignBasisKind>();
        var field = Show(DesignBasisKind.Eurocode, Enum.GetValues<DesignBasisKind>(), Words.Of, chosen);

        field.FindAll("input[type=radio]")[1].Change("on");

        Assert.Equal([DesignBasisKind.UsStrength], chosen);
    }

    [Fact]
    public void Render_FiveOptions_AreAListWithWords()
    {
        var field = Show(WallKind.TimberFrame, Enum.GetValues<WallKind>(), Words.Of);

        var list = field.Find("select");
        Assert.Equal(list.Id, field.Find("label").GetAttribute("for"));
        Assert.Equal(["Reinforced concrete", "Masonry", "Cavity masonry", "Timber frame", "Steel frame"],
            field.FindAll("option").Select(o => o.TextContent));
        Assert.Equal("3", list.GetAttribute("value"));
    }

    [Fact]
    public void Choose_InAList_RaisesTheOption()
    {
        var chosen = new List<WallKind>();
        var field = Show(WallKind.TimberFrame, Enum.GetValues<WallKind>(), Words.Of, chosen);

        field.Find("select").Change("1");

        Assert.Equal([WallKind.Masonry], chosen);
    }

    [Fact]
    public void Render_ValueOutsideTheOptions_SaysSo()
    {
        var field = Render<ChoiceField<string>>(p => p.Add(f => f.Label, "Material").Add(f => f.FieldKey, "material")
            .Add(f => f.Value, "gone").Add(f => f.Options, ["a", "b", "c", "d"]).Add(f => f.Words, o => o)
            .Add(f => f.Unlisted, "gone (not in the library)"));

        Assert.Equal("gone (not in the library)", field.FindAll("option")[0].TextContent);
    }

    private IRenderedComponent<ChoiceField<T>> Show<T>(T value, IReadOnlyList<T> options, Func<T, string> words, List<T>? chosen = null)
        where T : notnull =>
        Render<ChoiceField<T>>(p => p.Add(f => f.Label, "Choice").Add(f => f.FieldKey, "choice").Add(f => f.Value, value)
            .Add(f => f.Options, options).Add(f => f.Words, words).Add(f => f.ValueChanged, v => chosen?.Add(v)));
}
