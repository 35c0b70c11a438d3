using System.Text;
using FloodPanel.Storage.Entities;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Storage;

/// <summary>The project file as it stands in a revision.</summary>
internal static class RevisionText
{
    /// <summary>The text of a project, read back once: what is acknowledged as saved can be opened again.</summary>
    /// <exception cref="StoreException">The project could not be opened again.</exception>
    public static string Of(Project project)
    {
        var file = Written(project);
        var reading = ProjectFileReader.Read(file);
        return reading.Project is not null
            ? Encoding.UTF8.GetString(file)
            : throw new StoreException($"The project cannot be stored. {reading.Problems[0]}");
    }

    /// <exception cref="StoreException">The text is damaged.</exception>
    public static StoredProject Open(RevisionRow revision)
    {
        var reading = ProjectFileReader.Read(Encoding.UTF8.GetBytes(revision.Json));
        return reading.Project is { } project
            ? new StoredProject(revision.ProjectId, revision.Number, revision.SavedAt, project)
            : throw new StoreException($"Revision {revision.Number} of the stored project is damaged. {reading.Problems[0]}");
    }

    private static byte[] Written(Project project)
    {
        try
        {
            return ProjectFileWriter.Write(project, indented: false);
        }
        catch (ArgumentException e)
        {
            throw new StoreException("The project cannot be stored: it holds a number that is not finite.", e);
        }
    }
}
