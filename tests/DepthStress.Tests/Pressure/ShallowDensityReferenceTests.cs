using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

/// <summary>Published relations for density where nothing is logged, through the overburden itself.</summary>
public class ShallowDensityReferenceTests
{
    private static double Feet(double ft) => ft * 0.3048; // exact

    private static double Ppg(double ppg) => ppg * 119.82642731689663; // 0.45359237 kg per 231 in3, both exact definitions

    // Traugott 1997, read in Zhang 2019, Applied Petroleum Geomechanics, p. 190 eqs 6.4-6.6: mean density of sediment in lb/gal, and
    // Sv = (rho_w Zw + rho_a (Z - Zw - Zag))/19.25 psi. Values computed from the formula in full precision, half the last digit.
    [Theory]
    [InlineData(9842.52, 1640.42, 98.43, 8.7, 18.071328, 16.328718, 8348.869)]
    [InlineData(9842.52, 1640.42, 98.43, 8.6, 18.071328, 16.312051, 8340.348)]
    [InlineData(10000, 2000, 80, 8.7, 18.047129, 16.033327, 8329.001)]
    [InlineData(10000, 2000, 80, 8.6, 18.047129, 16.013327, 8318.611)]
    [InlineData(20000, 5000, 80, 8.7, 18.854767, 16.240656, 16873.409)]
    [InlineData(15000, 0, 0, 8.7, 18.862977, 18.862977, 14698.424)]
    public void The_mean_density_of_Traugott_carries_the_overburden(
        double z, double water, double air, double waterDensity, double mean, double gradient, double stress)
    {
        var above = new MeanDensityLaw(Method("traugott-1997"));
        var sediment = Feet(z - water - air);
        Assert.Equal(mean, above.MassAbove(sediment) / sediment / Ppg(1), 5e-7);

        var sv = Overburden.Start(Feet(water), Ppg(waterDensity), above.MassAbove(sediment), Feet(z), 2400).Stress;
        Assert.Equal(stress, Units.Psi.FromSi(sv), 5e-4);
        Assert.Equal(gradient, Units.Psi.FromSi(sv) * 19.25 / z, 5e-7);

        // 0.052 for 1/19.25 is the oilfield's rounding, 0.1 % too much: 8 psi or more in every case.
        var rounded = ((waterDensity * water) + (mean * (z - water - air))) * 0.052;
        Assert.True(rounded - Units.Psi.FromSi(sv) > 8);
    }

    // Miller, read in Zhang 2019 p. 34 eqs 2.3-2.4 with the Gulf of Mexico coefficients; computed from the formula, half the last digit.
    [Theory]
    [InlineData(0, 1.537500)]
    [InlineData(100, 1.658539)]
    [InlineData(500, 1.906741)]
    [InlineData(1000, 2.027614)]
    [InlineData(2000, 2.092701)]
    public void The_density_of_Miller_is_met_at_its_depths(double depth, double density) =>
        Assert.Equal(density, new LocalDensityLaw(Method("miller-gulf")).DensityAt(Feet(depth)) / 1000, 5e-7);

    // Zhang 2019 p. 192: published relations of basins give 62.93 (North Sea) to 73.56 MPa (Haynesville) at 3000 m. A sane
    // assumption lies among them, widened by the +-1.35 MPa printed for the Malay basin.
    [Fact]
    public void Whole_assumed_columns_weigh_what_basins_weigh()
    {
        ShallowDensity[] columns =
        [
            new MeanDensityLaw(Method("traugott-1997")),
            new ExponentialDensity(2000, 2700).Tie(3000, 2550, out _),
            new PointDensity([new(0, 1950), new(1000, 2250), new(3000, 2550)]),
            ShallowDensity.Mean(2300),
        ];
        Assert.All(columns, c => Assert.InRange(Overburden.Start(0, 1030, c.MassAbove(3000), 3000, 2500).Stress / 1e6, 62.93 - 1.35, 73.56 + 1.35));
    }
}
