using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A layer's samples [Start, End) and zone; the first and the last of them are usable.</summary>
/// <param name="Start">First sample.</param>
/// <param name="End">One past the last sample.</param>
/// <param name="Zone">Index of the zone, or -1.</param>
internal readonly record struct LayerBounds(int Start, int End, short Zone)
{
    /// <summary>True vertical thickness, m.</summary>
    public double Thickness(SampleCells cells) => cells.Base(End - 1) - cells.Top(Start);

    /// <summary>True when a layer below shares its top with this one's base.</summary>
    public bool Touches(LayerBounds below, SampleCells cells) => cells.Base(End - 1) == cells.Top(below.Start);

    /// <summary>The layers between some cuts, each given by the first sample below it, from top to bottom.</summary>
    public List<LayerBounds> CutAt(EarthModel model, IEnumerable<int> samples)
    {
        var cut = new List<LayerBounds>();
        var from = Start;
        foreach (var sample in samples)
        {
            if (sample <= from || sample >= End) continue;
            cut.Add(new LayerBounds(from, sample, Zone).Trimmed(model));
            from = sample;
        }

        cut.Add(new LayerBounds(from, End, Zone).Trimmed(model));
        return cut;
    }

    /// <summary>The same without unusable samples at its ends.</summary>
    public LayerBounds Trimmed(EarthModel model)
    {
        var (start, end) = (Start, End);
        while (start < end && !model.Usable[start]) start++;
        while (end > start && !model.Usable[end - 1]) end--;
        return this with { Start = start, End = end };
    }
}
