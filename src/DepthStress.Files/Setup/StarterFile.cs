using System.Globalization;
using System.Text;
using DepthStress.Core.Catalogue;
using DepthStress.Core.Logs;
using DepthStress.Core.Model;
using DepthStress.Core.Prediction;
using DepthStress.Core.Quantities;
using DepthStress.Files.Ingest;
using DepthStress.Files.Reading;
using MathNet.Numerics.Statistics;

namespace DepthStress.Files.Setup;

/// <summary>Writes a starter well file for a log file: what was recognised, and every choice with a comment.</summary>
public static class StarterFile
{
    /// <summary>The starter well file as text; what only the user can know is left as a comment marked <c>&lt;-</c>.</summary>
    public static string For(LogFile log)
    {
        ArgumentNullException.ThrowIfNull(log);
        var text = new StringBuilder();
        text.Append(CultureInfo.InvariantCulture, $"""
            # Starter well file for {log.Name}. Fill in the lines marked <-, look at every other choice, then run: depthstress check
            # Quantities carry their unit. Methods: depthstress methods. All keys: depthstress schema.

            [well]
            name = {Quoted(log.WellName is { Length: > 0 } name ? name : Path.GetFileNameWithoutExtension(log.Name))}
            datum = "rotary table"                # what measured depth counts from: rotary table, ground or sea level
            # datum_elevation = "25 m"            # <- height of the datum above mean sea level
            # water_depth = "100 m"               # <- offshore: depth of the sea
            # ground_elevation = "20 m"           # <- onshore, instead: height of the ground above mean sea level
            # water_table_depth = "5 m"           # onshore: depth of the water table below the ground

            [logs]
            files = [{Quoted(log.Name)}]

            """);
        StarterResample.Append(text, log);
        StarterShear.Append(text, log);
        text.Append("""

            [logs.curves]

            """);
        AppendCurves(text, log);
        text.Append("""

            [survey]

            """);
        text.AppendLine(StarterSurvey.Line(log));
        text.Append("""

            # [[zones]]                           # named intervals; any section below may be overridden inside one, as [zones.moduli]
            # name = "upper sand"
            # top = "1234 m"
            # depth_kind = "md"                   # md, tvd or tvdss


            """);
        text.Append("""
            # [conditioning]                      # nothing is changed unless asked for; every change is marked and listed
            # parked = true                       # take out the constant ends that a parked tool leaves
            # null_smear = true                   # take out edges of gaps that were averaged with the missing-value code
            # spikes = { window = "3 m", threshold = 5, curves = ["compressional", "shear", "density", "gamma_ray"] }
            # washout = { caliper_excess = "1 in", density_correction = "0.025 g/cm3", rule = "both" }   # density out, to be bridged by [overburden] gaps; "either" takes out more
            # fill_gaps = "1 m"                   # bridge gaps up to this length by a straight line
            # shifts = [{ curve = "density", by = "-0.4 m" }]   # positive downwards


            """);
        AppendShale(text, log);
        AppendPrediction(text, log);
        text.Append("""

            [porosity]
            porosity = "density-porosity"
            matrix_density = "2.65 g/cm3"         # quartz 2.65, calcite 2.71, dolomite 2.87
            fluid_density = "1.03 g/cm3"          # of the fluid the density tool sees

            [moduli]
            static_youngs = "lacy-1997-combined"  # or another method, or { law = "linear", factor = 0.7 }
            static_poisson = "equal-to-dynamic"   # moves Shmin more than most choices: a number such as 0.25 is possible too

            [strength]
            ucs = "horsrud-2001-shale"            # made for shale; give sands and limestones their own in their zones
            friction_angle = "lal-1999-shale-friction"
            tensile_strength = { law = "linear", input = "ucs", factor = 0.1 }   # a tenth of UCS (common practice)

            [biot]
            coefficient = 1.0                     # the upper bound; stiff rock has less

            [overburden]
            # above_log = "2.0 g/cm3"             # <- mean density from the ground or mudline to the first logged density

            """);
        AppendGaps(text, log);
        text.Append("""
            below_log = "hold"                    # below the last density its value is held

            [pore_pressure]
            # method = "hydrostatic"              # <- hydrostatic, gradient (with gradient, reference), table (with points, depth_kind), fluid line (with [fluids]) or one of: depthstress methods --for pp
            fluid_density = "1.03 g/cm3"
            # shale_cutoff = 0.5                  # methods of shale: least shale volume of shale
            # sands = "shale"                     # and what other rock takes: shale (from the shale around), table or fluid line
            # honour_tests = true                 # moves each zone to its measured formation pressures

            # [pore_pressure.normal_trend]        # trend methods: where shale is normally compacted; parameters not given here are fitted there
            # top = "1000 m"
            # base = "2000 m"
            # depth_kind = "tvd"
            # matrix_slowness = "65 us/ft"

            [horizontal_stress]
            # strain_along_shmin = "0 microstrain"     # tectonic strains, compression positive; without them SHmax stays empty
            # strain_along_shmax = "200 microstrain"
            friction_coefficient = 0.6

            [layers]
            max_thickness = "100 m"

            [output]
            units = "metric"                      # or "field"

            """);
        return text.ToString().ReplaceLineEndings("\n");
    }

