using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>What the program's own finite elements find in a block of a column.</summary>
/// <param name="Top">True vertical depth of the block's top, m.</param>
/// <param name="Base">True vertical depth of its base, which does not move, m.</param>
/// <param name="Displacement">Vertical displacement of the top under weight, pore pressure and lateral strains, m, upward positive.</param>
/// <param name="Residual">Greatest force left over at a node, as a share of the force on the base.</param>
/// <param name="Stress">Greatest difference of vertical stress from what lies above, at the middle of elements, as a share of it.</param>
/// <param name="Layers">What they find in each of its layers.</param>
public sealed record ColumnBlock(double Top, double Base, double Displacement, double Residual, double Stress, IReadOnlyList<SolvedLayer> Layers);

/// <summary>The stresses that finite elements find in a layer, means over its elements, Pa, total, compression positive.</summary>
/// <param name="Number">Number of the layer in the layer table.</param>
/// <param name="Vertical">Vertical stress.</param>
/// <param name="Shmin">Stress along Shmin.</param>
/// <param name="Shmax">Stress along SHmax.</param>
/// <param name="FormulaError">Greatest difference from the layer's own formula at the middle of an element, as a share of the stress there.</param>
public sealed record SolvedLayer(int Number, double Vertical, double Shmin, double Shmax, double FormulaError);

/// <summary>
/// Navier's equation of the layered column in one dimension, by linear elements of unit area: equilibrium
/// <c>ds/dz = rho g</c>, <c>s = C33 e - C13 (e_h + e_H) - a_v p</c> (tension positive, lateral strains compression positive). The
/// base is held, the vertical stress presses on the top. The horizontal stresses follow from the strain that is found.
/// </summary>
public static class ColumnCheck
{
    private const int ElementsPerLayer = 4;

    /// <summary>Solves every block of a column.</summary>
    public static IReadOnlyList<ColumnBlock> Of(SolverColumn column)
    {
        ArgumentNullException.ThrowIfNull(column);
        return [.. column.Blocks.Select(b => Solve(b, column.Strains))];
    }

    private static ColumnBlock Solve(IReadOnlyList<ColumnLayer> block, FarField strains)
    {
        var elements = block.SelectMany((l, i) => Enumerable.Range(0, ElementsPerLayer).Select(k => new Element(l, k, (i * ElementsPerLayer) + k, strains))).ToArray();
        var n = elements.Length;
        var (diagonal, beside, force) = (new double[n], new double[n], new double[n]); // nodes from the top; the base is held
        force[0] = -block[0].VerticalTop;
        for (var e = 0; e < n; e++)
        {
            var element = elements[e];
            diagonal[e] += element.Stiffness;
            force[e] += -element.Fixed - (0.5 * element.Weight);
            if (e + 1 == n) continue;
            diagonal[e + 1] += element.Stiffness;
            beside[e] = -element.Stiffness;
            force[e + 1] += element.Fixed - (0.5 * element.Weight);
        }

        var u = Tridiagonal(diagonal, beside, force);
        double residual = 0, stress = 0;
        var above = -block[0].VerticalTop;
        var layers = new List<SolvedLayer>();
        foreach (var layer in elements.Chunk(ElementsPerLayer))
        {
            double vertical = 0, shmin = 0, shmax = 0, error = 0;
            foreach (var element in layer)
            {
                var strain = element.Strain(u[element.Node], element.Node + 1 < n ? u[element.Node + 1] : 0);
                var s = element.Stress(strain);
                residual = Math.Max(residual, Math.Abs(s - above + (0.5 * element.Weight)));
                above = s - (0.5 * element.Weight);
                stress = Math.Max(stress, Share(-s, element.Vertical));
                var (least, greatest) = (element.Horizontal(strain, strains.AlongShmin, strains.AlongShmax) + element.Layer.ClosingShmin, element.Horizontal(strain, strains.AlongShmax, strains.AlongShmin) + element.Layer.ClosingShmax);
                (vertical, shmin, shmax) = (vertical - s, shmin + least, shmax + greatest);
                error = Math.Max(error, Math.Max(
                    Share(-s, element.Vertical),
                    Math.Max(Share(least, element.Layer.Shmin(element.Middle, strains)), Share(greatest, element.Layer.Shmax(element.Middle, strains)))));
            }

            layers.Add(new SolvedLayer(layer[0].Layer.Number, vertical / layer.Length, shmin / layer.Length, shmax / layer.Length, error));
        }

        return new ColumnBlock(block[0].Top, block[^1].Base, u[0], residual / Math.Abs(above), stress, layers);
    }

    private static double Share(double found, double expected) => Math.Abs(found - expected) / Math.Abs(expected);

    /// <summary>Solves a symmetric positive definite system with one band beside the diagonal; no library here has one that grows linearly.</summary>
    private static double[] Tridiagonal(double[] diagonal, double[] beside, double[] force)
    {
        var n = diagonal.Length;
        var (d, u) = ((double[])diagonal.Clone(), (double[])force.Clone());
        for (var i = 1; i < n; i++)
        {
            var share = beside[i - 1] / d[i - 1];
            d[i] -= share * beside[i - 1];
            u[i] -= share * u[i - 1];
        }

        for (var i = n - 1; i >= 0; i--) u[i] = (u[i] - (i + 1 < n ? beside[i] * u[i + 1] : 0)) / d[i];
        return u;
    }

    /// <summary>An element: its upper and its lower node move, the strain between is one.</summary>
    private sealed class Element
    {
        private readonly double _size;
        private readonly double _pore;

        public Element(ColumnLayer layer, int slice, int node, FarField strains)
        {
            (Layer, Node, _size) = (layer, node, layer.Thickness / ElementsPerLayer);
            Middle = layer.Top + (_size * (slice + 0.5));
            _pore = layer.Pore(Middle);
            var c = layer.Rock.Stiffness;
            Stiffness = c.C33 / _size;
            Fixed = -(c.C13 * (strains.AlongShmin + strains.AlongShmax)) - (layer.Rock.BiotVertical * _pore);
            Weight = layer.Density * Constants.StandardGravity * _size;
            Vertical = layer.Vertical(Middle);
        }

        /// <summary>The layer it is a part of.</summary>
        public ColumnLayer Layer { get; }

        /// <summary>Number of its upper node.</summary>
        public int Node { get; }

        /// <summary>True vertical depth of its middle, m.</summary>
        public double Middle { get; }

        /// <summary>Force per stretch, Pa/m.</summary>
        public double Stiffness { get; }

        /// <summary>Stress without stretch, Pa, tension positive.</summary>
        public double Fixed { get; }

        /// <summary>Weight over area, Pa.</summary>
        public double Weight { get; }

        /// <summary>The vertical stress that lies above the middle, Pa, compression positive.</summary>
        public double Vertical { get; }

        /// <summary>Vertical strain, tension positive.</summary>
        public double Strain(double upper, double lower) => (upper - lower) / _size;

        /// <summary>Vertical stress, Pa, tension positive.</summary>
        public double Stress(double strain) => (Stiffness * _size * strain) + Fixed;

        /// <summary>Horizontal stress, Pa, compression positive, by Hooke's law from all three strains, the lateral ones compression positive.</summary>
        public double Horizontal(double strain, double along, double across)
        {
            var c = Layer.Rock.Stiffness;
            return (c.C11 * along) + (c.C12 * across) - (c.C13 * strain) + (Layer.Rock.BiotHorizontal * _pore);
        }
    }
}
