using DepthStress.Core.Calibration;

namespace DepthStress.Tests.Calibration;

/// <summary>Lines through the points (1, 2), (2, 4), (3, 7), by hand; Student's t of 95 % from public tables (12.7062 and 4.30265).</summary>
public class SimpleFitReferenceTests
{
    private static readonly double[] X = [1, 2, 3];
    private static readonly double[] Y = [2, 4, 7];

    // Slope 5/2, intercept -2/3, residuals 1/6, -1/3, 1/6: squares sum to 1/6. Tolerance: rounding; half the tables' last digit.
    [Fact]
    public void An_ordinary_line()
    {
        var (intercept, slope, deviation) = SimpleFit.Line(X, Y)!.Value;
        Assert.Equal(-2.0 / 3, intercept.Value, 1e-12);
        Assert.Equal(2.5, slope.Value, 1e-12);
        Assert.Equal(Math.Sqrt(1.0 / 6), deviation, 1e-12);
        Assert.Equal(Math.Sqrt(1.0 / 12), slope.Error, 1e-12);
        Assert.Equal(2.5 + (12.7062 * Math.Sqrt(1.0 / 12)), slope.High, 5e-5);
        Assert.Equal(2.5 - (12.7062 * Math.Sqrt(1.0 / 12)), slope.Low, 5e-5);
    }

    // 31/14; the squared residuals sum to 5/14, over two degrees of freedom. Tolerance: as above.
    [Fact]
    public void A_line_through_the_origin()
    {
        var slope = SimpleFit.ThroughOrigin(X, Y)!.Value;
        Assert.Equal(31.0 / 14, slope.Value, 1e-12);
        Assert.Equal(Math.Sqrt(5.0 / 14 / 2 / 14), slope.Error, 1e-12);
        Assert.Equal(slope.Value + (4.30265 * slope.Error), slope.High, 5e-6);
    }

    // The ratios 2, 2, 7/3 have the mean 19/9 and the standard error 1/9. Tolerance: rounding.
    [Fact]
    public void A_factor_is_the_mean_of_the_ratios()
    {
        var factor = SimpleFit.Factor(X, Y)!.Value;
        Assert.Equal(19.0 / 9, factor.Value, 1e-12);
        Assert.Equal(1.0 / 9, factor.Error, 1e-12);
    }

    [Fact]
    public void Too_few_points_give_no_line()
    {
        Assert.Null(SimpleFit.Line([1, 2], [1, 2]));
        Assert.Null(SimpleFit.Line([1, 1, 1], [1, 2, 3]));
        Assert.Null(SimpleFit.ThroughOrigin([1], [1]));
        Assert.Throws<ArgumentException>(() => SimpleFit.ThroughOrigin([1, 2], [1]));
    }
}
