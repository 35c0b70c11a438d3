using FloodPanel.Calculation.Verification;
using FloodPanel.Storage.LibraryData;

namespace FloodPanel.Web.Files;

/// <summary>The verification table for the checking engineer's own files.</summary>
public static class VerificationDownload
{
    public const string Address = "/verification.csv";

    public static void MapVerification(this IEndpointRouteBuilder app) => app.MapGet(
        Address, () => Results.File(VerificationFile.Write(VerificationTable.Rows()), "text/csv", "verification.csv"));
}
