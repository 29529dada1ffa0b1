using System.Globalization;
using System.Text.Json.Nodes;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>What a change of pore pressure does to a zone, in words and as part of the record of a run.</summary>
public static class DepletionText
{
    /// <summary>One line for a zone.</summary>
    public static string Line(DepletionResult result, EarthModel model, UnitSystem units)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(model);
        string Show(double si) => units.Show(Quantity.Pressure(si));
        var name = result.Zone < 0 ? (model.Setup.Zones.Count == 0 ? "whole log" : "outside the zones") : model.ZoneName(result.Zone);
        var towards = result.NewDistance < result.Distance ? "towards" : "away from";
        return string.Create(
            CultureInfo.InvariantCulture,
            $"Pressure change {Show(result.PressureChange)} in {name}: Shmin follows by {result.Coefficient:F3} of it, from {Show(result.Shmin)} to {Show(result.NewShmin)} on average; {towards} normal faulting, {Place(result.NewDistance, Show)} its frictional limit after, {Place(result.Distance, Show)} it before (a path of {result.Neutral:F3} would stay){Odd(result)}.");
    }

    /// <summary>The record of a zone, SI prefixed as named.</summary>
    public static JsonObject Json(DepletionResult result, EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(model);
        static double Megapascal(double si) => Math.Round(Units.Megapascal.FromSi(si), 4);
        return new JsonObject
        {
            ["zone"] = model.ZoneName(result.Zone),
            ["pressure_change_mpa"] = Megapascal(result.PressureChange),
            ["path_coefficient"] = Math.Round(result.Coefficient, 6),
            ["neutral_coefficient"] = Math.Round(result.Neutral, 6),
            ["shmin_mpa"] = Megapascal(result.Shmin),
            ["new_shmin_mpa"] = Megapascal(result.NewShmin),
            ["above_frictional_limit_mpa"] = Megapascal(result.Distance),
            ["new_above_frictional_limit_mpa"] = Megapascal(result.NewDistance),
            ["samples"] = result.Samples,
            ["samples_beyond_limit_by_the_change"] = result.BeyondLimit,
            ["samples_with_negative_pressure"] = result.NegativePressure,
        };
    }

    private static string Place(double distance, Func<double, string> show) => $"{show(Math.Abs(distance))} {(distance < 0 ? "below" : "above")}";

    private static string Odd(DepletionResult result)
    {
        var beyond = result.BeyondLimit > 0 ? string.Create(CultureInfo.InvariantCulture, $"; {result.BeyondLimit} samples pass the limit by it") : "";
        return result.NegativePressure == 0 ? beyond : string.Create(CultureInfo.InvariantCulture, $"{beyond}; warning: in {result.NegativePressure} samples the pore pressure would fall below zero");
    }
}
