using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>Observations where there are no logs, and pore pressure against the mud the hole was drilled with.</summary>
internal static class ObservationFindings
{
    /// <summary>Looks for them.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var md = model.Values.Read(Property.MeasuredDepth).ToArray();
        var findings = new List<Finding>();
        foreach (var interval in model.Setup.Observations.Select(o => ObservedInterval.Of(model.Setup, o)))
        {
            if (md.Length == 0 || interval.Samples(md).Count > 0) continue;
            var (top, bottom) = (Quantity.Length(interval.Top), Quantity.Length(interval.Base));
            var (word, place) = (interval.Observation.Kind.Word(), interval.Observation.Position);
            findings.Add(interval.Base < md[0]
                ? Finding.General(Severity.Warning, $"{place}: {word} at {top} to {bottom} measured depth lies above the first sample at {Quantity.Length(md[0])}: it has no logs to compare with")
                : Finding.General(Severity.Warning, $"{place}: {word} at {top} to {bottom} measured depth lies below the last sample at {Quantity.Length(md[^1])}: it has no logs to compare with"));
        }

        if (!model.Setup.Mud.Density.IsSet) return findings;
        var (tvd, pp) = (SampleMarks.Column(model, Property.TrueVerticalDepth), SampleMarks.Column(model, Property.PorePressure));
        var mud = new double[md.Length];
        HoleIndex.FillMudPressure(model.Setup, md, tvd, mud);
        return findings.Concat(SampleMarks.Where(
            model, Severity.Note, $"pore pressure is above the pressure of the mud the hole was drilled with: rock too tight to flow, or one of the two is wrong",
            i => pp[i] > mud[i]));
    }
}
