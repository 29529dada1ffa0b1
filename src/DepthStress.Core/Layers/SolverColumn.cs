using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>Which rock a solver's column is made of.</summary>
public enum SolverRock
{
    /// <summary>The isotropic pair of each layer.</summary>
    Isotropic,

    /// <summary>The upscaled rock with flat beds.</summary>
    Layered,
}

/// <summary>A layer of the column, with what the solver is to find in it; stresses total, compression positive.</summary>
/// <param name="Number">Number of the layer in the layer table.</param>
/// <param name="Top">True vertical depth of its top, m.</param>
/// <param name="Base">True vertical depth of its base, m.</param>
/// <param name="Rock">Its rock.</param>
/// <param name="Density">Bulk density, kg/m3.</param>
/// <param name="VerticalTop">Vertical stress at its top, Pa.</param>
/// <param name="Pressure">Pore pressure.</param>
/// <param name="ClosingShmin">Initial stress along Shmin that the strains do not give, Pa.</param>
/// <param name="ClosingShmax">The same along SHmax, Pa.</param>
public sealed record ColumnLayer(
    int Number, double Top, double Base, PorousRock Rock, double Density, double VerticalTop, DepthLine Pressure, double ClosingShmin, double ClosingShmax)
{
    /// <summary>Thickness, m.</summary>
    public double Thickness => Base - Top;

    /// <summary>Vertical stress at a depth, Pa: what lies above presses.</summary>
    public double Vertical(double tvd) => VerticalTop + (Density * Constants.StandardGravity * (tvd - Top));

    /// <summary>Pore pressure at a depth, Pa.</summary>
    public double Pore(double tvd) => Pressure.At(tvd);

    /// <summary>Stress along Shmin at a depth under a pair of strains, Pa.</summary>
    public double Shmin(double tvd, FarField strains) => Rock.Horizontal(Vertical(tvd), Pore(tvd), strains.AlongShmin, strains.AlongShmax) + ClosingShmin;

    /// <summary>Stress along SHmax at a depth under a pair of strains, Pa.</summary>
    public double Shmax(double tvd, FarField strains) => Rock.Horizontal(Vertical(tvd), Pore(tvd), strains.AlongShmax, strains.AlongShmin) + ClosingShmax;
}

/// <summary>
/// The layers that a solver can take, in blocks of layers that touch. A layer without values ends a block; the next begins with the
/// profile's vertical stress on its top, which is what the missing rock would hand down.
/// </summary>
/// <param name="Blocks">The blocks from top to bottom, each from top to bottom; at least one layer in each.</param>
/// <param name="Strains">The lateral strains of all of them.</param>
public sealed record SolverColumn(IReadOnlyList<IReadOnlyList<ColumnLayer>> Blocks, FarField Strains)
{
    /// <summary>Every layer.</summary>
    public IEnumerable<ColumnLayer> Layers => Blocks.SelectMany(b => b);

    /// <summary>The column of a layer table; null when a solver can take none of its layers.</summary>
    public static SolverColumn? Of(LayerTable table, SolverRock rock)
    {
        ArgumentNullException.ThrowIfNull(table);
        var blocks = new List<List<ColumnLayer>>();
        foreach (var layer in table.Layers)
        {
            if (layer.Medium is not { } medium || !(layer.BaseTvd > layer.TopTvd)) continue;
            var above = blocks.Count > 0 ? blocks[^1][^1] : null;
            var touches = above is not null && above.Base == layer.TopTvd;
            if (!touches) blocks.Add([]);
            blocks[^1].Add(new ColumnLayer(
                layer.Number, layer.TopTvd, layer.BaseTvd, rock == SolverRock.Layered ? medium.Rock : medium.Pair.ToPorous(), medium.Density,
                touches ? above!.Vertical(layer.TopTvd) : medium.Vertical.Mean - (medium.Density * Constants.StandardGravity * (medium.Vertical.Depth - layer.TopTvd)),
                medium.Pore, medium.ClosingShmin, double.IsNaN(medium.ClosingShmax) ? 0 : medium.ClosingShmax));
        }

        return blocks.Count == 0 ? null : new SolverColumn(blocks, table.Strains);
    }
}
