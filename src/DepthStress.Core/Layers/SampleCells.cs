using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>
/// The interval of true vertical depth that each sample of the layers stands for: halfway to the usable samples beside it, and
/// up to the sample itself where the layers end. Cells of neighbours share their edge to the last bit.
/// </summary>
internal sealed class SampleCells
{
    private readonly double[] _tops;
    private readonly double[] _bases;

    /// <summary>Makes the cells of the usable samples that lie in a zone, or of all usable samples when there are no zones.</summary>
    public SampleCells(EarthModel model)
    {
        var tvd = model.Values.Read(Property.TrueVerticalDepth);
        (_tops, _bases) = (new double[model.Count], new double[model.Count]);
        var above = -1;
        for (var i = 0; i < tvd.Length; i++)
        {
            if (!model.Usable[i]) continue;
            if (model.Zones[i] < 0 && model.Setup.Zones.Count > 0)
            {
                above = -1;
                continue;
            }

            _tops[i] = _bases[i] = tvd[i];
            if (above >= 0) _bases[above] = _tops[i] = 0.5 * (tvd[above] + tvd[i]);
            above = i;
        }
    }

    /// <summary>Top of a sample's cell, m tvd.</summary>
    public double Top(int sample) => _tops[sample];

    /// <summary>Base of a sample's cell, m tvd.</summary>
    public double Base(int sample) => _bases[sample];

    /// <summary>Middle of a sample's cell, m tvd.</summary>
    public double Middle(int sample) => 0.5 * (_tops[sample] + _bases[sample]);

    /// <summary>Thickness of a sample's cell, m; zero where the sample enters no layer.</summary>
    public double Thickness(int sample) => _bases[sample] - _tops[sample];
}
