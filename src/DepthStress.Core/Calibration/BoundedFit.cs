using MathNet.Numerics.LinearAlgebra;

namespace DepthStress.Core.Calibration;

/// <summary>
/// Weighted non-linear least squares within bounds, for a few parameters of any scale: Gauss-Newton steps, each a linear
/// problem within the bounds (<see cref="BoundedLinear"/>), damped where they fail (Levenberg 1944; Marquardt 1963) along
/// columns scaled as by Moré 1978, in Watson (ed.), Numerical Analysis, Springer, 105-116. Deterministic.
/// </summary>
public static class BoundedFit
{
    /// <summary>The constant of Huber's weights that keeps 95 % efficiency with normal errors: Huber 1981, Robust Statistics; Holland and Welsch 1977.</summary>
    public const double HuberConstant = 1.345;

    private const int MostSteps = 500;
    private const int MostReweightings = 100;

    /// <summary>So many steps in a row that gain no more than rounding end the search: they would go to and fro. From the first damping to the last there are fewer.</summary>
    private const int MostIdle = 40;

    /// <summary>A relative step below this ends the search.</summary>
    private const double SmallStep = 1e-10;

    /// <summary>Changes of the sum of squares below this share of it are rounding.</summary>
    private const double Rounding = 1e-12;

    /// <summary>So are changes below this: residuals are in standard deviations.</summary>
    private const double Nothing = 1e-14;

    /// <summary>A parameter that moves the residuals by less than this over its scale is hardly felt: its steps stay of the size of its scale.</summary>
    private const double Unfelt = 1e-6;

    /// <summary>A parameter nearer to a bound than this share of its scale is at it.</summary>
    private const double Touching = 1e-12;

    private const double FirstDamping = 1e-4, LeastDamping = 1e-9, MostDamping = 1e12;

    /// <summary>Finds the parameters within bounds with the least sum of squared residuals, from the start downhill.</summary>
    /// <exception cref="ArgumentException">The problem is none, or its residuals are not finite at the start.</exception>
    public static FitResult Solve(FitProblem problem)
    {
        ArgumentNullException.ThrowIfNull(problem);
        problem.Check();
        return Descend(problem, null);
    }

    /// <summary>
    /// The same with Huber's weights: beyond <paramref name="constant"/> standard deviations a residual pulls no harder than at it.
    /// Weights are renewed until the parameters stay; errors are those of the weighted fit.
    /// </summary>
    /// <param name="problem">The problem.</param>
    /// <param name="constant">Where residuals begin to count less, in standard deviations; above zero.</param>
    /// <exception cref="ArgumentException">As above, or the constant is not above zero.</exception>
    public static FitResult SolveRobust(FitProblem problem, double constant = HuberConstant)
    {
        ArgumentNullException.ThrowIfNull(problem);
        problem.Check();
        if (!(constant > 0)) throw new ArgumentException("It is not above zero.", nameof(constant));
        var result = Descend(problem, null);
        var steps = result.Iterations;
        for (var round = 0; round < MostReweightings; round++)
        {
            var weights = result.Residuals.Select(r => Math.Abs(r) <= constant ? 1 : constant / Math.Abs(r)).ToArray();
            var next = Descend(problem.From(result.Estimates), weights);
            steps += next.Iterations;
            var moved = Enumerable.Range(0, problem.Parameters.Count).Max(j => RelativeStep(problem, result.Estimates[j], next.Estimates[j] - result.Estimates[j], j));
            result = next with { Iterations = steps, Converged = next.Converged && moved <= 1e-8 };
            if (moved <= 1e-8) break;
        }

        return result;
    }

