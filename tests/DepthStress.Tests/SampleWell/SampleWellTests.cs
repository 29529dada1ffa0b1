using System.Text;
using SampleWell;
using SampleWell.Hidden;
using static System.FormattableString;

namespace DepthStress.Tests.SampleWell;

public sealed class SampleWellTests
{
    [Fact]
    public void The_generator_knows_nothing_of_the_program() =>
        Assert.DoesNotContain(
            typeof(SampleLogs).Assembly.GetReferencedAssemblies(),
            assembly => assembly.Name!.Contains("DepthStress", StringComparison.OrdinalIgnoreCase));

    [Fact]
    public void The_shipped_files_are_what_the_generator_makes()
    {
        using var well = WrittenWell.Shipped();
        var made = Directory.GetFiles(well.Folder).Select(Path.GetFileName).Order(StringComparer.Ordinal).ToArray();
        var shipped = Directory.GetFiles(SampleLogs.DefaultFolder).Select(Path.GetFileName).Order(StringComparer.Ordinal).ToArray();
        Assert.Equal(made, shipped);
        foreach (var name in made)
        {
            var expected = File.ReadAllBytes(Path.Combine(well.Folder, name!));
            Assert.True(expected.AsSpan().SequenceEqual(File.ReadAllBytes(Path.Combine(SampleLogs.DefaultFolder, name!))), name);
        }
    }

    [Fact]
    public void The_shipped_folder_stays_below_six_megabytes() =>
        Assert.InRange(Directory.GetFiles(SampleLogs.DefaultFolder).Sum(file => new FileInfo(file).Length), 1, 6_000_000);

    [Fact]
    public void Another_seed_makes_other_files_and_the_same_seed_the_same()
    {
        using var first = WrittenWell.Other(7);
        using var again = WrittenWell.Other(7);
        using var other = WrittenWell.Other(8);
        foreach (var path in Directory.GetFiles(first.Folder))
        {
            var name = Path.GetFileName(path);
            Assert.Equal(File.ReadAllBytes(path), File.ReadAllBytes(Path.Combine(again.Folder, name)));
            Assert.NotEqual(File.ReadAllBytes(path), File.ReadAllBytes(Path.Combine(other.Folder, name)));
        }
    }

    [Theory]
    [MemberData(nameof(Plans))]
    public void The_truth_is_rock_that_can_exist(WellPlan plan)
    {
        var truth = new Truth(plan);
        for (var i = 0; i < truth.Grid.Md.Length; i++)
        {
            Assert.True(truth.Pore[i] < truth.Shmin[i] && truth.Shmin[i] < truth.Sv[i], Invariant($"stresses, point {i}"));
            Assert.True(truth.Shmin[i] < truth.Shmax[i], Invariant($"horizontal stresses, point {i}"));
            Assert.True(truth.StaticVertical[i] < truth.DynamicVertical[i], Invariant($"moduli, point {i}"));
            Assert.InRange(truth.PoissonVertical[i], 0.05, 0.45);
            Assert.InRange(truth.PoissonHorizontal[i], 0.05, 0.45);
            Assert.InRange(1000 * truth.Sv[i] / (truth.Tvd[i] - plan.GroundTvd), 16, 27);
            Assert.InRange(truth.Rock.Vp[i] / truth.Rock.Vs[i], 1.55, 2.2);
            Assert.InRange(truth.Biot[i], truth.Rock.Porosity[i], 1);
            // Positive strain energy of rock alike in every horizontal direction.
            var energy = 1 - truth.PoissonHorizontal[i]
                - 2 * truth.PoissonVertical[i] * truth.PoissonVertical[i] * truth.StaticHorizontal[i] / truth.StaticVertical[i];
            Assert.True(energy > 0, Invariant($"strain energy, point {i}"));
        }
    }

    [Fact]
    public void Neighbouring_log_samples_resemble_each_other()
    {
        // A tool of 0.6 m resolution sampled every 0.15 m: white noise would have a correlation of zero from sample to sample.
        using var well = WrittenWell.Other(3);
        var gamma = well.Log("quillback-4-run2.csv").Between("GR", 2750, 3350).Where(value => value is > 0 and < 170).ToArray();
        var mean = gamma.Average();
        var together = gamma.Zip(gamma.Skip(1), (a, b) => (a - mean) * (b - mean)).Average();
        Assert.InRange(together / gamma.Average(a => (a - mean) * (a - mean)), 0.9, 0.999);
    }

    [Fact]
    public void The_las_file_says_what_its_rows_hold()
    {
        var lines = File.ReadAllLines(Path.Combine(SampleLogs.DefaultFolder, "quillback-4.las"), Encoding.ASCII);
        Assert.Equal("~V~W~C~P~A", string.Concat(lines.Where(line => line.StartsWith('~')).Select(line => line[..2])));
        var start = Array.FindIndex(lines, line => line.StartsWith("~A", StringComparison.Ordinal)) + 1;
        var curves = lines.Count(line => line.StartsWith(' ') && line.Contains(" : ", StringComparison.Ordinal) && char.IsDigit(line[(line.IndexOf(" : ", StringComparison.Ordinal) + 3)]));
        var rows = lines[start..].Select(line => line.Split(' ', StringSplitOptions.RemoveEmptyEntries)).ToArray();
        Assert.All(rows, row => Assert.Equal(curves, row.Length));
        Assert.Equal("900.0744", rows[0][0]);
        Assert.Contains(" STRT.M           900.0744                   : START DEPTH", lines);
        Assert.Contains($" STOP.M           {rows[^1][0]}                  : STOP DEPTH", lines);
        Assert.All(lines, line => Assert.InRange(line.Length, 1, 256));
    }

    public static TheoryData<WellPlan> Plans() =>
        [WellPlans.Quillback4, .. Enumerable.Range(1, 8).Select(seed => WellPlans.Drawn((ulong)seed))];
}
