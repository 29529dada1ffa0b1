using System.Text;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;

namespace DepthStress.Files.Writing;

/// <summary><c>layers-solver.csv</c>: every column of <c>layers.csv</c> in SI with every digit, one header line, missing empty; and the strains of the column.</summary>
public static class SolverCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="table">The layers.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(LayerTable table, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(destination);
        var rows = table.Layers.Count;
        var strains = table.Strains;
        List<(string Name, string[] Cells)> columns =
        [
            .. LayerColumns.All.Select(c => c is NumberColumn<LayerTable> number
                ? (SiColumns.Name(number), Array.ConvertAll(SiColumns.Values(number, table), Cell))
                : (c.Id, Words((TextColumn<LayerTable>)c, table))),
            ("strain_along_shmin", [.. Enumerable.Repeat(strains.Known ? Cell(strains.AlongShmin) : "", rows)]),
            ("strain_along_shmax", [.. Enumerable.Repeat(strains.Known ? Cell(strains.AlongShmax) : "", rows)]),
        ];
        using var text = new StreamWriter(destination, new UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };
        text.WriteLine(string.Join(',', columns.Select(c => c.Name)));
        for (var row = 0; row < rows; row++) text.WriteLine(string.Join(',', columns.Select(c => c.Cells[row])));
    }

    private static string Cell(double value) => double.IsFinite(value) ? DeckNumber.Exact(value) : "";

    private static string[] Words(TextColumn<LayerTable> column, LayerTable table)
    {
        var words = new string[table.Layers.Count];
        column.Read(table, 0, words);
        return Array.ConvertAll(words, CellText.Csv);
    }
}
