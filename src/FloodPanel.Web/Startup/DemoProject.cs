using FloodPanel.Storage;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Web.Startup;

/// <summary>An invented project in a new database, so that there is something to look at.</summary>
public static class DemoProject
{
    private const string FileName = "demo-project.json";

    public static async Task AddAsync(ProjectStore store)
    {
        var path = Path.Combine(LibraryFiles.DeliveredFolder, FileName);
        if (!File.Exists(path))
        {
            // An office may take it out of the data folder.
            return;
        }

        var reading = ProjectFileReader.Read(await File.ReadAllBytesAsync(path));
        await store.CreateAsync(reading.Project
            ?? throw new StoreException($"The demonstration project {path} cannot be read. {reading.Problems[0]}"));
    }
}
