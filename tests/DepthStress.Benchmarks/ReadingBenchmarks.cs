using System.Globalization;
using System.Text;
using BenchmarkDotNet.Attributes;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;

namespace DepthStress.Benchmarks;

/// <summary>Reading log files of twelve columns, beside a bare loop over the lines of the same bytes.</summary>
[MemoryDiagnoser]
public class ReadingBenchmarks
{
    private const int Columns = 12;
    private readonly string _folder = Directory.CreateTempSubdirectory("depthstress-").FullName;

    [Params(15_000, 1_000_000)]
    public int Rows { get; set; }

    [GlobalSetup]
    public void Setup()
    {
        var names = string.Join(',', Enumerable.Range(1, Columns - 1).Select(c => $"C{c.ToString(CultureInfo.InvariantCulture)}"));
        Write("plain.csv", $"DEPT[m],{names}\n", ',');
        Write("semicolons.csv", $"DEPT[m];{names.Replace(',', ';')}\n", ';');
        var head = new StringBuilder("~V\nVERS. 2.0 :\nWRAP. NO :\n~W\nNULL. -999.25 :\n~C\nDEPT.m :\n");
        foreach (var name in names.Split(',')) head.Append(name).Append(". :\n");
        Write("plain.las", $"{head}~A\n", ' ');
        Write("wrapped.las", $"{head.Replace("WRAP. NO", "WRAP. YES")}~A\n", '\n');
        File.WriteAllText(PathOf("utf16.csv"), File.ReadAllText(PathOf("plain.csv")), Encoding.Unicode);
    }

    [GlobalCleanup]
    public void Cleanup() => Directory.Delete(_folder, recursive: true);

    [Benchmark(Baseline = true)]
    public long ReadLine()
    {
        using var reader = new StreamReader(PathOf("plain.csv"));
        var length = 0L;
        while (reader.ReadLine() is { } line) length += line.Length;
        return length;
    }

    [Benchmark]
    public int Csv() => Read("plain.csv");

    [Benchmark]
    public int CsvSemicolons() => Read("semicolons.csv");

    [Benchmark]
    public int CsvUtf16() => Read("utf16.csv");

    [Benchmark]
    public int Las() => Read("plain.las");

    [Benchmark]
    public int LasWrapped() => Read("wrapped.las");

    private int Read(string name) => LogFileReader.Read(PathOf(name), name, new LogReadOptions(), new DiagnosticBag())!.Rows;

    private string PathOf(string name) => Path.Combine(_folder, name);

    private void Write(string name, string head, char delimiter)
    {
        using var writer = new StreamWriter(PathOf(name));
        writer.Write(head);
        for (var r = 0; r < Rows; r++)
        {
            writer.Write((900 + (0.1524 * r)).ToString("F4", CultureInfo.InvariantCulture));
            for (var c = 1; c < Columns; c++)
            {
                writer.Write(delimiter);
                writer.Write((((r * 7919L) + (c * 104_729L)) % 1_000_000 / 1000.0).ToString("F3", CultureInfo.InvariantCulture));
            }

            writer.Write('\n');
        }
    }
}
