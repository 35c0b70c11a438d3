using FloodPanel.Calculation;
using Microsoft.AspNetCore.Components;

namespace FloodPanel.Web.Shared.Results;

/// <summary>The cautions of a result, and the words that stand beside every result.</summary>
public sealed partial class NoteList
{
    private const string AidCode = "calculation-aid";

    /// <summary>The notes of a result.</summary>
    [Parameter, EditorRequired]
    public IReadOnlyList<Note> Notes { get; set; } = [];

    /// <summary>What the notes are, for those who cannot see the heading.</summary>
    [Parameter]
    public string Title { get; set; } = "Cautions";

    /// <summary>Name for tests.</summary>
    [Parameter]
    public string TestId { get; set; } = "notes";

    /// <summary>The reader's units.</summary>
    [CascadingParameter]
    public UnitSystem Units { get; set; }

    private List<Note> Cautions => [.. Notes.Where(note => note.Code != AidCode)];

    private Note? Aid => Notes.FirstOrDefault(note => note.Code == AidCode);
}
