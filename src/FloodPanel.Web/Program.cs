using FloodPanel.Storage;
using FloodPanel.Storage.LibraryData;
using FloodPanel.Web;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Files;
using FloodPanel.Web.Startup;
using Microsoft.AspNetCore.Connections;

var builder = WebApplication.CreateBuilder(new WebApplicationOptions { Args = args, ContentRootPath = AppContext.BaseDirectory });
builder.WebHost.UseStaticWebAssets();
builder.UseAddressOfOurOwn();
try
{
    var office = Office.Open(builder.Configuration);
    builder.Services.AddFloodPanel(office);
    var app = builder.Build();
    if (office.IsNew)
    {
        await DemoProject.AddAsync(app.Services.GetRequiredService<ProjectStore>());
    }

    app.UseAnswerToFaults();
    app.UseProtectiveHeaders();
    app.UseStatusCodePagesWithReExecute("/not-found", createScopeForStatusCodePages: true);
    app.UseAntiforgery();
    app.MapStaticAssets();
    app.MapProjectFiles();
    app.MapOwnerSummary();
    app.MapVerification();
    app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null);
    app.Lifetime.ApplicationStopping.Register(app.Services.GetRequiredService<OpenEditors>().SaveAll);
    app.SayWhereItListens(office.DataFolder);
    await app.RunAsync();
    return 0;
}
catch (Exception e) when (e is StoreException or LibraryFileException)
{
    await Console.Error.WriteLineAsync(e.Message);
    return 1;
}
catch (IOException e) when (e.InnerException is AddressInUseException)
{
    await Console.Error.WriteLineAsync($"{e.Message.TrimEnd('.')}. Is FloodPanel running already? Stop it, or start this one with --urls and another address.");
    return 1;
}
