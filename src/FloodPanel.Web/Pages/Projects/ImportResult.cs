using FloodPanel.Storage;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Web.Pages.Projects;

/// <summary>What became of one file.</summary>
/// <param name="FileName">Its name.</param>
/// <param name="Stored">The project made of it; null when the file was refused.</param>
/// <param name="Problems">Why it was refused, or what must be put right before it can be calculated.</param>
public sealed record ImportResult(string FileName, StoredProject? Stored, IReadOnlyList<FileProblem> Problems);
