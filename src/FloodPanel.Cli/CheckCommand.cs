using FloodPanel.Calculation;
using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Cli;

/// <summary>check FILE: is every opening of the project adequate?</summary>
internal static class CheckCommand
{
    public static int Run(string path, Stream output)
    {
        var library = LibraryFiles.Load(LibraryFiles.DeliveredFolder);
        var project = Open(path);
        if (project.Validate(library) is [var problem, ..])
        {
            throw new RefusalException($"{problem.Path}: {problem.Message}");
        }

        var result = Design.Run(project, library);
        output.Write(ResultWriter.Write(result));

        // Without an opening or a cover nothing was shown to be adequate.
        VerdictKind[] verdicts = [.. result.Openings.Select(o => o.Verdict.Kind), .. result.Covers.Select(c => c.Kind)];
        var allAdequate = verdicts.Length > 0 && verdicts.All(kind => kind == VerdictKind.Adequate);
        return allAdequate ? ExitCode.Adequate : ExitCode.NotAdequate;
    }

    private static Project Open(string path)
    {
        var reading = ProjectFileReader.Read(ReadFile(path));
        return reading.Project ?? throw new RefusalException(reading.Problems[0].ToString());
    }

    /// <summary>At most one byte more than the largest file, which is enough to refuse it: the path may name an endless device.</summary>
    private static byte[] ReadFile(string path)
    {
        try
        {
            using var file = File.OpenRead(path);
            using var bytes = new MemoryStream();
            var buffer = new byte[81920];
            while (bytes.Length <= ProjectFileReader.LargestFile && file.Read(buffer) is > 0 and var count)
            {
                bytes.Write(buffer, 0, count);
            }

            return bytes.ToArray();
        }
        catch (Exception e) when (e is FileNotFoundException or DirectoryNotFoundException)
        {
            throw new RefusalException($"{path}: There is no such file.");
        }
        catch (UnauthorizedAccessException) when (Directory.Exists(path))
        {
            throw new RefusalException($"{path}: This is a folder; allowed is a project file.");
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            throw new RefusalException($"{path}: The file cannot be read: {e.Message}");
        }
    }
}
