using System.Text.Encodings.Web;
using System.Text.Json;
using DepthStress.Core.Calibration;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary><c>calibration.json</c>: the estimates with their uncertainty and what a reader should know of them.</summary>
public static class CalibrationJson
{
    private const int Digits = 3;

    /// <summary>Writes the record of a calibration.</summary>
    public static void Write(CalibrationResult result, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(destination);
        var options = new JsonWriterOptions { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };
        using (var json = new Utf8JsonWriter(destination, options))
        {
            json.WriteStartObject();
            json.WriteString("program", "DepthStress");
            json.WriteString("version", RunJson.Version);
            json.WriteString("caution", Caution.Text);
            json.WriteString("well", CellText.Clean(result.After.Setup.Name));
            json.WriteString("strain", "microstrain, compression positive");
            json.WriteStartArray("strains");
            foreach (var strain in result.Strains) Strain(json, result, strain);
            json.WriteEndArray();
            json.WriteStartArray("other_parameters");
            foreach (var other in result.Others) Other(json, other);
            json.WriteEndArray();
            json.WriteNumber("degrees_of_freedom", result.DegreesOfFreedom);
            Number(json, "reduced_chi_square", result.ReducedChiSquare);
            Number(json, "model_error_mpa", Units.Megapascal.FromSi(result.ModelError));
            json.WriteStartArray("findings");
            foreach (var finding in result.Findings) json.WriteStringValue(FindingText.Of(finding, units, result.After.Count));
            json.WriteEndArray();
            json.WriteEndObject();
        }

        destination.Write("\n"u8);
    }

    private static void Strain(Utf8JsonWriter json, CalibrationResult result, StrainEstimate strain)
    {
        json.WriteStartObject();
        json.WriteStartArray("zones");
        foreach (var zone in strain.Group.Zones) json.WriteStringValue(CellText.Clean(result.After.Setup.Zones[zone].Name));
        json.WriteEndArray();
        Estimate(json, "strain_along_shmin", strain.AlongShmin);
        Estimate(json, "strain_along_shmax", strain.AlongShmax);
        Estimate(json, "difference", strain.Difference);
        Number(json, "correlation", strain.Correlation);
        json.WriteBoolean("separated", strain.Separated);
        json.WriteEndObject();
    }

    private static void Other(Utf8JsonWriter json, ParameterEstimate other)
    {
        json.WriteStartObject();
        json.WriteString("section", other.Section);
        json.WriteString("key", other.Key);
        json.WriteString("unit", $"SI of {other.Dimension}");
        json.WriteNumber("value", other.Estimate.Value);
        json.WritePropertyName("standard_error");
        if (double.IsFinite(other.Estimate.StandardError)) json.WriteNumberValue(other.Estimate.StandardError);
        else json.WriteNullValue();
        json.WriteNumber("low_95", other.Estimate.Low);
        json.WriteNumber("high_95", other.Estimate.High);
        json.WriteNumber("before", other.Estimate.Start);
        json.WriteString("from", other.Basis);
        json.WriteEndObject();
    }

    private static void Estimate(Utf8JsonWriter json, string name, Estimate estimate)
    {
        json.WriteStartObject(name);
        Number(json, "value", Micro(estimate.Value));
        Number(json, "standard_error", Micro(estimate.StandardError));
        Number(json, "low_95", Micro(estimate.Low));
        Number(json, "high_95", Micro(estimate.High));
        Number(json, "before", Micro(estimate.Start));
        json.WriteBoolean("held", estimate.Held);
        json.WriteBoolean("at_bound", estimate.AtBound);
        json.WriteEndObject();
    }

    private static double Micro(double strain) => Units.Microstrain.FromSi(strain);

    private static void Number(Utf8JsonWriter json, string name, double value)
    {
        if (double.IsFinite(value)) json.WriteNumber(name, Math.Round(value, Digits));
        else json.WriteNull(name);
    }
}
