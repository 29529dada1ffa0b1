using System.Globalization;
using SampleWell.Logging;
using Xunit.Abstractions;

namespace DepthStress.Tests.Conditioning;

/// <summary>
/// How well conditioning finds spoilt samples whose sizes are drawn by <see cref="GradedDamage"/>, from what cannot be seen to what cannot
/// be missed. Per kind and curve, a size is stated from which the damage can be told from the rock; recall is asserted from that
/// size on, loosely from half of it on, and printed below it. Precision counts every marked sample: one that is not spoilt, by damage of any size, is wrong.
/// </summary>
public class ConditioningScoreTests(ITestOutputHelper output)
{
    private const double Wanted = 0.95; // demanded of precision and of recall, each

    private const double WantedFromHalf = 0.5; // of recall between half that size and that size, where 20 samples or more are so spoilt

    private const int LeastParked = 4; // fewer constant samples are never taken for a parked tool: none can be found below it

    /// <summary>Unit of the sizes: see <see cref="GradedDamage"/>; for washouts, how much density reads low, g/cm3.</summary>
    private static readonly (DamageKind Kind, string Step, string Curve, double Tellable)[] Kinds =
    [
        (DamageKind.Parked, "parked tool", "GR", 7),
        (DamageKind.Parked, "parked tool", "DTC", 4),
        (DamageKind.Parked, "parked tool", "DTS", 4),
        (DamageKind.Parked, "parked tool", "RHOB", 7),
        (DamageKind.Parked, "parked tool", "NPHI", 10),
        (DamageKind.NullSmear, "smeared at the edge of a gap", "GR", 0.02),
        (DamageKind.NullSmear, "smeared at the edge of a gap", "DTC", 0.01),
        (DamageKind.NullSmear, "smeared at the edge of a gap", "DTS", 0.02),
        (DamageKind.NullSmear, "smeared at the edge of a gap", "RHOB", 0.0005),
        (DamageKind.Spike, "spike", "GR", 45),
        (DamageKind.Spike, "spike", "DTC", 15),
        (DamageKind.Spike, "spike", "DTS", 35),
        (DamageKind.Spike, "spike", "RHOB", 0.08),
        (DamageKind.Washout, "washout", "RHOB", 0.06),
    ];

    [Theory]
    [InlineData(1, 20)] // the settings and sizes were chosen on these
    [InlineData(101, 105)] // looked at once: some of the sizes above were raised after that
    [InlineData(201, 205)] // not looked at while settings and sizes were chosen
    public void Spoilt_samples_are_found_and_sound_ones_left_alone(int first, int last)
    {
        var score = new Score();
        for (var seed = first; seed <= last; seed++)
        {
            foreach (var run in GradedDamage.Make((ulong)seed)) score.Add(run);
        }

        var failures = new List<string>();
        foreach (var (kind, step, curve, tellable) in Kinds)
        {
            var (right, wrong) = score.Marked(step, curve);
            var (found, total) = score.Found(kind, curve, tellable, double.PositiveInfinity);
            var (foundSmaller, totalSmaller) = score.Found(kind, curve, 0, tellable);
            var (foundHalf, totalHalf) = score.Found(kind, curve, tellable / 2, tellable);
            var precision = (double)right / (right + wrong);
            var recall = (double)found / total;
            var line = string.Create(
                CultureInfo.InvariantCulture,
                $"{kind,-10} {curve,-5} precision {precision:F3} ({right} of {right + wrong})  recall from size {tellable} on {recall:F3} ({found} of {total}), below it {foundSmaller} of {totalSmaller}, from half of it on {foundHalf} of {totalHalf}");
            output.WriteLine(line);
            Assert.True(total >= 20, line); // enough samples for the share to mean something
            if (!(precision >= Wanted && recall >= Wanted)) failures.Add(line);
            if (totalHalf >= 20 && !(kind == DamageKind.Parked && tellable < 2 * LeastParked) && foundHalf < WantedFromHalf * totalHalf) failures.Add(line);
        }

        Assert.Empty(failures);
    }
}
