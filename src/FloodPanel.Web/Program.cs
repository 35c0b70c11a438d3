using FloodPanel.Calculation;
using FloodPanel.Web;
using FloodPanel.Web.Editing;
using FloodPanel.Web.Startup;
using MudBlazor.Services;

var builder = WebApplication.CreateBuilder(new WebApplicationOptions { Args = args, ContentRootPath = AppContext.BaseDirectory });
builder.WebHost.UseStaticWebAssets();
builder.UseAddressOfOurOwn();
builder.Services.AddRazorComponents().AddInteractiveServerComponents();
builder.Services.AddMudServices(options => options.SnackbarConfiguration.PositionClass = "mud-snackbar-location-bottom-left");
builder.Services.AddSingleton(TimeProvider.System);
builder.Services.AddSingleton<MemoryProjects>();
builder.Services.AddSingleton(Library.Empty);
builder.Services.AddScoped(services => services.GetRequiredService<MemoryProjects>().Access);
builder.Services.AddScoped<ScreenSettings>();
builder.Services.AddScoped<ProjectEditor>();

var app = builder.Build();
app.UseProtectiveHeaders();
app.UseStatusCodePagesWithReExecute("/not-found", createScopeForStatusCodePages: true);
app.UseAntiforgery();
app.MapStaticAssets();
app.MapRazorComponents<App>().AddInteractiveServerRenderMode(options => options.ContentSecurityFrameAncestorsPolicy = null);
app.SayWhereItListens();
await app.RunAsync();
