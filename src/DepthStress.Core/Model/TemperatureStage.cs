using DepthStress.Core.Logs;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>The temperature of the rock: the log, or a straight line from the ground or mudline where that is chosen.</summary>
internal static class TemperatureStage
{
    /// <summary>Fills the runs whose temperature is a line; the log itself stays as it is.</summary>
    public static void Apply(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs)
    {
        if (!runs.Any(r => IsLine(r.Settings.Temperature))) return;
        var tvd = table.Read(Property.TrueVerticalDepth);
        var top = setup.Frame.SolidTopTvd;
        if (table.Has(Property.Temperature)) table.Adopt(Property.Temperature, table.Read(Property.Temperature).ToArray());
        var values = table.Write(Property.Temperature);
        foreach (var run in runs.Where(r => IsLine(r.Settings.Temperature)))
        {
            var line = run.Settings.Temperature;
            for (var i = run.Start; i < run.End; i++) values[i] = line.Surface.Value + (line.Gradient.Value * (tvd[i] - top));
        }
    }

    private static bool IsLine(TemperatureSettings settings) =>
        settings is { Source: { IsSet: true, Value: TemperatureSource.Gradient }, Surface.IsSet: true, Gradient.IsSet: true };
}
