using System.Reflection;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.Json.Nodes;
using DepthStress.Core.Calibration;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;

namespace DepthStress.Files.Writing;

/// <summary>
/// Writes <c>run.json</c>: program version, inputs with SHA-256, the resolved setup with who decided each value, every
/// message and finding, and the methods used with their sources. No clock, machine name or absolute path.
/// </summary>
public static class RunJson
{
    private static readonly JsonSerializerOptions Indented = new()
    {
        WriteIndented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>The program's version.</summary>
    public static string Version { get; } =
        typeof(RunJson).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()?.InformationalVersion ?? "";

    /// <summary>Writes the record of a run.</summary>
    /// <param name="file">The well file.</param>
    /// <param name="logs">The logs.</param>
    /// <param name="model">The model.</param>
    /// <param name="diagnostics">Every message.</param>
    /// <param name="core">Core beside the model, or null.</param>
    /// <param name="layers">The layers.</param>
    /// <param name="solved">What the program's own finite elements find in their column; or null.</param>
    /// <param name="destination">Gets the record; stays open.</param>
    public static void Write(
        WellFile file, IngestedLogs logs, EarthModel model, DiagnosticBag diagnostics, CoreComparison? core, LayerTable layers, IReadOnlyList<ColumnBlock>? solved, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(file);
        ArgumentNullException.ThrowIfNull(logs);
        ArgumentNullException.ThrowIfNull(model);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var units = file.Sections.Output.Units.Value;
        var setup = new RecordingSection();
        Bindings.All(setup, file.Sections);
        var json = new JsonObject
        {
            ["program"] = "DepthStress",
            ["version"] = Version,
            ["caution"] = Caution.Text,
            ["well"] = file.Setup.Name,
            ["datum"] = Datum(file.Setup),
            ["inputs"] = Array(file.Inputs.Concat(logs.Files.Select(f => new InputFile(f.Name, f.Sha256))).Select(i => new JsonObject
            {
                ["file"] = i.Name,
                ["sha256"] = i.Sha256,
            })),
            ["curves"] = Array(CurveQuality.Of(model).Select(Curve)),
            ["plausibility"] = Array(Plausibility.Of(model).Select(s => (JsonNode)units.Show(s))),
            ["setup"] = setup.Json,
            ["messages"] = Array(diagnostics.Items.Select(d => (JsonNode)d.ToString())),
            ["layered_rock"] = Array(VtiZone.Of(model).Select(z => Layered(model, z))),
            ["predictions"] = Array(model.Predictions.Select(Predicted)),
            ["trends"] = Array(model.Trends.Select(t => TrendRecord(model, t))),
            ["core"] = core is null ? null : CoreJson.Of(core),
            ["depletion"] = Array(DepletionResult.Of(model).Select(d => DepletionText.Json(d, model))),
            ["closed_loop"] = solved is null ? null : Loop(ClosedLoop.Of(layers, solved)),
            ["column_check"] = solved is null ? null : Array(solved.Select(b => new JsonObject
            {
                ["top_tvd_m"] = Number(b.Top),
                ["base_tvd_m"] = Number(b.Base),
                ["top_displacement_m"] = Math.Round(b.Displacement, 6),
                ["equilibrium_residual"] = Math.Round(b.Residual, 9),
                ["vertical_stress_error"] = Math.Round(b.Stress, 9),
            })),
            ["findings"] = Array(model.Findings.Select(f => (JsonNode)FindingText.Of(f, units, model.Count))),
            ["methods"] = Array(model.LawUses.GroupBy(u => (u.Slot, u.Law)).Select(u => Method(model, u))),
        };
        using var writer = new Utf8JsonWriter(destination, new JsonWriterOptions { Indented = true, NewLine = "\n", Encoder = Indented.Encoder });
        json.WriteTo(writer, Indented);
        writer.Flush();
        destination.Write("\n"u8);
    }

    private static JsonObject Loop(ClosedLoop loop) => new()
    {
        ["formula_share"] = Math.Round(loop.Formula.Share, 9),
        ["profile_share"] = Math.Round(loop.Profile.Share, 9),
        ["profile_difference_pa"] = Number(loop.Profile.Pressure),
        ["profile_stress"] = loop.Profile.Stress,
        ["profile_layer"] = loop.Profile.Layer,
    };

    private static JsonObject Datum(WellSetup setup)
    {
        var json = new JsonObject { ["datum"] = setup.Frame.Datum.Name() };
        foreach (var (name, _, metres) in DepthStatement.Surfaces(setup.Frame)) json[name + "_m"] = metres;
        foreach (var (name, meaning) in DepthStatement.Kinds) json[name] = meaning;
        return json;
    }

    private static JsonObject Curve(CurveQuality quality) => new()
    {
        ["role"] = quality.Role.Id,
        ["source"] = quality.Source,
        ["present"] = Math.Round(quality.Present, 6),
        ["top_md_m"] = Number(quality.Top),
        ["base_md_m"] = Number(quality.Base),
        ["gaps"] = quality.Gaps,
        ["longest_gap_m"] = Number(quality.LongestGap),
        ["origins"] = Array(quality.Origins.Select(o => new JsonObject
        {
            ["origin"] = Core.Logs.SampleOrigins.Name(o.Origin),
            ["step"] = o.Step,
            ["samples"] = o.Samples,
        })),
    };

    private static JsonNode? Number(double value) => double.IsNaN(value) ? null : Math.Round(value, 4);

    private static JsonObject Method(EarthModel model, IGrouping<(LawSlot Slot, Law Law), LawUse> uses)
    {
        var (slot, law) = uses.Key;
        var total = uses.Aggregate(default(LawOutcome), (sum, use) => sum + use.Outcome);
        return new JsonObject
        {
            ["key"] = slot.Key,
            ["method"] = law.Id,
            ["formula"] = law.Text,
            ["unit"] = law.Unit.Symbol,
            ["source"] = law.Source,
            ["standing"] = law.Standing switch
            {
                Standing.Confirmed => "coefficients read in the source",
                Standing.Identity => "identity",
                Standing.FromMemory => "coefficients recalled, not read",
                Standing.Trained => "fitted to the well's own samples",
                _ => "given by the user",
            },
            ["samples"] = total.Evaluated,
            ["input_missing"] = total.InputMissing,
            ["outside_domain"] = total.OutsideDomain,
            ["outside_range"] = total.OutsideRange,
            ["where"] = Array(uses.GroupBy(u => (u.Zone, u.Lithology)).Select(g => new JsonObject
            {
                ["zone"] = model.ZoneName(g.Key.Zone),
                ["lithology"] = model.LithologyName(g.Key.Lithology),
                ["samples"] = g.Sum(u => u.Outcome.Evaluated),
            })),
        };
    }

    private static JsonObject Layered(EarthModel model, VtiZone zone) => new()
    {
        ["zone"] = model.ZoneName(zone.Zone),
        ["samples"] = zone.Samples,
        ["youngs_static_vertical_gpa"] = Number(Units.Gigapascal.FromSi(zone.Vertical)),
        ["youngs_static_horizontal_gpa"] = Number(Units.Gigapascal.FromSi(zone.Horizontal)),
        ["c13_over_c33_dynamic"] = Number(zone.DynamicRatio),
        ["c13_over_c33_static"] = Number(zone.StaticRatio),
    };

    private static JsonObject Predicted(Prediction prediction)
    {
        var (unit, error) = (prediction.Law.Unit, prediction.Error);
        return new JsonObject
        {
            ["property"] = Core.Logs.PropertyNames.Name(prediction.Property),
            ["method"] = prediction.Words,
            ["formula"] = prediction.Law.Text,
            ["unit"] = unit.Symbol,
            ["standard_error"] = double.IsNaN(error) ? null : Math.Round(error / unit.Factor, 6),
            ["samples"] = prediction.Samples.Count(s => s),
            ["beyond_training"] = prediction.Beyond.Count(b => b),
        };
    }

    private static JsonObject TrendRecord(EarthModel model, FittedTrend trend) => new()
    {
        ["quantity"] = trend.Trend.Quantity switch
        {
            TrendQuantity.Slowness => "slowness",
            TrendQuantity.Resistivity => "resistivity",
            _ => "porosity",
        },
        ["zone"] = model.ZoneName(trend.Zone),
        ["parameters"] = Array(trend.Parameters.Select(p =>
        {
            var (unit, _) = UnitSystem.Metric.UnitFor(p.Dimension);
            return new JsonObject
            {
                ["key"] = p.Key,
                ["value"] = Math.Round(p.Value / unit.Factor, 6),
                ["standard_error"] = p.Kind == TrendParameterKind.Estimated ? Math.Round(p.Error / unit.Factor, 6) : null,
                ["unit"] = unit.Symbol,
                ["from"] = p.Kind switch
                {
                    TrendParameterKind.Given => "given",
                    TrendParameterKind.Estimated => "fitted",
                    _ => "fitted, stopped at its bound",
                },
            };
        })),
        ["shale_samples"] = trend.Samples,
        ["independent_samples"] = Math.Round(trend.Effective, 1),
        ["top_tvd_m"] = Number(trend.Top),
        ["base_tvd_m"] = Number(trend.Base),
    };

    private static JsonArray Array(IEnumerable<JsonNode> items) => new([.. items]);
}
