namespace SampleWell.Hidden;

/// <summary>Even steps of measured depth, four to a log sample, so that beds and sums are finer than what the logs see.</summary>
public sealed class FineGrid
{
    /// <summary>Steps between two log samples.</summary>
    public const int PerSample = 4;

    /// <summary>Lays the grid over the logged part of a well.</summary>
    public FineGrid(WellPlan plan)
    {
        Samples = plan.HalfFeet.Last - plan.HalfFeet.First + 1;
        Step = Physics.HalfFoot / PerSample;
        Md = new double[(Samples - 1) * PerSample + 1];
        for (var i = 0; i < Md.Length; i++)
            Md[i] = (plan.HalfFeet.First * PerSample + i) * Step;
    }

    /// <summary>Count of log samples.</summary>
    public int Samples { get; }

    /// <summary>Step, m.</summary>
    public double Step { get; }

    /// <summary>Measured depths, m.</summary>
    public double[] Md { get; }

    /// <summary>The values at the log samples alone.</summary>
    public double[] AtSamples(double[] values)
    {
        var picked = new double[Samples];
        for (var i = 0; i < Samples; i++)
            picked[i] = values[i * PerSample];
        return picked;
    }

    /// <summary>Straight-line value at any measured depth; level beyond the ends.</summary>
    public double At(double[] values, double md)
    {
        var place = Math.Clamp((md - Md[0]) / Step, 0, Md.Length - 1);
        var i = Math.Min((int)place, Md.Length - 2);
        return values[i] + (place - i) * (values[i + 1] - values[i]);
    }

    /// <summary>Mean over an interval of measured depth.</summary>
    public double Mean(double[] values, double top, double bottom)
    {
        var first = Math.Clamp((int)Math.Ceiling((top - Md[0]) / Step), 0, Md.Length - 1);
        var last = Math.Clamp((int)((bottom - Md[0]) / Step), first, Md.Length - 1);
        var sum = 0.0;
        for (var i = first; i <= last; i++)
            sum += values[i];
        return sum / (last - first + 1);
    }
}
