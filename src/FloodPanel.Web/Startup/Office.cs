using FloodPanel.Calculation;
using FloodPanel.Storage;
using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Web.Startup;

/// <summary>What must be in order before the server starts.</summary>
/// <param name="DataFolder">Where projects are stored.</param>
/// <param name="IsNew">True when the database was made just now.</param>
/// <param name="Library">Materials and profiles.</param>
public sealed record Office(string DataFolder, bool IsNew, Library Library)
{
    /// <summary>Opens data folder and library.</summary>
    /// <exception cref="StoreException">The data folder cannot be used.</exception>
    /// <exception cref="LibraryFileException">The library cannot be used.</exception>
    public static Office Open(IConfiguration configuration)
    {
        var folder = Storage.DataFolder.Resolve(configuration[Storage.DataFolder.Setting]);
        var isNew = !File.Exists(Path.Combine(folder, StoreSetup.FileName));
        StoreSetup.Open(folder);
        return new Office(folder, isNew, LibraryFiles.Load(LibraryFiles.DeliveredFolder));
    }
}
