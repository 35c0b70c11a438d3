using Microsoft.Playwright;

namespace FloodPanel.Browser.Tests;

/// <summary>The browser of this machine; tests skip where there is none.</summary>
internal static class Chromium
{
    /// <summary>Test classes of this collection run one after the other: a measurement means little beside another browser at work.</summary>
    public const string OneAtATime = "Chromium";

    public const string Missing =
        "No Chromium was found: install the package 'chromium', or set CHROMIUM to the browser's path, and the browser tests run.";

    // Nothing here talks to the outside: the pages of an office without internet must work.
    private static readonly string[] Quiet =
    [
        "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking",
        "--disable-component-update", "--disable-sync",
    ];

    /// <summary>Path of the browser; null where none is installed.</summary>
    public static string? Path { get; } = new[]
    {
        Environment.GetEnvironmentVariable("CHROMIUM"),
        "/usr/bin/chromium",
        "/usr/bin/chromium-browser",
        "/usr/bin/google-chrome",
    }.FirstOrDefault(File.Exists);

    public static Task<IBrowser> StartAsync(IPlaywright playwright) =>
        playwright.Chromium.LaunchAsync(new() { ExecutablePath = Path, Args = Quiet });
}
