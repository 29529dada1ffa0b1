using DepthStress.Core.Conditioning;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Conditioning;

/// <summary>Conditioning inside the chain: origins, order, zones, what is said.</summary>
public class ConditioningChainTests
{
    private static readonly SpikeSettings Spikes = new()
    {
        Window = Chosen(3.0),
        Threshold = Chosen(5.0),
        Curves = Chosen<IReadOnlyList<string>>(["shear", "density"]),
    };

    [Fact]
    public void Without_a_choice_nothing_changes()
    {
        var logs = Spiky();
        Assert.Equal(logs[Property.Vs]!.Values, Run(Setup, logs).Logs[Property.Vs]!.Values);
    }

    [Fact]
    public void A_spike_is_taken_out_marked_and_reported()
    {
        var model = Run(With(new ConditioningSettings { Spikes = Spikes }), Spiky());
        var vs = model.Logs[Property.Vs]!;
        Assert.Equal([30, 70], Enumerable.Range(0, vs.Values.Length).Where(i => double.IsNaN(vs.Values[i])));
        Assert.Contains(new OriginRun(30, 31, SampleOrigin.Edited, "taken out: spike"), vs.Origins.Runs);
        Assert.Contains("conditioning, spike: shear 2", model.Texts());
        Assert.Equal(Severity.Note, model.Findings.First(f => f.Text.Format.StartsWith("conditioning", StringComparison.Ordinal)).Severity);
    }

    [Fact]
    public void Samples_that_pass_keep_their_value_and_origin()
    {
        var logs = Spiky();
        var after = Run(With(new ConditioningSettings { Spikes = Spikes, FillGaps = Chosen(1.0) }), logs).Logs[Property.Vs]!;
        for (var i = 0; i < logs.Count; i++)
        {
            if (i is not (30 or 70)) Assert.Equal(logs[Property.Vs]!.Values[i], after.Values[i]);
        }

        Assert.Equal(2, after.Origins.CountOf(SampleOrigin.Filled));
        Assert.Equal(0, after.Origins.CountOf(SampleOrigin.Edited));
    }

    [Fact]
    public void Velocity_is_bridged_by_a_straight_line_in_slowness()
    {
        var model = Run(With(new ConditioningSettings { FillGaps = Chosen(0.3) }), Logs(Curve(Property.Vp, Same(4000, 100)), Curve(Property.Vs, [.. Same(2000, 50), double.NaN, .. Same(1000, 49)])));
        Assert.Equal(1 / (0.5 * ((1 / 2000.0) + (1 / 1000.0))), model.Logs[Property.Vs]!.Values[50], 1e-9); // rounding alone
        Assert.Equal(SampleOrigin.Filled, model.StressBasis[50]);
    }

    [Fact]
    public void A_zone_can_switch_a_step_off()
    {
        var off = new StageSettings { Conditioning = new ConditioningSettings { Spikes = new SpikeSettings { Curves = Chosen<IReadOnlyList<string>>([], kind: SettingKind.Zone) } } };
        var setup = With(new ConditioningSettings { Spikes = Spikes }) with
        {
            Zones = [new Zone("upper", 0, null, DepthKind.Measured, new StageSettings(), WellFile), new Zone("coal", 7.5, null, DepthKind.Measured, off, WellFile)],
        };
        var vs = Run(setup, Spiky()).Logs[Property.Vs]!.Values;
        Assert.True(double.IsNaN(vs[30]));
        Assert.False(double.IsNaN(vs[70]));
    }

    [Fact]
    public void Curves_are_moved_before_anything_is_looked_for()
    {
        var shift = Chosen<IReadOnlyList<CurveShift>>([new CurveShift("shear", 1.5)]);
        var model = Run(With(new ConditioningSettings { Shifts = shift, Spikes = Spikes }), Spiky());
        var vs = model.Logs[Property.Vs]!;
        Assert.Equal([.. Enumerable.Range(0, 10), 40, 80], Enumerable.Range(0, 100).Where(i => double.IsNaN(vs.Values[i])));
        Assert.Equal(new OriginRun(10, 40, SampleOrigin.Edited, "depth shift"), vs.Origins.Runs[1]);
    }

    [Fact]
    public void A_parked_end_is_found_on_a_moved_curve_too()
    {
        var logs = Logs();
        Array.Fill(logs[Property.Vs]!.Values, 1500, 90, 10);
        var shift = Chosen<IReadOnlyList<CurveShift>>([new CurveShift("shear", -0.15)]);
        var vs = Run(With(new ConditioningSettings { Shifts = shift, Parked = Chosen(true) }), logs).Logs[Property.Vs]!;
        Assert.Contains(new OriginRun(89, 99, SampleOrigin.Edited, "taken out: parked tool"), vs.Origins.Runs);
    }

    [Fact]
    public void A_washout_without_the_curves_it_needs_is_said_to_have_no_effect()
    {
        var washout = new WashoutSettings { CaliperExcess = Chosen(0.025), DensityCorrection = Chosen(50.0), Rule = Chosen(WashoutRule.Either) };
        var texts = Run(With(new ConditioningSettings { Washout = washout }), Spiky()).Texts();
        Assert.Contains("[conditioning] washout caliper_excess has no effect: no caliper or no bit size", texts);
        Assert.Contains("[conditioning] washout density_correction has no effect: no density correction", texts);
    }

    private static WellSetup With(ConditioningSettings settings) => Setup with { Settings = Settings with { Conditioning = settings } };

    private static LogTable Logs(params Curve[] replaced) => Table(
        [.. Waves.Depths(100).Select(d => d - 1000)],
        Curve(Property.Vp, Same(4000, 100)),
        Curve(Property.Vs, [.. Waves.Curve(100).Select(v => 1000 * v)]),
        Curve(Property.Density, Same(2500, 100))).With(replaced);

    private static LogTable Spiky()
    {
        var logs = Logs();
        logs[Property.Vs]!.Values[30] = 1200;
        logs[Property.Vs]!.Values[70] = 1200;
        return logs;
    }
}
