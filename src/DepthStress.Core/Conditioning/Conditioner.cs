using DepthStress.Core.Logs;

namespace DepthStress.Core.Conditioning;

/// <summary>Samples [Start, End) and how they are conditioned.</summary>
/// <param name="Start">First sample.</param>
/// <param name="End">One past the last sample.</param>
/// <param name="Settings">The resolved settings.</param>
public readonly record struct ConditioningRun(int Start, int End, ConditioningSettings Settings);

/// <summary>What one step did to one curve.</summary>
/// <param name="Name">The step, as the origins name it.</param>
/// <param name="Property">The curve.</param>
/// <param name="Samples">True where it changed something.</param>
public sealed record ConditioningStep(string Name, Property Property, bool[] Samples);

/// <summary>Conditioned logs, and what was done to them.</summary>
/// <param name="Logs">The logs.</param>
/// <param name="Steps">What each chosen step did, in order.</param>
/// <param name="Removals">Impossible samples that were taken out besides.</param>
public sealed record ConditionedLogs(LogTable Logs, IReadOnlyList<ConditioningStep> Steps, IReadOnlyList<SampleRemoval> Removals);

/// <summary>
/// Conditions logs in this order: depth shifts, parked ends, smear at gap edges, spikes, washouts, impossible samples (always),
/// short gaps. Every changed sample is marked with its origin and step; nothing else changes.
/// </summary>
public sealed class Conditioner
{
    private readonly IReadOnlyList<ConditioningRun> _runs;
    private readonly List<ConditioningStep> _steps = [];
    private LogTable _logs;

    private Conditioner(LogTable logs, IReadOnlyList<ConditioningRun> runs) => (_logs, _runs) = (logs, runs);

    /// <summary>Applies every step that the settings ask for.</summary>
    /// <param name="logs">The logs as read.</param>
    /// <param name="runs">Settings by sample, in order and covering every sample.</param>
    public static ConditionedLogs Apply(LogTable logs, IReadOnlyList<ConditioningRun> runs)
    {
        ArgumentNullException.ThrowIfNull(logs);
        ArgumentNullException.ThrowIfNull(runs);
        var conditioner = new Conditioner(logs, runs);
        conditioner.Shift();
        conditioner.TakeOut("parked tool", s => s.Parked.Value, (_, _) => true, (_, curve, _) => ParkedTool.Mark(curve.Values, curve.Origins));
        conditioner.TakeOut("smeared at the edge of a gap", s => s.NullSmear.Value, (_, _) => true, (_, _, values) => NullSmear.Mark(values));
        conditioner.TakeOut(
            "spike",
            s => s.Spikes,
            (s, curve) => s is { Window.IsSet: true, Threshold.IsSet: true, Curves.IsSet: true } && s.Curves.Value.Contains(curve.Role.Id),
            (s, _, values) => SpikeFilter.Mark(logs.Depths, values, s.Window.Value, s.Threshold.Value));
        conditioner.TakeOut(
            "washout", s => s.Washout, (s, curve) => s.Rule.IsSet && curve.Role.Property == Property.Density, (s, _, _) => conditioner.Washouts(s));
        (conditioner._logs, var removals) = ImpossibleSamples.Remove(conditioner._logs);
        conditioner.FillGaps();
        return new ConditionedLogs(conditioner._logs, conditioner._steps, removals);
    }

    private bool[] Washouts(WashoutSettings settings) => Washout.Mark(
        _logs[Property.Caliper]?.Values, _logs[Property.BitSize]?.Values, _logs[Property.DensityCorrection]?.Values, settings, _logs.Count);

    private void Shift()
    {
        if (_runs.Count == 0 || !_runs[0].Settings.Shifts.IsSet) return;
        foreach (var (role, by) in _runs[0].Settings.Shifts.Value)
        {
            if (_logs.Curves.FirstOrDefault(c => c.Role.Id == role) is not { } curve) continue;
            var property = curve.Role.Property;
            var moved = MeasuredScale.Convert(property, DepthShift.Move(_logs.Depths, MeasuredScale.Convert(property, curve.Values), by));
            var origins = OriginTrack.Of(moved, SampleOrigin.Edited, DepthShift.Name);
            _logs = _logs.With(curve with { Values = moved, Origins = origins });
            _steps.Add(new ConditioningStep(DepthShift.Name, property, Array.ConvertAll(moved, v => !double.IsNaN(v))));
        }
    }

    /// <summary>Takes out what a step marks on each curve; marks are found on the whole curve and hold where their setting does.</summary>
    private void TakeOut<T>(
        string name, Func<ConditioningSettings, T> choose, Func<T, Curve, bool> applies, Func<T, Curve, double[], bool[]> mark)
        where T : notnull
    {
        var choices = _runs.Select(r => choose(r.Settings)).Where(c => c is not false).Distinct().ToArray();
        if (choices.Length == 0) return;
        foreach (var curve in _logs.Curves.Where(c => MeasuredScale.IsContinuous(c.Role.Property)).ToArray())
        {
            var marks = new bool[_logs.Count];
            foreach (var choice in choices.Where(c => applies(c, curve)))
            {
                var found = mark(choice, curve, MeasuredScale.Convert(curve.Role.Property, curve.Values));
                foreach (var run in _runs.Where(r => choose(r.Settings).Equals(choice)))
                {
                    for (var i = run.Start; i < run.End; i++) marks[i] = found[i] && !double.IsNaN(curve.Values[i]);
                }
            }

            if (!marks.Contains(true)) continue;
            var values = (double[])curve.Values.Clone();
            for (var i = 0; i < values.Length; i++)
            {
                if (marks[i]) values[i] = double.NaN;
            }

            _steps.Add(new ConditioningStep(name, curve.Role.Property, marks));
            _logs = _logs.With(curve with { Values = values, Origins = curve.Origins.Mark(marks, SampleOrigin.Edited, "taken out: " + name) });
        }
    }

    private void FillGaps()
    {
        if (!_runs.Any(r => r.Settings.FillGaps is { IsSet: true, Value: > 0 })) return;
        var longest = new double[_logs.Count];
        foreach (var run in _runs) Array.Fill(longest, run.Settings.FillGaps.IsSet ? run.Settings.FillGaps.Value : 0, run.Start, run.End - run.Start);
        foreach (var curve in _logs.Curves.Where(c => MeasuredScale.IsContinuous(c.Role.Property)).ToArray())
        {
            var property = curve.Role.Property;
            var (bridged, filled) = ShortGaps.Fill(_logs.Depths, MeasuredScale.Convert(property, curve.Values), longest);
            if (!filled.Contains(true)) continue;
            var back = MeasuredScale.Convert(property, bridged);
            var values = (double[])curve.Values.Clone();
            for (var i = 0; i < values.Length; i++)
            {
                if (filled[i]) values[i] = back[i];
            }

            const string Name = "short gap";
            _steps.Add(new ConditioningStep(Name, property, filled));
            _logs = _logs.With(curve with { Values = values, Origins = curve.Origins.Mark(filled, SampleOrigin.Filled, "short gap bridged") });
        }
    }
}
