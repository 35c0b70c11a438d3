using System.Net;
using System.Text;
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
        var answer = await GetAsync("/");

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
        var answer = await GetAsync("/nowhere");

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.Contains("This page is not here", await answer.Content.ReadAsStringAsync(Token), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Export_Project_IsItsFileUnderItsName()
    {
        var stored = await app.Store.CreateAsync(Examples.Mill with { Name = "Mill: 4" }, Token);

        var answer = await GetAsync($"/projects/{stored.Id}/export");

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

        var answer = await GetAsync($"/projects/{stored.Id}/export");

        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
        Assert.StartsWith("This project is not here", await answer.Content.ReadAsStringAsync(Token), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("si")]
    [InlineData("us")]
    public async Task OwnerSummary_Project_IsAPdfNamedWithItsRevision(string units)
    {
        var stored = await app.Store.CreateAsync(Examples.Mill, Token);

        var answer = await GetAsync($"/projects/{stored.Id}/owner-summary.pdf?units={units}");

        Assert.Equal("application/pdf", answer.Content.Headers.ContentType!.MediaType);
        Assert.Equal("Mill Lane 4 owner summary revision 1.pdf", answer.Content.Headers.ContentDisposition!.FileNameStar);
        Assert.StartsWith("%PDF-", Encoding.Latin1.GetString(await answer.Content.ReadAsByteArrayAsync(Token)), StringComparison.Ordinal);
    }

    [Fact]
    public async Task OwnerSummary_ProjectWithAProblem_IsRefusedWithItsSentence()
    {
        var stored = await app.Store.CreateAsync(Examples.Mill with { Openings = [Examples.Door with { ClearHeight = 0 }] }, Token);

        var answer = await GetAsync($"/projects/{stored.Id}/owner-summary.pdf");

        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        Assert.Contains("Clear height is 0 m; allowed is", await answer.Content.ReadAsStringAsync(Token), StringComparison.Ordinal);
    }

    [Fact]
    public async Task OwnerSummary_NoOpenings_IsRefused()
    {
        var stored = await app.Store.CreateAsync(Examples.Mill with { Openings = [] }, Token);

        var answer = await GetAsync($"/projects/{stored.Id}/owner-summary.pdf");

        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.StatusCode);
        Assert.Contains("no openings yet", await answer.Content.ReadAsStringAsync(Token), StringComparison.Ordinal);
    }

    [Fact]
    public async Task OwnerSummary_UnknownUnits_IsRefused()
    {
        var stored = await app.Store.CreateAsync(Examples.Mill, Token);

        var answer = await GetAsync($"/projects/{stored.Id}/owner-summary.pdf?units=cubits");

        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Equal("Units are “cubits”; allowed is si or us.", await answer.Content.ReadAsStringAsync(Token));
    }

    [Theory]
    [InlineData("/css/app.css", "text/css")]
    [InlineData("/css/drawing.css", "text/css")]
    [InlineData("/fonts/source-sans-3.woff2", "font/woff2")]
    [InlineData("/_framework/blazor.web.js", "text/javascript")]
    public async Task OwnFiles_AreServed(string address, string type)
    {
        var answer = await GetAsync(address);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Equal(type, answer.Content.Headers.ContentType!.MediaType);
    }

    private Task<HttpResponseMessage> GetAsync(string address) =>
        app.CreateClient().GetAsync(new Uri(address, UriKind.Relative), Token);
}
