using System.Globalization;
using DepthStress.Core.Conditioning;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>Conditions the logs zone by zone and says what was done.</summary>
internal static class ConditioningStage
{
    /// <summary>Gives the conditioned logs; what was done goes to the findings.</summary>
    public static LogTable Apply(WellSetup setup, LogTable logs, ReadOnlySpan<short> zones, List<Finding> findings)
    {
        var lithologies = new short[logs.Count];
        Array.Fill(lithologies, LithologyIndex.None);
        var runs = SettingsRun.Resolve(setup, zones, lithologies).Select(r => new ConditioningRun(r.Start, r.End, r.Settings.Conditioning)).ToArray();
        var conditioned = Conditioner.Apply(logs, runs);
        foreach (var removal in conditioned.Removals)
        {
            if (Finding.About(Severity.Warning, $"{removal.Reason}: taken out", logs.Depths, removal.Samples) is { } finding) findings.Add(finding);
        }

        foreach (var step in conditioned.Steps.GroupBy(s => s.Name))
        {
            var touched = new bool[logs.Count];
            foreach (var curve in step)
            {
                for (var i = 0; i < touched.Length; i++) touched[i] |= curve.Samples[i];
            }

            if (Finding.About(Severity.Note, $"conditioning, {step.Key}: {Counts(step)}", logs.Depths, touched) is { } finding) findings.Add(finding);
        }

        foreach (var wash in runs.Select(r => r.Settings.Washout).Where(w => w.Rule.IsSet && w.Rule.Value != WashoutRule.None).Distinct())
        {
            var noCaliper = logs[Property.Caliper] is null || logs[Property.BitSize] is null;
            if (wash.CaliperExcess.IsSet && noCaliper)
                findings.Add(Finding.General(Severity.Warning, $"[conditioning] washout caliper_excess has no effect: no caliper or no bit size"));
            if (wash.DensityCorrection.IsSet && logs[Property.DensityCorrection] is null)
                findings.Add(Finding.General(Severity.Warning, $"[conditioning] washout density_correction has no effect: no density correction"));
        }

        return conditioned.Logs;
    }

    private static string Counts(IEnumerable<ConditioningStep> steps) =>
        string.Join(", ", steps.Select(s => string.Create(CultureInfo.InvariantCulture, $"{CurveRoles.Of(s.Property)!.Id} {s.Samples.Count(m => m)}")));
}
