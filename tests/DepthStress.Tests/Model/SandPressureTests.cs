using DepthStress.Core.Depth;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using static DepthStress.Tests.Model.PressureWell;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>What rock that is not shale takes where the method tells the pressure of shale.</summary>
public class SandPressureTests
{
    [Fact]
    public void Between_shales_a_sand_lies_on_a_straight_line()
    {
        var pp = Computed(Eaton).Column(Property.PorePressure);
        var (above, below) = (At(2798), At(2830)); // the sand runs from 2800 to 2828 m
        Assert.True(IsSand(2800) && IsSand(2828) && !IsSand(2798) && !IsSand(2830));
        for (var i = above; i <= below; i++)
            Assert.Equal(pp[above] + ((pp[below] - pp[above]) * (i - above) / (below - above)), pp[i], 1e-3); // rounding
    }

    [Fact]
    public void Nothing_is_chosen_for_sands_silently() => Assert.Equal(
        ["well.toml(21,1): error: eaton-1975-sonic tells the pressure of shale, and the rock at 550.0 m measured depth is not shale: expected [pore_pressure] sands = \"shale\" (from the shale above and below), \"table\" or \"fluid line\""],
        Problems(Eaton with { Sands = default }));

    [Fact]
    public void A_known_shale_volume_asks_for_its_cut_off() => Assert.Equal(
        ["well.toml(21,1): error: eaton-1975-sonic tells the pressure of shale, and shale volume is known: expected [pore_pressure] shale_cutoff, such as 0.5, or shale_lithologies"],
        Problems(Eaton with { ShaleCutoff = default }));

    [Fact]
    public void Where_nothing_tells_sand_from_shale_that_is_said()
    {
        var logs = Table(Md, [.. LogsOf().Curves.Where(c => c.Role.Property != Property.ShaleVolume)]);
        Assert.Contains(
            "every sample was taken as shale by eaton-1975-sonic: nothing tells sand from shale; set [shale] volume and [pore_pressure] shale_cutoff, or shale_lithologies",
            Run(With(Eaton with { ShaleCutoff = default, Sands = default }), logs).Texts());
        Assert.Equal(["well.toml(5,1): error: [pore_pressure] shale_cutoff needs a shale volume, expected [shale] volume or a curve of it"], Errors(With(Eaton), logs)[..1]);
    }

    [Fact]
    public void Sands_may_take_a_table_or_a_fluid_column()
    {
        var table = Eaton with
        {
            Sands = Chosen(SandPressure.Table),
            DepthKind = Chosen(DepthKind.TrueVertical),
            Points = Chosen<IReadOnlyList<PressurePoint>>([new(0, 0), new(3000, 33e6)]),
        };
        Assert.Equal(11e3 * 2810, Computed(table).Column(Property.PorePressure)[At(2810)], 1e-3);
        var fluids = new FluidSettings { WaterDensity = Chosen(1100.0), Anchor = Chosen(FluidAnchor.Point), AnchorDepth = Chosen(2810.0), AnchorPressure = Chosen(40e6), DepthKind = Chosen(DepthKind.TrueVertical) };
        var pp = Computed(Eaton with { Sands = Chosen(SandPressure.FluidLine) }, fluids).Column(Property.PorePressure);
        Assert.Equal(40e6 + (1100 * G * 10), pp[At(2820)], 1e-3);
        Assert.Equal(Hydrostatic(1050), pp[At(1050)], 1e3); // shale keeps its method; the fitted trend is met to six digits
    }

    [Fact]
    public void Below_the_last_shale_its_excess_stays_and_above_the_first_it_fades()
    {
        bool Sand(double z) => z is < 700 or > 2900;
        var logs = LogsOf(z => Normal(z) * 1.05, z => Sand(z) ? 0 : 1);
        var given = new NormalTrendSettings { SurfaceSlowness = Chosen(190 * Unit), MatrixSlowness = Chosen(65 * Unit), ScaleLength = Chosen(1700.0) };
        var model = Run(With(Eaton with { NormalTrend = given }), logs);
        var pp = model.Column(Property.PorePressure);
        Assert.Equal(pp[At(2900)] - Hydrostatic(2900), pp[At(3000)] - Hydrostatic(3000), 1e-3); // rounding
        Assert.Equal((pp[At(700)] - Hydrostatic(700)) * 500 / 700, pp[At(500)] - Hydrostatic(500), 1e-3);
        Assert.Contains("no shale on one side: the pressure of these sands is the normal one with the excess of the nearest shale", model.Texts());
    }

    [Fact]
    public void A_lithology_may_tell_shale()
    {
        var shale = new LithologyChoice(new LithologyRule("mud", new(0.5, 1), null, null, [], WellFile), new());
        var pore = Eaton with { ShaleCutoff = default, ShaleLithologies = Chosen<IReadOnlyList<string>>(["mud"]) };
        var pp = Run(With(pore) with { Lithologies = [shale] }, LogsOf()).Column(Property.PorePressure);
        Assert.Equal(Computed(Eaton).Column(Property.PorePressure), pp);
    }

    [Fact]
    public void A_window_averages_the_shale_that_sands_hang_on()
    {
        // Noise of one sample in shale: the line between means moves less than that between single samples.
        var logs = LogsOf(z => Slowness(z) * (IsSand(z) ? 1 : 1 + (0.05 * (z % 4 == 0 ? 1 : -1))));
        var given = new NormalTrendSettings { SurfaceSlowness = Chosen(190 * Unit), MatrixSlowness = Chosen(65 * Unit), ScaleLength = Chosen(1700.0) };
        double Miss(PorePressureSettings pore) => Math.Abs(Run(With(pore with { NormalTrend = given }), logs).Column(Property.PorePressure)[At(1010)] - Hydrostatic(1010));
        Assert.True(Miss(Eaton with { SandWindow = Chosen(40.0) }) < 0.3 * Miss(Eaton));
    }

    [Fact]
    public void Shale_takes_the_normal_pressure_only_where_that_is_asked_for()
    {
        var logs = LogsOf(z => Normal(z) * (z > 2000 ? 0.9 : 1));
        var low = Run(With(Eaton), logs);
        Assert.Contains("pore pressure is more than 2 % below the weight of water", low.Texts());
        var held = Run(With(Eaton with { AtLeastNormal = Chosen(true) }), logs);
        Assert.Equal(Hydrostatic(2700), held.Column(Property.PorePressure)[At(2700)], 1e-3);
        Assert.DoesNotContain("pore pressure is more than 2 % below the weight of water", held.Texts());
        var finding = Assert.Single(held.Findings, f => f.Text.Format.StartsWith("shale took the normal pressure", StringComparison.Ordinal));
        Assert.True(finding.Samples > 300);
    }
}
