using DepthStress.Core.Depth;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Core.Stress;
using static DepthStress.Tests.Model.SmallWell;

namespace DepthStress.Tests.Pressure;

/// <summary>Eaton's two relations: pore pressure from sonic slowness (1975) and fracture gradient (1969).</summary>
public class EatonReferenceTests
{
    private const double Foot = 0.3048; // exact
    private const double Psi = 6894.757293168361; // NIST SP 811 App. B.8 prints 6.894757 E+03
    private const double PsiPerFootDensity = 19.25 * 119.82642731689663; // density that weighs 1 psi/ft: 231/12 lb/gal

    /// <summary>A well of one constant gradient and slowness down to 13,500 ft.</summary>
    private static EarthModel Well(double observed, double normal, double exponent = double.NaN)
    {
        var settings = Settings with
        {
            PorePressure = new PorePressureSettings
            {
                Method = Chosen(PorePressureMethod.EatonSonic),
                FluidDensity = Chosen(0.465 * PsiPerFootDensity),
                Trend = Chosen<IReadOnlyList<TrendPoint>>([new(0, 1 / (normal * Foot)), new(5000, 1 / (normal * Foot))]),
                Exponent = double.IsNaN(exponent) ? default : Chosen(exponent),
            },
        };
        double[] depths = [0, 10_000 * Foot, 13_500 * Foot];
        return Run(
            Setup with { Settings = settings },
            Table(depths, Curve(Property.Density, Same(PsiPerFootDensity, 3)), Curve(Property.Vp, Same(observed * Foot, 3)), Curve(Property.Vs, Same(observed * Foot / 2, 3))));
    }

    // Drilling-text problem on a public question page: 13,500 ft, 10,000 ft/s where 12,000 ft/s is normal, S 1.0, Pn 0.465 psi/ft: printed 0.69
    // psi/ft; computed from the formula 0.690394 psi/ft and 9320.3125 psi.
    [Fact]
    public void The_printed_sonic_case_is_met_through_the_whole_chain()
    {
        var pp = Well(10_000, 12_000).Column(Property.PorePressure)[2] / Psi;
        Assert.Equal(0.69, pp / 13_500, 0.005);
        Assert.Equal(0.690394, pp / 13_500, 5e-7);
        Assert.Equal(9320.3125, pp, 1e-4);

        // One sheet in circulation prints the ratio upside down, which gives 0.076 psi/ft: far below the normal pressure.
        Assert.True(pp / 13_500 > 0.465);
        Assert.True(Math.Abs((pp / 13_500) - (1 - (0.535 * Math.Pow(1.2, 3)))) > 0.5);
    }

    [Fact]
    public void Slower_rock_is_overpressured_and_faster_rock_is_not()
    {
        Assert.True(Well(11_900, 12_000).Column(Property.PorePressure)[2] > 13_500 * 0.465 * Psi);
        Assert.True(Well(12_100, 12_000).Column(Property.PorePressure)[2] < 13_500 * 0.465 * Psi);
    }

    // Identity: rock on its trend has the normal pressure, whatever the exponent. One pascal for rounding.
    [Theory]
    [InlineData(double.NaN)]
    [InlineData(1.2)]
    public void Rock_on_its_trend_has_the_normal_pressure(double exponent) =>
        Assert.Equal(13_500 * 0.465 * Psi, Well(12_000, 12_000, exponent).Column(Property.PorePressure)[2], 1);

    [Fact]
    public void The_users_exponent_replaces_the_published_one()
    {
        var pp = Well(10_000, 12_000, 1.2).Column(Property.PorePressure)[2] / Psi / 13_500;
        Assert.Equal(1 - (0.535 * Math.Pow(10.0 / 12, 1.2)), pp, 1e-9); // self-computed
    }

    // S - (S - Pn) x 1.5^3 = 1 - 0.535 x 3.375 < 0 psi/ft: no pressure, and the samples are counted; at the ground S and Pn are zero, and so is Pp.
    [Fact]
    public void Rock_so_fast_that_the_pressure_would_be_negative_has_none()
    {
        var model = Well(18_000, 12_000);
        Assert.Equal([false, true, true], model.Column(Property.PorePressure).Select(double.IsNaN));
        var finding = Assert.Single(model.Findings, f => UnitSystem.Metric.Show(f.Text) == "[pore_pressure] method: eaton-1975-sonic has no meaning for these samples, the result is missing");
        Assert.Equal(2, finding.Samples);
        Assert.DoesNotContain(model.Texts(), t => t.Contains("pressure table", StringComparison.Ordinal));
    }

    [Fact]
    public void Without_sonic_there_is_no_pressure_and_the_reason_is_said()
    {
        var model = Well(double.NaN, 12_000);
        Assert.All(model.Column(Property.PorePressure), p => Assert.True(double.IsNaN(p)));
        Assert.Contains("compressional log missing: no pore pressure by eaton-1975-sonic", model.Texts());
        Assert.DoesNotContain(model.Texts(), t => t.Contains("pressure table", StringComparison.Ordinal));
    }

    // Eaton 1969 with the whole stress as matrix stress is uniaxial strain with Biot's coefficient 1. Lapeyrouse, Formulas and
    // Calculations for Drilling, Production and Workover: 12,000 ft, S 0.96, P 12 lb/gal = 0.624 psi/ft, ratio 0.47: printed 0.92 psi/ft, 11,040 psi and
    // 17.69 lb/gal; the print rounds on its way, hence 0.3 %. In full precision 0.921962 psi/ft.
    [Fact]
    public void The_printed_fracture_gradient_is_uniaxial_strain()
    {
        var gradient = StrainModel.Of(1, 0.47, 1, 0.96, 0.624, 0, 0);
        Assert.Equal(0.92, gradient, 0.003 * 0.92);
        Assert.Equal(11_040, gradient * 12_000, 0.003 * 11_040);
        Assert.Equal(17.69, gradient / 0.052, 0.003 * 17.69);
        Assert.Equal(0.921962, gradient, 5e-7);
    }

    // Gulf Coast fracture-gradient exercise, 11,000 ft, P 0.735, S 0.96 psi/ft, ratio 0.46: 0.926667 psi/ft (inputs read in the exercise
    // after Bourgoyne et al. 1986; the answer computed from F = (S - P) nu/(1 - nu) + P).
    [Fact]
    public void The_Gulf_Coast_exercise_is_uniaxial_strain()
    {
        Assert.Equal(0.926667, StrainModel.Of(1, 0.46, 1, 0.96, 0.735, 0, 0), 5e-7);
        Assert.Equal((0.225 * 0.46 / 0.54) + 0.735, StrainModel.Of(1, 0.46, 1, 0.96, 0.735, 0, 0), 1e-15);
    }

    [Fact]
    public void The_frame_of_the_trend_is_the_mudline()
    {
        var trend = new TrendLine([new(0, 600e-6), new(1000, 300e-6)]);
        var slowness = new double[2];
        trend.Fill([125, 1125], Sea.SolidTopTvd, slowness);
        Assert.Equal([600e-6, 300e-6], slowness, (a, b) => Math.Abs(a - b) < 1e-18);
        Assert.Equal(DatumKind.RotaryTable, Sea.Datum);
    }
}
