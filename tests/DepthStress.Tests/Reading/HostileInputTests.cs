using System.Globalization;
using System.Text;

namespace DepthStress.Tests.Reading;

/// <summary>Files made to bring a reader down.</summary>
public class HostileInputTests
{
    private const string Curves = "~C\nDEPT.m:\nGR.:\n~A\n";

    /// <summary>Reads a made-up file and asserts that it costs no more than 64 MB and fifty times its size, or the room given.</summary>
    private static LogReading Read(string name, string start, string piece, long pieces, string end = "", long? room = null)
    {
        byte[] Bytes(string text) => Encoding.UTF8.GetBytes(text);
        using var stream = new EndlessStream(Bytes(start), Bytes(piece), pieces, Bytes(end));
        var before = GC.GetAllocatedBytesForCurrentThread();
        var read = LogReading.From(() => stream, name);
        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, room ?? (64L << 20) + (50 * stream.Length));
        return read;
    }

    [Theory]
    [InlineData("a.csv", "DEPT,GR\n1,")]
    [InlineData("a.csv", "DEPT GR\n1 2\n2 ")]
    [InlineData("a.csv", "")]
    [InlineData("a.las", "")]
    [InlineData("a.las", LogReading.LasHead + Curves + "1 ")]
    [InlineData("a.las", "~V\nVERS. 2.0:\nWRAP. YES:\n" + Curves + "1\n")]
    public void A_line_of_a_gigabyte_is_refused_without_being_held(string name, string start)
    {
        var read = Read(name, start, "7777777777777777", 1 << 26, room: 64 << 20);
        Assert.EndsWith("error: found a line of more than 1 MiB, expected a line for each depth", read.Errors[0], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("a.csv", "DEPT,GR\n", "1,2\n")]
    [InlineData("a.csv", "DEPT GR\n", "1 2\n")]
    [InlineData("a.las", LogReading.LasHead + Curves, "1 2\n")]
    [InlineData("a.las", "~V\nVERS. 2.0:\nWRAP. YES:\n~W\nNULL. -1:\n" + Curves, "1\n2\n")]
    public void Ten_million_empty_lines_take_no_room(string name, string start, string end)
    {
        var read = Read(name, start, "\n", 10_000_000, end, room: 128 << 20);
        Assert.Equal(1, read.File!.Rows);
    }

    [Fact]
    public void A_million_columns_in_one_row_are_refused_as_a_line_too_long() => Assert.Equal(
        ["a.csv(1): error: found a line of more than 1 MiB, expected a line for each depth"], Read("a.csv", "DEPT", ",GR", 1_000_000, "\n1\n").Errors);

    [Fact]
    public void A_million_curves_are_refused_and_a_tenth_can_be_wrapped()
    {
        const string head = "~V\nVERS. 2.0:\nWRAP. YES:\n~W\nNULL. -1:\n~C\nDEPT.m:\n";
        Assert.Equal(["a.las(100007): error: found more than 100000 curves, expected fewer"], Read("a.las", head, "G.:\n", 1_000_000).Errors);
        var read = Read("a.las", head, "G.:\n", 99_999, $"~A\n1\n{string.Concat(Enumerable.Repeat("2\n", 99_999))}");
        Assert.Equal(100_000, read.File!.Columns.Count);
        Assert.Contains(read.Messages, m => m.EndsWith("and 99979 more names of columns were made or changed", StringComparison.Ordinal));
    }

    [Fact]
    public void A_million_odd_header_lines_are_counted_not_listed()
    {
        var read = Read("a.las", "~V\nVERS. 2.0:\nWRAP. NO:\n~W\nNULL. -1:\n", "no dot\n", 1_000_000, Curves + "1 2\n");
        Assert.Equal(21, read.Messages.Length);
        Assert.Equal("a.las: warning: and 999980 more odd lines in the header", read.Messages[^1]);
    }

    [Fact]
    public void A_million_wrong_rows_are_counted_not_listed()
    {
        foreach (var (name, start) in new[] { ("a.csv", "DEPT,GR\n1,2\n"), ("a.las", LogReading.LasHead + Curves), ("a.csv", "DEPT GR\n1 2\n") })
        {
            Assert.Equal(21, Read(name, start, "x\n", 1_000_000).Errors.Length);
        }
    }

    [Fact]
    public void Sections_without_end_are_passed_over()
    {
        var read = Read("a.las", LogReading.LasHead + Curves + "1 2\n", "~Tops\n", 100_000);
        Assert.Equal(1, read.File!.Rows);
        Assert.Equal("a.las: note: and 99980 more sections are not read", read.Messages[^1]);
    }

    // What a terminal, a spreadsheet, a page or a format string could take for more than text.
    [Theory]
    [InlineData("G\u0007\u001b[31mR", "G[31mR")]
    [InlineData("<script>alert(1)</script>", "<script>alert(1)</script>")]
    [InlineData("=HYPERLINK(1)", "=HYPERLINK(1)")]
    [InlineData("{0:X}%s", "{0:X}%s")]
    [InlineData("\u202eRG", "\u202eRG")]
    public void Names_are_kept_as_text_without_control_characters(string name, string expected)
    {
        Assert.StartsWith(expected.Split('(')[0], LogReading.Csv($"DEPT,{name}\n1,2\n").File!.Columns[1].Name, StringComparison.Ordinal);
        Assert.Equal(expected, LogReading.Las($"{LogReading.LasHead}~C\nDEPT.m:\n{name}. :\n~A\n1 2\n").File!.Columns[1].Name);
        Assert.DoesNotContain(LogReading.Csv($"DEPT,{name}\n1,{name}\n").Messages, m => m.Any(char.IsControl));
    }

    [Fact]
    public void Numbers_of_any_length_are_read_or_refused()
    {
        var digits = new string('9', 400);
        LogReading.Csv($"DEPT,GR\n1,{digits}\n").IsRefusedWith(
            $"a.csv(2,3): error: column \"GR\": found \"{digits[..40]}...\", expected a number");
        Assert.Equal(
            [double.Parse("0." + digits, CultureInfo.InvariantCulture)], LogReading.Csv($"DEPT,GR\n1,0.{digits}\n").Clean().Columns[1].Values);
    }
}
