using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Model;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

public class SettingsRunTests
{
    private static StageSettings Poisson(double value, SettingKind kind) =>
        new() { Moduli = new ModuliSettings { StaticPoisson = Chosen(ConstantPoisson(value), 9, kind) } };

    private static readonly WellSetup Setup = SmallWell.Setup with
    {
        Zones = [new Zone("A", 100, 300, DepthKind.Measured, Poisson(0.31, SettingKind.Zone), WellFile)],
        Lithologies = [new LithologyChoice(new LithologyRule("stiff", null, null, null, [1], WellFile), Poisson(0.32, SettingKind.Lithology))],
    };

    private static SettingsRun[] Resolve(WellSetup setup, short[] zones, short[] lithologies) =>
        [.. SettingsRun.Resolve(setup, zones, lithologies)];

    private static double PoissonOf(SettingsRun run) => run.Settings.Moduli.StaticPoisson.Value.Evaluate();

    [Fact]
    public void Lithology_stands_over_zone_and_zone_over_well()
    {
        var runs = Resolve(Setup, [-1, 0, 0, -1], [-1, -1, 0, 0]);
        Assert.Equal([(0, 1), (1, 2), (2, 3), (3, 4)], runs.Select(r => (r.Start, r.End)));
        Assert.Equal("equal-to-dynamic", runs[0].Settings.Moduli.StaticPoisson.Value.Id);
        Assert.Equal([0.31, 0.32, 0.32], runs[1..].Select(PoissonOf));
        Assert.Equal(SettingKind.Lithology, runs[2].Settings.Moduli.StaticPoisson.Source.Kind);
        Assert.Equal(SmallWell.Settings.Biot, runs[2].Settings.Biot);
    }

    [Fact]
    public void Equal_neighbours_are_joined_and_settings_resolved_once()
    {
        var runs = Resolve(Setup, [0, 0, -1, 0], [-1, -1, -1, -1]);
        Assert.Equal([2, 1, 1], runs.Select(r => r.Length));
        Assert.Same(runs[0].Settings, runs[2].Settings);
    }

    [Fact]
    public void A_zone_that_decides_nothing_keeps_a_friction_the_well_decided()
    {
        var setup = Setup with
        {
            Settings = SmallWell.Settings with { HorizontalStress = new HorizontalStressSettings { FrictionCoefficient = Chosen(0.85) } },
        };
        Assert.Equal(0.85, Resolve(setup, [0], [0])[0].Settings.HorizontalStress.FrictionCoefficient.Value);
    }

    [Fact]
    public void No_samples_give_no_runs() => Assert.Empty(Resolve(Setup, [], []));
}
