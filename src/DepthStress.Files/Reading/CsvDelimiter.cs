namespace DepthStress.Files.Reading;

/// <summary>Tells the delimiter of a CSV file from its first lines.</summary>
internal static class CsvDelimiter
{
    /// <summary>What is wrong with the delimiter, or null where it is a comma or there is none.</summary>
    public static string? Problem(ReadOnlySpan<byte> head)
    {
        var header = FirstLine(ref head);
        var commas = CountOutsideQuotes(header, (byte)',');
        foreach (var (delimiter, name) in (ReadOnlySpan<(byte, string)>)[((byte)';', "';'"), ((byte)'\t', "a tab"), ((byte)'|', "'|'")])
        {
            if (CountOutsideQuotes(header, delimiter) <= commas) continue;
            for (var lines = 0; lines < 3; lines++)
            {
                if (HasDecimalComma(FirstLine(ref head), delimiter))
                {
                    return $"found {name} as delimiter and decimal commas, expected ',' and decimal points";
                }
            }

            return $"found {name} as delimiter, expected ','";
        }

        return null;
    }

    private static bool HasDecimalComma(ReadOnlySpan<byte> line, byte delimiter)
    {
        foreach (var range in line.Split(delimiter))
        {
            if (NumberText.HasDecimalComma(line[range])) return true;
        }

        return false;
    }

    private static ReadOnlySpan<byte> FirstLine(ref ReadOnlySpan<byte> text)
    {
        text = text.TrimStart("\r\n"u8);
        var end = text.IndexOfAny((byte)'\n', (byte)'\r');
        var line = end < 0 ? text : text[..end];
        text = text[line.Length..];
        return line;
    }

    private static int CountOutsideQuotes(ReadOnlySpan<byte> line, byte wanted)
    {
        var (count, quoted) = (0, false);
        foreach (var b in line)
        {
            if (b == (byte)'"') quoted = !quoted;
            else if (b == wanted && !quoted) count++;
        }

        return count;
    }
}
