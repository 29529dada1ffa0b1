using DepthStress.Core.Borehole;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Files.Setup;

/// <summary>Puts the sections about the hole together: mud, casing, observations.</summary>
internal static class HoleAssembly
{
    /// <summary>Reports what [mud] and [casing] lack; what is incomplete is left out of the setup by <see cref="Whole(MudSettings)"/>.</summary>
    public static void Check(WellFileSections sections, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var (mud, casing) = (sections.Mud, sections.Casing);
        if (mud.Density.IsSet)
        {
            var position = mud.Density.Source.Position;
            if (mud.Density.Value.Any(m => double.IsNaN(m.Top) || double.IsNaN(m.Density)) && !wrong.Has("[density]", "top", "density"))
                diagnostics.Error(position, "[mud] density: expected each mud with top and density");
            if (!mud.DepthKind.IsSet) diagnostics.Error(position, "[mud] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"");
        }

        if (!casing.Shoes.IsSet) return;
        if (casing.Shoes.Value.Any(double.IsNaN) && !wrong.Has("[shoes]", "depth"))
            diagnostics.Error(casing.Shoes.Source.Position, "[casing] shoes: expected each shoe with depth");
        if (!casing.DepthKind.IsSet) diagnostics.Error(casing.Shoes.Source.Position, "[casing] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"");
    }

    /// <summary>The muds, those without a top or density left out: they have been reported.</summary>
    public static MudSettings Whole(MudSettings mud) => mud.Density.IsSet
        ? mud with { Density = new(mud.Density.Value.Where(m => !double.IsNaN(m.Top) && !double.IsNaN(m.Density)).ToList(), mud.Density.Source) }
        : mud;

    /// <summary>The shoes, those without a depth left out: they have been reported.</summary>
    public static CasingSettings Whole(CasingSettings casing) => casing.Shoes.IsSet
        ? casing with { Shoes = new(casing.Shoes.Value.Where(double.IsFinite).ToList(), casing.Shoes.Source) }
        : casing;

    /// <summary>Every row of the observation files.</summary>
    public static IReadOnlyList<Observation> Observations(
        WellFileSections sections, string folder, List<InputFile> inputs, WrongKeys wrong, SourcePosition file, DiagnosticBag diagnostics)
    {
        var files = sections.Observations.Files;
        if (!files.IsSet) return [];
        var rows = new List<Observation>();
        foreach (var name in files.Value.Distinct(StringComparer.Ordinal))
            rows.AddRange(ObservationFile.Read(Path.GetFullPath(name, folder), name, sections.Logs.Csv.Options(), inputs, diagnostics));
        foreach (var twice in files.Value.GroupBy(f => f, StringComparer.Ordinal).Where(g => g.Count() > 1))
            diagnostics.Error(files.Source.Position, $"found the file \"{twice.Key}\" twice in [observations] files, expected each once");
        foreach (var twice in rows.GroupBy(o => (o.Top, o.Base, o.DepthKind, o.Kind)).Where(g => g.Count() > 1))
        {
            foreach (var again in twice.Skip(1))
                diagnostics.Warning(again.Position, $"{again.Kind.Word()}: found a second one over the same interval, the first at {twice.First().Position}; both count");
        }

        if (rows.Find(o => o.Kind.BreaksWall()) is { } broken && !sections.Observations.Settings.BreakdownFluid.IsSet && !wrong.Has("[observations]", "breakdown_fluid"))
        {
            diagnostics.Error(
                file,
                $"[observations] breakdown_fluid is not set; expected \"non-penetrating\" or \"penetrating\", whether the fluid of the {broken.Kind.Word()} test at {broken.Position} entered the rock");
        }

        return rows;
    }
}
