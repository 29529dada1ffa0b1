using System.Text;

namespace DepthStress.Files.Reading;

/// <summary>The missing-value codes of one column as its cells are read; a text that is a number counts as one.</summary>
internal sealed class ColumnCodes
{
    private readonly double[] _numbers;
    private readonly byte[][] _texts;

    /// <summary>Prepares codes.</summary>
    public ColumnCodes(MissingCodes codes)
    {
        var texts = codes.Texts.Select(t => Encoding.UTF8.GetBytes(t.Trim())).ToLookup(t => NumberText.TryParse(t, out _));
        _texts = [.. texts[false]];
        _numbers = [.. codes.Numbers, .. texts[true].Select(t => NumberText.TryParse(t, out var value) ? value : double.NaN)];
    }

    /// <summary>True for a number that means missing.</summary>
    public bool Has(double value)
    {
        foreach (var number in _numbers)
        {
            if (number == value) return true;
        }

        return false;
    }

    /// <summary>True for a cell whose text means missing.</summary>
    public bool Has(ReadOnlySpan<byte> cell)
    {
        cell = cell.Trim(" \t"u8);
        foreach (var text in _texts)
        {
            if (cell.SequenceEqual(text) || Ascii.EqualsIgnoreCase(cell, text)) return true;
        }

        return false;
    }
}
