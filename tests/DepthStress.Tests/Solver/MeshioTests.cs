using System.Globalization;
using System.Text.Json.Nodes;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Files.Writing;

namespace DepthStress.Tests.Solver;

/// <summary>The grid read back by meshio, a reader of mesh files that nobody here made (Debian package python3-meshio).</summary>
public class MeshioTests
{
    private const string Script = """
        import json, meshio
        m = meshio.read("layers.vtu")
        print(json.dumps({"cells": [[c.type, c.data.tolist()] for c in m.cells], "points": m.points.tolist(), "data": {k: v[0].tolist() for k, v in m.cell_data.items()}}))
        """;

    [MeshioFact]
    public void The_grid_is_read_back_with_the_same_cells_and_the_same_values()
    {
        using var folder = new TestFolder();
        var (table, settings) = (SampleColumn.Table, SampleColumn.Settings(SolverRock.Isotropic));
        using (var file = File.Create(folder.Of("layers.vtu"))) LayersVtu.Write(table, settings, file);
        Assert.True(Outside.PythonWithMeshio is not null, "no Python with meshio: install the Debian package python3-meshio");
        var (code, text) = Outside.Run(Outside.PythonWithMeshio, folder.Path, "-c", Script);
        Assert.True(code == 0, text);
        var read = JsonNode.Parse(text[text.IndexOf('{', StringComparison.Ordinal)..])!;
        var cells = Assert.Single(read["cells"]!.AsArray())!;
        Assert.Equal("hexahedron", cells[0]!.GetValue<string>());
        Assert.Equal(table.Layers.Count, cells[1]!.AsArray().Count);
        for (var k = 0; k < table.Layers.Count; k++)
        {
            var corners = cells[1]![k]!.AsArray().Select(n => read["points"]![n!.GetValue<int>()]!.AsArray().Select(x => x!.GetValue<double>()).ToArray()).ToList();
            Assert.All(corners[..4], c => Assert.Equal(-table.Layers[k].BaseTvd, c[2]));
            Assert.All(corners[4..], c => Assert.Equal(-table.Layers[k].TopTvd, c[2]));
            Assert.Equal(4, corners[..4].Select(c => (c[0], c[1])).Distinct().Count());
        }

        // Names and digits as layers-solver.csv has them.
        var (header, rows) = SolverTable(table);
        var numbers = LayerColumns.All.Select((c, k) => (Column: c, Name: header[k], Place: k)).Where(c => c.Column is NumberColumn<LayerTable>).ToList();
        Assert.Equal(numbers.Select(c => c.Name), read["data"]!.AsObject().Select(d => d.Key));
        foreach (var (column, name, place) in numbers)
        {
            var values = new double[table.Layers.Count];
            ((NumberColumn<LayerTable>)column).Read(table, 0, values);
            Assert.Equal(values.Select(v => double.IsNaN(v) ? -999.25 : v), read["data"]![name]!.AsArray().Select(v => v!.GetValue<double>()));
            Assert.Equal(values, rows.Select(r => r[place].Length == 0 ? double.NaN : double.Parse(r[place], CultureInfo.InvariantCulture)));
        }
    }

    private static (string[] Header, List<string[]> Rows) SolverTable(LayerTable table)
    {
        using var stream = new MemoryStream();
        SolverCsv.Write(table, stream);
        var lines = System.Text.Encoding.UTF8.GetString(stream.ToArray()).Split('\n', StringSplitOptions.RemoveEmptyEntries);
        return (lines[0].Split(','), [.. lines[1..].Select(l => l.Split(','))]);
    }
}
