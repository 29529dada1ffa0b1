using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>
/// How much a zone's mean Shmin moves when static Poisson's ratio or Biot's coefficient is chosen otherwise, all else as in
/// the run: the two choices that logs cannot settle. In layered rock both directions are shifted alike.
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
    /// 1) and was held at the end of it, or where layered rock would not be stable with it and Poisson's ratios stayed.
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
        var sample = new ShminSample(model, run);
        ReadOnlySpan<(double Poisson, double Biot)> tries = [(-PoissonStep, 0), (PoissonStep, 0), (0, -BiotStep), (0, BiotStep)];
        for (var i = run.Start; i < run.End; i++)
        {
            if (double.IsNaN(shmin[i])) continue;
            sum.Count++;
            sum.Shmin += shmin[i];
            var held = false;
            for (var k = 0; k < tries.Length; k++)
            {
                sum.Other[k] += sample.With(i, tries[k].Poisson, tries[k].Biot, ref held);
            }

            if (held) sum.Held++;
        }
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
