using System.Globalization;
using Bunit;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components.Web;
using Microsoft.Extensions.DependencyInjection;

namespace FloodPanel.Web.Tests.Bench;

/// <summary>The Bench with the editor and the real calculation behind it.</summary>
public class BenchPageTests : BenchContext
{
    [Fact]
    public void Render_Opening_ShowsFormDrawingsLadderAndVerdict()
    {
        var page = Open("garage");

        Assert.Equal("3.3", Field(page, "clearWidth").GetAttribute("value"));
        Assert.NotNull(page.Find("[data-testid=elevation] svg"));
        Assert.NotNull(page.Find("[data-testid=section] svg"));
        Assert.Equal(6, page.FindAll("[data-testid=ladder] tbody tr").Count);
        Assert.Equal("incomplete", page.Find("[data-testid=verdict-banner]").GetAttribute("data-kind"));
        Assert.Contains("licensed engineer", page.Find("[data-testid=safety]").TextContent);
    }

    [Fact]
    public void Type_ClearWidth_ChangesBaysLadderAndDrawingAtOnce()
    {
        var page = Open("garage");
        var before = Text(page, "moment-log-1");

        Field(page, "clearWidth").Input("4.1");

        Assert.Equal([2.0, 2.0], Editor.Project.Openings[0].Barrier.Bays);
        Assert.Equal("2", Field(page, "bays[0]").GetAttribute("value"));
        Assert.NotEqual(before, Text(page, "moment-log-1"));
        Assert.Contains("4.100", page.Find("[data-testid=elevation] [data-field=clearWidth]").TextContent);
    }

    [Fact]
    public void Type_TextThatIsRefused_KeepsItAndMarksTheResultsAsNotCurrent()
    {
        var page = Open("garage");
        Field(page, "clearWidth").Input("wide");

        Field(page, "clearWidth").Blur();

        Assert.Equal("wide", Field(page, "clearWidth").GetAttribute("value"));
        Assert.Equal("none", page.Find("[data-testid=verdict-banner]").GetAttribute("data-kind"));
        Assert.Contains("Clear width reads “wide”", page.Find("[data-testid=problems]").TextContent);
        Assert.NotNull(page.Find("[data-testid=stale]"));
        Assert.Contains("stale", page.Find("[data-testid=results]").ClassName);

        Field(page, "clearWidth").Input("3.3");

        Assert.Empty(page.FindAll("[data-testid=stale]"));
        Assert.Equal("incomplete", page.Find("[data-testid=verdict-banner]").GetAttribute("data-kind"));
    }

    [Fact]
    public void Type_WhatDoesNotFitTogether_IsSaidAtTheFieldAndInTheList()
    {
        var page = Open("garage");

        Field(page, "bays[0]").Input("1.2");

        Assert.Contains("add up to", page.Find("[data-testid=problem-bays]").TextContent);
        Assert.Contains("add up to", page.Find("[data-testid=problems]").TextContent);
        Assert.Null(Editor.ResultFor("garage"));
        Assert.NotNull(page.Find("[data-testid=stale]"));

        page.Find("[data-testid=even-out]").Click();

        Assert.Empty(page.FindAll("[data-testid=problems]"));
        Assert.Equal([1.6, 1.6], Editor.Project.Openings[0].Barrier.Bays);
    }

    [Fact]
    public void Undo_AfterTyping_PutsTheOldNumberBackIntoTheField()
    {
        var page = Open("garage");
        Field(page, "sillLevel").Input("11.2");

        page.InvokeAsync(Editor.Undo);

        Assert.Equal("11.4", Field(page, "sillLevel").GetAttribute("value"));
    }

    [Fact]
    public void Flow_SwitchedOffAndOn_IsWhatItWas()
    {
        var page = Open("garage");

        page.Find("[data-testid=switch-flow]").Change(false);

        Assert.Null(Editor.Project.Openings[0].Actions.Flow);
        Assert.Empty(page.FindAll("[data-testid=resultant-flow]"));

        page.Find("[data-testid=switch-flow]").Change(true);

        Assert.Equal(1.2, Editor.Project.Openings[0].Actions.Flow!.Velocity);
        Assert.Single(page.FindAll("[data-testid=resultant-flow]"));
    }

    [Fact]
    public void Number_Clicked_OpensItsWorkingWhichFollowsTheTyping()
    {
        var page = Open("garage");
        page.Find("[data-testid=moment-log-1]").Click();
        var before = page.Find("[data-testid=working] .asked").TextContent;

        Field(page, "clearWidth").Input("4.1");

        Assert.Equal("true", page.Find("[data-testid=moment-log-1]").GetAttribute("aria-expanded"));
        Assert.NotEqual(before, page.Find("[data-testid=working] .asked").TextContent);
        Assert.Contains("(2.040 m)²/8", page.Find("[data-testid=working] .asked").TextContent);

        page.Find("[data-testid=close-working]").Click();

        Assert.Empty(page.FindAll("[data-testid=working]"));
    }

