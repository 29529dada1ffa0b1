using MathNet.Numerics.Distributions;
using MathNet.Numerics.RootFinding;

namespace DepthStress.Core.Calibration;

/// <summary>Fits strains to readings, again and again: with others held, without one reading, with one strain at a trial value.</summary>
/// <param name="readings">The readings that depend on the strains.</param>
/// <param name="start">The strains before, along Shmin and along SHmax, group by group.</param>
/// <param name="robust">True when readings far off shall weigh less.</param>
/// <param name="strengthError">
/// Relative standard deviation of the relations that give the rock's strengths: one factor for all, estimated along.
/// </param>
internal sealed class StrainFitter(IReadOnlyList<Reading> readings, double[] start, bool robust, double strengthError)
{
    /// <summary>The model's error and the fit that it weighs are found in turn; this many turns settle them.</summary>
    private const int Turns = 60;

    /// <summary>The model's error is settled when it changes by less than this share of the smallest standard deviation.</summary>
    private const double Settled = 1e-6;

    /// <summary>No factor on strengths is sought outside these.</summary>
    private const double WeakestShare = 0.1, MostTimes = 10;

    /// <summary>The mean of min(z^2, c^2) for a normal z and Huber's constant c.</summary>
    private static double HuberShare
    {
        get
        {
            const double C = BoundedFit.HuberConstant;
            var tail = 1 - Normal.CDF(0, 1, C);
            return 1 - (2 * tail) - (2 * C * Normal.PDF(0, 1, C)) + (2 * C * C * tail);
        }
    }

    /// <summary>The best strains, with the model's error estimated.</summary>
    public StrainFit Fit(ReadOnlySpan<HeldStrain> held)
    {
        var parameters = new StrainParameters(start, held);
        var fit = Fit(parameters, readings, 0);
        for (var turn = 0; turn < Turns; turn++)
        {
            var error = ModelError(fit);
            if (Math.Abs(error - fit.ModelError) <= Settled * readings.Min(r => r.Sigma)) break;
            fit = Fit(parameters, readings, error);
        }

        return fit;
    }

    /// <summary>The least sum of squares with the observations' own standard deviations alone.</summary>
    public double OwnChiSquare(ReadOnlySpan<HeldStrain> held) => Fit(new StrainParameters(start, held), readings, 0).ChiSquare;

    /// <summary>The least sum of squares with one strain of one group held at a trial value, the model's error as it is.</summary>
    /// <param name="best">The best fit.</param>
    /// <param name="held">What the groups hold otherwise.</param>
    /// <param name="group">The group.</param>
    /// <param name="strain">What is held.</param>
    /// <param name="value">At which value.</param>
    public double ChiSquare(StrainFit best, ReadOnlySpan<HeldStrain> held, int group, HeldStrain strain, double value)
    {
        var (trial, holds) = ((double[])best.Strains.Clone(), held.ToArray());
        holds[group] = strain;
        ref var along = ref trial[2 * group];
        ref var across = ref trial[(2 * group) + 1];
        switch (strain)
        {
            case HeldStrain.AlongShmin:
                along = value;
                across = Math.Max(across, value);
                break;
            case HeldStrain.AlongShmax:
                across = value;
                along = Math.Min(along, value);
                break;
            default:
                across = along + value;
                break;
        }

        return Fit(new StrainParameters(trial, holds), readings, best.ModelError).ChiSquare;
    }

    /// <summary>What each reading is missed by, in standard deviations of a prediction, when it is left out of the fit.</summary>
    public Dictionary<Reading, double> LeaveOneOut(StrainFit best, ReadOnlySpan<HeldStrain> held)
    {
        var missed = new Dictionary<Reading, double>(ReferenceEqualityComparer.Instance);
        foreach (var reading in readings)
        {
            List<Reading> others = [.. readings.Where(r => r != reading)];
            if (others.Count(r => r.Meaning == Meaning.Value) < best.Parameters.Count) continue;
            var fit = Fit(new StrainParameters(best.Strains, held), others, best.ModelError);
            var comparison = reading.Compare(fit.Strains, best.ModelError, fit.Strength);
            missed.Add(reading, (comparison with { Sigma = double.Hypot(comparison.Sigma, PredictionError(reading, fit)) }).Residual);
        }

        return missed;
    }

    /// <summary>Readings that say something at the fit, less the parameters that it determines.</summary>
    public int DegreesOfFreedom(StrainFit fit) => readings.Count(r => Counts(r, fit)) - fit.Bound.Count(b => !b);

    private static bool Counts(Reading reading, StrainFit fit) =>
        reading.Meaning == Meaning.Value || reading.Compare(fit.Strains, fit.ModelError, fit.Strength).Residual != 0;

