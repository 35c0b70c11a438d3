using System.Net;
using FloodPanel.Storage.ProjectFile;
using FloodPanel.Web.Tests.Bench;

namespace FloodPanel.Web.Tests.Files;

public sealed class ServerTests(WebApp app) : IClassFixture<WebApp>
{
    private static CancellationToken Token => TestContext.Current.CancellationToken;

    [Fact]
    public async Task FirstPage_NewDatabase_ShowsTheDemonstrationProject()
    {
        var page = await app.CreateClient().GetStringAsync(new Uri("/", UriKind.Relative), Token);

        Assert.Contains("(demonstration)", page, StringComparison.Ordinal);
    }

    [Fact]
    public async Task FirstPage_Answer_AllowsNothingFromElsewhere()
    {
        var answer = await app.CreateClient().GetAsync(new Uri("/", UriKind.Relative), Token);

        var policy = Assert.Single(answer.Headers.GetValues("Content-Security-Policy"));
        Assert.StartsWith("default-src 'self'; script-src 'self';", policy, StringComparison.Ordinal);
        Assert.DoesNotContain("http", policy, StringComparison.Ordinal);
        Assert.Equal("nosniff", Assert.Single(answer.Headers.GetValues("X-Content-Type-Options")));
    }

    [Fact]
    public async Task FirstPage_Text_NamesNoOtherHost()
    {
        var page = await app.CreateClient().GetStringAsync(new Uri("/", UriKind.Relative), Token);

        // Names of XML spaces are not fetched.
        Assert.DoesNotContain("http", page.Replace("http://www.w3.org/", "", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public async Task UnknownAddress_IsNotFoundInOurOwnWords()
    {
        var answer = await app.CreateClient().GetAsync(new Uri("/nowhere", UriKind.Relative), Token);

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Contains("This page is not here", await answer.Content.ReadAsStringAsync(Token), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Export_Project_IsItsFileUnderItsName()
    {
        var stored = await app.Store.CreateAsync(Examples.Mill with { Name = "Mill: 4" }, Token);

        var answer = await app.CreateClient().GetAsync(new Uri($"/projects/{stored.Id}/export", UriKind.Relative), Token);

        var read = ProjectFileReader.Read(await answer.Content.ReadAsByteArrayAsync(Token));
        Assert.Equal(stored.Project, read.Project);
        Assert.Equal("application/json", answer.Content.Headers.ContentType!.MediaType);
        Assert.Equal("Mill 4.json", answer.Content.Headers.ContentDisposition!.FileNameStar);
    }

    [Fact]
    public async Task Export_DeletedProject_IsNotFoundInASentence()
    {
        var stored = await app.Store.CreateAsync(Examples.Mill, Token);
        await app.Store.DeleteAsync(stored.Id, Token);

        var answer = await app.CreateClient().GetAsync(new Uri($"/projects/{stored.Id}/export", UriKind.Relative), Token);

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.StartsWith("This project is not here", await answer.Content.ReadAsStringAsync(Token), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("/css/app.css", "text/css")]
    [InlineData("/css/drawing.css", "text/css")]
    [InlineData("/fonts/source-sans-3.woff2", "font/woff2")]
    [InlineData("/_framework/blazor.web.js", "text/javascript")]
    public async Task OwnFiles_AreServed(string address, string type)
    {
        var answer = await app.CreateClient().GetAsync(new Uri(address, UriKind.Relative), Token);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Equal(type, answer.Content.Headers.ContentType!.MediaType);
    }
}
