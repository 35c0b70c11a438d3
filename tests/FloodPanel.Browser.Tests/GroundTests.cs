namespace FloodPanel.Browser.Tests;

public class GroundTests
{
    [Fact]
    public void Runner_Starts() => Assert.Equal(10, Environment.Version.Major);
}
