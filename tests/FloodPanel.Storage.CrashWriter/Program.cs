using FloodPanel.Calculation.ProjectTree;
using FloodPanel.Storage;
using Microsoft.Extensions.DependencyInjection;

// Saves one project over and over in the folder named by the first argument, until it is killed. After each save
// that the store acknowledges it prints the project, the revision and the reference saved in it.
var folder = args[0];
StoreSetup.Open(folder);
await using var services = new ServiceCollection().AddFloodPanelStorage(folder).BuildServiceProvider();
var store = services.GetRequiredService<ProjectStore>();

var project = new Project { Name = "Burst", Openings = [new Opening { Id = "a", Barrier = new() { Bays = [1] } }] };
var known = (await store.ListAsync()).SingleOrDefault();
var stored = known is null ? await store.CreateAsync(project) : (await store.OpenAsync(known.Id))!;
var revision = stored.Revision;
for (var save = 1; ; save++)
{
    var reference = $"{Environment.ProcessId}-{save}";
    var outcome = await store.SaveAsync(stored.Id, revision, project with { Reference = reference });
    revision = ((ProjectSaved)outcome).Revision;
    Console.Out.WriteLine($"{stored.Id} {revision} {reference}");
    Console.Out.Flush();
}
