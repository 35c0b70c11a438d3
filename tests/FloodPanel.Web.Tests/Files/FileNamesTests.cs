using FloodPanel.Web.Files;

namespace FloodPanel.Web.Tests.Files;

public class FileNamesTests
{
    [Theory]
    [InlineData("Mill Lane 4", "Mill Lane 4.json")]
    [InlineData("Quay 2/3: \"north\" <gate>?", "Quay 2 3 north gate.json")]
    [InlineData("..", "project.json")]
    [InlineData("", "project.json")]
    [InlineData("Zürich 東\t1", "Zürich 東 1.json")]
    public void For_ProjectName_IsAFileNameEverywhere(string name, string expected) =>
        Assert.Equal(expected, FileNames.For(name, ".json"));

    [Fact]
    public void For_LongName_IsCut() => Assert.Equal(80 + 5, FileNames.For(new string('x', 400), ".json").Length);
}
