using FloodPanel.Calculation;
using FloodPanel.Documents.OwnerSummaries;
using FloodPanel.Storage;

namespace FloodPanel.Web.Files;

/// <summary>The owner summary of the newest saved revision, calculated anew.</summary>
public static class OwnerSummaryFile
{
    public static void MapOwnerSummary(this IEndpointRouteBuilder app) =>
        app.MapGet("/projects/{id:guid}/owner-summary.pdf", WriteAsync);

    private static async Task<IResult> WriteAsync(Guid id, string? units, ProjectStore store, Library library, TimeProvider time)
    {
        if (Units(units) is not { } system)
        {
            return Refusals.Of(StatusCodes.Status400BadRequest, $"Units are “{units}”; allowed is si or us.");
        }

        if (await store.OpenAsync(id) is not { } stored)
        {
            return Refusals.NotFound();
        }

        return Refusal(stored, library, system) ?? Results.File(
            OwnerSummaryPdf.Write(Design.Run(stored.Project, library), library, system, stored.Revision, Today(time)),
            "application/pdf",
            FileNames.For($"{stored.Project.Name} owner summary", $" revision {stored.Revision}.pdf"));
    }

    private static IResult? Refusal(StoredProject stored, Library library, UnitSystem system)
    {
        if (stored.Project.Openings.Count == 0)
        {
            return Refusals.Of(StatusCodes.Status422UnprocessableEntity, "The project has no openings yet; add one, then make the owner summary.");
        }

        var problems = stored.Project.Validate(library);
        return problems.Count switch
        {
            0 => null,
            1 => Refusals.Of(StatusCodes.Status422UnprocessableEntity, $"The owner summary cannot be made yet. {problems[0].Message.In(system)}"),
            _ => Refusals.Of(StatusCodes.Status422UnprocessableEntity,
                $"The owner summary cannot be made yet. {problems[0].Message.In(system)} Besides this one, {problems.Count - 1} more must be put right."),
        };
    }

    private static UnitSystem? Units(string? word) => word switch
    {
        null or "si" => UnitSystem.SI,
        "us" => UnitSystem.USCustomary,
        _ => null,
    };

    private static DateOnly Today(TimeProvider time) => DateOnly.FromDateTime(time.GetLocalNow().DateTime);
}
