using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Storage.Tests.LibraryData;

/// <summary>Figures from memory carry their mark into every result that rests on them, until the user has confirmed them.</summary>
public class UnconfirmedValuesTests
{
    private static readonly Library Delivered = LibraryFiles.Load(LibraryFiles.DeliveredFolder);

    private static readonly Project FromMemory = new()
    {
        Name = "Mill",
        Site = new Site { DesignStillWaterLevel = 0.9 },
        Openings =
        [
            new Opening
            {
                Id = "door", ClearWidth = 2.1, ClearHeight = 2,
                Barrier = new Barrier
                {
                    Bays = [1, 1],
                    Logs = new LogStack { Material = new LibraryMaterial("en-aw-6082-t6"), Profile = new LibraryProfile("log-200-80"), Count = 6 },
                    Posts = new PostSet { Material = new LibraryMaterial("s235"), Profile = new LibraryProfile("cf-100-100-5"), Width = 0.1 },
                },
            },
        ],
    };

    [Fact]
    public void Evaluate_MaterialAndProfileFromMemory_NamesEach() => Assert.Equal(
        [
            "EN AW-6082 T6: the strengths in the library are from memory: check them against the source and confirm them.",
            "SHS 100 × 100 × 5, cold formed: the dimensions in the library are from memory: check them against the source and confirm them.",
        ],
        Notes(FromMemory).Select(note => note.Text.ToString()));

    [Fact]
    public void Evaluate_Confirmed_NamesThemNoMore()
    {
        Assert.Single(Notes(FromMemory with { Confirmed = ["en-aw-6082-t6"] }));
        Assert.Empty(Notes(FromMemory with { Confirmed = ["en-aw-6082-t6", "cf-100-100-5"] }));
    }

    [Fact]
    public void Evaluate_Confirmed_VerdictIsTheSame() => Assert.Equal(
        Verdict(FromMemory), Verdict(FromMemory with { Confirmed = ["en-aw-6082-t6", "cf-100-100-5"] }));

    [Fact]
    public void Evaluate_OwnFigures_AreTheUsersAndNotMarked()
    {
        var opening = FromMemory.Openings[0];
        var logs = opening.Barrier.Logs with { Material = Delivered.Materials["en-aw-6082-t6"].Item };
        var own = FromMemory with { Openings = [opening with { Barrier = opening.Barrier with { Logs = logs, Posts = opening.Barrier.Posts! with { Profile = Delivered.Profiles["cf-100-100-5"].Item } } }] };

        Assert.Empty(Notes(own));
    }

    private static IEnumerable<Note> Notes(Project project) =>
        Design.Run(project, Delivered).Openings[0].Notes.Where(note => note.Code == "unconfirmed-value");

    private static (VerdictKind, string) Verdict(Project project)
    {
        var verdict = Design.Run(project, Delivered).Openings[0].Verdict;
        return (verdict.Kind, string.Join(',', verdict.Missing));
    }
}
