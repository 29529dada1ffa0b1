using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>
/// The normal trends of a well. What is not given is fitted to shale of the stated interval, on the samples of every run that has the same
/// trend settings, whatever the method there: a zone with settings of its own has a trend of its own.
/// </summary>
internal sealed class TrendStage(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, bool[] shale, PressureOutcome outcome)
{
    private readonly Dictionary<(TrendQuantity, Key), NormalTrend?> _known = [];
    private bool _picked;

    /// <summary>The column of a trend's values.</summary>
    public static Property NormalOf(TrendQuantity quantity) => quantity switch
    {
        TrendQuantity.Slowness => Property.NormalSlowness,
        TrendQuantity.Resistivity => Property.NormalResistivity,
        _ => Property.NormalPorosity,
    };

    /// <summary>The trend of some settings, fitted once; null when it cannot be, the reason then among the problems.</summary>
    public NormalTrend? For(StageSettings settings, TrendQuantity quantity)
    {
        var pore = settings.PorePressure;
        if (quantity == TrendQuantity.Slowness && pore.Trend.IsSet) return new TrendLine(pore.Trend.Value);
        var key = (quantity, Key.Of(settings));
        if (_known.TryGetValue(key, out var trend)) return trend;
        var fitted = pore.NormalTrend.IsWhole(quantity) ? Given(quantity, pore.NormalTrend) : Fit(quantity, key.Item2);
        if (fitted is not null)
        {
            outcome.Trends.Add(fitted);
            outcome.Findings.AddRange(TrendWords.Of(fitted, setup));
        }

        _known.Add(key, fitted?.Trend);
        return fitted?.Trend;
    }

    private static FittedTrend Given(TrendQuantity quantity, NormalTrendSettings given)
    {
        var slowness = quantity == TrendQuantity.Slowness;
        var trend = new ExponentialTrend(quantity, given.Surface(quantity).Value, slowness ? given.MatrixSlowness.Value : 0, given.ScaleLength.Value);
        var (name, dimension) = quantity switch
        {
            TrendQuantity.Slowness => ("surface_slowness", Dimension.Slowness),
            TrendQuantity.Resistivity => ("surface_resistivity", Dimension.Resistivity),
            _ => ("surface_porosity", Dimension.Fraction),
        };
        TrendParameter Parameter(string key, double value, Dimension d) => new(key, value, 0, d, TrendParameterKind.Given);
        return new FittedTrend
        {
            Trend = trend,
            Parameters =
            [
                Parameter(name, trend.Surface, dimension),
                .. slowness ? [Parameter("matrix_slowness", trend.Limit, dimension)] : (TrendParameter[])[],
                Parameter("scale_length", trend.Length, Dimension.Length),
            ],
            Top = double.NaN,
            Base = double.NaN,
        };
    }

    private FittedTrend? Fit(TrendQuantity quantity, Key key)
    {
        var given = key.Trend;
        var members = runs.Where(r => Key.Of(r.Settings) == key).ToList();
        var (top, bottom) = (ZoneIndex.ToVertical(setup, given.Top.Value, given.DepthKind.Value), ZoneIndex.ToVertical(setup, given.Base.Value, given.DepthKind.Value));
        var picks = Pick(quantity, members, top, bottom);
        var solidTop = setup.Frame.SolidTopTvd;
        var tvd = table.Read(Property.TrueVerticalDepth);
        var depth = new double[picks.Count];
        var raw = new double[picks.Count];
        for (var k = 0; k < depth.Length; k++) (depth[k], raw[k]) = (tvd[picks[k]] - solidTop, table.Read(LogOf(quantity))[picks[k]]);
        if (depth.Length < TrendFitter.LeastSamples)
        {
            outcome.Problems.Add((given.Top.Source.Position, $"[pore_pressure.normal_trend]: found {depth.Length} shale samples with {Words(quantity)} between {Quantity.Length(top)} and {Quantity.Length(bottom)} true vertical depth, expected at least {TrendFitter.LeastSamples}"));
            return null;
        }

        var values = raw;
        if (given.Smoothing.IsSet) RunningWindow.Fill(depth, raw, given.Window.Value, given.Smoothing.Value, values = new double[raw.Length]);
        var fitted = TrendFitter.Fit(quantity, given, depth, values, out var problem);
        if (fitted is null)
        {
            outcome.Problems.Add((given.Top.Source.Position, $"[pore_pressure.normal_trend] between {Quantity.Length(top)} and {Quantity.Length(bottom)} true vertical depth: {problem!}"));
            return null;
        }

        if (quantity == TrendQuantity.Slowness) Show(picks, values);
        var one = setup.Zones.Count > 0 && members.TrueForAll(r => r.Zone == members[0].Zone);
        return fitted with { Top = depth[0] + solidTop, Base = depth[^1] + solidTop, Zone = one ? members[0].Zone : ZoneIndex.None };
    }

    /// <summary>Shale samples with a value in the interval, from top to bottom; a hole that climbs gives none twice as deep.</summary>
    private List<int> Pick(TrendQuantity quantity, List<SettingsRun> members, double top, double bottom)
    {
        var picks = new List<int>();
        if (!table.Has(LogOf(quantity))) return picks;
        var log = table.Read(LogOf(quantity));
        var tvd = table.Read(Property.TrueVerticalDepth);
        var sv = table.Read(Property.VerticalStress);
        foreach (var run in members)
        {
            for (var i = run.Start; i < run.End; i++)
            {
                if (shale[i] && log[i] > 0 && !double.IsNaN(sv[i]) && tvd[i] >= top && tvd[i] <= bottom && tvd[i] > setup.Frame.SolidTopTvd
                    && (picks.Count == 0 || tvd[i] >= tvd[picks[^1]]))
                {
                    picks.Add(i);
                }
            }
        }

        return picks;
    }

    private void Show(List<int> picks, double[] values)
    {
        var shown = table.Write(Property.PickedSlowness);
        if (!_picked) shown.Fill(double.NaN);
        _picked = true;
        for (var k = 0; k < values.Length; k++) shown[picks[k]] = values[k];
    }

    private static Property LogOf(TrendQuantity quantity) => quantity switch
    {
        TrendQuantity.Slowness => Property.CompressionalSlowness,
        TrendQuantity.Resistivity => Property.DeepResistivity,
        _ => Property.Porosity,
    };

    /// <summary>The quantity in words.</summary>
    public static string Words(TrendQuantity quantity) => quantity switch
    {
        TrendQuantity.Slowness => "slowness",
        TrendQuantity.Resistivity => "resistivity",
        _ => "porosity",
    };

    /// <summary>What makes two trends the same one.</summary>
    private sealed record Key(NormalTrendSettings Trend, Setting<double> Cutoff, Setting<IReadOnlyList<string>> Lithologies)
    {
        public static Key Of(StageSettings settings) =>
            new(settings.PorePressure.NormalTrend, settings.PorePressure.ShaleCutoff, settings.PorePressure.ShaleLithologies);
    }
}
