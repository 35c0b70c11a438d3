using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Results;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Results;

public class NoteAndProblemTests : BunitContext
{
    [Fact]
    public void Notes_OfEveryResult_EndWithTheSafetyWords()
    {
        var notes = Render<NoteList>(p => p.Add(n => n.Notes, Examples.Result(Examples.Door).Notes));

        Assert.Contains("licensed engineer", notes.Find("[data-testid=safety]").TextContent);
        Assert.Contains("people leave when told to", notes.Find("[data-testid=safety]").TextContent);
    }

    [Fact]
    public void Notes_Caution_IsListedWithItsCode()
    {
        var tall = Examples.Door with { ClearHeight = 1 };

        var notes = Render<NoteList>(p => p.Add(n => n.Notes, Examples.Result(tall).Notes));

        Assert.Contains("taller than the clear height", notes.Find("[data-testid=note-taller-than-opening]").TextContent);
        Assert.Empty(notes.FindAll("[data-testid=note-calculation-aid]"));
    }

    [Fact]
    public void Problems_Listed_CountThemselves()
    {
        var list = Render<ProblemList>(p => p.Add(l => l.Sentences, [new Sentence($"One."), new Sentence($"Two.")]));

        Assert.Equal("Mend these 2 first", list.Find("h2").TextContent);
        Assert.Equal(["One.", "Two."], list.FindAll("li").Select(item => item.TextContent));
    }

    [Fact]
    public void Problems_None_ShowNothing()
    {
        var list = Render<ProblemList>(p => p.Add(l => l.Sentences, []));

        Assert.Equal("", list.Markup.Trim());
    }

    [Fact]
    public void Schedule_ListsEachBay()
    {
        var result = Examples.Result(Examples.Garage);

        var table = Render<ScheduleTable>(p => p.Add(t => t.Schedule, result.Schedule).Add(t => t.HoldDowns, result.HoldDowns).AddCascadingValue(new OpenFigure()));

        Assert.Equal(2, table.FindAll("tbody tr").Count);
        Assert.Equal(Units.FormatNumber(result.Schedule[1].Mass, Dimension.Mass, UnitSystem.SI), table.Find("[data-testid=mass-2]").TextContent);
    }

    [Fact]
    public void PostsAndGuides_ShowTheirOwnNumbers()
    {
        var loadCase = Examples.Result(Examples.Garage).Cases[0];

        var posts = Render<PostTable>(p => p.Add(t => t.Case, loadCase).AddCascadingValue(new OpenFigure()));
        var guides = Render<GuideTable>(p => p.Add(t => t.Case, loadCase).AddCascadingValue(new OpenFigure()));

        Assert.Equal(Units.FormatNumber(loadCase.Posts[0].BaseMoment, Dimension.Moment, UnitSystem.SI), posts.Find("[data-testid=moment-post-1]").TextContent);
        Assert.Equal(Units.FormatNumber(loadCase.Guides[1].Reaction, Dimension.Force, UnitSystem.SI), guides.Find("[data-testid=reaction-right]").TextContent);
    }
}
