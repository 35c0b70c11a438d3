using FloodPanel.Documents.Typography;

namespace FloodPanel.Documents.Tests.Typography;

public class WordingTests
{
    private static readonly FontFile Font = FontFile.Regular;

    /// <summary>Source Sans 3.052, regular: advances of 0, 1 and space in its hmtx table are 497, 497 and 200 of 1000.</summary>
    [Theory]
    [InlineData("0", 0.497)]
    [InlineData("10", 0.994)]
    [InlineData("1 0", 1.194)]
    public void Width_Digits_AreTabular(string text, double width) => Assert.Equal(width, Font.Width(text, 1), 1e-9);

    [Theory]
    [InlineData("γρστφ≤√×²³⁴…–·°π")]
    public void Has_SymbolsOfTheTrade_AreThere(string symbols) =>
        Assert.All(symbols.EnumerateRunes(), rune => Assert.True(Font.Has(rune), rune.ToString()));

    [Theory]
    [InlineData("  a \t\n b\u0001c ", "a b c")]
    [InlineData("", "")]
    public void OneLine_ControlCharacters_BecomeSpaces(string typed, string expected) =>
        Assert.Equal(expected, Wording.OneLine(typed));

    [Fact]
    public void OneLine_HalfACharacter_IsReplaced() =>
        Assert.Equal("\uFFFD", Wording.OneLine(new string((char)0xD800, 1)));

    [Fact]
    public void Shorten_TooLong_EndsInAnEllipsisAndFits()
    {
        var shortened = Wording.Shorten(Sample.LongName, Font, 3, 40);

        Assert.EndsWith("…", shortened, StringComparison.Ordinal);
        Assert.StartsWith(shortened[..^1], Sample.LongName, StringComparison.Ordinal);
        Assert.InRange(Font.Width(shortened, 3), 36, 40);
    }

    [Fact]
    public void Shorten_Fits_IsUnchanged() => Assert.Equal("Garage", Wording.Shorten("Garage", Font, 3, 40));

    [Fact]
    public void Lines_LongText_FitAndLoseNothing()
    {
        var lines = Wording.Lines(Sample.LongName, Font, 3, 40);

        Assert.All(lines, line => Assert.True(Font.Width(line, 3) <= 40));
        Assert.Equal(Sample.LongName, string.Join(' ', lines));
    }

    [Fact]
    public void Lines_OneEndlessWord_IsBroken()
    {
        var word = new string('W', 200);

        var lines = Wording.Lines(word, Font, 3, 40);

        Assert.All(lines, line => Assert.True(Font.Width(line, 3) <= 40));
        Assert.Equal(word, string.Concat(lines));
    }

    [Fact]
    public void Lines_MoreThanAllowed_CutsTheLast()
    {
        var lines = Wording.Lines(Sample.LongName, Font, 3, 40, most: 2);

        Assert.Equal(2, lines.Count);
        Assert.EndsWith("…", lines[1], StringComparison.Ordinal);
    }
}
