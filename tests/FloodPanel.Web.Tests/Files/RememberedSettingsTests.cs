using System.Net;

namespace FloodPanel.Web.Tests.Files;

public sealed class RememberedSettingsTests(WebApp app) : IClassFixture<WebApp>
{
    [Theory]
    [InlineData("other=1", "fp-theme-light")]
    [InlineData("fp-theme=dark", "fp-theme-dark")]
    [InlineData("fp-theme=system; fp-system=dark", "fp-theme-dark")]
    [InlineData("fp-theme=light; fp-system=dark", "fp-theme-light")]
    [InlineData("fp-theme=nonsense", "fp-theme-light")]
    public async Task FirstPage_Cookies_DecideTheTheme(string cookies, string expected)
    {
        using var request = new HttpRequestMessage(HttpMethod.Get, "/");
        request.Headers.Add("Cookie", cookies);

        var answer = await app.CreateClient().SendAsync(request, TestContext.Current.CancellationToken);

        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.Contains($"<html lang=\"en\" class=\"{expected}\">", await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken), StringComparison.Ordinal);
    }
}
