using DepthStress.Core.Depth;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>The stresses of one sample.</summary>
/// <param name="Zone">The zone's name, or nothing.</param>
/// <param name="MeasuredDepth">Measured depth, m.</param>
/// <param name="TrueVerticalDepth">True vertical depth, m.</param>
/// <param name="Vertical">Vertical stress, Pa.</param>
/// <param name="Pore">Pore pressure, Pa.</param>
/// <param name="Shmin">Least horizontal stress, Pa.</param>
/// <param name="Shmax">Greatest horizontal stress, Pa.</param>
/// <param name="Friction">The friction coefficient that its settings choose.</param>
public sealed record StressState(
    string Zone, double MeasuredDepth, double TrueVerticalDepth, double Vertical, double Pore, double Shmin, double Shmax, double Friction)
{
    /// <summary>Number of the sample.</summary>
    public int Sample { get; init; }

    /// <summary>The most states that are chosen without being asked for.</summary>
    public const int MostChosen = 6;

    /// <summary>The sample nearest to a depth of some kind; null when the depth lies outside the samples or the hole never reaches it.</summary>
    public static StressState? At(EarthModel model, double depth, DepthKind kind)
    {
        ArgumentNullException.ThrowIfNull(model);
        var md = model.Values.Read(Property.MeasuredDepth);
        var wanted = ZoneIndex.ToMeasured(model.Setup, depth, kind);
        return model.Count > 0 && wanted >= md[0] && wanted <= md[^1] ? Of(model, Nearest(md, wanted, _ => true)) : null;
    }

    /// <summary>
    /// The states to show when nobody names depths: the middle of each target zone, the first six of them; without target zones the
    /// middle of the profile. Where the middle has no Shmin the nearest sample that has one stands for it.
    /// </summary>
    public static IReadOnlyList<StressState> Chosen(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var targets = Enumerable.Range(0, model.Setup.Zones.Count).Where(z => model.Setup.Zones[z].Target && Array.IndexOf(model.Zones, (short)z) >= 0).Take(MostChosen).ToList();
        if (targets.Count == 0) return model.Count == 0 ? [] : [Middle(model, _ => true)];
        return [.. targets.Select(z => Middle(model, i => model.Zones[i] == z))];
    }

    private static StressState Middle(EarthModel model, Predicate<int> inside)
    {
        var md = model.Values.Read(Property.MeasuredDepth);
        var samples = Enumerable.Range(0, model.Count).Where(i => inside(i)).ToList();
        var middle = (md[samples[0]] + md[samples[^1]]) / 2;
        var shmin = SampleMarks.Column(model, Property.MinHorizontalStress);
        var known = samples.Exists(i => !double.IsNaN(shmin[i]));
        return Of(model, Nearest(md, middle, i => inside(i) && (!known || !double.IsNaN(shmin[i]))));
    }

    private static int Nearest(ReadOnlySpan<double> md, double wanted, Predicate<int> fits)
    {
        var best = -1;
        for (var i = 0; i < md.Length; i++)
        {
            if (fits(i) && (best < 0 || Math.Abs(md[i] - wanted) < Math.Abs(md[best] - wanted))) best = i;
        }

        return best;
    }

    private static StressState Of(EarthModel model, int sample)
    {
        double At(Property property) => model.Values.Has(property) ? model.Values.Read(property)[sample] : double.NaN;
        var run = model.Runs.First(r => sample < r.End);
        return new StressState(
            model.ZoneName(model.Zones[sample]), At(Property.MeasuredDepth), At(Property.TrueVerticalDepth), At(Property.VerticalStress),
            At(Property.PorePressure), At(Property.MinHorizontalStress), At(Property.MaxHorizontalStress), run.Settings.HorizontalStress.FrictionCoefficient.Value)
        {
            Sample = sample,
        };
    }
}
