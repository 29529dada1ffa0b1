using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>The whole chain on an invented well of round numbers; expected values self-computed, tolerance one pascal.</summary>
public class ChainTests
{
    private const double G = 9.80665; // standard gravity, exact
    private const double Gap = double.NaN;
    private const double Pascal = 1;

    private static bool[] Missing(EarthModel model, Property property) => Array.ConvertAll(model.Column(property), double.IsNaN);

    [Fact]
    public void Stresses_come_out_as_by_hand()
    {
        var model = Run(Setup with { Settings = SmallWell.Settings with { HorizontalStress = Strains } }, LogsWith());
        double sv = 2500 * G * 400, pp = 1000 * G * 400, k = 0.21875 / 0.78125, plane = 17.55e9 / (1 - (0.21875 * 0.21875));
        Assert.Equal(sv, model.Column(Property.VerticalStress)[4], Pascal);
        Assert.Equal(pp, model.Column(Property.PorePressure)[4], Pascal);
        Assert.Equal(35.1e9, model.Column(Property.YoungsDynamic)[4], Pascal);
        Assert.Equal(17.55e9, model.Column(Property.YoungsStatic)[4], Pascal);
        var uniaxial = (k * (sv - (0.8 * pp))) + (0.8 * pp);
        Assert.Equal(uniaxial + (plane * (2e-4 + (0.21875 * 6e-4))), model.Column(Property.MinHorizontalStress)[4], Pascal);
        Assert.Equal(uniaxial + (plane * (6e-4 + (0.21875 * 2e-4))), model.Column(Property.MaxHorizontalStress)[4], Pascal);
    }

    [Fact]
    public void Without_strains_Shmin_is_uniaxial_and_SHmax_is_empty_not_a_copy()
    {
        var model = Run();
        double sv = 2500 * G * 300, pp = 1000 * G * 300;
        Assert.Equal((0.28 * (sv - (0.8 * pp))) + (0.8 * pp), model.Column(Property.MinHorizontalStress)[3], Pascal);
        Assert.All(Missing(model, Property.MaxHorizontalStress), Assert.True);
    }

    [Fact]
    public void A_missing_shear_velocity_empties_the_horizontal_stress_and_leaves_Sv()
    {
        var model = Run(Curve(Property.Vs, 2400, 2400, Gap, Gap, 2400));
        Assert.Equal([false, false, true, true, false], Missing(model, Property.MinHorizontalStress));
        Assert.Equal([false, false, false, false, false], Missing(model, Property.VerticalStress));
        Assert.Contains(model.Findings, f => f.Samples == 2 && f.Text.Format == "shear log missing: no moduli, no horizontal stress");
    }

    [Fact]
    public void Without_a_shear_log_the_chain_still_gives_Sv_and_pore_pressure()
    {
        var model = Run(Setup, Table(Depths, Curve(Property.Vp, Same(4000)), Curve(Property.Density, Same(2500))));
        Assert.All(Missing(model, Property.MinHorizontalStress), Assert.True);
        Assert.DoesNotContain(true, Missing(model, Property.VerticalStress));
        Assert.DoesNotContain(true, Missing(model, Property.PorePressure));
    }

    [Fact]
    public void A_lithology_rule_decides_inside_a_zone_and_the_zone_over_the_well()
    {
        var zone = new Zone("A", 100, 400, DepthKind.Measured, Poisson(0.31), WellFile);
        var rule = new LithologyRule("shaly", new Interval(0.5, 1), null, null, [], WellFile);
        var setup = Setup with { Zones = [zone], Lithologies = [new LithologyChoice(rule, Poisson(0.35))] };
        var model = Run(setup, LogsWith(Curve(Property.ShaleVolume, 0.9, 0.1, 0.9, 0.1, 0.1)));
        Assert.Equal([0.35, 0.31, 0.35, 0.31, 0.21875], model.Column(Property.PoissonStatic), (a, b) => Math.Abs(a - b) < 1e-12);
        Assert.Equal(["", "A", "A", "A", ""], model.Zones.Select(z => model.ZoneName(z)));
        Assert.Equal(["shaly", "", "shaly", "", ""], model.Lithologies.Select(l => model.LithologyName(l)));

        static StageSettings Poisson(double value) =>
            new() { Moduli = new ModuliSettings { StaticPoisson = Chosen(ConstantPoisson(value)) } };
    }

