using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The guides at both ends and what fixes them.</summary>
public sealed partial class GuidesSection
{
    private static readonly GuideMounting[] Mountings = Enum.GetValues<GuideMounting>();

    private GuideSet? remembered;

    /// <summary>Materials to choose from.</summary>
    [Parameter, EditorRequired]
    public Library Library { get; set; } = null!;

    /// <summary>The design basis of the project: what new values are values of.</summary>
    [Parameter, EditorRequired]
    public DesignBasisKind Basis { get; set; }

    protected override object? Shown => Barrier.Guides;

    protected override object? Besides => Library;

    private static string Name(GuideMounting mounting) => mounting switch
    {
        GuideMounting.WetFace => "Wet face",
        GuideMounting.DryFace => "Dry face",
        _ => "In the reveal",
    };

    private static string Way(GuideSet guides) => guides.Mounting switch
    {
        GuideMounting.WetFace when guides.LoadOffset <= guides.BearingDistance => "Water presses the guide onto the wall; the fasteners hold it in place.",
        GuideMounting.WetFace => "The load stands beyond the bearing strip: the guide tips about it and pulls the fasteners.",
        GuideMounting.DryFace => "Water pulls the guide off the wall; its heel presses on, and the fasteners are prised.",
        _ => "Fasteners in shear; the couple of the load pulls them and presses the heel on.",
    };

    private string At(string leaf) => $"{Path}.barrier.guides.{leaf}";

    private Sentence? Problem(string leaf) => ProblemAt($"barrier.guides.{leaf}");

    // Switched off and on again, they are what they were.
    private Task Switch(bool on)
    {
        remembered = Barrier.Guides ?? remembered;
        return EditBarrier("guides", b => b with { Guides = on ? remembered ?? FirstGuides.Of(b, Library, Basis, GuideMounting.Reveal) : null });
    }

    // Guides that nobody has touched become the first ones of the other mounting; typed figures stay.
    private Task Remount(GuideMounting mounting) => EditBarrier("guide mounting", b => b.Guides switch
    {
        null => b,
        { } guides when guides == FirstGuides.Of(b, Library, Basis, guides.Mounting) => b with { Guides = FirstGuides.Of(b, Library, Basis, mounting) },
        { } guides => b with { Guides = guides with { Mounting = mounting } },
    });

    private Task Change(string what, Func<GuideSet, GuideSet> apply) =>
        EditBarrier(what, b => b.Guides is { } guides ? b with { Guides = apply(guides) } : b);
}
