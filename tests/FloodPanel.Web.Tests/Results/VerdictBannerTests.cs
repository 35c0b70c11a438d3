using Bunit;
using FloodPanel.Calculation;
using FloodPanel.Web.Shared.Results;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Results;

public class VerdictBannerTests : BunitContext
{
    [Theory]
    [InlineData(VerdictKind.Adequate, "Adequate. Log bending in the brim-full case governs, at 0.92 of the allowable.", "Adequate", "Log bending in the brim-full case governs, at 0.92 of the allowable.")]
    [InlineData(VerdictKind.Incomplete, "Incomplete: not yet checked are anchors and guides.", "Incomplete", "Not yet checked are anchors and guides.")]
    public void Render_Verdict_IsAWordAShapeAndASentence(VerdictKind kind, string sentence, string word, string rest)
    {
        var banner = Render<VerdictBanner>(p => p.Add(b => b.Verdict, new Verdict(kind, [], null, new Sentence($"{sentence}"))));

        Assert.Equal(word, banner.Find("[data-testid=verdict]").TextContent.Trim());
        Assert.NotNull(banner.Find("[data-testid=verdict] svg"));
        Assert.Equal(rest, banner.Find("[data-testid=verdict-sentence]").TextContent);
    }

    [Fact]
    public void Render_NoResult_SaysWhy()
    {
        var banner = Render<VerdictBanner>(p => p.Add(b => b.Verdict, null).Add(b => b.WithoutResult, "2 problems to mend."));

        Assert.Equal("none", banner.Find("[data-testid=verdict-banner]").GetAttribute("data-kind"));
        Assert.Equal("2 problems to mend.", banner.Find("[data-testid=verdict-sentence]").TextContent);
    }

    [Fact]
    public void Show_WhatGoverns_RaisesItsFigure()
    {
        var result = Examples.Result(Examples.Garage);
        var asked = new List<FigureKey>();
        var banner = Render<VerdictBanner>(p => p.Add(b => b.Verdict, result.Verdict)
            .Add(b => b.Governing, Figures.Governing(result)).Add(b => b.OnShow, key => asked.Add(key)));

        banner.Find("[data-testid=show-governing]").Click();

        Assert.Equal(result.Verdict.Governing!.Utilisation, Figures.Find(result, Assert.Single(asked))!.Check!.Utilisation);
    }
}
