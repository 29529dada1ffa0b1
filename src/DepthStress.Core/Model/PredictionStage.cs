using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Shear velocity and density where they are not logged, as chosen; logged values are never touched.</summary>
internal static class PredictionStage
{
    /// <summary>Fills density, then porosity as far as shear needs it, then shear velocity.</summary>
    /// <returns>The logs with what was predicted, and what that was.</returns>
    public static (LogTable Logs, IReadOnlyList<Prediction> Predictions) Apply(
        WellSetup setup, LogTable logs, PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses, List<Finding> findings)
    {
        if (!runs.Any(r => LawSlots.Prediction.Any(s => s.Choice(r.Settings).IsSet))) return (logs, []);
        LawColumns.Derive(table, runs);
        var predictions = new List<Prediction>();
        var filled = logs;
        foreach (var slot in LawSlots.Prediction)
        {
            var gap = new PredictionGap(setup, slot, logs, table, runs);
            if (gap.Count == 0) continue;
            // Counted later, where it is computed again with the density that fills end up with.
            if (slot.Property == Property.Vs) LawStage.Apply(LawSlots.Porosity, table, runs, []);
            PublishedPrediction.Fill(gap, table, uses);
            TrainedPrediction.Fill(gap, logs, table, uses, findings);
            if (Finding.About(Severity.Warning, gap.Impossible, logs.Depths, gap.Refused) is { } finding) findings.Add(finding);
            if (gap.Predictions.Count == 0) continue;
            filled = filled.With(gap.Curve());
            table.Adopt(slot.Property, gap.Values);
            table.Adopt(gap.ErrorProperty, gap.Errors);
            predictions.AddRange(gap.Predictions);
        }

        return (filled, predictions);
    }
}
