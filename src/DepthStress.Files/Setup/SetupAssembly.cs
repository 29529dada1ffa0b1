using DepthStress.Core.Catalogue;
using DepthStress.Core.Depth;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Layers;
using DepthStress.Core.Lithology;
using DepthStress.Core.Model;

namespace DepthStress.Files.Setup;

/// <summary>Puts the bound sections together into the chain's setup, and reports what is missing or contradicts itself.</summary>
internal static class SetupAssembly
{
    /// <summary>Stands in for reference levels that cannot be used, so that the other problems can be found in the same run.</summary>
    private static readonly DepthFrame AnyFrame = new(DatumKind.Ground, 0, 0, null, null);

    private static readonly string[] RuleKeys =
    [
        "shale_volume_min", "shale_volume_max", "density_min", "density_max", "photoelectric_min", "photoelectric_max", "facies",
    ];

    /// <summary>Assembles the setup and reports what is wrong with it.</summary>
    public static WellSetup Assemble(
        WellFileSections sections, string name, string folder, List<InputFile> inputs, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var file = new SourcePosition(name);
        var well = sections.Well;
        if (!well.Name.IsSet) diagnostics.Error(file, "[well] name is not set");
        if (!sections.Logs.Files.IsSet || sections.Logs.Files.Value.Count == 0)
            diagnostics.Error(file, "[logs] files is not set; expected the names of the log files");
        else
            CheckFiles(sections.Logs.Files, diagnostics);
        if (sections.Logs.Csv.HeaderLine is { IsSet: true } line && line.Value != Math.Floor(line.Value))
            diagnostics.Error(line.Source.Position, "found a fraction, expected header_line = a whole number");
        if (sections.Logs.DepthColumns is [_, var second, ..])
            diagnostics.Error(second.Position, "found a second column for depth, expected one: every file is read with it");

        sections.Logs.Resample.Check(diagnostics);
        var frame = Frame(well, file, wrong, diagnostics);
        var trajectory = SurveyAssembly.Path(sections.Survey, sections.Logs.Csv.Options(), file, folder, inputs, wrong, diagnostics);
        CheckPoints(sections, wrong, diagnostics);
        LayerCheck.Report(sections.Layers, diagnostics);
        var zones = Zones(sections.Zones, diagnostics);
        var lithologies = Lithologies(sections.Lithologies, wrong, diagnostics);
        HoleAssembly.Check(sections, wrong, diagnostics);
        return new WellSetup
        {
            Position = file,
            Name = well.Name.Value ?? "",
            Frame = frame ?? AnyFrame,
            FrameKnown = frame is not null,
            Trajectory = trajectory ?? Trajectory.Vertical,
            PathCurve = sections.Survey.Curve,
            Bedding = SurveyAssembly.Bedding(sections.Survey, diagnostics),
            Zones = zones,
            Lithologies = lithologies,
            Settings = sections.Settings,
            Overburden = sections.Overburden,
            Observations = HoleAssembly.Observations(sections, folder, inputs, wrong, file, diagnostics),
            ObservationSettings = sections.Observations.Settings,
            Mud = HoleAssembly.Whole(sections.Mud),
            Casing = HoleAssembly.Whole(sections.Casing),
            Core = sections.Core.Read(sections.Logs.Csv.Options(), folder, inputs, diagnostics),
            AcceptUnverified = sections.AcceptUnverified.Value,
        };
    }

    private static DepthFrame? Frame(WellSection well, SourcePosition file, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        if (!well.Datum.IsSet) diagnostics.Error(file, "[well] datum is not set; expected \"rotary table\", \"ground\" or \"sea level\"");
        var elevation = well.DatumElevation;
        if (!elevation.IsSet && well.Datum.IsSet)
        {
            elevation = well.Datum.Value switch
            {
                DatumKind.SeaLevel => Setting.Default(0.0),
                DatumKind.Ground => well.GroundElevation,
                _ => elevation,
            };
        }

        if (!elevation.IsSet) diagnostics.Error(file, "[well] datum_elevation is not set; expected the datum's height above mean sea level");
        if (well.GroundElevation.IsSet && well.WaterDepth.IsSet)
        {
            diagnostics.Error(
                well.WaterDepth.Source.Position, "found both ground_elevation and water_depth, expected the first in a well on land or the second in a well at sea");
            return null;
        }

        if (!well.GroundElevation.IsSet && !well.WaterDepth.IsSet && !wrong.Has("[well]", "ground_elevation", "water_depth"))
            diagnostics.Error(file, "[well] has neither ground_elevation (onshore) nor water_depth (offshore); expected one of them");
        if (!well.Datum.IsSet || !elevation.IsSet || well.GroundElevation.IsSet == well.WaterDepth.IsSet) return null;
        if (well.GroundElevation.IsSet && !well.WaterTableDepth.IsSet && !wrong.Has("[well]", "water_table_depth"))
            diagnostics.Note(file, "[well] water_table_depth is not set: the water table is taken at the ground");

        var frame = new DepthFrame(
            well.Datum.Value, elevation.Value, Value(well.GroundElevation), Value(well.WaterDepth), Value(well.WaterTableDepth));
        var problems = DepthFrame.Validate(frame);
        foreach (var problem in problems) diagnostics.Error(Place(well, problem, file), $"[well]: {problem}");
        return problems.Count == 0 ? frame : null;
    }

