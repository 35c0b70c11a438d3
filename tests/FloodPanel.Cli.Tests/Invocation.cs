using System.Diagnostics;
using System.Text;
using System.Text.Json.Nodes;

namespace FloodPanel.Cli.Tests;

/// <summary>One run of the command line and what came of it.</summary>
internal sealed record Invocation(int ExitCode, string Output, string Errors)
{
    public JsonObject Result => JsonNode.Parse(Output)!.AsObject();

    public static string Sample(string name) => Path.Combine(AppContext.BaseDirectory, "Samples", name);

    /// <summary>Runs in this process.</summary>
    public static Invocation Of(params string[] arguments)
    {
        using var output = new MemoryStream();
        using var errors = new StringWriter();
        var code = CommandLine.Run(arguments, output, errors);
        return new Invocation(code, Encoding.UTF8.GetString(output.ToArray()), errors.ToString());
    }

    /// <summary>Runs the program itself.</summary>
    public static async Task<Invocation> OfProgramAsync(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet")
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            StandardOutputEncoding = Encoding.UTF8,
            StandardErrorEncoding = Encoding.UTF8,
        };
        start.ArgumentList.Add(Path.Combine(AppContext.BaseDirectory, "floodpanel.dll"));
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        using var program = Process.Start(start)!;
        var output = program.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        var errors = program.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        await program.WaitForExitAsync(TestContext.Current.CancellationToken);
        return new Invocation(program.ExitCode, await output, await errors);
    }
}
