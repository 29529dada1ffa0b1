using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>
/// Plain means over the samples of a zone, all columns over the same samples: those that have a least horizontal stress, or
/// all of them when none has one.
/// </summary>
public sealed class ZoneMeans
{
    private const int Chunk = 1024;
    private readonly EarthModel _model;
    private readonly List<int> _samples;
    private readonly Dictionary<string, double> _means = [];

    private ZoneMeans(EarthModel model, short zone, List<int> covered, List<int> all)
    {
        _model = model;
        _samples = covered.Count > 0 ? covered : all;
        Title = model.ZoneTitle(zone);
        TopMd = model.Values.Read(Property.MeasuredDepth)[all[0]];
        Covered = covered.Count / (double)all.Count;
    }

    /// <summary>The zone's name; "whole log" when the well has no zones.</summary>
    public string Title { get; }

    /// <summary>Measured depth of the zone's first sample, m.</summary>
    public double TopMd { get; }

    /// <summary>Share of the zone's samples that have a least horizontal stress, 0 to 1.</summary>
    public double Covered { get; }

    /// <summary>The means of every zone that has samples, from top to bottom.</summary>
    public static IReadOnlyList<ZoneMeans> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var shmin = model.Values.Read(Property.MinHorizontalStress);
        var zones = new Dictionary<short, (List<int> Covered, List<int> All)>();
        for (var i = 0; i < model.Count; i++)
        {
            if (model.Zones[i] < 0 && model.Setup.Zones.Count > 0) continue;
            if (!zones.TryGetValue(model.Zones[i], out var samples)) zones.Add(model.Zones[i], samples = ([], []));
            samples.All.Add(i);
            if (!shmin.IsEmpty && !double.IsNaN(shmin[i])) samples.Covered.Add(i);
        }

        return [.. zones.Select(z => new ZoneMeans(model, z.Key, z.Value.Covered, z.Value.All))];
    }

    /// <summary>The mean of a column, SI; NaN when no sample has a value.</summary>
    public double Mean(NumberColumn<EarthModel> column)
    {
        ArgumentNullException.ThrowIfNull(column);
        return _means.TryGetValue(column.Id, out var known) ? known : _means[column.Id] = Compute(column);
    }

    private double Compute(NumberColumn<EarthModel> column)
    {
        double sum = 0;
        var count = 0;
        Span<double> buffer = stackalloc double[Chunk];
        for (var k = 0; k < _samples.Count;)
        {
            var start = _samples[k];
            var values = buffer[..Math.Min(Chunk, _model.Count - start)];
            column.Read(_model, start, values);
            for (; k < _samples.Count && _samples[k] < start + values.Length; k++)
            {
                var value = values[_samples[k] - start];
                if (double.IsNaN(value)) continue;
                sum += value;
                count++;
            }
        }

        return count > 0 ? sum / count : double.NaN;
    }
}
