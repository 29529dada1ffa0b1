using SampleWell.Logging;

namespace DepthStress.Tests.SampleWell;

/// <summary>The list of damage and the files must agree, both ways.</summary>
public sealed class SampleDamageTests
{
    private static readonly DamageKind[] Erased = [DamageKind.Gap, DamageKind.Null, DamageKind.MissingShear];

    [Theory]
    [InlineData(0)]
    [InlineData(5)]
    [InlineData(11)]
    public void Every_kind_of_damage_is_there_and_shows_in_the_files(int seed)
    {
        using var well = seed == 0 ? WrittenWell.Shipped() : WrittenWell.Other((ulong)seed);
        Assert.Equal(Enum.GetValues<DamageKind>(), well.Result.Damage.Select(record => record.Kind).Distinct().Order());
        Assert.All(well.Result.Damage, record => Assert.True(Shows(well, record), record.ToString()));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(5)]
    public void Every_missing_or_smeared_value_is_on_the_list(int seed)
    {
        using var well = seed == 0 ? WrittenWell.Shipped() : WrittenWell.Other((ulong)seed);
        foreach (var file in new[] { "quillback-4-run1.csv", "quillback-4-run2.csv" })
        {
            var depth = well.Log(file).Column("DEPT");
            foreach (var curve in Curve.All.Where(curve => curve.Name != "DRHO"))
            {
                var values = well.Log(file).Column(curve.Name);
                var listed = well.Result.Damage.Where(record => record.File == file && record.Curve == curve.Name).ToArray();
                for (var i = 0; i < values.Length; i++)
                {
                    if (values[i] < 0)
                    {
                        var missing = values[i] == Curve.Missing;
                        Assert.Contains(listed, record => depth[i] > record.Start - 0.01 && depth[i] < record.End + 0.01
                            && (missing ? Erased.Contains(record.Kind) : record.Kind == DamageKind.NullSmear));
                    }
                }
            }
        }
    }

    [Fact]
    public void No_density_gap_is_longer_than_five_metres_and_the_last_density_is_sound()
    {
        using var well = WrittenWell.Shipped();
        var density = well.Result.Damage.Where(record => record.Curve == "RHOB").ToArray();
        Assert.All(density, record => Assert.InRange(record.End - record.Start, 0, 5));
        Assert.DoesNotContain(density, record => record.File == "quillback-4-run2.csv" && record.End > 3390);
    }

    [Fact]
    public void The_missing_shear_is_about_ninety_metres_long()
    {
        using var well = WrittenWell.Shipped();
        var record = Assert.Single(well.Result.Damage, record => record.Kind == DamageKind.MissingShear);
        Assert.Equal(90, record.End - record.Start, 1.0); // the design says "about 90 m"
    }

    private static bool Shows(WrittenWell well, DamageRecord record)
    {
        var values = well.Values(record);
        var beside = Beside(well, record);
        return record.Kind switch
        {
            DamageKind.Gap => values.Length > 3 && values.All(value => value == Curve.Missing),
            DamageKind.Null => values.Length <= 2 && values.All(value => value == Curve.Missing),
            DamageKind.MissingShear => record.Curve == "DTS" && values.All(value => value == Curve.Missing),
            DamageKind.NullSmear => values.Length == 1 && values[0] is < -100 and > Curve.Missing,
            DamageKind.Parked => values.Length >= 10 && values.Distinct().Count() == 1,
            DamageKind.RatHole => values.All(value => value - 8.5 > 3),
            DamageKind.Spike => values.Length <= 3 && values.All(value => Math.Abs(value - beside) > 0.1 * beside),
            DamageKind.Washout => record.Curve switch
            {
                "CALI" => values.Max() > beside + 1.5,
                "RHOB" => values.Min() < beside - 0.08,
                "DRHO" => values.Max() > beside + 0.05,
                _ => values.Length >= 10,
            },
            _ => false,
        };
    }

    /// <summary>The middle one of the sound values within a metre of the stretch.</summary>
    private static double Beside(WrittenWell well, DamageRecord record)
    {
        var log = well.Log(record.File);
        double[] near = [
            .. log.Between(record.Curve, record.Start - 1, record.Start - 0.1), .. log.Between(record.Curve, record.End + 0.1, record.End + 1)];
        var sound = near.Where(value => value > -1).Order().ToArray();
        return sound.Length > 0 ? sound[sound.Length / 2] : double.NaN;
    }
}
