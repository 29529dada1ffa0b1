using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>What the conversion to static constants did to the stress ratio of layered rock, and whose temperature is missing.</summary>
internal static class AnisotropyFindings
{
    /// <summary>Looks at each zone with a model of anisotropy, then at the laws and the temperature.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var temperature = SampleMarks.Column(model, Property.Temperature);
        var thermal = new bool[model.Count];
        foreach (var run in model.Runs) Array.Fill(thermal, run.Settings.HorizontalStress.IsThermal, run.Start, run.Length);
        return
        [
            .. VtiZone.Of(model).Select(z => Finding.General(
                Severity.Note,
                $"static conversion {Place(model, z.Zone)}: C13/C33, the horizontal over the vertical stress without pore pressure and lateral strain, goes from {Number(z.DynamicRatio)} to {Number(z.StaticRatio)} on average")),
            .. Laws(model),
            .. SampleMarks.Where(
                model, Severity.Warning, $"temperature missing: no thermal stress, so no horizontal stress", i => thermal[i] && double.IsNaN(temperature[i])),
        ];
    }

    private static IEnumerable<Finding> Laws(EarthModel model)
    {
        var laws = model.Runs.Select(r => r.Settings)
            .Where(s => s.Anisotropy.IsOn && s.Anisotropy.StaticConversion.Value == StaticConversion.EachModulus && s.Moduli.StaticYoungs.IsSet)
            .Select(s => s.Moduli.StaticYoungs.Value).Where(l => !VtiStaticStage.HasDirection(l)).Select(l => l.Id).Distinct();
        foreach (var id in laws)
        {
            yield return Finding.General(
                Severity.Note,
                $"[moduli] static_youngs: {id} does not start from the dynamic modulus, so the static moduli along and across the beds keep the ratio of the dynamic ones");
        }
    }

    private static string Place(EarthModel model, short zone) =>
        zone >= 0 ? $"in zone \"{model.Setup.Zones[zone].Name}\"" : model.Setup.Zones.Count > 0 ? "outside the zones" : "in the well";

    private static Quantity Number(double value) => new(value, Dimension.None);
}
