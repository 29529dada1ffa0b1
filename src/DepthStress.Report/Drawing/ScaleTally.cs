namespace DepthStress.Report.Drawing;

/// <summary>Counts values against a scale: the least and greatest on it, and how many lie beyond an end.</summary>
/// <param name="scale">The scale; one that follows the data has its widest ends.</param>
internal struct ScaleTally(CurveScale scale)
{
    private readonly double _low = scale.Low, _high = scale.High;

    /// <summary>The scale as it was given.</summary>
    public CurveScale Scale { get; } = scale;

    /// <summary>The least value on the scale; NaN without any value.</summary>
    public double Least { get; private set; } = double.NaN;

    /// <summary>The greatest value on the scale; NaN without any value.</summary>
    public double Greatest { get; private set; } = double.NaN;

    /// <summary>How many values lie beyond an end.</summary>
    public int OffScale { get; private set; }

    /// <summary>Counts a value; one that is not finite does not count.</summary>
    public void Add(double value)
    {
        if (!double.IsFinite(value)) return;
        if (value < _low || value > _high)
        {
            OffScale++;
            value = Math.Clamp(value, _low, _high);
        }

        if (!(value >= Least)) Least = value;
        if (!(value <= Greatest)) Greatest = value;
    }

    /// <summary>The scales of the curves of one track; those that follow the data share round ends.</summary>
    public static IReadOnlyList<CurveScale> Scales(IReadOnlyList<ScaleTally> curves)
    {
        var fitted = curves.Where(t => t.Scale.Fit != ScaleFit.Fixed).ToList();
        if (fitted.Count == 0) return [.. curves.Select(t => t.Scale)];
        var first = fitted[0].Scale;
        var low = first.Fit == ScaleFit.RightEnd ? first.Left : fitted.Min(t => t.Least);
        var shared = RoundSteps.Around(low, fitted.Max(t => t.Greatest), first.Divisions);
        return [.. curves.Select(t => t.Scale.Fit == ScaleFit.Fixed ? t.Scale : shared)];
    }
}
