using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>
/// Plain means over the samples of a zone, all columns over the same samples: those that have a least horizontal stress, or
/// all of them when none has one.
/// </summary>
public sealed class ZoneMeans
{
    private readonly EarthModel _model;
    private readonly List<int> _samples;

    private ZoneMeans(EarthModel model, short zone, List<int> covered, List<int> all)
    {
        _model = model;
        _samples = covered.Count > 0 ? covered : all;
        Name = model.ZoneName(zone);
        TopMd = model.Values.Read(Property.MeasuredDepth)[all[0]];
        Covered = covered.Count / (double)all.Count;
    }

    /// <summary>The zone's name; empty when the well has no zones.</summary>
    public string Name { get; }

    /// <summary>Measured depth of the zone's first sample, m.</summary>
    public double TopMd { get; }

    /// <summary>Share of the zone's samples that have a least horizontal stress, 0 to 1.</summary>
    public double Covered { get; }

    /// <summary>The means of every zone that has samples, from top to bottom.</summary>
    public static IReadOnlyList<ZoneMeans> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var shmin = SampleMarks.Column(model, Property.MinHorizontalStress);
        var means = new List<ZoneMeans>();
        foreach (var zone in Enumerable.Range(0, model.Count).GroupBy(i => model.Zones[i]))
        {
            if (zone.Key < 0 && model.Setup.Zones.Count > 0) continue;
            var all = zone.ToList();
            var covered = all.FindAll(i => !double.IsNaN(shmin[i]));
            means.Add(new ZoneMeans(model, zone.Key, covered, all));
        }

        return means;
    }

    /// <summary>The mean of a column, SI; NaN when no sample has a value.</summary>
    public double Mean(NumberColumn<EarthModel> column)
    {
        ArgumentNullException.ThrowIfNull(column);
        double sum = 0;
        var count = 0;
        var value = new double[1];
        foreach (var i in _samples)
        {
            column.Read(_model, i, value);
            if (double.IsNaN(value[0])) continue;
            sum += value[0];
            count++;
        }

        return count > 0 ? sum / count : double.NaN;
    }
}
