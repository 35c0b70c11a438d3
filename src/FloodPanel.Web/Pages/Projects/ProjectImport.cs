using FloodPanel.Calculation;
using FloodPanel.Storage;
using FloodPanel.Storage.ProjectFile;
using Microsoft.AspNetCore.Components.Forms;

namespace FloodPanel.Web.Pages.Projects;

/// <summary>
/// Makes projects of files. A file that cannot be read is refused with every problem in it; one that can be read but
/// not yet calculated becomes a project, because its owner must be able to mend it here.
/// </summary>
public sealed class ProjectImport(ProjectStore store, Library library)
{
    public async Task<ImportResult> ReadAsync(IBrowserFile file)
    {
        if (file.Size > ProjectFileReader.LargestFile)
        {
            return Refused(file.Name, $"The file has {Megabytes(file.Size)} MB; a project file has at most {Megabytes(ProjectFileReader.LargestFile)} MB.");
        }

        try
        {
            using var bytes = new MemoryStream();
            await using var stream = file.OpenReadStream(ProjectFileReader.LargestFile);
            await stream.CopyToAsync(bytes);
            return await TakeAsync(file.Name, bytes.ToArray());
        }
        catch (IOException e)
        {
            return Refused(file.Name, $"The file did not arrive whole ({e.Message.TrimEnd('.')}); try it again.");
        }
    }

    public async Task<ImportResult> TakeAsync(string fileName, ReadOnlyMemory<byte> utf8)
    {
        var reading = ProjectFileReader.Read(utf8);
        if (reading.Project is not { } project)
        {
            return new ImportResult(fileName, null, reading.Problems);
        }

        var problems = project.Validate(library).Select(p => new FileProblem(p.Path, p.Message.ToString()));
        return new ImportResult(fileName, await store.CreateAsync(project), [.. problems]);
    }

    private static ImportResult Refused(string fileName, string sentence) =>
        new(fileName, null, [new FileProblem("", sentence)]);

    private static string Megabytes(long bytes) => FormattableString.Invariant($"{bytes / 1048576.0:0.#}");
}
