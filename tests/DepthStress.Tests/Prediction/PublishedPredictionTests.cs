using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Prediction;
using DepthStress.Core.Quantities;
using DepthStress.Tests.Model;
using static DepthStress.Tests.Prediction.PredictionWell;

namespace DepthStress.Tests.Prediction;

public class PublishedPredictionTests
{
    private static readonly Law Mudrock = SmallWell.Method("castagna-1985-mudrock");

    private static double ByMudrock(int i) => (Vp[i] - 1360) / 1.16;

    [Fact]
    public void Only_missing_samples_are_filled_and_say_how()
    {
        // Logged values 50 m/s above the line, so that its misfit is known.
        var logged = Without(Make(i => ByMudrock(i) + 50), 300, 400);
        var model = SmallWell.Run(Setup(Shear(Mudrock)), WellLogs(logged));
        var (vs, error) = (model.Column(Property.Vs), model.Column(Property.ShearError));
        for (var i = 0; i < Count; i++)
        {
            var missing = i is >= 300 and < 400;
            Assert.Equal(missing ? ByMudrock(i) : logged[i], vs[i], 1e-9); // rounding
            Assert.Equal(missing ? 50 : NoValue, error[i], 1e-9); // rounding
            Assert.Equal(missing ? SampleOrigin.Predicted : SampleOrigin.Measured, model.StressBasis[i]);
        }

        Assert.Equal(new OriginRun(300, 400, SampleOrigin.Predicted, "predicted: castagna-1985-mudrock"), model.Origins(Property.Vs)!.Runs[1]);
        Assert.Contains("shear velocity predicted (castagna-1985-mudrock), standard error 50 m/s: the horizontal stresses there rest on it", model.Texts());
        Assert.DoesNotContain(model.Texts(), t => t.StartsWith("shear log missing", StringComparison.Ordinal));
    }

    [Fact]
    public void What_is_not_chosen_stays_missing()
    {
        var model = SmallWell.Run(Setup(new PredictionSettings()), WellLogs(Without(Vs, 300, 400)));
        Assert.Equal(100, model.Column(Property.Vs).Count(double.IsNaN));
        Assert.Empty(model.Predictions);
        Assert.False(model.Values.Has(Property.ShearError));
    }

    [Fact]
    public void Without_a_shear_log_the_error_is_missing_and_that_is_said()
    {
        var model = SmallWell.Run(Setup(Shear(Mudrock)), WellLogs(Make(_ => NoValue)));
        Assert.All(model.Column(Property.ShearError), e => Assert.True(double.IsNaN(e)));
        Assert.Contains(model.Texts(), t => t.Contains("standard error not known, since nothing logged is there to compare with", StringComparison.Ordinal));
    }

    [Fact]
    public void A_zone_may_have_its_own_relation()
    {
        var own = UserLaw.Constant(Property.Vs, Units.MetrePerSecond, 1500);
        var setup = Setup(Shear(Mudrock)) with { Zones = [Zone("upper", 0, new()), Zone("lower", 200, Shear(own))] };
        var vs = SmallWell.Run(setup, WellLogs(Without(Vs, 300, 500))).Column(Property.Vs);
        Assert.Equal(ByMudrock(399), vs[399], 1e-9); // rounding; the zone begins at 200 m, sample 400
        Assert.Equal(1500, vs[400], 1e-9);
    }

    [Fact]
    public void In_salt_only_its_own_rule_predicts()
    {
        var logs = WellLogs(Without(Vs, 300, 400));
        var inherited = SmallWell.Run(Setup(Shear(Mudrock)) with { Lithologies = [Salt(new())] }, logs);
        var salt = Enumerable.Range(300, 100).Where(i => ShaleVolume[i] <= 0.5).ToArray();
        Assert.NotEmpty(salt);
        Assert.All(salt, i => Assert.True(double.IsNaN(inherited.Column(Property.Vs)[i])));
        var own = UserLaw.Constant(Property.Vs, Units.MetrePerSecond, 1700);
        var decided = SmallWell.Run(Setup(Shear(Mudrock)) with { Lithologies = [Salt(new() { Shear = ByRule(own) })] }, logs);
        Assert.All(salt, i => Assert.Equal(1700, decided.Column(Property.Vs)[i], 1e-9)); // rounding
    }

    [Fact]
    public void Nothing_is_predicted_above_the_mudline()
    {
        // Datum 25 m above the sea, 100 m of water: sample 250 is the mudline.
        var setup = Setup(Shear(Mudrock)) with { Frame = SmallWell.Sea };
        var vs = SmallWell.Run(setup, WellLogs(Without(Vs, 200, 300))).Column(Property.Vs);
        Assert.All(vs[200..250], v => Assert.True(double.IsNaN(v)));
        Assert.All(vs[250..300], v => Assert.False(double.IsNaN(v)));
    }

    [Fact]
    public void A_velocity_that_no_rock_has_is_refused()
    {
        var fast = UserLaw.Constant(Property.Vs, Units.MetrePerSecond, 4000);
        var model = SmallWell.Run(Setup(Shear(fast)), WellLogs(Without(Vs, 300, 310)));
        Assert.Equal(10, model.Column(Property.Vs).Count(double.IsNaN));
        Assert.Contains("predicted shear velocity with Vp/Vs not above sqrt(4/3): left missing", model.Texts());
    }

    [Fact]
    public void A_predicted_density_is_no_gap_for_the_overburden()
    {
        var density = Without(Density, 200, 300);
        Assert.Contains(SmallWell.Errors(Setup(new()), WellLogs(Vs, density)), e => e.Contains("density is missing from 99.5 m to 150.0 m", StringComparison.Ordinal));
        var model = SmallWell.Run(Setup(new() { Density = SmallWell.Chosen(SmallWell.Method("gardner-1974")) }), WellLogs(Vs, density));
        Assert.Equal(310 * Math.Pow(Vp[250], 0.25), model.Column(Property.Density)[250], 1e-9); // rounding
        Assert.Equal(SampleOrigin.Predicted, model.StressBasis[250]);
        Assert.Equal(SampleOrigin.Measured, model.StressBasis[400]);
        Assert.True(model.Column(Property.UnloggedShare)[400] > 0.1, "a predicted density is not a logged one");
        var miss = Enumerable.Range(0, Count).Where(i => i is < 200 or >= 300).Average(i => Math.Pow((310 * Math.Pow(Vp[i], 0.25)) - 2400, 2));
        Assert.Equal(Math.Sqrt(miss), model.Column(Property.DensityError)[250], 1e-6); // rounding
    }

    [Fact]
    public void Shear_may_start_from_porosity_that_a_predicted_density_gives()
    {
        var settings = Setup(new()
        {
            Shear = SmallWell.Chosen(SmallWell.Method("han-1986-shaly-sandstone")),
            Density = SmallWell.Chosen(UserLaw.Constant(Property.Density, Units.KilogramPerCubicMetre, 2320)),
        }).Settings with
        {
            Porosity = new() { Porosity = SmallWell.Chosen(SmallWell.Method("density-porosity")), MatrixDensity = SmallWell.Chosen(2650.0), FluidDensity = SmallWell.Chosen(1000.0) },
        };
        var model = SmallWell.Run(SmallWell.Setup with { Settings = settings }, WellLogs(Without(Vs, 300, 310), Without(Density, 300, 310)));
        // 20 % porosity, by hand: Vs = 3520 - 4910 * 0.2 - 1890 C.
        Assert.Equal(3520 - 982 - (1890 * ShaleVolume[305]), model.Column(Property.Vs)[305], 1e-6); // rounding
    }
}
