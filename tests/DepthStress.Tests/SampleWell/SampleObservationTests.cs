using System.Globalization;
using SampleWell.Hidden;

namespace DepthStress.Tests.SampleWell;

/// <summary>The tests of the sample well against its truth.</summary>
public sealed class SampleObservationTests
{
    [Fact]
    public void The_shipped_well_has_every_kind_of_test()
    {
        using var well = WrittenWell.Shipped();
        var counts = Rows(well).CountBy(row => row[3]).ToDictionary();
        Assert.Equal(8, counts["closure"]);
        Assert.Equal(2, counts["leak-off"]);
        Assert.Equal(1, counts["integrity"]);
        Assert.Equal(5, counts["formation-pressure"]);
        Assert.Equal(2, counts["breakdown"]);
        Assert.Equal(3, counts["breakout-width"]);
        Assert.Equal(14, File.ReadLines(Path.Combine(well.Folder, "quillback-4-core.csv")).Count() - 1);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(9)]
    public void Pressures_agree_with_the_truth_within_four_standard_deviations(int seed)
    {
        using var well = seed == 0 ? WrittenWell.Shipped() : WrittenWell.Other((ulong)seed);
        var truth = well.Result.Truth;
        foreach (var row in Rows(well).Where(row => row[2] == "md" && row[3] is "closure" or "formation-pressure"))
        {
            var hidden = truth.Grid.Mean(row[3] == "closure" ? truth.Shmin : truth.Pore, Number(row[0]), Number(row[1]));
            Assert.Equal(hidden, Downhole(row, truth), 4 * Number(row[7])); // the row states its standard deviation
        }
    }

    [Theory]
    [InlineData(0)]
    [InlineData(9)]
    public void Leak_off_lies_above_the_least_stress_and_the_integrity_test_below(int seed)
    {
        using var well = seed == 0 ? WrittenWell.Shipped() : WrittenWell.Other((ulong)seed);
        var truth = well.Result.Truth;
        foreach (var row in Rows(well).Where(row => row[3] == "leak-off"))
            Assert.True(Downhole(row, truth) > truth.Grid.Mean(truth.Shmin, Number(row[0]), Number(row[1])));
        var integrity = Assert.Single(Rows(well), row => row[3] == "integrity");
        var shoe = Number(integrity[0]);
        var atShoe = Number(integrity[4]) + 9.80665e-3 * Number(integrity[6]) * truth.Plan.Path.Tvd(shoe);
        Assert.True(atShoe < truth.Grid.Mean(truth.Shmin, shoe, shoe + 1));
    }

    private static List<string[]> Rows(WrittenWell well) =>
        [.. File.ReadLines(Path.Combine(well.Folder, "quillback-4-observations.csv")).Skip(1).Select(line => line.Split(','))];

    /// <summary>The value in MPa, with the fluid column added (g/cm3 x m x 9.80665e-3 = MPa) where it was read at surface.</summary>
    private static double Downhole(string[] row, Truth truth)
    {
        var middle = truth.Plan.Path.Tvd((Number(row[0]) + Number(row[1])) / 2);
        return Number(row[4]) + (row[5] == "surface" ? 9.80665e-3 * Number(row[6]) * middle : 0);
    }

    private static double Number(string cell) => double.Parse(cell.Split(' ')[0], CultureInfo.InvariantCulture);
}
