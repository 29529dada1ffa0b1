using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using MathNet.Numerics.Statistics;

namespace DepthStress.Core.Model;

/// <summary>
/// Whether logs that should agree do, in plain words. The bounds are common practice; nothing is changed by them.
/// </summary>
public static class Plausibility
{
    /// <summary>Vp/Vs of consolidated and soft rock (common practice).</summary>
    private const double LowRatio = 1.4, HighRatio = 3.0;

    /// <summary>Poisson's ratio that sonic logs give in rock (common practice).</summary>
    private const double LowPoisson = 0.05, HighPoisson = 0.45;

    /// <summary>How far density may lie from what velocity suggests, kg/m3 (common practice).</summary>
    private const double DensityMisfit = 250;

    /// <summary>The statements that the model's curves allow.</summary>
    public static IReadOnlyList<FormattableString> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var (vp, vs) = (SampleMarks.Column(model, Property.Vp), SampleMarks.Column(model, Property.Vs));
        var statements = new List<FormattableString>();
        if (Known(Pairs(vp, vs, (p, s) => p / s)) is { Length: > 0 } ratios)
        {
            statements.Add(
                $"Vp/Vs: median {Round(ratios, 50)}, nine tenths between {Round(ratios, 5)} and {Round(ratios, 95)}; {Share(ratios, r => r is < LowRatio or > HighRatio)} outside {LowRatio}-{HighRatio}");
        }

        if (Known(SampleMarks.Column(model, Property.PoissonDynamic)) is { Length: > 0 } poisson)
        {
            statements.Add(
                $"dynamic Poisson's ratio: median {Round(poisson, 50)}, nine tenths between {Round(poisson, 5)} and {Round(poisson, 95)}; {Share(poisson, n => n is < LowPoisson or > HighPoisson)} outside {LowPoisson}-{HighPoisson}");
        }

        // The assumed density above the log says nothing about the tool.
        var density = model.Logs[Property.Density]?.Values ?? [];
        if (density.Length > 0 && Known(Pairs(density, vp, (d, v) => d - Gardner(v))) is { Length: > 0 } misfits)
        {
            statements.Add(
                $"density against Gardner's density from velocity: median difference {new Quantity(misfits.Percentile(50), Dimension.Density)}; {Share(misfits, m => Math.Abs(m) > DensityMisfit)} further than {new Quantity(DensityMisfit, Dimension.Density)} apart");
        }

        return statements;
    }

    /// <summary>
    /// Density that velocity suggests: <c>0.31 V^0.25</c>, g/cm3 and m/s (Gardner, Gardner and Gregory 1974, Geophysics 39,
    /// 770-780), in kg/m3.
    /// </summary>
    internal static double Gardner(double velocity) => 310 * Math.Pow(velocity, 0.25);

    private static double[] Pairs(double[] a, double[] b, Func<double, double, double> of)
    {
        var pairs = new double[a.Length];
        for (var i = 0; i < pairs.Length; i++) pairs[i] = of(a[i], b[i]);
        return pairs;
    }

    private static double[] Known(double[] values) => Array.FindAll(values, double.IsFinite);

    private static string Round(double[] values, int percent) => FormattableString.Invariant($"{values.Percentile(percent):F2}");

    private static string Share(double[] values, Predicate<double> odd) =>
        FormattableString.Invariant($"{100.0 * Array.FindAll(values, odd).Length / values.Length:F1} %");
}
