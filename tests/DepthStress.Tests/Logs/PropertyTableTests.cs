using DepthStress.Core.Logs;

namespace DepthStress.Tests.Logs;

public class PropertyTableTests
{
    [Fact]
    public void A_new_column_starts_as_all_missing()
    {
        var table = new PropertyTable(3);
        Assert.False(table.Has(Property.Biot));
        Assert.True(table.Read(Property.Biot).IsEmpty);
        Assert.Equal([double.NaN, double.NaN, double.NaN], table.Write(Property.Biot).ToArray());
        Assert.True(table.Has(Property.Biot));
    }

    [Fact]
    public void What_is_written_is_read_again_and_stays()
    {
        var table = new PropertyTable(2);
        table.Write(Property.Biot)[1] = 0.7;
        table.Write(Property.Biot)[0] = 0.6;
        Assert.Equal([0.6, 0.7], table.Read(Property.Biot).ToArray());
    }

    [Fact]
    public void An_adopted_array_is_not_copied()
    {
        double[] values = [1, 2];
        var table = new PropertyTable(2);
        table.Adopt(Property.Vp, values);
        table.Write(Property.Vp)[0] = 5;
        Assert.Equal(5, values[0]);
        Assert.Throws<ArgumentException>(() => table.Adopt(Property.Vp, [1]));
    }

    [Fact]
    public void Every_property_has_room()
    {
        var table = new PropertyTable(1);
        foreach (var property in Enum.GetValues<Property>()) table.Write(property)[0] = (int)property;
        Assert.All(Enum.GetValues<Property>(), p => Assert.Equal((int)p, table.Read(p)[0]));
    }
}
