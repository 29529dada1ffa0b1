using System.Text.Json.Nodes;
using DepthStress.Core.Calibration;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>The comparison with core as part of the record of a run; metric units, as the names say.</summary>
internal static class CoreJson
{
    /// <summary>The record.</summary>
    public static JsonObject Of(CoreComparison core) => new()
    {
        ["plugs"] = core.Rows.Count,
        ["moduli"] = Array(core.Groups.Select(g => Group(g, core.At))),
        ["ucs"] = Array(core.Ucs.Select(u => (JsonNode)new JsonObject { ["group"] = u.Name, ["model_minus_plug"] = Show(u.Difference, Units.Megapascal, "mpa") })),
        ["depth_match"] = core.Match is not { } m ? null : new JsonObject
        {
            ["shift_m"] = Round(m.Shift),
            ["gain"] = Round(m.Gain),
            ["lowest_m"] = Round(m.Low),
            ["greatest_m"] = Round(m.High),
            ["plugs"] = m.Plugs,
            ["determined"] = m.Determined,
        },
    };

    private static JsonObject Group(CoreGroup group, PlugDepth at) => new()
    {
        ["group"] = group.Name,
        ["plugs"] = group.Rows.Count,
        ["least_confining_pressure_mpa"] = Round(Units.Megapascal.FromSi(group.Confining.Least)),
        ["greatest_confining_pressure_mpa"] = Round(Units.Megapascal.FromSi(group.Confining.Greatest)),
        ["youngs_static_model_minus_plug"] = Show(group.Youngs, Units.Gigapascal, "gpa"),
        ["poisson_static_model_minus_plug"] = Show(group.Poisson, Units.One, ""),
        ["plug_on_dynamic_modulus"] = group.Line is not { } line ? null : new JsonObject
        {
            ["intercept_gpa"] = Show(line.Intercept, Units.Gigapascal),
            ["slope"] = Show(line.Slope, Units.One),
            ["deviation_gpa"] = Round(Units.Gigapascal.FromSi(line.Deviation)),
        },
        ["plug_on_dynamic_modulus_through_origin"] = group.ThroughOrigin is { } slope ? Show(slope, Units.One) : null,
        ["static_youngs_factor"] = group.Factor is { } factor ? Show(factor, Units.One) : null,
        ["laws"] = Array(group.Laws(at).Select(l => (JsonNode)new JsonObject
        {
            ["method"] = l.Law.Id,
            ["recalled"] = l.Law.Standing == Standing.FromMemory,
            ["plugs"] = l.Count,
            ["mean_misfit_gpa"] = Round(Units.Gigapascal.FromSi(l.Mean)),
            ["rms_misfit_gpa"] = Round(Units.Gigapascal.FromSi(l.RootMeanSquare)),
        })),
    };

    private static JsonObject? Show(Difference? difference, Unit unit, string suffix) => difference is null ? null : new JsonObject
    {
        ["plugs"] = difference.Count,
        ["mean" + (suffix.Length > 0 ? "_" + suffix : "")] = Round(unit.FromSi(difference.Mean)),
        ["rms" + (suffix.Length > 0 ? "_" + suffix : "")] = Round(unit.FromSi(difference.RootMeanSquare)),
    };

    private static JsonObject Show(FitValue estimate, Unit unit) => new()
    {
        ["value"] = Round(unit.FromSi(estimate.Value)),
        ["standard_error"] = Round(unit.FromSi(estimate.Error)),
        ["low_95"] = Round(unit.FromSi(estimate.Low)),
        ["high_95"] = Round(unit.FromSi(estimate.High)),
    };

    private static JsonNode? Round(double value) => double.IsFinite(value) ? Math.Round(value, 6) : null;

    private static JsonArray Array(IEnumerable<JsonNode> items) => new([.. items]);
}
