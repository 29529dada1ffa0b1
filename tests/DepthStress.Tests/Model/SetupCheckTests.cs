using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using DepthStress.Core.Stress;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Every message of the setup check, in full.</summary>
public class SetupCheckTests
{
    private static string[] Report(WellSetup setup)
    {
        var diagnostics = new DiagnosticBag();
        SetupCheck.Report(setup, diagnostics);
        return [.. diagnostics.Items.Select(d => d.ToString())];
    }

    private static string[] Report(StageSettings settings) => Report(Setup with { Settings = settings });

    private static StageSettings Pore(PorePressureSettings pore) => SmallWell.Settings with { PorePressure = pore };

    private static string[] Strained(double? along, double? across) => Report(SmallWell.Settings with
    {
        HorizontalStress = new HorizontalStressSettings
        {
            StrainAlongShmin = along is { } a ? Chosen(a, 7) : default,
            StrainAlongShmax = across is { } b ? Chosen(b, 8) : default,
        },
    });

    [Fact]
    public void A_sound_setup_has_no_messages() => Assert.Empty(Report(Setup));

    [Fact]
    public void Every_required_choice_is_asked_for_with_the_methods_that_fit() => Assert.Equal(
        [
            "well.toml(1,1): error: [moduli] static_youngs is not set; expected a value or a method: lacy-1997-sandstone, lacy-1997-shale, lacy-1997-combined, ohen-2003-shale and others, see \"depthstress methods --for youngs_static\"",
            "well.toml(1,1): error: [moduli] static_poisson is not set; expected a value or a method: equal-to-dynamic",
            "well.toml(1,1): error: [biot] coefficient is not set; expected a value or a method: krief-1990-biot, consolidated-rock-biot, lee-2003-unconsolidated, nur-1998-critical-porosity and others, see \"depthstress methods --for biot\"",
            "well.toml(1,1): error: [pore_pressure] method is not set; expected hydrostatic, gradient, table, fluid line, eaton-1975-sonic, eaton-1975-resistivity, bowers-1995-loading, bowers-1995-unloading and others, see \"depthstress methods --for pp\"",
        ],
        Report(new StageSettings()));

    [Fact]
    public void A_recalled_method_above_the_log_needs_consent_too()
    {
        var recalled = Method("traugott-1997") with { Standing = Standing.FromMemory };
        var setup = Setup with { Overburden = new OverburdenSettings { AboveLog = Chosen<ShallowDensity>(new MeanDensityLaw(recalled), 9) } };
        Assert.Equal(
            ["well.toml(9,1): error: [overburden] above_log = \"traugott-1997\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it"],
            Report(setup));
        Assert.Empty(Report(setup with { AcceptUnverified = true }));
    }

    [Fact]
    public void A_recalled_method_needs_consent()
    {
        var setup = Setup with
        {
            Settings = SmallWell.Settings with { Biot = new BiotSettings { Coefficient = Chosen(Method("krief-1990-biot"), 12) } },
        };
        Assert.Equal(
            ["well.toml(12,1): error: [biot] coefficient = \"krief-1990-biot\": its coefficients were recalled, not read in the source; set accept_unverified = true to use it"],
            Report(setup));
        Assert.Empty(Report(setup with { AcceptUnverified = true }));
    }

    [Fact]
    public void A_law_needs_its_parameters()
    {
        var porosity = new PorositySettings { Porosity = Chosen(Method("density-porosity"), 13) };
        Assert.Equal(
            [
                "well.toml(13,1): error: [porosity] porosity = \"density-porosity\" needs [porosity] matrix_density",
                "well.toml(13,1): error: [porosity] porosity = \"density-porosity\" needs [porosity] fluid_density",
            ],
            Report(SmallWell.Settings with { Porosity = porosity }));
        porosity = porosity with { MatrixDensity = Chosen(2650.0), FluidDensity = Chosen(1000.0) };
        Assert.Empty(Report(SmallWell.Settings with { Porosity = porosity }));
    }

