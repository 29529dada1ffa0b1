using DepthStress.Core.Borehole;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Setup;

/// <summary>Declares the keys of the sections about the hole itself: mud, casing, observations.</summary>
internal static class HoleBindings
{
    private static readonly (string, LeakOffMeaning)[] LeakOffs = [("upper bound", LeakOffMeaning.UpperBound), ("value", LeakOffMeaning.Value)];

    private static readonly (string, IntegrityMeaning)[] Integrities = [("leak-off", IntegrityMeaning.LeakOff), ("shmin", IntegrityMeaning.Shmin)];

    private static readonly (string, BreakdownFluid)[] Fluids =
        [("non-penetrating", BreakdownFluid.NonPenetrating), ("penetrating", BreakdownFluid.Penetrating)];

    /// <summary>The [mud] section.</summary>
    public static MudSettings Mud(ISection s, MudSettings m)
    {
        var muds = s.Tables("density", m.Density.IsSet ? m.Density.Value : [], (t, mud) => Interval(t, mud, m.Density.Source), new(double.NaN, double.NaN), "the muds from top to bottom, each with the depth at which it begins");
        return m with
        {
            Density = muds.Count > 0 ? new Setting<IReadOnlyList<MudInterval>>(muds, s.SourceOf("density")) : m.Density,
            DepthKind = s.Choice("depth_kind", m.DepthKind, Bindings.DepthKinds, "the kind of depth of their tops"),
        };
    }

    /// <summary>The [casing] section.</summary>
    public static CasingSettings Casing(ISection s, CasingSettings c)
    {
        var shoes = s.Tables("shoes", c.Shoes.IsSet ? c.Shoes.Value : [], (t, shoe) => Shoe(t, shoe, c.Shoes.Source), double.NaN, "the shoes of the casing strings");
        return c with
        {
            Shoes = shoes.Count > 0 ? new Setting<IReadOnlyList<double>>(shoes, s.SourceOf("shoes")) : c.Shoes,
            DepthKind = s.Choice("depth_kind", c.DepthKind, Bindings.DepthKinds, "the kind of depth of the shoes"),
        };
    }

    /// <summary>The [observations] section.</summary>
    public static ObservationsSection Observations(ISection s, ObservationsSection o) => o with
    {
        Files = s.Texts("files", o.Files, "tests as CSV with top, base, depth_kind, kind, value, pressure_at, fluid_density, sigma, pore_pressure, date and note, relative to the well file"),
        Settings = o.Settings with
        {
            LeakOff = s.Choice("leak_off", o.Settings.LeakOff, LeakOffs, "what a leak-off pressure says of Shmin"),
            Integrity = s.Choice("integrity", o.Settings.Integrity, Integrities, "what a pressure held without leak-off is a lower bound of; shmin only where the wall is cracked already"),
            StrengthError = s.Number("strength_error", o.Settings.StrengthError, new Interval(0, 1), "relative standard deviation of the relations of [strength], one error for all breakdowns and breakouts"),
            BreakdownFluid = s.Choice("breakdown_fluid", o.Settings.BreakdownFluid, Fluids, "whether the fluid of breakdown and reopening tests entered the rock"),
        },
    };

    private static MudInterval Interval(ISection s, MudInterval m, SettingSource source)
    {
        var top = s.Quantity("top", Bindings.Known(m.Top, source), Sign.Any, Dimension.Length, "depth at which the mud begins");
        var density = s.FluidDensity("density", Bindings.Known(m.Density, source), "its density when the hole was drilled");
        return new MudInterval(top.IsSet ? top.Value : double.NaN, density.IsSet ? density.Value : double.NaN);
    }

    private static double Shoe(ISection s, double shoe, SettingSource source)
    {
        var depth = s.Quantity("depth", Bindings.Known(shoe, source), Sign.Any, Dimension.Length, "depth of the shoe");
        return depth.IsSet ? depth.Value : double.NaN;
    }
}
