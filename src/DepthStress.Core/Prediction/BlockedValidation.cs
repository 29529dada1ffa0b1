namespace DepthStress.Core.Prediction;

/// <summary>
/// Cross-validation by blocks of depth. Neighbouring samples of a log are not independent, so a sample is predicted from
/// blocks it does not belong to; what is left is the error that a gap as long as a block would have.
/// </summary>
public static class BlockedValidation
{
    /// <summary>The least length of log in a block, m: longer than beds and than the reach of the tools (common practice).</summary>
    public const double BlockLength = 20;

    /// <summary>The most blocks.</summary>
    public const int Most = 10;

    /// <summary>Fewer blocks say too little.</summary>
    public const int Least = 5;

    /// <summary>How many blocks so many rows at a step make; fewer than <see cref="Least"/> are too few.</summary>
    /// <param name="rows">Number of rows.</param>
    /// <param name="step">The usual distance between samples, m.</param>
    public static int Blocks(int rows, double step) => (int)Math.Min(Most, rows * step / BlockLength);

    /// <summary>The fold of each row when rows, in order of depth, are cut into equal contiguous blocks.</summary>
    public static int[] Contiguous(int rows, int blocks) => [.. Enumerable.Range(0, rows).Select(i => (int)((long)i * blocks / rows))];

    /// <summary>Root of the mean squared error of rows predicted from the other folds; NaN when a fold cannot be left out.</summary>
    /// <param name="predictors">One column per predictor.</param>
    /// <param name="target">What is to be met.</param>
    /// <param name="folds">The fold of each row.</param>
    public static double Error(IReadOnlyList<double[]> predictors, double[] target, int[] folds)
    {
        ArgumentNullException.ThrowIfNull(predictors);
        ArgumentNullException.ThrowIfNull(target);
        ArgumentNullException.ThrowIfNull(folds);
        double sum = 0;
        foreach (var fold in folds.Distinct().Order())
        {
            var kept = Enumerable.Range(0, target.Length).Where(i => folds[i] != fold).ToArray();
            if (LinearRegression.Fit([.. predictors.Select(p => Pick(p, kept))], Pick(target, kept)) is not { } line) return double.NaN;
            for (var i = 0; i < target.Length; i++)
            {
                if (folds[i] != fold) continue;
                var miss = line.At(predictors, i) - target[i];
                sum += miss * miss;
            }
        }

        return Math.Sqrt(sum / target.Length);
    }

    private static double[] Pick(double[] values, int[] rows) => Array.ConvertAll(rows, i => values[i]);
}
