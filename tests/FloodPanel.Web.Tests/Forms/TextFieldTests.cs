using Bunit;
using FloodPanel.Web.Shared.Forms;

namespace FloodPanel.Web.Tests.Forms;

public class TextFieldTests : BunitContext
{
    private readonly List<string> taken = [];

    [Fact]
    public void Type_Words_AreTakenWhileTyping()
    {
        var field = Show("Mill", required: true);

        field.Find("input").Input("Mill Lane");

        Assert.Equal(["Mill Lane"], taken);
        Assert.Equal(field.Find("input").Id, field.Find("label").GetAttribute("for"));
    }

    [Fact]
    public void Type_TooLong_KeepsTheTextAndIsNotTaken()
    {
        var field = Show("Mill");

        field.Find("input").Input(new string('x', 21));

        Assert.Empty(taken);
        Assert.Equal(21, field.Find("input").GetAttribute("value")!.Length);
        Assert.Equal("Name has 21 characters; allowed are at most 20.", field.Find("[role=alert]").TextContent);
    }

    [Fact]
    public void Type_NothingWhereRequired_IsNotTaken()
    {
        var field = Show("Mill", required: true);

        field.Find("input").Input(" ");

        Assert.Empty(taken);
        Assert.Equal("Name is empty; write 1 to 20 characters.", field.Find("[role=alert]").TextContent);
    }

    [Fact]
    public void Render_ManyLines_IsATextArea()
    {
        var field = Show("a\nb", lines: 3);

        Assert.Equal("3", field.Find("textarea").GetAttribute("rows"));
        Assert.Equal("a\nb", field.Find("textarea").GetAttribute("value"));
    }

    [Fact]
    public void Value_ChangedFromOutside_ReplacesARefusedText()
    {
        var field = Show("Mill", required: true);
        field.Find("input").Input("");

        field.Render(p => p.Add(f => f.Value, "Lane"));

        Assert.Equal("Lane", field.Find("input").GetAttribute("value"));
        Assert.Empty(field.FindAll("[role=alert]"));
    }

    private IRenderedComponent<TextField> Show(string value, bool required = false, int lines = 1) =>
        Render<TextField>(p => p.Add(f => f.Label, "Name").Add(f => f.FieldKey, "name").Add(f => f.Value, value)
            .Add(f => f.MaxLength, 20).Add(f => f.Required, required).Add(f => f.Lines, lines)
            .Add(f => f.ValueChanged, v => taken.Add(v)));
}
