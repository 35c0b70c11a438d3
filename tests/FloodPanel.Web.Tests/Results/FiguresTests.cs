using FloodPanel.Web.Shared.Results;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Results;

public class FiguresTests
{
    [Theory]
    [InlineData(Figures.Levels, "h", "", 0, 0, "")]
    [InlineData(Figures.Freeboard, "u", "", 0, 0, "")]
    [InlineData(Figures.Schedule, "m", "", 0, 2, "")]
    [InlineData(Figures.Resultant, "R", "design-flood", 0, 0, "")]
    [InlineData(Figures.Action, "p_s", "design-flood", 2, 0, "")]
    [InlineData(Figures.LineLoad, "w", "brim-full", 3, 2, "")]
    [InlineData(Figures.LogBending, "M", "design-flood", 1, 1, "")]
    [InlineData(Figures.LogShear, "V", "design-flood", 1, 1, "")]
    [InlineData(Figures.LogDeflection, "δ", "design-flood", 1, 2, "")]
    [InlineData(Figures.PostBending, "M", "design-flood", 1, 0, "")]
    [InlineData(Figures.PostShear, "V", "brim-full", 1, 0, "")]
    [InlineData(Figures.PostDeflection, "δ", "design-flood", 1, 0, "")]
    [InlineData(Figures.Guide, "R", "design-flood", 0, 0, "right")]
    public void Find_EveryFigure_HasALineWithItsSymbol(string name, string symbol, string loadCase, int index, int bay, string side)
    {
        var working = Figures.Find(Examples.Result(Examples.Garage), new(name, symbol, loadCase, index, bay, side));

        Assert.NotNull(working);
        Assert.Contains(working.Steps, step => step.Symbol == symbol);
        Assert.NotEqual("", working.Source);
    }

    [Fact]
    public void Find_LogThatIsNoLongerThere_IsNull()
    {
        var key = new FigureKey(Figures.LogBending, "M", "design-flood", 6, 1);

        var working = Figures.Find(Examples.Result(Examples.Garage.WithLogs(logs => logs with { Count = 5 })), key);

        Assert.Null(working);
    }

    [Fact]
    public void Governing_OfAResult_IsTheCheckThatTheVerdictNames()
    {
        var result = Examples.Result(Examples.Garage);

        var key = Figures.Governing(result)!;

        Assert.Equal(result.Verdict.Governing!.Check, key.Name);
        Assert.Equal(result.Verdict.Governing.Case, key.Case);
        Assert.Equal(result.Verdict.Governing.Utilisation, Figures.Find(result, key)!.Check!.Utilisation);
    }

    [Fact]
    public void Governing_TooLow_IsTheFreeboard()
    {
        var low = Examples.Result(Examples.Garage.WithLogs(logs => logs with { Count = 5 }));

        var key = Figures.Governing(low)!;

        Assert.Equal(Figures.Freeboard, key.Name);
        Assert.False(Figures.Find(low, key)!.Check!.Passes);
    }
}
