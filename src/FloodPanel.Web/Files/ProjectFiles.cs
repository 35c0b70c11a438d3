using FloodPanel.Storage;
using FloodPanel.Storage.ProjectFile;

namespace FloodPanel.Web.Files;

/// <summary>Downloads, made of the newest saved revision. A refusal is a sentence.</summary>
public static class ProjectFiles
{
    public static void MapProjectFiles(this IEndpointRouteBuilder app) => app.MapGet("/projects/{id:guid}/export", ExportAsync);

    private static async Task<IResult> ExportAsync(Guid id, ProjectStore store) =>
        await store.OpenAsync(id) is { } stored
            ? Results.File(ProjectFileWriter.Write(stored.Project, indented: true), "application/json",
                FileNames.For(stored.Project.Name, ".json"))
            : Refusals.NotFound();
}
