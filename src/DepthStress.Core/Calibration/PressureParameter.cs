using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Calibration;

/// <summary>A parameter of the pore pressure that formation pressures can determine.</summary>
/// <param name="Section">Section of the well file that holds it.</param>
/// <param name="Key">Its key there.</param>
/// <param name="Dimension">What it measures.</param>
/// <param name="Fit">Its start and bounds, SI.</param>
/// <param name="Put">The setup with a value of it put in.</param>
public sealed record PressureParameter(
    string Section, string Key, Dimension Dimension, FitParameter Fit, Func<WellSetup, double, WellSetup> Put)
{
    /// <summary>A trend's parameter may change by this factor either way.</summary>
    private const double Reach = 5;

    private static SettingSource Calibrated { get; } = new(SettingKind.Calibrated, SourcePosition.None);

    /// <summary>The parameters that the settings free; problems are reported.</summary>
    public static IReadOnlyList<PressureParameter> Of(EarthModel model, CalibrationSettings settings, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(settings);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var parameters = new List<PressureParameter>();
        var position = settings.Free.Source.Position;
        if (settings.Frees(FreeParameter.PressureExponent))
        {
            if (Exponent(model) is { } exponent) parameters.Add(exponent);
            else diagnostics.Error(position, "[calibration] free: found pressure_exponent, expected an Eaton method as [pore_pressure] method of the well: only those have an exponent");
        }

        if (settings.Frees(FreeParameter.NormalTrend))
        {
            var trend = model.Trends.FirstOrDefault(t => t.Zone < 0);
            if (trend is null) diagnostics.Error(position, "[calibration] free: found normal_trend, expected [pore_pressure.normal_trend] of the well: there is no exponential trend to change");
            else parameters.AddRange(Trend(trend));
        }

        return parameters;
    }

    private static PressureParameter? Exponent(EarthModel model)
    {
        var settings = model.Setup.Settings.PorePressure;
        var law = model.LawUses.FirstOrDefault(u => u.Slot.Key == LawSlots.PorePressure.Key && u.Law.Coefficients is [{ Symbol: "n" }])?.Law;
        if (law is null) return null;
        var start = settings.Exponent.IsSet ? settings.Exponent.Value : law.Coefficients[0].Value;
        return new(
            "pore_pressure", "exponent", Dimension.None, new FitParameter(start, 0.1, 10, 1),
            (setup, value) => Change(setup, p => p with { Exponent = new(value, Calibrated) }));
    }

    private static IEnumerable<PressureParameter> Trend(FittedTrend fitted)
    {
        var trend = fitted.Trend;
        var (key, put) = ((string, Func<NormalTrendSettings, double, NormalTrendSettings>))(trend.Quantity switch
        {
            TrendQuantity.Slowness => ("surface_slowness", (t, v) => t with { SurfaceSlowness = new(v, Calibrated), MatrixSlowness = t.MatrixSlowness.IsSet ? t.MatrixSlowness : new(trend.Limit, Calibrated) }),
            TrendQuantity.Resistivity => ("surface_resistivity", (t, v) => t with { SurfaceResistivity = new(v, Calibrated) }),
            _ => ("surface_porosity", (t, v) => t with { SurfacePorosity = new(v, Calibrated) }),
        });
        var dimension = trend.Quantity switch { TrendQuantity.Slowness => Dimension.Slowness, TrendQuantity.Resistivity => Dimension.Resistivity, _ => Dimension.Fraction };
        var lowest = trend.Quantity == TrendQuantity.Slowness ? trend.Limit * 1.01 : trend.Surface / Reach;
        yield return new(
            "pore_pressure.normal_trend", key, dimension, new FitParameter(trend.Surface, lowest, trend.Surface * Reach, trend.Surface),
            (setup, value) => Change(setup, p => p with { NormalTrend = put(p.NormalTrend, value) }));
        yield return new(
            "pore_pressure.normal_trend", "scale_length", Dimension.Length, new FitParameter(trend.Length, trend.Length / Reach, trend.Length * Reach, trend.Length),
            (setup, value) => Change(setup, p => p with { NormalTrend = p.NormalTrend with { ScaleLength = new(value, Calibrated) } }));
    }

    private static WellSetup Change(WellSetup setup, Func<PorePressureSettings, PorePressureSettings> change) =>
        setup with { Settings = setup.Settings with { PorePressure = change(setup.Settings.PorePressure) } };
}
