using System.Text;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

/// <summary>Reads log files given as text or bytes, and keeps what was said about them.</summary>
internal sealed record LogReading(LogFile? File, DiagnosticBag Bag)
{
    public const string LasHead = "~V\nVERS. 2.0 :\nWRAP. NO :\n~W\nNULL. -999.25 :\n";

    public string[] Messages => [.. Bag.Items.Select(d => d.ToString())];

    public string[] Errors => [.. Bag.Items.Where(d => d.Severity == Severity.Error).Select(d => d.ToString())];

    public static LogReading Csv(string text, LogReadOptions? options = null) => Bytes(Encoding.UTF8.GetBytes(text), "a.csv", options);

    public static LogReading Las(string text, LogReadOptions? options = null) => Bytes(Encoding.UTF8.GetBytes(text), "a.las", options);

    public static LogReading Bytes(byte[] bytes, string name, LogReadOptions? options = null) =>
        From(() => new MemoryStream(bytes), name, options);

    public static LogReading From(Func<Stream> open, string name, LogReadOptions? options = null)
    {
        var bag = new DiagnosticBag();
        var file = LogFileReader.Read(open, name, options ?? new LogReadOptions(), bag);
        Assert.Equal(file is null, bag.HasErrors);
        return new LogReading(file, bag);
    }

    public static LogReading AtPath(string path)
    {
        var bag = new DiagnosticBag();
        return new LogReading(LogFileReader.Read(path, "a.csv", new LogReadOptions(), bag), bag);
    }

    /// <summary>The file, after asserting that nothing at all was said about it.</summary>
    public LogFile Clean()
    {
        Assert.Empty(Messages);
        return Assert.IsType<LogFile>(File);
    }

    /// <summary>Asserts that the file was refused with exactly these messages.</summary>
    public void IsRefusedWith(params string[] messages)
    {
        Assert.Equal(messages, Messages);
        Assert.Null(File);
    }

    public LogColumn Column(string name) => File!.Columns.Single(c => c.Name == name);
}
