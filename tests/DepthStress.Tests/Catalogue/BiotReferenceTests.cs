using CsCheck;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Rock;
using static DepthStress.Tests.Catalogue.Laws;

namespace DepthStress.Tests.Catalogue;

public class BiotReferenceTests
{
    // Lee 2003 in Zhang 2019 p. 78 eq. 2.89; values self-computed to five digits. Near 0 at no porosity only with the minus sign.
    [Theory]
    [InlineData(0, 0.00537)]
    [InlineData(0.1, 0.60106)]
    [InlineData(0.2, 0.83847)]
    [InlineData(0.3, 0.93283)]
    public void Lees_coefficient_goes_from_none_to_nearly_one(double porosity, double expected) =>
        Assert.Equal(expected, Apply("lee-2003-unconsolidated", porosity), 5e-6);

    // Self-computed from recalled coefficients at 10, 20 and 30 % porosity; half the last digit.
    [Theory]
    [InlineData("krief-1990-biot", 0.29616, 0.56690, 0.78316)]
    [InlineData("consolidated-rock-biot", 0.32993, 0.57171, 0.74215)]
    [InlineData("lee-2003-unconsolidated", 0.60106, 0.83847, 0.93283)]
    public void Coefficients_from_porosity_rise_with_it(string id, double at10, double at20, double at30)
    {
        Assert.Equal(at10, Apply(id, 0.1), 5e-6);
        Assert.Equal(at20, Apply(id, 0.2), 5e-6);
        Assert.Equal(at30, Apply(id, 0.3), 5e-6);
    }

    // Quartz 37/44 GPa: the Hashin-Shtrikman bound at three porosities, self-computed; half the last digit.
    [Theory]
    [InlineData(0.1, 0.15339)]
    [InlineData(0.2, 0.28961)]
    [InlineData(0.3, 0.41137)]
    public void The_bound_for_quartz_is_where_it_should_be(double porosity, double expected) =>
        Assert.Equal(expected, Apply("hashin-shtrikman-bound", porosity, 37e9, 44e9), 5e-6);

    [Theory]
    [InlineData(0.1, 0.25)]
    [InlineData(0.2, 0.50)]
    [InlineData(0.3, 0.75)]
    [InlineData(0.4, 1)]
    [InlineData(0.6, 1)]
    public void Beyond_the_critical_porosity_the_coefficient_is_one(double porosity, double expected) =>
        Assert.Equal(expected, Apply("nur-1998-critical-porosity", porosity, 0.4), 1e-12);

    // Identity: porosity <= Biot's coefficient <= 1 for every law that knows porosity, and for one mineral the bound lies between.
    // Tolerance: rounding.
    [Fact]
    public void No_coefficient_is_below_porosity_or_above_one()
    {
        var laws = MethodCatalogue.For(Property.Biot)
            .Where(l => l.Inputs.Any(i => i.Property == Property.Porosity) && l.Inputs.All(i => i.Property != Property.Vs)).ToList();
        Assert.Equal(5, laws.Count);
        Gen.Select(Gen.Double[0, 0.99], Gen.Double[0.05, 1], Gen.Double[1, 100], Gen.Double[1, 100]).Sample((porosity, critical, bulk, shear) =>
        {
            foreach (var law in laws)
            {
                var coefficient = law.Evaluate([.. law.Inputs.Select(i => i.Property switch
                {
                    Property.Porosity => porosity,
                    Property.CriticalPorosity => critical,
                    Property.MineralBulkModulus => bulk,
                    _ => shear,
                })]);
                Assert.InRange(coefficient, porosity - 1e-12, 1 + 1e-12);
            }
        });
    }

    // Identity: laws for consolidated rock are not below the Hashin-Shtrikman bound of quartz (37/44 GPa) where rocks lie.
    [Fact]
    public void Laws_from_porosity_lie_above_the_bound_of_quartz() => Gen.Double[0.01, 0.45].Sample(porosity =>
    {
        var bound = Apply("hashin-shtrikman-bound", porosity, 37e9, 44e9);
        return Apply("krief-1990-biot", porosity) >= bound && Apply("consolidated-rock-biot", porosity) >= bound
            && Apply("lee-2003-unconsolidated", porosity) >= bound && Apply("nur-1998-critical-porosity", porosity, 0.4) >= bound;
    });

    // Identity: with the density porosity of gas-filled rock (fluid of no mass) the two shear forms are one.
    [Fact]
    public void The_two_shear_forms_agree_where_the_fluid_has_no_mass() => Gen.Double[0, 0.4].Sample(porosity =>
    {
        var full = Apply("krief-1990-shear-modulus", 2650 * (1 - porosity), 2000, 2650, 4090);
        Assert.Equal(full, Apply("krief-1990-shear-porosity", porosity, 2000, 4090), 1e-12);
    });

    // Zhang 2019 p. 79: with a fluid of 0.2 g/cm3 the full form gives 0.68750 against 0.69010 (self-computed; half the last digit).
    [Fact]
    public void A_light_fluid_moves_the_shear_form_little()
    {
        Assert.Equal(0.68750, Apply("krief-1990-shear-modulus", (0.9 * 2650) + (0.1 * 200), 2400, 2650, 4090), 5e-6);
        Assert.Equal(0.69010, Apply("krief-1990-shear-porosity", 0.1, 2400, 4090), 5e-6);
    }

    // Identity: the sonic form is 1 - K / Ks with the K of the dynamic moduli. Tolerance: rounding.
    [Fact]
    public void The_sonic_form_rests_on_the_dynamic_bulk_modulus() => Gen.Select(Gen.Double[2500, 5500], Gen.Double[1.5, 2.2]).Sample((vp, ratio) =>
    {
        var (vs, density) = (vp / ratio, 2400.0);
        var bulk = ElasticConstants.Bulk(DynamicModuli.Youngs(vp, vs, density), DynamicModuli.Poisson(vp, vs));
        Assert.Equal(1 - (bulk / 80e9), Apply("dry-rock-sonic-biot", density, vp, vs, 80e9), 1e-9);
    });

    // K 15 GPa in quartz of 37 GPa: 0.59459, self-computed; E 22.5 GPa and Poisson's ratio 0.25 make K 15.
    [Fact]
    public void The_static_form_takes_static_moduli() => Assert.Equal(0.59459, Apply("biot-willis-1957-static", 22.5e9, 0.25, 37e9), 5e-6);

    [Fact]
    public void A_rock_stiffer_than_its_mineral_has_no_coefficient() =>
        Assert.True(double.IsNaN(Apply("biot-willis-1957-static", 90e9, 0.25, 37e9)));
}
