using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Layered rock through the whole chain.</summary>
public sealed class AnisotropyChainTests
{
    private const double Degree = Math.PI / 180;

    private static readonly ThomsenParameters Parameters = new(0.1, 0.15, 0.05);

    private static readonly AnisotropySettings Thomsen = new()
    {
        Model = Chosen(AnisotropyModel.Thomsen),
        Epsilon = Chosen(0.1),
        Gamma = Chosen(0.15),
        Delta = Chosen(0.05),
        ShearWave = Chosen(ShearWave.AlongBeds),
    };

    private static readonly AnisotropySettings Stoneley = new()
    {
        Model = Chosen(AnisotropyModel.Annie),
        C66 = Chosen(BedShearSource.Stoneley),
        MudDensity = Chosen(1200.0),
        MudVelocity = Chosen(1500.0),
        ShearWave = Chosen(ShearWave.AlongBeds),
    };

    private static readonly WellSetup Slanted = Setup with { Trajectory = Bent(new SurveyStation(0, 30 * Degree, 90 * Degree)) };

    private static VtiStiffness Dynamic => Parameters.ToStiffness(2500 * 4000.0 * 4000, 2500 * 2400.0 * 2400);

    private static WellSetup Layered(AnisotropySettings anisotropy, WellSetup? setup = null, Func<StageSettings, StageSettings>? change = null)
    {
        var settings = SmallWell.Settings with { Anisotropy = anisotropy, HorizontalStress = Strains };
        return (setup ?? Setup) with { Settings = change?.Invoke(settings) ?? settings };
    }

    private static string[] About(EarthModel model, string start) => [.. model.Texts().Where(t => t.StartsWith(start, StringComparison.Ordinal))];

    // The settings halve Young's modulus and keep Poisson's ratio, so the stress ratio without strains is that of the stiffness.
    [Fact]
    public void Stresses_are_those_of_the_stiffness_that_Thomsens_parameters_give()
    {
        var model = Run(Layered(Thomsen), LogsWith());
        var c = VtiConstants.Of(Dynamic);
        Assert.Equal(c.Vertical, model.Column(Property.YoungsDynamic)[2], 1); // Pa: rounding
        Assert.Equal(c.Horizontal / 2, model.Column(Property.YoungsStaticHorizontal)[2], 1);
        Assert.Equal(c.PoissonHorizontal, model.Column(Property.PoissonStaticHorizontal)[2], 1e-14);
        double sv = model.Column(Property.VerticalStress)[2], pore = 0.8 * model.Column(Property.PorePressure)[2];
        var (e, nu) = (c.Horizontal / 2, c.PoissonHorizontal);
        var uniaxial = (Dynamic.StressRatio * (sv - pore)) + pore;
        Assert.Equal(uniaxial + (e / (1 - (nu * nu)) * (2e-4 + (nu * 6e-4))), model.Column(Property.MinHorizontalStress)[2], 1e-6 * sv);
        Assert.Equal(uniaxial + (e / (1 - (nu * nu)) * (6e-4 + (nu * 2e-4))), model.Column(Property.MaxHorizontalStress)[2], 1e-6 * sv);
        var ratio = UnitSystem.Metric.Show(new Quantity(Dynamic.StressRatio, Dimension.None));
        Assert.Equal(
            [$"static conversion in the well: C13/C33, the horizontal over the vertical stress without pore pressure and lateral strain, goes from {ratio} to {ratio} on average"],
            About(model, "static conversion"));
    }

    [Fact]
    public void Parameters_of_pure_shale_scale_with_shale_volume_and_without_one_there_is_no_stress()
    {
        var setup = Layered(Thomsen with { ScaleWithShale = Chosen(true) });
        var model = Run(setup, LogsWith(Curve(Property.ShaleVolume, 0, 0.5, 1, double.NaN, 1)));
        var e = model.Column(Property.YoungsDynamicHorizontal);
        var half = new ThomsenParameters(0.05, 0.075, 0.025).ToStiffness(Dynamic.C33, Dynamic.C44);
        Assert.Equal(DynamicModuli.Youngs(4000, 2400, 2500), e[0], 1); // Pa: rounding
        Assert.Equal(VtiConstants.Of(half).Horizontal, e[1], 1);
        Assert.Equal(VtiConstants.Of(Dynamic).Horizontal, e[2], 1);
        Assert.True(double.IsNaN(model.Column(Property.MinHorizontalStress)[3]));
        Assert.Single(About(model, "[anisotropy] no shale volume to scale the parameters with: no moduli, no horizontal stress"));
    }

