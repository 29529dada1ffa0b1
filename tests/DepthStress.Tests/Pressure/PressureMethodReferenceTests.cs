using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Tests.Catalogue;

namespace DepthStress.Tests.Pressure;

/// <summary>Methods of shale pressure against printed numbers and against numbers computed apart from this code.</summary>
public class PressureMethodReferenceTests
{
    private const double Psi = 6894.757293168361; // NIST SP 811 App. B.8 prints 6.894757 E+03
    private const double Foot = 0.3048; // exact
    private const double SlownessUnit = 1e-6 / Foot;

    /// <summary>A law in its published units, without the kernel.</summary>
    private static double Published(string id, params double[] inputs) => MethodCatalogue.Find(id)!.Evaluate(inputs);

    // Training manual, d-exponent: S 1.04, Pn 0.452 psi/ft, observed 1.75, normal 1.85: printed 0.490 psi/ft (computed 0.489931). The
    // d-exponent and resistivity share Eaton's exponent of 1.2. Tolerance: half the last printed digit.
    [Fact]
    public void The_printed_case_of_the_exponent_1_2_is_met() =>
        Assert.Equal(0.490, Published("eaton-1975-resistivity", 1.04, 0.452, 1.85, 1.75), 5e-4);

    // Self-computed: 9000 ft/s at 10,000 psi with three published pairs (the pairs are from memory). Tolerance: the digits given.
    [Theory]
    [InlineData(4.4567, 0.8168, 4124.631, 5875.369)]
    [InlineData(28.3711, 0.6207, 2900.790, 7099.210)]
    [InlineData(14.1984, 0.724, 2419.525, 7580.475)]
    public void Bowers_on_loading(double a, double b, double stress, double pressure)
    {
        Assert.Equal(pressure, Published("bowers-1995-loading", 10_000, 9000, a, b), 1e-3);
        Assert.Equal(9000, 5000 + (a * Math.Pow(stress, b)), 0.05); // the loading curve itself, back from the stress to seven digits
    }

    // Self-computed; the way back through the unloading curve of eq. 7.16 must give the velocity that went in.
    [Fact]
    public void Bowers_on_unloading_goes_there_and_back()
    {
        var pressure = Published("bowers-1995-unloading", 12_000, 9000, 4.4567, 0.8168, 3.13, 10_500);
        Assert.Equal(10_202.255, pressure, 1e-3);
        var most = Math.Pow((10_500 - 5000) / 4.4567, 1 / 0.8168);
        Assert.Equal(6091.269, most, 1e-3);
        var back = 5000 + (4.4567 * Math.Pow(most * Math.Pow((12_000 - pressure) / most, 1 / 3.13), 0.8168));
        Assert.Equal(9000, back, 1e-6); // rounding
    }

    // With U = 1 there is no permanent change: both curves are one (identity).
    [Fact]
    public void Unloading_without_hysteresis_is_loading() => Assert.Equal(
        Published("bowers-1995-loading", 12_000, 9000, 4.4567, 0.8168), Published("bowers-1995-unloading", 12_000, 9000, 4.4567, 0.8168, 1, 10_500), 1e-8);

    // 5000 ft/s is 1524 m/s: at and below it there is no effective stress; above V_max the rock was not unloaded.
    [Fact]
    public void Bowers_ends_at_the_velocity_of_water_and_at_the_greatest_velocity()
    {
        double Loading(double v) => Laws.Apply("bowers-1995-loading", 10_000 * Psi, v, 14.1984, 0.724);
        double Unloading(double v) => Laws.Apply("bowers-1995-unloading", 10_000 * Psi, v, 14.1984, 0.724, 5, 3000);
        Assert.True(double.IsNaN(Loading(1524)));
        Assert.Equal(10_000 * Psi, Loading(1524.001), 1e3); // a thousandth of a m/s holds next to no stress
        Assert.True(double.IsNaN(Unloading(3000.1)));
        Assert.False(double.IsNaN(Unloading(2999.9)));
    }

    // GSR p. 150 eq. 7.14 with 1.0 and 0.465 psi/ft is P = D - 0.535 De: 12,000 and 8000 ft give 7720 psi (computed).
    [Fact]
    public void Equivalent_depth_is_the_source_line() =>
        Assert.Equal(7720, Published("equivalent-depth-sonic", 12_000, 8000 - (0.465 * 8000)), 1e-9);

    // Self-computed from the form in the abstract of Zhang 2013. Tolerance: the digits given.
    [Fact]
    public void Zhang_by_porosity()
    {
        var pressure = Laws.Apply("zhang-2011-porosity", 44e6, 20.6e6, 2000, 0.10, 0.46, 1 / 0.001118);
        Assert.Equal(28.029643e6, pressure, 0.5);
        Assert.Equal(15.970357e6, 44e6 - pressure, 0.5);
    }

    [Fact]
    public void Zhang_by_slowness()
    {
        double At(double slowness) => Laws.Apply(
            "zhang-2011-sonic", 9500 * Psi, 4650 * Psi, 10_000 * Foot, slowness * SlownessUnit, 200 * SlownessUnit, 70 * SlownessUnit, Foot / 0.00028) / Psi;
        Assert.Equal(6257.771, At(90), 5e-4);
        Assert.Equal(4650, At(70 + (130 * Math.Exp(-2.8))), 1e-6); // identity: rock on its trend has the normal pressure
        Assert.Equal(77.905308, 70 + (130 * Math.Exp(-2.8)), 5e-7);
        Assert.True(double.IsNaN(At(70))); // at the matrix slowness there is no finite effective stress
    }

    // Identity: with phi = phi_0 exp(-s / s_c) the effective stress comes back, to rounding.
    [Theory]
    [InlineData(5e6)]
    [InlineData(30e6)]
    public void Compaction_by_porosity_gives_the_stress_back(double stress) => Assert.Equal(
        60e6 - stress, Laws.Apply("compaction-porosity", 60e6, 0.42 * Math.Exp(-stress / 33e6), 0.42, 33e6), 1e-6);

    [Fact]
    public void Every_method_of_shale_says_what_it_starts_from()
    {
        Assert.Equal(8, Core.Pressure.ShaleMethod.All.Count);
        Assert.Equal(MethodCatalogue.For(Property.PorePressure).Select(l => l.Id), Core.Pressure.ShaleMethod.All.Select(m => m.Law.Id));
        Assert.All(Core.Pressure.ShaleMethod.All, m => Assert.Equal(RockKinds.Shale, m.Law.Rocks));
    }
}
