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
    private readonly bool[] _samples;
    private readonly int _start;
    private readonly int _end;

    private ZoneMeans(EarthModel model, short zone)
    {
        _model = model;
        _samples = new bool[model.Count];
        var shmin = model.Values.Read(Property.MinHorizontalStress);
        int all = 0, covered = 0;
        for (var i = 0; i < _samples.Length; i++)
        {
            if (model.Zones[i] != zone) continue;
            all++;
            if (double.IsNaN(shmin[i])) continue;
            _samples[i] = true;
            covered++;
        }

        if (covered == 0) covered = all;
        if (!_samples.Contains(true)) _samples = Array.ConvertAll(model.Zones, z => z == zone);
        (_start, _end) = (Array.IndexOf(_samples, true), Array.LastIndexOf(_samples, true) + 1);
        Name = model.ZoneName(zone);
        TopMd = model.Values.Read(Property.MeasuredDepth)[Array.IndexOf(model.Zones, zone)];
        Covered = covered / (double)all;
    }

    /// <summary>The zone's name; empty when the well has no zones.</summary>
    public string Name { get; }

    /// <summary>Measured depth of the zone's first sample, m.</summary>
    public double TopMd { get; }

    /// <summary>Share of the zone's samples that the means are over, 0 to 1.</summary>
    public double Covered { get; }

    /// <summary>The means of every zone that has samples, from top to bottom.</summary>
    public static IReadOnlyList<ZoneMeans> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var means = new List<ZoneMeans>();
        foreach (var zone in model.Zones.Distinct())
        {
            if (zone < 0 && model.Setup.Zones.Count > 0) continue;
            means.Add(new ZoneMeans(model, zone));
        }

        return means;
    }

    /// <summary>The mean of a column, SI; NaN when no sample has a value.</summary>
    public double Mean(NumberColumn<EarthModel> column)
    {
        ArgumentNullException.ThrowIfNull(column);
        double sum = 0;
        var count = 0;
        Span<double> values = stackalloc double[Chunk];
        for (var start = _start; start < _end; start += Chunk)
        {
            var chunk = values[..Math.Min(Chunk, _end - start)];
            column.Read(_model, start, chunk);
            for (var i = 0; i < chunk.Length; i++)
            {
                if (!_samples[start + i] || double.IsNaN(chunk[i])) continue;
                sum += chunk[i];
                count++;
            }
        }

        return count > 0 ? sum / count : double.NaN;
    }
}
