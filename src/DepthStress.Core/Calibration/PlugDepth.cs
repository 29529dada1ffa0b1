using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>The model at the depth of a plug, by straight lines between samples.</summary>
/// <param name="model">The finished model.</param>
public sealed class PlugDepth(EarthModel model)
{
    private readonly double[] _md = model.Values.Read(Property.MeasuredDepth).ToArray();

    /// <summary>A property at a measured depth; NaN outside the samples, beside a missing one, or where a zone ends in between.</summary>
    public double At(Property property, double depth)
    {
        if (Between(depth) is not var (i, share)) return double.NaN;
        if (LawParameters.Of(property) is { } parameter) return parameter.Value(Run(i).Settings);
        if (!model.Values.Has(property)) return double.NaN;
        var values = model.Values.Read(property);
        if (share == 0) return values[i];
        return model.Zones[i] == model.Zones[i + 1] ? values[i] + (share * (values[i + 1] - values[i])) : double.NaN;
    }

    /// <summary>The settings of the sample at or above a depth; null outside the samples.</summary>
    public StageSettings? Settings(double depth) => Between(depth) is var (i, _) ? Run(i).Settings : null;

    private SettingsRun Run(int sample) => model.Runs.First(r => sample < r.End);

    private (int Sample, double Share)? Between(double depth)
    {
        if (_md.Length == 0 || !(depth >= _md[0] && depth <= _md[^1])) return null;
        var at = Array.BinarySearch(_md, depth);
        if (at >= 0) return (at, 0);
        var below = ~at;
        return (below - 1, (depth - _md[below - 1]) / (_md[below] - _md[below - 1]));
    }
}
