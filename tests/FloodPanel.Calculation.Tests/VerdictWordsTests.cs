using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests;

/// <summary>The verdict on the dock, in words.</summary>
public class VerdictWordsTests
{
    [Fact]
    public void Sentence_Incomplete_ListsWhatIsMissingAndWhatGovernsSoFar()
    {
        var sentence = SampleProject.Result(SampleProject.Project).Verdict.Sentence.ToString();

        Assert.Matches(
            @"^Incomplete: not yet checked are base plates, anchors, guides and supporting wall\. Of what is checked, [a-z ]+ in the brim-full case governs, at 0\.\d\d of the allowable\.$",
            sentence);
    }

    [Fact]
    public void Sentence_OneMissing_NamedAlone()
    {
        var project = Refused.With((Barrier b) => b with { ByOthers = SampleProject.AllByOthers.RemoveAt(4) });

        Assert.StartsWith("Incomplete: not yet checked are guides. ", SampleProject.Result(project).Verdict.Sentence.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void Sentence_Adequate_SaysSoFirst()
    {
        var project = Refused.With((Barrier b) => b with { ByOthers = SampleProject.AllByOthers });

        Assert.StartsWith("Adequate. Every check made here passes; ", SampleProject.Result(project).Verdict.Sentence.ToString(), StringComparison.Ordinal);
    }

    /// <summary>A barrier of 1.2 m, counted as 1.201 m, where 1.81 m is wanted.</summary>
    [Fact]
    public void Sentence_FreeboardMissed_SaysHowMuchHigher() => Assert.Equal(
        "Inadequate. Freeboard governs: the barrier should be 1.51 times as high. Not yet checked are base plates, anchors, guides and supporting wall.",
        SampleProject.Result(Refused.With((Site s) => s with { Freeboard = 0.96 })).Verdict.Sentence.ToString());

    /// <summary>Between 1 and 1.005 two decimals would print 1.00 and look like a pass.</summary>
    [Fact]
    public void Sentence_JustOverTheAllowable_NotRoundedToOne()
    {
        var log = SampleProject.Result(SampleProject.Project).Cases[1].Logs[0];
        var stress = SampleProject.Aluminium.AllowableBending!.Value * log.BendingCheck!.Utilisation / 1.0001;
        var project = Refused.With((LogStack l) => l with { Material = SampleProject.Aluminium with { AllowableBending = stress } });

        var verdict = SampleProject.Result(project).Verdict;

        Assert.Equal(1.0001, verdict.Governing!.Utilisation, tolerance: 1e-9);
        Assert.Equal(
            "Inadequate. Log bending in the brim-full case governs, at just over 1.00 of the allowable. Not yet checked are base plates, anchors, guides and supporting wall.",
            verdict.Sentence.ToString());
    }
}