    [Fact]
    public void Isotropic_by_name_is_what_no_choice_gives()
    {
        var (none, named) = (Run(Layered(new()), LogsWith()), Run(Layered(new() { Model = Chosen(AnisotropyModel.Isotropic) }), LogsWith()));
        foreach (var property in (Property[])[Property.YoungsStatic, Property.MinHorizontalStress, Property.MaxHorizontalStress])
            Assert.Equal(none.Column(property), named.Column(property));
        Assert.Empty(About(named, "static conversion"));
        var column = new double[5];
        DepthColumns.Get("youngs_static_vertical").Read(named, 0, column);
        Assert.All(column, v => Assert.True(double.IsNaN(v)));
    }

    [Fact]
    public void The_Stoneley_wave_gives_C66_across_the_beds_and_is_refused_beyond_20_degrees()
    {
        var logs = LogsWith(Curve(Property.Stoneley, 1300, 1300, 1300, 1600, double.NaN));
        var model = Run(Layered(Stoneley), logs);
        Assert.Equal(StoneleyShear.C66(1300, 1200, 1500), model.Column(Property.BedShearStiffness)[1], 1e-3); // Pa: rounding
        Assert.Equal([false, false, false, true, true], model.Column(Property.MinHorizontalStress).Select(double.IsNaN));
        Assert.Single(About(model, "[anisotropy] the Stoneley wave is not slower than sound in the mud: no moduli"));
        Assert.Single(About(model, "[anisotropy] no Stoneley log: no moduli"));
        var use = Assert.Single(model.LawUses, u => u.Law.Id == "white-stoneley-c66");
        Assert.Equal(new LawOutcome(3, 1, 1, 0), use.Outcome);

        var slanted = Run(Layered(Stoneley, Slanted), logs);
        Assert.All(slanted.Column(Property.MinHorizontalStress), s => Assert.True(double.IsNaN(s)));
        Assert.Equal(4, Assert.Single(slanted.Findings, f => UnitSystem.Metric.Show(f.Text).Contains("more than 20 deg", StringComparison.Ordinal)).Samples);
    }

    [Fact]
    public void Samples_the_model_cannot_serve_are_isotropic_where_that_is_chosen()
    {
        var model = Run(Layered(Stoneley with { IsotropicOutside = Chosen(true) }, Slanted), LogsWith(Curve(Property.Stoneley, Same(1300))));
        var isotropic = Run(Layered(new(), Slanted), LogsWith());
        Assert.Equal(isotropic.Column(Property.MinHorizontalStress), model.Column(Property.MinHorizontalStress));
        Assert.Equal(isotropic.Column(Property.MaxHorizontalStress), model.Column(Property.MaxHorizontalStress));
        Assert.Single(About(model, "[anisotropy] the hole is more than 20 deg from the normal of the beds, where the Stoneley wave does not give C66: taken as isotropic, as chosen"));
    }

    // Forward apart from the stage, then through the chain: 1e-9 of the velocity.
    [Theory]
    [InlineData(ShearWave.AlongBeds, "SH")]
    [InlineData(ShearWave.AcrossBeds, "SV")]
    public void Velocities_along_an_oblique_hole_become_those_across_the_beds(ShearWave wave, string name)
    {
        var waves = new VtiVelocities(Dynamic, 30 * Degree);
        var (vp, vs) = (Math.Sqrt(waves.Compressional / 2500), Math.Sqrt(waves.Shear(wave) / 2500));
        var logs = LogsWith(Curve(Property.Vp, Same(vp)), Curve(Property.Vs, Same(vs)));
        var model = Run(Layered(Thomsen with { ShearWave = Chosen(wave) }, Slanted), logs);
        Assert.All(model.Column(Property.Vp), v => Assert.Equal(4000, v, 4e-6));
        Assert.All(model.Column(Property.Vs), v => Assert.Equal(2400, v, 2.4e-6));
        Assert.Equal(vp, logs[Property.Vp]!.Values[0]); // what was read stays as it was
        var run = Assert.Single(model.Logs[Property.Vp]!.Origins.Runs);
        Assert.Equal((SampleOrigin.Edited, "velocity across the beds"), (run.Origin, run.Step));
        var change = FormattableString.Invariant($"compressional {100 * ((4000 / vp) - 1):+0.0;-0.0} %, shear, taken as {name}, {100 * ((2400 / vs) - 1):+0.0;-0.0} % on average");
        Assert.Equal([$"velocities along the hole turned into vertical ones in the well: {change}"], About(model, "velocities along"));
        Assert.Empty(About(model, "sonic along"));
    }

