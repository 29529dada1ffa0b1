using System.Text;
using DepthStress.Files.Reading;

namespace DepthStress.Tests.Reading;

public class EncodingTests
{
    private static readonly string LasText = $"{LogReading.LasHead}WELL. Bl\u00e5b\u00e6r 7:\n~C\nDEPT.m:\nDT.\u00b5s/m:\n~A\n1 300.5\n2 x\u00b5\n";

    private static LogReading Read(Encoding encoding, bool mark, string text, string name, LogEncoding? stated = null) => LogReading.Bytes(
        [.. mark ? encoding.GetPreamble() : [], .. encoding.GetBytes(text)], name, new LogReadOptions { Csv = new CsvOptions { Encoding = stated } });

    public static TheoryData<string, bool> Utf16 => new() { { "utf-16", true }, { "utf-16", false }, { "utf-16BE", true }, { "utf-16BE", false } };

    [Theory]
    [MemberData(nameof(Utf16))]
    public void Las_in_utf16_keeps_names_units_and_places(string encoding, bool mark)
    {
        var read = Read(Encoding.GetEncoding(encoding), mark, LasText, "a.las");
        Assert.Equal(["a.las(12,3): error: column \"DT\": found \"x\u00b5\", expected a number"], read.Errors);
        var sound = Read(Encoding.GetEncoding(encoding), mark, LasText.Replace("2 x\u00b5\n", "", StringComparison.Ordinal), "a.las");
        Assert.Equal(("Bl\u00e5b\u00e6r 7", "\u00b5s/m"), (sound.File!.WellName!, sound.File.Columns[1].Unit!));
        Assert.EndsWith("byte first), read as such", Assert.Single(sound.Messages), StringComparison.Ordinal);
    }

    [Fact]
    public void A_lone_surrogate_in_utf16_does_no_harm()
    {
        byte[] bytes = [.. Encoding.Unicode.GetPreamble(), .. Encoding.Unicode.GetBytes("DEPT,G"), 0x00, 0xD8, .. Encoding.Unicode.GetBytes("R\n1,2\n")];
        Assert.Equal(["DEPT", "G\ufffdR"], LogReading.Bytes(bytes, "a.csv").File!.Columns.Select(c => c.Name));
    }

    // 0x80 is the euro sign in code page 1252 and a control character in Latin-1.
    [Fact]
    public void Names_that_are_no_utf8_are_read_by_code_page_1252()
    {
        var read = LogReading.Bytes([.. "DEPT,C["u8, 0x80, .. "]\n1,2\n"u8], "a.csv");
        Assert.Equal("\u20ac", read.File!.Columns[1].Unit);
    }

    [Fact]
    public void A_stated_code_page_makes_its_bytes_no_matter()
    {
        var windows = CodePagesEncodingProvider.Instance.GetEncoding(1252)!;
        var file = Read(windows, false, "DEPT,DT[\u00b5s/m]\n1,2\n", "a.csv", LogEncoding.Windows1252).Clean();
        Assert.Equal("\u00b5s/m", file.Columns[1].Unit);
    }

    [Fact]
    public void A_stated_utf16_is_read_without_a_note() =>
        Assert.Equal(1, Read(Encoding.Unicode, false, "DEPT,DT\n1,2\n", "a.csv", LogEncoding.Utf16LittleEndian).Clean().Rows);

    [Fact]
    public void A_stated_utf8_makes_other_bytes_an_error()
    {
        var read = LogReading.Bytes([.. "DEPT,C["u8, 0x80, .. "]\n1,2\n"u8], "a.csv", new LogReadOptions { Csv = new CsvOptions { Encoding = LogEncoding.Utf8 } });
        Assert.Equal(["a.csv(1): error: found bytes that are not UTF-8, expected UTF-8 as the well file says"], read.Errors);
    }

    [Fact]
    public void A_mark_that_contradicts_the_stated_encoding_is_an_error() =>
        Read(Encoding.Unicode, true, "DEPT,DT\n1,2\n", "a.csv", LogEncoding.Utf8).IsRefusedWith(
            "a.csv(1,1): error: found UTF-16 (low byte first), expected UTF-8 as the well file says");

    [Fact]
    public void A_stated_encoding_holds_for_csv_alone() =>
        Assert.NotNull(Read(Encoding.Unicode, true, LasText.Replace("2 x\u00b5\n", "", StringComparison.Ordinal), "a.las", LogEncoding.Windows1252).File);
}
