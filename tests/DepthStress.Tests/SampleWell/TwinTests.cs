using SampleWell.Twins;
using static System.FormattableString;

namespace DepthStress.Tests.SampleWell;

public sealed class TwinTests : IDisposable
{
    private readonly string folder = Directory.CreateTempSubdirectory("twin-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void The_written_logs_carry_the_truth()
    {
        var truth = Twin.Write(folder, 4001, 2);
        var log = new LogTextFile(Path.Combine(folder, "twin.csv"));
        var (compressional, shear, density) = (log.Column("DTC"), log.Column("DTS"), log.Column("RHOB"));
        Assert.Equal(4001, log.Count);
        for (var i = 0; i < log.Count; i++)
        {
            var vp = 304.8 / compressional[i];
            var vs = 304.8 / shear[i];
            // E = rho Vs^2 (3 Vp^2 - 4 Vs^2) / (Vp^2 - Vs^2), g/cm3 and km/s give GPa: another form than the generator's.
            var expected = density[i] * vs * vs * (3 * vp * vp - 4 * vs * vs) / (vp * vp - vs * vs);
            Assert.Equal(expected, truth.YoungsDynamic[i], 1e-7 * expected); // ten digits are printed, E loses up to two
        }
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void The_stresses_are_in_order_and_the_pressure_hydrostatic(bool offshore)
    {
        var truth = offshore ? Twin.WriteOffshore(folder, 2001, 2) : Twin.Write(folder, 2001, 2);
        var water = offshore ? 24.0 : 25.5;
        for (var i = 0; i < truth.Md.Length; i++)
        {
            Assert.Equal(0.010100849500000 * (truth.Tvd[i] - water), truth.Pp[i], 1e-9); // 1030 x 9.80665 Pa/m; rounding alone
            Assert.True(truth.Pp[i] < truth.Shmin[i] && truth.Shmin[i] < truth.Shmax[i] && truth.Shmin[i] < truth.Sv[i], Invariant($"sample {i}"));
        }
    }

    [Fact]
    public void The_offshore_overburden_starts_with_the_sea()
    {
        var truth = Twin.WriteOffshore(folder, 101, 2);
        // 85 m of 1025 kg/m3 and 791 m of 1950 kg/m3 above the first sample at 900 m.
        Assert.Equal((1025 * 85 + 1950 * 791) * 9.80665e-6, truth.Sv[0], 1e-9); // rounding alone
        Assert.Equal(truth.Md, truth.Tvd);
    }

    [Fact]
    public void A_large_well_has_the_count_of_samples_that_was_asked()
    {
        var wellFile = Large.Write(folder, Large.Ordinary);
        Assert.True(File.Exists(wellFile));
        Assert.Equal(Large.Ordinary, new LogTextFile(Path.Combine(folder, "twin.csv")).Count);
    }
}