    /// <summary>The key that a problem of the frame is about.</summary>
    private static SourcePosition Place(WellSection well, string problem, SourcePosition file)
    {
        (string Words, SettingSource Source)[] keys =
        [
            ("found a water table depth", well.WaterTableDepth.Source), ("found a water depth", well.WaterDepth.Source),
            ("found a ground elevation", well.GroundElevation.Source), ("found a datum elevation", well.DatumElevation.Source),
            ("found the ground as datum", well.Datum.Source),
        ];
        var place = keys.FirstOrDefault(k => problem.StartsWith(k.Words, StringComparison.Ordinal)).Source ?? SettingSource.NotSet;
        return place.Kind == SettingKind.WellFile ? place.Position : file;
    }

    private static void CheckFiles(Setting<IReadOnlyList<string>> files, DiagnosticBag diagnostics)
    {
        if (files.Value.Any(string.IsNullOrWhiteSpace)) diagnostics.Error(files.Source.Position, "found an empty name in [logs] files, expected the names of the log files");
        foreach (var twice in files.Value.GroupBy(f => f, StringComparer.Ordinal).Where(g => g.Count() > 1))
            diagnostics.Error(files.Source.Position, $"found the file \"{twice.Key}\" twice in [logs] files, expected each once");
    }

    private static List<Zone> Zones(IReadOnlyList<ZoneSection> sections, DiagnosticBag diagnostics)
    {
        var zones = new List<Zone>();
        foreach (var zone in sections)
        {
            if (!zone.Name.IsSet) diagnostics.Error(zone.Position, "[[zones]] name is not set");
            if (!zone.Top.IsSet) diagnostics.Error(zone.Position, "[[zones]] top is not set");
            if (!zone.DepthKind.IsSet) diagnostics.Error(zone.Position, "[[zones]] depth_kind is not set; expected \"md\", \"tvd\" or \"tvdss\"");
            if (!zone.Name.IsSet || !zone.Top.IsSet || !zone.DepthKind.IsSet) continue;
            zones.Add(new Zone(zone.Name.Value, zone.Top.Value, Value(zone.Base), zone.DepthKind.Value, zone.Overrides, zone.Position) { Target = zone.Target.Value });
        }

        return zones;
    }

    private static List<LithologyChoice> Lithologies(IReadOnlyList<LithologySection> sections, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var choices = new List<LithologyChoice>();
        foreach (var section in sections)
        {
            if (!section.Name.IsSet) diagnostics.Error(section.Position, "[[lithology]] name is not set");
            var rule = new LithologyRule(
                section.Name.Value ?? "",
                Range(section.ShaleVolumeMin, section.ShaleVolumeMax),
                Range(section.DensityMin, section.DensityMax),
                Range(section.PhotoelectricMin, section.PhotoelectricMax),
                section.Facies.IsSet ? section.Facies.Value : [],
                section.Position)
            {
                Salt = section.Salt.Value,
            };
            CheckOrder(section.ShaleVolumeMin, section.ShaleVolumeMax, "shale_volume", diagnostics);
            CheckOrder(section.DensityMin, section.DensityMax, "density", diagnostics);
            CheckOrder(section.PhotoelectricMin, section.PhotoelectricMax, "photoelectric", diagnostics);
            if (rule is { ShaleVolume: null, Density: null, Photoelectric: null, Facies.Count: 0 } && !wrong.Has("[[lithology]]", RuleKeys))
                diagnostics.Error(section.Position, "[[lithology]] has no rule; expected a cut-off such as shale_volume_max, or facies");
            choices.Add(new LithologyChoice(rule, section.Overrides));
        }

        return choices;
    }

    private static void CheckOrder(Setting<double> low, Setting<double> high, string name, DiagnosticBag diagnostics)
    {
        if (low.IsSet && high.IsSet && low.Value > high.Value)
            diagnostics.Error(low.Source.Position, $"found {name}_min above {name}_max, expected a range that something can lie in");
    }

    private static void CheckPoints(WellFileSections sections, WrongKeys wrong, DiagnosticBag diagnostics)
    {
        var pressures = sections.Zones.Select(z => z.Overrides).Concat(sections.Lithologies.Select(l => l.Overrides))
            .Append(sections.Settings).Select(s => s.PorePressure).ToList();
        foreach (var trend in pressures.Select(p => p.Trend).Where(t => t.IsSet))
        {
            if (trend.Value.Any(p => double.IsNaN(p.Depth) || double.IsNaN(p.Slowness)) && !wrong.Has("[trend]", "depth", "slowness"))
                diagnostics.Error(trend.Source.Position, "[pore_pressure] trend: expected each point with depth and slowness");
        }

        foreach (var points in pressures.Select(p => p.Points).Where(p => p.IsSet))
        {
            if (points.Value.Any(p => double.IsNaN(p.Depth) || double.IsNaN(p.Pressure)) && !wrong.Has("[points]", "depth", "pressure"))
                diagnostics.Error(points.Source.Position, "[pore_pressure] points: expected each point with depth and pressure");

            if (points.Value.Count < 2) diagnostics.Error(points.Source.Position, "[pore_pressure] points: found one point, expected two or more");
        }
    }

    private static Interval? Range(Setting<double> low, Setting<double> high) => !low.IsSet && !high.IsSet
        ? null
        : new Interval(low.IsSet ? low.Value : double.NegativeInfinity, high.IsSet ? high.Value : double.PositiveInfinity);

    private static double? Value(Setting<double> setting) => setting.IsSet ? setting.Value : null;
}
