using DepthStress.Core.Borehole;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Tests.Model;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Observations;

/// <summary>Observations against the path, the mud and the casing.</summary>
public sealed class ObservedIntervalTests
{
    private static readonly SourcePosition Row = new("tests.csv", 2);

    private static Observation Test(double top, double bottom, ObservationKind kind = ObservationKind.Closure, DepthKind depth = DepthKind.Measured) =>
        new() { Position = Row, Top = top, Base = bottom, DepthKind = depth, Kind = kind, Value = 10e6, Sigma = 1e6 };

    private static MudSettings Mud(params MudInterval[] muds) => new()
    {
        Density = SmallWell.Chosen<IReadOnlyList<MudInterval>>(muds),
        DepthKind = SmallWell.Chosen(DepthKind.Measured),
    };

    [Fact]
    public void A_surface_pressure_gets_the_column_down_to_the_middle()
    {
        // Printed on drilling-reference pages: 1740 kPa, 1300 m, 1100 kg/m3 is an equivalent density of 1236 kg/m3.
        var test = Test(1300, 1300) with { Value = 1740e3, AtSurface = true, FluidDensity = 1100 };
        var interval = ObservedInterval.Of(SmallWell.Setup, test);
        Assert.Equal(1236, interval.Value / (9.81 * 1300), 1.0); // printed without decimals
    }

    [Fact]
    public void An_equivalent_density_becomes_the_pressure_of_its_column()
    {
        var interval = ObservedInterval.Of(SmallWell.Setup, Test(1000, 1000) with { Value = 1500, Sigma = 20, AsDensity = true });
        Assert.Equal(1500 * 9.80665 * 1000, interval.Value, 1e-3); // a product of exact numbers
        Assert.Equal(20 * 9.80665 * 1000, interval.Sigma, 1e-3);
    }

    [Fact]
    public void Depths_of_any_kind_lie_on_the_path()
    {
        // Vertical to 1000 m, then at once 60 deg: below, each metre along the hole is half a metre down.
        var setup = SmallWell.Setup with { Trajectory = SmallWell.Bent(new(1000, 0, 0), new(1000.001, Math.PI / 3, Math.PI / 2), new(2000, Math.PI / 3, Math.PI / 2)) };
        var interval = ObservedInterval.Of(setup, Test(1100, 1200, depth: DepthKind.TrueVertical));
        Assert.Equal(1200, interval.Top, 0.01); // the bend is 1 mm long
        Assert.Equal(1400, interval.Base, 0.01);
        Assert.Equal(1150, interval.MiddleTvd, 0.01);
        Assert.Equal(Math.PI / 3, interval.Inclination, 1e-9); // straight below the bend
        Assert.Equal(Math.PI / 2, interval.Azimuth, 1e-9);
    }

    [Theory]
    [InlineData(100, 300, 1, 3)]
    [InlineData(120, 130, 1, 1)]
    [InlineData(160, 180, 2, 1)]
    [InlineData(200, 200, 2, 1)]
    [InlineData(-50, -10, 0, 0)]
    [InlineData(401, 420, 0, 0)]
    [InlineData(-50, 10, 0, 1)]
    public void It_covers_the_samples_inside_or_the_nearest(double top, double bottom, int first, int count) =>
        Assert.Equal((first, count), ObservedInterval.Of(SmallWell.Setup, Test(top, bottom)).Samples(SmallWell.Depths));

    [Fact]
    public void A_leak_off_or_integrity_test_presses_on_the_hole_from_the_shoe_down()
    {
        var setup = SmallWell.Setup with
        {
            Casing = new CasingSettings { Shoes = SmallWell.Chosen<IReadOnlyList<double>>([100, 350]), DepthKind = SmallWell.Chosen(DepthKind.Measured) },
        };
        var test = Test(200, 300, ObservationKind.Integrity) with { FluidDensity = 1000 };
        var interval = ObservedInterval.Of(setup, test);
        Assert.Equal(100, interval.OpenTop);
        Assert.Equal((1, 3), interval.OpenSamples(SmallWell.Depths));
        Assert.Equal(10e6 - (1000 * 9.80665 * 150), interval.PressureAt(100), 1e-3); // 150 m of water above the middle
        Assert.Equal(200, ObservedInterval.Of(setup, Test(200, 300)).OpenTop);
    }

