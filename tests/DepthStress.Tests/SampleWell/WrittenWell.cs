using System.Globalization;
using SampleWell;
using SampleWell.Logging;

namespace DepthStress.Tests.SampleWell;

/// <summary>A sample well written into a folder of its own, and its log files read back; the folder goes away with it.</summary>
internal sealed class WrittenWell : IDisposable
{
    private readonly Dictionary<string, LogTextFile> logs = [];

    private WrittenWell(Func<string, SampleResult> write)
    {
        Folder = Directory.CreateTempSubdirectory("sample-well-").FullName;
        Result = write(Folder);
    }

    public string Folder { get; }

    public SampleResult Result { get; }

    public static WrittenWell Shipped() => new(SampleLogs.Write);

    public static WrittenWell Other(ulong seed) => new(folder => SampleLogs.Write(folder, seed));

    public LogTextFile Log(string file)
    {
        if (!logs.TryGetValue(file, out var log))
            logs[file] = log = new LogTextFile(Path.Combine(Folder, file));
        return log;
    }

    /// <summary>The values of a spoiled stretch, as they stand in the file.</summary>
    public double[] Values(DamageRecord record) => Log(record.File).Between(record.Curve, record.Start, record.End);

    public void Dispose() => Directory.Delete(Folder, recursive: true);
}

/// <summary>A log file as its text says it: names without units, numbers by column.</summary>
internal sealed class LogTextFile
{
    private readonly string[] names;
    private readonly double[][] rows;

    public LogTextFile(string path)
    {
        var lines = File.ReadAllLines(path);
        names = [.. lines[0].Split(',').Select(name => name[..name.IndexOf('[', StringComparison.Ordinal)])];
        rows = [.. lines.Skip(1).Select(line => line.Split(',').Select(cell => double.Parse(cell, CultureInfo.InvariantCulture)).ToArray())];
    }

    public int Count => rows.Length;

    public double[] Column(string name)
    {
        var index = Array.IndexOf(names, name);
        return [.. rows.Select(row => row[index])];
    }

    public double[] Between(string name, double top, double bottom)
    {
        var index = Array.IndexOf(names, name);
        return [.. rows.Where(row => row[0] > top - 0.01 && row[0] < bottom + 0.01).Select(row => row[index])];
    }
}
