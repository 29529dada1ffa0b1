using System.Text.Json;
using DepthStress.Core.Layers;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>
/// <c>layers.json</c>: the layers keyed by the column names of <c>layers.csv</c>, with caution, datum, depth kinds and units.
/// Missing is null. Numbers carry the column's fixed decimals.
/// </summary>
public static class LayersJson
{
    private static readonly JsonWriterOptions Options = new() { Indented = true, IndentCharacter = ' ', IndentSize = 2, NewLine = "\n" };

    /// <summary>Writes the layers.</summary>
    /// <param name="table">The layers.</param>
    /// <param name="setup">The well.</param>
    /// <param name="units">The units of the results.</param>
    /// <param name="destination">Gets the bytes; stays open.</param>
    public static void Write(LayerTable table, WellSetup setup, UnitSystem units, Stream destination)
    {
        ArgumentNullException.ThrowIfNull(table);
        ArgumentNullException.ThrowIfNull(setup);
        ArgumentNullException.ThrowIfNull(destination);
        using (var json = new Utf8JsonWriter(destination, Options))
        {
            json.WriteStartObject();
            json.WriteString("caution", Caution.Text);
            json.WriteString("well", CellText.Clean(setup.Name));
            WriteDepth(json, setup, units);
            json.WriteString("stress", "total, compression positive");
            WriteUnits(json, units);
            json.WriteStartArray("layers");
            for (var row = 0; row < table.Layers.Count; row++) WriteLayer(json, table, row, units);
            json.WriteEndArray();
            json.WriteEndObject();
        }

        destination.Write("\n"u8);
    }

    private static void WriteDepth(Utf8JsonWriter json, WellSetup setup, UnitSystem units)
    {
        var length = DepthStatement.Length(units);
        json.WriteStartObject("depth");
        json.WriteString("datum", setup.Frame.Datum.Name());
        foreach (var (name, _, metres) in DepthStatement.Surfaces(setup.Frame))
            WriteNumber(json, $"{name}_{length.Unit.Suffix}", length.Unit.FromSi(metres), length.Decimals);
        json.WriteStartObject("kinds");
        foreach (var (name, meaning) in DepthStatement.Kinds) json.WriteString(name, meaning);
        json.WriteEndObject();
        json.WriteEndObject();
    }

    private static void WriteUnits(Utf8JsonWriter json, UnitSystem units)
    {
        json.WriteString("unit_system", units == UnitSystem.Metric ? "metric" : "field");
        json.WriteStartObject("units");
        foreach (var column in LayerColumns.All.OfType<NumberColumn<LayerTable>>())
            json.WriteString(column.Header(units), column.In(units).Unit.Symbol is { Length: > 0 } symbol ? symbol : "1");
        json.WriteEndObject();
    }

    private static void WriteLayer(Utf8JsonWriter json, LayerTable table, int row, UnitSystem units)
    {
        Span<double> number = [double.NaN];
        Span<string> word = [""];
        json.WriteStartObject();
        foreach (var column in LayerColumns.All)
        {
            switch (column)
            {
                case NumberColumn<LayerTable> numbers:
                    numbers.Fill(table, row, units, number);
                    WriteNumber(json, numbers.Header(units), number[0], numbers.In(units).Decimals);
                    break;
                case TextColumn<LayerTable> words:
                    words.Read(table, row, word);
                    if (word[0].Length > 0) json.WriteString(words.Id, CellText.Clean(word[0]));
                    else json.WriteNull(words.Id);
                    break;
            }
        }

        json.WriteEndObject();
    }

    private static void WriteNumber(Utf8JsonWriter json, string name, double value, int decimals)
    {
        Span<byte> bytes = stackalloc byte[FixedPoint.MaxLength];
        FixedPoint.TryFormat(value, decimals, bytes, out var written);
        json.WritePropertyName(name);
        if (written > 0) json.WriteRawValue(bytes[..written], skipInputValidation: true);
        else json.WriteNullValue();
    }
}
