namespace DepthStress.Core.Diagnostics;

/// <summary>Finds the known name closest to a mistyped one (Levenshtein 1966 edit distance).</summary>
public static class NearestName
{
    /// <summary>
    /// Returns the candidate with the fewest single-letter edits, or null when none is within a third of the
    /// typed name's length (at least two edits are always allowed). A name with nothing in common with the typed
    /// one is never near. Case is ignored; ties go to the first candidate.
    /// </summary>
    public static string? Find(string typed, IEnumerable<string> candidates)
    {
        ArgumentNullException.ThrowIfNull(typed);
        ArgumentNullException.ThrowIfNull(candidates);
        if (typed.Length > 100) return null;
        var best = Math.Max(2, typed.Length / 3) + 1;
        string? nearest = null;
        foreach (var candidate in candidates)
        {
            var distance = Distance(typed, candidate, best);
            if (distance >= Math.Min(best, Math.Max(typed.Length, candidate.Length))) continue;
            best = distance;
            nearest = candidate;
        }

        return nearest;
    }

    /// <summary>A phrase to append to a message: <c>; did you mean "x"?</c>, or nothing.</summary>
    public static string Hint(string typed, IEnumerable<string> candidates) =>
        Find(typed, candidates) is { } name ? $"; did you mean \"{name}\"?" : "";

    private static int Distance(string a, string b, int limit)
    {
        if (Math.Abs(a.Length - b.Length) >= limit) return limit;
        var previous = new int[b.Length + 1];
        var current = new int[b.Length + 1];
        for (var j = 0; j <= b.Length; j++) previous[j] = j;
        for (var i = 1; i <= a.Length; i++)
        {
            current[0] = i;
            for (var j = 1; j <= b.Length; j++)
            {
                var same = char.ToUpperInvariant(a[i - 1]) == char.ToUpperInvariant(b[j - 1]);
                current[j] = Math.Min(Math.Min(current[j - 1], previous[j]) + 1, previous[j - 1] + (same ? 0 : 1));
            }

            (previous, current) = (current, previous);
        }

        return previous[b.Length];
    }
}
