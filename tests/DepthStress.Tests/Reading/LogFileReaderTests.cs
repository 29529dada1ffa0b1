using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using DepthStress.Core.Diagnostics;
using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public sealed class LogFileReaderTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("depthstress-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void A_missing_file_is_told() =>
        LogReading.AtPath(Path.Combine(_folder, "b.csv")).IsRefusedWith("a.csv: error: file not found");

    [Fact]
    public void A_file_in_a_missing_folder_is_told() =>
        LogReading.AtPath(Path.Combine(_folder, "c", "b.csv")).IsRefusedWith("a.csv: error: file not found");

    [Fact]
    public void A_folder_is_told() => LogReading.AtPath(_folder).IsRefusedWith("a.csv: error: found a folder, expected a log file");

    [Fact]
    public void An_empty_name_is_told() =>
        LogReading.AtPath("").IsRefusedWith("a.csv: error: found a name that cannot be a path, expected the path of a log file");

    [Fact]
    public void A_refused_permission_is_told() => LogReading.From(() => throw new UnauthorizedAccessException("x"), "a.csv")
        .IsRefusedWith("a.csv: error: no permission to read the file");

    [Fact]
    public void A_failing_disk_is_told() => LogReading.From(() => throw new IOException("bad\nsector"), "a.csv")
        .IsRefusedWith("a.csv: error: the file cannot be read: badsector");

    [Theory]
    [InlineData("")]
    [InlineData("\n \r\n\t\n")]
    [InlineData("\ufeff")]
    public void An_empty_file_is_told(string text) =>
        LogReading.Csv(text).IsRefusedWith("a.csv: error: found an empty file, expected a CSV or LAS log file");

    [Theory]
    [InlineData(false, false)]
    [InlineData(false, true)]
    [InlineData(true, false)]
    [InlineData(true, true)]
    public void Utf16_is_read_with_and_without_a_mark_and_noted(bool bigEndian, bool mark)
    {
        var encoding = new UnicodeEncoding(bigEndian, mark);
        byte[] bytes = [.. encoding.GetPreamble(), .. encoding.GetBytes("DEPT,GR\n1,2\n")];
        var read = LogReading.Bytes(bytes, "a.csv");
        Assert.Equal([2], read.Column("GR").Values);
        Assert.Equal((bytes.Length, Convert.ToHexStringLower(SHA256.HashData(bytes))), ((int)read.File!.Bytes, read.File.Sha256));
        Assert.Equal([$"a.csv(1): note: found UTF-16 ({(bigEndian ? "high" : "low")} byte first), read as such"], read.Messages);
    }

    [Fact]
    public void Binary_data_are_told_with_their_line() =>
        LogReading.Csv("DEPT,GR\n1,2\n2,\0\n").IsRefusedWith("a.csv(3): error: found a NUL byte (binary data), expected text");

    [Fact]
    public void Binary_data_far_down_are_told_with_their_line()
    {
        var text = new StringBuilder("DEPT,GR\r\n");
        for (var i = 1; i <= 50_000; i++) text.Append(i).Append(",1\r\n");
        LogReading.Csv(text.Append('\0').ToString())
            .IsRefusedWith("a.csv(50002): error: found a NUL byte (binary data), expected text");
    }

    [Theory]
    [InlineData("a.las", "~V\n", LogFormat.Las)]
    [InlineData("a.csv", "~V\n", LogFormat.Las)]
    [InlineData("a.txt", "# note\n\n  ~Version\n", LogFormat.Las)]
    [InlineData("a", "~W\n", LogFormat.Las)]
    public void Las_is_told_by_its_content(string name, string start, LogFormat format)
    {
        var read = LogReading.Bytes(Encoding.UTF8.GetBytes($"{start}~C\nDEPT.m:\n~A\n1\n"), name);
        Assert.Equal(format, read.File!.Format);
    }

    [Theory]
    [InlineData("a.csv")]
    [InlineData("a.txt")]
    [InlineData("a")]
    public void Anything_else_is_read_as_csv(string name) =>
        Assert.Equal(LogFormat.Csv, LogReading.Bytes("DEPT,GR\n1,2\n"u8.ToArray(), name).File!.Format);

    [Fact]
    public void The_extension_decides_where_the_content_does_not() =>
        Assert.StartsWith("a.LAS(1,1): error: found \"DEPT,GR\" before the first section", LogReading.Bytes("DEPT,GR\n1,2\n"u8.ToArray(), "a.LAS").Errors[0], StringComparison.Ordinal);

    [Theory]
    [InlineData(1)]
    [InlineData(60_000)]
    public void Size_and_hash_are_those_of_the_file_in_both_formats(int rows)
    {
        var lines = string.Concat(Enumerable.Range(1, rows).Select(i => FormattableString.Invariant($"{i}#{i * 0.25}\n")));
        foreach (var (name, text) in new[]
        {
            ("a.csv", "DEPT,GR\n" + lines.Replace('#', ',')),
            ("a.las", LogReading.LasHead + "~C\nDEPT.m:\nGR.:\n~A\n" + lines.Replace('#', ' ')),
        })
        {
            var path = Path.Combine(_folder, name);
            File.WriteAllText(path, text);
            var bag = new DiagnosticBag();
            var file = LogFileReader.Read(path, "given", new LogReadOptions(), bag)!;
            Assert.Empty(bag.Items);
            Assert.Equal("given", file.Name);
            Assert.Equal(text.Length, file.Bytes);
            Assert.Equal(Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text))), file.Sha256);
            Assert.Equal(Enumerable.Range(1, rows).Select(i => i * 0.25), file.Columns[1].Values);
        }
    }

    [Fact]
    public void A_million_empty_lines_cost_no_room_and_keep_the_line_numbers()
    {
        var empty = new string('\n', 1_000_000);
        Assert.Equal(1, LogReading.Csv($"DEPT,GR{empty}1,2{empty}").Clean().Rows);
        LogReading.Csv($"DEPT,GR{empty}1,x{empty}")
            .IsRefusedWith("a.csv(1000001,3): error: column \"GR\": found \"x\", expected a number");
        LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m:\n~A{empty}x{empty}")
            .IsRefusedWith("a.las(1000008,1): error: column \"DEPT\": found \"x\", expected a number");
        LogReading.Csv(empty).IsRefusedWith("a.csv: error: found no header row, expected the names of the columns");
    }

    [Fact]
    public void The_culture_of_the_machine_does_not_matter()
    {
        var before = CultureInfo.CurrentCulture;
        var comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        (comma.NumberFormat.NumberDecimalSeparator, comma.NumberFormat.NegativeSign) = (",", "~");
        try
        {
            CultureInfo.CurrentCulture = comma;
            Assert.Equal([-1.5, 2.25], LogReading.Csv("DEPT,GR\n1.5,-1.5\n2.5,22500000000000000000000000e-25\n").Clean().Columns[1].Values);
            Assert.Equal(
                ["a.csv(3): note: depth decreases throughout (from 1.5 to -1.5), the rows are turned round"],
                LogReading.Csv("DEPT,GR\n1.5,1\n-1.5,1\n").Messages);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Ten_thousand_columns_are_read()
    {
        var names = string.Join(',', Enumerable.Range(0, 10_000).Select(i => FormattableString.Invariant($"C{i}")));
        var row = string.Join(',', Enumerable.Repeat("5", 10_000));
        Assert.Equal(10_001, LogReading.Csv($"DEPT,{names}\n1,{row}\n2,{row}\n").Clean().Columns.Count);
    }
}
