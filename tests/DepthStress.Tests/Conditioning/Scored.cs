using DepthStress.Core.Conditioning;
using DepthStress.Core.Logs;
using SampleWell.Logging;
using static DepthStress.Tests.Model.SmallWell;
using LogCurve = DepthStress.Core.Logs.Curve;
using SampleCurve = SampleWell.Logging.Curve;

namespace DepthStress.Tests.Conditioning;

/// <summary>Brings a spoilt run to the program as its file would, and says which samples are spoilt.</summary>
internal static class Scored
{
    /// <summary>A density that is off by no more than three standard deviations of the tool (0.007 g/cm3) is not spoilt.</summary>
    public const double SoundDensity = 0.021;

    public static ConditioningSettings Settings(double threshold) => new()
    {
        Parked = Chosen(true),
        NullSmear = Chosen(true),
        Spikes = new SpikeSettings
        {
            Window = Chosen(3.0),
            Threshold = Chosen(threshold),
            Curves = Chosen<IReadOnlyList<string>>(["compressional", "shear", "density", "gamma_ray"]),
        },
        Washout = new WashoutSettings
        {
            CaliperExcess = Chosen(0.0254),
            DensityCorrection = Chosen(25.0),
            Rule = Chosen(WashoutRule.Both),
        },
    };

    public static ConditionedLogs Condition(LogTable logs, ConditioningSettings settings) =>
        Conditioner.Apply(logs, [new ConditioningRun(0, logs.Count, settings)]);

    /// <summary>The curves in SI, rounded to the digits of the file.</summary>
    public static LogTable Table(LogRun run) => new(
        [.. Enumerable.Range(0, run.Count).Select(run.Md)],
        SampleCurve.All.Select(curve => Read(curve, run.Curves[curve.Name])));

    public static string Name(Property property) => SampleCurve.All.First(c => c.Role == CurveRoles.Of(property)!.Id).Name;

    /// <summary>True where a curve was changed by more than its file shows, and density by more than its tool's unrest.</summary>
    public static Dictionary<string, bool[]> Spoilt(GradedRun run)
    {
        var spoilt = run.Spoilt.Curves.Keys.ToDictionary(name => name, _ => new bool[run.Spoilt.Count]);
        foreach (var record in run.Damage)
        {
            for (var i = record.First; i < record.First + record.Count; i++)
            {
                spoilt[record.Curve][i] = record.Kind != DamageKind.Washout
                    || Math.Abs(run.Spoilt.Curves[record.Curve][i] - run.Clean.Curves[record.Curve][i]) > SoundDensity;
            }
        }

        return spoilt;
    }

    private static LogCurve Read(SampleCurve curve, double[] values)
    {
        var role = CurveRoles.Find(curve.Role)!;
        var si = Array.ConvertAll(values, value => value == SampleCurve.Missing ? double.NaN : Si(curve.Unit, Math.Round(value, curve.Decimals)));
        return new LogCurve(role, curve.Name, si, OriginTrack.Of(si, SampleOrigin.Measured, curve.Name));
    }

    private static double Si(string unit, double value) => unit switch
    {
        "us/ft" => 304800 / value,
        "g/cm3" => 1000 * value,
        "in" => 0.0254 * value,
        _ => value,
    };
}
