namespace DepthStress.Files.Reading;

/// <summary>What a cell of the data is.</summary>
internal enum CellKind
{
    /// <summary>A number, or an empty cell.</summary>
    Number,

    /// <summary>A word for no value.</summary>
    NullText,

    /// <summary>Anything else.</summary>
    Bad,
}

/// <summary>Reads cells that may be written in any way.</summary>
internal static class Cell
{
    /// <summary>Reads a cell; NaN where it has no value.</summary>
    public static CellKind Read(ReadOnlySpan<byte> cell, bool decimalComma, out double value)
    {
        cell = cell.Trim(" \t"u8);
        if (decimalComma && cell.Contains((byte)'.'))
        {
            value = double.NaN;
            return NullText.Is(cell) ? CellKind.NullText : CellKind.Bad;
        }

        if (NumberText.TryParse(cell, out value)) return CellKind.Number;
        if (decimalComma && NumberMarks.TryParseComma(cell, out value)) return CellKind.Number;
        value = double.NaN;
        return NullText.Is(cell) ? CellKind.NullText : CellKind.Bad;
    }
}
