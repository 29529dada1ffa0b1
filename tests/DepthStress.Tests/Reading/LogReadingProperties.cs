using System.Globalization;
using System.Text;
using CsCheck;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Tests.Reading;

public class LogReadingProperties
{
    private const int FuzzCases = 2000;
    private static readonly string[] Formats = ["R", "F4", "F9", "E5", "E16", "G6"];

    // The base library's parser is the reference: it rounds correctly (IEEE 754-2019, 5.12.2).
    [Fact]
    public void Every_number_is_read_as_the_base_library_reads_it() => Gen.Double.Array[1, 40]
        .Select(Gen.Int[0, Formats.Length - 1])
        .Sample((numbers, choice) =>
        {
            var cells = numbers.Where(double.IsFinite).Select(n => n.ToString(Formats[choice], CultureInfo.InvariantCulture)).ToArray();
            if (cells.Length == 0) return;
            var text = string.Join('\n', cells.Select((c, i) => FormattableString.Invariant($"{i}#{c}")));
            var csv = LogReading.Csv("DEPT,GR\n" + text.Replace('#', ','));
            var las = LogReading.Las(LogReading.LasHead + "~C\nDEPT.m:\nGR.:\n~A\n" + text.Replace('#', ' '));
            for (var i = 0; i < cells.Length; i++)
            {
                var expected = double.Parse(cells[i], NumberStyles.Float, CultureInfo.InvariantCulture);
                if (!double.IsFinite(expected)) return;
                if (expected is -999.25 or -999 or -9999) expected = double.NaN;
                Assert.Equal(expected, csv.File!.Columns[1].Values[i]);
                Assert.Equal(expected, las.File!.Columns[1].Values[i]);
            }
        });

    [Theory]
    [InlineData("a.csv", "DEPT[m],GR (gAPI),\"RHOB\"\nm,gAPI,g/cm3\n1.5,10,-999.25\n2.0,11.25,2.5\n2.5,,2.6e0\n3,12,2.65\n")]
    [InlineData("a.las", "# c\n~V\nVERS. 2.0 :\nWRAP. NO :\n~W\nSTRT.m 1.5 :\nSTEP.m 0.5 :\nNULL. -999.25 :\nWELL. Bramble 7 : WELL\n~C\nDEPT.m : depth\nGR.gAPI :\nRDEP .ohm.m :\n~P\n~O\ntext\n~A\n1.5 10 -999.25\n2.0 11.25 2.5\n2.5 11 2.6e0\n3 12 2.65\n")]
    public void Spoilt_files_end_in_a_sound_table_or_in_an_error_with_a_position(string name, string text)
    {
        var random = new Random(20_260);
        var (read, refused) = (0, 0);
        for (var n = 0; n < FuzzCases; n++)
        {
            var bytes = Spoil(Encoding.UTF8.GetBytes(text), random);
            var result = LogReading.Bytes(bytes, name);
            if (result.File is { } file)
            {
                read++;
                Assert.All(file.Columns, c => Assert.Equal(file.Rows, c.Values.Length));
                Assert.All(file.Columns, c => Assert.Equal(c.Missing, c.Values.Count(double.IsNaN)));
                Assert.Equal(file.Columns.Count, file.Columns.Select(c => c.Name.ToUpperInvariant()).Distinct().Count());
                if (file.DepthColumn < 0) continue;
                var depth = file.Columns[file.DepthColumn].Values;
                for (var i = 0; i < depth.Length; i++) Assert.True(i == 0 ? !double.IsNaN(depth[0]) : depth[i] > depth[i - 1]);
            }
            else
            {
                refused++;
                var lines = 1 + Math.Max(bytes.Count(b => b is (byte)'\n'), bytes.Count(b => b is (byte)'\n' or (byte)'\r'));
                Assert.Contains(result.Bag.Items, d => d.Severity == Severity.Error);
                Assert.All(result.Bag.Items, d => Assert.Equal(name, d.Position.File));
                Assert.All(result.Bag.Items, d => Assert.InRange(d.Position.Line, 0, lines));
                Assert.DoesNotContain(result.Messages, m => m.Any(char.IsControl));
            }
        }

        // Both ends are reached, so that neither branch above is idle.
        Assert.InRange(read, 100, FuzzCases);
        Assert.InRange(refused, 100, FuzzCases);
    }

    private static byte[] Spoil(byte[] bytes, Random random)
    {
        ReadOnlySpan<byte> spices = "\0\r\n\t \",;:.~#-+eE0199xN\u00b5\u001b[]()"u8;
        var spoilt = bytes.ToList();
        for (var times = random.Next(1, 5); times > 0 && spoilt.Count > 0; times--)
        {
            var at = random.Next(spoilt.Count);
            var length = Math.Min(random.Next(1, 20), spoilt.Count - at);
            switch (random.Next(7))
            {
                case 0: spoilt[at] = (byte)random.Next(256); break;
                case 1: spoilt[at] = spices[random.Next(spices.Length)]; break;
                case 2: spoilt.Insert(at, spices[random.Next(spices.Length)]); break;
                case 3: spoilt.RemoveRange(at, length); break;
                case 4: spoilt.InsertRange(at, spoilt.GetRange(random.Next(spoilt.Count - length + 1), length)); break;
                case 5 when random.Next(4) == 0: spoilt.RemoveRange(at, spoilt.Count - at); break;
                default: spoilt.InsertRange(at, Enumerable.Repeat(spices[random.Next(spices.Length)], random.Next(1, 9))); break;
            }
        }

        return [.. spoilt];
    }
}
