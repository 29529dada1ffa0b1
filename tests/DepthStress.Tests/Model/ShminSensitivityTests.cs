using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>What the choices of Poisson's ratio and Biot's coefficient do to Shmin.</summary>
public class ShminSensitivityTests
{
    private const double G = 9.80665; // standard gravity, exact

    private static StageSettings With(double poisson, double biot, bool strained = false) => SmallWell.Settings with
    {
        Moduli = new ModuliSettings
        {
            StaticYoungs = Chosen(UserLaw.Constant(Property.YoungsStatic, Units.Gigapascal, 20)),
            StaticPoisson = Chosen(ConstantPoisson(poisson)),
        },
        Biot = new BiotSettings { Coefficient = Chosen(UserLaw.Constant(Property.Biot, Units.One, biot)) },
        HorizontalStress = strained ? Strains : new(),
    };

    private static EarthModel Model(StageSettings settings, params Zone[] zones) => Run(Setup with { Settings = settings, Zones = zones }, LogsWith());

    private static double Mean(EarthModel model) => model.Column(Property.MinHorizontalStress).Average();

    // By hand: mean depth 200 m, Sv = 2500 g 200, Pp = 1000 g 200; K = nu/(1-nu) is 1/3 at 0.25, 0.25 at 0.2, 3/7 at 0.3.
    [Fact]
    public void The_changes_are_those_computed_by_hand()
    {
        var s = Assert.Single(ShminSensitivity.Of(Model(With(0.25, 0.8))));
        double sv = 2500 * G * 200, pp = 1000 * G * 200, effective = sv - (0.8 * pp);
        Assert.Equal((effective / 3) + (0.8 * pp), s.Shmin, 1);
        Assert.Equal(((1 / 4.0) - (1 / 3.0)) * effective, s.PoissonLower, 1);
        Assert.Equal(((3 / 7.0) - (1 / 3.0)) * effective, s.PoissonHigher, 1);
        Assert.Equal(-0.1 * pp * 2 / 3, s.BiotLower, 1);
        Assert.Equal(0.1 * pp * 2 / 3, s.BiotHigher, 1);
        Assert.Equal(0, s.Held);
    }

    // One code path: a run with the shifted constant gives the same change. A micropascal for the order of the sums.
    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void The_changes_are_those_of_another_run(bool strained)
    {
        var basis = Model(With(0.27, 0.7, strained));
        var s = Assert.Single(ShminSensitivity.Of(basis));
        Assert.Equal(Mean(Model(With(0.22, 0.7, strained))) - Mean(basis), s.PoissonLower, 1e-6);
        Assert.Equal(Mean(Model(With(0.32, 0.7, strained))) - Mean(basis), s.PoissonHigher, 1e-6);
        Assert.Equal(Mean(Model(With(0.27, 0.6, strained))) - Mean(basis), s.BiotLower, 1e-6);
        Assert.Equal(Mean(Model(With(0.27, 0.8, strained))) - Mean(basis), s.BiotHigher, 1e-6);
        Assert.True(s.PoissonLower < 0 && s.PoissonHigher > 0 && s.BiotLower < 0 && s.BiotHigher > 0);
    }

    // No rock has a Biot's coefficient above one or a Poisson's ratio above a half: what is tried stops there, and it is counted.
    [Fact]
    public void Nothing_impossible_is_tried()
    {
        var basis = Model(With(0.47, 0.95));
        var s = Assert.Single(ShminSensitivity.Of(basis));
        double sv = 2500 * G * 200, pp = 1000 * G * 200;
        Assert.Equal(sv - Mean(basis), s.PoissonHigher, 1); // at 1/2 the rock carries Sv sideways
        Assert.Equal(0.05 * pp * (1 - (0.47 / 0.53)), s.BiotHigher, 1);
        Assert.Equal(5, s.Held);
    }

    [Fact]
    public void Each_zone_has_its_own_row_from_top_to_bottom_and_missing_samples_do_not_count()
    {
        Zone Of(string name, double top, double? bottom) => new(name, top, bottom, DepthKind.Measured, new StageSettings(), WellFile);
        var model = Run(
            Setup with { Settings = With(0.25, 0.8), Zones = [Of("A", 100, 200), Of("B", 200, 300), Of("C", 400, null)] },
            LogsWith(Curve(Property.Density, 2500, 2500, 2500, 2500, double.NaN)));
        var rows = ShminSensitivity.Of(model);
        Assert.Equal(["", "A", "B"], rows.Select(r => model.ZoneName(r.Zone)));
        Assert.Equal(model.Column(Property.MinHorizontalStress)[1], rows[1].Shmin, 1e-6);
        Assert.Equal(model.Column(Property.MinHorizontalStress)[2], rows[2].Shmin, 1e-6);
    }
}
