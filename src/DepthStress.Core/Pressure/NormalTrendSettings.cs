using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Core.Pressure;

/// <summary>An exponential normal trend: where its shale is picked, and the parameters that are given; the others are estimated.</summary>
public sealed record NormalTrendSettings
{
    /// <summary>Top of the normally compacted interval, m.</summary>
    public Setting<double> Top { get; init; }

    /// <summary>Its base, m.</summary>
    public Setting<double> Base { get; init; }

    /// <summary>The kind of these depths.</summary>
    public Setting<DepthKind> DepthKind { get; init; }

    /// <summary>How the log is smoothed before the fit; not set means not at all.</summary>
    public Setting<Smoothing> Smoothing { get; init; }

    /// <summary>Height of the smoothing window along the vertical, m.</summary>
    public Setting<double> Window { get; init; }

    /// <summary>Slowness at the ground or mudline, s/m.</summary>
    public Setting<double> SurfaceSlowness { get; init; }

    /// <summary>Slowness that great depth tends to, s/m.</summary>
    public Setting<double> MatrixSlowness { get; init; }

    /// <summary>Resistivity at the ground or mudline, ohm.m.</summary>
    public Setting<double> SurfaceResistivity { get; init; }

    /// <summary>Porosity at the ground or mudline, v/v.</summary>
    public Setting<double> SurfacePorosity { get; init; }

    /// <summary>Depth over which the exponential changes by a factor e, m: one over the c or b of the usual notation.</summary>
    public Setting<double> ScaleLength { get; init; }

    /// <summary>The value at the ground or mudline of a quantity.</summary>
    public Setting<double> Surface(TrendQuantity quantity) => quantity switch
    {
        TrendQuantity.Slowness => SurfaceSlowness,
        TrendQuantity.Resistivity => SurfaceResistivity,
        _ => SurfacePorosity,
    };

    /// <summary>True when no parameter of a quantity's trend is left to be estimated.</summary>
    public bool IsWhole(TrendQuantity quantity) =>
        Surface(quantity).IsSet && ScaleLength.IsSet && (quantity != TrendQuantity.Slowness || MatrixSlowness.IsSet);

    /// <summary>True when anything but the picking is given, or an interval to pick from.</summary>
    public bool Says(TrendQuantity quantity) => IsWhole(quantity) || Top.IsSet || Base.IsSet || Surface(quantity).IsSet || MatrixSlowness.IsSet || ScaleLength.IsSet;

    /// <summary>The same settings with the parameters of a trend put in, as estimates.</summary>
    public NormalTrendSettings With(ExponentialTrend trend)
    {
        ArgumentNullException.ThrowIfNull(trend);
        static Setting<double> Put(Setting<double> given, double value) =>
            given.IsSet ? given : new(value, new SettingSource(SettingKind.Calibrated, SourcePosition.None));
        return this with
        {
            SurfaceSlowness = trend.Quantity == TrendQuantity.Slowness ? Put(SurfaceSlowness, trend.Surface) : SurfaceSlowness,
            MatrixSlowness = trend.Quantity == TrendQuantity.Slowness ? Put(MatrixSlowness, trend.Limit) : MatrixSlowness,
            SurfaceResistivity = trend.Quantity == TrendQuantity.Resistivity ? Put(SurfaceResistivity, trend.Surface) : SurfaceResistivity,
            SurfacePorosity = trend.Quantity == TrendQuantity.Porosity ? Put(SurfacePorosity, trend.Surface) : SurfacePorosity,
            ScaleLength = Put(ScaleLength, trend.Length),
        };
    }

    /// <summary>These settings where they were decided, else those below them.</summary>
    public NormalTrendSettings Over(NormalTrendSettings below)
    {
        ArgumentNullException.ThrowIfNull(below);
        return new NormalTrendSettings
        {
            Top = Top.Over(below.Top),
            Base = Base.Over(below.Base),
            DepthKind = DepthKind.Over(below.DepthKind),
            Smoothing = Smoothing.Over(below.Smoothing),
            Window = Window.Over(below.Window),
            SurfaceSlowness = SurfaceSlowness.Over(below.SurfaceSlowness),
            MatrixSlowness = MatrixSlowness.Over(below.MatrixSlowness),
            SurfaceResistivity = SurfaceResistivity.Over(below.SurfaceResistivity),
            SurfacePorosity = SurfacePorosity.Over(below.SurfacePorosity),
            ScaleLength = ScaleLength.Over(below.ScaleLength),
        };
    }
}
