using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>What is missing from the results, and why.</summary>
internal static class MissingFindings
{
    /// <summary>Looks for logs and choices without which stresses stay empty.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var (vp, vs) = (SampleMarks.Column(model, Property.Vp), SampleMarks.Column(model, Property.Vs));
        var sv = SampleMarks.Column(model, Property.VerticalStress);
        var pp = SampleMarks.Column(model, Property.PorePressure);
        var usable = model.Usable;
        Finding[] free = model.Runs.Any(r => !r.Settings.HorizontalStress.StrainAlongShmax.IsSet)
            ? [Finding.General(Severity.Note, $"SHmax is empty where nothing constrains it: set strain_along_shmin and strain_along_shmax")]
            : [];
        return
        [
            .. SampleMarks.Where(
                model, Severity.Warning, $"compressional log missing: no moduli, no horizontal stress",
                i => usable[i] && double.IsNaN(vp[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"shear log missing: no moduli, no horizontal stress",
                i => usable[i] && double.IsNaN(vs[i]) && !double.IsNaN(vp[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"no density below the last logged one, so no stress: set [overburden] below_log",
                i => usable[i] && double.IsNaN(sv[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"pore pressure missing: the depth lies outside the pressure table", i => double.IsNaN(pp[i])),
            .. free,
        ];
    }
}
