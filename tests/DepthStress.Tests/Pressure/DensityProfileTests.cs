using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

public class DensityProfileTests
{
    private const double Gap = double.NaN;

    private static readonly double[] Tvd = [100, 110, 120, 130, 150, 160];

    private static readonly bool[] AllUsable = [true, true, true, true, true, true];

    private static OverburdenSettings Gaps(DensityFillKind kind, double density = Gap) =>
        new() { AboveLog = Chosen(ShallowDensity.Mean(2100.0)), Gaps = Chosen(new DensityFill(kind, density)) };

    private static OverburdenSettings Below(DensityFillKind kind, double density = Gap) =>
        new() { AboveLog = Chosen(ShallowDensity.Mean(2100.0)), BelowLog = Chosen(new DensityFill(kind, density)) };

    private static (DensityProfile? Profile, string[] Problems) Prepare(
        double[] density, OverburdenSettings settings, bool[]? usable = null, double[]? tvd = null)
    {
        var problems = new List<FormattableString>();
        var profile = DensityProfile.Prepare(Curve(Property.Density, density), tvd ?? Tvd, usable ?? AllUsable, solidTop: 0, settings, problems);
        return (profile, [.. problems.Select(p => UnitSystem.Metric.Show(p))]);
    }

    private static string Origins(DensityProfile profile)
    {
        var each = new SampleOrigin[profile.Origins.Count];
        profile.Origins.Weaken(each);
        return string.Join(' ', each.Select(o => o.Name()));
    }

    [Fact]
    public void A_gap_left_open_is_an_error_that_names_its_interval()
    {
        var (_, problems) = Prepare([2200, Gap, 2300, Gap, Gap, 2400], new OverburdenSettings());
        Assert.Equal(
            [
                "density is missing from 100.0 m to 120.0 m true vertical depth, and the overburden needs it: set [overburden] gaps = \"linear\" or a density",
                "density is missing from 120.0 m to 160.0 m true vertical depth, and the overburden needs it: set [overburden] gaps = \"linear\" or a density",
            ],
            problems);
    }

    [Fact]
    public void A_linear_fill_is_a_straight_line_over_true_vertical_depth()
    {
        var (profile, problems) = Prepare([2200, 2200, 2200, Gap, Gap, 2600], Gaps(DensityFillKind.Linear));
        Assert.Empty(problems);
        Assert.Equal([2200, 2200, 2200, 2300, 2500, 2600], profile!.Values);
        Assert.Equal("measured measured measured filled filled measured", Origins(profile));
    }

    [Fact]
    public void A_held_fill_repeats_the_last_logged_value()
    {
        var (profile, _) = Prepare([2200, 2250, Gap, Gap, 2500, 2600], Gaps(DensityFillKind.Hold));
        Assert.Equal([2200, 2250, 2250, 2250, 2500, 2600], profile!.Values);
        Assert.Equal("measured measured filled filled measured measured", Origins(profile));
    }

    [Fact]
    public void A_stated_fill_is_an_assumption()
    {
        var (profile, _) = Prepare([2200, 2250, Gap, Gap, 2500, 2600], Gaps(DensityFillKind.Stated, 2345));
        Assert.Equal([2200, 2250, 2345, 2345, 2500, 2600], profile!.Values);
        Assert.Equal("measured measured assumed assumed measured measured", Origins(profile));
    }

