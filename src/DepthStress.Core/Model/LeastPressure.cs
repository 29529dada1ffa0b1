using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

namespace DepthStress.Core.Model;

/// <summary>Gives shale the normal pressure where its method gives less, where that is asked for.</summary>
internal static class LeastPressure
{
    /// <summary>Raises the pressures and lists the samples.</summary>
    public static void Apply(PropertyTable table, IReadOnlyList<SettingsRun> runs, bool[] shale, PressureOutcome outcome)
    {
        if (!runs.Any(r => r.Settings.PorePressure.AtLeastNormal.Value)) return;
        var pressure = table.Write(Property.PorePressure);
        var normal = table.Read(Property.NormalPressure);
        var raised = new bool[table.Count];
        foreach (var run in runs)
        {
            var pore = run.Settings.PorePressure;
            if (!pore.AtLeastNormal.Value || !pore.Method.IsSet || ShaleMethod.Of(pore.Method.Value) is null) continue;
            for (var i = run.Start; i < run.End; i++)
            {
                if (!shale[i] || !(pressure[i] < normal[i])) continue;
                pressure[i] = normal[i];
                raised[i] = true;
            }
        }

        if (Finding.About(Severity.Note, $"shale took the normal pressure: its method gives less", table.Read(Property.MeasuredDepth), raised) is { } finding)
            outcome.Findings.Add(finding);
    }
}