    [Fact]
    public void Shale_volume_needs_its_two_lines()
    {
        var shale = new ShaleSettings { Volume = Chosen(Method("linear-gamma-ray")) };
        Assert.Equal(
            [
                "well.toml(1,1): error: [shale] clean is not set; expected the gamma radiation of clean rock, such as \"25 gAPI\"",
                "well.toml(1,1): error: [shale] shale is not set; expected the gamma radiation of shale, such as \"130 gAPI\"",
            ],
            Report(SmallWell.Settings with { Shale = shale }));
        shale = shale with { Clean = Chosen(100.0, 20), Shale = Chosen(30.0, 21) };
        Assert.Equal(
            ["well.toml(21,1): error: found a shale line of 30 gAPI, expected it above the clean line of 100 gAPI"],
            Report(SmallWell.Settings with { Shale = shale }));
    }

    [Fact]
    public void A_hydrostatic_pressure_needs_a_fluid() => Assert.Equal(
        ["well.toml(1,1): error: [pore_pressure] fluid_density is not set; expected such as \"1.03 g/cm3\""],
        Report(Pore(new() { Method = Chosen(PorePressureMethod.Hydrostatic) })));

    [Fact]
    public void A_gradient_needs_a_value_and_a_reference_the_well_has()
    {
        Assert.Equal(
            [
                "well.toml(1,1): error: [pore_pressure] gradient is not set; expected such as \"10.5 kPa/m\"",
                "well.toml(1,1): error: [pore_pressure] reference is not set; expected rotary table, ground, sea surface or mudline",
            ],
            Report(Pore(new() { Method = Chosen(PorePressureMethod.Gradient) })));
        var gradient = Pore(new()
        {
            Method = Chosen(PorePressureMethod.Gradient),
            Gradient = Chosen(1050.0),
            Reference = Chosen(DepthReference.Mudline, 30),
        });
        Assert.Equal(["well.toml(30,1): error: found a reference that an onshore well does not have, expected rotary table or ground"], Report(gradient));
        Assert.Empty(Report(Setup with { Settings = gradient, Frame = Sea }));
        gradient = gradient with { PorePressure = gradient.PorePressure with { Reference = Chosen(DepthReference.Ground, 30) } };
        Assert.Equal(["well.toml(30,1): error: found a reference that an offshore well does not have, expected rotary table, sea surface or mudline"], Report(Setup with { Settings = gradient, Frame = Sea }));
    }

    [Fact]
    public void A_pressure_table_needs_points_that_get_deeper()
    {
        var table = new PorePressureSettings { Method = Chosen(PorePressureMethod.Table) };
        Assert.Equal(
            [
                "well.toml(1,1): error: [pore_pressure] points is not set; expected a table of depth and pressure",
                "well.toml(1,1): error: [pore_pressure] depth_kind is not set; expected md, tvd or tvdss",
            ],
            Report(Pore(table)));
        table = table with { DepthKind = Chosen(DepthKind.TrueVertical), Points = Points(100, 200) };
        Assert.Empty(Report(Pore(table)));
        foreach (var points in new[] { Points(), Points(200, 200), Points(200, 100) })
        {
            Assert.Equal(
                ["well.toml(31,1): error: [pore_pressure] points do not get deeper, expected true vertical depths that increase from point to point"],
                Report(Pore(table with { Points = points })));
        }

        static Setting<IReadOnlyList<PressurePoint>> Points(params double[] depths) =>
            Chosen<IReadOnlyList<PressurePoint>>([.. depths.Select(d => new PressurePoint(d, 1e6))], 31);
    }

    [Fact]
    public void Strains_come_in_pairs_and_in_order()
    {
        Assert.Equal(["well.toml(1,1): error: [horizontal_stress] strain_along_shmax is not set; expected both strains or neither"], Strained(1e-4, null));
        Assert.Equal(["well.toml(1,1): error: [horizontal_stress] strain_along_shmin is not set; expected both strains or neither"], Strained(null, 1e-4));
        Assert.Equal(
            ["well.toml(8,1): error: strain_along_shmax is below strain_along_shmin: exchange them and turn shmax_azimuth by 90 deg"],
            Strained(2e-4, 1e-4));
        Assert.Empty(Strained(1e-4, 1e-4));
        Assert.Empty(Strained(-2e-4, -1e-4));
        Assert.Empty(Strained(null, null));
    }

