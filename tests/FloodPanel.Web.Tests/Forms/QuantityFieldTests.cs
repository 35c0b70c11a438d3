using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Web.Shared.Forms;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace FloodPanel.Web.Tests.Forms;

public class QuantityFieldTests : BunitContext
{
    private readonly List<double?> taken = [];

    [Fact]
    public void Render_Value_ShowsNumberUnitAndLabel()
    {
        var field = Show(3.3);

        var input = Input(field);
        Assert.Equal("3.3", input.GetAttribute("value"));
        Assert.Equal("m", field.Find(".unit").TextContent);
        Assert.Equal(input.Id, field.Find("label").GetAttribute("for"));
        Assert.Equal("Clear width", field.Find("label").TextContent);
        Assert.NotNull(field.Find("[data-field=clearWidth]"));
    }

    [Fact]
    public void Type_AllowedValue_IsTakenWhileTypingAndTextStays()
    {
        var field = Show(3.3);

        Input(field).Input("3 ft 6 in");

        Assert.Equal([42 * 0.0254], taken.Select(v => Math.Round(v!.Value, 10)));
        Assert.Equal("3 ft 6 in", Input(field).GetAttribute("value"));
    }

    [Theory]
    [InlineData("Enter")]
    [InlineData("blur")]
    public void Leave_AfterTypingAUnit_ReformatsInTheUnitShown(string how)
    {
        var field = Show(3.3);
        Input(field).Input("1067 mm");

        Leave(field, how);

        Assert.Equal("1.067", Input(field).GetAttribute("value"));
    }

    [Theory]
    [InlineData("200", "Clear width is 200 m; allowed is 0.100 m to 100.000 m.")]
    [InlineData("abc", "Clear width reads “abc”: it is not a number. Allowed is from 0.100 m to 100.000 m.")]
    [InlineData("", "Clear width is empty; allowed is from 0.100 m to 100.000 m.")]
    [InlineData("1,250", "Clear width reads “1,250”: it could mean 1.250 or 1250. Write one of these. Allowed is from 0.100 m to 100.000 m.")]
    public void Type_WhatIsNotAllowed_KeepsTextAndValueAndSaysWhatIsAllowed(string typed, string sentence)
    {
        var field = Show(3.3);

        Input(field).Input(typed);
        Leave(field, "blur");

        Assert.Empty(taken);
        Assert.Equal(typed, Input(field).GetAttribute("value"));
        var problem = field.Find("[role=alert]");
        Assert.Equal(sentence, problem.TextContent);
        Assert.Contains(problem.Id!, Input(field).GetAttribute("aria-describedby")!.Split(' '));
        Assert.Equal("true", Input(field).GetAttribute("aria-invalid"));
    }

    [Fact]
    public void Type_WhatIsNotAllowed_SaysSoAfterAPauseWithoutLeaving()
    {
        var field = Show(3.3);

        Input(field).Input("abc");

        Assert.Empty(field.FindAll("[role=alert]"));
        field.WaitForAssertion(() => Assert.Single(field.FindAll("[role=alert]")), TimeSpan.FromSeconds(5));
    }

    [Fact]
    public void Type_OnTheWayToAnAllowedValue_NeverComplains()
    {
        var field = Show(200, Fields.LogDeflectionLimit);

        Input(field).Input("3");
        Input(field).Input("30");

        Assert.Empty(field.FindAll("[role=alert]"));
        Assert.Equal([30.0], taken);
    }

    [Fact]
    public void Type_AllowedAfterRefused_ClearsTheSentence()
    {
        var field = Show(3.3);
        Input(field).Input("abc");
        Leave(field, "blur");

        Input(field).Input("4");

        Assert.Empty(field.FindAll("[role=alert]"));
        Assert.Equal([4.0], taken);
    }

    [Fact]
    public void Escape_AfterRefusedText_RestoresTheLastGoodValue()
    {
        var field = Show(3.3);
        Input(field).Input("4");
        Input(field).Input("4x");

        Input(field).KeyDown(new KeyboardEventArgs { Key = "Escape" });

        Assert.Equal("4", Input(field).GetAttribute("value"));
        Assert.Empty(field.FindAll("[role=alert]"));
    }

    [Theory]
    [InlineData("ArrowUp", false, 3.31)]
    [InlineData("ArrowDown", false, 3.29)]
    [InlineData("ArrowUp", true, 3.4)]
    public void Arrow_InALength_MovesByACentimetreOrTen(string key, bool shift, double expected)
    {
        var field = Show(3.3);

        Input(field).KeyDown(new KeyboardEventArgs { Key = key, ShiftKey = shift });

        Assert.Equal(expected, Assert.Single(taken)!.Value, 1e-12);
    }

