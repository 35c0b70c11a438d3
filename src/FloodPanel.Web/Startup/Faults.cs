using FloodPanel.Storage;
using Microsoft.AspNetCore.Diagnostics;

namespace FloodPanel.Web.Startup;

public static class Faults
{
    /// <summary>A fault outside of a page is answered with a sentence; its trace goes to the log alone.</summary>
    public static void UseAnswerToFaults(this WebApplication app) => app.UseExceptionHandler(handler => handler.Run(async context =>
    {
        var fault = context.Features.Get<IExceptionHandlerFeature>()?.Error;
        context.Response.ContentType = "text/plain; charset=utf-8";
        await context.Response.WriteAsync(fault is StoreException
            ? fault.Message
            : "FloodPanel could not answer because of a fault in the program. What was saved is safe. Go back and try again.");
    }));
}
