using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>
/// Finds layer boundaries where a law gives way to another (at a zone's top or where a lithology rule begins to hold) and the
/// change of law makes more of the step than the rock does. Both laws are applied to the samples on both sides: what they differ
/// by on the same rock is the law's part of the step, the rest is the rock's.
/// </summary>
internal static class LawSwitches
{
    /// <summary>One finding per pair of laws.</summary>
    /// <param name="model">The model.</param>
    /// <param name="cells">The cells of its samples.</param>
    /// <param name="layers">The layers.</param>
    /// <param name="window">The thickness on either side that is compared, m; a boundary counts when it lies within half of it.</param>
    public static IEnumerable<Finding> At(EarthModel model, SampleCells cells, IReadOnlyList<LayerBounds> layers, double window)
    {
        var md = model.Values.Read(Property.MeasuredDepth).ToArray();
        var artefacts = new List<(LawSlot Slot, string Above, string Below, double Depth)>();
        for (var r = 1; r < model.Runs.Count; r++)
        {
            var (above, below) = (model.Runs[r - 1], model.Runs[r]);
            if (above.End != below.Start) continue;
            var switched = LawSlots.Rock.Where(s => s.Required && Differ(s.Choice(above.Settings), s.Choice(below.Settings))).ToList();
            if (switched.Count == 0) continue;
            var top = cells.Top(below.Start);
            if (!layers.Skip(1).Any(l => Math.Abs(cells.Top(l.Start) - top) <= 0.5 * window)) continue;
            foreach (var slot in switched.Where(s => IsOfLaw(model, cells, s, above, below, window)))
                artefacts.Add((slot, slot.Choice(above.Settings).Value.Id, slot.Choice(below.Settings).Value.Id, md[below.Start]));
        }

        return artefacts.GroupBy(a => (a.Slot, a.Above, a.Below)).Select(g => new Finding(
            Severity.Warning,
            $"{g.Key.Slot.Key} changes from {g.Key.Above} to {g.Key.Below} at a layer boundary, and the change of law makes more of the step there than the rock does: an artefact, not a contrast",
            g.Count(), [.. g.Select(a => new DepthRange(a.Depth, a.Depth))]));
    }

    /// <summary>True for two different laws of the rock; a constant is what the user says of it.</summary>
    private static bool Differ(Setting<Law> a, Setting<Law> b) =>
        a.IsSet && b.IsSet && a.Value.Inputs.Count > 0 && b.Value.Inputs.Count > 0 && (a.Value.Id != b.Value.Id || a.Value.Text != b.Value.Text);

    private static bool IsOfLaw(EarthModel model, SampleCells cells, LawSlot slot, SettingsRun above, SettingsRun below, double window)
    {
        var border = cells.Top(below.Start);
        var (start, end) = (above.End, below.Start);
        while (start > above.Start && border - cells.Top(start - 1) <= window) start--;
        while (end < below.End && cells.Base(end) - border <= window) end++;
        var upper = (Start: start, End: above.End);
        var lower = (below.Start, End: end);
        var (upperOwn, upperOther) = (Mean(model, slot, above, upper), Mean(model, slot, below, upper));
        var (lowerOwn, lowerOther) = (Mean(model, slot, below, lower), Mean(model, slot, above, lower));
        var law = 0.5 * (upperOther - upperOwn + lowerOwn - lowerOther);
        var rock = 0.5 * (lowerOther - upperOwn + lowerOwn - upperOther);
        return Math.Abs(law) > Math.Abs(rock);
    }

    /// <summary>Mean of a run's law on some samples, wherever they lie; NaN when it gives nothing there.</summary>
    private static double Mean(EarthModel model, LawSlot slot, SettingsRun run, (int Start, int End) samples)
    {
        var law = slot.Choice(run.Settings).Value;
        var values = new double[samples.End - samples.Start];
        if (values.Length == 0) return double.NaN;
        LawKernel.Apply(law, LawColumns.For(law, model.Values, run with { Start = samples.Start, End = samples.End }), values);
        return values.Where(v => !double.IsNaN(v)).DefaultIfEmpty(double.NaN).Average();
    }
}
