using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using Microsoft.AspNetCore.Components;
using MudBlazor;

namespace FloodPanel.Web.Pages.Openings;

/// <summary>Asks for the tape-measure figures of an opening and shows the barrier that they lead to.</summary>
public sealed partial class AddOpeningDialog
{
    private string name = "";
    private double? sillLevel;
    private double? clearWidth;
    private double? clearHeight;
    private bool tried;

    [Inject]
    public required Library Library { get; init; }

    [CascadingParameter]
    public required IMudDialogInstance Dialog { get; set; }

    [Parameter, EditorRequired]
    public required Project Project { get; set; }

    [Parameter, EditorRequired]
    public required UnitSystem Units { get; set; }

    private double RetainedDepth => Project.Site.DesignFloodLevel - (sillLevel ?? 0);

    private Sentence? SillProblem => sillLevel is not null && RetainedDepth > Validation.GreatestRetainedDepth
        ? new($"Sill level is {Metres(sillLevel.Value)}, {Metres(RetainedDepth)} below the design flood level, {Metres(Project.Site.DesignFloodLevel)}; allowed is up to {Metres(Validation.GreatestRetainedDepth)} below it.")
        : null;

    private Opening? Proposal => name.Trim().Length > 0 && sillLevel is { } sill && clearWidth is { } width && clearHeight is { } height && SillProblem is null
        ? OpeningProposal.For(Project, Library, new OpeningBasics(name.Trim(), sill, width, height))
        : null;

    private string ProposalWords => Proposal is { } proposal
        ? OpeningProposal.Describe(Project, Library, proposal).In(Units)
        : $"Design flood level {Calculation.Units.Format(Metres(Project.Site.DesignFloodLevel), Units)}, {Project.Site.Datum}.";

    private void Add()
    {
        if (Proposal is { } opening)
        {
            Dialog.Close(opening);
        }

        tried = true;
    }

    private string Missing
    {
        get
        {
            var missing = new[]
            {
                name.Trim().Length == 0 ? "a name" : null,
                sillLevel is null ? "the sill level" : null,
                clearWidth is null ? "the clear width" : null,
                clearHeight is null ? "the clear height" : null,
            }.OfType<string>().ToArray();
            return missing.Length == 0
                ? "Put right what is marked, then add the opening."
                : $"Still needed: {string.Join(", ", missing)}.";
        }
    }

    private static Quantity Metres(double value) => new(value, Dimension.Length);
}
