namespace FloodPanel.Storage;

/// <summary>Where the database lies.</summary>
public static class DataFolder
{
    /// <summary>The setting that moves it; as an environment variable, FloodPanel__DataFolder.</summary>
    public const string Setting = "FloodPanel:DataFolder";

    /// <summary>The full path of the data folder; it need not exist yet.</summary>
    /// <param name="configured">What the setting holds; null or blank for the default.</param>
    /// <exception cref="StoreException">The setting is no path, or there is no default on this machine.</exception>
    public static string Resolve(string? configured)
    {
        if (!string.IsNullOrWhiteSpace(configured))
        {
            return FullPath(configured);
        }

        var local = Environment.GetFolderPath(
            Environment.SpecialFolder.LocalApplicationData, Environment.SpecialFolderOption.DoNotVerify);
        return local.Length > 0
            ? Path.Combine(local, "FloodPanel")
            : throw new StoreException($"This account has no folder for application data; name one with the setting {Setting}.");
    }

    private static string FullPath(string configured)
    {
        try
        {
            return Path.GetFullPath(configured);
        }
        catch (Exception e) when (e is ArgumentException or NotSupportedException or PathTooLongException)
        {
            throw new StoreException($"The setting {Setting} is \"{configured}\"; allowed is the path of a folder.", e);
        }
    }
}
