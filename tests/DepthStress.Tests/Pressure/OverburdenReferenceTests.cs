using CsCheck;
using DepthStress.Core.Pressure;

namespace DepthStress.Tests.Pressure;

public class OverburdenReferenceTests
{
    private const double G = 9.80665; // standard gravity, exact

    // Closed form: rho g z (Zoback 2007 p. 9 eq. 1.6 for constant density). Rounding of five sums.
    [Fact]
    public void Constant_density_gives_its_weight()
    {
        var stress = new double[5];
        var carry = Overburden.Start(0, 1030, 0, 0, 2300);
        Overburden.Scan([0, 100, 250, 260, 1000], [2300, 2300, 2300, 2300, 2300], stress, ref carry);
        Assert.Equal(0, stress[0]);
        Assert.Equal(2300 * G * 250, stress[2], 1e-6);
        Assert.Equal(2300 * G * 1000, stress[4], 1e-6);
    }

    // Closed form: the integral of rho0 + k z is rho0 z + k z^2 / 2; the trapezoidal rule is exact for a straight line.
    [Fact]
    public void Density_that_grows_linearly_gives_the_closed_form()
    {
        double[] tvd = [0, 3, 10, 500, 501, 2000];
        var stress = new double[tvd.Length];
        var carry = Overburden.Start(0, 1030, 0, 0, 2000);
        Overburden.Scan(tvd, [.. tvd.Select(z => 2000 + (0.2 * z))], stress, ref carry);
        for (var i = 0; i < tvd.Length; i++) Assert.Equal(G * ((2000 * tvd[i]) + (0.1 * tvd[i] * tvd[i])), stress[i], 1e-7 * (1 + stress[i]) * 1e-3);
    }

    // Zoback 2007 p. 9: water, then rock; air adds nothing. Datum 25 m above the sea, 100 m of water, mudline at 125 m, first density
    // at 200 m. Self-computed: 9.80665 (1030 x 100 + 1900 x 75) = 2407532.575 Pa; rounding only.
    [Fact]
    public void Offshore_the_water_weighs_and_the_air_does_not()
    {
        var carry = Overburden.Start(100, 1030, ShallowDensity.Mean(1900).MassAbove(75), 200, 2100);
        Assert.Equal(2407532.575, carry.Stress, 1e-6);
        var stress = new double[2];
        Overburden.Scan([200, 300], [2100, 2300], stress, ref carry);
        Assert.Equal(2407532.575, stress[0], 1e-6);
        Assert.Equal(2407532.575 + (2200 * G * 100), stress[1], 1e-6);
    }

    [Fact]
    public void A_first_sample_at_the_mudline_carries_the_water_alone() =>
        Assert.Equal(1030 * G * 100, Overburden.Start(100, 1030, 0, 125, 2100).Stress, 1e-6);

    [Fact]
    public void A_sample_left_out_gets_no_stress_and_the_integral_goes_on()
    {
        var stress = new double[3];
        var carry = Overburden.Start(0, 1030, 0, 0, 2000);
        Overburden.Scan([0, 50, 100], [2000, double.NaN, 2200], stress, ref carry);
        Assert.True(double.IsNaN(stress[1]));
        Assert.Equal(2100 * G * 100, stress[2], 1e-6);
    }

    // A chunked scan adds the same numbers in the same order: equal to the last bit.
    [Fact]
    public void A_chunked_scan_equals_the_whole_scan() =>
        Gen.Select(Gen.Double[0.01, 5].Array[1, 60], Gen.Double[1500, 3000].Array[60], Gen.Bool.Array[60], Gen.Int[1, 17]).Sample((steps, density, missing, chunk) =>
        {
            var n = steps.Length;
            var (tvd, z) = (new double[n], 0.0);
            for (var i = 0; i < n; i++) tvd[i] = z += steps[i];
            var rho = density[..n].Select((d, i) => missing[i] ? double.NaN : d).ToArray();
            var (whole, parts) = (new double[n], new double[n]);
            var start = Overburden.Start(0, 1030, ShallowDensity.Mean(2000).MassAbove(tvd[0]), tvd[0], density[0]);
            var (one, many) = (start, start);
            Overburden.Scan(tvd, rho, whole, ref one);
            for (var from = 0; from < n; from += chunk)
            {
                var length = Math.Min(chunk, n - from);
                Overburden.Scan(tvd.AsSpan(from, length), rho.AsSpan(from, length), parts.AsSpan(from, length), ref many);
            }

            return whole.AsSpan().SequenceEqual(parts) && one == many;
        });

    [Fact]
    public void Lengths_are_checked()
    {
        var carry = default(OverburdenCarry);
        Assert.Throws<ArgumentException>(() => Overburden.Scan([1, 2], [1], new double[2], ref carry));
    }
}
