using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>The mean of a property over a stretch of samples.</summary>
internal static class SampleMean
{
    /// <summary>The mean over the samples that have the property; NaN without any.</summary>
    public static double Of(EarthModel model, Property property, int first, int count) => Of(model.Values, property, first, count);

    /// <summary>The same of a table.</summary>
    public static double Of(PropertyTable table, Property property, int first, int count)
    {
        if (!table.Has(property)) return double.NaN;
        double sum = 0;
        var known = 0;
        foreach (var value in table.Read(property).Slice(first, count))
        {
            if (double.IsNaN(value)) continue;
            sum += value;
            known++;
        }

        return known == 0 ? double.NaN : sum / known;
    }
}
