using MathNet.Numerics.RootFinding;

namespace DepthStress.Core.Calibration;

/// <summary>
/// A profile-likelihood interval: the values of one parameter at which chi-square, least over all others within their bounds,
/// rises by no more than a threshold. It holds where bounds are active and standard errors do not. Source: Venzon and
/// Moolgavkar 1988, Applied Statistics 37:87-94. At an active bound the true coverage is at least the nominal one.
/// </summary>
/// <param name="Low">Its lower end; the parameter's bound where <paramref name="OpenBelow"/>.</param>
/// <param name="High">Its upper end; the parameter's bound where <paramref name="OpenAbove"/>.</param>
/// <param name="OpenBelow">True where chi-square does not rise enough down to the bound, or as far as was looked.</param>
/// <param name="OpenAbove">The same upwards.</param>
public sealed record ProfileInterval(double Low, double High, bool OpenBelow, bool OpenAbove)
{
    /// <summary>The rise of chi-square for 68.27 % with one parameter (one standard deviation).</summary>
    public const double OneSigma = 1;

    /// <summary>The rise of chi-square for 95 % with one parameter: the square of 1.959964.</summary>
    public const double Percent95 = 3.841459;

    /// <summary>How often the search outwards doubles its step.</summary>
    private const int MostDoublings = 60;

    /// <summary>Finds the interval of one parameter.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="best">Its solution.</param>
    /// <param name="parameter">Index of the parameter.</param>
    /// <param name="rise">The threshold on chi-square, above zero; times the reduced chi-square where stated deviations are not trusted.</param>
    public static ProfileInterval Of(FitProblem problem, FitResult best, int parameter, double rise = OneSigma)
    {
        ArgumentNullException.ThrowIfNull(problem);
        ArgumentNullException.ThrowIfNull(best);
        if (!(rise > 0)) throw new ArgumentException("It is not above zero.", nameof(rise));
        var p = problem.Parameters[parameter];
        var (low, openBelow) = End(problem, best, parameter, rise, p.Lower, -1);
        var (high, openAbove) = End(problem, best, parameter, rise, p.Upper, 1);
        return new(low, high, openBelow, openAbove);
    }

    private static (double End, bool Open) End(FitProblem problem, FitResult best, int parameter, double rise, double bound, int sign)
    {
        var middle = best.Estimates[parameter];
        if (middle == bound) return (bound, true);
        var error = best.StandardErrors[parameter];
        var step = double.IsFinite(error) && error > 0 ? error * Math.Sqrt(rise) : problem.Parameters[parameter].Scale;
        var warm = best.Estimates;
        var inner = middle;
        for (var k = 0; k < MostDoublings; k++, step *= 2)
        {
            var outer = middle + (sign * step);
            var reachesBound = sign * (outer - bound) >= 0;
            if (reachesBound) outer = bound;
            if (Excess(outer) >= 0)
            {
                // In shares of the last step, whose size depends on the parameter's unit.
                var from = inner;
                var found = Brent.TryFindRoot(share => Excess(from + (share * (outer - from))), 0, 1, 1e-9, 200, out var root);
                return (found ? from + (root * (outer - from)) : outer, false);
            }

            if (reachesBound) return (bound, true);
            inner = outer;
        }

        return (double.IsFinite(bound) ? bound : sign * double.PositiveInfinity, true);

        double Excess(double value)
        {
            var held = BoundedFit.Solve(problem.From(warm).Holding(parameter, value));
            return held.ChiSquare - best.ChiSquare - rise;
        }
    }
}
