using System.Globalization;
using CsCheck;

namespace DepthStress.Tests.Reading;

public class LogReadingProperties
{
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
}
