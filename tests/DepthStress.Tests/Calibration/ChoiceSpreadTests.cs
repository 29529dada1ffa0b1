using DepthStress.Core.Calibration;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Calibration;

/// <summary>Every admissible choice, against runs of the chain with that choice.</summary>
public sealed class ChoiceSpreadTests
{
    private static WellSetup Shale => SmallWell.Setup with
    {
        Settings = SmallWell.Settings with
        {
            Moduli = SmallWell.Settings.Moduli with { StaticYoungs = SmallWell.Chosen(SmallWell.Method("lacy-1997-shale")) },
            HorizontalStress = SmallWell.Strains,
        },
    };

    [Fact]
    public void A_trial_is_what_a_run_with_that_choice_gives()
    {
        var spread = Assert.Single(ChoiceSpread.Of(SmallWell.Run(Shale, SmallWell.LogsWith())));
        Assert.Contains(spread.Trials, t => t.StaticYoungs != "lacy-1997-shale");
        foreach (var trial in spread.Trials.Where(t => t.StaticPoisson == "equal-to-dynamic" && t.Biot == "constant"))
        {
            var settings = Shale.Settings with { Moduli = Shale.Settings.Moduli with { StaticYoungs = SmallWell.Chosen(SmallWell.Method(trial.StaticYoungs)) } };
            var shmin = SmallWell.Run(Shale with { Settings = settings }, SmallWell.LogsWith()).Column(Property.MinHorizontalStress);
            Assert.Equal(shmin.Where(double.IsFinite).Average(), trial.Shmin, 1e-3); // Pa: the same formulas, summed in another order
        }
    }

    [Fact]
    public void The_chosen_combination_comes_first_and_the_ranges_hold_it()
    {
        var model = SmallWell.Run(Shale, SmallWell.LogsWith());
        var spread = Assert.Single(ChoiceSpread.Of(model));
        Assert.Equal(("lacy-1997-shale", "equal-to-dynamic", "constant"), (spread.Trials[0].StaticYoungs, spread.Trials[0].StaticPoisson, spread.Trials[0].Biot));
        Assert.Equal(spread.Chosen, spread.Trials[0].Shmin);
        Assert.All((SpreadRange[])[spread.All, spread.ByYoungs, spread.ByPoisson, spread.ByBiot], r => Assert.InRange(spread.Chosen, r.Low, r.High));
        Assert.True(spread.All.Width >= spread.ByPoisson.Width);
    }

    [Fact]
    public void Relations_for_other_rock_and_recalled_ones_stay_out()
    {
        var spread = Assert.Single(ChoiceSpread.Of(SmallWell.Run(Shale, SmallWell.LogsWith())));
        foreach (var id in spread.Trials.Select(t => t.StaticYoungs).Distinct())
        {
            var law = SmallWell.Method(id);
            Assert.True(law.Rocks.HasFlag(RockKinds.Shale), id);
            Assert.NotEqual(Standing.FromMemory, law.Standing);
        }
    }

    [Fact]
    public void The_model_is_as_it_was()
    {
        var model = SmallWell.Run(Shale, SmallWell.LogsWith());
        var before = (model.Column(Property.YoungsStatic), model.Column(Property.MinHorizontalStress), model.Column(Property.Biot));
        ChoiceSpread.Of(model);
        Assert.Equal(before.Item1, model.Column(Property.YoungsStatic));
        Assert.Equal(before.Item2, model.Column(Property.MinHorizontalStress));
        Assert.Equal(before.Item3, model.Column(Property.Biot));
    }

    [Fact]
    public void A_zone_by_a_ratio_has_no_spread()
    {
        var settings = Shale.Settings with
        {
            HorizontalStress = Shale.Settings.HorizontalStress with { Method = SmallWell.Chosen(Core.Stress.HorizontalStressMethod.EffectiveStressRatio), Ratio = SmallWell.Chosen(0.6) },
        };
        Assert.Empty(ChoiceSpread.Of(SmallWell.Run(Shale with { Settings = settings }, SmallWell.LogsWith())));
    }
}
