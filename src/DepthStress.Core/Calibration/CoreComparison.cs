using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Calibration;

/// <summary>A plug beside the model at its shifted depth, SI.</summary>
/// <param name="Plug">The plug.</param>
/// <param name="Depth">Measured depth on the log, m.</param>
/// <param name="Youngs">The model's static Young's modulus.</param>
/// <param name="Unfactored">The same without the factor of the settings.</param>
/// <param name="Dynamic">The dynamic Young's modulus.</param>
/// <param name="Poisson">The model's static Poisson's ratio.</param>
/// <param name="Ucs">The model's unconfined compressive strength.</param>
public sealed record PlugRow(CorePlug Plug, double Depth, double Youngs, double Unfactored, double Dynamic, double Poisson, double Ucs);

/// <summary>Model minus plug over some plugs.</summary>
/// <param name="Count">Plugs with both.</param>
/// <param name="Mean">Mean difference, SI.</param>
/// <param name="RootMeanSquare">Root mean square difference, SI.</param>
public sealed record Difference(int Count, double Mean, double RootMeanSquare)
{
    /// <summary>The difference of the pairs that are both known; null without any.</summary>
    public static Difference? Of(IEnumerable<(double Model, double Plug)> pairs)
    {
        var known = pairs.Select(p => p.Model - p.Plug).Where(d => !double.IsNaN(d)).ToList();
        return known.Count == 0 ? null : new Difference(known.Count, known.Average(), Math.Sqrt(known.Average(d => d * d)));
    }
}

/// <summary>Plugs that may be pooled: cut alike and tested alike.</summary>
/// <param name="Name">What they have in common.</param>
/// <param name="Rows">Their rows.</param>
public sealed record CoreGroup(string Name, IReadOnlyList<PlugRow> Rows)
{
    private IReadOnlyList<PlugRow> WithDynamic { get; } = [.. Rows.Where(r => !double.IsNaN(r.Plug.YoungsStatic) && !double.IsNaN(r.Dynamic))];

    /// <summary>The least and greatest confining pressure, Pa; NaN where none is stated.</summary>
    public (double Least, double Greatest) Confining => (Rows.Min(r => r.Plug.ConfiningPressure), Rows.Max(r => r.Plug.ConfiningPressure));

    /// <summary>The model's static modulus against the plugs'.</summary>
    public Difference? Youngs => Difference.Of(Rows.Select(r => (r.Youngs, r.Plug.YoungsStatic)));

    /// <summary>The model's Poisson's ratio against the plugs'.</summary>
    public Difference? Poisson => Difference.Of(Rows.Select(r => (r.Poisson, r.Plug.PoissonStatic)));

    /// <summary>The line of plug modulus on dynamic modulus; null where it has none.</summary>
    public (FitValue Intercept, FitValue Slope, double Deviation)? Line => SimpleFit.Line([.. WithDynamic.Select(r => r.Dynamic)], [.. WithDynamic.Select(r => r.Plug.YoungsStatic)]);

    /// <summary>The same through the origin.</summary>
    public FitValue? ThroughOrigin => SimpleFit.ThroughOrigin([.. WithDynamic.Select(r => r.Dynamic)], [.. WithDynamic.Select(r => r.Plug.YoungsStatic)]);

    /// <summary>The factor that the chosen law's modulus needs to meet the plugs: <c>[moduli] static_youngs_factor</c>.</summary>
    public FitValue? Factor
    {
        get
        {
            var rows = Rows.Where(r => !double.IsNaN(r.Plug.YoungsStatic) && !double.IsNaN(r.Unfactored)).ToList();
            return SimpleFit.Factor([.. rows.Select(r => r.Unfactored)], [.. rows.Select(r => r.Plug.YoungsStatic)]);
        }
    }

    /// <summary>Every law of the catalogue for static modulus on these plugs, the best first.</summary>
    public IReadOnlyList<LawMisfit> Laws(PlugDepth at) => LawMisfit.All(
        Property.YoungsStatic, [.. Rows.Where(r => !double.IsNaN(r.Plug.YoungsStatic)).Select(r => (r.Depth, r.Plug.YoungsStatic))], at);
}

/// <summary>Core beside the model. Nothing of it changes the model.</summary>
/// <param name="Rows">Every plug, in the order of the files.</param>
/// <param name="Groups">Moduli by what may be pooled.</param>
/// <param name="Ucs">Strength by orientation: name and difference, where a plug and the model have one.</param>
/// <param name="Match">The shift of core depths that would fit better, where one was looked for and could be.</param>
/// <param name="At">The model at depths.</param>
public sealed record CoreComparison(
    IReadOnlyList<PlugRow> Rows, IReadOnlyList<CoreGroup> Groups, IReadOnlyList<(string Name, Difference Difference)> Ucs, CoreDepthMatch? Match, PlugDepth At)
{
    /// <summary>Compares the core of a model's setup; null without plugs.</summary>
    public static CoreComparison? Of(EarthModel model)
    {
        ArgumentNullException.ThrowIfNull(model);
        var core = model.Setup.Core;
        if (core.Plugs.Count == 0) return null;
        var at = new PlugDepth(model);
        var rows = core.Plugs.Select(p => Row(p, p.Depth + core.Shift, at)).ToList();
        var groups = rows.Where(r => !double.IsNaN(r.Plug.YoungsStatic) || !double.IsNaN(r.Plug.PoissonStatic))
            .GroupBy(r => r.Plug.Group).Select(g => new CoreGroup(g.Key, [.. g])).OrderByDescending(g => g.Rows.Count).ToList();
        var ucs = rows.GroupBy(r => r.Plug.OrientationWord)
            .Select(g => (g.Key, Difference: Difference.Of(g.Select(r => (r.Ucs, r.Plug.Ucs))))).Where(g => g.Difference is not null)
            .Select(g => (g.Key, g.Difference!)).ToList();
        var match = core.DepthShiftLimit.IsSet && groups.Count > 0 ? CoreDepthMatch.Find([.. groups[0].Rows.Select(r => r.Plug)], at, core.DepthShiftLimit.Value) : null;
        return new CoreComparison(rows, groups, ucs, match, at);
    }

    private static PlugRow Row(CorePlug plug, double depth, PlugDepth at)
    {
        // In layered rock a plug along the beds is compared with the modulus along them. A plug at an angle has no counterpart there.
        var layered = at.Settings(depth)?.Anisotropy.IsOn ?? false;
        var along = layered && plug.Orientation == PlugOrientation.Horizontal;
        var inclined = layered && plug.Orientation == PlugOrientation.Inclined;
        var youngs = inclined ? double.NaN : at.At(along ? Property.YoungsStaticHorizontal : Property.YoungsStatic, depth);
        // Poisson's ratio of a plug along the beds depends on where its sides were measured.
        var poisson = along || inclined ? double.NaN : at.At(Property.PoissonStatic, depth);
        return new PlugRow(
            plug, depth, youngs, youngs / (at.Settings(depth)?.Moduli.StaticYoungsFactor.Value ?? 1),
            inclined ? double.NaN : at.At(along ? Property.YoungsDynamicHorizontal : Property.YoungsDynamic, depth), poisson, at.At(Property.Ucs, depth));
    }
}
