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

    /// <summary>
    /// Samples where a shifted value would leave its physical range (Poisson's ratio up to 1/2, Biot's coefficient from 0 to
    /// 1) and was held at the end of it.
    /// </summary>
    public int Held { get; private init; }

    /// <summary>The sensitivity of every zone that has a Shmin, from top to bottom.</summary>
    public static IReadOnlyList<ShminSensitivity> Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var sums = new Dictionary<short, Sum>();
        foreach (var run in model.Runs)
        {
            if (StressStage.IsSalt(model.Setup, run.Lithology)) continue;
            if (!sums.TryGetValue(run.Zone, out var sum)) sums.Add(run.Zone, sum = new Sum());
            Add(model, run, sum);
        }

        return [.. sums.Where(s => s.Value.Count > 0).Select(s => s.Value.ToSensitivity(s.Key))];
    }

    private static void Add(EarthModel model, in SettingsRun run, Sum sum)
    {
        var shmin = model.Values.Read(Property.MinHorizontalStress);
        var (along, across) = run.Settings.HorizontalStress.BothStrains() ?? (0, 0);
        var e = model.Values.Read(Property.YoungsStatic);
        var nu = model.Values.Read(Property.PoissonStatic);
        var biot = model.Values.Read(Property.Biot);
        var sv = model.Values.Read(Property.VerticalStress);
        var pp = model.Values.Read(Property.PorePressure);
        ReadOnlySpan<(double Poisson, double Biot)> tries = [(-PoissonStep, 0), (PoissonStep, 0), (0, -BiotStep), (0, BiotStep)];
        for (var i = run.Start; i < run.End; i++)
        {
            if (double.IsNaN(shmin[i])) continue;
            sum.Count++;
            sum.Shmin += shmin[i];
            var held = false;
            for (var k = 0; k < tries.Length; k++)
            {
                var (poisson, coefficient) = (nu[i] + tries[k].Poisson, biot[i] + tries[k].Biot);
                if (tries[k].Poisson != 0) held |= Hold(ref poisson, -1 + PoissonStep, 0.5);
                else held |= Hold(ref coefficient, 0, 1);
                sum.Other[k] += StrainModel.Of(e[i], poisson, coefficient, sv[i], pp[i], along, across);
            }

            if (held) sum.Held++;
        }
    }

    private static bool Hold(ref double value, double low, double high)
    {
        if (value >= low && value <= high) return false;
        value = Math.Clamp(value, low, high);
        return true;
    }

    private sealed class Sum
    {
        public int Count { get; set; }

        public int Held { get; set; }

        public double Shmin { get; set; }

        public double[] Other { get; } = new double[4];

        public ShminSensitivity ToSensitivity(short zone) =>
            new(zone, Shmin / Count, Change(0), Change(1), Change(2), Change(3)) { Held = Held };

        private double Change(int k) => (Other[k] - Shmin) / Count;
    }
}
