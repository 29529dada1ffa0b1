namespace DepthStress.Core.Conditioning;

/// <summary>
/// Finds samples where the hole is larger than the bit by more than a limit, or the density correction is larger than one,
/// or both: the density pad then reads mud as well as rock (common practice).
/// </summary>
public static class Washout
{
    /// <summary>Marks washed-out samples; a missing curve or value says nothing.</summary>
    /// <param name="caliper">Hole diameter, m; empty when it was not logged.</param>
    /// <param name="bitSize">Bit diameter, m; empty when it is not known.</param>
    /// <param name="correction">Density correction, kg/m3; empty when it was not logged.</param>
    /// <param name="settings">The limits; one that is not set is not looked at.</param>
    /// <param name="count">Number of samples.</param>
    public static bool[] Mark(
        ReadOnlySpan<double> caliper, ReadOnlySpan<double> bitSize, ReadOnlySpan<double> correction, WashoutSettings settings, int count)
    {
        ArgumentNullException.ThrowIfNull(settings);
        var marks = new bool[count];
        var both = settings.Rule.Value == WashoutRule.Both;
        if (settings.Rule.Value == WashoutRule.None) return marks;
        for (var i = 0; i < count; i++)
        {
            var large = settings.CaliperExcess.IsSet && caliper.Length == count && bitSize.Length == count
                && caliper[i] - bitSize[i] > settings.CaliperExcess.Value;
            var corrected = settings.DensityCorrection.IsSet && correction.Length == count
                && Math.Abs(correction[i]) > settings.DensityCorrection.Value;
            marks[i] = both ? large && corrected : large || corrected;
        }

        return marks;
    }
}
