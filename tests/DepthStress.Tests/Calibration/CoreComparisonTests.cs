using DepthStress.Core.Calibration;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Calibration;

public class CoreComparisonTests
{
    private static readonly double[] Fine = [.. Enumerable.Range(0, 201).Select(i => 0.5 * i)];

    private static CorePlug Plug(double depth, double gigapascals, PlugOrientation orientation = PlugOrientation.Vertical, double confining = 8e6) =>
        new() { Depth = depth, YoungsStatic = gigapascals * 1e9, Orientation = orientation, ConfiningPressure = confining };

    private static EarthModel Model(CoreData core, Func<double, double>? vp = null, double factor = 1)
    {
        double[] values = [.. Fine.Select(vp ?? (_ => 4000))];
        var moduli = SmallWell.Settings.Moduli with { StaticYoungsFactor = SmallWell.Chosen(factor) };
        return SmallWell.Run(
            SmallWell.Setup with { Settings = SmallWell.Settings with { Moduli = moduli }, Core = core },
            SmallWell.Table(
                Fine, SmallWell.Curve(Property.Vp, values), SmallWell.Curve(Property.Vs, [.. values.Select(v => 0.6 * v)]), SmallWell.Curve(Property.Density, SmallWell.Same(2500, 201))));
    }

    private static CoreComparison Compare(EarthModel model) => CoreComparison.Of(model)!;

    // Dynamic modulus 35.1 GPa, static half of it: 17.55 GPa (self-computed). Tolerance: rounding.
    [Fact]
    public void Plugs_are_compared_with_the_model_at_their_depth()
    {
        var core = Compare(Model(new CoreData { Plugs = [Plug(10.1, 20), Plug(20, 18), Plug(30, 16)] }));
        var group = Assert.Single(core.Groups);
        Assert.Equal(17.55e9 - 18e9, group.Youngs!.Mean, 10.0);
        Assert.Equal(Math.Sqrt(((2.45 * 2.45) + (0.45 * 0.45) + (1.55 * 1.55)) / 3) * 1e9, group.Youngs.RootMeanSquare, 10.0);
        Assert.Equal((20 + 18 + 16) / 3 / 17.55, group.Factor!.Value.Value, 1e-9);
        Assert.Equal(18.0 / 35.1, group.ThroughOrigin!.Value.Value, 1e-9);
        Assert.Null(group.Line); // the dynamic modulus does not vary
        Assert.Null(core.Match);
        Assert.Null(CoreComparison.Of(Model(new CoreData())));
    }

    [Fact]
    public void Plugs_cut_or_tested_differently_are_not_pooled()
    {
        var core = Compare(Model(new CoreData
        {
            Plugs =
            [
                Plug(10, 20), Plug(11, 20), Plug(12, 20, PlugOrientation.Horizontal), Plug(13, 20, confining: 0), Plug(14, 20, confining: double.NaN),
                Plug(15, 20, PlugOrientation.NotStated),
            ],
        }));
        Assert.Equal(
            ["vertical; confined", "horizontal; confined", "vertical; unconfined", "vertical; confining pressure not stated", "orientation not stated; confined"],
            core.Groups.Select(g => g.Name));
        Assert.Equal([2, 1, 1, 1, 1], core.Groups.Select(g => g.Rows.Count));
    }

    // The factor of the settings multiplies the law's modulus, and what core asks for counts from the law, whatever is set.
    [Fact]
    public void The_factor_of_the_settings_is_applied_and_core_asks_for_the_whole_of_it()
    {
        CoreData data = new() { Plugs = [Plug(10, 20), Plug(20, 21)] };
        var (one, two) = (Model(data), Model(data, factor: 1.5));
        Assert.Equal(one.Column(Property.YoungsStatic).Select(v => v * 1.5), two.Column(Property.YoungsStatic));
        Assert.Equal(Compare(one).Groups[0].Factor!.Value.Value, Compare(two).Groups[0].Factor!.Value.Value, 1e-12);
    }

    [Fact]
    public void A_stated_shift_moves_the_core_and_nothing_else()
    {
        var still = Compare(Model(new CoreData { Plugs = [Plug(10, 20), Plug(20, 21)] }));
        var moved = Compare(Model(new CoreData { Plugs = [Plug(10, 20), Plug(20, 21)], DepthShift = SmallWell.Chosen(1.5) }));
        Assert.Equal([10, 20], still.Rows.Select(r => r.Depth));
        Assert.Equal([11.5, 21.5], moved.Rows.Select(r => r.Depth));
    }

    [Fact]
    public void Laws_are_listed_by_how_little_they_miss()
    {
        var core = Compare(Model(new CoreData { Plugs = [Plug(10, 20), Plug(20, 21)] }));
        var laws = core.Groups[0].Laws(core.At);
        Assert.Contains(laws, l => l.Law.Id == "lacy-1997-combined");
        Assert.DoesNotContain(laws, l => l.Law.Inputs.Any(i => i.Property == Property.Porosity)); // there is none here
        foreach (var (a, b) in laws.Zip(laws.Skip(1))) Assert.True(a.Count > b.Count || a.RootMeanSquare <= b.RootMeanSquare);
        // Lacy 1997 at 35.1 GPa = 5.090825 Mpsi: 0.018 E^2 + 0.422 E (self-computed; tolerance: digits of the input).
        var lacy = laws.First(l => l.Law.Id == "lacy-1997-combined");
        Assert.Equal((((0.018 * 5.090825) + 0.422) * 5.090825 * 6.894757e9) - 20.5e9, lacy.Mean, 1e4);
    }

    // Plugs 1.3 times as stiff as the model 1.2 m below them: the shift is found to its step, whatever the factor.
    [Fact]
    public void A_shift_that_fits_is_found_and_not_applied()
    {
        static double Vp(double z) => 4000 + (400 * Math.Sin(2 * Math.PI * z / 17)) + (150 * Math.Sin(2 * Math.PI * z / 5));
        var at = new PlugDepth(Model(new CoreData(), Vp));
        CorePlug[] plugs = [.. Enumerable.Range(0, 8).Select(k => Plug(20 + (3.1 * k), 1.3e-9 * at.At(Property.YoungsStatic, 21.2 + (3.1 * k))))];
        var core = Compare(Model(new CoreData { Plugs = plugs, DepthShiftLimit = SmallWell.Chosen(3.0) }, Vp));
        Assert.Equal(1.2, core.Match!.Shift, 0.026);
        Assert.True(core.Match.Determined);
        Assert.InRange(core.Match.Gain, 0.99, 1);
        Assert.All(core.Rows, r => Assert.Equal(r.Plug.Depth, r.Depth));
    }

    [Fact]
    public void Where_the_model_does_not_vary_no_shift_is_determined()
    {
        CorePlug[] plugs = [.. Enumerable.Range(0, 6).Select(k => Plug(20 + (3 * k), 18 + (k % 3)))];
        var core = Compare(Model(new CoreData { Plugs = plugs, DepthShiftLimit = SmallWell.Chosen(3.0) }));
        Assert.False(core.Match!.Determined);
        Assert.Null(Compare(Model(new CoreData { Plugs = plugs[..3], DepthShiftLimit = SmallWell.Chosen(3.0) })).Match);
    }
}
