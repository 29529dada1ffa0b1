using DepthStress.Core.Logs;

namespace DepthStress.Core.Conditioning;

/// <summary>The curves that can be conditioned, in what the tool measures: slowness for velocities, the value itself for the rest.</summary>
public static class MeasuredScale
{
    /// <summary>False for curves that stand still by nature: bit size and facies codes.</summary>
    public static bool IsContinuous(Property property) => property is not (Property.BitSize or Property.Facies);

    /// <summary>Names of the roles that can be conditioned.</summary>
    public static IReadOnlyList<string> Names { get; } = [.. CurveRoles.All.Where(r => IsContinuous(r.Property)).Select(r => r.Id)];

    /// <summary>A curve's values as measured; the inverse of itself.</summary>
    public static double[] Convert(Property property, double[] values)
    {
        ArgumentNullException.ThrowIfNull(values);
        return property is Property.Vp or Property.Vs ? Array.ConvertAll(values, v => v == 0 ? double.NaN : 1 / v) : (double[])values.Clone();
    }
}
