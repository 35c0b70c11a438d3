using System.Collections.Frozen;
using FloodPanel.Calculation.Cases;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Calculation;

/// <summary>One row of a library, with where it comes from.</summary>
/// <typeparam name="T">Material or profile.</typeparam>
/// <param name="Id">Identifier, as written in project files.</param>
/// <param name="Title">Name on screens.</param>
/// <param name="Item">The material or profile.</param>
/// <param name="Source">Where the figures come from.</param>
/// <param name="Evidence">How the figures are known: "read", "derived", "memory" or "invented".</param>
public sealed record LibraryEntry<T>(string Id, string Title, T Item, string Source, string Evidence)
{
    /// <summary>True when the figures are from memory: they carry a mark until the user has confirmed them.</summary>
    public bool FromMemory => Evidence == "memory";
}

/// <summary>Materials and profiles that a project may name by id, and the design bases. Read from data files by the caller.</summary>
/// <param name="materials">The materials.</param>
/// <param name="profiles">The profiles.</param>
/// <param name="bases">The design bases, one of each kind.</param>
public sealed class Library(
    IEnumerable<LibraryEntry<Material>> materials,
    IEnumerable<LibraryEntry<Profile>> profiles,
    IEnumerable<DesignBasis> bases)
{
    /// <summary>A library without entries: only inline materials and profiles resolve, under the standard bases.</summary>
    public static Library Empty { get; } = new([], [], DesignBases.Standard);

    /// <summary>The design bases by kind.</summary>
    public FrozenDictionary<DesignBasisKind, DesignBasis> Bases { get; } = bases.ToFrozenDictionary(b => b.Kind);

    /// <summary>The design basis of a project: its own copy, or else the one it names.</summary>
    /// <param name="project">The project.</param>
    public DesignBasis BasisOf(Project project) => project.OwnBasis ?? Bases[project.DesignBasis];

    /// <summary>Materials by id.</summary>
    public FrozenDictionary<string, LibraryEntry<Material>> Materials { get; } = materials.ToFrozenDictionary(m => m.Id);

    /// <summary>Profiles by id.</summary>
    public FrozenDictionary<string, LibraryEntry<Profile>> Profiles { get; } = profiles.ToFrozenDictionary(p => p.Id);

    /// <summary>The material chosen, or null where the library does not hold it.</summary>
    /// <param name="choice">An inline material or a library id.</param>
    public Material? Find(MaterialChoice choice) => choice switch
    {
        Material inline => inline,
        LibraryMaterial named => Materials.GetValueOrDefault(named.Id)?.Item,
        _ => null,
    };

    /// <summary>The profile chosen, or null where the library does not hold it.</summary>
    /// <param name="choice">An inline profile or a library id.</param>
    public Profile? Find(ProfileChoice choice) => choice switch
    {
        Profile inline => inline,
        LibraryProfile named => Profiles.GetValueOrDefault(named.Id)?.Item,
        _ => null,
    };
}