    private static FitResult Descend(FitProblem problem, double[]? weights)
    {
        var n = problem.Parameters.Count;
        var at = problem.Parameters.Select(p => Snapped(Math.Clamp(p.Start, p.Lower, p.Upper), p)).ToArray();
        var residuals = new double[problem.Count];
        problem.Residuals(at, residuals);
        if (!residuals.All(double.IsFinite)) throw new ArgumentException("Its residuals are not finite at the start.", nameof(problem));
        var roots = weights?.Select(Math.Sqrt).ToArray();
        var jacobian = new double[problem.Count, n];
        var trial = new double[problem.Count];
        var lengths = problem.Parameters.Select(p => Unfelt / p.Scale).ToArray();
        var (damping, converged, quiet, steps) = (0.0, false, 0, 0);
        var sum = Sum(residuals, roots);
        var fresh = true;
        var (best, idle) = (sum, 0);
        while (steps < MostSteps && !converged && sum > 0)
        {
            steps++;
            if (sum < (best * (1 - Rounding)) - Nothing)
            {
                (best, idle) = (sum, 0);
            }
            else if (++idle >= MostIdle)
            {
                converged = true;
                break;
            }

            if (fresh) Linearise();
            var linear = new LinearStep(problem, at, residuals, jacobian, roots, lengths);
            if (linear.Solve(damping) is not var (moved, left))
            {
                if (!Damp()) break;
                continue;
            }

            problem.Residuals(moved, trial);
            var reached = Sum(trial, roots);
            var promised = sum - left;
            var isRounding = promised <= (Rounding * sum) + Nothing;
            if (!(isRounding ? reached <= (sum * (1 + Rounding)) + Nothing : sum - reached >= 1e-4 * promised))
            {
                // Nothing more to gain that is not rounding: the point stays.
                if (isRounding && damping == 0) converged = true;
                else if (!Damp()) break;
                continue;
            }

            var size = Enumerable.Range(0, n).Max(j => RelativeStep(problem, at[j], moved[j] - at[j], j));
            (at, sum, fresh) = (moved, reached, true);
            trial.CopyTo(residuals, 0);
            quiet = isRounding ? quiet + 1 : 0;
            converged = damping <= LeastDamping && (size <= SmallStep || quiet >= 3);
            damping = damping <= LeastDamping ? 0 : damping / 10;
        }

        if (sum == 0) converged = true;
        FitJacobian.Fill(problem, at, residuals, jacobian);
        return FitResult.Of(problem, at, residuals, jacobian, weights, steps, converged);

        void Linearise()
        {
            FitJacobian.Fill(problem, at, residuals, jacobian);
            for (var j = 0; j < n; j++)
            {
                var length = 0.0;
                for (var i = 0; i < problem.Count; i++) length += jacobian[i, j] * jacobian[i, j] * (weights?[i] ?? 1);
                lengths[j] = Math.Max(lengths[j], Math.Sqrt(length));
            }

            fresh = false;
        }

        bool Damp()
        {
            damping = damping == 0 ? FirstDamping : damping * 10;
            return damping <= MostDamping;
        }
    }

    /// <summary>The value, or the bound that it all but touches.</summary>
    private static double Snapped(double value, FitParameter p)
    {
        if (value - p.Lower <= Touching * p.Scale) return p.Lower;
        return p.Upper - value <= Touching * p.Scale ? p.Upper : value;
    }

    private static double RelativeStep(FitProblem problem, double at, double step, int j) =>
        Math.Abs(step) / (Math.Abs(at) + problem.Parameters[j].Scale);

    private static double Sum(double[] residuals, double[]? roots)
    {
        var sum = 0.0;
        for (var i = 0; i < residuals.Length; i++)
        {
            var r = residuals[i] * (roots?[i] ?? 1);
            sum += r * r;
        }

        return sum;
    }

    /// <summary>The problem made linear around a point, in steps multiplied by the lengths of the columns.</summary>
    private sealed class LinearStep
    {
        private readonly Matrix<double> _scaled;
        private readonly Vector<double> _right;
        private readonly double[] _at, _units, _low, _high;
        private readonly IReadOnlyList<FitParameter> _parameters;

        public LinearStep(FitProblem problem, double[] at, double[] residuals, double[,] jacobian, double[]? roots, double[] lengths)
        {
            (_at, _parameters) = (at, problem.Parameters);
            _units = lengths.Select((l, j) => l > 0 && double.IsFinite(l) ? l : 1 / problem.Parameters[j].Scale).ToArray();
            _scaled = Matrix<double>.Build.Dense(residuals.Length, at.Length, (i, j) => jacobian[i, j] * (roots?[i] ?? 1) / _units[j]);
            _right = Vector<double>.Build.Dense(residuals.Length, i => -residuals[i] * (roots?[i] ?? 1));
            _low = at.Select((p, j) => Math.Min((problem.Parameters[j].Lower - p) * _units[j], 0)).ToArray();
            _high = at.Select((p, j) => Math.Max((problem.Parameters[j].Upper - p) * _units[j], 0)).ToArray();
        }

        /// <summary>
        /// Where the step leads and the sum of squares that the linear problem promises there, or null where columns repeat each
        /// other and nothing damps them.
        /// </summary>
        public (double[] Moved, double Left)? Solve(double damping)
        {
            if (!_scaled.Enumerate().All(double.IsFinite)) return null;
            var n = _units.Length;
            var (matrix, right) = (_scaled, _right);
            if (damping > 0)
            {
                matrix = _scaled.Stack(Matrix<double>.Build.DenseDiagonal(n, Math.Sqrt(damping)));
                right = Vector<double>.Build.Dense(_right.Count + n, i => i < _right.Count ? _right[i] : 0);
            }

            if (BoundedLinear.Solve(matrix, right, _low, _high) is not { } step || !step.All(double.IsFinite)) return null;
            var left = _right - (_scaled * Vector<double>.Build.Dense(step));
            // At a bound of the step the parameter is at its own, exactly.
            var moved = step.Select((s, j) => s == _low[j] ? _parameters[j].Lower
                : s == _high[j] ? _parameters[j].Upper
                : Snapped(Math.Clamp(_at[j] + (s / _units[j]), _parameters[j].Lower, _parameters[j].Upper), _parameters[j])).ToArray();
            return (moved, left.DotProduct(left));
        }
    }
}
