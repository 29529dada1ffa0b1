using System.Globalization;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Report.Page;

/// <summary>How sure the stresses of the targets are, in words.</summary>
internal static class Targets
{
    /// <summary>One sentence per target zone that has a Shmin.</summary>
    public static IEnumerable<string> Uncertainty(ReportContent content)
    {
        var (model, units) = (content.Model, content.Pictures.Units);
        string Size(double si) => (si > 0 ? "+" : "") + units.Show(Quantity.Pressure(si));
        return content.Sensitivities.Where(s => s.Zone >= 0 && model.Setup.Zones[s.Zone].Target).Select(s => string.Create(
            CultureInfo.InvariantCulture,
            $"How sure: the mean Shmin of {model.ZoneName(s.Zone)} moves by {Size(s.PoissonLower)} to {Size(s.PoissonHigher)} when static Poisson's ratio is {ShminSensitivity.PoissonStep:0.00} lower or higher, and by {Size(s.BiotLower)} to {Size(s.BiotHigher)} when Biot's coefficient is {ShminSensitivity.BiotStep:0.00} lower or higher; logs cannot settle either. Barriers move with the same choices."));
    }

    /// <summary>What the stresses of all samples rest on.</summary>
    public static string Basis(EarthModel model)
    {
        var shares = Enum.GetValues<SampleOrigin>().Where(o => o != SampleOrigin.None)
            .Select(o => (Origin: o, Count: model.StressBasis.Count(b => b == o))).Where(s => s.Count > 0)
            .Select(s => string.Create(CultureInfo.InvariantCulture, $"{s.Origin.Name()} {100.0 * s.Count / model.Count:F1} %")).ToList();
        return shares.Count == 0
            ? "What it rests on: no sample has a stress."
            : $"What it rests on, by the weakest log under each sample's stress: {string.Join(", ", shares)}; the rest has no stress.";
    }
}
