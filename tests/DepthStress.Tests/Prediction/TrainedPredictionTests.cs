using DepthStress.Core.Logs;
using DepthStress.Core.Prediction;
using DepthStress.Tests.Model;
using static DepthStress.Tests.Prediction.PredictionWell;

namespace DepthStress.Tests.Prediction;

public class TrainedPredictionTests
{
    private static readonly PredictionSettings Trained = Shear(PredictionWell.Trained(Property.Vs));

    [Fact]
    public void What_follows_from_the_other_logs_is_found_again()
    {
        var model = SmallWell.Run(Setup(Trained), WellLogs(Without(Vs, 300, 400)));
        for (var i = 0; i < Count; i++) Assert.Equal(Vs[i], model.Column(Property.Vs)[i], 0.01); // m/s: coefficients of seven digits
        Assert.All(model.Column(Property.ShearError)[300..400], e => Assert.InRange(e, 0, 0.01));
        Assert.Equal(SampleOrigin.Predicted, model.StressBasis[350]);
        var use = Assert.Single(model.LawUses, u => u.Slot.Key == "[prediction] shear");
        Assert.Equal("Vs = 0.6 Vp - 300 Vsh + ", use.Law.Text[..24]);
        Assert.Equal(100, use.Outcome.Evaluated);
    }

    [Fact]
    public void Spikes_do_not_bend_the_relation()
    {
        var spiked = Without(Vs, 300, 400);
        (spiked[50], spiked[120], spiked[500]) = (2900, 160, 1000);
        var model = SmallWell.Run(Setup(Trained), WellLogs(spiked));
        for (var i = 300; i < 400; i++) Assert.Equal(Vs[i], model.Column(Property.Vs)[i], 0.01); // m/s: coefficients of seven digits
        Assert.Equal(160, model.Column(Property.Vs)[120]); // a logged value is left as it is
    }

    [Fact]
    public void A_zone_learns_from_itself_where_it_has_enough_and_from_the_well_where_not()
    {
        // Below 200 m another relation holds; the last 40 m are a zone of their own with nothing logged.
        var vs = Make(i => i < 400 ? Vs[i] : i < 720 ? Vs[i] + 250 : NoValue);
        var setup = Setup(Trained) with { Zones = [Zone("upper", 0, new()), Zone("lower", 200, new()), Zone("end", 360, new())] };
        var model = SmallWell.Run(setup, WellLogs(Without(Without(vs, 100, 120), 500, 520)));
        Assert.Equal(Vs[110], model.Column(Property.Vs)[110], 0.01); // m/s: coefficients of seven digits
        Assert.Equal(Vs[510] + 250, model.Column(Property.Vs)[510], 0.01);
        Assert.Equal(["trained on zone upper", "trained on zone lower", "trained on the whole well"], model.Predictions.Select(p => p.Words));
        Assert.True(model.Column(Property.ShearError)[750] > 10, "two relations in one well: its error is not that of either");
    }

    [Fact]
    public void Too_few_logged_samples_train_nothing()
    {
        var model = SmallWell.Run(Setup(Trained), WellLogs(Without(Vs, 100, Count)));
        Assert.Equal(Count - 100, model.Column(Property.Vs).Count(double.IsNaN));
        Assert.Contains("[prediction] shear = \"trained\": 100 logged samples are too few to train on, expected logs over at least 100.0 m; nothing is predicted", model.Texts());
    }

    [Fact]
    public void Use_beyond_the_trained_range_is_a_warning()
    {
        var model = SmallWell.Run(Setup(Trained), WellLogs(Without(Vs, 600, Count))); // velocity rises with depth
        Assert.Contains("shear velocity predicted (trained on the whole well) beyond the range of the samples it was trained on", model.Texts());
    }

    [Fact]
    public void Salt_is_neither_learnt_from_nor_filled()
    {
        var vs = Make(i => ShaleVolume[i] <= 0.5 ? 1700 + (i % 7) : Vs[i]);
        var model = SmallWell.Run(Setup(Trained) with { Lithologies = [Salt(new())] }, WellLogs(Without(vs, 300, 400)));
        for (var i = 300; i < 400; i++) Assert.Equal(ShaleVolume[i] <= 0.5 ? NoValue : Vs[i], model.Column(Property.Vs)[i], 0.01); // m/s: coefficients of seven digits
    }

    [Fact]
    public void Density_is_trained_the_same_way()
    {
        var density = Make(i => 1500 + (0.25 * Vp[i]) + (100 * ShaleVolume[i]));
        var model = SmallWell.Run(Setup(new() { Density = SmallWell.Chosen(PredictionWell.Trained(Property.Density)) }), WellLogs(Vs, Without(density, 200, 300)));
        for (var i = 200; i < 300; i++) Assert.Equal(density[i], model.Column(Property.Density)[i], 0.01); // kg/m3: coefficients of seven digits
        Assert.Contains(model.Texts(), t => t.StartsWith("bulk density predicted (trained on the whole well), standard error 0.000 g/cm3: the stresses there", StringComparison.Ordinal));
    }

    // Errors that waver slowly over depth, as logs' do: neighbours share them, so leaving out single samples would see too little.
    [Fact]
    public void Blocks_see_an_error_that_single_samples_hide()
    {
        var target = Make(i => (0.6 * Vp[i]) + (80 * Math.Sin(0.013 * i)));
        var single = BlockedValidation.Error([Vp], target, [.. Enumerable.Range(0, Count).Select(i => i % 10)]);
        var blocked = BlockedValidation.Error([Vp], target, BlockedValidation.Contiguous(Count, 10));
        Assert.True(blocked > 1.05 * single, FormattableString.Invariant($"{blocked} against {single}"));
    }

    [Theory]
    [InlineData(199, 0.5, 4)]
    [InlineData(200, 0.5, 5)]
    [InlineData(5000, 0.5, 10)]
    public void Blocks_are_twenty_metres_or_a_tenth(int rows, double step, int expected) => Assert.Equal(expected, BlockedValidation.Blocks(rows, step));
}
