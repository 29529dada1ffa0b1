using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Model;

/// <summary>
/// Where the hole crosses the beds so obliquely that sonic is not the velocity across them, and neither a model of anisotropy
/// turned it into that nor the user says that it is.
/// </summary>
internal static class BeddingFindings
{
    /// <summary>Up to this mean angle to the normal of the beds, 20 deg in rad, the difference is small (common practice).</summary>
    private const double Limit = 20 * Math.PI / 180;

    /// <summary>One note for each zone, or for the well where it has none; nothing is corrected, so it is no warning.</summary>
    public static IEnumerable<Finding> Of(EarthModel model)
    {
        var (vp, angle) = (SampleMarks.Column(model, Property.Vp), SampleMarks.Column(model, Property.BeddingAngle));
        var settled = new bool[model.Count];
        foreach (var run in model.Runs)
        {
            var choice = run.Settings.Anisotropy;
            Array.Fill(settled, !choice.AlongHole.Value || choice.IsOn, run.Start, run.Length);
        }

        for (var zone = (int)ZoneIndex.None; zone < model.Setup.Zones.Count; zone++)
        {
            var z = zone;
            bool Counts(int i) => model.Zones[i] == z && !settled[i] && double.IsFinite(vp[i]) && double.IsFinite(angle[i]);
            var angles = Enumerable.Range(0, model.Count).Where(Counts).Select(i => angle[i]).ToArray();
            if (angles.Length == 0 || !(angles.Average() > Limit)) continue;
            var place = z >= 0 ? $"in zone \"{model.Setup.Zones[z].Name}\"" : model.Setup.Zones.Count > 0 ? "outside the zones" : "in the well";
            FormattableString text = $"sonic along the hole is not the vertical velocity {place} (mean angle to the normal of the beds {new Quantity(angles.Average(), Dimension.Angle)})";
            foreach (var finding in SampleMarks.Where(model, Severity.Note, text, Counts)) yield return finding;
        }
    }
}
