using System.Globalization;
using CsvHelper;

namespace FloodPanel.Storage.LibraryData;

/// <summary>Reads one file of the library row by row and gathers what is wrong with it.</summary>
internal sealed class LibraryTable(string folder, string file, IReadOnlyList<string> columns, List<string> problems)
{
    private static readonly CsvReaderOptions Csv = new()
    {
        TrackLineNumbers = true,
        MalformedData = CsvMalformedDataHandling.Throw,
        FormatProvider = CultureInfo.InvariantCulture,
    };

    public List<LibraryEntry<T>> Read<T>(Func<LibraryRow, T?> readItem)
        where T : class
    {
        var entries = new List<LibraryEntry<T>>();
        try
        {
            using var csv = CsvReader.FromFile(Path.Combine(folder, file), Csv);
            if (HasColumns(csv))
            {
                while (csv.Read())
                {
                    ReadRow(csv, readItem, entries);
                }
            }
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            problems.Add($"{file} cannot be read in the data folder {folder}: {e.Message}");
        }
        catch (CsvFormatException e)
        {
            problems.Add($"{file} is not a table of comma-separated values: {e.Message}");
        }

        return entries;
    }

    private bool HasColumns(CsvReader csv)
    {
        if (csv.Headers.SequenceEqual(columns))
        {
            return true;
        }

        problems.Add($"{file}, line 1: the columns are \"{string.Join(',', csv.Headers)}\"; needed are \"{string.Join(',', columns)}\".");
        return false;
    }

    private void ReadRow<T>(CsvReader csv, Func<LibraryRow, T?> readItem, List<LibraryEntry<T>> entries)
        where T : class
    {
        var row = new LibraryRow(csv, file, problems);
        var before = problems.Count;
        if (csv.FieldCount != columns.Count)
        {
            row.Refuse($"the row has {csv.FieldCount} fields; needed are {columns.Count}");
            return;
        }

        var id = row.Id("id", entries.Select(e => e.Id));
        var title = row.Text("title");
        var item = readItem(row);
        var source = row.Source();
        var evidence = row.Evidence();
        if (problems.Count == before && item is not null)
        {
            entries.Add(new LibraryEntry<T>(id, title, item, source, evidence));
        }
    }
}
