namespace FloodPanel.Calculation.Tests;

public class ValueListTests
{
    [Fact]
    public void Equals_SameItems_EqualWithSameHash()
    {
        ValueList<double> one = [1.6, 1.6];
        var other = Enumerable.Repeat(1.6, 2).ToValueList();

        Assert.True(one.Equals(other));
        Assert.Equal(one.GetHashCode(), other.GetHashCode());
    }

    [Theory]
    [InlineData(1.6)]
    [InlineData(1.6, 1.7)]
    [InlineData(1.6, 1.6, 1.6)]
    public void Equals_OtherItemsOrCount_NotEqual(params double[] items)
    {
        ValueList<double> one = [1.6, 1.6];

        Assert.False(one.Equals(items.ToValueList()));
    }

    [Fact]
    public void Equals_NothingOrAnotherType_NotEqual()
    {
        ValueList<double> one = [1.6];

        Assert.False(one.Equals(null));
        Assert.False(one.Equals((object)1.6));
    }

    [Fact]
    public void Equals_RecordsHoldingEqualLists_EqualByValue()
    {
        var one = new Barrier { Bays = [1, 2], ByOthers = [new("anchors", "N", "R")] };
        var other = new Barrier { Bays = [1, 2], ByOthers = [new("anchors", "N", "R")] };

        Assert.Equal(one, other);
        Assert.NotEqual(one, other with { Bays = [2, 1] });
    }

    [Fact]
    public void SetItemAddInsertRemoveAt_Copies_LeaveTheOriginal()
    {
        ValueList<int> one = [1, 2, 3];

        Assert.Equal([1, 9, 3], one.SetItem(1, 9));
        Assert.Equal([1, 2, 3, 4], one.Add(4));
        Assert.Equal([0, 1, 2, 3], one.Insert(0, 0));
        Assert.Equal([1, 2, 3, 7], one.Insert(3, 7));
        Assert.Equal([1, 3], one.RemoveAt(1));
        Assert.Equal([1, 2, 3], one);
    }

    [Fact]
    public void Create_FromAnArray_DoesNotShareIt()
    {
        var items = new[] { 1, 2 };
        var list = items.ToValueList();

        items[0] = 5;

        Assert.Equal([1, 2], list);
    }
}