    [Fact]
    public void Shale_volume_follows_from_gamma_ray_zone_by_zone_and_feeds_the_lithology_rules()
    {
        var shale = new ShaleSettings { Volume = Chosen(Method("linear-gamma-ray")), Clean = Chosen(20.0), Shale = Chosen(120.0) };
        var zone = new Zone("A", 300, null, DepthKind.Measured, new StageSettings { Shale = new ShaleSettings { Shale = Chosen(220.0) } }, WellFile);
        var rule = new LithologyRule("shaly", new Interval(0.5, 1), null, null, [], WellFile);
        var setup = Setup with
        {
            Settings = SmallWell.Settings with { Shale = shale },
            Zones = [zone],
            Lithologies = [new LithologyChoice(rule, new StageSettings())],
        };
        var model = Run(setup, LogsWith(Curve(Property.GammaRay, 20, 70, 130, 70, 120)));
        Assert.Equal([0, 0.5, 1, 0.25, 0.5], model.Column(Property.ShaleVolume), (a, b) => Math.Abs(a - b) < 1e-12);
        Assert.Equal(["", "shaly", "shaly", "", "shaly"], model.Lithologies.Select(l => model.LithologyName(l)));
        Assert.Contains(model.Findings, f => f.Samples == 1 && f.Text.Format.StartsWith("gamma ray beyond", StringComparison.Ordinal));
    }

    [Fact]
    public void Porosity_takes_its_parameters_from_the_settings()
    {
        var porosity = new PorositySettings { Porosity = Chosen(Method("density-porosity")), MatrixDensity = Chosen(2650.0), FluidDensity = Chosen(1000.0) };
        var model = Run(Setup with { Settings = SmallWell.Settings with { Porosity = porosity } }, LogsWith());
        Assert.All(model.Column(Property.Porosity), phi => Assert.Equal(150.0 / 1650, phi, 1e-12));
    }

    [Fact]
    public void A_law_in_slowness_gets_it_from_velocity()
    {
        var strength = new StrengthSettings { Ucs = Chosen(Method("mcnally-1987-sandstone")) };
        var model = Run(Setup with { Settings = SmallWell.Settings with { Strength = strength } }, LogsWith());
        Assert.All(model.Column(Property.Ucs), ucs => Assert.Equal(1200e6 * Math.Exp(-0.036 * 76.2), ucs, Pascal)); // 4000 m/s = 76.2 us/ft
    }

    // 63.66 m = 100 m x 2 / pi is the depth of a quarter circle of 100 m: down, level, and down again.
    [Fact]
    public void Steep_samples_have_no_Sv_and_the_integral_goes_on()
    {
        var setup = Setup with { Trajectory = Bent(new(0, 0, 0), new(100, 0, 0), new(200, Math.PI / 2, 0), new(300, 0, 0), new(400, 0, 0)) };
        var model = Run(setup, LogsWith(Curve(Property.Density, 2500, 2500, 3900, 2500, 2500)));
        Assert.Equal([true, true, false, true, true], model.Usable);
        Assert.Equal([false, false, true, false, false], Missing(model, Property.VerticalStress));
        Assert.Equal(2500 * G * (100 + (400 / Math.PI)), model.Column(Property.VerticalStress)[3], Pascal);
        Assert.Contains(model.Findings, f => f.Samples == 1 && f.Text.Format.StartsWith("hole steeper than 80 deg", StringComparison.Ordinal));
    }

