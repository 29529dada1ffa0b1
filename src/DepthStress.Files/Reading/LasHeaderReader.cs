using System.Globalization;
using System.Text;
using DepthStress.Core.Quantities;

namespace DepthStress.Files.Reading;

/// <summary>Reads the sections of a LAS file up to its data.</summary>
internal sealed class LasHeaderReader(LogSource source, LineReader lines)
{
    private readonly LasHeader _header = new();
    private readonly HashSet<char> _sections = [];
    private readonly HashSet<string> _seen = [];
    private char _section;
    private bool _bad, _foreign, _strayReported;
    private int _warnings, _passed;
    private LasHeaderLine? _well;

    /// <summary>Reads up to and with the title of the data section; null when the file cannot be used.</summary>
    public LasHeader? Read()
    {
        while (!_bad && _section != 'A' && lines.TryRead(out var bytes))
        {
            var text = TextCleaner.Decode(bytes, ref _foreign);
            var trimmed = text.AsSpan().Trim();
            if (trimmed.IsEmpty || trimmed[0] == '#') continue;
            if (trimmed[0] == '~') OpenSection(TextCleaner.Clean(text));
            else ReadLine(text);
        }

        if (lines.TooLong)
        {
            source.LineTooLong(lines.Line + 1);
            return null;
        }

        if (_bad) return null;
        Close();
        return _bad ? null : _header;
    }

    private void OpenSection(string title)
    {
        _section = LasSections.Kind(title, _header.Version);
        if (_section == ' ')
        {
            if (++_passed <= ProblemTally.Limit) source.Diagnostics.Note(source.At(lines.Line, 1), $"section \"{Cut(title)}\" is not read");
        }
        else if (!_sections.Add(_section))
        {
            Error(1, $"found a second ~{_section} section, expected one");
        }
    }

    private void ReadLine(string text)
    {
        switch (_section)
        {
            case 'V' or 'W' or 'C':
                if (!LasHeaderLine.TryParse(text, out var parts))
                {
                    Warn($"found \"{Cut(text)}\" without a dot, expected MNEM.UNIT DATA : DESCRIPTION; the line is left out");
                    return;
                }

                if (!parts.HasColon) Warn($"found \"{Cut(text)}\" without a colon, expected MNEM.UNIT DATA : DESCRIPTION");
                if (_section == 'V') ReadVersion(parts);
                else if (_section == 'W') ReadWell(parts);
                else AddCurve(parts, text);
                break;
            case '\0' when !_strayReported:
                _strayReported = true;
                source.Diagnostics.Error(source.At(lines.Line, 1), $"found \"{Cut(text)}\" before the first section, expected a line that starts with ~");
                break;
            default:
                break;
        }
    }

    private void ReadVersion(LasHeaderLine parts)
    {
        var name = parts.Mnemonic.ToUpperInvariant();
        switch (name)
        {
            case "VERS":
                ReadVersionNumber(parts.Data);
                break;
            case "WRAP" when parts.Data.Equals("YES", StringComparison.OrdinalIgnoreCase):
                _header.Wrapped = true;
                break;
            case "WRAP" when !parts.Data.Equals("NO", StringComparison.OrdinalIgnoreCase):
                Error(0, $"found WRAP \"{Cut(parts.Data)}\", expected YES or NO");
                break;
            case "DLM":
                ReadDelimiter(parts.Data);
                break;
            default:
                break;
        }

        _seen.Add(name);
    }

    private void ReadVersionNumber(string text)
    {
        if (!QuantityText.TryNumber(text, out var version))
        {
            Warn($"found the version \"{Cut(text)}\", read as LAS 2.0");
        }
        else if (version is < 1 or >= 4)
        {
            Error(0, $"found LAS {Cut(text)}, expected a version from 1.2 to 3.0");
        }
        else
        {
            _header.Version = version;
            if (version == 2) return;
            source.Diagnostics.Note(source.At(lines.Line), $"found LAS {Cut(text)}, {(version >= 3 ? "its log data are read" : "read")} by the rules of LAS 2.0");
        }
    }

