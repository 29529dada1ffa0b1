using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Lithology;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Prediction;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Prediction;

/// <summary>An invented vertical well from 0 to 400 m, a sample every half metre, whose shear velocity follows the other logs.</summary>
internal static class PredictionWell
{
    public const int Count = 801;

    public const double NoValue = double.NaN;

    public static double[] Depths { get; } = Make(i => 0.5 * i);

    /// <summary>Rises with depth and wavers, so that no log repeats another.</summary>
    public static double[] Vp { get; } = Make(i => 3000 + (2.0 * i) + (200 * Math.Sin(0.11 * i)));

    public static double[] ShaleVolume { get; } = Make(i => 0.5 + (0.4 * Math.Cos(0.07 * i)));

    public static double[] Vs { get; } = Make(i => (0.6 * Vp[i]) - (300 * ShaleVolume[i]));

    public static double[] Density { get; } = Make(_ => 2400);

    public static Law Trained(Property property) => TrainedRelation.For(property)!;

    public static PredictionSettings Shear(Law law) => new() { Shear = SmallWell.Chosen(law) };

    public static WellSetup Setup(PredictionSettings prediction) =>
        SmallWell.Setup with { Settings = SmallWell.Settings with { Prediction = prediction } };

    public static LogTable WellLogs(double[] vs, double[]? density = null) => SmallWell.Table(
        Depths,
        SmallWell.Curve(Property.Vp, Vp), SmallWell.Curve(Property.ShaleVolume, ShaleVolume), SmallWell.Curve(Property.Vs, vs), SmallWell.Curve(Property.Density, density ?? Density));

    /// <summary>The values without those of some samples.</summary>
    public static double[] Without(double[] values, int start, int end) => Make(i => i >= start && i < end ? NoValue : values[i]);

    public static double[] Make(Func<int, double> value) => [.. Enumerable.Range(0, Count).Select(value)];

    public static Zone Zone(string name, double top, PredictionSettings prediction) =>
        new(name, top, null, Core.Depth.DepthKind.Measured, new StageSettings { Prediction = prediction }, SmallWell.WellFile);

    /// <summary>Salt where the shale volume is at most 0.5.</summary>
    public static LithologyChoice Salt(PredictionSettings prediction) => new(
        new LithologyRule("salt", new(0, 0.5), null, null, [], SmallWell.WellFile) { Salt = true }, new StageSettings { Prediction = prediction });

    public static Setting<Law> ByRule(Law law) => SmallWell.Chosen(law, kind: SettingKind.Lithology);
}
