using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Calculation.Sections;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>A profile of the library, or one by its shape.</summary>
public sealed partial class ProfilePicker
{
    private const string Own = "";

    private readonly Dictionary<Type, Profile> remembered = [];
    private Profile? lastOwn;
    private string[] ids = [];
    private Library? listed;

    /// <summary>Key of the field, "logs.profile".</summary>
    [Parameter, EditorRequired]
    public string Key { get; set; } = "";

    /// <summary>What is chosen.</summary>
    [Parameter, EditorRequired]
    public ProfileChoice Choice { get; set; } = null!;

    /// <summary>Profiles to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    /// <summary>What the member is made of, for its mass; null where the library does not hold it.</summary>
    [Parameter, EditorRequired]
    public Material? Material { get; set; }

    /// <summary>True for posts, which lists their usual shapes first.</summary>
    [Parameter, EditorRequired]
    public bool ForPosts { get; set; }

    /// <summary>Path of the choice in the project file.</summary>
    [Parameter, EditorRequired]
    public string Path { get; set; } = "";

    /// <summary>The problems of the project.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<InputProblem> Problems { get; set; } = [];

    /// <summary>Raised with another choice.</summary>
    [Parameter, EditorRequired]
    public EventCallback<ProfileChoice> OnChange { get; set; }

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private string[] Ids => ids;

    private string ChosenId => Choice is LibraryProfile named ? named.Id : Own;

    private LibraryEntry<Profile>? Entry => Choice is LibraryProfile named ? Library.Profiles.GetValueOrDefault(named.Id) : null;

    /// <summary>The profile, once it can be drawn.</summary>
    private Profile? Drawn => HasProblem ? null : Library.Find(Choice);

    private string? Summary
    {
        get
        {
            if (Drawn is not { } profile)
            {
                return null;
            }

            var section = SectionProperties.Of(profile);
            return $"A {Shown(section.Area, Dimension.SectionArea)}, I {Shown(section.Inertia, Dimension.SecondMoment)}, "
                + $"W {Shown(section.Modulus, Dimension.SectionModulus)}";
        }
    }

    private bool HasProblem => Problems.Any(p => p.Path.StartsWith(Path, StringComparison.Ordinal));

    protected override void OnParametersSet()
    {
        if (Choice is Profile own)
        {
            remembered[own.GetType()] = lastOwn = own;
        }

        if (!ReferenceEquals(listed, Library))
        {
            listed = Library;
            ids = [.. Library.Profiles.Values.OrderBy(p => IsPostShape(p.Item) != ForPosts).ThenBy(p => p.Id, StringComparer.Ordinal).Select(p => p.Id), Own];
        }
    }

    private static bool IsPostShape(Profile profile) => profile is RectangularTube or ISection;

    private string TitleOf(string id) => id == Own ? "Own dimensions" : Library.Profiles.GetValueOrDefault(id)?.Title ?? id;

    private Sentence? ProblemAt(string leaf) => Problems.FirstOrDefault(p => p.Path == Path + leaf)?.Message;

    // Own dimensions start from those of the library, or from what they were before.
    private Task Choose(string id) => id == Own
        ? Edit(lastOwn ?? Library.Find(Choice) ?? new Rectangle { Height = 0.2, Depth = 0.05 })
        : OnChange.InvokeAsync(new LibraryProfile(id));

    // Back at a shape, its thicknesses are what they were; height and depth go along.
    private Task Reshape(Profile own, Type shape) => Edit(remembered.TryGetValue(shape, out var before)
        ? before with { Height = own.Height, Depth = own.Depth }
        : ProfileShapes.Like(own, shape));

    private Task Edit(Profile own) => OnChange.InvokeAsync(own);

    // Number and unit stay on one line.
    private string Shown(double value, Dimension dimension) =>
        Calculation.Units.Format(value, dimension, Units).Replace(' ', '\u00A0');
}