    [Fact]
    public void Velocities_said_to_be_vertical_are_left_and_not_complained_about()
    {
        var model = Run(Layered(Thomsen with { AlongHole = Chosen(false) }, Slanted), LogsWith());
        Assert.All(model.Column(Property.Vp), v => Assert.Equal(4000, v));
        Assert.Empty(About(model, "sonic along"));
        Assert.Empty(About(model, "velocities along"));
    }

    [Fact]
    public void A_shear_log_gives_C66_from_60_degrees_on()
    {
        var annie = Stoneley with { C66 = Chosen(BedShearSource.FastShear), ShearWave = Chosen(ShearWave.AcrossBeds) };
        var c = VtiClosure.AnnieFromGamma(1, 1, 0.2).Of(4000.0 * 4000, 2400.0 * 2400);
        foreach (var degrees in (double[])[60, 40])
        {
            var waves = new VtiVelocities(c, degrees * Degree);
            var model = Run(
                Layered(annie, Setup with { Bedding = new Bedding(degrees * Degree, 0) }),
                LogsWith(
                    Curve(Property.Vp, Same(Math.Sqrt(waves.Compressional))), Curve(Property.Vs, Same(Math.Sqrt(waves.ShearVertical))),
                    Curve(Property.FastShear, Same(Math.Sqrt(waves.ShearHorizontal)))));
            if (degrees >= 60) Assert.All(model.Column(Property.BedShearStiffness), v => Assert.Equal(1, v / (2500 * c.C66), 1e-9));
            else Assert.Single(About(model, "[anisotropy] the hole is less than 60 deg from the normal of the beds"));
        }
    }

    // By hand: 1 - 0.45 = 0.55 must exceed 2 x 0.45^2 Eh/Ev, so Eh/Ev up to 1.358; these parameters give more.
    [Fact]
    public void A_static_stiffness_that_would_not_be_stable_is_missing()
    {
        var stiff = Thomsen with { Epsilon = Chosen(0.5), Gamma = Chosen(0.6) };
        var model = Run(Layered(stiff, null, s => s with { Moduli = s.Moduli with { StaticPoisson = Chosen(ConstantPoisson(0.45)) } }), LogsWith());
        Assert.All(model.Column(Property.YoungsStatic), v => Assert.True(double.IsNaN(v)));
        Assert.All(model.Column(Property.MinHorizontalStress), v => Assert.True(double.IsNaN(v)));
        Assert.Equal(5, Assert.Single(model.Findings, f => f.Text.Format.StartsWith("the static stiffness would not be stable", StringComparison.Ordinal)).Samples);
    }

    [Fact]
    public void A_dynamic_stiffness_that_is_not_stable_is_missing()
    {
        // C13 of delta 1 is too great for the C11 of epsilon -0.2.
        var model = Run(Layered(Thomsen with { Epsilon = Chosen(-0.2), Delta = Chosen(1.0), AlongHole = Chosen(false) }), LogsWith());
        Assert.Single(About(model, "[anisotropy] the dynamic stiffness is not stable: no moduli, no horizontal stress"));
        Assert.All(model.Column(Property.YoungsDynamic), v => Assert.True(double.IsNaN(v)));
    }

    // One factor on the whole stiffness keeps C13/C33; a curved law on each modulus does not.
    [Theory]
    [InlineData(StaticConversion.WholeStiffness, true)]
    [InlineData(StaticConversion.EachModulus, false)]
    public void The_stress_ratio_is_kept_by_one_factor_only(StaticConversion conversion, bool kept)
    {
        var model = Run(
            Layered(Thomsen with { StaticConversion = Chosen(conversion) }, null, s => s with { Moduli = s.Moduli with { StaticYoungs = Chosen(Method("lacy-1997-shale")) } }),
            LogsWith());
        var zone = Assert.Single(VtiZone.Of(model));
        Assert.Equal(Dynamic.StressRatio, zone.DynamicRatio, 1e-12); // rounding
        Assert.Equal(kept, Math.Abs(zone.StaticRatio - zone.DynamicRatio) < 1e-12);
        var at = StaticStiffness.At(model.Values, 2);
        Assert.Equal(zone.StaticRatio, at.StressRatio, 1e-12);
        Assert.Equal(Dynamic.C44 / Dynamic.C66, at.C44 / at.C66, 1e-12);
    }

