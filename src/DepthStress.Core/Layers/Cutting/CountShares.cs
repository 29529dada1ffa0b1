namespace DepthStress.Core.Layers;

/// <summary>Shares a wanted number of segments out among several columns so that the total cost is least.</summary>
public static class CountShares
{
    /// <summary>How many segments each column gets; null when they cannot add up to the count.</summary>
    /// <param name="cuts">The cuts of each column.</param>
    /// <param name="count">The wanted total.</param>
    public static int[]? Of(IReadOnlyList<CountedCut> cuts, int count)
    {
        ArgumentNullException.ThrowIfNull(cuts);
        ArgumentOutOfRangeException.ThrowIfNegative(count);
        var best = new double[cuts.Count + 1, count + 1];
        var share = new int[cuts.Count + 1, count + 1];
        for (var total = 1; total <= count; total++) best[0, total] = double.PositiveInfinity;
        for (var c = 1; c <= cuts.Count; c++)
        {
            for (var total = 0; total <= count; total++)
            {
                best[c, total] = double.PositiveInfinity;
                for (var own = 1; own <= Math.Min(total, cuts[c - 1].Most); own++)
                {
                    var cost = best[c - 1, total - own] + cuts[c - 1].Cost(own);
                    if (cost < best[c, total]) (best[c, total], share[c, total]) = (cost, own);
                }
            }
        }

        if (!double.IsFinite(best[cuts.Count, count])) return null;
        var shares = new int[cuts.Count];
        for (var c = cuts.Count; c > 0; count -= shares[--c]) shares[c - 1] = share[c, count];
        return shares;
    }
}
