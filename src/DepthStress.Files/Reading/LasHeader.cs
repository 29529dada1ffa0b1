using System.Globalization;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Reading;

/// <summary>What the sections before the data of a LAS file say.</summary>
internal sealed class LasHeader
{
    /// <summary>Version of the standard, 2 where the file does not say.</summary>
    public double Version { get; set; } = 2;

    /// <summary>True where a depth step may take several lines.</summary>
    public bool Wrapped { get; set; }

    /// <summary>The stated delimiter of the data, or null.</summary>
    public char? Delimiter { get; set; }

    /// <summary>Name of the well, or null.</summary>
    public string? Well { get; set; }

    /// <summary>Missing-value code, or null.</summary>
    public double? Null { get; set; }

    /// <summary>Stated first depth and its place.</summary>
    public (double Value, SourcePosition Position)? Start { get; set; }

    /// <summary>Stated last depth and its place.</summary>
    public (double Value, SourcePosition Position)? Stop { get; set; }

    /// <summary>Stated step and its place; 0 means that the steps differ.</summary>
    public (double Value, SourcePosition Position)? Step { get; set; }

    /// <summary>The curves in the order of the data.</summary>
    public List<ColumnHeader> Curves { get; } = [];

    /// <summary>Notes where the data, in the order of the file, do not bear out the stated first depth, last depth and step.</summary>
    public void Compare(DepthTrack depth, DiagnosticBag diagnostics)
    {
        var tolerance = 0.01 * Math.Abs(Step?.Value ?? 0);
        if (tolerance == 0) tolerance = 1e-6 * Math.Max(1, Math.Abs(depth.Last));
        if (Start is { } start && !(Math.Abs(start.Value - depth.First) <= tolerance))
        {
            diagnostics.Note(start.Position, string.Create(
                CultureInfo.InvariantCulture, $"STRT says {start.Value}, the data start at {depth.First}"));
        }

        if (Stop is { } stop && !(Math.Abs(stop.Value - depth.Last) <= tolerance))
        {
            diagnostics.Note(stop.Position, string.Create(
                CultureInfo.InvariantCulture, $"STOP says {stop.Value}, the data end at {depth.Last}"));
        }

        // Depths are often printed with too few digits for the step: half a step is a gap, less is rounding.
        var (low, high) = depth.Descends ? (-depth.MaxStep, -depth.MinStep) : (depth.MinStep, depth.MaxStep);
        if (Step is { Value: not 0 } step && depth.MaxStep > 0 && !(low / step.Value is >= 0.5 and <= 1.5 && high / step.Value is >= 0.5 and <= 1.5))
        {
            diagnostics.Note(step.Position, string.Create(
                CultureInfo.InvariantCulture,
                $"STEP says {step.Value}, the data have steps from {low:G6} to {high:G6}"));
        }
    }
}
