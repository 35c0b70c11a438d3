using System.Collections.Concurrent;
using System.Diagnostics;
using System.Net;
using System.Net.Sockets;

namespace FloodPanel.Browser.Tests;

/// <summary>The built app as a process of its own, on a free port and a data folder of the test.</summary>
internal sealed class AppProcess : IDisposable
{
    private readonly Process process;
    private readonly ConcurrentQueue<string> output = [];

    private AppProcess(Process process, Uri address)
    {
        this.process = process;
        Address = address;
        process.OutputDataReceived += Keep;
        process.ErrorDataReceived += Keep;
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
    }

    public Uri Address { get; }

    /// <summary>From the start of the process to the last byte of the first page.</summary>
    public TimeSpan ToFirstPage { get; private set; }

    /// <summary>Lines in which the app's log tells of an error.</summary>
    public IEnumerable<string> Faults => output.Where(line =>
        line.StartsWith("fail:", StringComparison.Ordinal) || line.StartsWith("crit:", StringComparison.Ordinal));

    /// <summary>Starts the app and waits until it answers.</summary>
    /// <exception cref="InvalidOperationException">It ended, or did not answer within a minute.</exception>
    public static async Task<AppProcess> StartAsync(string dataFolder)
    {
        var address = new Uri($"http://127.0.0.1:{FreePort()}");
        var start = new ProcessStartInfo("dotnet", [WebAssembly, "--urls", address.ToString()])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            Environment = { ["FloodPanel__DataFolder"] = dataFolder },
        };
        var clock = Stopwatch.StartNew();
        var app = new AppProcess(Process.Start(start)!, address);
        using var client = new HttpClient { BaseAddress = address };
        while (clock.Elapsed < TimeSpan.FromMinutes(1) && !app.process.HasExited)
        {
            if (await AnswersAsync(client))
            {
                app.ToFirstPage = clock.Elapsed;
                return app;
            }

            await Task.Delay(20);
        }

        app.Dispose();
        throw new InvalidOperationException($"The app did not answer at {address}; it said: {string.Join('\n', app.output)}");
    }

    /// <summary>SIGKILL: the process gets no chance to save anything.</summary>
    public void Kill()
    {
        process.Kill();
        process.WaitForExit();
    }

    public void Dispose()
    {
        if (!process.HasExited)
        {
            Kill();
        }

        process.Dispose();
    }

    // The tests stand beside the app in the artifacts, in a folder of the same configuration.
    private static string WebAssembly
    {
        get
        {
            var tests = new DirectoryInfo(AppContext.BaseDirectory);
            return Path.Combine(tests.Parent!.Parent!.FullName, "FloodPanel.Web", tests.Name, "FloodPanel.Web.dll");
        }
    }

    private static async Task<bool> AnswersAsync(HttpClient client)
    {
        try
        {
            await client.GetStringAsync(new Uri("/", UriKind.Relative));
            return true;
        }
        catch (HttpRequestException)
        {
            return false;
        }
    }

    private void Keep(object sender, DataReceivedEventArgs line)
    {
        if (line.Data is not null)
        {
            output.Enqueue(line.Data);
        }
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
