namespace DepthStress.Core.Catalogue;

/// <summary>The shapes that published relations share; the coefficients come in the order of the formula.</summary>
public static class LawForms
{
    /// <summary>Kilometres per second times microseconds per foot: a velocity in km/s is this over a slowness in us/ft (exact).</summary>
    public const double VelocityTimesSlowness = 304.8;

    /// <summary><c>a</c>.</summary>
    public static double Constant(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0];

    /// <summary><c>x</c>.</summary>
    public static double Same(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => x[0];

    /// <summary><c>a x + b</c>.</summary>
    public static double Linear(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => (c[0] * x[0]) + c[1];

    /// <summary><c>a x - b</c>.</summary>
    public static double LinearLess(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => (c[0] * x[0]) - c[1];

    /// <summary><c>a x^2 + b x</c>.</summary>
    public static double Quadratic(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => ((c[0] * x[0]) + c[1]) * x[0];

    /// <summary><c>a x^b</c>.</summary>
    public static double Power(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * Math.Pow(x[0], c[1]);

    /// <summary><c>a exp(b x)</c>.</summary>
    public static double Exponential(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * Math.Exp(c[1] * x[0]);

    /// <summary><c>x / a</c>.</summary>
    public static double Share(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => x[0] / c[0];

    /// <summary><c>a (1 - b x)^2</c>, which turns up again beyond <c>1 / b</c>.</summary>
    public static double Parabola(ReadOnlySpan<double> x, ReadOnlySpan<double> c)
    {
        var left = 1 - (c[1] * x[0]);
        return c[0] * left * left;
    }

    /// <summary><c>a (304.8 / x)^b</c>, a power law of velocity in km/s written for slowness in us/ft.</summary>
    public static double SlownessPower(ReadOnlySpan<double> x, ReadOnlySpan<double> c) =>
        c[0] * Math.Pow(VelocityTimesSlowness / x[0], c[1]);

    /// <summary><c>10^(a + b log10 x)</c>.</summary>
    public static double Logarithmic(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => Math.Pow(10, c[0] + (c[1] * Math.Log10(x[0])));

    /// <summary><c>10^(a + b log10(x y))</c>.</summary>
    public static double LogarithmicProduct(ReadOnlySpan<double> x, ReadOnlySpan<double> c) =>
        Math.Pow(10, c[0] + (c[1] * Math.Log10(x[0] * x[1])));

    /// <summary><c>a x y^2 + b</c>: a line in the compressional modulus of density and velocity.</summary>
    public static double ModulusLinear(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => (c[0] * x[0] * x[1] * x[1]) + c[1];

    /// <summary><c>a exp(b x y^2)</c>: an exponential of the compressional modulus of density and velocity.</summary>
    public static double ModulusExponential(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * Math.Exp(c[1] * x[0] * x[1] * x[1]);
}