    // What a zone lacks, its lithologies lack too: said once. What a lithology alone lacks is said for each zone.
    [Fact]
    public void A_problem_inside_a_zone_or_lithology_names_it()
    {
        var half = new StageSettings { HorizontalStress = Strains with { StrainAlongShmin = default } };
        var zone = new Zone("A", 100, null, DepthKind.Measured, half, new("well.toml", 40, 1));
        var other = new Zone("B", 200, null, DepthKind.Measured, new StageSettings(), new("well.toml", 41, 1));
        var rule = new LithologyRule("salt", null, null, null, [7], new("well.toml", 50, 1));
        var setup = Setup with { Zones = [zone, other], Lithologies = [new LithologyChoice(rule, new StageSettings())] };
        Assert.Equal(
            ["well.toml(40,1): error: [horizontal_stress] strain_along_shmin is not set in zone \"A\"; expected both strains or neither"],
            Report(setup));
        Assert.Equal(
            [
                "well.toml(40,1): error: [horizontal_stress] strain_along_shmin is not set in zone \"A\"; expected both strains or neither",
                "well.toml(50,1): error: [horizontal_stress] strain_along_shmin is not set in zone \"B\" for lithology \"salt\"; expected both strains or neither",
            ],
            Report(setup with { Lithologies = [new LithologyChoice(rule, half)] }));
    }

    [Fact]
    public void A_lithology_rule_cannot_decide_shale_volume()
    {
        var rule = new LithologyRule("marl", new Interval(0.2, 0.5), null, null, [], new("well.toml", 51, 1));
        var overrides = new StageSettings { Shale = new ShaleSettings { Clean = Chosen(20.0) } };
        Assert.Equal(
            ["well.toml(51,1): error: [shale] is set for lithology \"marl\", expected it in the well or a zone: lithology rules hold by shale volume"],
            Report(Setup with { Lithologies = [new LithologyChoice(rule, overrides)] }));
    }

    [Fact]
    public void Zones_out_of_order_overlapping_or_named_twice_are_reported()
    {
        static Zone Of(string name, double top, double? bottom, int line, DepthKind kind = DepthKind.Measured) =>
            new(name, top, bottom, kind, new StageSettings(), new("well.toml", line, 1));
        Assert.Equal(
            [
                "well.toml(2,1): error: zone \"B\" starts at 50.0 m measured depth, expected below zone \"A\" at 100.0 m",
                "well.toml(3,1): error: found a second zone named \"a\", expected each name once",
                "well.toml(3,1): error: zone \"a\" ends above its top",
                "well.toml(5,1): error: zone \"D\" starts at 350.0 m measured depth, inside zone \"C\" that ends at 400.0 m",
            ],
            Report(Setup with { Zones = [Of("A", 100, null, 1), Of("B", 50, 60, 2), Of("a", 200, 150, 3), Of("C", 300, 400, 4), Of("D", 350, null, 5)] }));
        var level = Bent(new(0, 0, 0), new(100, Math.PI / 2, 0), new(1000, Math.PI / 2, 0));
        Assert.Equal(
            ["well.toml(6,1): error: the hole never reaches the top of zone \"E\""],
            Report(Setup with { Trajectory = level, Zones = [Of("E", 500, null, 6, DepthKind.TrueVertical)] }));
    }

    [Fact]
    public void One_cause_is_reported_once_for_all_zones()
    {
        var law = UserLaw.Constant(Property.Biot, Units.One, 0.8) with { Id = "guess", Standing = Standing.FromMemory };
        var zones = new[] { "A", "B" }.Select((name, k) => new Zone(name, 100 * k, null, DepthKind.Measured, new StageSettings(), WellFile));
        Assert.Single(Report(Setup with { Zones = [.. zones], Settings = SmallWell.Settings with { Biot = new BiotSettings { Coefficient = Chosen(law) } } }));
    }
}
