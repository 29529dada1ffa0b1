using System.Globalization;
using System.Runtime.CompilerServices;

namespace DepthStress.Files.Reading;

/// <summary>Collects rows into columns; checks cells, counts and depth on the way.</summary>
internal sealed class TableBuilder
{
    private readonly LogSource _source;
    private readonly List<ColumnHeader> _headers;
    private readonly int _depth;
    private readonly double? _null;
    private readonly double[] _columnNull;
    private readonly ColumnCodes?[] _columnCodes;
    private readonly double[][] _values;
    private readonly int[] _missing;
    private int _rows, _capacity;

    /// <summary>Prepares a table; nothing is allocated for the values before the first row.</summary>
    public TableBuilder(LogSource source, List<ColumnHeader> headers, int depthColumn, double? nullValue, bool decimalComma)
    {
        (_source, _headers, _depth, _null) = (source, headers, depthColumn, nullValue);
        DecimalComma = decimalComma;
        NullTexts = new NullTextTally(headers);
        Tally = new ProblemTally(source.Diagnostics);
        Depth = new DepthTrack(source, Tally);
        Row = new double[headers.Count];
        _values = new double[headers.Count][];
        _missing = new int[headers.Count];
        _columnNull = new double[headers.Count];
        _columnCodes = new ColumnCodes?[headers.Count];
        var codes = new Dictionary<string, ColumnCodes>(StringComparer.OrdinalIgnoreCase);
        foreach (var (name, code) in source.Options.MissingByColumn) codes[name] = new ColumnCodes(code);
        for (var c = 0; c < headers.Count; c++)
        {
            _columnNull[c] = nullValue ?? double.NaN;
            _columnCodes[c] = codes.GetValueOrDefault(headers[c].Name);
        }

        // A positive NULL may well be a depth; a negative one is none.
        if (nullValue >= 0) _columnNull[depthColumn] = double.NaN;
    }

    /// <summary>The numbers of the row being read, NaN where the cell is empty; <see cref="AddRow"/> takes them.</summary>
    public double[] Row { get; }

    /// <summary>True where the decimal mark is a comma.</summary>
    public bool DecimalComma { get; }

    /// <summary>How many lines a row takes, as far as is known: so that arrays are allocated once.</summary>
    public int LinesPerRow { get; set; } = 1;

    /// <summary>Words for no value.</summary>
    public NullTextTally NullTexts { get; }

    /// <summary>Problems of rows.</summary>
    public ProblemTally Tally { get; }

    /// <summary>The depth so far.</summary>
    public DepthTrack Depth { get; }

    /// <summary>Reads a cell that is not a plain number into <see cref="Row"/>; a text that the well file names as missing is a cell without a value.</summary>
    public CellKind ReadCell(ReadOnlySpan<byte> cell, int column)
    {
        if (_columnCodes[column]?.Has(cell) != true) return Cell.Read(cell, DecimalComma, out Row[column]);
        Row[column] = double.NaN;
        return CellKind.Number;
    }

    /// <summary>Takes <see cref="Row"/> as the next row.</summary>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public void AddRow(int line)
    {
        if (_rows == _capacity) Grow(line);
        for (var c = 0; c < Row.Length; c++)
        {
            var value = Row[c];
            if (IsMissing(value, c))
            {
                value = double.NaN;
                _missing[c]++;
            }

            _values[c][_rows] = value;
        }

        Depth.Add(_values[_depth][_rows], line);
        _rows++;
    }

    /// <summary>Leaves out a row with unreadable cells (already reported); its depth still counts.</summary>
    public void SkipRow(int line, bool depthIsBad)
    {
        if (depthIsBad) Depth.Skip();
        else Depth.Add(IsMissing(Row[_depth], _depth) ? double.NaN : Row[_depth], line);
    }

    /// <summary>Reports a cell that is no number and that the tally admits.</summary>
    public void BadCell(int line, int column, int index, ReadOnlySpan<byte> text)
    {
        var problem = NumberMarks.Problem(text, DecimalComma ? ',' : '.') ?? $"\"{TextCleaner.Quote(text)}\", expected a number";
        _source.Diagnostics.Error(_source.At(line, column), $"column \"{_headers[index].Name}\": found {problem}");
    }

    /// <summary>Reports a row with too few or too many values, and leaves it out; the hint goes to the end of the message.</summary>
    public void WrongCount(int line, int found, string hint = "")
    {
        Depth.Skip();
        if (!Tally.Admit(RowProblem.Count, _source.At(line))) return;
        _source.Diagnostics.Error(_source.At(line), string.Create(
            CultureInfo.InvariantCulture, $"found {found} {(found == 1 ? "value" : "values")}, expected {Row.Length} (one for each column){hint}"));
    }

    /// <summary>Closes the table; null when it cannot be used.</summary>
    public LogFile? Finish(LogFormat format, string? wellName)
    {
        Tally.Close();
        if (!Depth.Close(_source.Options.RepeatedDepth) || Tally.Any) return null;
        if (_rows == 0)
        {
            _source.Diagnostics.Error(_source.At(), "found no data rows, expected at least one");
            return null;
        }

        NullTexts.Report(_source.Diagnostics);
        PutInOrder();
        var columns = new LogColumn[_headers.Count];
        for (var c = 0; c < columns.Length; c++)
        {
            var header = _headers[c];
            if (_values[c].Length != _rows) Array.Resize(ref _values[c], _rows);
            columns[c] = new LogColumn(header.Name, header.Unit, header.Description, _values[c], header.Position, _missing[c]);
            if (_missing[c] == _rows) _source.Diagnostics.Warning(header.Position, $"column \"{header.Name}\" has no values, all are missing");
        }

        return new LogFile(
            _source.Name, format, wellName, _null, columns, _depth, _rows, _source.File.BytesRead, _source.File.Sha256());
    }

    private void PutInOrder()
    {
        if (Depth.Repeats)
        {
            _rows = RowOrder.Join(_values, _depth, _rows, _source.Options.RepeatedDepth == RepeatedDepth.Mean);
            for (var c = 0; c < _values.Length; c++) _missing[c] = CountMissing(_values[c].AsSpan(0, _rows));
        }

        Depth.ReportDescent();
        if (Depth.Descends) RowOrder.Reverse(_values, _rows);
    }

    private static int CountMissing(ReadOnlySpan<double> values)
    {
        var count = 0;
        foreach (var value in values) count += double.IsNaN(value) ? 1 : 0;
        return count;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private bool IsMissing(double value, int column) =>
        (!(value > -999) && (double.IsNaN(value) || value is -999.25 or -999 or -9999))
        || value == _columnNull[column] || _columnCodes[column]?.Has(value) == true;

    private void Grow(int line)
    {
        // As many rows as lines are left, but no more than the bytes can hold (a blank or a comma and one character for each cell).
        var lines = ((_source.Scan.Lines - line) / LinesPerRow) + 1;
        var most = (_source.Scan.Bytes / (2L * _headers.Count)) + 1;
        _capacity = _rows == 0 ? (int)Math.Clamp(lines, 1, Math.Min(most, Array.MaxLength)) : (int)Math.Min(2L * _capacity, Array.MaxLength);
        for (var c = 0; c < _values.Length; c++) Array.Resize(ref _values[c], _capacity);
    }
}
