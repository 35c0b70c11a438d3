using FloodPanel.Calculation;
using FloodPanel.Documents.Pdf;

namespace FloodPanel.Documents.OwnerSummaries;

/// <summary>The owner's summary as a PDF.</summary>
public static class OwnerSummaryPdf
{
    /// <summary>Composes and writes the summary. The same input gives the same bytes.</summary>
    /// <param name="result">The calculation of the project.</param>
    /// <param name="library">The materials and profiles that the project may name.</param>
    /// <param name="units">The owner's units; US customary units go on US Letter.</param>
    /// <param name="revision">Revision of the project.</param>
    /// <param name="date">Date of the summary.</param>
    public static byte[] Write(ProjectResult result, Library library, UnitSystem units, int revision, DateOnly date) =>
        PdfReportWriter.Write(OwnerSummary.Compose(result, library, units, revision, date));
}
