using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Files.Ingest;
using DepthStress.Files.Setup;
using SampleWell;

namespace DepthStress.Tests.WellFiles;

/// <summary>
/// Spoilt well files. Each ends in a well file, which is recorded and run as far as its logs allow, or in errors that name a file and a
/// line in it; never in an exception, and in bounded room. The long run (DEPTHSTRESS_LONG_FUZZ=1) takes other seeds and fifty times as many.
/// </summary>
public sealed class WellFileFuzzTests
{
    private static readonly bool IsLong = Environment.GetEnvironmentVariable("DEPTHSTRESS_LONG_FUZZ") == "1";
    private static readonly int Cases = IsLong ? 20_000 : 400;

    /// <summary>The small sound file and one of every kind of section beside it.</summary>
    private static readonly string Rich = WellText.Sound
        .Exchange("files = [\"logs.csv\"]\n", "files = [\"logs.csv\"]\nrepeated_depth = \"mean\"\nresample = { step = \"0.5 m\", method = \"mean\", max_gap = \"2 m\" }\n"
            + "[logs.csv]\ndelimiter = \",\"\n[logs.curves]\nshear = { column = \"DTS\", unit = \"us/ft\", missing = [0, \"off\"] }\ngamma_ray = [{ column = \"GR\", base = \"1001 m\" }, \"GR\"]\n")
        + """
        points = [{ depth = "0 m", pressure = "0 MPa" }, { depth = "3000 m", pressure = "30 MPa" }]
        [conditioning]
        spikes = { window = "3 m", threshold = 5, curves = ["density", "shear"] }
        washout = { caliper_excess = "1 in", rule = "either" }
        shifts = [{ curve = "density", by = "-0.4 m" }]
        fill_gaps = "1 m"
        [shale]
        volume = "linear-gamma-ray"
        clean = "28 gAPI"
        shale = "128 gAPI"
        [prediction]
        shear = "trained"
        density = "gardner-1974"
        [strength]
        ucs = { law = "linear", input = "youngs_static", factor = 0.002, offset = "24 MPa" }
        [[zones]]
        name = "a"
        top = "1000 m"
        depth_kind = "md"
        target = true
        [zones.biot]
        coefficient = 0.7
        [[lithology]]
        name = "coal"
        density_max = "1.8 g/cm3"
        salt = false
        [lithology.moduli]
        static_poisson = 0.3
        [horizontal_stress]
        strain_along_shmin = "10 microstrain"
        strain_along_shmax = "200 microstrain"
        [layers]
        max_thickness = "100 m"
        [output]
        units = "field"
        scales = [{ curve = "density", left = "2 g/cm3", right = "3 g/cm3" }]

        """;

    [Theory]
    [InlineData("small")]
    [InlineData("rich")]
    [InlineData("sample")]
    public void Spoilt_well_files_end_in_a_well_file_or_in_errors_with_a_position(string kind)
    {
        using var folder = new TestFolder();
        var text = kind switch
        {
            "small" => WellText.Sound,
            "rich" => Rich,
            _ => File.ReadAllText(Path.Combine(SampleLogs.DefaultFolder, "quillback-4.toml")),
        };

        // The sample's small files are there, its logs are not: so long a log would be read 20,000 times.
        foreach (var name in kind == "sample" ? ["survey", "observations", "core"] : (string[])[])
            File.Copy(Path.Combine(SampleLogs.DefaultFolder, $"quillback-4-{name}.csv"), folder.Of($"quillback-4-{name}.csv"));

        if (kind != "sample") folder.Write("logs.csv", WellText.Logs);
        var others = Directory.EnumerateFiles(folder.Path).Select(f => (Path.GetFileName(f), File.ReadAllText(f)));
        Assert.DoesNotContain(WellText.Messages(text, [.. others]), m => m.Contains(": error: ", StringComparison.Ordinal));
        var random = new Random((IsLong ? 4_711 : 20_260) + kind.Length);
        var (sound, refused) = (0, 0);
        for (var n = 0; n < Cases; n++)
        {
            var bytes = FuzzToml.Spoil(text, random, n % 2 == 0 ? 1 : 4);
            if (Read(folder, bytes)) sound++;
            else refused++;
        }

        // Both ends are reached, so that neither is idle.
        Assert.InRange(sound, Cases / 20, Cases);
        Assert.InRange(refused, Cases / 20, Cases);
    }

    /// <summary>Reads one well file and what it names; false where it was refused.</summary>
    private static bool Read(TestFolder folder, byte[] bytes)
    {
        var path = folder.Of("well.toml");
        File.WriteAllBytes(path, bytes);
        var bag = new DiagnosticBag();
        var before = GC.GetAllocatedBytesForCurrentThread();
        WellFile? well;
        try
        {
            well = WellFileReader.Read(path, bag);
        }
        catch (Exception e)
        {
            throw new InvalidOperationException($"could not read: {Convert.ToBase64String(bytes)}", e);
        }

        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, (64L << 20) + (50L * bytes.Length));
        var refused = bag.HasErrors;
        if (well is null) Assert.True(refused, "no well file goes with an error");
        if (!refused)
        {
            Bindings.All(new RecordingSection(), well!.Sections);
            try
            {
                if (LogIngest.Read(well, bag) is { } logs) Chain.Run(well.Setup, logs.Logs, bag);
            }
            catch (Exception e)
            {
                throw new InvalidOperationException($"could not run: {Convert.ToBase64String(bytes)}", e);
            }
        }

        AssertPlaced(bag, bytes);
        return !refused;
    }

    private static void AssertPlaced(DiagnosticBag bag, byte[] bytes)
    {
        var lines = 1 + bytes.Count(b => b is (byte)'\n' or (byte)'\r');
        foreach (var item in bag.Items)
        {
            Assert.NotEmpty(item.Position.File);
            if (item.Position.File == "well.toml") Assert.InRange(item.Position.Line, 0, lines);
            Assert.DoesNotContain(item.ToString(), char.IsControl);
        }
    }
}
