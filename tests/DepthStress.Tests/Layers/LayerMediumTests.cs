using DepthStress.Core.Depth;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Layers;

public class LayerMediumTests
{
    private static WellSetup Strained => Setup with { Settings = Settings with { HorizontalStress = Strains } };

    private static string[] Found(LayerTable table) => [.. table.Findings.Select(f => UnitSystem.Metric.Show(f.Text))];

    // E 17.55 GPa, nu 0.21875, a 0.8 everywhere. Tolerance: rounding.
    [Fact]
    public void Rock_of_one_kind_is_upscaled_to_itself()
    {
        var medium = Assert.Single(Layered(Run(Strained, LogsWith()), new LayerSettings()).Layers).Medium!;
        Assert.Equal(17.55, medium.Pair.Youngs / 1e9, 1e-12);
        Assert.Equal(0.21875, medium.Pair.Poisson, 1e-14);
        Assert.Equal(0.8, medium.Pair.Biot, 1e-14);
        Assert.Equal(0.8, medium.Rock.BiotVertical, 1e-14);
        Assert.Equal(2500, medium.Density, 1e-9);
        Assert.Equal((0, 0), (medium.ClosingShmin, medium.ClosingShmax));
        Assert.Equal(2500 * 9.80665, medium.Vertical.Slope, 1e-6);
        Assert.Equal(1000 * 9.80665 * 400, medium.Pore.At(400), 1e-3);
    }

    // The zone's own strain along Shmin is 1e-4 more: E/(1 - nu^2) 1e-4 of Shmin. Tolerance: half a unit of the last digit of 18.4320.
    [Fact]
    public void Strains_of_a_zones_own_are_closed_and_said()
    {
        var own = new StageSettings { HorizontalStress = new HorizontalStressSettings { StrainAlongShmin = Chosen(5e-4) } };
        var setup = Strained with { Zones = [new("A", 0, null, DepthKind.Measured, new StageSettings(), WellFile), new("B", 300, null, DepthKind.Measured, own, WellFile)] };
        var table = Layered(Run(setup, LogsWith()), new LayerSettings());
        Assert.Equal(new FarField(2e-4, 6e-4, true), table.Strains);
        Assert.Equal(0, table.Layers[0].Medium!.ClosingShmin);
        Assert.Equal(18.4320e9 * 3e-4, table.Layers[1].Medium!.ClosingShmin, 20.0);
        Assert.Equal(18.4320e9 * 3e-4 * 0.21875, table.Layers[1].Medium!.ClosingShmax, 20.0);
        Assert.Contains(Found(table), t => t.StartsWith("one pair of lateral strains does not explain the horizontal stresses of some layers (layer 2)", StringComparison.Ordinal));
    }

    [Fact]
    public void A_layer_without_values_has_no_medium_and_is_named()
    {
        var setup = Strained with { Zones = [new("A", 0, null, DepthKind.Measured, new StageSettings(), WellFile), new("B", 300, null, DepthKind.Measured, new StageSettings(), WellFile)] };
        var table = Layered(Run(setup, LogsWith(Curve(Property.Vs, 2400, 2400, 2400, double.NaN, double.NaN))), new LayerSettings());
        Assert.NotNull(table.Layers[0].Medium);
        Assert.Null(table.Layers[1].Medium);
        Assert.Contains(Found(table), t => t.Contains("the solver's column leaves them out (layer 2)", StringComparison.Ordinal));
    }

    [Fact]
    public void Poissons_ratio_at_the_edge_of_stability_is_said()
    {
        var stiff = Settings with { Moduli = Settings.Moduli with { StaticPoisson = Chosen(ConstantPoisson(0.495)) } };
        var table = Layered(Run(Setup with { Settings = stiff }, LogsWith()), new LayerSettings());
        Assert.Contains(Found(table), t => t.StartsWith("Poisson's ratio of some upscaled layers is 0.49 or more (layer 1)", StringComparison.Ordinal));
    }

    [Fact]
    public void Without_strains_the_column_has_none_and_shmax_stays_unknown()
    {
        var table = Layered(Run(), new LayerSettings());
        Assert.Equal(default, table.Strains);
        Assert.True(double.IsNaN(Assert.Single(table.Layers).Medium!.ClosingShmax));
    }

    [Fact]
    public void The_least_strength_of_a_layer_is_that_of_a_sample()
    {
        var setup = Setup with { Settings = Settings with { Strength = Settings.Strength with { Ucs = Chosen(Method("horsrud-2001-shale")) } } };
        var model = Run(setup, LogsWith(Curve(Property.Vp, 4000, 3600, 3900, 3700, 4000)));
        Assert.Equal(model.Column(Property.Ucs).Min(), Assert.Single(Layered(model, new LayerSettings()).Layers).LeastUcs);
    }
}
