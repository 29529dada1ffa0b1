using DepthStress.Core.Diagnostics;

namespace DepthStress.Tests.Reading;

/// <summary>
/// The rules for header lines and sections of the standard: Canadian Well Logging Society, LAS version 2.0, a digital
/// standard for logs (rules given in own words, from memory; example values are our own).
/// </summary>
public class LasHeaderReferenceTests
{
    private static LogReading Read(string curve, string sections = "") =>
        LogReading.Las($"{LogReading.LasHead}{sections}~C\nDEPT.m : depth\n{curve}\n~A\n1 2\n");

    // Rule "mnemonic": up to the first dot, blanks around it do not count.
    // Rule "units": directly after the first dot, up to the first blank; may hold dots and slashes, may be absent.
    // Rule "data": after that blank, up to the last colon; may hold blanks, dots and colons.
    // Rule "description": after the last colon.
    [Theory]
    [InlineData("GR.gAPI 30 310 01 00 : gamma ray", "GR", "gAPI", "gamma ray")]
    [InlineData("  GR  .gAPI   :  gamma ray  ", "GR", "gAPI", "gamma ray")]
    [InlineData("RDEP .ohm.m : deep", "RDEP", "ohm.m", "deep")]
    [InlineData("GR. : gamma ray", "GR", null, "gamma ray")]
    [InlineData("GR.gAPI: gamma ray", "GR", "gAPI", "gamma ray")]
    [InlineData("GR.gAPI a:b 10:30:05 : gamma ray", "GR", "gAPI", "gamma ray")]
    [InlineData("GR.gAPI :", "GR", "gAPI", "")]
    [InlineData("GR.\tgAPI : gamma ray", "GR", null, "gamma ray")]
    [InlineData("LONG_NAME_OF_2020 ._ : gamma.ray", "LONG_NAME_OF_2020", "_", "gamma.ray")]
    public void Header_lines_are_split_at_first_dot_first_blank_and_last_colon(string line, string name, string? unit, string description)
    {
        var column = Read(line).Clean().Columns[1];
        Assert.Equal((name, unit, description), (column.Name, column.Unit, column.Description));
    }

    [Theory]
    [InlineData("WELL. Bramble 7 : WELL", "Bramble 7")]
    [InlineData("WELL . 12:30 no. 4 : WELL", "12:30 no. 4")]
    [InlineData("well. Bramble 7 :", "Bramble 7")]
    [InlineData("WELL. : WELL", null)]
    [InlineData("FLD. Bramble : FIELD", null)]
    public void The_name_of_the_well_is_the_data_of_its_line(string line, string? name) =>
        Assert.Equal(name, LogReading.Las($"{LogReading.LasHead}{line}\n~C\nDEPT.m :\n~A\n1\n").Clean().WellName);

    // Rule "sections": a line whose first non-blank character is ~; the letter after it tells which, the rest is free.
    [Theory]
    [InlineData("~Version\n", "~Well\n", "~Curve\n", "~Ascii\n")]
    [InlineData("~V\n", "~W\n", "~C\n", "~A\n")]
    [InlineData("  ~version information\n", "~well block\n", " ~curves\n", "~A  DEPTH  GR\n")]
    public void Sections_are_told_by_their_first_letter(string v, string w, string c, string a)
    {
        var file = LogReading.Las($"{v}VERS. 2.0:\nWRAP. NO:\n{w}NULL. -1:\n{c}DEPT.m:\nGR.:\n{a}1 2\n2 -1\n").Clean();
        Assert.Equal([2, double.NaN], file.Columns[1].Values);
        Assert.Equal(-1, file.NullValue);
    }

    // Rule "~P and ~O": parameters and free text; nothing in them is data.
    [Fact]
    public void Parameters_and_other_text_are_passed_over() => Read("GR.:", "~P\nBS.in 8.5 : bit\nno dot here\n~O\nany text: 1 2 3\n").Clean();

    // Rule "comments": a line whose first non-blank character is #.
    [Fact]
    public void Comments_and_empty_lines_are_passed_over_anywhere()
    {
        var file = LogReading.Las("# a\n\n" + LogReading.LasHead + "#b\n~C\n  # c\nDEPT.m:\n\n~A\n#d\n1\n\n # e\n2\n#f\n").Clean();
        Assert.Equal([1, 2], file.Columns[0].Values);
    }

    // Rule "index": the first curve is the index.
    [Fact]
    public void The_first_curve_is_the_depth_whatever_its_name() =>
        Assert.Equal(0, LogReading.Las($"{LogReading.LasHead}~C\nX.m:\nGR.m:\n~A\n1 9\n2 8\n").Clean().DepthColumn);

    // Rule "null": NULL in ~W is the missing-value code of the data.
    [Fact]
    public void The_null_value_of_the_header_is_missing()
    {
        var file = LogReading.Las("~V\nVERS. 2.0:\nWRAP. NO:\n~W\nNULL. -77.50 :\n~C\nDEPT.m:\nGR.:\n~A\n1 -77.5\n2 -999.25\n3 5\n").Clean();
        Assert.Equal([double.NaN, double.NaN, 5], file.Columns[1].Values);
        Assert.Equal((-77.5, 2), (file.NullValue, file.Columns[1].Missing));
    }

    // Before version 2.0 the value of most ~W lines stood after the colon.
    [Fact]
    public void A_version_1_2_file_is_read_with_a_note_and_its_well_name_stands_after_the_colon()
    {
        var read = LogReading.Las("~V\nVERS. 1.2:\nWRAP. NO:\n~W\nNULL. -999.25:\nWELL. WELL: Bramble 7\n~C\nDEPT.m:\n~A\n1\n");
        Assert.Equal("Bramble 7", read.File!.WellName);
        Assert.Equal(["a.las(2): note: found LAS 1.2, read by the rules of LAS 2.0"], read.Messages);
    }

    [Fact]
    public void A_curve_knows_its_line() => Assert.Equal(new SourcePosition("a.las", 8, 3), Read("  GR.gAPI :").Clean().Columns[1].Position);
}
