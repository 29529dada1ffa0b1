namespace DepthStress.Core.Calibration;

/// <summary>Derivatives of residuals: the problem's own, else by differences that stay within the bounds unless these lie closer together than a step.</summary>
internal static class FitJacobian
{
    // The step that balances the error of a central difference (step squared) against rounding (epsilon over step).
    private static readonly double Relative = Math.Cbrt(Math.BitIncrement(1.0) - 1);

    /// <summary>Fills the derivatives.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="at">The parameters.</param>
    /// <param name="residuals">The residuals there.</param>
    /// <param name="jacobian">Gets the derivatives.</param>
    public static void Fill(FitProblem problem, double[] at, double[] residuals, double[,] jacobian)
    {
        if (problem.Jacobian is { } own)
        {
            own(at, jacobian);
            return;
        }

        var (below, above, moved) = (new double[problem.Count], new double[problem.Count], (double[])at.Clone());
        for (var j = 0; j < at.Length; j++)
        {
            var p = problem.Parameters[j];
            var step = Relative * Math.Max(Math.Abs(at[j]), p.Scale);
            var (low, high) = p.Lower == p.Upper ? (at[j], at[j]) : (Math.Max(at[j] - step, p.Lower), Math.Min(at[j] + step, p.Upper));
            // Between bounds closer together than a step a difference would be rounding.
            if (high > low && high - low < step) (low, high) = (at[j] - step, at[j] + step);
            Evaluate(low, below);
            Evaluate(high, above);
            for (var i = 0; i < problem.Count; i++)
            {
                // One-sided where the other side lies out of bounds or has no residual.
                var (from, fromValue) = double.IsFinite(below[i]) ? (low, below[i]) : (at[j], residuals[i]);
                var (to, toValue) = double.IsFinite(above[i]) ? (high, above[i]) : (at[j], residuals[i]);
                jacobian[i, j] = to > from ? (toValue - fromValue) / (to - from) : 0;
            }

            moved[j] = at[j];

            void Evaluate(double value, double[] destination)
            {
                if (value == at[j])
                {
                    residuals.CopyTo(destination, 0);
                    return;
                }

                moved[j] = value;
                problem.Residuals(moved, destination);
            }
        }
    }
}
