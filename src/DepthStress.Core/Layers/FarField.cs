using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>The one pair of lateral strains that a solver imposes on the sides of the whole column, compression positive.</summary>
/// <param name="AlongShmin">Strain along Shmin.</param>
/// <param name="AlongShmax">Strain along SHmax.</param>
/// <param name="Known">False where no strains are chosen: the pair is then zero.</param>
public readonly record struct FarField(double AlongShmin, double AlongShmax, bool Known)
{
    /// <summary>
    /// The pair that holds over the greatest thickness of the layers, among rock whose stress comes from strains; no strains
    /// where there is no such rock. Of equal thicknesses the uppermost.
    /// </summary>
    internal static FarField Of(EarthModel model, double[] weights)
    {
        var thickness = new List<(FarField Pair, double Sum)>();
        foreach (var run in model.Runs)
        {
            if (run.Settings.HorizontalStress.ByRatio || StressStage.IsSalt(model.Setup, run.Lithology)) continue;
            var pair = run.Settings.HorizontalStress.BothStrains() is { } strains ? new FarField(strains.AlongShmin, strains.AlongShmax, true) : default;
            double sum = 0;
            for (var i = run.Start; i < run.End; i++) sum += weights[i];
            var at = thickness.FindIndex(t => t.Pair == pair);
            if (at < 0) thickness.Add((pair, sum));
            else thickness[at] = (pair, thickness[at].Sum + sum);
        }

        return thickness.Count == 0 ? default : thickness.MaxBy(t => t.Sum).Pair;
    }
}
