using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;

namespace DepthStress.Core.Layers;

/// <summary>A curve that layers can be cut by.</summary>
/// <param name="Id">Its name in the well file: that of its result column.</param>
/// <param name="Property">The property.</param>
/// <param name="Trend">True when it grows with depth of itself, so that a layer keeps a straight line.</param>
public sealed record CutCurveChoice(string Id, Property Property, bool Trend);

/// <summary>The curves that layers can be cut by.</summary>
public static class CutCurves
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<CutCurveChoice> All { get; } =
    [
        new("youngs_static", Property.YoungsStatic, false), new("poisson_static", Property.PoissonStatic, false),
        new("youngs_dynamic", Property.YoungsDynamic, false), new("poisson_dynamic", Property.PoissonDynamic, false),
        new("density", Property.Density, false), new("vp", Property.Vp, false), new("vs", Property.Vs, false),
        new("gamma_ray", Property.GammaRay, false), new("shale_volume", Property.ShaleVolume, false), new("porosity", Property.Porosity, false),
        new("biot", Property.Biot, false), new("ucs", Property.Ucs, false), new("friction_angle", Property.FrictionAngle, false),
        new("tensile_strength", Property.TensileStrength, false), new("sv", Property.VerticalStress, true), new("pp", Property.PorePressure, true),
        new("shmin", Property.MinHorizontalStress, true), new("shmax", Property.MaxHorizontalStress, true),
    ];

    /// <summary>The chosen curves that have values; one that the user named and that has none is an error, a default one is a warning.</summary>
    internal static IReadOnlyList<CutCurveChoice> Chosen(EarthModel model, LayerSettings settings, DiagnosticBag diagnostics, List<Finding> findings)
    {
        var chosen = new List<CutCurveChoice>();
        foreach (var curve in settings.Curves.Value.Select(id => All.First(c => c.Id == id)))
        {
            if (model.Values.Has(curve.Property) && model.Values.Read(curve.Property).ContainsAnyExcept(double.NaN)) chosen.Add(curve);
            else if (settings.Curves.Source.Kind == SettingKind.Default) findings.Add(Finding.General(Severity.Warning, $"[layers]: {curve.Id} has no values, so no boundary rests on it"));
            else diagnostics.Error(settings.Curves.Source.Position, $"[layers]: found the curve \"{curve.Id}\" without any value, expected curves that the run gives");
        }

        if (chosen.Count == 0 && !diagnostics.HasErrors)
            diagnostics.Error(model.Setup.Position, $"[layers]: none of {string.Join(", ", settings.Curves.Value)} has values, expected one to cut layers by; name others in curves");
        return chosen;
    }
}
