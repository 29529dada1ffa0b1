using DepthStress.Core.Layers;

namespace DepthStress.Files.Writing;

/// <summary>A horizontal plane of nodes.</summary>
/// <param name="Depth">True vertical depth, m.</param>
/// <param name="Pore">Pore pressure, Pa.</param>
internal readonly record struct DeckPlane(double Depth, double Pore);

/// <summary>A slice of elements between two planes of one layer.</summary>
/// <param name="Layer">The layer.</param>
/// <param name="Above">Index of the upper plane.</param>
/// <param name="Below">Index of the lower plane.</param>
internal readonly record struct DeckSlice(ColumnLayer Layer, int Above, int Below);

/// <summary>
/// The hexahedra of a column: four slices in each layer. A layer has its own planes; it shares one with the layer above where both
/// have the same pressure there, else the two planes at its top are tied.
/// </summary>
internal sealed class DeckMesh
{
    /// <summary>Slices in each layer.</summary>
    public const int SlicesPerLayer = 4;

    private readonly List<DeckPlane> _planes = [];
    private readonly List<DeckSlice> _slices = [];
    private readonly List<(int Upper, int Lower)> _ties = [];
    private readonly List<(int Plane, ColumnLayer Layer)> _tops = [];
    private readonly List<int> _bases = [];

    public DeckMesh(SolverColumn column, LayerSettings settings)
    {
        (Nx, Ny, Extent) = ((int)settings.ElementsAlongShmax.Value, (int)settings.ElementsAlongShmin.Value, settings.Extent.Value);
        foreach (var block in column.Blocks)
        {
            for (var k = 0; k < block.Count; k++) Add(block[k], isTop: k == 0);
            _bases.Add(_planes.Count - 1);
        }
    }

    public int Nx { get; }

    public int Ny { get; }

    public double Extent { get; }

    public IReadOnlyList<DeckPlane> Planes => _planes;

    public IReadOnlyList<DeckSlice> Slices => _slices;

    /// <summary>Planes at one depth that move as one.</summary>
    public IReadOnlyList<(int Upper, int Lower)> Ties => _ties;

    /// <summary>Planes at the tops of blocks, with their layers.</summary>
    public IReadOnlyList<(int Plane, ColumnLayer Layer)> Tops => _tops;

    /// <summary>Planes at the bases of blocks.</summary>
    public IReadOnlyList<int> Bases => _bases;

    /// <summary>Elements of a slice.</summary>
    public int PerSlice => Nx * Ny;

    /// <summary>Number of the node of a plane at a place of the grid.</summary>
    public int Node(int plane, int i, int j) => (plane * (Nx + 1) * (Ny + 1)) + (j * (Nx + 1)) + i + 1;

    /// <summary>Coordinates along the axes.</summary>
    public (double X, double Y) At(int i, int j) => (Extent * i / Nx, Extent * j / Ny);

    /// <summary>The places of a plane's nodes, in the order of their numbers.</summary>
    public IEnumerable<(int I, int J)> Places() => from j in Enumerable.Range(0, Ny + 1) from i in Enumerable.Range(0, Nx + 1) select (i, j);

    /// <summary>The eight nodes of each element of a slice: the lower face counterclockwise seen from above, then the upper face.</summary>
    public IEnumerable<int[]> Elements(DeckSlice slice)
    {
        for (var j = 0; j < Ny; j++)
        {
            for (var i = 0; i < Nx; i++)
                yield return [.. Face(slice.Below, i, j), .. Face(slice.Above, i, j)];
        }
    }

    private int[] Face(int plane, int i, int j) => [Node(plane, i, j), Node(plane, i + 1, j), Node(plane, i + 1, j + 1), Node(plane, i, j + 1)];

    private void Add(ColumnLayer layer, bool isTop)
    {
        var first = new DeckPlane(layer.Top, layer.Pore(layer.Top));
        if (isTop)
        {
            _tops.Add((_planes.Count, layer));
            _planes.Add(first);
        }
        else if (_planes[^1] != first)
        {
            _ties.Add((_planes.Count - 1, _planes.Count));
            _planes.Add(first);
        }

        for (var k = 1; k <= SlicesPerLayer; k++)
        {
            var depth = k == SlicesPerLayer ? layer.Base : layer.Top + (layer.Thickness * k / SlicesPerLayer);
            _planes.Add(new DeckPlane(depth, layer.Pore(depth)));
            _slices.Add(new DeckSlice(layer, _planes.Count - 2, _planes.Count - 1));
        }
    }
}
