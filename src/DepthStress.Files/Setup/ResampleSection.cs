using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Files.Setup;

/// <summary>The regular depth grid that all curves are brought onto, as far as the well file asks for one.</summary>
public sealed record ResampleSection
{
    /// <summary>Distance between depths, m.</summary>
    public Setting<double> Step { get; init; }

    /// <summary>How samples are made.</summary>
    public Setting<ResampleMethod> Method { get; init; }

    /// <summary>The longest distance between logged samples that is bridged, m.</summary>
    public Setting<double> MaxGap { get; init; }

    /// <summary>Where it stands; null where the file has none.</summary>
    public SourcePosition? Position { get; init; }

    /// <summary>The same for the logs; null unless everything is stated.</summary>
    public Resampling? Rule => Step.IsSet && Method.IsSet && MaxGap.IsSet ? new Resampling(Step.Value, Method.Value, MaxGap.Value) : null;

    /// <summary>Reports what is not stated: nothing about the depths of the results is chosen silently.</summary>
    internal void Check(DiagnosticBag diagnostics)
    {
        if (Position is not { } position) return;
        foreach (var (key, isSet, expected) in new[]
        {
            ("step", Step.IsSet, "the distance between depths, such as \"0.1524 m\""),
            ("method", Method.IsSet, "\"linear\" or \"mean\""),
            ("max_gap", MaxGap.IsSet, "the longest distance between logged samples that is bridged, such as \"1 m\""),
        })
        {
            if (!isSet) diagnostics.Error(position, $"[resample] {key} is not set; expected {expected}");
        }
    }
}
