using SampleWell.Hidden;
using SampleWell.Logging;
using static SampleWell.Writing.FixedText;

namespace SampleWell.Writing;

/// <summary>Writes the well file of a sample well as its user would: with first guesses, not with the hidden truth.</summary>
internal static class WellFile
{
    /// <summary>Writes the file.</summary>
    public static void Write(string path, Truth truth, LogRun upper, LogRun lower)
    {
        var plan = truth.Plan;
        using var text = new FixedText(path);
        text.Add($"""
            # Quillback 4, Sorrel basin. The well, the basin and every number are invented.
            # Depths are below the rotary table unless a line says otherwise.

            [well]
            name = "Quillback 4"
            datum = "rotary table"
            datum_elevation = "{Quantity(plan.DatumElevation, 1, "m")}"          # above sea level
            ground_elevation = "{Quantity(plan.GroundElevation, 1, "m")}"
            water_table_depth = "{Quantity(plan.WaterTable, 0, "m")}"          # below ground

            [logs]
            files = ["{upper.File}", "{lower.File}"]

            # Two runs, joined in the dapple shale where both read well. The 12 1/4 in hole ends at 2105 m: from the splice down to there the
            # caliper of the second run sees the old, larger hole.
            [logs.curves]

            """);
        foreach (var curve in Curve.All)
            text.Add(Spliced(curve, upper.File, lower.File, Quantity(plan.Splice, 0, "m")));
        text.Add("""

            [survey]
            file = "quillback-4-survey.csv"
            north = "grid"                       # azimuths in the survey are from grid north

            # Formation tops, picked on the logs.

            """);
        foreach (var formation in plan.Formations)
            text.Add(WellFileZones.Zone(formation));
        text.Add(Choices);
        text.Add(PressureTable(truth));
        text.Add(Hole(plan));
        text.Add(Guesses);
    }

    /// <summary>The casing, and the mud that was made heavier on the way down.</summary>
    private static string Hole(WellPlan plan)
    {
        string Md(double depth) => Quantity(Math.Round(depth), 0, "m");
        return $$"""
            [mud]
            depth_kind = "md"
            density = [
                { top = "0 m", density = "1.06 g/cm3" },
                { top = "{{Md(plan.Formations[3].Top)}}", density = "1.25 g/cm3" },     # gas in the dapple shale
                { top = "{{Md(plan.Formations[5].Top)}}", density = "1.40 g/cm3" },
            ]

            [casing]
            depth_kind = "md"
            shoes = [{ depth = "{{Md(plan.FirstMd)}}" }, { depth = "2105 m" }]


            """;
    }

    private static string Spliced(Curve curve, string upper, string lower, string splice) => $$"""
        {{curve.Role}} = [{ column = "{{curve.Name}}", file = "{{upper}}", base = "{{splice}}" }, { column = "{{curve.Name}}", file = "{{lower}}" }]

        """;

    private const string Choices = """
        # What holds wherever a zone above does not say otherwise.

        [conditioning]
        parked = true                        # the recorder ran on while the tools stood still
        null_smear = true                    # the curves were resampled across gaps
        spikes = { window = "3 m", threshold = 5, curves = ["compressional", "shear", "density", "gamma_ray"] }
        washout = { caliper_excess = "1 in", density_correction = "0.025 g/cm3", rule = "both" }   # shale is a little enlarged everywhere
        fill_gaps = "1 m"

        [shale]
        volume = "linear-gamma-ray"          # straight between the cleanest sand and limestone and the purest shale seen
        clean = "28 gAPI"
        shale = "128 gAPI"

        [prediction]
        shear = "trained"                    # where the shear arrival was not found: from the other logs, as learnt where it was

        [porosity]
        porosity = "density-porosity"
        matrix_density = "2.66 g/cm3"
        fluid_density = "1.03 g/cm3"

        # Shale is stiffer along its bedding. Thomsen's parameters of pure shale are those of plugs from a neighbouring well.
        [anisotropy]
        model = "thomsen"
        epsilon = 0.07
        gamma = 0.10
        delta = 0.02
        scale_with_shale = true
        velocities = "vertical"              # the sonic of the deviated hole came corrected to the direction across the beds
        outside = "isotropic"                # where shale volume is missing

        [moduli]
        static_youngs = "lacy-1997-combined"
        static_poisson = "equal-to-dynamic"  # taken equal to the dynamic one: the plugs do not contradict it

        [strength]
        ucs = "horsrud-2001-shale"
        friction_angle = "lal-1999-shale-friction"
        tensile_strength = { law = "linear", input = "ucs", factor = 0.1, offset = "0 MPa" }   # common practice

        [biot]
        coefficient = 0.85

        [overburden]
        above_log = "2.10 g/cm3"             # mean from the ground to the first density; drill cuttings and a nearby seismic line
        gaps = "linear"                      # short density gaps, at most about 4 m, are bridged by a straight line

        # Hydrostatic (1.03 g/cm3) from the water table to the dapple shale, then above it: measured in the sands and limestones,
        # drawn through the shales from gas shows and the mud weight.

        """;

    private static string PressureTable(Truth truth)
    {
        var plan = truth.Plan;
        double Depth(int formation, double below) => Math.Round(plan.Path.Tvd(plan.Formations[formation].Top) + below);
        var shale = Depth(3, 0);
        var half = Math.Round((shale + Depth(4, 0)) / 2);
        double[] depths = [
            shale, Math.Round((shale + half) / 2), half, Math.Round((half + Depth(4, 0)) / 2), Depth(4, 0), Depth(5, 0), Depth(5, 75), Depth(5, 150), 3200];
        var points = depths.Select(tvd => (tvd, Physics.ColumnMpa(plan.FluidDensity, tvd - plan.WaterTvd) + ExcessPressure.At(plan, tvd)));
        var rows = string.Concat(points.Select(point =>
            $"    {{ depth = \"{Quantity(point.tvd, 0, "m")}\", pressure = \"{Quantity(point.Item2, 1, "MPa")}\" }},\n"));
        return $$"""
            [pore_pressure]
            method = "table"
            depth_kind = "tvd"                   # below the rotary table, so the water table (18 m below ground) is at {{Quantity(plan.WaterTvd, 1, "m")}}
            points = [
                { depth = "{{Quantity(plan.WaterTvd, 1, "m")}}", pressure = "0 MPa" },
            {{rows}}]


            """;
    }

    private const string Guesses = """
        [horizontal_stress]
        strain_along_shmin = "50 microstrain"   # first guesses from the neighbouring basin, compression positive; not calibrated
        strain_along_shmax = "250 microstrain"
        shmax_azimuth = "60 deg"             # from breakouts in the vertical part of the hole
        friction_coefficient = 0.6

        [layers]
        max_thickness = "150 m"

        [observations]
        files = ["quillback-4-observations.csv"]
        breakdown_fluid = "non-penetrating"  # small volumes of mud between packers, through its filter cake
        strength_error = 0.05                # the crushed plugs scatter by no more around the relations of [strength]

        [core]
        files = ["quillback-4-core.csv"]
        depth_shift_limit = "3 m"            # the summary says whether another depth would fit better

        """;
}
