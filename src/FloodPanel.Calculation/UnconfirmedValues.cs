using FloodPanel.Calculation.ProjectTree;
using Barrier = FloodPanel.Calculation.ProjectTree.Barrier;

namespace FloodPanel.Calculation;

/// <summary>Says which figures of an opening come from memory and have not been confirmed yet. It never changes the verdict.</summary>
internal static class UnconfirmedValues
{
    /// <summary>One note for each entry of the library that the opening uses, is marked as from memory and stands unconfirmed.</summary>
    public static IEnumerable<Note> Notes(Opening opening, Library library, ValueList<string> confirmed)
    {
        var barrier = opening.Barrier;
        var materials = Materials(barrier).OfType<LibraryMaterial>().Select(chosen => library.Materials.GetValueOrDefault(chosen.Id));
        var profiles = Profiles(barrier).OfType<LibraryProfile>().Select(chosen => library.Profiles.GetValueOrDefault(chosen.Id));
        return
        [
            .. materials.OfType<LibraryEntry<Material>>().Distinct().Where(entry => IsOpen(entry, confirmed)).Select(entry => Note(entry, "strengths")),
            .. profiles.OfType<LibraryEntry<Profile>>().Distinct().Where(entry => IsOpen(entry, confirmed)).Select(entry => Note(entry, "dimensions")),
        ];
    }

    private static bool IsOpen<T>(LibraryEntry<T> entry, ValueList<string> confirmed) => entry.FromMemory && !confirmed.Contains(entry.Id);

    private static Note Note<T>(LibraryEntry<T> entry, string figures) => new("unconfirmed-value", new(
        $"{entry.Title}: the {figures} in the library are from memory: check them against the source and confirm them."));

    private static IEnumerable<MaterialChoice?> Materials(Barrier barrier) =>
    [
        .. barrier.Logs.Groups.Select(group => group.Material),
        barrier.Posts?.Material, barrier.Posts?.Raker?.Material, barrier.BasePlate?.Material, barrier.Guides?.Material,
    ];

    private static IEnumerable<ProfileChoice?> Profiles(Barrier barrier) =>
        [.. barrier.Logs.Groups.Select(group => group.Profile), barrier.Posts?.Profile, barrier.Posts?.Raker?.Profile];
}
