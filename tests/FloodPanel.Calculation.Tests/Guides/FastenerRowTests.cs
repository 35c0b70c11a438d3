using FloodPanel.Calculation.Actions;
using FloodPanel.Calculation.Guides;
using FsCheck;
using FsCheck.Xunit;

namespace FloodPanel.Calculation.Tests.Guides;

public class FastenerRowTests
{
    [Theory]
    [InlineData(1.2, 0.1, 0.25, 5, 0.25)]
    [InlineData(1.2, 0.1, 0.24, 6, 0.2)]
    [InlineData(1.2, 0.1, 5, 2, 1)]
    [InlineData(0.9, 0.15, 0.2, 4, 0.2)]
    public void Of_Pitch_FewestFastenersNoFurtherApart(double length, double end, double pitch, int count, double spacing)
    {
        var row = FastenerRow.Of(length, end, pitch);

        Assert.Equal(count, row.Count);
        Assert.Equal(spacing, row.Spacing, 1e-12);
        Assert.Equal(end, row.Position(0), 1e-12);
        Assert.Equal(length - end, row.Position(row.Count - 1), 1e-12);
    }

    [Theory]
    [InlineData(0.2, 0.1, 0.25)]
    [InlineData(1.2, 0, 0.25)]
    [InlineData(1.2, 0.1, 0)]
    [InlineData(1.2, 0.1, double.NaN)]
    public void Of_NoRoomOrNoPitch_Refuses(double length, double end, double pitch) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => FastenerRow.Of(length, end, pitch));

    /// <summary>Whatever the line load, the stretches lie end to end and the fasteners receive the whole of it.</summary>
    [Property]
    public void Stretch_AnyRow_TogetherTheWholeGuide(NonEmptyArray<PositiveInt> lines, PositiveInt pitch)
    {
        var load = Load(lines);
        var row = FastenerRow.Of(load.Length, 0.3 * load.Length, 0.02 + pitch.Get % 50 / 100.0);

        Assert.Equal(0, row.Stretch(0).From);
        Assert.Equal(load.Length, row.Stretch(row.Spaces).To);
        Assert.All(Enumerable.Range(1, row.Spaces), i => Assert.Equal(row.Stretch(i - 1).To, row.Stretch(i).From, 1e-12));
        Hand.Equal(load.Over(0, load.Length), Enumerable.Range(0, row.Count).Sum(i => Received(load, row, i)));
    }

    /// <summary>Three or five new spaces for each old one: every new stretch lies within an old one, so that no fastener receives more.</summary>
    [Property]
    public void Stretch_OddNumberOfNewSpaces_WorstFastenerNeverReceivesMore(NonEmptyArray<PositiveInt> lines, PositiveInt spaces, bool byFive)
    {
        var load = Load(lines);
        var row = new FastenerRow(load.Length, 0.2 * load.Length, 1 + spaces.Get % 6);
        var closer = row with { Spaces = row.Spaces * (byFive ? 5 : 3) };

        Assert.True(Worst(load, closer) <= Worst(load, row) * (1 + 1e-12));
    }

    /// <summary>
    /// Any closer pitch: no fastener receives more than the greatest load on any stretch as long as the old one, or on an end. The bound itself
    /// falls with the pitch; the worst fastener may not, because it may come to stand at a peak.
    /// </summary>
    [Property]
    public void Stretch_AnyCloserPitch_WithinTheGreatestLoadOnAStretch(NonEmptyArray<PositiveInt> lines, PositiveInt spaces, PositiveInt more)
    {
        var load = Load(lines);
        var row = new FastenerRow(load.Length, 0.2 * load.Length, 1 + spaces.Get % 6);
        var closer = row with { Spaces = row.Spaces + 1 + more.Get % 5 };
        var end = row.EndDistance + row.Spacing / 2;
        var bound = Math.Max(Math.Max(load.Over(0, end), load.Over(load.Length - end, load.Length)), Greatest(load, row.Spacing));

        Assert.True(Worst(load, closer) <= bound * (1 + 1e-12));
    }

    /// <summary>All of the load on the middle third: two fasteners share it, a third takes it alone.</summary>
    [Fact]
    public void Stretch_PeakBetweenTwoFasteners_OneMoreInTheMiddleReceivesMore()
    {
        var load = GuideLoad.Of([default, new(900, 900), default], 1, [0.3, 0.3, 0.3]);

        Hand.Equal(450, Worst(load, new(0.9, 0.05, 1)));
        Hand.Equal(900, Worst(load, new(0.9, 0.05, 2)));
    }

    private static GuideLoad Load(NonEmptyArray<PositiveInt> lines)
    {
        FactoredLoad[] loads = [.. lines.Get.Take(12).Select(line => new FactoredLoad(line.Get, line.Get))];
        return GuideLoad.Of(loads, 0.8, [.. Enumerable.Repeat(0.2, loads.Length)]);
    }

    private static double Received(GuideLoad load, FastenerRow row, int index) =>
        row.Stretch(index) is var (from, to) ? load.Over(from, to) : 0;

    private static double Worst(GuideLoad load, FastenerRow row) =>
        Enumerable.Range(0, row.Count).Max(index => Received(load, row, index));

    /// <summary>A line load of steps is heaviest on a stretch that begins or ends at a joint.</summary>
    private static double Greatest(GuideLoad load, double length) => Enumerable.Range(0, load.LogCount + 1)
        .Select(load.Edge)
        .SelectMany(edge => new[] { edge, edge - length })
        .Select(from => Math.Clamp(from, 0, Math.Max(0, load.Length - length)))
        .Max(from => load.Over(from, from + length));
}
