using DepthStress.Core.Logs;

namespace DepthStress.Core.Layers;

/// <summary>The greatest difference of a solver's stress from what it should be.</summary>
/// <param name="Share">As a share of the stress.</param>
/// <param name="Pressure">In Pa, found less expected; NaN where only the share is known.</param>
/// <param name="Layer">Number of the layer it is in; 0 for none.</param>
/// <param name="Stress">Which stress: Sv, Shmin or SHmax; empty where only the share is known.</param>
public readonly record struct LoopDifference(double Share, double Pressure, int Layer, string Stress)
{
    /// <summary>The greater of this and another.</summary>
    internal LoopDifference Or(LoopDifference other) => other.Share > Share ? other : this;
}

/// <summary>A layer's mean stresses by a solver and in the profile at log scale, Pa.</summary>
/// <param name="Layer">The layer.</param>
/// <param name="Solved">What the solver finds.</param>
public sealed record LoopLayer(Layer Layer, SolvedLayer Solved)
{
    /// <summary>The solver's vertical stress less that of the profile.</summary>
    public double Vertical => Solved.Vertical - Layer.Profile(Property.VerticalStress).Mean;

    /// <summary>The solver's Shmin less that of the profile.</summary>
    public double Shmin => Solved.Shmin - Layer.Profile(Property.MinHorizontalStress).Mean;

    /// <summary>The solver's SHmax less that of the profile; NaN where the profile has none.</summary>
    public double Shmax => Solved.Shmax - Layer.Profile(Property.MaxHorizontalStress).Mean;

    internal LoopDifference Greatest() => new LoopDifference(0, 0, 0, "")
        .Or(Of("Sv", Vertical, Property.VerticalStress)).Or(Of("Shmin", Shmin, Property.MinHorizontalStress)).Or(Of("SHmax", Shmax, Property.MaxHorizontalStress));

    private LoopDifference Of(string name, double difference, Property property) => new(Math.Abs(difference / Layer.Profile(property).Mean), difference, Layer.Number, name);
}

/// <summary>
/// What comes back when the exported layers are solved by the program's own finite elements: against the layers' own formula, which
/// must agree to rounding, and on average over each layer against the profile at log scale, which tells what layering costs.
/// </summary>
/// <param name="Formula">Greatest difference from the layers' own formula.</param>
/// <param name="Profile">Greatest difference of a layer's mean from the profile's.</param>
/// <param name="Layers">Every layer that was solved.</param>
public sealed record ClosedLoop(LoopDifference Formula, LoopDifference Profile, IReadOnlyList<LoopLayer> Layers)
{
    /// <summary>Puts solved blocks beside the layer table they come from.</summary>
    public static ClosedLoop Of(LayerTable table, IReadOnlyList<ColumnBlock> blocks)
    {
        ArgumentNullException.ThrowIfNull(table);
        var byNumber = table.Layers.ToDictionary(l => l.Number);
        List<LoopLayer> layers = [.. blocks.SelectMany(b => b.Layers).Select(s => new LoopLayer(byNumber[s.Number], s))];
        var none = new LoopDifference(0, double.NaN, 0, "");
        return new ClosedLoop(
            layers.Aggregate(none, (worst, l) => worst.Or(new LoopDifference(l.Solved.FormulaError, double.NaN, l.Solved.Number, ""))),
            layers.Aggregate(none, (worst, l) => worst.Or(l.Greatest())), layers);
    }
}
