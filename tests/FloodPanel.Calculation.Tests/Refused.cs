using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation.Tests;

/// <summary>Short ways to change the sample project and to read what is wrong with it.</summary>
internal static class Refused
{
    public static Project With(Func<Site, Site> change) =>
        SampleProject.Project with { Site = change(SampleProject.Project.Site) };

    public static Project With(Func<Opening, Opening> change) =>
        SampleProject.Project with { Openings = [change(SampleProject.Dock)] };

    public static Project With(Func<Barrier, Barrier> change) =>
        With((Opening o) => o with { Barrier = change(o.Barrier) });

    public static Project With(Func<LogStack, LogStack> change) =>
        With((Barrier b) => b with { Logs = change(b.Logs) });

    public static Project With(Func<PostSet, PostSet> change) =>
        With((Barrier b) => b with { Posts = change(b.Posts!) });

    public static Project With(ActionSet actions) => With((Opening o) => o with { Actions = actions });

    /// <summary>The only problem there is stands at a path and reads so in SI and US units.</summary>
    public static void Once(Project project, string path, string si, string us)
    {
        var problem = Assert.Single(project.Validate(Library.Empty));

        Assert.Equal(path, problem.Path);
        Assert.Equal(si, problem.Message.In(UnitSystem.SI));
        Assert.Equal(us, problem.Message.In(UnitSystem.USCustomary));
    }

    public static void Not(Project project) => Assert.Empty(project.Validate(Library.Empty));
}
