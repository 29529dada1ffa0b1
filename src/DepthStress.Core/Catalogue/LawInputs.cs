namespace DepthStress.Core.Catalogue;

/// <summary>
/// The columns that feed a law, in SI, in the order of its inputs. A column of length one is a constant that holds for
/// every sample.
/// </summary>
public ref struct LawInputs
{
    /// <summary>The most inputs a law may have.</summary>
    public const int Most = 7;

    private ReadOnlySpan<double> _a, _b, _c, _d, _e, _f, _g;

    /// <summary>Number of columns.</summary>
    public int Count { get; private set; }

    /// <summary>The column of an input.</summary>
    public readonly ReadOnlySpan<double> this[int index] => index switch
    {
        0 => _a,
        1 => _b,
        2 => _c,
        3 => _d,
        4 => _e,
        5 => _f,
        6 => _g,
        _ => throw new ArgumentOutOfRangeException(nameof(index)),
    };

    /// <summary>Adds the column of the next input.</summary>
    public void Add(ReadOnlySpan<double> column)
    {
        switch (Count++)
        {
            case 0: _a = column; break;
            case 1: _b = column; break;
            case 2: _c = column; break;
            case 3: _d = column; break;
            case 4: _e = column; break;
            case 5: _f = column; break;
            case 6: _g = column; break;
            default: throw new InvalidOperationException("A law has at most seven inputs.");
        }
    }
}
