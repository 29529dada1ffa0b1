using DepthStress.Core.Diagnostics;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>A fitted normal trend in words.</summary>
internal static class TrendWords
{
    /// <summary>Its parameters with their standard errors, and the bounds that stopped one.</summary>
    public static IEnumerable<Finding> Of(FittedTrend trend, WellSetup setup)
    {
        var quantity = TrendStage.Words(trend.Trend.Quantity);
        var owner = trend.Zone < 0 ? "" : $" in {setup.Zones[trend.Zone].Name}";
        var parameters = trend.Parameters.Select(One).Aggregate((a, b) => $"{a}, {b}");
        if (trend.Samples == 0)
        {
            yield return Finding.General(Severity.Note, $"normal trend of {quantity}{owner}: {parameters}; given, not fitted");
            yield break;
        }

        FormattableString scatter = trend.Trend.Quantity == TrendQuantity.Resistivity
            ? (FormattableString)$"a factor of {new Quantity(Math.Exp(trend.Scatter), Dimension.Fraction)}"
            : $"{new Quantity(trend.Scatter, trend.Parameters[0].Dimension)}";
        yield return Finding.General(
            Severity.Note,
            $"normal trend of {quantity}{owner}: {parameters}; fitted to {trend.Samples} shale samples, worth {Math.Round(trend.Effective)} independent ones, from {Quantity.Length(trend.Top)} to {Quantity.Length(trend.Base)} true vertical depth, scatter {scatter}");
        foreach (var held in trend.Parameters.Where(p => p.Kind == TrendParameterKind.AtBound))
            yield return Finding.General(Severity.Warning, $"normal trend of {quantity}{owner}: the shale does not tell {held.Key}, it stopped at the bound of {new Quantity(held.Value, held.Dimension)}; give it in [pore_pressure.normal_trend]");
    }

    private static FormattableString One(TrendParameter p) => p.Kind switch
    {
        TrendParameterKind.Given => $"{p.Key} {new Quantity(p.Value, p.Dimension)} (given)",
        TrendParameterKind.AtBound => $"{p.Key} {new Quantity(p.Value, p.Dimension)} (at its bound)",
        _ => $"{p.Key} {new Quantity(p.Value, p.Dimension)} +- {new Quantity(p.Error, p.Dimension)}",
    };
}
