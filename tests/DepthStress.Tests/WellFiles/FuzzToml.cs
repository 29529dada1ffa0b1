using System.Text;
using DepthStress.Tests.Reading;

namespace DepthStress.Tests.WellFiles;

/// <summary>Spoils well files: lines and values in ways that people and programs do, bytes in any way.</summary>
internal static class FuzzToml
{
    private static readonly string[] Values =
    [
        "1e999", "-1e308", "9223372036854775808", "0x7fffffffffffffff", "1_000", "nan", "-inf", "true", "\"\"", "\" \"", "''", "[]", "{}", "[[]]", "2020-01-01T00:00:00Z",
        "\"NaN m\"", "\"1e400 m\"", "\"-0 m\"", "\"1e-320 g/cm3\"", "\"1e300 MPa\"", "\"\\u0000\"", "\"\\uD800\"", "\"\\U0010FFFF\"", "\"a\\u202Eb\"", "\"e\\u0301\"", "\"\uFF11 m\"",
        "\"\u200B\"", "\"/\"", "\"..\"", "\"\"\"\na\nb\"\"\"", "{ a.b.c = 1 }", "{ law = \"linear\", factor = 1e308 }", "{ column = 3 }", "[\"a\", 1, [true]]",
    ];

    private static readonly string[] Lines =
    [
        "[well]", "[[well]]", "[[zones]]", "[zones.biot]", "[[lithology]]", "[logs.curves]", "[logs.resample]", "[a.b.c.d]", "= 1", "\"\" = 1", "\u00E5 = 1", "#\uFEFF", "well.name.x = 1",
        "shear_from = \"mean\"", "resample = { step = \"1 m\" }", "[", "]]", "\"quoted key\" = 1", "name = name",
    ];

    public static byte[] Spoil(string text, Random random, int most)
    {
        var lines = text.Split('\n').ToList();
        for (var times = random.Next(0, most + 1); times > 0; times--) SpoilLine(lines, random);
        var spoilt = Encoding.UTF8.GetBytes(string.Join(random.Next(20) == 0 ? "\r\n" : "\n", lines));
        return random.Next(3) == 0 ? FuzzBytes.Spoil(spoilt, random, most) : spoilt;
    }

    private static void SpoilLine(List<string> lines, Random random)
    {
        var (at, other) = (random.Next(lines.Count), random.Next(lines.Count));
        switch (random.Next(9))
        {
            case 0: lines.Insert(other, lines[at]); break;
            case 1: (lines[at], lines[other]) = (lines[other], lines[at]); break;
            case 2: lines[at] = ""; break;
            case 3: (lines[at], lines[other]) = (With(lines[at], Value(lines[other])), With(lines[other], Value(lines[at]))); break;
            case 4 or 5: lines[at] = With(lines[at], Values[random.Next(Values.Length)]); break;
            case 6: lines.Insert(at, Lines[random.Next(Lines.Length)]); break;
            case 7: lines[at] = With(lines[at], Deep(random)); break;
            default: lines.RemoveRange(at, Math.Min(random.Next(1, 6), lines.Count - at)); break;
        }

        if (lines.Count == 0) lines.Add("");
    }

    private static string Deep(Random random)
    {
        var depth = 1 << random.Next(1, 13);
        return random.Next(3) switch
        {
            0 => new string('[', depth) + new string(']', depth),
            1 => string.Concat(Enumerable.Repeat("{ a = ", depth)) + "1" + string.Concat(Enumerable.Repeat(" }", depth)),
            _ => "{ " + string.Join('.', Enumerable.Repeat("a", depth)) + " = 1 }",
        };
    }

    private static string Value(string line) => line.IndexOf('=', StringComparison.Ordinal) is >= 0 and var at ? line[(at + 1)..].Trim() : "1";

    private static string With(string line, string value) => line.IndexOf('=', StringComparison.Ordinal) is >= 0 and var at ? $"{line[..(at + 1)]} {value}" : line;
}
