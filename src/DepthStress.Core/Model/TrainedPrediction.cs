using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Prediction;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Predictions by relations trained on the well's own samples, zone by zone.</summary>
internal static class TrainedPrediction
{
    /// <summary>Fills what the trained relation was chosen for; says where too little is logged to train one.</summary>
    /// <param name="gap">What is missing.</param>
    /// <param name="logs">The logs as read: a relation starts from no prediction.</param>
    /// <param name="table">The columns.</param>
    /// <param name="uses">Gets the relations.</param>
    /// <param name="findings">Gets what could not be trained.</param>
    public static void Fill(PredictionGap gap, LogTable logs, PropertyTable table, List<LawUse> uses, List<Finding> findings)
    {
        var missing = gap.Missing.Where(m => TrainedRelation.Is(m.Law)).ToList();
        if (missing.Count == 0) return;
        var shale = table.Read(Property.ShaleVolume).ToArray();
        var candidates = TrainedRelation.Predictors(gap.Property, Array.Exists(shale, v => !double.IsNaN(v)));
        var columns = candidates.Select(c => c.Property == Property.ShaleVolume ? shale : logs[c.Property]?.Values ?? PredictionGap.NoValues(logs.Count)).ToArray();
        var trainer = new Trainer(missing[0].Law, candidates, columns, gap.Values, Step(logs.Depths));

        var zones = new short[logs.Count];
        foreach (var run in gap.Runs) Array.Fill(zones, run.Zone, run.Start, run.Length);
        var logged = Enumerable.Range(0, logs.Count).Where(i => gap.Logged[i]).ToArray();
        var whole = new TrainingSet("the whole well", logged, Array.ConvertAll(logged, i => zones[i]));
        var untrained = new bool[logs.Count];
        foreach (var zone in missing.GroupBy(m => m.Run.Zone))
        {
            int[] samples = [.. zone.SelectMany(m => m.Samples)];
            var own = new TrainingSet(
                zone.Key < 0 ? "the samples outside zones" : $"zone {gap.ZoneName(zone.Key)}", [.. logged.Where(i => zones[i] == zone.Key)], null);
            foreach (var i in samples) untrained[i] = !double.IsNaN(columns[0][i]);
            // Without zones the whole well is one, and its error comes from blocks of depth.
            foreach (var fit in trainer.Fit(samples, gap.Runs.All(r => r.Zone < 0) ? [whole with { Zones = null }] : [own, whole]))
            {
                foreach (var i in fit.Samples) untrained[i] = false;
                Put(gap, fit, candidates, columns, zone.Key, uses);
            }
        }

        if (Finding.About(
            Severity.Warning,
            $"{gap.Slot.Key} = \"{TrainedRelation.Id}\": {logged.Length} logged samples are too few to train on, expected logs over at least {Quantity.Length(BlockedValidation.Least * BlockedValidation.BlockLength)}; nothing is predicted",
            logs.Depths, untrained) is { } finding)
        {
            findings.Add(finding);
        }
    }

    private static void Put(PredictionGap gap, TrainedFit fit, LawInput[] candidates, double[][] columns, short zone, List<LawUse> uses)
    {
        var inputs = default(LawInputs);
        var beyond = new bool[fit.Samples.Length];
        foreach (var input in fit.Law.Inputs)
        {
            var column = columns[Array.FindIndex(candidates, c => c.Property == input.Property)];
            var values = Array.ConvertAll(fit.Samples, i => column[i]);
            for (var k = 0; k < values.Length; k++) beyond[k] |= !input.Range.Contains(input.Unit.FromSi(values[k]));
            inputs.Add(values);
        }

        var predicted = new double[fit.Samples.Length];
        uses.Add(new LawUse(gap.Slot, fit.Law, zone, -1, LawKernel.Apply(fit.Law, inputs, predicted)));
        gap.Put(fit.Law, fit.Law.Title, fit.Error, fit.Samples, predicted, beyond);
    }

    private static double Step(double[] depths) =>
        depths.Length < 2 ? 0 : MathNet.Numerics.Statistics.ArrayStatistics.MedianInplace([.. depths.Zip(depths.Skip(1), (a, b) => b - a)]);
}
