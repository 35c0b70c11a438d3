using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;

namespace FloodPanel.Web.Pages.Bench;

/// <summary>The checks that somebody else makes.</summary>
public sealed partial class ByOthersSection
{
    private readonly Dictionary<string, DesignedByOthers> remembered = [];

    protected override object? Shown => (Barrier.ByOthers, Barrier.Posts is null);

    // Posts and base plates need a check only where there are posts; what was declared before stays visible.
    private IEnumerable<string> Checks => NeededChecks.MayBeByOthers.Where(check =>
        Barrier.Posts is not null || check is not (NeededChecks.Posts or NeededChecks.BasePlates) || DeclarationOf(check) is not null);

    private DesignedByOthers? DeclarationOf(string check) => Barrier.ByOthers.FirstOrDefault(d => d.Check == check);

    private Task Switch(string check, bool on)
    {
        if (DeclarationOf(check) is { } declared)
        {
            remembered[check] = declared;
        }

        return Declare(check, on ? remembered.GetValueOrDefault(check, new(check, "", "")) : null);
    }

    private Task Declare(string check, DesignedByOthers? declaration) =>
        Edit($"{NeededChecks.Title(check)} by others", o => OpeningEdits.Declare(o, check, declaration));
}