    private void ReadDelimiter(string text)
    {
        switch (text.ToUpperInvariant())
        {
            case "":
                break;
            case "SPACE":
                _header.Delimiter = CsvOptions.Blanks;
                break;
            case "TAB":
                _header.Delimiter = '\t';
                break;
            case "COMMA":
                _header.Delimiter = ',';
                break;
            default:
                Error(0, $"found DLM {Cut(text)}, expected SPACE, TAB or COMMA");
                break;
        }
    }

    private void ReadWell(LasHeaderLine parts)
    {
        var name = parts.Mnemonic.ToUpperInvariant();
        _seen.Add(name);
        if (name == "WELL") _well = parts;
        if (name is not ("STRT" or "STOP" or "STEP" or "NULL") || parts.Data.Length == 0) return;
        if (!QuantityText.TryNumber(parts.Data, out var value) && !IsDecimalComma(parts.Data, out value))
        {
            Warn($"found {name} \"{Cut(parts.Data)}\", expected a number");
            return;
        }

        var place = (value, source.At(lines.Line));
        if (name == "NULL") _header.Null = value;
        else if (name == "STRT") _header.Start = place;
        else if (name == "STOP") _header.Stop = place;
        else _header.Step = place;
    }

    private void AddCurve(LasHeaderLine parts, string text)
    {
        if (_header.Curves.Count == LogSource.MaxCurves)
        {
            Error(0, "found more than 100000 curves, expected fewer");
            return;
        }

        var column = text.Length - text.AsSpan().TrimStart().Length + 1;
        var unit = parts.Unit.Length > 0 ? parts.Unit : null;
        _header.Curves.Add(new ColumnHeader(parts.Mnemonic, unit, parts.Description, source.At(lines.Line, column)));
    }

    private void Close()
    {
        _bad |= _strayReported;
        if (_warnings > ProblemTally.Limit)
        {
            source.Diagnostics.Warning(source.At(), string.Create(CultureInfo.InvariantCulture, $"and {_warnings - ProblemTally.Limit} more odd lines in the header"));
        }

        // Before version 2 the value stood behind the colon.
        if (_well is { } well && (_header.Version < 2 ? well.Description : well.Data) is { Length: > 0 } name) _header.Well = name;
        if (_bad && _sections.Count == 0) return;
        if (!_seen.Contains("VERS")) source.Diagnostics.Warning(source.At(), "found no VERS line, expected LAS 2.0; read as LAS 2.0");
        if (!_seen.Contains("WRAP")) source.Diagnostics.Warning(source.At(), "found no WRAP line, expected WRAP NO; read as not wrapped");
        if (_header.Null is null && !_seen.Contains("NULL"))
        {
            source.Diagnostics.Note(source.At(), "found no NULL line; -999.25, -999 and -9999 are read as missing");
        }

        if (_header.Curves.Count == 0) Error(-1, "found no curves, expected a ~C section that lists them");
        if (!_sections.Contains('A')) Error(-1, "found no ~A section, expected the data in it");
        if (_foreign) source.ReportForeignBytes(source.At());
        ColumnHeader.MakeUnique(_header.Curves, source.Diagnostics);
    }

    private void Error(int column, string text)
    {
        _bad = true;
        source.Diagnostics.Error(column < 0 ? source.At() : source.At(lines.Line, column), text);
    }

    private void Warn(string text)
    {
        if (++_warnings <= ProblemTally.Limit) source.Diagnostics.Warning(source.At(lines.Line), text);
    }

    // A decimal comma that cannot be a thousands separator.
    private static bool IsDecimalComma(string text, out double value)
    {
        var bytes = Encoding.UTF8.GetBytes(text);
        return NumberMarks.TryParseComma(bytes, out value) && !NumberMarks.IsGrouped(bytes, ',');
    }

    private static string Cut(string text) => TextCleaner.Quote(Encoding.UTF8.GetBytes(text));
}
