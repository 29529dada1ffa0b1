using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Tests.Model;

public sealed class HorizontalStressTests
{
    [Fact]
    public void Any_range_of_samples_gives_what_the_whole_run_gives()
    {
        var table = Table(9);
        var (shmin, shmax) = (new double[9], new double[9]);
        HorizontalStress.Fill(table, new StageSettings(), 0, 9, (1e-4, 3e-4), shmin, shmax);
        var (someMin, someMax) = (new double[4], new double[4]);
        HorizontalStress.Fill(table, new StageSettings(), 3, 4, (1e-4, 3e-4), someMin, someMax);
        Assert.Equal(shmin[3..7], someMin);
        Assert.Equal(shmax[3..7], someMax);
        Assert.All(shmin.Zip(shmax), s => Assert.True(s.Second > s.First));
    }

    [Fact]
    public void Without_strains_Shmin_is_uniaxial_and_SHmax_is_missing()
    {
        var (shmin, shmax) = (new double[3], new double[3]);
        HorizontalStress.Fill(Table(3), new StageSettings(), 0, 3, null, shmin, shmax);
        Assert.Equal(36e6, shmin[0], 1e-6); // worked by hand: nu .25, Sv 60, Pp 30 MPa, Biot .8; rounding alone
        Assert.All(shmax, s => Assert.True(double.IsNaN(s)));
    }

    [Fact]
    public void Without_static_constants_both_are_missing()
    {
        var (shmin, shmax) = (new double[2], new double[2]);
        HorizontalStress.Fill(new PropertyTable(2), new StageSettings(), 0, 2, (1e-4, 3e-4), shmin, shmax);
        Assert.All(shmin.Concat(shmax), s => Assert.True(double.IsNaN(s)));
    }

    [Fact]
    public void Filling_allocates_nothing()
    {
        var (table, settings) = (Table(9), new StageSettings());
        var (shmin, shmax) = (new double[9], new double[9]);
        HorizontalStress.Fill(table, settings, 0, 9, (1e-4, 3e-4), shmin, shmax); // compiled now
        var before = GC.GetAllocatedBytesForCurrentThread();
        for (var k = 0; k < 100; k++) HorizontalStress.Fill(table, settings, 0, 9, (1e-4 * k, 3e-4 * k), shmin, shmax);
        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    private static PropertyTable Table(int n)
    {
        var table = new PropertyTable(n);
        Set(Property.YoungsStatic, i => 20e9 + (i * 1e9));
        Set(Property.PoissonStatic, i => 0.25 + (i * 0.01));
        Set(Property.Biot, _ => 0.8);
        Set(Property.VerticalStress, _ => 60e6);
        Set(Property.PorePressure, _ => 30e6);
        return table;

        void Set(Property property, Func<int, double> value) => table.Adopt(property, [.. Enumerable.Range(0, n).Select(value)]);
    }
}
