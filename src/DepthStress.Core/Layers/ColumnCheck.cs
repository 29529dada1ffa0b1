using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>What the program's own finite elements find in a block of a column.</summary>
/// <param name="Top">True vertical depth of the block's top, m.</param>
/// <param name="Base">True vertical depth of its base, which does not move, m.</param>
/// <param name="Displacement">Vertical displacement of the top under weight, pore pressure and lateral strains, m, upward positive.</param>
/// <param name="Residual">Greatest force left over at a node, as a share of the force on the base.</param>
/// <param name="Stress">Greatest difference of vertical stress from what lies above, at the middle of elements, as a share of it.</param>
public sealed record ColumnBlock(double Top, double Base, double Displacement, double Residual, double Stress);

/// <summary>
/// Navier's equation of the layered column in one dimension, by linear elements of unit area: equilibrium
/// <c>ds/dz = rho g</c>, <c>s = C33 e - C13 (e_h + e_H) - a_v p</c> (tension positive, lateral strains compression positive). The
/// base is held, the vertical stress presses on the top.
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
        var elements = block.SelectMany(l => Enumerable.Range(0, ElementsPerLayer).Select(k => new Element(l, k, strains))).ToArray();
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
        for (var e = 0; e < n; e++)
        {
            var element = elements[e];
            var s = element.Stress(u[e], e + 1 < n ? u[e + 1] : 0);
            residual = Math.Max(residual, Math.Abs(s - above + (0.5 * element.Weight)));
            above = s - (0.5 * element.Weight);
            stress = Math.Max(stress, Math.Abs((s / -element.Vertical) - 1));
        }

        return new ColumnBlock(block[0].Top, block[^1].Base, u[0], residual / Math.Abs(above), stress);
    }

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

    /// <summary>An element: its upper and its lower node move, the stress between is one.</summary>
    private readonly struct Element
    {
        public Element(ColumnLayer layer, int slice, FarField strains)
        {
            var size = layer.Thickness / ElementsPerLayer;
            var middle = layer.Top + (size * (slice + 0.5));
            var c = layer.Rock.Stiffness;
            Stiffness = c.C33 / size;
            Fixed = -(c.C13 * (strains.AlongShmin + strains.AlongShmax)) - (layer.Rock.BiotVertical * layer.Pore(middle));
            Weight = layer.Density * Constants.StandardGravity * size;
            Vertical = layer.Vertical(middle);
        }

        /// <summary>Force per stretch, Pa/m.</summary>
        public double Stiffness { get; }

        /// <summary>Stress without stretch, Pa, tension positive.</summary>
        public double Fixed { get; }

        /// <summary>Weight over area, Pa.</summary>
        public double Weight { get; }

        /// <summary>The vertical stress that lies above the middle, Pa, compression positive.</summary>
        public double Vertical { get; }

        public double Stress(double upper, double lower) => (Stiffness * (upper - lower)) + Fixed;
    }
}
