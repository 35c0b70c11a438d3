using FloodPanel.Documents.Drawings;

namespace FloodPanel.Documents.Reports;

/// <summary>A document before it is laid out: what it says, not how a PDF library says it.</summary>
/// <param name="Properties">What the file says of itself.</param>
/// <param name="Paper">The paper.</param>
/// <param name="Header">Words at the head of each page.</param>
/// <param name="Band">A warning across the head of each page; null for none.</param>
/// <param name="Footer">Words at the foot of each page, left and middle; the page number stands on the right.</param>
/// <param name="Blocks">The content.</param>
public sealed record Report(
    ReportProperties Properties,
    Paper Paper,
    string Header,
    Band? Band,
    (string Left, string Middle) Footer,
    IReadOnlyList<Block> Blocks);

/// <summary>What a file says of itself.</summary>
/// <param name="Title">Title.</param>
/// <param name="Author">Who answers for it.</param>
/// <param name="Subject">What it is about.</param>
/// <param name="Keywords">Words to find it by.</param>
/// <param name="Date">Its date.</param>
public sealed record ReportProperties(string Title, string Author, string Subject, string Keywords, DateOnly Date);

/// <summary>A warning across the head of a page.</summary>
/// <param name="Words">The warning.</param>
/// <param name="Reason">Why it stands there.</param>
public sealed record Band(string Words, string Reason);

/// <summary>Paper and its margins [mm].</summary>
/// <param name="Width">Width.</param>
/// <param name="Height">Height.</param>
/// <param name="Side">Left and right margin.</param>
/// <param name="Top">Where the content begins.</param>
/// <param name="Foot">Room for the foot of the page.</param>
public sealed record Paper(double Width, double Height, double Side, double Top, double Foot)
{
    /// <summary>ISO 216 A4.</summary>
    public static Paper A4 { get; } = new(210, 297, 18, 22, 19);

    /// <summary>US Letter, 8½ × 11 in.</summary>
    public static Paper Letter { get; } = new(215.9, 279.4, 18, 22, 19);

    /// <summary>Where the content ends, from the upper edge.</summary>
    public double Bottom => Height - Foot;

    /// <summary>Width between the margins.</summary>
    public double ContentWidth => Width - 2 * Side;
}

/// <summary>A part of a report.</summary>
public abstract record Block;

/// <summary>A heading; it stays with what follows.</summary>
/// <param name="Words">The words.</param>
/// <param name="Level">1 for the title, 2 for a section, 3 within a section.</param>
public sealed record Heading(string Words, int Level) : Block;

/// <summary>What a paragraph is.</summary>
public enum ParagraphKind
{
    /// <summary>Plain words.</summary>
    Body,

    /// <summary>Words that recede.</summary>
    Muted,

    /// <summary>Words that must be read: set off by a rule.</summary>
    Strong,

    /// <summary>An item of a list.</summary>
    Item,
}

/// <summary>A paragraph.</summary>
/// <param name="Words">The words.</param>
/// <param name="Kind">What it is.</param>
public sealed record Paragraph(string Words, ParagraphKind Kind = ParagraphKind.Body) : Block;

/// <summary>Names and values in two columns.</summary>
/// <param name="Rows">The rows; empty values are left out.</param>
public sealed record Facts(IReadOnlyList<(string Name, string Value)> Rows) : Block;

/// <summary>A table whose head is repeated on each page; a row is never split.</summary>
/// <param name="Columns">The columns.</param>
/// <param name="Rows">The cells, row by row.</param>
public sealed record Table(IReadOnlyList<Column> Columns, IReadOnlyList<IReadOnlyList<string>> Rows) : Block;

/// <summary>A column of a table.</summary>
/// <param name="Heading">Its heading.</param>
/// <param name="Share">Its share of the width.</param>
/// <param name="IsNumber">True when its cells are aligned on the decimal point.</param>
/// <param name="Unit">The unit of its numbers, below the heading.</param>
public sealed record Column(string Heading, double Share, bool IsNumber = false, string Unit = "");

/// <summary>A drawing as wide as the content.</summary>
/// <param name="Scene">The drawing.</param>
public sealed record Figure(Scene Scene) : Block;

/// <summary>A verdict: a shape, a word, a sentence.</summary>
/// <param name="Kind">The verdict.</param>
/// <param name="Lead">What it means, in a few words.</param>
/// <param name="Words">Why.</param>
public sealed record VerdictLine(Calculation.VerdictKind Kind, string Lead, string Words) : Block;

/// <summary>Lines to sign on.</summary>
/// <param name="Name">Printed below the first line.</param>
public sealed record SignatureLines(string Name) : Block;

/// <summary>Blocks that stay on one page where they fit on one.</summary>
/// <param name="Blocks">The blocks.</param>
public sealed record Together(IReadOnlyList<Block> Blocks) : Block;
