using MathNet.Numerics.RootFinding;

namespace DepthStress.Core.Calibration;

/// <summary>
/// The uncertainty of estimated strains: from the covariance where no bound is active, else from the profile of the sum of
/// squares, since ordinary standard errors are not valid at a bound.
/// </summary>
internal sealed class StrainIntervals(StrainFitter fitter, StrainFit best, HeldStrain[] held, double quantile)
{
    /// <summary>No interval reaches further than this from the estimate.</summary>
    private const double Farthest = 0.02;

    /// <summary>Ends of intervals are found to this share of the farthest reach, 0.02 nanostrain.</summary>
    private const double Accuracy = 1e-9;

    /// <summary>The estimate of a group.</summary>
    /// <param name="group">The group.</param>
    /// <param name="g">Its number.</param>
    /// <param name="start">The strains before, NaN where there are none.</param>
    public StrainEstimate Of(StrainGroup group, int g, double[] start)
    {
        var (along, across) = (2 * g, (2 * g) + 1);
        var bound = best.Parameters.OfGroup(g).Any(k => best.Bound[k]);
        var c = best.Covariance;
        var (varianceAlong, varianceAcross, both) = (c[along, along], c[across, across], c[along, across]);
        var alongShmin = Of(g, HeldStrain.AlongShmin, best.Strains[along], varianceAlong, start[along], bound);
        var alongShmax = Of(g, HeldStrain.AlongShmax, best.Strains[across], varianceAcross, start[across], bound);
        var difference = Of(
            g, HeldStrain.Difference, best.Strains[across] - best.Strains[along], varianceAlong + varianceAcross - (2 * both), start[across] - start[along], bound);
        var correlation = held[g] == HeldStrain.None && !bound ? both / Math.Sqrt(varianceAlong * varianceAcross) : double.NaN;
        var error = double.IsNaN(alongShmax.StandardError) ? (alongShmax.High - alongShmax.Low) / (2 * quantile) : alongShmax.StandardError;
        var separated = held[g] != HeldStrain.None
            || (!(Math.Abs(correlation) > StrainEstimate.LargestCorrelation) && error <= StrainEstimate.LargestError);
        return new StrainEstimate(group, alongShmin, alongShmax, difference, correlation, separated);
    }

    private Estimate Of(int g, HeldStrain strain, double value, double variance, double start, bool bound)
    {
        if (held[g] == strain) return new Estimate(value, 0, value, value, start) { Held = true };
        if (!bound)
        {
            var error = Math.Sqrt(variance);
            return new Estimate(value, error, value - (quantile * error), value + (quantile * error), start);
        }

        var lowest = strain == HeldStrain.Difference ? 0 : value - Farthest;
        return new Estimate(value, double.NaN, End(g, strain, value, lowest), End(g, strain, value, value + Farthest), start) { AtBound = true };
    }

    /// <summary>Where, towards a limit, the sum of squares has grown by the square of the quantile.</summary>
    private double End(int g, HeldStrain strain, double value, double limit)
    {
        // A second strain that is held takes no part: the profile runs over what is left.
        var level = best.ChiSquare + (quantile * quantile);
        double Excess(double trial) => fitter.ChiSquare(best, held, g, strain, trial) - level;
        if (Math.Abs(limit - value) <= Accuracy || Excess(limit) <= 0) return limit;
        return value + ((limit - value) * Brent.FindRoot(share => Excess(value + (share * (limit - value))), 0, 1, Accuracy, 200));
    }
}
