namespace DepthStress.Core.Catalogue;

/// <summary>
/// The shapes that published relations share; the coefficients come in the order of the formula. They are lambdas because a
/// delegate of one is called faster than one of a static method.
/// </summary>
public static class LawForms
{
    /// <summary>Kilometres per second times microseconds per foot: a velocity in km/s is this over a slowness in us/ft (exact).</summary>
    public const double VelocityTimesSlowness = 304.8;

    /// <summary><c>a</c>.</summary>
    public static LawFormula Constant { get; } = (_, c) => c[0];

    /// <summary><c>x</c>.</summary>
    public static LawFormula Same { get; } = (x, _) => x[0];

    /// <summary><c>a x + b</c>.</summary>
    public static LawFormula Linear { get; } = (x, c) => (c[0] * x[0]) + c[1];

    /// <summary><c>a x - b</c>.</summary>
    public static LawFormula LinearLess { get; } = (x, c) => (c[0] * x[0]) - c[1];

    /// <summary><c>a x^2 + b x</c>.</summary>
    public static LawFormula Quadratic { get; } = (x, c) => ((c[0] * x[0]) + c[1]) * x[0];

    /// <summary><c>a x^b</c>.</summary>
    public static LawFormula Power { get; } = (x, c) => c[0] * Math.Pow(x[0], c[1]);

    /// <summary><c>a exp(b x)</c>.</summary>
    public static LawFormula Exponential { get; } = (x, c) => c[0] * Math.Exp(c[1] * x[0]);

    /// <summary><c>x / a</c>.</summary>
    public static LawFormula Share { get; } = (x, c) => x[0] / c[0];

    /// <summary><c>a (1 - b x)^2</c>, which turns up again beyond <c>1 / b</c>.</summary>
    public static LawFormula Parabola { get; } = (x, c) =>
    {
        var left = 1 - (c[1] * x[0]);
        return c[0] * left * left;
    };

    /// <summary><c>a (304.8 / x)^b</c>, a power law of velocity in km/s written for slowness in us/ft.</summary>
    public static LawFormula SlownessPower { get; } = (x, c) => c[0] * Math.Pow(VelocityTimesSlowness / x[0], c[1]);

    /// <summary><c>10^(a + b log10 x)</c>.</summary>
    public static LawFormula Logarithmic { get; } = (x, c) => Math.Pow(10, c[0] + (c[1] * Math.Log10(x[0])));

    /// <summary><c>10^(a + b log10(x y))</c>.</summary>
    public static LawFormula LogarithmicProduct { get; } = (x, c) => Math.Pow(10, c[0] + (c[1] * Math.Log10(x[0] * x[1])));

    /// <summary><c>a x y^2 + b</c>: a line in the compressional modulus of density and velocity.</summary>
    public static LawFormula ModulusLinear { get; } = (x, c) => (c[0] * x[0] * x[1] * x[1]) + c[1];

    /// <summary><c>a exp(b x y^2)</c>: an exponential of the compressional modulus of density and velocity.</summary>
    public static LawFormula ModulusExponential { get; } = (x, c) => c[0] * Math.Exp(c[1] * x[0] * x[1] * x[1]);
}
