using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Documents.Tests.OwnerSummaries;

/// <summary>Invented projects for the owner's summary, by name.</summary>
internal static class Projects
{
    private static readonly Opening Yard = Sample.Gap(4.9, 3, 2.4, 6) with { Id = "yard", Wall = WallKind.CavityMasonry };

    private static readonly Dictionary<string, Func<Project>> All = new()
    {
        ["none"] = () => Sample.Project,
        ["one"] = () => Sample.Project with { Openings = [Sample.Door] },
        ["adequate"] = () => Sample.Project with { Openings = [Declared(Sample.Door)] },
        ["inadequate"] = () => Sample.Project with { Openings = [Sample.Garage with { SillLevel = 10.9 }] },
        ["three"] = () => Sample.Project with { Openings = [Sample.Garage, Sample.Door, Yard] },
        ["twelve"] = () => Many(12, i => $"Opening {i + 1}"),
        ["twelve-long"] = () => Many(12, i => i % 4 == 3 ? new string('M', 200) : Sample.LongName) with
        {
            Name = Sample.LongName,
            Client = Sample.LongName,
            Address = Sample.LongName,
            Engineer = Sample.LongName,
            Reference = new string('W', 200),
        },
        ["forty"] = () => Many(40, i => $"Opening {i + 1}"),
        ["odd-names"] = () => Sample.Project with
        {
            Name = "Tab\tand\nnew line \u0001",
            Client = "\uD800",
            Openings = [Sample.Door with { Name = "水門 \uD83D\uDEB0" }],
        },
    };

    public static IEnumerable<string> Names => All.Keys;

    public static Project Find(string name) => All[name]();

    public static ProjectResult Run(string name) => Design.Run(Find(name), Library.Empty);

    private static Opening Declared(Opening opening) => opening with
    {
        Barrier = opening.Barrier with
        {
            ByOthers = [.. NeededChecks.MayBeByOthers.Select(c => new DesignedByOthers(c, "Ostrey Anchors", "D-12"))],
        },
    };

    private static Project Many(int count, Func<int, string> name) => Sample.Project with
    {
        Openings =
        [
            .. Enumerable.Range(0, count).Select(i => (i % 3 == 0 ? Sample.Garage : i % 3 == 1 ? Sample.Door : Yard) with
            {
                Id = $"opening-{i}",
                Name = name(i),
            }),
        ],
    };
}
