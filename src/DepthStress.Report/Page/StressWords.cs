using System.Globalization;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Report.Drawing;

namespace DepthStress.Report.Page;

/// <summary>What the stress of the whole profile is, in words.</summary>
internal static class StressWords
{
    private const int Chunk = 4096;

    private static readonly (string Name, string Column)[] Gradients = [("Shmin", "shmin_gradient"), ("SHmax", "shmax_gradient"), ("Pp", "pp_gradient"), ("Sv", "sv_gradient")];

    /// <summary>One sentence: gradients with their means and ends, and the share of each faulting regime.</summary>
    public static string Of(EarthModel model, UnitSystem units)
    {
        var gradients = Gradients.Select(g => Gradient(model, units, g.Name, DepthColumns.Get(g.Column))).Where(g => g.Length > 0).ToList();
        return gradients.Count == 0 ? "The stress: there is none." : $"The stress, as {PageTexts.Gradient(model.Setup.Frame)}: {string.Join("; ", gradients)}. {Regimes(model)}";
    }

    private static string Gradient(EarthModel model, UnitSystem units, string name, NumberColumn<EarthModel> column)
    {
        var (count, sum, least, greatest) = (0, 0.0, double.PositiveInfinity, double.NegativeInfinity);
        var values = new double[Math.Min(Chunk, model.Count)];
        for (var start = 0; start < model.Count; start += Chunk)
        {
            var chunk = values.AsSpan(0, Math.Min(Chunk, model.Count - start));
            column.Fill(model, start, units, chunk);
            foreach (var value in chunk)
            {
                if (!double.IsFinite(value)) continue;
                (count, sum, least, greatest) = (count + 1, sum + value, Math.Min(least, value), Math.Max(greatest, value));
            }
        }

        var decimals = units == UnitSystem.Metric ? 2 : 3;
        string Show(double value) => ScaledDigits.Show(value, decimals);
        return count == 0 ? "" : $"{name} {Show(sum / count)} {column.In(units).Unit.Symbol} on average ({Show(least)} to {Show(greatest)})";
    }

    private static string Regimes(EarthModel model)
    {
        var column = DepthColumns.All.OfType<TextColumn<EarthModel>>().First(c => c.Id == "regime");
        var (start, counts) = (0, new Dictionary<string, int>(StringComparer.Ordinal));
        var runs = WordRuns.Of(model, column, new Bins(model.Count, 1));
        foreach (var (end, number) in runs.Runs)
        {
            if (runs.Words[number] is { Length: > 0 } word) counts[word] = counts.GetValueOrDefault(word) + end - start;
            start = end;
        }

        var total = counts.Values.Sum();
        return total == 0
            ? "The faulting regime is not known."
            : $"Faulting regime: {string.Join(", ", counts.OrderByDescending(c => c.Value).ThenBy(c => c.Key, StringComparer.Ordinal).Select(c => string.Create(CultureInfo.InvariantCulture, $"{c.Key} in {100.0 * c.Value / total:F1} %")))} of the samples where it is known.";
    }
}
