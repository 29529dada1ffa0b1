using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Prediction;

namespace DepthStress.Core.Model;

/// <summary>Predictions by published relations and by the user's own, with their misfit against what the well has logged.</summary>
internal static class PublishedPrediction
{
    /// <summary>Fewer logged samples say nothing about a relation's error.</summary>
    private const int LeastCompared = 30;

    /// <summary>Fills what such relations were chosen for.</summary>
    public static void Fill(PredictionGap gap, PropertyTable table, List<LawUse> uses)
    {
        foreach (var parts in gap.Missing.Where(m => !TrainedRelation.Is(m.Law)).GroupBy(m => m.Law))
        {
            var law = parts.Key;
            var error = Misfit(gap, table, law);
            var words = law.Standing == Standing.UserGiven ? $"{law.Text} {law.Unit.Symbol}".TrimEnd() : law.Id;
            var samples = new List<int>();
            var predicted = new List<double>();
            foreach (var (run, _, missing) in parts)
            {
                var values = new double[missing.Length];
                uses.Add(new LawUse(gap.Slot, law, run.Zone, run.Lithology, LawKernel.Apply(law, LawColumns.At(law, table, run, missing), values)));
                samples.AddRange(missing);
                predicted.AddRange(values);
            }

            gap.Put(law, words, error, [.. samples], [.. predicted], new bool[samples.Count]);
        }
    }

    /// <summary>
    /// Root of the mean squared misfit against logged samples where the same relation is chosen, or, where those are too few,
    /// against the whole well's; missing when nothing is logged. A mean misfit counts: the prediction carries it.
    /// </summary>
    private static double Misfit(PredictionGap gap, PropertyTable table, Law law)
    {
        var (chosen, anywhere) = (default(Sum), default(Sum));
        foreach (var run in gap.Runs)
        {
            var logged = Enumerable.Range(run.Start, run.Length).Where(i => gap.Logged[i]).ToArray();
            if (logged.Length == 0) continue;
            var values = new double[logged.Length];
            LawKernel.Apply(law, LawColumns.At(law, table, run, logged), values);
            var sum = Sum.Of(values, logged, gap.Values);
            anywhere = anywhere.Plus(sum);
            if (gap.Slot.Choice(run.Settings) is { IsSet: true } choice && choice.Value == law) chosen = chosen.Plus(sum);
        }

        return chosen.Count >= LeastCompared ? chosen.Root : anywhere.Count >= LeastCompared ? anywhere.Root : double.NaN;
    }

    private readonly record struct Sum(int Count, double Squares)
    {
        public double Root => Math.Sqrt(Squares / Count);

        public Sum Plus(Sum other) => new(Count + other.Count, Squares + other.Squares);

        public static Sum Of(double[] predicted, int[] samples, double[] logged)
        {
            var sum = default(Sum);
            for (var k = 0; k < samples.Length; k++)
            {
                var miss = predicted[k] - logged[samples[k]];
                if (!double.IsNaN(miss)) sum = sum.Plus(new(1, miss * miss));
            }

            return sum;
        }
    }
}
