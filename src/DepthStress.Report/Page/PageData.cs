using System.Globalization;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using DepthStress.Core.Calibration;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report.Page;

/// <summary>What the page's script draws from, as JSON: tracks, columns of printed digits, runs of words, zones, layers, observations.</summary>
internal sealed class PageData(ReportContent content)
{
    private static readonly string[] Depths = ["md", "tvd", "tvdss"];
    private readonly EarthModel _model = content.Model;

    /// <summary>The JSON text; nothing in it can end the element it stands in.</summary>
    public string Write(IReadOnlyList<PageTrack> tracks, IReadOnlyList<Comparison> observations)
    {
        var (bins, units) = (Bins.Of(_model.Count), content.Pictures.Units);
        using var bytes = new MemoryStream();
        using var json = new Utf8JsonWriter(bytes, new JsonWriterOptions { Encoder = JavaScriptEncoder.Default });
        json.WriteStartObject();
        json.WriteString("units", units == UnitSystem.Metric ? "metric" : "field");
        json.WriteString("datum", PageTexts.Datum(_model.Setup.Frame));
        json.WriteNumber("samples", bins.Samples);
        json.WriteNumber("perRow", bins.PerRow);
        json.WriteNumber("rows", bins.Rows);
        Each(json, "columns", Depths.Select(DepthColumns.Get).Concat(tracks.SelectMany(t => t.Curves).Select(c => c.Definition.Column)).Distinct(), c => Column(json, c, units, bins));
        Each(json, "words", DepthColumns.All.OfType<TextColumn<EarthModel>>(), c => Words(json, WordRuns.Of(_model, c, bins)));
        Each(json, "tracks", tracks, t => Track(json, t));
        Each(json, "zones", Zones(), z => Interval(json, z.Name, z.Top, z.Base, null));
        Each(json, "layers", content.Layers.Layers, l => Interval(json, l.Number.ToString(CultureInfo.InvariantCulture), (l.TopMd, l.TopTvd), (l.BaseMd, l.BaseTvd), l.Profile(Property.MinHorizontalStress).Mean));
        Each(json, "observations", observations.Where(o => double.IsFinite(o.Residual)), o => Observation(json, o));
        Each(json, "friction", Frictions(bins), f => json.WriteNumberValue(f));
        if (StressState.Chosen(_model) is [var state, ..]) json.WriteNumber("start", state.Sample / bins.PerRow);
        json.WriteStartObject("origins");
        foreach (var origin in Enum.GetValues<SampleOrigin>().Where(o => o != SampleOrigin.None)) json.WriteString(origin.Name(), Colour(OriginRibbon.Colour(origin)));
        json.WriteEndObject();
        json.WriteEndObject();
        json.Flush();
        return Encoding.UTF8.GetString(bytes.GetBuffer(), 0, (int)bytes.Length);
    }

    private static void Each<T>(Utf8JsonWriter json, string name, IEnumerable<T> items, Action<T> write)
    {
        json.WriteStartArray(name);
        foreach (var item in items) write(item);
        json.WriteEndArray();
    }

    private void Column(Utf8JsonWriter json, NumberColumn<EarthModel> column, UnitSystem units, Bins bins)
    {
        if (PackedColumn.Of(_model, column, units, bins) is not { } packed) return;
        json.WriteStartObject();
        json.WriteString("id", column.Id);
        json.WriteString("title", column.Title);
        json.WriteString("symbol", column.Symbol);
        Unit(json, "metric", column.Metric);
        Unit(json, "field", column.Field);
        json.WriteBoolean("wide", packed.Wide);
        Raw(json, "low", packed.Low);
        if (packed.High is { } high) Raw(json, "high", high);
        json.WriteEndObject();
    }

    /// <summary>Base64 needs no escapes; the encoder would spend six characters on a plus.</summary>
    private static void Raw(Utf8JsonWriter json, string name, byte[] bytes)
    {
        json.WritePropertyName(name);
        json.WriteRawValue($"\"{Convert.ToBase64String(bytes)}\"", skipInputValidation: true);
    }

    private static void Unit(Utf8JsonWriter json, string name, ColumnUnit unit)
    {
        json.WriteStartObject(name);
        json.WriteString("unit", unit.Unit.Symbol);
        json.WriteNumber("factor", unit.Unit.Factor);
        json.WriteNumber("offset", unit.Unit.Offset);
        json.WriteNumber("decimals", unit.Decimals);
        json.WriteEndObject();
    }

    private static void Words(Utf8JsonWriter json, WordRuns words)
    {
        json.WriteStartObject();
        json.WriteString("id", words.Column.Id);
        json.WriteString("title", words.Column.Title);
        Each(json, "list", words.Words, w => json.WriteStringValue(PlainText.Clean(w)));
        Each(json, "runs", words.Runs.SelectMany(r => new[] { r.End, r.Word }), json.WriteNumberValue);
        json.WriteEndObject();
    }

