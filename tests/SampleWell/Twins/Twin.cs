using SampleWell.Hidden;

namespace SampleWell.Twins;

/// <summary>
/// An unspoilt well of isotropic rock under hydrostatic pressure, whose well file states every law and number that made it: a run must
/// return its truth. Its rock is that of a sample well of the same seed.
/// </summary>
public static class Twin
{
    internal const double StrainMin = 150e-6;
    internal const double StrainMax = 400e-6;
    private const double Top = 900;
    private const double Bottom = 3390;

    /// <summary>Writes the twin on land: deviated, from 900 to 3390 m, in even steps.</summary>
    /// <param name="folder">Folder of the three files, made if it is missing.</param>
    /// <param name="samples">Count of samples, at least 2.</param>
    /// <param name="seed">Seed of its rock.</param>
    public static TwinTruth Write(string folder, int samples, ulong seed) => Write(folder, samples, seed, TwinSite.Onshore);

    /// <summary>Writes the vertical twin at sea, with 85 m of water below 24 m of air.</summary>
    /// <inheritdoc cref="Write(string, int, ulong)"/>
    public static TwinTruth WriteOffshore(string folder, int samples, ulong seed) => Write(folder, samples, seed, TwinSite.Offshore);

    private static TwinTruth Write(string folder, int samples, ulong seed, TwinSite site)
    {
        Directory.CreateDirectory(folder);
        var plan = WellPlans.Drawn(seed) with { Path = site.Path, Excess = (0, 0), Anisotropy = (0, 0, 0) };
        var rock = new RockColumn(plan);
        var zones = plan.Formations
            .Select(zone => new TwinZone(zone.Name, zone.Top, site.Path.Tvd(zone.Top), LawName(zone.Kind), Math.Round(zone.Biot, 2)))
            .ToList();
        var truth = new TwinTruth(samples, Path.Combine(folder, "twin.toml"), zones);
        using (var csv = new TwinCsv(Path.Combine(folder, "twin.csv")))
        {
            for (var i = 0; i < samples; i++)
            {
                truth.Md[i] = Math.Round(Top + (Bottom - Top) * i / (samples - 1), 9);
                var sample = new TwinSample(rock, truth.Md[i]);
                csv.Add(truth.Md[i], sample);
                Fill(truth, i, sample, plan, site);
            }
        }

        Writing.SurveyCsv.WriteExact(Path.Combine(folder, "twin-survey.csv"), plan);
        TwinWellFile.Write(truth, site);
        return truth;
    }

    private static void Fill(TwinTruth truth, int i, TwinSample sample, WellPlan plan, TwinSite site)
    {
        var zone = plan.FormationAt(truth.Md[i]);
        var tvd = site.Path.Tvd(truth.Md[i]);
        var ratio = sample.Vp * sample.Vp / (sample.Vs * sample.Vs);
        var poisson = (ratio - 2) / (2 * ratio - 2);
        var dynamic = 2 * (1 + poisson) * sample.Density * sample.Vs * sample.Vs * 1e-9;
        var still = Laws.Static(plan.Formations[zone].Kind, dynamic);
        truth.Zone[i] = zone;
        truth.Tvd[i] = tvd;
        truth.Density[i] = sample.Density / 1000;
        truth.YoungsDynamic[i] = dynamic;
        truth.YoungsStatic[i] = still;
        truth.Poisson[i] = poisson;
        // The density runs straight from sample to sample, so the mean of the two ends is exact on a straight hole.
        truth.Sv[i] = i == 0
            ? site.OverburdenAt(tvd)
            : truth.Sv[i - 1] + Physics.ColumnMpa(500 * (truth.Density[i - 1] + truth.Density[i]), tvd - truth.Tvd[i - 1]);
        truth.Pp[i] = Physics.ColumnMpa(TwinSite.FluidDensity, tvd - site.Water);
        var rock = new Elastic(still, still, poisson, poisson);
        truth.Shmin[i] = rock.HorizontalStress(truth.Sv[i], truth.Pp[i], truth.Zones[zone].Biot, StrainMin, StrainMax);
        truth.Shmax[i] = rock.HorizontalStress(truth.Sv[i], truth.Pp[i], truth.Zones[zone].Biot, StrainMax, StrainMin);
    }

    private static string LawName(RockKind kind) => kind switch
    {
        RockKind.Shale => "lacy-1997-shale",
        RockKind.Sand => "lacy-1997-sandstone",
        _ => "lacy-1997-combined",
    };
}
