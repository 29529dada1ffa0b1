using System.Globalization;
using System.Text;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Writing;

/// <summary>What the program writes as LAS, it reads back.</summary>
public class ResultsLasReadingTests
{
    public static TheoryData<string> Systems => ["metric", "field"];

    [Theory]
    [MemberData(nameof(Systems))]
    public void Results_las_reads_back_exactly(string system)
    {
        var units = system == "metric" ? UnitSystem.Metric : UnitSystem.Field;
        var model = TinyWell.Model(count: 40);
        var text = TinyWell.Text(stream => ResultsLas.Write(model, units, stream));
        var bag = new DiagnosticBag();
        var file = LogFileReader.Read(() => new MemoryStream(Encoding.UTF8.GetBytes(text)), "results.las", new LogReadOptions(), bag)!;

        // Columns without values are all that may be said; the header's depths and step hold.
        Assert.All(bag.Items, d => Assert.EndsWith("has no values, all are missing", d.Text, StringComparison.Ordinal));
        Assert.Equal((model.Count, "DEPT", 0), (file.Rows, file.Columns[0].Name, file.DepthColumn));
        var rows = text[text.IndexOf("~A", StringComparison.Ordinal)..].Split('\n')[1..^1];
        NumberColumn<EarthModel>[] columns = [.. DepthColumns.Numbers.Where(c => c.InLas)];
        Assert.Equal((rows.Length, columns.Length), (file.Rows, file.Columns.Count));
        var missing = 0;
        for (var r = 0; r < rows.Length; r++)
        {
            var cells = rows[r].Split(' ', StringSplitOptions.RemoveEmptyEntries);
            for (var c = 0; c < columns.Length; c++)
            {
                missing += cells[c] == ResultsLas.Null ? 1 : 0;
                Assert.Equal(
                    cells[c] == ResultsLas.Null ? double.NaN : double.Parse(cells[c], CultureInfo.InvariantCulture), file.Columns[c].Values[r]);
            }
        }

        Assert.Equal(missing, file.Columns.Sum(c => c.Missing));

        // Both kinds of cell are there.
        Assert.InRange(missing, 1, (rows.Length * columns.Length) - 1);
    }
}