    [Fact]
    public void Impossible_samples_go_out_and_are_counted()
    {
        var model = Run(Curve(Property.Vs, 2400, 3900, 2400, 2400, 2400));
        Assert.Equal([false, true, false, false, false], Missing(model, Property.MinHorizontalStress));
        var finding = Assert.Single(model.Findings, f => UnitSystem.Metric.Show(f.Text) == "Vp/Vs not above sqrt(4/3): taken out");
        Assert.Equal(1, finding.Samples);
        Assert.Equal([new DepthRange(100, 100)], finding.Where);
    }

    [Fact]
    public void The_stress_basis_is_the_weakest_origin()
    {
        var spliced = Curve(Property.Vp, Same(4000));
        spliced = spliced with { Origins = spliced.Origins.Mark([false, true, true, false, false], SampleOrigin.Spliced, "run 2") };
        var setup = Setup with { Overburden = new OverburdenSettings { Gaps = Chosen(new DensityFill(DensityFillKind.Linear)) } };
        var model = Run(setup, LogsWith(spliced, Curve(Property.Density, 2500, 2500, Gap, Gap, 2500), Curve(Property.Vs, 2400, 2400, 2400, Gap, 2400)));
        Assert.Equal(
            [SampleOrigin.Measured, SampleOrigin.Spliced, SampleOrigin.Filled, SampleOrigin.Filled, SampleOrigin.Measured], model.StressBasis);
    }

    [Fact]
    public void Where_there_is_no_stress_there_is_no_basis()
    {
        var model = Run(Curve(Property.Density, 2500, 2500, 2500, 2500, Gap));
        Assert.Equal(SampleOrigin.None, model.StressBasis[4]);
        Assert.Equal(SampleOrigin.Measured, model.StressBasis[3]);
    }

    [Fact]
    public void The_logs_that_came_in_stay_as_they_were()
    {
        var logs = LogsWith(Curve(Property.ShaleVolume, Same(0.3)), Curve(Property.GammaRay, Same(50)), Curve(Property.Vs, 2400, 3900, 2400, 2400, 2400));
        var before = logs.Curves.Select(c => c.Values.ToArray()).ToArray();
        var shale = new ShaleSettings { Volume = Chosen(Method("linear-gamma-ray")), Clean = Chosen(20.0), Shale = Chosen(120.0) };
        var model = Run(Setup with { Settings = SmallWell.Settings with { Shale = shale } }, logs);
        Assert.Equal(0.3, model.Column(Property.ShaleVolume)[0], 1e-12); // (50 - 20) / 100
        Assert.Equal(before, logs.Curves.Select(c => c.Values));
    }

    [Fact]
    public void Offshore_the_water_weighs_and_the_air_does_not()
    {
        var model = Run(
            Setup with { Frame = Sea, Overburden = new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2000.0)) } },
            Table([125, 225, 325], Curve(Property.Density, Gap, 2400, 2400), Curve(Property.Vp, Same(4000, 3)), Curve(Property.Vs, Same(2400, 3))));
        Assert.Equal(1030 * G * 100, model.Column(Property.VerticalStress)[0], Pascal);
        Assert.Equal(G * (103000 + (2200 * 100) + (2400 * 100)), model.Column(Property.VerticalStress)[2], Pascal);
        Assert.Equal(1000 * G * 300, model.Column(Property.PorePressure)[2], Pascal);
    }

    [Fact]
    public void Samples_above_the_ground_stay_out()
    {
        var model = Run(Setup with { Frame = new DepthFrame(DatumKind.RotaryTable, 150, 0, null, null), Overburden = new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2000.0)) } }, LogsWith());
        Assert.Equal([false, false, true, true, true], model.Usable);
        Assert.Equal(2000 * G * 50, model.Column(Property.VerticalStress)[2], Pascal);
        Assert.Contains(model.Findings, f => f.Samples == 2 && f.Text.Format == "logs above the ground or mudline: left out");
    }
}
