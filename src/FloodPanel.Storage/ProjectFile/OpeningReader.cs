namespace FloodPanel.Storage.ProjectFile;

/// <summary>Reads one opening with its barrier.</summary>
internal static class OpeningReader
{
    public static Opening Read(FileValue value)
    {
        var blank = new Opening();
        if (value.AsObject() is not { } opening)
        {
            return blank;
        }

        var read = new Opening
        {
            Id = opening.Text("id"),
            Name = opening.Text("name", blank.Name),
            SillLevel = opening.Number("sillLevel"),
            GroundLevel = opening.NumberOrNull("groundLevel"),
            ClearWidth = opening.Number("clearWidth"),
            ClearHeight = opening.Number("clearHeight"),
            RakeDegrees = opening.Number("rake", blank.RakeDegrees),
            ProtectedSideLevel = opening.NumberOrNull("protectedSideLevel"),
            Wall = ReadWall(opening.Object("wall"), blank.Wall, out var behind),
            WallBehind = behind,
            Actions = opening.Object("actions") is { } actions ? ActionReader.Read(actions) : blank.Actions,
            Barrier = opening.NeededObject("barrier") is { } barrier ? ReadBarrier(barrier) : blank.Barrier,
            Leakage = opening.Object("leakage") is { } leakage ? LeakageFile.Read(leakage) : null,
        };
        opening.Close();
        return read;
    }

    private static WallKind ReadWall(FileObject? wall, WallKind fallback, out WallInput? behind)
    {
        var kind = wall?.Word("kind", FileWords.Wall, fallback) ?? fallback;
        behind = wall?.WordOrNull("measure", FileWords.WallMeasure) is { } measure
            ? new WallInput
            {
                Measure = measure,
                LineResistance = wall.NumberOrNull("lineResistance"),
                TotalResistance = wall.NumberOrNull("totalResistance"),
                Source = wall.Text("source", ""),
            }
            : null;
        wall?.Close();
        return kind;
    }

    private static Barrier ReadBarrier(FileObject barrier)
    {
        var read = new Barrier
        {
            Logs = barrier.NeededObject("logs") is { } logs ? ReadLogs(logs) : new LogStack(),
            Bays = (barrier.Need("bays", "a list of clear widths")?.AsList() ?? []).Select(b => b.AsNumber()).ToValueList(),
            Posts = barrier.Object("posts") is { } posts ? ReadPosts(posts) : null,
            BasePlate = barrier.Object("basePlate") is { } plate ? PostBaseFile.ReadPlate(plate) : null,
            Anchors = barrier.Object("anchors") is { } anchors ? AnchorFile.Read(anchors) : null,
            Guides = barrier.Object("guides") is { } guides ? GuideFile.Read(guides) : null,
            Footing = barrier.Object("footing") is { } footing ? FootingFile.Read(footing) : null,
            ByOthers = barrier.List("byOthers").Select(ReadByOthers).ToValueList(),
        };
        barrier.Close();
        return read;
    }

    private static LogStack ReadLogs(FileObject logs)
    {
        var blank = new LogStack();
        var read = new LogStack
        {
            Material = SectionReader.ReadMaterial(logs),
            Profile = SectionReader.ReadProfile(logs),
            Count = logs.WholeNumber("count", Fields.LogCount),
            EndBearing = logs.Number("endBearing", blank.EndBearing),
            DeflectionLimit = logs.Number("deflectionLimit", blank.DeflectionLimit),
            FittingClearance = logs.Number("fittingClearance", blank.FittingClearance),
            Sealed = logs.Flag("sealed", blank.Sealed),
            SealPreload = logs.Number("sealPreload", blank.SealPreload),
            Below = logs.List("below").Select(ReadGroup).ToValueList(),
            Joint = LogServiceFile.ReadJoint(logs),
            Timber = LogServiceFile.ReadTimber(logs),
            Composite = LogServiceFile.ReadComposite(logs),
        };
        logs.Close();
        return read;
    }

    private static LogGroup ReadGroup(FileValue value)
    {
        if (value.AsObject() is not { } group)
        {
            return new LogGroup();
        }

        var read = new LogGroup
        {
            Material = SectionReader.ReadMaterial(group),
            Profile = SectionReader.ReadProfile(group),
            Count = group.WholeNumber("count", Fields.LogCount),
        };
        group.Close();
        return read;
    }

    private static PostSet ReadPosts(FileObject posts)
    {
        var blank = new PostSet();
        var read = new PostSet
        {
            Material = SectionReader.ReadMaterial(posts),
            Profile = SectionReader.ReadProfile(posts),
            Width = posts.Number("width", blank.Width),
            DeflectionLimit = posts.Number("deflectionLimit", blank.DeflectionLimit),
            WeldedBase = posts.Flag("weldedBase", blank.WeldedBase),
            Raker = posts.Object("raker") is { } raker ? PostBaseFile.ReadRaker(raker) : null,
        };
        posts.Close();
        return read;
    }

    private static DesignedByOthers ReadByOthers(FileValue value)
    {
        if (value.AsObject() is not { } declared)
        {
            return new DesignedByOthers("", "", "");
        }

        var read = new DesignedByOthers(
            declared.Text("check"),
            declared.Text("name", ""),
            declared.Text("reference", ""));
        declared.Close();
        return read;
    }
}
