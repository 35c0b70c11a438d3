using Bunit;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Tests.Bench;

public class LogGroupTests : BenchContext
{
    private LogStack Logs => Editor.Project.Openings[0].Barrier.Logs;

    [Fact]
    public void Add_Once_TakesTheLowestLogOutOfTheStackAndKeepsTheirNumber()
    {
        var page = Open("garage");
        var before = Logs;

        page.Find("[data-testid=add-log-group]").Click();

        var group = Assert.Single(Logs.Below);
        Assert.Equal((before.TotalCount, 1), (Logs.TotalCount, group.Count));
        Assert.Equal(before.Profile, group.Profile);
        Assert.Contains("Log 1, at the bottom", page.Find("[data-testid=log-group-0]").TextContent, StringComparison.Ordinal);
        Assert.NotNull(page.Find("[data-testid=cutting-length-1-from-2]"));
    }

    [Fact]
    public void Profile_Changed_ChangesTheLadderOfThatLogOnly()
    {
        var page = Open("garage");
        page.Find("[data-testid=add-log-group]").Click();
        var (lowest, next) = (Text(page, "deflection-log-1"), Text(page, "deflection-log-2"));

        Field(page, "logs.below[0].profile.depth").Input("100");

        Assert.NotEqual(lowest, Text(page, "deflection-log-1"));
        Assert.StartsWith(next, Text(page, "deflection-log-2"), StringComparison.Ordinal);
    }

    [Fact]
    public void Delete_Group_GivesItsLogsBack()
    {
        var page = Open("garage");
        var before = Logs;
        page.Find("[data-testid=add-log-group]").Click();

        page.Find("[data-testid=log-group-0] button[title=Delete]").Click();

        Assert.Equal(before, Logs);
    }

    [Fact]
    public void Count_MoreThanAHundredInAll_IsRefusedInWords()
    {
        var page = Open("garage");
        page.Find("[data-testid=add-log-group]").Click();

        Field(page, "logs.below[0].count").Input("100");

        Assert.Contains("allowed is 100 in all", page.Find("[data-testid=bench-form]").TextContent, StringComparison.Ordinal);
    }
}
