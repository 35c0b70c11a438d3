using System.Text;

namespace FloodPanel.Web.Files;

/// <summary>What a download says when it cannot be made; shown on the page that asked for it.</summary>
internal static class Refusals
{
    public static IResult NotFound() =>
        Of(StatusCodes.Status404NotFound, "This project is not here; it may have been deleted. Go back to the list of projects.");

    public static IResult Of(int status, string sentence) =>
        Results.Text(sentence, "text/plain", Encoding.UTF8, status);
}
