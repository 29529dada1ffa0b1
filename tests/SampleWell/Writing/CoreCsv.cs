using SampleWell.Hidden;
using static SampleWell.Writing.FixedText;

namespace SampleWell.Writing;

/// <summary>Writes the laboratory table of the core plugs: triaxial tests near the stress in place, and some crushed.</summary>
internal static class CoreCsv
{
    /// <summary>Formation, place of the core in it (0 top, 1 base) and count of plugs, 1.5 m apart.</summary>
    private static readonly (int Formation, double Place, int Plugs)[] Cores = [(1, 0.30, 5), (4, 0.35, 5), (5, 0.22, 4)];

    /// <summary>Writes the file; plugs avoid the depths of spoiled logs only by chance, as in life.</summary>
    public static void Write(string path, Truth truth)
    {
        var draws = new Draws(truth.Plan.Seed, "core");
        using var text = new FixedText(path);
        text.Add("depth_m,orientation,confining_pressure,youngs_static,poisson_static,ucs\n");
        foreach (var (formation, place, plugs) in Cores)
        {
            var (top, bottom) = truth.Plan.Span(formation);
            for (var plug = 0; plug < plugs; plug++)
                Plug(text, truth, draws, Math.Round(top + place * (bottom - top) + 1.5 * plug + draws.Between(-0.5, 0.5), 2), along: plug % 3 == 2);
        }
    }

    private static void Plug(FixedText text, Truth truth, Draws draws, double md, bool along)
    {
        double At(double[] values) => truth.Grid.At(values, md);
        var confining = (At(truth.Shmin) + At(truth.Shmax)) / 2 - At(truth.Pore);
        var stiffness = At(along ? truth.StaticHorizontal : truth.StaticVertical) * (1 + 0.05 * draws.Normal());
        var ratio = At(along ? truth.PoissonHorizontal : truth.PoissonVertical) + 0.012 * draws.Normal();
        var strength = At(truth.Strength) * (1 + 0.06 * draws.Normal());
        text.Add(md, 2).Add($",{(along ? "horizontal" : "vertical")},{Quantity(confining, 0, "MPa")},{Quantity(stiffness, 2, "GPa")},");
        text.Add(ratio, 3).Add($",{(along ? "" : Quantity(strength, 1, "MPa"))}\n");
    }
}
