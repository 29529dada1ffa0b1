using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Core.Layers;

/// <summary>Cuts stretches where properties change: where the evidence outweighs chance, or into a wanted number of layers.</summary>
internal static class PropertyCut
{
    /// <summary>The greatest number of cells; longer logs are averaged down first.</summary>
    public const int MostCells = 20_000;

    /// <summary>About how many sums of costs a wanted number of layers may take: one or two seconds of work.</summary>
    private const double MostWork = 4e9;

    /// <summary>Work on what a segment costs, in terms of one sum of costs.</summary>
    private const int CostWork = 6;

    /// <summary>The layers from top to bottom; null when no cut keeps the limits, which is then reported.</summary>
    public static List<LayerBounds>? Of(
        EarthModel model, SampleCells cells, List<LayerBounds> bounds, IReadOnlyList<CutCurveChoice> curves, LayerSettings settings, DiagnosticBag diagnostics, List<Finding> findings)
    {
        if (settings.Count.IsSet && !WantedCount.CoversStretches(bounds.Count, settings, diagnostics)) return null;
        var group = Group(model, cells, bounds, settings);
        if (group > 1) findings.Add(Finding.General(Severity.Note, $"[layers]: to find changes, every {group} neighbouring samples were averaged into one cell, so boundaries lie between those cells"));
        var resolution = settings.Resolution.Value;
        var stretches = CurveScatter.Standardised([.. bounds.Select(b => CutStretch.Of(model, cells, b, curves, resolution, group))], resolution);
        var ends = settings.Count.IsSet ? Counted(model, stretches, settings, diagnostics) : Clearest(model, stretches, curves, settings, diagnostics);
        if (ends is null) return null;
        var layers = stretches.SelectMany((s, k) => s.Layers(model, ends[k])).ToList();
        findings.Add(Finding.General(Severity.Note, $"[layers]: {layers.Count} layers, cut where {string.Join(", ", curves.Select(c => c.Id))} change"));
        return layers;
    }

    /// <summary>
    /// The cut that the Bayesian information criterion finds: a boundary pays with ln(n) for itself and for every number a segment
    /// of a curve has of its own, n being the number of independent samples.
    /// </summary>
    private static int[][]? Clearest(
        EarthModel model, List<CutStretch> stretches, IReadOnlyList<CutCurveChoice> curves, LayerSettings settings, DiagnosticBag diagnostics)
    {
        var independent = stretches.Sum(s => s.Thickness) / settings.Resolution.Value;
        var numbers = 1 + curves.Sum(c => c.Trend ? 2 : 1);
        var penalty = settings.Contrast.Value * numbers * Math.Log(Math.Max(2, independent));
        var ends = stretches.ConvertAll(s => ClearestCut.Of(s.Costs(), s.Edges, penalty, Limits(s, settings)));
        foreach (var (s, _) in stretches.Zip(ends).Where(p => p.Second is null)) TooFarApart(model, s, settings, diagnostics);
        return ends.TrueForAll(e => e is not null) ? [.. ends.Select(e => e!)] : null;
    }

    /// <summary>The cut into a wanted number of layers whose total misfit is least, shared out among the stretches by the same rule.</summary>
    private static int[][]? Counted(EarthModel model, List<CutStretch> stretches, LayerSettings settings, DiagnosticBag diagnostics)
    {
        var count = (int)settings.Count.Value;
        var cuts = stretches.ConvertAll(s => new CountedCut(s.Costs(), s.Edges, Limits(s, settings), MostLayers(s.Thickness, s.First.Length, stretches.Count, settings)));
        var possible = cuts.ConvertAll(c => Enumerable.Range(1, c.Most).Where(k => double.IsFinite(c.Cost(k))).ToList());
        bool ByThickness(int k) => stretches[k].Thickness > cuts[k].Most * settings.Limits.Most;
        var apart = Enumerable.Range(0, cuts.Count).Where(k => possible[k].Count == 0 && !ByThickness(k)).ToList();
        foreach (var k in apart) TooFarApart(model, stretches[k], settings, diagnostics);
        if (apart.Count > 0) return null;
        var least = stretches.Select((s, k) => possible[k].Count > 0 ? possible[k][0] : (int)Math.Ceiling(s.Thickness / settings.Limits.Most)).Sum();
        if (least > count)
        {
            WantedCount.TooFew(settings, least, diagnostics);
            return null;
        }

        if (CountShares.Of(cuts, count) is { } shares) return [.. cuts.Select((c, k) => c.Ends(shares[k])!)];
        WantedCount.TooMany(settings, possible.Sum(p => p[^1]), "samples and least thickness", diagnostics);
        return null;
    }

    /// <summary>A stretch thinner than the least thickness is one layer.</summary>
    private static ThicknessLimits Limits(CutStretch stretch, LayerSettings settings) =>
        settings.Limits.IsThickEnough(stretch.Thickness) ? settings.Limits : settings.Limits with { Least = stretch.Thickness };

    private static int MostLayers(double thickness, int cells, int stretches, LayerSettings settings)
    {
        var thin = Math.Max(1, Math.Floor(thickness / settings.Limits.Least * (1 + 1e-9)));
        return (int)Math.Min(Math.Min(thin, cells), settings.Count.Value - stretches + 1);
    }

    /// <summary>How many neighbouring samples make a cell.</summary>
    private static int Group(EarthModel model, SampleCells cells, List<LayerBounds> bounds, LayerSettings settings)
    {
        var samples = bounds.ConvertAll(b => Enumerable.Range(b.Start, b.End - b.Start).Count(i => model.Usable[i]));
        var group = Math.Max(1, (samples.Sum() + MostCells - 1) / MostCells);
        if (!settings.Count.IsSet) return group;
        while (samples.Zip(bounds).Sum(p => Work(p.First / group, p.Second)) > MostWork) group++;
        return group;

        double Work(int n, LayerBounds b) => 0.5 * n * n * (CostWork + MostLayers(b.Thickness(cells), n, bounds.Count, settings));
    }

    private static void TooFarApart(EarthModel model, CutStretch stretch, LayerSettings settings, DiagnosticBag diagnostics)
    {
        var md = model.Values.Read(Logs.Property.MeasuredDepth);
        diagnostics.Error(
            settings.MaxThickness.Source.Position,
            UnitSystem.Metric.Show($"[layers]: found samples too far apart between {Quantity.Length(md[stretch.Bounds.Start])} and {Quantity.Length(md[stretch.Bounds.End - 1])} measured depth for layers from {Quantity.Length(settings.Limits.Least)} to {Quantity.Length(settings.Limits.Most)}, expected limits further apart"));
    }
}
