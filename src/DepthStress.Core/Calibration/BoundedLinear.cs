using MathNet.Numerics.LinearAlgebra;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Linear least squares within bounds by an active set, each set solved by QR. Sources: Lawson and Hanson 1974, Solving Least
/// Squares Problems (SIAM reprint 1995), the method for bounded variables; Stark and Parker 1995, Computational Statistics
/// 10:129-141.
/// </summary>
internal static class BoundedLinear
{
    /// <summary>A diagonal of R below this share of its greatest one means that columns repeat each other.</summary>
    private const double Dependent = 1e-13;

    /// <summary>A gradient below this share of the residual's length counts as zero, for columns of length one.</summary>
    private const double Flat = 1e-14;

    /// <summary>
    /// The x with the least ||A x - b|| and low &lt;= x &lt;= high, or null where columns that are free repeat each other.
    /// </summary>
    /// <param name="a">The matrix; its columns should be of similar length.</param>
    /// <param name="b">The right-hand side.</param>
    /// <param name="low">Lower bounds, zero or below.</param>
    /// <param name="high">Upper bounds, zero or above.</param>
    public static double[]? Solve(Matrix<double> a, Vector<double> b, double[] low, double[] high)
    {
        var n = a.ColumnCount;
        var x = new double[n];
        var free = new bool[n];
        for (var j = 0; j < n; j++) free[j] = low[j] < 0 && high[j] > 0;
        var refused = -1;
        // Each pass either frees one variable at a lower sum of squares or binds one: no set comes twice but by rounding.
        for (var pass = 0; pass < 100 * (n + 1); pass++)
        {
            if (SolveFree(a, b, x, free) is not { } z) return null;
            var (alpha, hit) = (1.0, -1);
            for (var j = 0; j < n; j++)
            {
                if (!free[j] || (z[j] > low[j] && z[j] < high[j])) continue;
                var bound = z[j] <= low[j] ? low[j] : high[j];
                var share = z[j] == x[j] ? 0 : (bound - x[j]) / (z[j] - x[j]);
                if (share <= alpha) (alpha, hit) = (Math.Max(share, 0), j);
            }

            for (var j = 0; j < n; j++)
            {
                if (free[j]) x[j] += alpha * (z[j] - x[j]);
            }

            if (hit >= 0)
            {
                x[hit] = z[hit] <= low[hit] ? low[hit] : high[hit];
                free[hit] = false;
                // A variable that was just freed and goes straight back did so by rounding.
                if (alpha == 0) refused = hit;
                continue;
            }

            var next = MostWanting(a, b, x, free, low, high, refused);
            if (next < 0) return x;
            free[next] = true;
        }

        return x;
    }

    private static double[]? SolveFree(Matrix<double> a, Vector<double> b, double[] x, bool[] free)
    {
        var z = (double[])x.Clone();
        var columns = Enumerable.Range(0, free.Length).Where(j => free[j]).ToArray();
        if (columns.Length == 0) return z;
        if (a.RowCount < columns.Length) return null;
        var rest = b.Clone();
        for (var j = 0; j < free.Length; j++)
        {
            if (!free[j] && x[j] != 0) rest -= x[j] * a.Column(j);
        }

        var qr = Matrix<double>.Build.DenseOfColumnVectors(columns.Select(a.Column)).QR();
        var diagonal = Enumerable.Range(0, columns.Length).Select(k => Math.Abs(qr.R[k, k])).ToArray();
        if (!(diagonal.Min() > Dependent * diagonal.Max())) return null;
        var solved = qr.Solve(rest);
        for (var k = 0; k < columns.Length; k++) z[columns[k]] = solved[k];
        return z;
    }

    /// <summary>The bound variable whose move inwards would lower the sum of squares most; -1 where none would.</summary>
    private static int MostWanting(Matrix<double> a, Vector<double> b, double[] x, bool[] free, double[] low, double[] high, int refused)
    {
        var residual = b - (a * Vector<double>.Build.Dense(x));
        var descent = a.TransposeThisAndMultiply(residual);
        var (best, gain) = (-1, Flat * residual.L2Norm());
        for (var j = 0; j < x.Length; j++)
        {
            if (free[j] || j == refused || low[j] == high[j]) continue;
            var inwards = x[j] <= low[j] ? descent[j] : -descent[j];
            if (inwards > gain) (best, gain) = (j, inwards);
        }

        return best;
    }
}
