namespace DepthStress.Files.Reading;

/// <summary>A cell of a header or unit row.</summary>
/// <param name="Text">Its text without control characters.</param>
/// <param name="IsNumber">True where it is a number.</param>
/// <param name="Column">Where it starts in its line, in characters, from 1.</param>
internal readonly record struct HeaderCell(string Text, bool IsNumber, int Column)
{
    /// <summary>Makes a cell of its bytes.</summary>
    public static HeaderCell Of(ReadOnlySpan<byte> bytes, int column, ref bool foreign) => new(
        TextCleaner.Clean(TextCleaner.Decode(bytes, ref foreign)),
        !bytes.Trim(" \t"u8).IsEmpty && Cell.Read(bytes, decimalComma: false, out _) == CellKind.Number,
        column);
}
