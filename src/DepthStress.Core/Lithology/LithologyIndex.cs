using DepthStress.Core.Logs;

namespace DepthStress.Core.Lithology;

/// <summary>Finds the first lithology rule that holds at each sample.</summary>
public static class LithologyIndex
{
    /// <summary>No rule holds.</summary>
    public const short None = -1;

    /// <summary>Fills the index of the first rule that holds, or <see cref="None"/>.</summary>
    public static void Fill(IReadOnlyList<LithologyRule> rules, PropertyTable table, Span<short> index)
    {
        ArgumentNullException.ThrowIfNull(rules);
        ArgumentNullException.ThrowIfNull(table);
        index.Fill(None);
        var shale = table.Read(Property.ShaleVolume);
        var density = table.Read(Property.Density);
        var photoelectric = table.Read(Property.Photoelectric);
        var facies = table.Read(Property.Facies);
        for (var i = 0; i < index.Length && rules.Count > 0; i++)
        {
            for (var k = 0; k < rules.Count; k++)
            {
                if (!rules[k].Holds(At(shale, i), At(density, i), At(photoelectric, i), At(facies, i))) continue;
                index[i] = (short)k;
                break;
            }
        }
    }

    private static double At(ReadOnlySpan<double> column, int index) => column.IsEmpty ? double.NaN : column[index];
}