    private static void AppendCurves(StringBuilder text, LogFile log)
    {
        var depth = log.Columns[log.DepthColumn];
        if (Units.Find(depth.Unit ?? "", Dimension.Length) is null)
            text.AppendLine(CultureInfo.InvariantCulture, $"depth = {{ column = {Quoted(depth.Name)}, unit = \"m\" }}   # <- the file states {Stated(depth)}: confirm");
        foreach (var role in CurveRoles.All)
        {
            var candidates = RoleAssignment.Candidates(role, [log]);
            if (candidates.Count == 0) continue;
            var column = candidates[0].Column;
            var known = role.Dimensions is [Dimension.None] || Units.Find(column.Unit ?? "", role.Dimensions) is not null;
            var rivals = candidates.Count == 1 ? "" : $"; also there: {string.Join(", ", candidates.Skip(1).Select(c => c.Column.Name))} ({column.Name} is the more specific name)";
            var value = known
                ? Quoted(column.Name)
                : $"{{ column = {Quoted(column.Name)}, unit = {Quoted(Units.Of(role.Dimensions[0]).First().Symbol)} }}";
            var doubt = known ? "" : "<- confirm the unit; ";
            text.AppendLine(CultureInfo.InvariantCulture, $"{role.Id + " = " + value,-38}# {doubt}{role.Title}, {Stated(column)}, {Present(log, column)}{rivals}");
        }
    }

    private static void AppendGaps(StringBuilder text, LogFile log)
    {
        var density = RoleAssignment.Candidates(CurveRoles.Of(Property.Density)!, [log]);
        var (gaps, longest) = density.Count > 0 ? Gaps(density[0].Column.Values, log.Columns[log.DepthColumn].Values) : (0, 0);
        text.AppendLine(gaps == 0
            ? "gaps = \"none\"                         # gaps in density are an error; \"linear\" bridges them"
            : string.Create(
                CultureInfo.InvariantCulture,
                $"# gaps = \"linear\"                     # <- gaps in density are an error unless bridged: found {gaps}, the longest {longest:F1} {Plain(log.Columns[log.DepthColumn].Unit ?? "")}"));
    }

    /// <summary>How often values are missing between others, and the longest stretch.</summary>
    private static (int Count, double Longest) Gaps(double[] values, double[] depths)
    {
        var (count, longest, last) = (0, 0.0, -1);
        for (var i = 0; i < values.Length; i++)
        {
            if (!double.IsFinite(values[i])) continue;
            if (last >= 0 && i - last > 1)
            {
                count++;
                longest = Math.Max(longest, depths[i] - depths[last]);
            }

            last = i;
        }

        return (count, longest);
    }

    private static void AppendShale(StringBuilder text, LogFile log)
    {
        var role = CurveRoles.Of(Property.GammaRay)!;
        var gamma = RoleAssignment.Candidates(role, [log]) is [var first, ..] ? Array.FindAll(first.Column.Values, double.IsFinite) : [];
        if (gamma.Length < 100)
        {
            text.AppendLine(CultureInfo.InvariantCulture, $"# [shale]                             # needs a gamma ray: volume = \"linear-gamma-ray\", clean = \"25 gAPI\", shale = \"130 gAPI\"");
            return;
        }

        Array.Sort(gamma);
        var (clean, shale) = (Math.Round(SortedArrayStatistics.Percentile(gamma, 5)), Math.Round(SortedArrayStatistics.Percentile(gamma, 95)));
        text.AppendLine(CultureInfo.InvariantCulture, $"""
            [shale]
            volume = "linear-gamma-ray"           # or {string.Join(", ", MethodCatalogue.For(Property.ShaleVolume).Where(l => l.Standing == Standing.Confirmed).Select(l => l.Id).Where(i => i != "linear-gamma-ray"))}
            {$"clean = \"{clean} gAPI\"",-38}# the log's 5th percentile, a starting point
            {$"shale = \"{shale} gAPI\"",-38}# the log's 95th percentile, a starting point
            """);
    }

    /// <summary>A section for shear, as a comment, where the compressional log is there and the shear log is not.</summary>
    private static void AppendPrediction(StringBuilder text, LogFile log)
    {
        var (compressional, shear) = (Values(log, Property.Vp), Values(log, Property.Vs));
        var (there, lacking) = (compressional.Count(double.IsFinite), compressional.Where((v, i) => double.IsFinite(v) && !(shear.Length > 0 && double.IsFinite(shear[i]))).Count());
        if (lacking == 0 || (shear.Length == 0 && StarterShear.HasWave(log))) return;
        var choice = 2 * lacking > there ? "castagna-1985-mudrock" : TrainedRelation.Id;
        text.AppendLine(CultureInfo.InvariantCulture, $"""

            # [prediction]                        # <- shear is missing at {lacking} of {there} samples that have compressional: no stress there unless predicted
            {$"# shear = \"{choice}\"",-38}# trained (on this well's own samples), or a published relation: depthstress methods --for vs
            """);
    }

    private static double[] Values(LogFile log, Property property) =>
        RoleAssignment.Candidates(CurveRoles.Of(property)!, [log]) is [var first, ..] ? first.Column.Values : [];

    private static string Stated(LogColumn column) => column.Unit is { Length: > 0 } unit ? Plain(unit) : "no unit";

    private static string Present(LogFile log, LogColumn column)
    {
        var first = Array.FindIndex(column.Values, double.IsFinite);
        if (first < 0) return "no values";
        var last = Array.FindLastIndex(column.Values, double.IsFinite);
        var depth = log.Columns[log.DepthColumn];
        return string.Create(CultureInfo.InvariantCulture, $"{depth.Values[first]:F1} to {depth.Values[last]:F1} {Plain(depth.Unit ?? "")}").TrimEnd();
    }

    private static string Plain(string text) => new([.. text.Where(c => !char.IsControl(c))]);

    /// <summary>A text as a TOML basic string.</summary>
    private static string Quoted(string text) =>
        "\"" + Plain(text).Replace("\\", "\\\\", StringComparison.Ordinal).Replace("\"", "\\\"", StringComparison.Ordinal) + "\"";
}
