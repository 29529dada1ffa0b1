using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Conditioning;

/// <summary>The choices for log conditioning; a step runs only where it is asked for.</summary>
public sealed record ConditioningSettings
{
    /// <summary>Curves that were logged off depth.</summary>
    public Setting<IReadOnlyList<CurveShift>> Shifts { get; init; }

    /// <summary>True takes out the constant ends that a parked tool leaves.</summary>
    public Setting<bool> Parked { get; init; }

    /// <summary>True takes out edges of gaps that were averaged with the missing-value code.</summary>
    public Setting<bool> NullSmear { get; init; }

    /// <summary>How spikes are found.</summary>
    public SpikeSettings Spikes { get; init; } = new();

    /// <summary>Where density is taken out as logged in an enlarged hole.</summary>
    public WashoutSettings Washout { get; init; } = new();

    /// <summary>The longest gap that a straight line bridges, m.</summary>
    public Setting<double> FillGaps { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public ConditioningSettings Over(ConditioningSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new ConditioningSettings
        {
            Shifts = Shifts.Over(below.Shifts),
            Parked = Parked.Over(below.Parked),
            NullSmear = NullSmear.Over(below.NullSmear),
            Spikes = Spikes.Over(below.Spikes),
            Washout = Washout.Over(below.Washout),
            FillGaps = FillGaps.Over(below.FillGaps),
        };
    }
}

/// <summary>A curve and how far it is moved.</summary>
/// <param name="Curve">The role's name in the well file.</param>
/// <param name="By">How far down, m; negative moves up.</param>
public readonly record struct CurveShift(string Curve, double By);

/// <summary>The choices for the spike filter.</summary>
public sealed record SpikeSettings
{
    /// <summary>Depth over which the usual step from sample to sample is taken, m.</summary>
    public Setting<double> Window { get; init; }

    /// <summary>How many robust standard deviations a step must exceed.</summary>
    public Setting<double> Threshold { get; init; }

    /// <summary>The curves that are filtered, by the role's name; an empty list means none.</summary>
    public Setting<IReadOnlyList<string>> Curves { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public SpikeSettings Over(SpikeSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new SpikeSettings
        {
            Window = Window.Over(below.Window),
            Threshold = Threshold.Over(below.Threshold),
            Curves = Curves.Over(below.Curves),
        };
    }
}

/// <summary>Which of the two signs of an enlarged hole must be there.</summary>
public enum WashoutRule
{
    /// <summary>One is enough.</summary>
    Either,

    /// <summary>Both at the same sample.</summary>
    Both,

    /// <summary>Density is never taken out.</summary>
    None,
}

/// <summary>The choices for washouts.</summary>
public sealed record WashoutSettings
{
    /// <summary>How much the hole's diameter exceeds the bit's, m.</summary>
    public Setting<double> CaliperExcess { get; init; }

    /// <summary>How much the density correction exceeds zero, up or down, kg/m3.</summary>
    public Setting<double> DensityCorrection { get; init; }

    /// <summary>Which of the two must be there.</summary>
    public Setting<WashoutRule> Rule { get; init; }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public WashoutSettings Over(WashoutSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new WashoutSettings
        {
            CaliperExcess = CaliperExcess.Over(below.CaliperExcess),
            DensityCorrection = DensityCorrection.Over(below.DensityCorrection),
            Rule = Rule.Over(below.Rule),
        };
    }
}
