namespace SampleWell;

/// <summary>
/// A named stream of random numbers: the k-th number depends on the seed, the name and k alone, by integer arithmetic, so it never
/// changes with the runtime. The mixing steps are those of SplitMix64 (Steele, Lea and Flood 2014, doi:10.1145/2660193.2660195).
/// </summary>
public sealed class Draws
{
    private readonly ulong origin;
    private ulong count;

    /// <summary>Opens the stream called <paramref name="name"/> of a well.</summary>
    public Draws(ulong seed, string name)
    {
        var hash = 14695981039346656037UL;
        foreach (var letter in name)
            hash = unchecked((hash ^ letter) * 1099511628211UL);
        origin = unchecked(Mix(seed) + hash);
    }

    /// <summary>Uniform in [0, 1).</summary>
    public double Uniform() => (Mix(unchecked(origin + ++count * 0x9E3779B97F4A7C15UL)) >> 11) * (1.0 / (1UL << 53));

    /// <summary>Uniform in [low, high).</summary>
    public double Between(double low, double high) => low + (high - low) * Uniform();

    /// <summary>A whole number in [low, high].</summary>
    public int Whole(int low, int high) => low + (int)((high - low + 1) * Uniform());

    /// <summary>Bell-shaped with mean 0, standard deviation 1 and bounds -6 and 6: the sum of twelve uniform numbers, less 6.</summary>
    public double Normal()
    {
        var sum = -6.0;
        for (var i = 0; i < 12; i++)
            sum += Uniform();
        return sum;
    }

    private static ulong Mix(ulong z)
    {
        unchecked
        {
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EBUL;
            return z ^ (z >> 31);
        }
    }
}