    private void Track(Utf8JsonWriter json, PageTrack track)
    {
        json.WriteStartObject();
        json.WriteString("id", track.Definition.Id);
        json.WriteString("title", track.Definition.Title);
        json.WriteBoolean("shown", track.Shown);
        Each(json, "curves", track.Curves, c => Curve(json, c));
        json.WriteEndObject();
    }

    private void Curve(Utf8JsonWriter json, PageCurve curve)
    {
        var definition = curve.Definition;
        json.WriteStartObject();
        json.WriteString("column", definition.Column.Id);
        json.WriteString("label", definition.Label);
        json.WriteString("colour", Colour(definition.Pen.Colour));
        json.WriteNumber("width", definition.Pen.Width);
        Each(json, "dash", definition.Pen.Dash ?? [], json.WriteNumberValue);
        if (definition.Ribbon is { } ribbon && _model.Origins(ribbon) is not null) json.WriteString("origin", $"{DepthColumns.All.First(c => c.Id.Equals(ribbon.ToString(), StringComparison.OrdinalIgnoreCase)).Id}_origin");
        Scale(json, "metric", curve.Metric);
        Scale(json, "field", curve.Field);
        json.WriteEndObject();
    }

    private static void Scale(Utf8JsonWriter json, string name, PageScale scale)
    {
        json.WriteStartObject(name);
        json.WriteNumber("left", scale.Scale.Left);
        json.WriteNumber("right", scale.Scale.Right);
        json.WriteNumber("divisions", scale.Scale.Divisions);
        json.WriteNumber("off", scale.OffScale);
        json.WriteEndObject();
    }

    private IEnumerable<(string Name, (double Md, double Tvd) Top, (double Md, double Tvd) Base)> Zones()
    {
        var vertical = ZoneSpan.Of(_model, _model.Values.Read(Property.TrueVerticalDepth)).ToDictionary(z => z.Zone);
        return [.. ZoneSpan.Of(_model, _model.Values.Read(Property.MeasuredDepth)).Where(z => vertical.ContainsKey(z.Zone)).Select(z => (z.Name, (z.Top, vertical[z.Zone].Top), (z.Base, vertical[z.Zone].Base)))];
    }

    /// <summary>An interval in SI: its depths of every kind.</summary>
    private void Interval(Utf8JsonWriter json, string name, (double Md, double Tvd) top, (double Md, double Tvd) bottom, double? shmin)
    {
        var frame = _model.Setup.Frame;
        json.WriteStartObject();
        json.WriteString("name", name);
        Each(json, "md", [top.Md, bottom.Md], v => Finite(json, v));
        Each(json, "tvd", [top.Tvd, bottom.Tvd], v => Finite(json, v));
        Each(json, "tvdss", [frame.ToSubsea(top.Tvd), frame.ToSubsea(bottom.Tvd)], v => Finite(json, v));
        if (shmin is { } value && double.IsFinite(value)) json.WriteNumber("shmin", value);
        json.WriteEndObject();
    }

    private void Observation(Utf8JsonWriter json, Comparison comparison)
    {
        var (reading, interval) = (comparison.Reading, comparison.Reading.Interval);
        var middle = (interval.Top + interval.Base) / 2;
        json.WriteStartObject();
        json.WriteString("kind", interval.Observation.Kind.Word());
        json.WriteString("subject", reading.Subject);
        json.WriteString("meaning", MeaningWords.Of(reading));
        Finite(json, "md", middle);
        Finite(json, "tvd", interval.MiddleTvd);
        Finite(json, "tvdss", _model.Setup.Frame.ToSubsea(interval.MiddleTvd));
        Finite(json, "value", comparison.Measured);
        Finite(json, "sigma", comparison.Sigma);
        Finite(json, "modelled", comparison.Modelled);
        json.WriteEndObject();
    }

    private static void Finite(Utf8JsonWriter json, double value)
    {
        if (double.IsFinite(value)) json.WriteNumberValue(value);
        else json.WriteNullValue();
    }

    private static void Finite(Utf8JsonWriter json, string name, double value)
    {
        json.WritePropertyName(name);
        Finite(json, value);
    }

    /// <summary>The friction coefficient of the settings by rows: one past the last row of a run, then its value. A bin has that of its first sample.</summary>
    private IEnumerable<double> Frictions(Bins bins)
    {
        var runs = new List<(int End, double Friction)>();
        foreach (var run in _model.Runs)
        {
            var (end, friction) = ((run.End + bins.PerRow - 1) / bins.PerRow, run.Settings.HorizontalStress.FrictionCoefficient.Value);
            if (runs.Count > 0 && (runs[^1].Friction == friction || runs[^1].End == end)) runs[^1] = (end, runs[^1].Friction);
            else runs.Add((end, friction));
        }

        return runs.SelectMany(r => new[] { r.End, r.Friction });
    }

    private static string Colour(int colour) => colour.ToString("x6", CultureInfo.InvariantCulture);
}