    [Fact]
    public void A_law_that_knows_no_direction_keeps_the_ratio_of_the_dynamic_moduli()
    {
        var model = Run(
            Layered(Thomsen, null, s => s with { Moduli = s.Moduli with { StaticYoungs = Chosen(UserLaw.Constant(Property.YoungsStatic, Units.Gigapascal, 20)) } }), LogsWith());
        var c = VtiConstants.Of(Dynamic);
        Assert.Equal(20e9 * c.Horizontal / c.Vertical, model.Column(Property.YoungsStaticHorizontal)[1], 1); // Pa: rounding
        Assert.Single(About(model, "[moduli] static_youngs: constant does not start from the dynamic modulus"));
    }

    [Fact]
    public void Biots_coefficient_from_moduli_has_two_directions_and_any_other_has_one()
    {
        Func<StageSettings, StageSettings> fromModuli = s => s with
        {
            Biot = new BiotSettings { Coefficient = Chosen(Method("biot-willis-1957-static")), MineralBulkModulus = Chosen(37e9) },
        };
        var model = Run(Layered(Thomsen, null, fromModuli), LogsWith());
        var c = StaticStiffness.At(model.Values, 2);
        Assert.Equal(VtiBiot.Vertical(c, 37e9), model.Column(Property.Biot)[2], 1e-14); // rounding
        Assert.Equal(VtiBiot.Horizontal(c, 37e9), model.Column(Property.BiotHorizontal)[2], 1e-14);
        Assert.True(model.Column(Property.Biot)[2] > model.Column(Property.BiotHorizontal)[2]);
        Assert.All(Run(Layered(Thomsen), LogsWith()).Column(Property.BiotHorizontal), b => Assert.Equal(0.8, b));

        var soft = Run(Layered(Thomsen, null, s => fromModuli(s) with { Biot = fromModuli(s).Biot with { MineralBulkModulus = Chosen(5e9) } }), LogsWith());
        Assert.Single(About(soft, "Biot's coefficient from moduli is not between 0 and 1 in one direction"));
    }

    // One code path: another run with shifted constants gives the same change. A micropascal for the order of the sums.
    [Fact]
    public void What_the_choices_do_to_Shmin_is_what_another_run_gives()
    {
        EarthModel With(double poisson, double biot) => Run(
            Layered(Thomsen, null, s => s with
            {
                Moduli = s.Moduli with { StaticPoisson = Chosen(ConstantPoisson(poisson)) },
                Biot = new BiotSettings { Coefficient = Chosen(UserLaw.Constant(Property.Biot, Units.One, biot)) },
            }),
            LogsWith());
        static double Mean(EarthModel model) => model.Column(Property.MinHorizontalStress).Average();
        var s = Assert.Single(ShminSensitivity.Of(With(0.25, 0.8)));
        var basis = Mean(With(0.25, 0.8));
        Assert.Equal(Mean(With(0.20, 0.8)) - basis, s.PoissonLower, 1e-6);
        Assert.Equal(Mean(With(0.30, 0.8)) - basis, s.PoissonHigher, 1e-6);
        Assert.Equal(Mean(With(0.25, 0.7)) - basis, s.BiotLower, 1e-6);
        Assert.Equal(Mean(With(0.25, 0.9)) - basis, s.BiotHigher, 1e-6);
        Assert.Equal(0, s.Held);
    }

    [Fact]
    public void Where_a_higher_ratio_would_not_be_stable_the_ratios_stay()
    {
        var stiff = Thomsen with { Epsilon = Chosen(0.3), Gamma = Chosen(0.4) };
        var model = Run(Layered(stiff, null, s => s with { Moduli = s.Moduli with { StaticPoisson = Chosen(ConstantPoisson(0.40)) } }), LogsWith());
        Assert.All(model.Column(Property.MinHorizontalStress), v => Assert.False(double.IsNaN(v)));
        var s = Assert.Single(ShminSensitivity.Of(model));
        Assert.Equal((5, 0.0), (s.Held, Math.Round(s.PoissonHigher)));
    }

    [Fact]
    public void Salt_in_a_layered_zone_has_no_beds()
    {
        var salt = new Core.Lithology.LithologyRule("salt", null, new Interval(2000, 2300), null, [], WellFile) { Salt = true };
        var model = Run(
            Layered(Thomsen) with { Lithologies = [new LithologyChoice(salt, new())] }, LogsWith(Curve(Property.Density, 2500, 2500, 2200, 2500, 2500)));
        Assert.Equal(DynamicModuli.Youngs(4000, 2400, 2200), model.Column(Property.YoungsDynamic)[2], 1e-3);
        Assert.True(double.IsNaN(model.Column(Property.YoungsStaticHorizontal)[2]));
        Assert.Equal(model.Column(Property.VerticalStress)[2], model.Column(Property.MinHorizontalStress)[2]);
    }
}
