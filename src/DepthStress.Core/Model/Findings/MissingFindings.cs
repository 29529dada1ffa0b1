using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;

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
        var shmin = SampleMarks.Column(model, Property.MinHorizontalStress); // salt has one without logs
        var usable = model.Usable;
        var trend = Lacks(model, s => Of(s) is null);
        var unsettled = Lacks(model, s => s.PorePressure.Method.IsSet);
        Finding[] free = model.Runs.Any(r => !r.Settings.HorizontalStress.ConstrainsShmax)
            ? [Finding.General(Severity.Note, $"SHmax is empty where nothing constrains it: set strain_along_shmin and strain_along_shmax")]
            : [];
        return
        [
            .. SampleMarks.Where(
                model, Severity.Warning, $"compressional log missing: no moduli, no horizontal stress",
                i => usable[i] && double.IsNaN(vp[i]) && double.IsNaN(shmin[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"shear log missing: no moduli, no horizontal stress",
                i => usable[i] && double.IsNaN(vs[i]) && !double.IsNaN(vp[i]) && double.IsNaN(shmin[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"no density below the last logged one, so no stress: set [overburden] below_log",
                i => usable[i] && double.IsNaN(sv[i])),
            .. SampleMarks.Where(
                model, Severity.Warning, $"pore pressure missing: the depth lies outside the pressure table",
                i => double.IsNaN(pp[i]) && !unsettled[i] && !trend[i]),
            .. ShaleMethod.All.SelectMany(m => NoLog(model, m)),
            .. NotSet(model, "[pore_pressure] method", s => s.PorePressure.Method.IsSet),
            .. LawSlots.All.Where(s => s.Required).SelectMany(slot => NotSet(model, slot.Key, s => slot.Choice(s).IsSet)),
            .. free,
        ];
    }

    private static ShaleMethod? Of(StageSettings settings) => settings.PorePressure.Method is { IsSet: true } method ? ShaleMethod.Of(method.Value) : null;

    /// <summary>Where the log of a method that tells the pressure of shale is missing.</summary>
    private static IEnumerable<Finding> NoLog(EarthModel model, ShaleMethod method)
    {
        var chosen = Lacks(model, s => Of(s)?.Method != method.Method);
        if (!chosen.Contains(true)) return [];
        var (pp, log) = (SampleMarks.Column(model, Property.PorePressure), SampleMarks.Column(model, method.Log));
        var name = method.Log switch
        {
            Property.Porosity => "porosity",
            Property.DeepResistivity => "resistivity log",
            _ => "compressional log",
        };
        return SampleMarks.Where(
            model, Severity.Warning, $"{name} missing: no pore pressure by {method.Law.Id}",
            i => model.Usable[i] && double.IsNaN(pp[i]) && chosen[i] && double.IsNaN(log[i]));
    }

    /// <summary>A choice that zones make but that nobody makes for the samples outside them.</summary>
    private static IEnumerable<Finding> NotSet(EarthModel model, string key, Predicate<StageSettings> isSet)
    {
        var lacks = Lacks(model, isSet);
        return SampleMarks.Where(model, Severity.Warning, $"{key} is not set for these samples: no horizontal stress", i => lacks[i]);
    }

    private static bool[] Lacks(EarthModel model, Predicate<StageSettings> isSet)
    {
        var lacks = new bool[model.Count];
        foreach (var run in model.Runs) Array.Fill(lacks, !isSet(run.Settings), run.Start, run.Length);
        return lacks;
    }
}
