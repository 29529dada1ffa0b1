using SampleWell.Writing;
using static SampleWell.Writing.FixedText;

namespace SampleWell.Twins;

/// <summary>Writes the well file of a twin; it states the laws and numbers that made the twin.</summary>
internal static class TwinWellFile
{
    /// <summary>Writes the file.</summary>
    public static void Write(TwinTruth truth, TwinSite site)
    {
        using var text = new FixedText(truth.WellFile);
        text.Add($"""
            # An invented well without noise or damage: a run must return the numbers that made it.
            [well]
            name = "Quillback twin"
            datum = "rotary table"
            {site.WellSection}

            [logs]
            files = ["twin.csv"]
            [logs.curves]
            gamma_ray = "GR"
            compressional = "DTC"
            shear = "DTS"
            density = "RHOB"

            [survey]
            file = "twin-survey.csv"
            north = "grid"


            """);
        foreach (var zone in truth.Zones)
        {
            text.Add($"""
                [[zones]]
                name = "{zone.Name}"
                top = "{Quantity(zone.TopMd, 1, "m")}"
                depth_kind = "md"
                [zones.moduli]
                static_youngs = "{zone.StaticLaw}"
                [zones.biot]
                coefficient = {Quantity(zone.Biot, 2, "")}


                """);
        }

        text.Add($"""
            [shale]
            volume = "linear-gamma-ray"
            clean = "28 gAPI"
            shale = "128 gAPI"
            [porosity]
            porosity = "density-porosity"
            matrix_density = "2.66 g/cm3"
            fluid_density = "1.03 g/cm3"
            [moduli]
            static_youngs = "lacy-1997-combined"
            static_poisson = "equal-to-dynamic"
            [strength]
            ucs = "horsrud-2001-shale"
            friction_angle = "lal-1999-shale-friction"
            tensile_strength = {"{"} law = "linear", input = "ucs", factor = 0.1, offset = "0 MPa" {"}"}
            [biot]
            coefficient = 0.85
            [overburden]
            {site.OverburdenSection}
            [pore_pressure]
            method = "hydrostatic"
            fluid_density = "{Quantity(TwinSite.FluidDensity / 1000, 2, "g/cm3")}"
            [horizontal_stress]
            strain_along_shmin = "{Quantity(Twin.StrainMin * 1e6, 0, "microstrain")}"
            strain_along_shmax = "{Quantity(Twin.StrainMax * 1e6, 0, "microstrain")}"
            shmax_azimuth = "60 deg"
            friction_coefficient = 0.6
            [layers]
            max_thickness = "150 m"

            """);
    }
}
