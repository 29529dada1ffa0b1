using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using MathNet.Numerics.Distributions;

namespace DepthStress.Core.Calibration;

/// <summary>
/// The constant shift of core depths that lets the plugs' moduli follow the model's best. A factor between the two is left free,
/// so that a law that is too stiff throughout does not move the core.
/// </summary>
/// <param name="Shift">The best shift, m, added to core depths.</param>
/// <param name="Gain">Share of the squared misfit that it takes away, 0 to 1.</param>
/// <param name="Low">Least shift that fits no worse at 95 %, m.</param>
/// <param name="High">Greatest such shift, m.</param>
/// <param name="Plugs">Number of plugs.</param>
/// <param name="Determined">True when no shift at all fits worse at 95 % and the best one lies inside the limit.</param>
public sealed record CoreDepthMatch(double Shift, double Gain, double Low, double High, int Plugs, bool Determined)
{
    /// <summary>Fewer plugs than this cannot tell.</summary>
    public const int FewestPlugs = 4;

    private const double Step = 0.05;

    /// <summary>Looks for the shift; null for too few plugs with a modulus and a model at every shift within the limit.</summary>
    /// <param name="plugs">Plugs that may be pooled.</param>
    /// <param name="at">The model.</param>
    /// <param name="limit">The greatest shift either way, m, above zero.</param>
    public static CoreDepthMatch? Find(IReadOnlyList<CorePlug> plugs, PlugDepth at, double limit)
    {
        ArgumentNullException.ThrowIfNull(plugs);
        ArgumentNullException.ThrowIfNull(at);
        var steps = (int)Math.Floor((limit / Step) + 1e-9);
        var shifts = Enumerable.Range(-steps, (2 * steps) + 1).Select(k => k * Step).ToArray();
        var usable = plugs.Where(p => !double.IsNaN(p.YoungsStatic) && shifts.All(s => !double.IsNaN(at.At(Property.YoungsStatic, p.Depth + s)))).ToList();
        if (usable.Count < FewestPlugs) return null;
        var misfits = shifts.Select(s => Misfit(usable, at, s)).ToArray();
        var (best, none) = (Array.IndexOf(misfits, misfits.Min()), misfits[steps]);
        // The region where a parameter more does not pay, for the factor and the shift (Student's t squared is F of one and n - 2).
        var t = StudentT.InvCDF(0, 1, usable.Count - 2, 0.975);
        var most = misfits[best] * (1 + (t * t / (usable.Count - 2)));
        var fitting = Enumerable.Range(0, shifts.Length).Where(k => misfits[k] <= most).ToList();
        return new CoreDepthMatch(
            shifts[best], none > 0 ? 1 - (misfits[best] / none) : 0, shifts[fitting[0]], shifts[fitting[^1]], usable.Count,
            none > most && best > 0 && best < shifts.Length - 1);
    }

    private static double Misfit(List<CorePlug> plugs, PlugDepth at, double shift)
    {
        double[] x = [.. plugs.Select(p => at.At(Property.YoungsStatic, p.Depth + shift))], y = [.. plugs.Select(p => p.YoungsStatic)];
        var factor = SimpleFit.ThroughOrigin(x, y)!.Value.Value;
        return x.Zip(y).Sum(p => (p.Second - (factor * p.First)) * (p.Second - (factor * p.First)));
    }
}
