using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>What holds a post: its weld, its raker, its base plate; without posts there is none.</summary>
public sealed partial class PostBaseSection
{
    private static readonly RakerInput UsualRaker = new();
    private static readonly BasePlateInput UsualPlate = new();
    private static readonly Dictionary<string, object?> WeldedId = new() { ["data-testid"] = "posts-welded-base" };

    private RakerInput? rememberedRaker;
    private BasePlateInput? rememberedPlate;

    /// <summary>Materials and profiles to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    protected override object? Shown => (Barrier.Posts, Barrier.BasePlate, Barrier.Bays.Count > 1);

    protected override object? Besides => Library;

    private bool IsAluminium => Barrier.Posts is { } posts && Library.Find(posts.Material)?.Family == MaterialFamily.Aluminium;

    private Sentence? RakerProblem(string leaf) => ProblemAt($"barrier.posts.raker.{leaf}");

    private Sentence? PlateProblem(string leaf) => ProblemAt($"barrier.basePlate.{leaf}");

    // Switched off and on again, they are what they were.
    private Task SwitchRaker(bool on)
    {
        rememberedRaker = Barrier.Posts?.Raker ?? rememberedRaker;
        return Edit("raker", o => o.Barrier.Posts is { } posts
            ? o with { Barrier = o.Barrier with { Posts = posts with { Raker = on ? rememberedRaker ?? FirstPostBase.Raker(o, Library) : null } } }
            : o);
    }

    private Task SwitchPlate(bool on)
    {
        rememberedPlate = Barrier.BasePlate ?? rememberedPlate;
        return EditBarrier("base plate", b => b with { BasePlate = on ? rememberedPlate ?? FirstPostBase.Plate(b, Library) : null });
    }

    private Task EditRaker(string what, Func<RakerInput, RakerInput> apply) =>
        EditPosts(what, p => p.Raker is { } raker ? p with { Raker = apply(raker) } : p);

    private Task EditPlate(string what, Func<BasePlateInput, BasePlateInput> apply) =>
        EditBarrier(what, b => b.BasePlate is { } plate ? b with { BasePlate = apply(plate) } : b);
}
