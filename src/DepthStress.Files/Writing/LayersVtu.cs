using System.Globalization;
using System.Text;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>layers.vtu</c>: one hexahedron per layer as a VTK XML file of an unstructured grid, in ASCII, with every column of numbers in SI
/// as cell data. Readers of that form know no missing value, so missing is -999.25, as in results.las.
/// </summary>
public static class LayersVtu
{
    private const int Hexahedron = 12;
    private const int Corners = 8;

    /// <summary>Writes the grid.</summary>
    /// <param name="table">The layers.</param>
    /// <param name="settings">Their settings.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(LayerTable table, LayerSettings settings, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(destination);
        using var text = new StreamWriter(destination, new UTF8Encoding(false), 1 << 16, leaveOpen: true) { NewLine = "\n" };
        var (cells, width) = (table.Layers.Count, settings.Extent.Value);
        text.WriteLine("<?xml version=\"1.0\"?>");
        text.WriteLine($"<!-- {Caution.Text} SI units, stresses total, compression positive; x along SHmax, y along Shmin, z minus true vertical depth below the datum; missing is {ResultsLas.Null}. -->");
        text.WriteLine("<VTKFile type=\"UnstructuredGrid\" version=\"0.1\" byte_order=\"LittleEndian\">\n<UnstructuredGrid>");
        text.WriteLine($"<Piece NumberOfPoints=\"{Whole(Corners * cells)}\" NumberOfCells=\"{Whole(cells)}\">");
        text.WriteLine("<Points>\n<DataArray type=\"Float64\" Name=\"Points\" NumberOfComponents=\"3\" format=\"ascii\">");
        foreach (var layer in table.Layers)
        {
            foreach (var depth in (ReadOnlySpan<double>)[layer.BaseTvd, layer.TopTvd])
            {
                foreach (var (x, y) in (ReadOnlySpan<(double, double)>)[(0, 0), (width, 0), (width, width), (0, width)])
                    text.WriteLine($"{DeckNumber.Exact(x)} {DeckNumber.Exact(y)} {DeckNumber.Exact(-depth)}");
            }
        }

        text.WriteLine("</DataArray>\n</Points>\n<Cells>");
        Array(text, "Int32", "connectivity", Enumerable.Range(0, Corners * cells).Select(Whole));
        Array(text, "Int32", "offsets", Enumerable.Range(1, cells).Select(k => Whole(Corners * k)));
        Array(text, "UInt8", "types", Enumerable.Repeat(Whole(Hexahedron), cells));
        text.WriteLine("</Cells>\n<CellData>");
        foreach (var column in LayerColumns.All.OfType<NumberColumn<LayerTable>>())
            Array(text, "Float64", SiColumns.Name(column), SiColumns.Values(column, table).Select(v => double.IsFinite(v) ? DeckNumber.Exact(v) : ResultsLas.Null));
        text.WriteLine("</CellData>\n</Piece>\n</UnstructuredGrid>\n</VTKFile>");
    }

    private static void Array(StreamWriter text, string type, string name, IEnumerable<string> values)
    {
        text.WriteLine($"<DataArray type=\"{type}\" Name=\"{name}\" format=\"ascii\">");
        text.WriteLine(string.Join(' ', values));
        text.WriteLine("</DataArray>");
    }

    private static string Whole(int value) => value.ToString(CultureInfo.InvariantCulture);
}
