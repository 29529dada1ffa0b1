using DepthStress.Core.Catalogue;
using DepthStress.Core.Pressure;

namespace DepthStress.Tests.Pressure;

/// <summary>
/// NIST StRD non-linear regression, Misra1a: y = b1 (1 - exp(-b2 x)), an exponential trend from zero. Certified values from memory (a refit
/// agrees to nine digits): b1 238.94212918, b2 5.5015643181E-04, deviations 2.7070075241 and 7.2668688436E-06, residual sum of squares 0.12455138894.
/// Tolerance: six digits.
/// </summary>
public class ExponentialFitReferenceTests
{
    private static readonly double[] X = [77.6, 114.9, 141.1, 190.8, 239.9, 289.0, 332.8, 378.4, 434.8, 477.3, 536.8, 593.1, 689.1, 760.0];

    private static readonly double[] Y = [10.07, 14.73, 17.94, 23.93, 29.61, 35.18, 40.02, 44.82, 50.76, 55.05, 61.01, 66.40, 75.47, 81.78];

    private static void Near(double certified, double actual) => Assert.Equal(certified, actual, 1e-6 * certified);

    [Fact]
    public void Misra1a_comes_out_as_certified()
    {
        var fit = ExponentialFit.Of(X, Y, new Interval(0, 0), new Interval(0, 10_000), new Interval(10, 100_000));
        Near(238.94212918, fit.Limit);
        Near(5.5015643181e-4, 1 / fit.Length);
        Near(2.7070075241, fit.LimitError);
        // To first order the deviation of b2 is that of the length over its square.
        Near(7.2668688436e-6, fit.LengthError / fit.Length / fit.Length);
        Near(0.12455138894, fit.ResidualSquares);
        Assert.Equal((2, 0.0, 0.0), (fit.Free, fit.Surface, fit.SurfaceError));
    }

    // Without a bound the limit is 239: a bound of 200 holds it, and the length gives way. At the bound the gradient points out of the range
    // (the condition of Karush, Kuhn and Tucker), so that a little less is worse.
    [Fact]
    public void A_bound_stops_an_estimate_and_says_so()
    {
        var at = ExponentialFit.Of(X, Y, new Interval(0, 0), new Interval(0, 200), new Interval(10, 100_000));
        Assert.Equal((200.0, 0.0, 1), (at.Limit, at.LimitError, at.Free));
        var within = ExponentialFit.Of(X, Y, new Interval(0, 0), new Interval(199, 199), new Interval(10, 100_000));
        Assert.True(within.ResidualSquares > at.ResidualSquares);
        Assert.True(at.ResidualSquares > 0.12455138894);
    }

    [Fact]
    public void A_length_at_its_bound_is_the_bound()
    {
        var fit = ExponentialFit.Of(X, Y, new Interval(0, 0), new Interval(0, 10_000), new Interval(10, 1000));
        Assert.Equal((1000.0, 0.0, 1), (fit.Length, fit.LengthError, fit.Free));
    }

    // A curve without scatter gives its parameters back; ten digits, since the sum of squares then ends in rounding.
    [Fact]
    public void Three_free_parameters_are_recovered()
    {
        double[] z = [.. Enumerable.Range(0, 500).Select(i => 1000 + (4.0 * i))];
        double[] y = [.. z.Select(d => 220e-6 + (380e-6 * Math.Exp(-d / 1900)))];
        var fit = ExponentialFit.Of(z, y, new Interval(300e-6, 900e-6), new Interval(100e-6, 300e-6), new Interval(200, 20_000));
        Assert.Equal(600e-6, fit.Surface, 600e-6 * 1e-6);
        Assert.Equal(220e-6, fit.Limit, 220e-6 * 1e-6);
        Assert.Equal(1900, fit.Length, 1900 * 1e-6);
        Assert.Equal(3, fit.Free);
    }

    [Fact]
    public void What_cannot_be_fitted_is_refused()
    {
        var any = new Interval(1, 2);
        Assert.Throws<ArgumentException>(() => ExponentialFit.Of([1, 2, 3], [1, 2, 3], any, any, any));
        Assert.Throws<ArgumentException>(() => ExponentialFit.Of([1, 2, 3, 4], [1, 2, 3], any, any, any));
        Assert.Throws<ArgumentException>(() => ExponentialFit.Of([1, 2, 3, 4], [1, 2, 3, 4], any, any, new Interval(0, 1)));
    }
}
