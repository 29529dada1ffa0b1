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

/// <summary>Every finding once provoked; the quiet well, which provokes none of them, shows each once absent.</summary>
public class FindingRulesTests
{
    private const double Gap = double.NaN;

    private static readonly StageSettings QuietSettings = With(0.5, 0.3) with { HorizontalStress = new() };

    /// <summary>Static Young's modulus as a share of the dynamic one, and Poisson's ratio.</summary>
    private static StageSettings With(double share, double poisson) => SmallWell.Settings with
    {
        Moduli = new ModuliSettings
        {
            StaticYoungs = Chosen(UserLaw.Linear(Property.YoungsStatic, Units.Gigapascal, DynamicModulus, share, 0)),
            StaticPoisson = Chosen(ConstantPoisson(poisson)),
        },
    };

    private static WellSetup Quiet(StageSettings settings) => Setup with { Settings = settings };

    private static string[] Texts(StageSettings settings, params Curve[] replaced) => Run(Quiet(settings), LogsWith(replaced)).Texts();

    private static string[] Texts(params Curve[] replaced) => Texts(QuietSettings, replaced);

    [Fact]
    public void A_quiet_well_has_one_note_only() => Assert.Equal(
        ["SHmax is empty where nothing constrains it: set strain_along_shmin and strain_along_shmax"], Texts());

    [Fact]
    public void Strains_everywhere_silence_the_note_on_SHmax() =>
        Assert.DoesNotContain(Texts(QuietSettings with { HorizontalStress = Strains }), t => t.StartsWith("SHmax is empty", StringComparison.Ordinal));

    [Fact]
    public void A_missing_compressional_log_is_found() =>
        Assert.Contains("compressional log missing: no moduli, no horizontal stress", Texts(Curve(Property.Vp, 4000, Gap, 4000, 4000, 4000)));

    [Fact]
    public void A_missing_shear_log_is_found() =>
        Assert.Contains("shear log missing: no moduli, no horizontal stress", Texts(Curve(Property.Vs, 2400, Gap, 2400, 2400, 2400)));

    [Fact]
    public void A_density_that_ends_early_is_found() => Assert.Contains(
        "no density below the last logged one, so no stress: set [overburden] below_log", Texts(Curve(Property.Density, 2500, 2500, 2500, 2500, Gap)));

    [Fact]
    public void A_pressure_table_that_ends_early_is_found()
    {
        var table = QuietSettings with
        {
            PorePressure = new PorePressureSettings
            {
                Method = Chosen(PorePressureMethod.Table),
                DepthKind = Chosen(DepthKind.TrueVertical),
                Points = Chosen<IReadOnlyList<PressurePoint>>([new(0, 0), new(300, 3e6)]),
            },
        };
        var finding = Assert.Single(Run(Quiet(table), LogsWith()).Findings, f => f.Text.Format.StartsWith("pore pressure missing", StringComparison.Ordinal));
        Assert.Equal([new DepthRange(400, 400)], finding.Where);
    }

    // Zones may make every choice themselves; samples outside them then have none, and must not be empty without a word.
    [Fact]
    public void Samples_outside_the_zones_without_a_choice_are_found()
    {
        var zone = new Zone("A", 100, 300, DepthKind.Measured, QuietSettings, WellFile);
        var model = Run(Setup with { Settings = new StageSettings(), Zones = [zone] }, LogsWith());
        foreach (var key in new[] { "[moduli] static_youngs", "[moduli] static_poisson", "[biot] coefficient", "[pore_pressure] method" })
        {
            var finding = Assert.Single(model.Findings, f => UnitSystem.Metric.Show(f.Text) == key + " is not set for these samples: no horizontal stress");
            Assert.Equal([new DepthRange(0, 0), new DepthRange(300, 400)], finding.Where);
        }

        Assert.DoesNotContain(model.Texts(), t => t.StartsWith("pore pressure missing", StringComparison.Ordinal));
    }

    [Fact]
    public void A_law_outside_its_domain_is_found()
    {
        var strength = new StrengthSettings { FrictionAngle = Chosen(Method("lal-1999-shale-friction")) };
        Assert.Contains(
            "[strength] friction_angle: lal-1999-shale-friction has no meaning for these samples, the result is missing",
            Texts(QuietSettings with { Strength = strength }, Curve(Property.Vp, 900, 4000, 4000, 4000, 4000), Curve(Property.Vs, 400, 2400, 2400, 2400, 2400)));
    }

    [Fact]
    public void A_law_beyond_its_range_is_found()
    {
        var settings = QuietSettings with { Moduli = QuietSettings.Moduli with { StaticPoisson = Chosen(Method("equal-to-dynamic")) } };
        Assert.Contains(
            "[moduli] static_poisson: equal-to-dynamic was used beyond the range it was fitted in",
            Texts(settings, Curve(Property.Vs, 2400, 2800, 2400, 2400, 2400))); // 4000/2800 is a ratio of 0.02
    }

    [Theory]
    [InlineData("linear-gamma-ray", "[shale] volume: linear-gamma-ray needs gamma ray, which is not there; the result is missing")]
    [InlineData("krief-1990-biot", "[biot] coefficient: krief-1990-biot needs porosity, which is not there; the result is missing")]
    public void A_law_without_its_log_is_found_in_words_of_the_trade(string id, string expected)
    {
        var law = Method(id);
        var settings = law.Predicts == Property.Biot
            ? QuietSettings with { Biot = new BiotSettings { Coefficient = Chosen(law) } }
            : QuietSettings with { Shale = new ShaleSettings { Volume = Chosen(law), Clean = Chosen(20.0), Shale = Chosen(120.0) } };
        Assert.Contains(expected, Texts(settings));
    }

