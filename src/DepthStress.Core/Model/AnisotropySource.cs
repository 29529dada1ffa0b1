using DepthStress.Core.Logs;
using DepthStress.Core.Rock;

namespace DepthStress.Core.Model;

/// <summary>Why the chosen model of anisotropy does not serve a sample.</summary>
internal enum AnisotropyLack
{
    None,
    ShaleVolume,
    Stoneley,
    StoneleyOblique,
    StoneleyFast,
    ShearLog,
    ShearSquare,
    NoVertical,
    Unstable,
}

/// <summary>Gives the closure of each sample of a run from its settings and logs.</summary>
internal readonly ref struct AnisotropySource(PropertyTable table, AnisotropySettings settings)
{
    /// <summary>Up to this angle between the hole and the normal of the beds, 20 deg in rad, the Stoneley wave stands for C66 (common practice).</summary>
    public const double MostOblique = 20 * Math.PI / 180;

    /// <summary>
    /// From this angle on, 60 deg in rad, the wave along the beds tells C66 a third more inexactly than itself at most. Near 45 deg two
    /// pairs of velocities across the beds give the same ones along the hole, so nothing there can tell them apart.
    /// </summary>
    public const double LeastOblique = 60 * Math.PI / 180;

    private readonly ReadOnlySpan<double> _shale = table.Read(Property.ShaleVolume);
    private readonly ReadOnlySpan<double> _angle = table.Read(Property.BeddingAngle);
    private readonly ReadOnlySpan<double> _stoneley = table.Read(Property.Stoneley);
    private readonly ReadOnlySpan<double> _density = table.Read(Property.Density);
    private readonly ReadOnlySpan<double> _shear =
        table.Read(settings.C66.Value == BedShearSource.FastShear ? Property.FastShear : Property.SlowShear);

    /// <summary>The words for a reason.</summary>
    public static string Words(AnisotropyLack lack) => lack switch
    {
        AnisotropyLack.ShaleVolume => "no shale volume to scale the parameters with",
        AnisotropyLack.Stoneley => "no Stoneley log",
        AnisotropyLack.StoneleyOblique => "the hole is more than 20 deg from the normal of the beds, where the Stoneley wave does not give C66",
        AnisotropyLack.StoneleyFast => "the Stoneley wave is not slower than sound in the mud",
        AnisotropyLack.ShearLog => "no log of the shear wave that c66 names",
        AnisotropyLack.ShearSquare => "the hole is less than 60 deg from the normal of the beds, where a shear log does not give C66",
        AnisotropyLack.NoVertical => "no vertical velocities fit those along the hole",
        _ => "the dynamic stiffness is not stable",
    };

    /// <summary>The closure of a sample; its stiffnesses are in Pa.</summary>
    public AnisotropyLack At(int i, out VtiClosure closure)
    {
        closure = default;
        var scale = 1.0;
        if (settings.ScaleWithShale.Value && double.IsNaN(scale = Value(_shale, i))) return AnisotropyLack.ShaleVolume;
        if (settings.Model.Value == AnisotropyModel.Thomsen)
        {
            closure = VtiClosure.Thomsen(new(scale * settings.Epsilon.Value, scale * settings.Gamma.Value, scale * settings.Delta.Value));
            return AnisotropyLack.None;
        }

        var modified = settings.Model.Value == AnisotropyModel.ModifiedAnnie;
        var (z, x) = modified ? (settings.C11Factor.Value, settings.C12Factor.Value) : (1, 1);
        var angle = Value(_angle, i);
        if (settings.C66.Value == BedShearSource.Gamma)
        {
            closure = VtiClosure.AnnieFromGamma(z, x, scale * settings.Gamma.Value);
            return AnisotropyLack.None;
        }

        if (settings.C66.Value == BedShearSource.Stoneley)
        {
            if (double.IsNaN(Value(_stoneley, i))) return AnisotropyLack.Stoneley;
            if (!(angle <= MostOblique)) return AnisotropyLack.StoneleyOblique;
            var c66 = StoneleyShear.C66(_stoneley[i], settings.MudDensity.Value, settings.MudVelocity.Value);
            closure = VtiClosure.AnnieFromC66(z, x, c66);
            return double.IsNaN(c66) ? AnisotropyLack.StoneleyFast : AnisotropyLack.None;
        }

        var shear = Value(_shear, i);
        if (double.IsNaN(shear)) return AnisotropyLack.ShearLog;
        if (!(angle >= LeastOblique)) return AnisotropyLack.ShearSquare;
        closure = VtiClosure.AnnieFromShear(z, x, _density[i] * shear * shear, angle);
        return AnisotropyLack.None;
    }

    private static double Value(ReadOnlySpan<double> column, int i) => column.IsEmpty ? double.NaN : column[i];
}