    [Fact]
    public void Above_the_log_the_mean_density_is_an_assumption()
    {
        var (profile, _) = Prepare([Gap, Gap, 2300, 2300, 2300, 2300], new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2100.0)) });
        Assert.Equal([2100, 2100, 2300, 2300, 2300, 2300], profile!.Values);
        Assert.Equal("assumed assumed measured measured measured measured", Origins(profile));
        Assert.Equal((0, 2, 6), (profile.First, profile.FirstLogged, profile.End));
    }

    [Fact]
    public void Without_a_mean_density_the_integral_starts_at_the_first_logged_one()
    {
        var (profile, _) = Prepare([Gap, Gap, 2300, 2300, 2300, 2300], new OverburdenSettings());
        Assert.Equal((2, 2), (profile!.First, profile.FirstLogged));
        Assert.True(double.IsNaN(profile.Values[1]));
        Assert.Equal("  measured measured measured measured", Origins(profile));
    }

    [Fact]
    public void Below_the_log_nothing_is_filled_unless_chosen()
    {
        double[] density = [2200, 2300, 2400, 2500, Gap, Gap];
        var (none, problems) = Prepare(density, Below(DensityFillKind.None));
        Assert.Empty(problems);
        Assert.Equal(4, none!.End);
        Assert.True(double.IsNaN(none.Values[4]));

        var (hold, _) = Prepare(density, Below(DensityFillKind.Hold));
        Assert.Equal([2500, 2500], hold!.Values[4..]);
        Assert.Equal("measured measured measured measured extrapolated extrapolated", Origins(hold));

        var (stated, _) = Prepare(density, Below(DensityFillKind.Stated, 2650));
        Assert.Equal([2650, 2650], stated!.Values[4..]);
        Assert.Equal("measured measured measured measured assumed assumed", Origins(stated));
        Assert.Equal(6, stated.End);
    }

    [Fact]
    public void A_sample_that_stays_out_of_the_integral_is_neither_a_gap_nor_filled()
    {
        var (profile, problems) = Prepare([2200, Gap, 2300, 2300, 2300, 2300], new OverburdenSettings(), [true, false, true, true, true, true]);
        Assert.Empty(problems);
        Assert.True(double.IsNaN(profile!.Values[1]));
    }

    [Fact]
    public void A_density_that_stays_out_of_the_integral_bridges_nothing()
    {
        var (_, problems) = Prepare([2200, Gap, 2300, Gap, 2300, 2300], new OverburdenSettings(), [true, true, false, true, true, true]);
        Assert.Equal(
            ["density is missing from 100.0 m to 150.0 m true vertical depth, and the overburden needs it: set [overburden] gaps = \"linear\" or a density"],
            problems);
    }

    [Fact]
    public void No_usable_density_gives_no_profile()
    {
        Assert.Null(Prepare([Gap, Gap, Gap, Gap, Gap, Gap], new OverburdenSettings()).Profile);
        Assert.Null(Prepare([2200, 2200, 2200, 2200, 2200, 2200], new OverburdenSettings(), new bool[6]).Profile);
    }

    // Two runs joined without the rows between them must not be bridged in silence.
    [Fact]
    public void Missing_rows_are_a_gap_too()
    {
        double[] tvd = [.. Enumerable.Range(0, 30).Select(i => i < 15 ? 100.0 + i : 600.0 + i)];
        double[] density = [.. Enumerable.Repeat(2300.0, 30)];
        var usable = Enumerable.Repeat(true, 30).ToArray();
        string[] expected =
            ["there are no samples from 114.0 m to 615.0 m true vertical depth, and the overburden needs density there: set [overburden] gaps = \"linear\" or add samples"];
        Assert.Equal(expected, Prepare(density, new OverburdenSettings(), usable, tvd).Problems);
        Assert.Equal(expected, Prepare(density, Gaps(DensityFillKind.Stated, 2400), usable, tvd).Problems);
        Assert.Empty(Prepare(density, Gaps(DensityFillKind.Linear), usable, tvd).Problems);
    }

    [Fact]
    public void The_log_itself_stays_as_it_was()
    {
        double[] density = [2200, Gap, 2300, 2300, 2300, 2300];
        Prepare(density, Gaps(DensityFillKind.Linear));
        Assert.True(double.IsNaN(density[1]));
    }

    [Fact]
    public void A_default_leaves_gaps_open_and_says_that_it_is_a_default()
    {
        var settings = new OverburdenSettings();
        Assert.Equal((DensityFillKind.None, SettingKind.Default), (settings.Gaps.Value.Kind, settings.Gaps.Source.Kind));
        Assert.Equal((DensityFillKind.None, SettingKind.Default), (settings.BelowLog.Value.Kind, settings.BelowLog.Source.Kind));
        Assert.Equal((1030.0, SettingKind.Default), (settings.WaterDensity.Value, settings.WaterDensity.Source.Kind)); // common practice
        Assert.False(settings.AboveLog.IsSet);
    }
}
