namespace FloodPanel.Calculation.Tests;

public class DesignTests
{
    [Fact]
    public void Run_SampleProject_HasNoProblemsAndNamesWhatIsMissing()
    {
        var problems = SampleProject.Project.Validate(Library.Empty);

        var result = SampleProject.Result(SampleProject.Project);

        Assert.Empty(problems);
        Assert.Equal(VerdictKind.Incomplete, result.Verdict.Kind);
        Assert.Equal(["base-plates", "anchors", "guides", "supporting-wall"], result.Verdict.Missing);
    }
}