    [Fact]
    public void The_mud_supports_a_breakout_that_states_no_density()
    {
        var setup = SmallWell.Setup with { Mud = Mud(new(0, 1100), new(200, 1300)) };
        var interval = ObservedInterval.Of(setup, Test(250, 250, ObservationKind.BreakoutWidth) with { Value = 1 });
        Assert.Equal(1300 * 9.80665 * 250, interval.MudPressure, 1e-3); // a product of exact numbers
        Assert.Equal(1100, HoleIndex.MudDensity(setup, 199.9));
        Assert.Null(HoleIndex.MudDensity(setup, -1));
    }

    [Fact]
    public void Observations_outside_the_logs_are_named()
    {
        var setup = SmallWell.Setup with { Observations = [Test(-20, -10), Test(100, 110), Test(500, 510)] };
        var texts = SmallWell.Run(setup, SmallWell.LogsWith()).Texts();
        Assert.Contains("tests.csv(2): closure at -20.0 m to -10.0 m measured depth lies above the first sample at 0.0 m: it has no logs to compare with", texts);
        Assert.Contains("tests.csv(2): closure at 500.0 m to 510.0 m measured depth lies below the last sample at 400.0 m: it has no logs to compare with", texts);
        Assert.Equal(2, texts.Count(t => t.Contains("no logs to compare", StringComparison.Ordinal)));
    }

    [Fact]
    public void Pore_pressure_above_the_mud_is_noted_where_it_is()
    {
        // Water in the pores (1000 kg/m3); the mud is lighter from 150 m to 250 m.
        var setup = SmallWell.Setup with { Mud = Mud(new(0, 1100), new(150, 900), new(250, 1100)) };
        var finding = Assert.Single(SmallWell.Run(setup, SmallWell.LogsWith()).Findings, f => UnitSystem.Metric.Show(f.Text).StartsWith("pore pressure is above the pressure of the mud", StringComparison.Ordinal));
        Assert.Equal((1, 200.0), (finding.Samples, finding.Where[0].Top));
    }

    private const string Table = "top_m,base_m,depth_kind,kind,value,pressure_at,sigma\n";

    [Theory]
    [InlineData("[mud]\ndensity = [{ top = \"0 m\", density = \"1.1 sg\" }]\n", "well.toml(28,11): error: [mud] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"")]
    [InlineData("[mud]\ndepth_kind = \"md\"\ndensity = [{ top = \"0 m\" }]\n", "well.toml(29,11): error: [mud] density: expected each mud with top and density")]
    [InlineData("[mud]\ndepth_kind = \"md\"\ndensity = [{ top = \"9 m\", density = \"1.1 sg\" }, { top = \"5 m\", density = \"0.5 psi/ft\" }]\n", "well.toml(29,11): error: [mud] density: found a top at 5.0 m measured depth below one at 9.0 m, expected them from top to bottom")]
    [InlineData("[casing]\nshoes = [{ depth = \"900 m\" }]\n", "well.toml(28,9): error: [casing] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"")]
    [InlineData("[casing]\ndepth_kind = \"md\"\nshoes = [{}]\n", "well.toml(29,9): error: [casing] shoes: expected each shoe with depth")]
    public void Mud_and_casing_say_what_they_lack(string section, string expected) => Assert.Equal([expected], WellText.Messages(WellText.Sound + section));

    [Fact]
    public void A_shoe_inside_the_interval_of_a_leak_off_is_a_warning() => Assert.Equal(
        ["tests.csv(2): warning: leak-off: found the casing shoe at 902.0 m measured depth inside its interval, expected the interval to begin at or below the shoe"],
        WellText.Messages(
            WellText.Sound + "[observations]\nfiles = \"tests.csv\"\n[casing]\ndepth_kind = \"md\"\nshoes = [{ depth = \"902 m\" }]\n",
            ("tests.csv", Table + "900,910,md,leak-off,15 MPa,downhole,0.4 MPa\n")));

    [Fact]
    public void Depths_that_the_hole_never_reaches_are_an_error() => Assert.Equal(
        ["tests.csv(2): error: closure: the hole never reaches its depths"],
        WellText.Messages(
            WellText.With("vertical = true", "file = \"survey.csv\"\nnorth = \"grid\"") + "[observations]\nfiles = \"tests.csv\"\n",
            ("survey.csv", "md_m,inclination_deg,azimuth_deg\n0,0,0\n200,0,0\n400,90,0\n3000,90,0\n"),
            ("tests.csv", Table + "900,910,tvd,closure,15 MPa,downhole,0.4 MPa\n")));
}
