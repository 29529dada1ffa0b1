using CsCheck;
using DepthStress.Core.Logs;
using DepthStress.Report.Drawing;

namespace DepthStress.Tests.Report;

public class DrawingPartsTests
{
    [Theory]
    [InlineData(2500, 15, 200)]
    [InlineData(1, 5, 0.2)]
    [InlineData(0.5, 4, 0.2)]
    [InlineData(7, 4, 2)]
    [InlineData(0, 4, 1)]
    public void Steps_are_round(double range, double parts, double expected) =>
        Assert.Equal(expected, RoundSteps.Step(range, parts), 12); // a product of a digit and a power of ten

    [Fact]
    public void A_scale_around_values_holds_them_in_few_round_parts() =>
        Gen.Select(Gen.Double[-1000, 1000], Gen.Double[0, 1000]).Sample((low, range) =>
        {
            var scale = RoundSteps.Around(low, low + range, 4);
            var slack = (scale.Right - scale.Left) * 1e-6; // ends within rounding of a round number count as round
            Assert.True(scale.Left <= low + slack && scale.Right >= low + range - slack);
            Assert.InRange(scale.Divisions, 1, 6);
        });

    [Theory]
    [InlineData(1000, 200, "1000")]
    [InlineData(0.30000000000000004, 0.1, "0.3")]
    [InlineData(-0.0, 0.1, "0.0")]
    [InlineData(-0.5, 0.5, "-0.5")]
    public void Labels_have_the_decimals_of_their_step(double value, double step, string expected) =>
        Assert.Equal(expected, RoundSteps.Show(value, step));

    [Fact]
    public void Labels_are_spread_without_overlap_when_there_is_room() =>
        Gen.Select(Gen.Double[0, 100].Array[1, 10], Gen.Double[1, 10]).Sample((wanted, height) =>
        {
            Array.Sort(wanted);
            double[] heights = [.. wanted.Select(_ => height)];
            var placed = LabelSpread.Place(wanted, heights, 0, 100);
            Assert.True(placed[0] >= (height / 2) - 1e-9 && placed[^1] <= 100 - (height / 2) + 1e-9); // rounding of sums
            for (var i = 1; i < placed.Length; i++) Assert.True(placed[i] - placed[i - 1] >= height - 1e-9);
        });

    [Fact]
    public void A_ribbon_shows_the_weakest_origin_of_each_row()
    {
        var axis = new DepthAxis(0, 1000, 0, 10);
        double[] depths = [.. Enumerable.Range(0, 1001).Select(i => (double)i)];
        var origins = OriginTrack.From(
        [
            new(0, 140, SampleOrigin.Measured, "log"), new(140, 141, SampleOrigin.Assumed, "user"), new(141, 400, SampleOrigin.Measured, "log"),
            new(400, 700, SampleOrigin.None, ""), new(700, 1001, SampleOrigin.Predicted, "law"),
        ]);
        var (m, a, n, p) = (SampleOrigin.Measured, SampleOrigin.Assumed, SampleOrigin.None, SampleOrigin.Predicted);
        Assert.Equal([m, a, m, m, n, n, n, p, p, p], OriginRibbon.Rows(origins, depths, axis));
    }

    [Fact]
    public void Text_of_any_kind_comes_out_clean() => Gen.String.Sample(text =>
    {
        var clean = PlainText.Clean(text);
        Assert.All(clean.EnumerateRunes(), r => Assert.False(System.Text.Rune.IsControl(r)));
        Assert.Equal(clean, PlainText.Clean(clean));
        Assert.True(PlainText.Width(PlainText.Shorten(clean, 8, false, 60), 8, false) <= 60);
    });

    [Fact]
    public void Wrapped_text_keeps_its_words_while_there_is_room() =>
        Assert.Equal(["Pressure and", "total stress"], PlainText.Wrap("Pressure and total stress", 9, true, 84, 2));
}
