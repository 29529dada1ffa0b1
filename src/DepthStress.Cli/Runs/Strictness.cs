using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Cli.Runs;

/// <summary>Counts what <c>--strict</c> does not let pass.</summary>
internal static class Strictness
{
    /// <summary>Number of warnings among messages and findings.</summary>
    public static int CountWarnings(DiagnosticBag diagnostics, EarthModel model) =>
        diagnostics.Items.Count(d => d.Severity == Severity.Warning) + model.Findings.Count(f => f.Severity == Severity.Warning);
}
