using System.Globalization;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Writing;

/// <summary>Start, stop and step of a LAS index, as its data lines write them.</summary>
internal static class LasIndex
{
    private const int MostStepDecimals = 9;

    /// <summary>Start, stop and step; the step is 0 when the samples are uneven or fewer than two.</summary>
    public static (string Start, string Stop, string Step) Of(EarthModel model, NumberColumn<EarthModel> index, UnitSystem units)
    {
        var unit = index.In(units);
        var depths = new double[model.Count];
        index.Fill(model, 0, units, depths);
        if (depths.Length == 0) return (ResultsLas.Null, ResultsLas.Null, Text(0, unit.Decimals));
        return (Text(depths[0], unit.Decimals), Text(depths[^1], unit.Decimals), Step(depths, unit.Decimals));
    }

    /// <summary>The shortest step that gives every depth from the first to within one written digit.</summary>
    private static string Step(double[] depths, int decimals)
    {
        if (depths.Length < 2) return Text(0, decimals);
        var mean = (depths[^1] - depths[0]) / (depths.Length - 1);
        for (var digits = decimals; digits <= MostStepDecimals; digits++)
        {
            var step = Math.Round(mean, digits);
            if (step > 0 && IsEven(depths, step, Math.Pow(10, -decimals))) return Text(step, digits);
        }

        return Text(0, decimals);
    }

    private static bool IsEven(double[] depths, double step, double tolerance)
    {
        for (var i = 0; i < depths.Length; i++)
        {
            if (!(Math.Abs(depths[0] + (i * step) - depths[i]) <= tolerance)) return false;
        }

        return true;
    }

    private static string Text(double value, int decimals) =>
        value.ToString("F" + decimals.ToString(CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
}
