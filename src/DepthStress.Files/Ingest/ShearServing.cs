using System.Globalization;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Files.Setup;

namespace DepthStress.Files.Ingest;

/// <summary>
/// Decides which shear wave serves the isotropic chain where a tool gave a fast and a slow one: a plain shear column does, else the
/// one that the well file names. Nothing is chosen silently.
/// </summary>
internal static class ShearServing
{
    private static readonly CurveRole Shear = CurveRoles.Of(Property.Vs)!;

    /// <summary>Puts the curve that serves as shear among the curves, or reports why there is none.</summary>
    /// <param name="logs">The well file's words about the logs.</param>
    /// <param name="roles">The columns of each role; a choice for shear is put in or exchanged.</param>
    /// <param name="curves">The curves; one for shear is put in or exchanged.</param>
    /// <param name="diagnostics">Gets what served and by how much the waves differ, and every problem.</param>
    public static void Choose(LogsSection logs, List<RoleChoice> roles, List<Curve> curves, DiagnosticBag diagnostics)
    {
        RoleChoice? Role(Property property) => roles.Find(r => r.Role.Property == property);
        var (plain, fast, slow) = (Role(Property.Vs), Role(Property.FastShear), Role(Property.SlowShear));
        var chosen = logs.ShearFrom;
        if (fast is null && slow is null)
        {
            if (chosen.IsSet) diagnostics.Error(chosen.Source.Position, "found shear_from, but no column for fast_shear or slow_shear; expected it only where one of them is there");
            return;
        }

        RoleChoice[] there = [.. new[] { fast, slow }.OfType<RoleChoice>()];
        var difference = Difference(there, curves, diagnostics);
        if (plain is not null && !chosen.IsSet)
        {
            diagnostics.Note(
                plain.Columns[0].Column.Position,
                $"shear: {Columns(plain)} serves; {Named(there)} {(there.Length == 1 ? "is" : "are")} there too and {(there.Length == 1 ? "does" : "do")} not enter the isotropic chain{difference}");
            return;
        }

        if (plain is { Stated: true })
        {
            diagnostics.Error(chosen.Source.Position, $"found both shear in [logs.curves] ({Columns(plain)}) and shear_from, expected one of them");
            return;
        }

        if (!chosen.IsSet)
        {
            var words = there.Length == 2 ? "\"fast\", \"slow\" or \"mean\"" : fast is null ? "\"slow\"" : "\"fast\"";
            diagnostics.Error(
                logs.Files.Source.Position,
                $"[logs] shear_from is not set: found {Named(there)} but no column for shear{difference}; expected shear_from = {words}, or shear in [logs.curves]");
            return;
        }

        Serve(chosen, plain, fast, slow, difference, roles, curves, diagnostics);
    }

    /// <summary>How much faster the fast wave is than the slow one, as a share of their mean: the mean over the samples that have both, and their number.</summary>
    /// <param name="fast">Velocity of the fast wave; NaN means missing.</param>
    /// <param name="slow">Velocity of the slow wave, of the same length and unit.</param>
    /// <returns>The same for slownesses but for the sign; NaN where no sample has both.</returns>
    public static (double Share, int Samples) MeanDifference(ReadOnlySpan<double> fast, ReadOnlySpan<double> slow)
    {
        var (sum, count) = (0.0, 0);
        for (var i = 0; i < Math.Min(fast.Length, slow.Length); i++)
        {
            if (!double.IsFinite(fast[i]) || !double.IsFinite(slow[i])) continue;
            sum += 2 * (fast[i] - slow[i]) / (fast[i] + slow[i]);
            count++;
        }

        return (count == 0 ? double.NaN : sum / count, count);
    }

    private static void Serve(
        Setting<ShearChoice> chosen, RoleChoice? plain, RoleChoice? fast, RoleChoice? slow, string difference, List<RoleChoice> roles, List<Curve> curves, DiagnosticBag diagnostics)
    {
        (string Id, RoleChoice? Role)[] wanted = chosen.Value switch
        {
            ShearChoice.Fast => [("fast_shear", fast)],
            ShearChoice.Slow => [("slow_shear", slow)],
            _ => [("fast_shear", fast), ("slow_shear", slow)],
        };
        var sources = new List<Curve>();
        foreach (var (id, role) in wanted)
        {
            if (role is null) diagnostics.Error(chosen.Source.Position, $"found shear_from = \"{Word(chosen.Value)}\", but no column for {id}");
            else if (curves.Find(c => c.Role == role.Role) is { } curve) sources.Add(curve);
            else if (!diagnostics.HasErrors) diagnostics.Error(chosen.Source.Position, $"found shear_from = \"{Word(chosen.Value)}\", but {id} ({Columns(role)}) cannot be used");
        }

        if (sources.Count != wanted.Length) return;
        roles.RemoveAll(r => r.Role == Shear);
        curves.RemoveAll(c => c.Role == Shear);
        roles.Add(new RoleChoice(Shear, [.. wanted.SelectMany(w => w.Role!.Columns)]));
        curves.Add(sources.Count == 1 ? sources[0] with { Role = Shear, Values = (double[])sources[0].Values.Clone() } : Mean(sources[0], sources[1]));
        var instead = plain is null ? "" : $", not {Columns(plain)}";
        diagnostics.Note(chosen.Source.Position, $"shear: {(sources.Count == 1 ? "" : "the mean slowness of ")}{Named([.. wanted.Select(w => w.Role!)])} serves{instead}{difference}");
    }

    /// <summary>The mean of the two slownesses, missing where one of them is.</summary>
    private static Curve Mean(Curve fast, Curve slow)
    {
        var values = new double[fast.Values.Length];
        for (var i = 0; i < values.Length; i++) values[i] = 2 * fast.Values[i] * slow.Values[i] / (fast.Values[i] + slow.Values[i]);
        return new Curve(Shear, $"mean of {fast.Source} and {slow.Source}", values, OriginTrack.Of(values, SampleOrigin.Edited, "mean of the fast and slow shear slowness"));
    }

    private static string Difference(RoleChoice[] there, List<Curve> curves, DiagnosticBag diagnostics)
    {
        if (there.Length < 2 || curves.Find(c => c.Role == there[0].Role) is not { } fast || curves.Find(c => c.Role == there[1].Role) is not { } slow) return "";
        var (share, samples) = MeanDifference(fast.Values, slow.Values);
        if (samples == 0) return "; no sample has both waves";
        var text = string.Create(CultureInfo.InvariantCulture, $"{100 * Math.Abs(share):F1} % {(share < 0 ? "slower" : "faster")} on average over {samples} {(samples == 1 ? "sample" : "samples")}");
        if (share < 0)
        {
            diagnostics.Warning(
                there[0].Columns[0].Column.Position, $"fast_shear ({Columns(there[0])}): found it {text} than slow_shear ({Columns(there[1])}), expected it faster; are the two exchanged?");
        }

        return $"; the fast one is {text} than the slow one";
    }

    private static string Word(ShearChoice choice) => choice switch
    {
        ShearChoice.Fast => "fast",
        ShearChoice.Slow => "slow",
        _ => "mean",
    };

    private static string Named(RoleChoice[] roles) => string.Join(" and ", roles.Select(r => $"{r.Role.Id} ({Columns(r)})"));

    private static string Columns(RoleChoice role) => string.Join(", ", role.Columns.Select(c => $"{c.Column.Name} in {c.File.Name}"));
}
