using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;

namespace DepthStress.Core.Model;

/// <summary>The curve of one comparison relation; the model's own stresses know nothing of it.</summary>
/// <param name="Law">The relation.</param>
/// <param name="Ratios">The ratios it was given, each once, from top to bottom; empty for a relation without one.</param>
/// <param name="Values">Its least stress at every sample, Pa; missing where it was not chosen or gives none.</param>
public sealed record ComparisonCurve(Law Law, IReadOnlyList<double> Ratios, double[] Values);

/// <summary>Computes the comparison curves that the settings name.</summary>
internal static class ComparisonStage
{
    /// <summary>One curve for each relation chosen anywhere, in the order of the samples that choose them.</summary>
    public static IReadOnlyList<ComparisonCurve> Apply(WellSetup setup, PropertyTable table, IReadOnlyList<SettingsRun> runs, List<LawUse> uses)
    {
        var curves = new List<(Law Law, List<double> Ratios, double[] Values)>();
        if (!runs.Any(r => r.Settings.HorizontalStress.Compare is { IsSet: true, Value.Count: > 0 })) return [];
        Depths(setup, table);
        foreach (var run in runs)
        {
            if (!run.Settings.HorizontalStress.Compare.IsSet) continue;
            foreach (var choice in run.Settings.HorizontalStress.Compare.Value)
            {
                var law = choice.Method.Value;
                var at = curves.FindIndex(c => c.Law == law);
                if (at < 0)
                {
                    at = curves.Count;
                    curves.Add((law, [], new double[table.Count]));
                    Array.Fill(curves[at].Values, double.NaN);
                }

                var (_, ratios, values) = curves[at];
                if (choice.Ratio.IsSet && !ratios.Contains(choice.Ratio.Value)) ratios.Add(choice.Ratio.Value);
                var inputs = default(LawInputs);
                foreach (var input in law.Inputs)
                    inputs.Add(input.Property == Property.MatrixStressRatio ? new[] { choice.Ratio.Value } : LawColumns.Column(input.Property, table, run));
                var outcome = LawKernel.Apply(law, inputs, values.AsSpan(run.Start, run.Length));
                uses.Add(new LawUse(LawSlots.Comparison, law, run.Zone, run.Lithology, outcome));
            }
        }

        return [.. curves.Select(c => new ComparisonCurve(c.Law, c.Ratios, c.Values))];
    }

    private static void Depths(WellSetup setup, PropertyTable table)
    {
        var tvd = table.Read(Property.TrueVerticalDepth);
        var surface = table.Write(Property.DepthBelowGroundOrSea);
        var solid = table.Write(Property.DepthBelowSurface);
        for (var i = 0; i < tvd.Length; i++)
        {
            surface[i] = tvd[i] - setup.Frame.SurfaceTvd;
            solid[i] = tvd[i] - setup.Frame.SolidTopTvd;
        }
    }
}
