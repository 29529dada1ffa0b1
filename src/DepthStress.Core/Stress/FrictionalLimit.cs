namespace DepthStress.Core.Stress;

/// <summary>
/// Limits that existing faults put on the stresses: <c>(S1 - Pp)/(S3 - Pp) &lt;= q</c>, with
/// <c>q = (sqrt(mu^2 + 1) + mu)^2</c> (Jaeger and Cook; Zoback 2007, Reservoir Geomechanics). Effective stress has
/// coefficient one here, never Biot's.
/// </summary>
public static class FrictionalLimit
{
    /// <summary>The greatest ratio of effective principal stresses for a coefficient of friction, which is not negative.</summary>
    public static double Ratio(double friction)
    {
        var root = Math.Sqrt((friction * friction) + 1) + friction;
        return root * root;
    }

    /// <summary>The least Shmin that normal faulting allows, Pa: <c>Pp + (Sv - Pp)/q</c>.</summary>
    public static double LowestShmin(double vertical, double pore, double friction) => pore + ((vertical - pore) / Ratio(friction));

    /// <summary>The greatest SHmax that reverse and strike-slip faulting allow, Pa: <c>Pp + q (min(Shmin, Sv) - Pp)</c>.</summary>
    public static double HighestShmax(double vertical, double shmin, double pore, double friction) =>
        pore + (Ratio(friction) * (Math.Min(shmin, vertical) - pore));
}
