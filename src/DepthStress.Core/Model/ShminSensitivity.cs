using DepthStress.Core.Logs;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>
/// How much a zone's mean Shmin moves when static Poisson's ratio or Biot's coefficient is chosen otherwise, all else as in
/// the run: the two choices that logs cannot settle.
/// </summary>
/// <param name="Zone">Index of the zone, or -1.</param>
/// <param name="Shmin">Mean Shmin, Pa, over the samples that have one outside salt.</param>
/// <param name="PoissonLower">Change of the mean, Pa, with Poisson's ratio lower by <see cref="PoissonStep"/>.</param>
/// <param name="PoissonHigher">Change of the mean, Pa, with Poisson's ratio higher by <see cref="PoissonStep"/>.</param>
/// <param name="BiotLower">Change of the mean, Pa, with Biot's coefficient lower by <see cref="BiotStep"/>.</param>
/// <param name="BiotHigher">Change of the mean, Pa, with Biot's coefficient higher by <see cref="BiotStep"/>.</param>
public sealed record ShminSensitivity(
    short Zone, double Shmin, double PoissonLower, double PoissonHigher, double BiotLower, double BiotHigher)
{
    /// <summary>The change of static Poisson's ratio that is tried.</summary>
    public const double PoissonStep = 0.05;

    /// <summary>The change of Biot's coefficient that is tried.</summary>
    public const double BiotStep = 0.1;

    /// <summary>The sensitivity of every zone that has a Shmin, from top to bottom.</summary>
    public static IReadOnlyList<ShminSensitivity> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var sums = new Dictionary<short, (int Count, double Shmin, double[] Other)>();
        foreach (var run in model.Runs)
        {
            if (StressStage.IsSalt(model.Setup, run.Lithology)) continue;
            var sum = sums.TryGetValue(run.Zone, out var before) ? before : (Count: 0, Shmin: 0.0, Other: new double[4]);
            Add(model, run, ref sum);
            sums[run.Zone] = sum;
        }

        return
        [
            .. sums.Where(s => s.Value.Count > 0).Select(s =>
            {
                var (count, shmin, other) = s.Value;
                double Change(int k) => (other[k] - shmin) / count;
                return new ShminSensitivity(s.Key, shmin / count, Change(0), Change(1), Change(2), Change(3));
            }),
        ];
    }

    private static void Add(EarthModel model, in SettingsRun run, ref (int Count, double Shmin, double[] Other) sum)
    {
        var shmin = model.Values.Read(Property.MinHorizontalStress);
        var (along, across) = (run.Settings.HorizontalStress.StrainAlongShmin, run.Settings.HorizontalStress.StrainAlongShmax);
        var e = model.Values.Read(Property.YoungsStatic);
        var nu = model.Values.Read(Property.PoissonStatic);
        var biot = model.Values.Read(Property.Biot);
        var sv = model.Values.Read(Property.VerticalStress);
        var pp = model.Values.Read(Property.PorePressure);
        for (var i = run.Start; i < run.End; i++)
        {
            if (double.IsNaN(shmin[i])) continue;
            sum.Count++;
            sum.Shmin += shmin[i];
            ReadOnlySpan<(double Poisson, double Biot)> tries = [(-PoissonStep, 0), (PoissonStep, 0), (0, -BiotStep), (0, BiotStep)];
            for (var k = 0; k < tries.Length; k++)
            {
                sum.Other[k] += StrainModel.Of(
                    e[i], nu[i] + tries[k].Poisson, biot[i] + tries[k].Biot, sv[i], pp[i], along.IsSet ? along.Value : 0, across.IsSet ? across.Value : 0);
            }
        }
    }
}
