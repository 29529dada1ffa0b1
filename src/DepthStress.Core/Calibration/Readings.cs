using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>Puts every observation of a well beside the model.</summary>
public static class Readings
{
    /// <summary>The observations as the model sees them, in the order of their rows.</summary>
    /// <param name="model">The finished model.</param>
    /// <param name="groups">The groups whose strains are to be estimated; none to compare the model as it is.</param>
    public static IReadOnlyList<Reading> Of(EarthModel model, IReadOnlyList<StrainGroup> groups)
    {
        ArgumentNullException.ThrowIfNull(model);
        return [.. model.Setup.Observations.Select(o => Of(model, groups, ObservedInterval.Of(model.Setup, o)))];
    }

    private static Reading Of(EarthModel model, IReadOnlyList<StrainGroup> groups, ObservedInterval interval)
    {
        var kind = interval.Observation.Kind;
        var subject = Subject(kind);
        var open = kind is ObservationKind.LeakOff or ObservationKind.Integrity or ObservationKind.Losses;
        var md = model.Values.Read(Property.MeasuredDepth);
        var (first, count) = open ? interval.OpenSamples(md) : interval.Samples(md);
        if (count == 0) return new(interval, subject, "outside the log");
        if (kind == ObservationKind.FormationPressure) return Pore(model, interval, first, count);

        var response = StrainResponse.Of(model, groups, first, first + count);
        if (response.Known == 0) return new(interval, subject, "no horizontal stress at its depth: a log, modulus or pressure is missing");
        var settings = model.Setup.ObservationSettings;
        return kind switch
        {
            ObservationKind.Closure => new(interval, Meaning.Value, subject, interval.Sigma, response, (shmin, _, _) => (interval.Value, shmin)),
            ObservationKind.ShutIn => new(interval, Meaning.UpperBound, subject, interval.Sigma, response, (shmin, _, _) => (interval.Value, shmin)),
            ObservationKind.Losses => Open(Meaning.UpperBound),
            ObservationKind.LeakOff => Open(settings.LeakOff.Value == LeakOffMeaning.Value ? Meaning.Value : Meaning.UpperBound),
            ObservationKind.Integrity => Open(settings.Integrity.Value == IntegrityMeaning.Shmin ? Meaning.LowerBound : Meaning.Nothing),
            _ => WallReadings.Of(model, interval, first, count, response),
        };

        Reading Open(Meaning meaning)
        {
            var tvd = model.Values.Read(Property.TrueVerticalDepth).Slice(first, count);
            var pressures = new double[count];
            for (var i = 0; i < count; i++) pressures[i] = interval.PressureAt(tvd[i]);
            return new(interval, meaning, subject, interval.Sigma, response, (shmin, _, _) => (interval.Value, shmin), pressures);
        }
    }

    private static string Subject(ObservationKind kind) => kind switch
    {
        ObservationKind.FormationPressure => Reading.PorePressure,
        ObservationKind.Breakdown or ObservationKind.Reopening => Reading.Breakdown,
        ObservationKind.BreakoutWidth or ObservationKind.NoBreakout => Reading.Shmax,
        _ => Reading.Shmin,
    };

    private static Reading Pore(EarthModel model, ObservedInterval interval, int first, int count)
    {
        var mean = SampleMean.Of(model, Property.PorePressure, first, count);
        return double.IsNaN(mean)
            ? new(interval, Reading.PorePressure, "no pore pressure at its depth")
            : new(interval, Meaning.Value, Reading.PorePressure, interval.Sigma, mean);
    }
}
