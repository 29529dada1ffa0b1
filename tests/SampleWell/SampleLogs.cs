using System.Reflection;
using SampleWell.Hidden;
using SampleWell.Logging;
using SampleWell.Writing;

namespace SampleWell;

/// <summary>Makes the folder of a sample well: logs, survey, tests, core, well file.</summary>
public static class SampleLogs
{
    private const double UpperBit = 12.25;
    private const double LowerBit = 8.5;
    private const double UpperEnd = 2105;
    private const double LowerStart = 2098;

    /// <summary>The folder of the shipped well in the source tree.</summary>
    public static string DefaultFolder => Path.Combine(
        typeof(SampleLogs).Assembly.GetCustomAttributes<AssemblyMetadataAttribute>().First(item => item.Key == "RepoRoot").Value!, "sample-logs");

    /// <summary>Writes the shipped well.</summary>
    /// <returns>The hidden truth and what was spoiled.</returns>
    public static SampleResult Write(string folder) => Write(folder, WellPlans.Quillback4);

    /// <summary>Writes another well of the same kind, under the same file names, for tests that must not be tuned to one well.</summary>
    /// <returns>The hidden truth and what was spoiled.</returns>
    public static SampleResult Write(string folder, ulong seed) => Write(folder, WellPlans.Drawn(seed));

    /// <summary>Writes the tests of a well that was written, made again with other errors, as large as their rows state.</summary>
    public static void WriteTestsAgain(string path, SampleResult well, ulong seed) =>
        Observation.Write(path, new Observations(well.Truth, new TestIntervals(well.Truth, well.Damage), seed, asStated: true).All());

    /// <summary>The hidden truth and what sound tools read of it in both runs.</summary>
    internal static (Truth Truth, LogRun Upper, LogRun Lower) Record(WellPlan plan)
    {
        var truth = new Truth(plan);
        return (
            truth,
            Tools.Record(truth, "quillback-4-run1.csv", plan.FirstMd, UpperEnd, _ => UpperBit),
            Tools.Record(truth, "quillback-4-run2.csv", LowerStart, plan.LastMd, md => md < UpperEnd ? UpperBit : LowerBit));
    }

    private static SampleResult Write(string folder, WellPlan plan)
    {
        Directory.CreateDirectory(folder);
        var (truth, upper, lower) = Record(plan);
        var damage = Damage.Apply(upper, lower, UpperEnd, md => truth.Grid.At(truth.Rock.ShaleVolume, md), plan.Seed);
        RunCsv.Write(folder, upper);
        RunCsv.Write(folder, lower);
        LasFile.Write(Path.Combine(folder, "quillback-4.las"), "Quillback 4", plan, upper, lower);
        SurveyCsv.WriteMeasured(Path.Combine(folder, "quillback-4-survey.csv"), plan);
        Observation.Write(Path.Combine(folder, "quillback-4-observations.csv"), new Observations(truth, new TestIntervals(truth, damage), plan.Seed).All());
        CoreCsv.Write(Path.Combine(folder, "quillback-4-core.csv"), truth);
        WellFile.Write(Path.Combine(folder, "quillback-4.toml"), truth, upper, lower);
        return new SampleResult(truth, damage);
    }
}

/// <summary>What the writer of a sample well knows and the files do not say.</summary>
/// <param name="Truth">The hidden truth.</param>
/// <param name="Damage">Every spoiled stretch of every curve.</param>
public sealed record SampleResult(Truth Truth, IReadOnlyList<DamageRecord> Damage);
