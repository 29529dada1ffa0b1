using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Tells shale from sand for the methods that know the pressure of shale alone.</summary>
internal static class ShaleSamples
{
    /// <summary>The words for what sands may take.</summary>
    private const string SandWords = "[pore_pressure] sands = \"shale\" (from the shale above and below), \"table\" or \"fluid line\"";

    /// <summary>True for shale: at or above the cut-off where one is set, of the named lithologies where some are; all where neither is.</summary>
    public static bool[] Mark(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, PressureOutcome outcome)
    {
        var shale = new bool[table.Count];
        var volume = table.Read(Property.ShaleVolume);
        var all = new SortedSet<string>(StringComparer.Ordinal);
        foreach (var run in runs)
        {
            var pore = run.Settings.PorePressure;
            var marks = shale.AsSpan(run.Start, run.Length);
            marks.Fill(!pore.ShaleLithologies.IsSet || (run.Lithology >= 0 && pore.ShaleLithologies.Value.Contains(setup.Lithologies[run.Lithology].Rule.Name)));
            if (pore.ShaleCutoff.IsSet)
            {
                for (var i = 0; i < marks.Length; i++) marks[i] &= !volume.IsEmpty && volume[run.Start + i] >= pore.ShaleCutoff.Value;
            }

            if (pore.Method.IsSet && ShaleMethod.Of(pore.Method.Value) is { } method && Check(run, method, table, marks, outcome)) all.Add(method.Law.Id);
        }

        if (all.Count > 0)
        {
            outcome.Findings.Add(Finding.General(
                Severity.Note, $"every sample was taken as shale by {string.Join(", ", all)}: nothing tells sand from shale; set [shale] volume and [pore_pressure] shale_cutoff, or shale_lithologies"));
        }

        return shale;
    }

    /// <summary>Reports what is not settled; true when every sample passes for shale.</summary>
    private static bool Check(in SettingsRun run, ShaleMethod method, PropertyTable table, ReadOnlySpan<bool> marks, PressureOutcome outcome)
    {
        var pore = run.Settings.PorePressure;
        var volume = table.Read(Property.ShaleVolume);
        if (!pore.ShaleCutoff.IsSet && !pore.ShaleLithologies.IsSet)
        {
            if (volume.IsEmpty || !AnyNumber(volume.Slice(run.Start, run.Length))) return true;
            outcome.Problems.Add((pore.Method.Source.Position, $"{method.Law.Id} tells the pressure of shale, and shale volume is known: expected [pore_pressure] shale_cutoff, such as 0.5, or shale_lithologies"));
            return false;
        }

        if (pore.ShaleCutoff.IsSet && volume.IsEmpty)
            outcome.Problems.Add((pore.ShaleCutoff.Source.Position, $"[pore_pressure] shale_cutoff needs a shale volume, expected [shale] volume or a curve of it"));
        if (pore.Sands.IsSet) return false;
        var sv = table.Read(Property.VerticalStress).Slice(run.Start, run.Length);
        for (var i = 0; i < marks.Length; i++)
        {
            if (marks[i] || double.IsNaN(sv[i])) continue;
            var first = Quantity.Length(table.Read(Property.MeasuredDepth)[run.Start + i]);
            // Said once for the settings, at the first depth.
            if (!outcome.Problems.Exists(p => p.Position == pore.Method.Source.Position && p.Text.Format.Contains("is not shale", StringComparison.Ordinal)))
                outcome.Problems.Add((pore.Method.Source.Position, $"{method.Law.Id} tells the pressure of shale, and the rock at {first} measured depth is not shale: expected {SandWords}"));
            break;
        }

        return false;
    }

    private static bool AnyNumber(ReadOnlySpan<double> values)
    {
        foreach (var value in values)
        {
            if (!double.IsNaN(value)) return true;
        }

        return false;
    }
}
