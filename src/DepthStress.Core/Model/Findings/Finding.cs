using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Model;

/// <summary>An interval of measured depth, m.</summary>
/// <param name="Top">Measured depth of its first sample.</param>
/// <param name="Base">Measured depth of its last sample.</param>
public readonly record struct DepthRange(double Top, double Base);

/// <summary>Something about the results that a reader should know.</summary>
/// <param name="Severity">How much it matters.</param>
/// <param name="Text">What it is; quantities in it are shown in the reader's units.</param>
/// <param name="Samples">How many samples it touches; zero when it is about the well as a whole.</param>
/// <param name="Where">The touched intervals, from top to bottom.</param>
public sealed record Finding(Severity Severity, FormattableString Text, int Samples, IReadOnlyList<DepthRange> Where)
{
    /// <summary>A finding about the well as a whole.</summary>
    public static Finding General(Severity severity, FormattableString text) => new(severity, text, 0, []);

    /// <summary>A finding about samples, or null when no sample is marked. Neighbouring samples are joined.</summary>
    public static Finding? About(Severity severity, FormattableString text, ReadOnlySpan<double> measuredDepth, ReadOnlySpan<bool> marked)
    {
        var where = new List<DepthRange>();
        var samples = 0;
        for (var i = 0; i < marked.Length; i++)
        {
            if (!marked[i]) continue;
            var start = i;
            while (i + 1 < marked.Length && marked[i + 1]) i++;
            samples += i - start + 1;
            where.Add(new DepthRange(measuredDepth[start], measuredDepth[i]));
        }

        return samples == 0 ? null : new Finding(severity, text, samples, where);
    }
}
