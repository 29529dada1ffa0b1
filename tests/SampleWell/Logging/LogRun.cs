namespace SampleWell.Logging;

/// <summary>One logging run: a stretch of the half-foot grid and the curves on it.</summary>
/// <param name="File">Name of its file.</param>
/// <param name="FirstHalfFoot">Measured depth of its first sample, in half feet.</param>
/// <param name="Curves">Values by column name; <see cref="Curve.Missing"/> where there is none.</param>
public sealed record LogRun(string File, int FirstHalfFoot, IReadOnlyDictionary<string, double[]> Curves)
{
    /// <summary>Count of samples.</summary>
    public int Count => Curves["GR"].Length;

    /// <summary>Measured depth of a sample, m.</summary>
    public double Md(int index) => (FirstHalfFoot + index) * Physics.HalfFoot;

    /// <summary>Index of the first sample at or below a measured depth, within the run.</summary>
    public int Index(double md) => Math.Clamp((int)Math.Ceiling(md / Physics.HalfFoot) - FirstHalfFoot, 0, Count - 1);
}