    private StrainFit Fit(StrainParameters parameters, IReadOnlyList<Reading> used, double modelError)
    {
        // The strengths come with one more residual: how far their factor is from one.
        var n = parameters.Count;
        var onStrength = strengthError > 0 && used.Any(r => r.OnStrength);
        void Residuals(ReadOnlySpan<double> values, Span<double> residuals)
        {
            var strains = parameters.Strains(values[..n]);
            var strength = onStrength ? values[n] : 1;
            for (var i = 0; i < used.Count; i++) residuals[i] = used[i].Compare(strains, modelError, strength).Residual;
            if (onStrength) residuals[^1] = (strength - 1) / strengthError;
        }

        List<FitParameter> all = [.. parameters.Parameters];
        if (onStrength) all.Add(new FitParameter(1, WeakestShare, MostTimes, strengthError));
        var problem = new FitProblem(all, used.Count + (onStrength ? 1 : 0), Residuals);
        var fit = robust ? BoundedFit.SolveRobust(problem) : BoundedFit.Solve(problem);
        double[] values = [.. fit.Estimates];
        bool[] bound = [.. fit.Bounds.Take(n).Select(b => b != BoundState.Free)];
        return new StrainFit(parameters, parameters.Strains(values.AsSpan(0, n)), Covariance(parameters, fit), fit.ChiSquare, bound, modelError)
        {
            Strength = onStrength ? values[n] : 1,
            StrengthError = onStrength ? fit.StandardErrors[n] : 0,
        };
    }

    /// <summary>Covariance of the strains: each is a straight function of the parameters.</summary>
    private static double[,] Covariance(StrainParameters parameters, FitResult fit)
    {
        var n = parameters.Strains([]).Length;
        var covariance = new double[n, n];
        for (var a = 0; a < n; a++)
        {
            for (var b = 0; b < n; b++)
            {
                for (var j = 0; j < parameters.Count; j++)
                {
                    for (var k = 0; k < parameters.Count; k++)
                    {
                        var weight = parameters.Slope(j, a) * parameters.Slope(k, b);
                        if (weight != 0) covariance[a, b] += weight * fit.Covariance[j, k];
                    }
                }
            }
        }

        return covariance;
    }

    /// <summary>
    /// The standard deviation of the profile's own error, Pa, that makes the sum of squares equal to the degrees of freedom; zero
    /// where the observations' own standard deviations suffice or no freedom is left.
    /// </summary>
    private double ModelError(StrainFit fit)
    {
        var freedom = DegreesOfFreedom(fit);
        var terms = readings.Where(r => Counts(r, fit)).Select(r =>
        {
            var (measured, modelled) = r.At(fit.Strains, fit.Strength);
            return (Miss: modelled - measured, r.Sigma, Leverage: r.Leverage(fit.Strains));
        }).ToList();
        // Robust: Huber's proposal 2 (Huber 1981, Robust Statistics), whose squares end where his weights begin.
        var (cap, share) = robust ? (BoundedFit.HuberConstant * BoundedFit.HuberConstant, HuberShare) : (double.PositiveInfinity, 1);
        double Excess(double error) =>
            terms.Sum(t => Math.Min(cap, t.Miss * t.Miss / ((t.Sigma * t.Sigma) + (t.Leverage * t.Leverage * error * error)))) - (share * freedom);
        if (freedom <= 0 || Excess(0) <= 0) return 0;
        var high = terms.Max(t => Math.Abs(t.Miss) / t.Leverage) * Math.Sqrt(terms.Count);
        // The solver's accuracy is one number for place and value: both are brought to the size of one.
        return high * Brent.FindRoot(x => Excess(x * high) / terms.Count, 0, 1, 1e-10, 200);
    }

    private static double PredictionError(Reading reading, StrainFit fit)
    {
        const double Step = 1e-6;
        var n = fit.Strains.Length;
        var slopes = new double[n];
        var (measured, modelled) = reading.At(fit.Strains);
        for (var k = 0; k < n; k++)
        {
            var strains = (double[])fit.Strains.Clone();
            strains[k] += Step;
            var (m, v) = reading.At(strains);
            slopes[k] = (v - m - (modelled - measured)) / Step;
        }

        double variance = 0;
        for (var a = 0; a < n; a++)
        {
            for (var b = 0; b < n; b++)
            {
                if (slopes[a] != 0 && slopes[b] != 0 && double.IsFinite(fit.Covariance[a, b])) variance += slopes[a] * fit.Covariance[a, b] * slopes[b];
            }
        }

        return Math.Sqrt(Math.Max(0, variance));
    }
}
