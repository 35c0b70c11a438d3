using CsvHelper;
using FloodPanel.Calculation.Verification;

namespace FloodPanel.Storage.LibraryData;

/// <summary>Writes the verification table as comma-separated values.</summary>
public static class VerificationFile
{
    /// <summary>The table as UTF-8 text, lines ended by line feeds.</summary>
    public static byte[] Write(IEnumerable<VerificationRow> rows)
    {
        using var stream = new MemoryStream();
        using (var csv = CsvWriter.Create(stream, new CsvWriterOptions { NewLine = "\n" }, leaveOpen: true))
        {
            csv.WriteRecord("source", "quantity", "unit", "published", "computed", "difference", "evidence", "remark");
            foreach (var row in rows)
            {
                csv.WriteRecord(
                    row.Source, row.Quantity, row.Unit, row.Published, row.ComputedShown, row.DifferenceShown,
                    row.Evidence.ToString().ToLowerInvariant(), row.Remark);
            }
        }

        return stream.ToArray();
    }
}
