using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>
/// Static constants of layered rock. By default the law for Young's modulus acts on the vertical and on the horizontal one, that
/// for Poisson's ratio on both ratios, and the third ratio follows from symmetry (<c>nu_hv = nu_v Eh / Ev</c>); a law that does
/// not start from the dynamic modulus knows no direction, and the ratio of the dynamic moduli is kept. Otherwise one factor
/// acts on the whole stiffness. What is not stable becomes missing.
/// </summary>
internal static class VtiStaticStage
{
    /// <summary>Fills the horizontal constants of the runs that have a model, once the vertical ones are there.</summary>
    public static void Moduli(PropertyTable table, IReadOnlyList<SettingsRun> runs, List<Finding> findings)
    {
        var unstable = new bool[table.Count];
        foreach (var run in runs.Where(r => r.Settings.Anisotropy.IsOn))
        {
            if (!table.Has(Property.YoungsStatic) || !table.Has(Property.PoissonStatic) || !table.Has(Property.YoungsDynamicHorizontal)) continue;
            Horizontal(run, table);
            var vertical = table.Write(Property.YoungsStatic);
            var horizontal = table.Write(Property.YoungsStaticHorizontal);
            var poisson = table.Write(Property.PoissonStatic);
            var poissonHorizontal = table.Write(Property.PoissonStaticHorizontal);
            for (var i = run.Start; i < run.End; i++)
            {
                if (double.IsNaN(table.Read(Property.YoungsDynamicHorizontal)[i])) horizontal[i] = poissonHorizontal[i] = double.NaN;
                if (VtiConstants.AreStable(vertical[i], horizontal[i], poisson[i], poissonHorizontal[i])) continue;
                unstable[i] = !double.IsNaN(vertical[i]) && !double.IsNaN(poisson[i]);
                vertical[i] = horizontal[i] = poisson[i] = poissonHorizontal[i] = double.NaN;
            }
        }

        Add(findings, table, unstable, $"the static stiffness would not be stable (1 - nu_hh above 2 nu_v^2 Eh/Ev), or no horizontal modulus follows: static constants and horizontal stress are missing");
    }

    /// <summary>Fills Biot's coefficient along the beds, once the one across them is there; a coefficient from moduli is had in both directions.</summary>
    public static void Biot(PropertyTable table, IReadOnlyList<SettingsRun> runs, List<Finding> findings)
    {
        var refused = new bool[table.Count];
        foreach (var run in runs.Where(r => r.Settings.Anisotropy.IsOn))
        {
            if (!table.Has(Property.Biot)) continue;
            var vertical = table.Write(Property.Biot);
            var horizontal = table.Write(Property.BiotHorizontal);
            vertical.Slice(run.Start, run.Length).CopyTo(horizontal[run.Start..]);
            var grains = run.Settings.Biot.MineralBulkModulus.Value;
            if (run.Settings.Biot.Coefficient.Value != BiotMethods.Static) continue;
            for (var i = run.Start; i < run.End; i++)
            {
                var stiffness = StaticStiffness.At(table, i);
                (vertical[i], horizontal[i]) = (VtiBiot.Vertical(stiffness, grains), VtiBiot.Horizontal(stiffness, grains));
                if (vertical[i] is >= 0 and <= 1 && horizontal[i] is >= 0 and <= 1) continue;
                refused[i] = !double.IsNaN(vertical[i]);
                vertical[i] = horizontal[i] = double.NaN;
            }
        }

        Add(findings, table, refused, $"Biot's coefficient from moduli is not between 0 and 1 in one direction: it and the horizontal stress are missing");
    }

    private static void Horizontal(SettingsRun run, PropertyTable table)
    {
        var (start, n) = (run.Start, run.Length);
        var dynamic = table.Read(Property.YoungsDynamic).Slice(start, n);
        var dynamicHorizontal = table.Read(Property.YoungsDynamicHorizontal).Slice(start, n);
        var youngs = table.Write(Property.YoungsStaticHorizontal).Slice(start, n);
        var poisson = table.Write(Property.PoissonStaticHorizontal).Slice(start, n);
        var whole = run.Settings.Anisotropy.StaticConversion.Value == StaticConversion.WholeStiffness;
        var (youngsLaw, poissonLaw) = (run.Settings.Moduli.StaticYoungs, run.Settings.Moduli.StaticPoisson);
        if (!youngsLaw.IsSet || !poissonLaw.IsSet) return;
        if (!whole && HasDirection(youngsLaw.Value))
        {
            LawKernel.Apply(youngsLaw.Value, LawColumns.For(youngsLaw.Value, table, run, AlongBeds), youngs);
        }
        else
        {
            var vertical = table.Read(Property.YoungsStatic).Slice(start, n);
            for (var i = 0; i < n; i++) youngs[i] = vertical[i] * (dynamicHorizontal[i] / dynamic[i]);
        }

        LawKernel.Apply(poissonLaw.Value, LawColumns.For(poissonLaw.Value, table, run, AlongBeds), poisson);
    }

    /// <summary>True for a law that starts from the dynamic modulus, and so tells one direction from the other.</summary>
    public static bool HasDirection(Law law) => law.Inputs.Any(i => i.Property == Property.YoungsDynamic);

    private static Property AlongBeds(Property property) => property switch
    {
        Property.YoungsDynamic => Property.YoungsDynamicHorizontal,
        Property.PoissonDynamic => Property.PoissonDynamicHorizontal,
        Property.YoungsStatic => Property.YoungsStaticHorizontal,
        _ => property,
    };

    private static void Add(List<Finding> findings, PropertyTable table, bool[] marks, FormattableString text)
    {
        if (Finding.About(Severity.Warning, text, table.Read(Property.MeasuredDepth), marks) is { } finding) findings.Add(finding);
    }
}
