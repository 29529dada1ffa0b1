using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

public class ChainErrorTests
{
    private const double Gap = double.NaN;

    [Fact]
    public void Without_density_there_is_no_model()
    {
        const string Expected = "well.toml(1,1): error: no bulk density at any depth, expected a density curve: the overburden needs it";
        Assert.Equal([Expected], Errors(Setup, Table(Depths, Curve(Property.Vp, Same(4000)))));
        Assert.Equal([Expected], Errors(Setup, LogsWith(Curve(Property.Density, Same(Gap)))));
        Assert.Equal([Expected], Errors(Setup, LogsWith(Curve(Property.Density, Same(9000)))));
        Assert.Equal([Expected], Errors(Setup, Table([])));
    }

    [Fact]
    public void Every_open_interval_of_density_is_named_in_one_run() => Assert.Equal(
        [
            "well.toml(1,1): error: density is missing from 100.0 m to 300.0 m true vertical depth, and the overburden needs it: set [overburden] gaps = \"linear\" or a density",
            "well.toml(1,1): error: density is not logged from 0.0 m (ground or mudline) to 100.0 m true vertical depth, and the overburden needs it: set [overburden] above_log",
        ],
        Errors(Setup, LogsWith(Curve(Property.Density, Gap, 2500, Gap, 2500, 2500))));

    [Fact]
    public void Offshore_the_open_interval_starts_at_the_mudline() => Assert.Equal(
        ["well.toml(1,1): error: density is not logged from 125.0 m (ground or mudline) to 200.0 m true vertical depth, and the overburden needs it: set [overburden] above_log"],
        Errors(Setup with { Frame = Sea }, LogsWith()));

    // A frame without its ground is refused before the chain; should one come through, Sv must not start at the first sample.
    [Fact]
    public void An_unknown_ground_never_passes_for_one_at_the_first_sample()
    {
        var frame = new DepthFrame(DatumKind.RotaryTable, 1000, null, null, null);
        Assert.Contains("density is not logged from", Assert.Single(Errors(Setup with { Frame = frame }, LogsWith())), StringComparison.Ordinal);
        Assert.True(double.IsNaN(Core.Pressure.Overburden.Start(0, 1030, double.NaN, 100, 2000).Stress));
    }

    [Fact]
    public void A_well_whose_samples_are_all_above_the_ground_has_no_density() =>
        Assert.Single(Errors(Setup with { Frame = new DepthFrame(DatumKind.RotaryTable, 1000, 0, null, null) }, LogsWith()));
}