    [Fact]
    public void WhatGoverns_Shown_BringsItsCaseAlong()
    {
        var page = Open("door");
        var governing = Editor.ResultFor("door")!.Verdict.Governing!;
        Assert.Equal("brim-full", governing.Case);

        page.Find("[data-testid=show-governing]").Click();

        Assert.Contains("brim-full case", page.Find("[data-testid=working]").TextContent);
        Assert.Single(page.FindAll("[data-testid=ladder] tr.governing"));
    }

    [Fact]
    public void Case_Chosen_ShowsItsLadderAndSection()
    {
        var page = Open("garage");
        var before = Text(page, "load-log-6");

        page.FindAll("[data-testid=cases] input")[1].Change("on");

        Assert.NotEqual(before, Text(page, "load-log-6"));
        Assert.Contains("brim-full", page.Find("[data-testid=section] svg").GetAttribute("aria-label"));
    }

    [Fact]
    public void Posts_None_LeaveOneBayAndComeBackAsTheyWere()
    {
        var page = Open("garage");

        Field(page, "postCount").Input("0");

        Assert.Equal([3.3], Editor.Project.Openings[0].Barrier.Bays);
        Assert.Empty(page.FindAll("[data-testid=posts]"));

        Field(page, "postCount").Input("2");

        Assert.Equal(3, Editor.Project.Openings[0].Barrier.Bays.Count);
        Assert.Equal(Examples.Garage.Barrier.Posts, Editor.Project.Openings[0].Barrier.Posts);
    }

    [Fact]
    public void Bays_OfDifferentWidth_EachHaveTheirLadder()
    {
        var page = Open("garage");
        Field(page, "bays[0]").Input("1.2");
        Field(page, "bays[1]").Input("2");
        var narrow = Text(page, "moment-log-1");

        page.FindAll("[data-testid=bays] input")[1].Change("on");

        Assert.True(Number(page, "moment-log-1") > double.Parse(narrow, CultureInfo.InvariantCulture));
    }

    [Fact]
    public void Material_FromTheLibraryToOwnFigures_StartsFromTheLibrary()
    {
        var page = Open("door");
        Choose(page, "logs.material", "Test alloy");
        Assert.Equal(new LibraryMaterial("alloy"), Editor.Project.Openings[1].Barrier.Logs.Material);

        Choose(page, "logs.material", "Own figures");

        Assert.Equal(Examples.Aluminium, Editor.Project.Openings[1].Barrier.Logs.Material);
        Field(page, "logs.material.allowableBending").Input("90");
        Assert.Equal(90e6, ((Material)Editor.Project.Openings[1].Barrier.Logs.Material).AllowableBending!.Value, 1e-3);
    }

    [Fact]
    public void Profile_OtherShapeAndBack_KeepsItsThicknesses()
    {
        var page = Open("door");

        Choose(page, "logs.profile.shape", "Rectangle");
        Assert.IsType<Rectangle>(Editor.Project.Openings[1].Barrier.Logs.Profile);
        Choose(page, "logs.profile.shape", "Hollow, with webs");

        Assert.Equal(Examples.Door.Barrier.Logs.Profile, Editor.Project.Openings[1].Barrier.Logs.Profile);
    }

    [Fact]
    public void ByOthers_NameAndReference_SatisfyTheCheck()
    {
        var page = Open("door");
        Assert.Contains("guides", Editor.ResultFor("door")!.Verdict.Missing);

        page.Find("[data-testid='switch-byOthers.guides']").Change(true);
        Field(page, "byOthers.guides.name").Input("R. Tolland");
        Field(page, "byOthers.guides.reference").Input("ST-114");

        Assert.DoesNotContain("guides", Editor.ResultFor("door")!.Verdict.Missing);
    }

    [Fact]
    public void Opening_ThatDoesNotExist_SaysWhereToGo()
    {
        var page = Open("shed");

        Assert.Contains("This opening is not here", page.Markup);
        Assert.Contains($"/projects/{Id}/openings", page.Find("a").GetAttribute("href"));
    }

    [Fact]
    public void Form_Toggled_OpensAndClosesWithEscape()
    {
        var page = Open("garage");

        page.Find("[data-testid=form-toggle]").Click();
        Assert.Equal("true", page.Find("[data-testid=form-toggle]").GetAttribute("aria-expanded"));
        page.Find("#bench-form").KeyDown(new KeyboardEventArgs { Key = "Escape" });

        Assert.Equal("false", page.Find("[data-testid=form-toggle]").GetAttribute("aria-expanded"));
    }
}
