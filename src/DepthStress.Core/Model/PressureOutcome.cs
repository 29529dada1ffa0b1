using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>What the pore-pressure stage found beside its columns.</summary>
internal sealed class PressureOutcome
{
    /// <summary>The exponential trends it used.</summary>
    public List<FittedTrend> Trends { get; } = [];

    /// <summary>What a reader should know.</summary>
    public List<Finding> Findings { get; } = [];

    /// <summary>What makes the input unusable, and where it stands.</summary>
    public List<(SourcePosition Position, FormattableString Text)> Problems { get; } = [];

    /// <summary>Hands the problems over, each once; true when there are none.</summary>
    public bool Report(DiagnosticBag diagnostics, SourcePosition file)
    {
        foreach (var (position, text) in Problems.Select(p => (p.Position, UnitSystem.Metric.Show(p.Text))).Distinct())
            diagnostics.Error(position == SourcePosition.None ? file : position, text);
        return Problems.Count == 0;
    }
}
