namespace DepthStress.Core.Catalogue;

/// <summary>The shapes that most published one-input relations share; the coefficients come in the order of the formula.</summary>
public static class LawForms
{
    /// <summary><c>a</c>.</summary>
    public static double Constant(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0];

    /// <summary><c>x</c>.</summary>
    public static double Same(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => x[0];

    /// <summary><c>a x + b</c>.</summary>
    public static double Linear(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => (c[0] * x[0]) + c[1];

    /// <summary><c>a x^2 + b x</c>.</summary>
    public static double Quadratic(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => ((c[0] * x[0]) + c[1]) * x[0];

    /// <summary><c>a x^b</c>.</summary>
    public static double Power(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * Math.Pow(x[0], c[1]);

    /// <summary><c>a exp(b x)</c>.</summary>
    public static double Exponential(ReadOnlySpan<double> x, ReadOnlySpan<double> c) => c[0] * Math.Exp(c[1] * x[0]);
}
