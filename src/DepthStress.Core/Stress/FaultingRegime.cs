namespace DepthStress.Core.Stress;

/// <summary>Anderson's classes of faulting (1951), by the order of the three stresses.</summary>
public enum FaultingRegime : byte
{
    /// <summary>At least one stress is missing, or all three are equal, as in salt.</summary>
    Unknown,

    /// <summary>Sv is the greatest.</summary>
    Normal,

    /// <summary>Sv lies between the horizontal stresses.</summary>
    StrikeSlip,

    /// <summary>Sv is the least.</summary>
    Reverse,
}

/// <summary>Classifies stress states.</summary>
public static class FaultingRegimes
{
    /// <summary>The class of a stress state; unknown when a stress is missing or all three are equal.</summary>
    public static FaultingRegime Of(double vertical, double shmin, double shmax)
    {
        if (double.IsNaN(vertical) || double.IsNaN(shmin) || double.IsNaN(shmax)) return FaultingRegime.Unknown;
        if (shmin == vertical && shmax == vertical) return FaultingRegime.Unknown;
        if (shmax <= vertical) return FaultingRegime.Normal;
        return shmin < vertical ? FaultingRegime.StrikeSlip : FaultingRegime.Reverse;
    }

    /// <summary>
    /// Simpson's shape number (1997, J. Geophys. Res. 102, 17909-17919): <c>(n + 1/2) + (-1)^n (phi - 1/2)</c>, with n the
    /// number of horizontal stresses above Sv and <c>phi = (S2 - S3)/(S1 - S3)</c>. From 0 to 1 normal, to 2 strike-slip,
    /// to 3 reverse. NaN when a stress is missing or all three are equal.
    /// </summary>
    public static double ShapeNumber(double vertical, double shmin, double shmax)
    {
        var n = (shmin > vertical ? 1 : 0) + (shmax > vertical ? 1 : 0);
        var (s1, s2, s3) = n switch
        {
            0 => (vertical, shmax, shmin),
            1 => (shmax, vertical, shmin),
            _ => (shmax, shmin, vertical),
        };
        var phi = (s2 - s3) / (s1 - s3);
        return n + 0.5 + ((n % 2 == 0 ? 1 : -1) * (phi - 0.5));
    }

    /// <summary>The name results use; empty when unknown.</summary>
    public static string Name(this FaultingRegime regime) => regime switch
    {
        FaultingRegime.Normal => "normal",
        FaultingRegime.StrikeSlip => "strike-slip",
        FaultingRegime.Reverse => "reverse",
        _ => "",
    };
}
