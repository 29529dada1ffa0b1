using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Prediction;

/// <summary>Samples to learn from, in order of depth.</summary>
/// <param name="Scope">What they are, in words.</param>
/// <param name="Rows">The samples.</param>
/// <param name="Zones">The zone of each, when whole zones are to be left out in turn; else null.</param>
public sealed record TrainingSet(string Scope, int[] Rows, short[]? Zones);

/// <summary>A relation trained for the samples that have its predictors.</summary>
/// <param name="Law">The relation.</param>
/// <param name="Error">Its cross-validated standard error, SI.</param>
/// <param name="Scope">What it was trained on, in words.</param>
/// <param name="Samples">The samples it is for.</param>
public sealed record TrainedFit(Law Law, double Error, string Scope, int[] Samples);

/// <summary>
/// Trains relations for missing samples: one for each set of logs that is there over them, on the zone's own samples where
/// they are enough, else on the whole well's. A prepare stage.
/// </summary>
public sealed class Trainer
{
    /// <summary>A sample this many robust standard deviations off the line is a spike, not rock.</summary>
    private const double SpikeLimit = 6;

    /// <summary>Standard deviation of normal errors over the median of their sizes.</summary>
    private const double DeviationOverMedian = 1.4826;

    private const int TrimRounds = 10;

    private readonly Law _choice;
    private readonly LawInput[] _candidates;
    private readonly double[][] _columns;
    private readonly double[] _target;
    private readonly double _step;

    /// <summary>Takes the columns to learn from.</summary>
    /// <param name="choice">The choice to train.</param>
    /// <param name="candidates">What the relation may start from.</param>
    /// <param name="columns">The logged values of each candidate, SI; what no rock has is not looked at.</param>
    /// <param name="target">The logged values of what is predicted, SI.</param>
    /// <param name="step">The usual distance between samples, m.</param>
    public Trainer(Law choice, LawInput[] candidates, double[][] columns, double[] target, double step)
    {
        ArgumentNullException.ThrowIfNull(choice);
        ArgumentNullException.ThrowIfNull(candidates);
        ArgumentNullException.ThrowIfNull(columns);
        (_choice, _candidates, _step) = (choice, candidates, step);
        _target = Array.ConvertAll(Credible(target, choice.Predicts), choice.Unit.FromSi);
        _columns = [.. columns.Select((c, k) => Array.ConvertAll(Credible(c, candidates[k].Property), candidates[k].Unit.FromSi))];
    }

    /// <summary>Trains what the missing samples need; samples without compressional velocity, or with too little to learn from, are left out.</summary>
    /// <param name="missing">The samples to be predicted.</param>
    /// <param name="sets">Where to learn, the best first.</param>
    public IEnumerable<TrainedFit> Fit(int[] missing, params TrainingSet[] sets)
    {
        foreach (var group in missing.GroupBy(i => Present(i)).OrderByDescending(g => g.Count()))
        {
            // The first candidate is the compressional velocity: without it nothing else tells enough.
            if ((group.Key & 1) == 0) continue;
            var chosen = Enumerable.Range(0, _candidates.Length).Where(k => (group.Key & (1 << k)) != 0).ToArray();
            foreach (var set in sets)
            {
                if (Fit(chosen, set) is not { } fit) continue;
                yield return fit with { Samples = [.. group] };
                break;
            }
        }
    }

    private TrainedFit? Fit(int[] chosen, TrainingSet set)
    {
        // A predictor that does not vary or repeats another tells nothing: the last goes first.
        for (; chosen.Length > 0; chosen = chosen[..^1])
        {
            var kept = Enumerable.Range(0, set.Rows.Length).Where(i => !double.IsNaN(_target[set.Rows[i]]) && chosen.All(k => !double.IsNaN(_columns[k][set.Rows[i]]))).ToArray();
            kept = WithoutSpikes(kept, chosen, set.Rows);
            if (Folds(set, kept) is not { } folds) continue;
            var (columns, target) = Gather(kept, chosen, set.Rows);
            if (LinearRegression.Fit(columns, target) is not { } line) continue;
            var error = BlockedValidation.Error(columns, target, folds);
            if (double.IsNaN(error)) continue;
            LawInput[] inputs = [.. chosen.Select((k, c) => _candidates[k].Within(columns[c].Min(), columns[c].Max()))];
            return new TrainedFit(TrainedRelation.From(_choice, inputs, line, set.Scope), error * _choice.Unit.Factor, set.Scope, []);
        }

        return null;
    }

    /// <summary>Leaves out rows far off the line, again and again until none is: least squares would follow a spike anywhere.</summary>
    private int[] WithoutSpikes(int[] kept, int[] chosen, int[] rows)
    {
        for (var round = 0; round < TrimRounds; round++)
        {
            var (columns, target) = Gather(kept, chosen, rows);
            if (LinearRegression.Fit(columns, target) is not { } line) return kept;
            var misses = target.Select((t, i) => Math.Abs(t - line.At(columns, i))).ToArray();
            var limit = SpikeLimit * DeviationOverMedian * MathNet.Numerics.Statistics.ArrayStatistics.MedianInplace([.. misses]);
            var near = kept.Where((_, i) => !(misses[i] > limit)).ToArray();
            if (near.Length == kept.Length) return kept;
            kept = near;
        }

        return kept;
    }

    private (double[][] Columns, double[] Target) Gather(int[] kept, int[] chosen, int[] rows) =>
        ([.. chosen.Select(k => Array.ConvertAll(kept, i => _columns[k][rows[i]]))], Array.ConvertAll(kept, i => _target[rows[i]]));

    /// <summary>The values that rock can have.</summary>
    private static double[] Credible(double[] values, Property property) =>
        CurveRoles.Of(property) is { } role ? Array.ConvertAll(values, v => v >= role.TypicalLow && v <= role.TypicalHigh ? v : double.NaN) : values;

    /// <summary>Whole zones where there are at least three of some length and the set asks for it, else blocks of depth; null when rows are too few.</summary>
    private int[]? Folds(TrainingSet set, int[] kept)
    {
        var blocks = BlockedValidation.Blocks(kept.Length, _step);
        if (blocks < BlockedValidation.Least) return null;
        if (set.Zones is { } zones)
        {
            var byZone = Array.ConvertAll(kept, i => (int)zones[i]);
            if (byZone.GroupBy(z => z).Count(g => g.Count() * _step >= BlockedValidation.BlockLength) >= 3) return byZone;
        }

        return BlockedValidation.Contiguous(kept.Length, blocks);
    }

    private int Present(int sample)
    {
        var present = 0;
        for (var k = 0; k < _columns.Length; k++)
        {
            if (!double.IsNaN(_columns[k][sample])) present |= 1 << k;
        }

        return present;
    }
}
