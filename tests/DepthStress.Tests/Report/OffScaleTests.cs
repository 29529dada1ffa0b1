using CsCheck;
using DepthStress.Core.Quantities;
using DepthStress.Report;
using DepthStress.Report.Drawing;

namespace DepthStress.Tests.Report;

public class OffScaleTests
{
    private static readonly CurveScale Scale = new(0, 10);

    [Fact]
    public void A_line_is_cut_where_it_crosses_an_end_of_the_scale()
    {
        var parts = CurveDrawing.OnScale([new(0, 5), new(1, 15), new(2, 5), new(3, 5)], Scale).ToList();
        Assert.Equal(2, parts.Count);
        Assert.Equal([new(0, 5), new(0.5, 10)], parts[0]);
        Assert.Equal([new(1.5, 10), new(2, 5), new(3, 5)], parts[1]);
    }

    [Fact]
    public void A_line_that_passes_the_whole_scale_keeps_its_part_inside()
    {
        var parts = CurveDrawing.OnScale([new(0, -10), new(1, 30)], Scale).ToList();
        Assert.Equal([new LogPoint(0.25, 0), new LogPoint(0.5, 10)], Assert.Single(parts));
    }

    [Fact]
    public void A_line_that_touches_an_end_does_not_run_along_it()
    {
        var parts = CurveDrawing.OnScale([new(0, 10), new(1, 20), new(2, 20), new(3, 0)], Scale).ToList();
        Assert.Equal(2, parts.Count);
        Assert.Equal([new LogPoint(0, 10)], parts[0]);
        Assert.Equal([new LogPoint(2.5, 10), new LogPoint(3, 0)], parts[1]);
    }

    [Fact]
    public void No_part_leaves_the_scale() => Gen.Int[-30, 40].Array[1, 60].Sample(values =>
    {
        LogPoint[] line = [.. values.Select((v, i) => new LogPoint(i, v))];
        var parts = CurveDrawing.OnScale(line, Scale).ToList();
        Assert.All(parts.SelectMany(p => p), p => Assert.InRange(p.Value, Scale.Low, Scale.High));
        Assert.Equal(line.Where(p => p.Value is >= 0 and <= 10), parts.SelectMany(p => p).Where(p => p.Depth == Math.Floor(p.Depth) && line[(int)p.Depth] == p));
    });

    [Fact]
    public void Runs_beyond_an_edge_are_marked_on_the_side_they_left()
    {
        var axis = new DepthAxis(0, 100, 0, 100);
        IReadOnlyList<LogPoint> line = [new(0, 5), new(10, 12), new(12, 14), new(20, 5), new(50, -3), new(60, 5)];
        Assert.Equal([(-1, 50, 50), (1, 10, 12)], CurveDrawing.OffScale([line], new Panel(0, 1, Scale, axis)));
        Assert.Equal([(-1, 10, 12), (1, 50, 50)], CurveDrawing.OffScale([line], new Panel(0, 1, new CurveScale(10, 0), axis)));
    }

    [Fact]
    public void The_head_counts_every_sample_off_the_scale()
    {
        var values = Enumerable.Range(0, 5000).Select(i => i % 5 == 0 ? 200.0 : 50).ToArray();
        var model = PictureModels.Small(
            PictureModels.Depths(5000, 1000, 2000), "spiky", [], ("density", [.. Enumerable.Repeat(2300.0, 5000)]), ("gamma_ray", values));
        var sheet = TracksPicture.Draw(model, UnitSystem.Metric, [TrackTable.Find("gamma_ray")!]);
        Assert.Contains(sheet.Texts, t => t.Text == "1000 off scale");
        Assert.Contains(sheet.Texts, t => t.Text.StartsWith("A wedge", StringComparison.Ordinal));
    }
}
