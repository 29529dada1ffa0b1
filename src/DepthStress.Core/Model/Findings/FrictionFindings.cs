using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Stress;

namespace DepthStress.Core.Model;

/// <summary>Stresses beyond what existing faults can carry; named, never clipped.</summary>
internal static class FrictionFindings
{
    /// <summary>Looks for stresses beyond the frictional limits.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var (sv, pp) = (SampleMarks.Column(model, Property.VerticalStress), SampleMarks.Column(model, Property.PorePressure));
        var (shmin, shmax) = (SampleMarks.Column(model, Property.MinHorizontalStress), SampleMarks.Column(model, Property.MaxHorizontalStress));
        var friction = new double[model.Count];
        foreach (var run in model.Runs) Array.Fill(friction, run.Settings.HorizontalStress.FrictionCoefficient.Value, run.Start, run.Length);

        return
        [
            .. SampleMarks.Where(
                model, Severity.Warning, $"Shmin is below the limit that friction on faults sets for normal faulting",
                i => shmin[i] < FrictionalLimit.LowestShmin(sv[i], pp[i], friction[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"SHmax is above the limit that friction on faults sets",
                i => shmax[i] > FrictionalLimit.HighestShmax(sv[i], shmin[i], pp[i], friction[i])),
        ];
    }
}
