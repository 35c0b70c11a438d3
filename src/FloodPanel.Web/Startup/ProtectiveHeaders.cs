namespace FloodPanel.Web.Startup;

/// <summary>Headers that keep the page to this server: nothing is loaded from elsewhere, nobody may frame it.</summary>
public static class ProtectiveHeaders
{
    // MudBlazor writes its theme and positions as style elements and attributes, hence unsafe-inline for styles alone.
    private const string Policy =
        "default-src 'self'; script-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; font-src 'self'; " +
        "connect-src 'self'; object-src 'none'; base-uri 'self'; form-action 'self'; frame-ancestors 'none'";

    public static void UseProtectiveHeaders(this WebApplication app) => app.Use((context, next) =>
    {
        var headers = context.Response.Headers;
        headers.ContentSecurityPolicy = Policy;
        headers.XContentTypeOptions = "nosniff";
        headers.XFrameOptions = "DENY";
        headers["Referrer-Policy"] = "same-origin";
        headers["Permissions-Policy"] = "camera=(), microphone=(), geolocation=()";
        headers["Cross-Origin-Opener-Policy"] = "same-origin";
        return next(context);
    });
}