    [Fact]
    public void Arrow_BeyondTheLimit_DoesNothing()
    {
        var field = Show(1, Fields.LogCount);

        Input(field).KeyDown(new KeyboardEventArgs { Key = "ArrowDown" });

        Assert.Empty(taken);
    }

    [Fact]
    public void Type_FractionOfACount_IsRefused()
    {
        var field = Show(6, Fields.LogCount);

        Input(field).Input("6.5");
        Leave(field, "blur");

        Assert.Equal("Number of logs is 6.5; it must be a whole number, from 1 to 100.", field.Find("[role=alert]").TextContent);
    }

    [Fact]
    public void Units_Switched_ShowTheSameValueInTheOtherUnit()
    {
        static void In(ComponentParameterCollectionBuilder<CascadingValue<UnitSystem>> page, UnitSystem system) =>
            page.Add(c => c.Value, system)
                .AddChildContent<QuantityField>(f => f.Add(q => q.Field, Fields.ClearWidth).Add(q => q.Value, 3.048));
        var host = Render<CascadingValue<UnitSystem>>(p => In(p, UnitSystem.SI));

        host.Render(p => In(p, UnitSystem.USCustomary));

        Assert.Equal("10", host.Find("input").GetAttribute("value"));
        Assert.Equal("ft", host.Find(".unit").TextContent);
    }

    [Fact]
    public void Value_ChangedFromOutside_ReplacesTheText()
    {
        var field = Show(3.3);
        Input(field).Input("4");

        field.Render(p => p.Add(f => f.Value, 3.3));

        Assert.Equal("3.3", Input(field).GetAttribute("value"));
    }

    [Fact]
    public void Value_SetToWhatWasJustTyped_LeavesTheTextAlone()
    {
        var field = Show(3.3);
        Input(field).Input("4.0");

        field.Render(p => p.Add(f => f.Value, 4.0));

        Assert.Equal("4.0", Input(field).GetAttribute("value"));
    }

    [Fact]
    public void Empty_WhenOptional_TakesNothing()
    {
        var field = Show(11.2, Fields.GroundLevel, optional: true);

        Input(field).Input("");

        Assert.Equal([null], taken);
    }

    [Fact]
    public void Default_ShownAsPlaceholderAndResetTo()
    {
        var field = Render<QuantityField>(p => p.Add(f => f.Field, Fields.Freeboard).Add(f => f.Value, 0.5)
            .Add(f => f.Default, 0.3).Add(f => f.ValueChanged, v => taken.Add(v)));

        field.Find("button.reset").Click();

        Assert.Equal("0.3", Input(field).GetAttribute("placeholder"));
        Assert.Equal([0.3], taken);
        Assert.Equal("0.3", Input(field).GetAttribute("value"));
    }

    [Fact]
    public void Problem_FromValidation_IsShownAtTheField()
    {
        var field = Render<QuantityField>(p => p.Add(f => f.Field, Fields.ClearWidth).Add(f => f.Value, 3.3)
            .Add(f => f.Problem, new Sentence($"Bays and posts together are {new Quantity(3.2, Dimension.Length)}.")));

        Assert.Equal("Bays and posts together are 3.200 m.", field.Find("[role=alert]").TextContent);
    }

    [Fact]
    public void Typed_RefusedText_IsReportedUntilMended()
    {
        var typed = new TypedProblems();
        var field = Render<QuantityField>(p => p.Add(f => f.Field, Fields.ClearWidth).Add(f => f.Value, 3.3).AddCascadingValue(typed));

        Input(field).Input("abc");
        Leave(field, "blur");

        Assert.Equal(["clearWidth"], typed.ByField.Keys);

        Input(field).Input("5");

        Assert.Empty(typed.ByField);
    }

    [Fact]
    public void Render_NothingChanged_IsNotDrawnAgain()
    {
        var field = Show(3.3);
        field.Render(p => p.Add(f => f.Value, 3.4));
        var before = field.RenderCount;

        field.Render(p => p.Add(f => f.Value, 3.4));

        Assert.Equal(before, field.RenderCount);
    }

    private IRenderedComponent<QuantityField> Show(double value, Field? definition = null, bool optional = false) =>
        Render<QuantityField>(p => p.Add(f => f.Field, definition ?? Fields.ClearWidth).Add(f => f.Value, value)
            .Add(f => f.Optional, optional).Add(f => f.ValueChanged, v => taken.Add(v)));

    private static AngleSharp.Dom.IElement Input(IRenderedComponent<QuantityField> field) => field.Find("input");

    private static void Leave(IRenderedComponent<QuantityField> field, string how)
    {
        if (how == "blur")
        {
            Input(field).Blur();
        }
        else
        {
            Input(field).KeyDown(new KeyboardEventArgs { Key = how });
        }
    }
}
