using System.Globalization;
using DepthStress.Core.Layers;
using DepthStress.Core.Logs;

namespace DepthStress.Tests.Solver;

/// <summary>The largest difference found, as a share, in Pa, and the layer it is in.</summary>
internal readonly record struct Worst(double Share, double Pascals, int Layer)
{
    public Worst Or(double found, double wanted, int layer) =>
        Math.Abs(found - wanted) / Math.Abs(wanted) > Share ? new(Math.Abs(found - wanted) / Math.Abs(wanted), Math.Abs(found - wanted), layer) : this;
}

/// <summary>The two numbers: the solver against the layers' own formula, and against the profile at log scale.</summary>
internal sealed record CalculixLoop(Worst Formula, Worst Profile, bool WithinProfile)
{
    /// <summary>Share of a stress, or stress in Pa, within which a layer's mean must be.</summary>
    private const double LargestShare = 0.005;
    private const double LargestPascals = 0.3e6;

    /// <summary>Elements of a layer along the vertical.</summary>
    private const int Slices = 4;

    public static CalculixLoop Of(LayerTable table, SolverColumn column, CalculixRun run, LayerSettings settings)
    {
        var (formula, profile, within) = (default(Worst), default(Worst), true);
        var perLayer = Slices * (int)(settings.ElementsAlongShmax.Value * settings.ElementsAlongShmin.Value);
        var solved = run.Elements.Chunk(perLayer).ToList();
        var layers = column.Layers.ToList();
        Assert.Equal(layers.Count, solved.Count);
        for (var k = 0; k < layers.Count; k++)
        {
            var layer = layers[k];
            foreach (var element in solved[k])
            {
                // The depth is printed with seven digits; the middle of the slice it names is known exactly.
                var slice = (int)((element.Depth - layer.Top) / layer.Thickness * Slices);
                var depth = layer.Top + (layer.Thickness * (slice + 0.5) / Slices);
                Assert.Equal(depth, element.Depth, 1e-2);
                formula = formula.Or(-element.Vertical, layer.Vertical(depth), layer.Number)
                    .Or(-element.Along1, layer.Shmax(depth, column.Strains), layer.Number)
                    .Or(-element.Along2, layer.Shmin(depth, column.Strains), layer.Number);
            }

            var row = table.Layers.Single(l => l.Number == layer.Number);
            Compare(solved[k].Average(e => -e.Vertical), row.Profile(Property.VerticalStress).Mean);
            Compare(solved[k].Average(e => -e.Along2), row.Profile(Property.MinHorizontalStress).Mean);
            if (!double.IsNaN(row.Profile(Property.MaxHorizontalStress).Mean)) Compare(solved[k].Average(e => -e.Along1), row.Profile(Property.MaxHorizontalStress).Mean);

            void Compare(double found, double wanted)
            {
                profile = profile.Or(found, wanted, row.Number);
                within &= Math.Abs(found - wanted) <= Math.Max(LargestShare * wanted, LargestPascals);
            }
        }

        return new CalculixLoop(formula, profile, within);
    }

    public override string ToString() => string.Create(
        CultureInfo.InvariantCulture,
        $"{Formula.Share:0E+0} | {100 * Profile.Share:F2} % ({Profile.Pascals / 1e6:F3} MPa, layer {Profile.Layer})");
}