    [Fact]
    public void A_law_on_moduli_without_a_shear_log_names_the_logs() => Assert.Contains(
        "[moduli] static_youngs: linear needs compressional slowness or velocity and shear slowness or velocity, which is not there; the result is missing",
        Run(Quiet(QuietSettings), Table(Depths, Curve(Property.Vp, Same(4000)), Curve(Property.Density, Same(2500)))).Texts());

    [Fact]
    public void Gamma_ray_beyond_its_lines_is_found()
    {
        var shale = new ShaleSettings { Volume = Chosen(Method("linear-gamma-ray")), Clean = Chosen(20.0), Shale = Chosen(120.0) };
        const string Expected = "gamma ray beyond the clean or shale line: the index was held at 0 or 1";
        Assert.Contains(Expected, Texts(QuietSettings with { Shale = shale }, Curve(Property.GammaRay, 10, 50, 50, 50, 50)));
        Assert.DoesNotContain(Expected, Texts(QuietSettings with { Shale = shale }, Curve(Property.GammaRay, 20, 50, 50, 50, 120)));
    }

    [Fact]
    public void A_pore_pressure_above_the_stresses_is_found()
    {
        var heavy = QuietSettings with { PorePressure = QuietSettings.PorePressure with { FluidDensity = Chosen(2600.0) } };
        Assert.Contains("pore pressure is not below Shmin", Texts(heavy));
        Assert.Contains("pore pressure is not below the vertical stress", Texts(heavy));
    }

    [Fact]
    public void A_static_modulus_not_below_the_dynamic_one_is_found() =>
        Assert.Contains("static Young's modulus is not below the dynamic one", Texts(With(1.0, 0.3)));

    [Theory]
    [InlineData(2800)] // 0.02
    [InlineData(1100)] // 0.46
    public void A_doubtful_Poissons_ratio_is_found(double vs) => Assert.Contains(
        "dynamic Poisson's ratio outside 0.05-0.45: doubtful sonic", Texts(Curve(Property.Vs, 2400, vs, 2400, 2400, 2400)));

    [Theory]
    [InlineData(1500)]
    [InlineData(2900)]
    public void A_doubtful_overburden_is_found(double density) => Assert.Contains(
        "mean overburden gradient below the ground or mudline outside 16.00 kPa/m to 27.00 kPa/m", Texts(Curve(Property.Density, Same(density))));

    // nu 0.2, weights per depth and g: Shmin 0.25 (2500 - 800) + 800 = 1225 against 1000 + 1500/3.119 = 1481.
    [Fact]
    public void An_Shmin_beyond_friction_is_found() =>
        Assert.Contains("Shmin is below the limit that friction on faults sets for normal faulting", Texts(With(0.5, 0.2)));

    // At the ground the strains alone give an SHmax above zero, and no stress is below Sv there.
    [Fact]
    public void An_SHmax_beyond_friction_is_found() => Assert.Contains(
        "SHmax is above the limit that friction on faults sets", Texts(QuietSettings with { HorizontalStress = Strains }));

    [Fact]
    public void Greater_friction_carries_more()
    {
        var strained = QuietSettings with { HorizontalStress = Strains with { FrictionCoefficient = Chosen(0.85) } };
        static int Count(EarthModel model) => model.Findings.Where(f => f.Text.Format.StartsWith("SHmax is above", StringComparison.Ordinal)).Sum(f => f.Samples);
        Assert.True(Count(Run(Quiet(strained), LogsWith())) < Count(Run(Quiet(QuietSettings with { HorizontalStress = Strains }), LogsWith())));
    }

    [Fact]
    public void Logs_below_the_survey_are_found()
    {
        var setup = Quiet(QuietSettings) with { Trajectory = Bent(new(0, 0, 0), new(250, 0, 0)) };
        Assert.Contains("logs below the last survey station at 250.0 m measured depth: the hole is taken to go straight on", Run(setup, LogsWith()).Texts());
    }

    // 2000 x 9.80665 x 150 + 2250 x 9.80665 x 50 Pa: the mean to 150 m, then half a step towards the log. The sonic starts higher.
    [Fact]
    public void An_assumed_density_above_the_log_is_told_with_what_rests_on_it()
    {
        var setup = Quiet(QuietSettings) with { Overburden = new OverburdenSettings { AboveLog = Chosen(ShallowDensity.Mean(2000.0)) } };
        var logs = Table([50, 150, 200, 400], Curve(Property.Vp, Same(4000, 4)), Curve(Property.Vs, Same(2400, 4)), Curve(Property.Density, Gap, Gap, 2500, 2500));
        Assert.Contains(
            "the vertical stress of 4.05 MPa at 200.0 m true vertical depth rests on an assumed mean density of 2.000 g/cm3 above the log",
            Run(setup, logs).Texts());
        logs = Table([0, 200, 400], Curve(Property.Vp, Same(4000, 3)), Curve(Property.Vs, Same(2400, 3)), Curve(Property.Density, Gap, 2500, 2500));
        Assert.Contains(Run(setup, logs).Texts(), t => t.Contains("rests on an assumed mean density", StringComparison.Ordinal));
        logs = Table([0, 200, 400], Curve(Property.Vp, Same(4000, 3)), Curve(Property.Vs, Same(2400, 3)), Curve(Property.Density, Same(2500, 3)));
        Assert.DoesNotContain(Run(setup, logs).Texts(), t => t.Contains("rests on an assumed mean density", StringComparison.Ordinal));
    }
}
