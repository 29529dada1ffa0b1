using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.PressureWell;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Model;

/// <summary>Measured formation pressures beside the computed ones.</summary>
public class FormationPressureTests
{
    private static readonly PorePressureSettings Plain = new() { Method = Chosen(PorePressureMethod.Hydrostatic), FluidDensity = Chosen(Water) };

    private static readonly PorePressureSettings Honoured = Plain with { HonourTests = Chosen(true) };

    // Residuals of +1 MPa (sigma 0.1) and +2 MPa (sigma 0.2): weights 100 and 25, so the shift is 1.2 MPa.
    [Fact]
    public void The_line_goes_through_the_weighted_mean_offset_of_the_tests()
    {
        Observation[] tests = [Test(1001, Hydrostatic(1001) + 1e6), Test(2001, Hydrostatic(2001) + 2e6, 0.2e6)];
        var model = Computed(Honoured, null, tests);
        Assert.Equal(Md.Select(z => Hydrostatic(z) + 1.2e6), model.Column(Property.PorePressure), (a, b) => Math.Abs(a - b) < 1e-3);
        Assert.Contains(
            "pore pressure in the well was moved by 1.20 MPa to its formation pressures (2); measured less computed after that: -0.20 MPa at 1001.0 m measured depth, 0.80 MPa at 2001.0 m measured depth",
            model.Texts());
        // 0.8 MPa is four sigma of that test.
        Assert.Contains(model.Texts(), t => t.StartsWith("the formation pressure of 22.21 MPa at 2001.0 m measured depth is more than three sigma (0.20 MPa each) off the computed", StringComparison.Ordinal));
    }

    [Fact]
    public void Tests_are_not_honoured_unless_that_is_asked_for()
    {
        var model = Computed(Plain, null, Test(1001, Hydrostatic(1001) + 0.29e6), Test(2001, Hydrostatic(2001) - 0.31e6));
        Assert.Equal(Hydrostatic(1500), model.Column(Property.PorePressure)[At(1500)], 1e-6);
        Assert.Single(model.Texts(), t => t.Contains("more than three sigma", StringComparison.Ordinal) && t.Contains("2001.0 m", StringComparison.Ordinal));
        Assert.DoesNotContain(model.Texts(), t => t.Contains("1001.0 m", StringComparison.Ordinal));
    }

    [Fact]
    public void Each_zone_is_moved_by_its_own_tests()
    {
        var setup = With(Honoured, null, Test(1001, Hydrostatic(1001) + 1e6)) with
        {
            Zones = [new("upper", 500, null, DepthKind.Measured, new(), WellFile), new("lower", 1500, null, DepthKind.Measured, new(), WellFile)],
        };
        var pp = Run(setup, LogsOf()).Column(Property.PorePressure);
        Assert.Equal(Hydrostatic(1498) + 1e6, pp[At(1498)], 1e-3);
        Assert.Equal(Hydrostatic(1500), pp[At(1500)], 1e-3);
    }

    [Fact]
    public void A_pressure_read_at_the_surface_gets_its_column_or_is_left_out()
    {
        var surface = Test(1001, Hydrostatic(1001) - (1200 * G * 1001) + 1e6) with { AtSurface = true };
        var pp = Computed(Honoured, null, surface with { FluidDensity = 1200 }).Column(Property.PorePressure);
        Assert.Equal(Hydrostatic(1500) + 1e6, pp[At(1500)], 1e-3);
        var left = Computed(Honoured, null, surface);
        Assert.Equal(Hydrostatic(1500), left.Column(Property.PorePressure)[At(1500)], 1e-6);
        Assert.Contains("tests.csv(4): the formation pressure was read at the surface and lacks the density of the fluid in the hole; it was not used", left.Texts());
        Assert.Contains("tests.csv(4): the formation pressure lies outside the logs and was not used", Computed(Honoured, null, Test(4000, 1e6)).Texts());
    }

    // By hand: 1100 kg/m3 from the datum, +- 10 kg/m3.
    [Fact]
    public void A_pressure_stated_as_a_density_counts_from_the_datum()
    {
        var stated = Test(1001, 1100, 10) with { AsDensity = true };
        Assert.Equal(Hydrostatic(1500) + (1100 * G * 1001) - Hydrostatic(1001), Computed(Honoured, null, stated).Column(Property.PorePressure)[At(1500)], 1e-3);
        Assert.Contains(Computed(Plain, null, stated).Texts(), t => t.Contains("more than three sigma (0.10 MPa each)", StringComparison.Ordinal));
    }

    [Fact]
    public void A_pressure_above_the_vertical_stress_cannot_be() => Assert.Equal(
        [UnitSystem.Metric.Show($"tests.csv(4): error: found a formation pressure of 30.00 MPa at 1001.0 m measured depth, expected it below the vertical stress there of {Quantity.Pressure(Weight(1001))}")],
        Problems(Plain, Test(1001, 30e6)));

    [Fact]
    public void Other_observations_are_not_formation_pressures() =>
        Assert.Equal(Hydrostatic(1500), Computed(Honoured, null, Test(1001, 20e6) with { Kind = ObservationKind.Closure }).Column(Property.PorePressure)[At(1500)], 1e-6);
}
