using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using DepthStress.Tests.WellFiles;

namespace DepthStress.Tests.Ingest;

/// <summary>Reads logs through a well file whose [logs] section and log files a test gives.</summary>
internal static class Ingesting
{
    public static (LogTable? Logs, string[] Messages) Read(string section, params (string Name, string Text)[] files)
    {
        using var folder = new TestFolder();
        var path = folder.Write("well.toml", WellText.With("[logs]\nfiles = [\"logs.csv\"]\n", "") + section);
        foreach (var (name, text) in files) folder.Write(name, text);
        var diagnostics = new DiagnosticBag();
        var well = WellFileReader.Read(path, diagnostics)!;
        var wrongAlready = diagnostics.HasErrors;
        var logs = LogIngest.Read(well, diagnostics);
        Assert.True(wrongAlready || diagnostics.HasErrors == logs is null, "errors go with no logs, and logs with no errors");
        return (logs?.Logs, [.. diagnostics.Items.Select(d => d.ToString())]);
    }

    /// <summary>Reads one file <c>a.csv</c>, with lines for [logs.curves].</summary>
    public static (LogTable? Logs, string[] Messages) One(string text, string curves = "") =>
        Read($"[logs]\nfiles = [\"a.csv\"]\n[logs.curves]\n{curves}\n", ("a.csv", text));

    /// <summary>Reads <c>a.csv</c> and <c>b.csv</c>, with lines for [logs.curves].</summary>
    public static (LogTable? Logs, string[] Messages) Two(string a, string b, string curves = "") =>
        Read($"[logs]\nfiles = [\"a.csv\", \"b.csv\"]\n[logs.curves]\n{curves}\n", ("a.csv", a), ("b.csv", b));

    /// <summary>A log of one column from a top in steps.</summary>
    public static string Csv(string column, double top, double step, params IEnumerable<double> values) => FormattableString.Invariant($"DEPT[m],{column}\n")
        + string.Concat(values.Select((v, i) => FormattableString.Invariant($"{top + (i * step)},{v}\n")));

    /// <summary>Origins as <c>start-end origin step</c>.</summary>
    public static string[] Origins(this Curve curve) =>
        [.. curve.Origins.Runs.Select(r => FormattableString.Invariant($"{r.Start}-{r.End} {r.Origin} {r.Step}").TrimEnd())];
}
