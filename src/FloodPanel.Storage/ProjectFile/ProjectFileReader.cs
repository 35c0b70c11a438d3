using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>
/// Reads project files. It judges names, types and structure; ranges and rules between fields are judged by
/// <see cref="Validation.Validate"/>, so that a project can be saved while it still has such problems.
/// </summary>
public static class ProjectFileReader
{
    internal const string Format = "floodpanel-project";
    internal const int Version = 1;

    /// <summary>Files larger than this are refused unread [bytes].</summary>
    public static int LargestFile => SyntaxScan.LargestFile;

    private static ReadOnlySpan<byte> ByteOrderMark => [0xEF, 0xBB, 0xBF];

    /// <summary>Reads a project; never throws on what the file holds.</summary>
    public static ProjectFileReading Read(ReadOnlyMemory<byte> utf8)
    {
        var text = utf8.Span.StartsWith(ByteOrderMark) ? utf8[ByteOrderMark.Length..] : utf8;
        if (SyntaxScan.FirstProblem(text.Span) is { } problem)
        {
            return new ProjectFileReading(null, [problem]);
        }

        try
        {
            using var document = JsonDocument.Parse(text, new JsonDocumentOptions { CommentHandling = JsonCommentHandling.Skip });
            return Read(document.RootElement);
        }
        catch (JsonException)
        {
            // What the scan lets pass: a lone word or number, or a comment that never ends.
            return new ProjectFileReading(null, [new FileProblem("", "The file is not JSON; allowed is one object in braces.")]);
        }
    }

    private static ProjectFileReading Read(JsonElement root)
    {
        var problems = new ProblemList();
        var file = new FileValue(root, "", problems).AsObject("a project file, one object in braces");
        if (file is null || !IsReadable(file, problems))
        {
            return new ProjectFileReading(null, problems.ToList());
        }

        var project = ReadProject(file);
        return problems.IsEmpty ? new ProjectFileReading(project, []) : new ProjectFileReading(null, problems.ToList());
    }

    /// <summary>Another kind of file, or a newer one, gets one sentence instead of a list of its unknown fields.</summary>
    private static bool IsReadable(FileObject file, ProblemList problems)
    {
        var format = file.Need("format", $"\"{Format}\"");
        if (format is not { } word)
        {
            return false;
        }

        if (!word.IsText || word.AsText() != Format)
        {
            word.Refuse($"\"{Format}\"");
            return false;
        }

        if (file.Need("version", "the number 1") is not { } version)
        {
            return false;
        }

        if (version.Element.ValueKind != JsonValueKind.Number || version.Element.GetDouble() != Version)
        {
            version.Refuse(version.Element.ValueKind == JsonValueKind.Number && version.Element.GetDouble() > Version
                ? "1; the file was written by a newer FloodPanel, which can open it"
                : "the number 1");
            return false;
        }

        return problems.IsEmpty;
    }

    private static Project ReadProject(FileObject file)
    {
        var blank = new Project();
        var kind = file.Word("designBasis", FileWords.DesignBasis, blank.DesignBasis);
        var project = new Project
        {
            Name = file.Text("name"),
            Reference = file.Text("reference", blank.Reference),
            Client = file.Text("client", blank.Client),
            Address = file.Text("address", blank.Address),
            Engineer = file.Text("engineer", blank.Engineer),
            DesignBasis = kind,
            OwnBasis = file.Object("ownBasis") is { } basis ? BasisReader.Read(basis, kind) : null,
            Confirmed = file.List("confirmed").Select(id => id.AsText()).ToValueList(),
            Site = file.NeededObject("site") is { } site ? ReadSite(site) : blank.Site,
            Openings = file.List("openings").Select(OpeningReader.Read).ToValueList(),
            Covers = file.List("covers").Select(CoverFile.Read).ToValueList(),
        };
        file.Close();
        return project;
    }

    private static Site ReadSite(FileObject site)
    {
        var blank = new Site();
        var read = new Site
        {
            Datum = site.Text("datum", blank.Datum),
            WaterDensity = site.Number("waterDensity", blank.WaterDensity),
            AnnualProbability = site.Number("annualProbability", blank.AnnualProbability),
            DesignStillWaterLevel = site.Number("designStillWaterLevel"),
            Surge = site.Number("surge", blank.Surge),
            ClimateAllowance = site.Number("climateAllowance", blank.ClimateAllowance),
            ClimateRatePerYear = site.Number("climateRatePerYear", blank.ClimateRatePerYear),
            DesignLifeYears = site.Number("designLifeYears", blank.DesignLifeYears),
            Freeboard = site.Number("freeboard", blank.Freeboard),
            FloodZone = site.Word("floodZone", FileWords.FloodZone, blank.FloodZone),
            Levels = site.List("levels").Select(ReadLevel).ToValueList(),
        };
        site.Close();
        return read;
    }

    private static LevelPoint ReadLevel(FileValue value)
    {
        if (value.AsObject() is not { } level)
        {
            return new LevelPoint(0, 0);
        }

        var read = new LevelPoint(level.Number("annualProbability"), level.Number("level"));
        level.Close();
        return read;
    }
}
