using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>Reads settings from a table and reports everything that is wrong with them.</summary>
internal sealed class ReadingSection : ISection
{
    private readonly TomlTable _table;
    private readonly string _path;
    private readonly SettingKind _kind;
    private readonly string? _owner;
    private readonly DiagnosticBag _diagnostics;
    private readonly WrongKeys _wrong;
    private readonly List<string> _known;

    /// <summary>Makes the section of a table.</summary>
    public ReadingSection(TomlTable table, string path, DiagnosticBag diagnostics, WrongKeys wrong)
        : this(table, path, diagnostics, wrong, SettingKind.WellFile, null, [])
    {
    }

    private ReadingSection(
        TomlTable table, string path, DiagnosticBag diagnostics, WrongKeys wrong, SettingKind kind, string? owner, List<string> known)
    {
        _table = table;
        _path = path;
        _diagnostics = diagnostics;
        _wrong = wrong;
        _kind = kind;
        _owner = owner;
        _known = known;
    }

    /// <inheritdoc/>
    public SourcePosition Position => _table.Position;

    /// <inheritdoc/>
    public ISection OwnedBy(SettingKind kind, string owner) => new ReadingSection(_table, _path, _diagnostics, _wrong, kind, owner, _known);

    /// <inheritdoc/>
    public SettingSource SourceOf(string key) => _table.Items.TryGetValue(key, out var item) ? Source(item.Value) : SettingSource.NotSet;

    /// <summary>Reports keys that no binding asked for.</summary>
    public void ReportUnknown()
    {
        foreach (var (key, item) in _table.Items)
        {
            if (_known.Contains(key)) continue;
            var isSection = _path.Length == 0 && item.Value is TomlTable or TomlArray { Items: [TomlTable, ..] };
            var found = isSection ? $"section [{Words.Short(key)}]" : $"key \"{Words.Short(key)}\"{(_path.Length == 0 ? "" : $" in {_path}")}";
            _diagnostics.Error(item.Key, $"found the unknown {found}, expected one of {string.Join(", ", _known)}{NearestName.Hint(key, _known)}");
        }
    }

    /// <inheritdoc/>
    public Setting<string> Text(string key, Setting<string> current, string doc) =>
        Read(key, current, node => node is TomlText text ? text.Value : Wrong<string>(node, $"{key} = a text in quotes"));

    /// <inheritdoc/>
    public Setting<IReadOnlyList<string>> Texts(string key, Setting<IReadOnlyList<string>> current, string doc) =>
        Read(key, current, node => node switch
        {
            TomlText text => [text.Value],
            TomlArray array when array.Items.TrueForAll(i => i is TomlText) => array.Items.ConvertAll(i => ((TomlText)i).Value),
            _ => Wrong<IReadOnlyList<string>>(node, $"{key} = a list of texts in quotes"),
        });

    /// <inheritdoc/>
    public Setting<bool> Flag(string key, Setting<bool> current, string doc) =>
        Read<bool>(key, current, node => node is TomlFlag flag ? flag.Value : WrongValue<bool>(node, $"{key} = true or false"));

    /// <inheritdoc/>
    public Setting<double> Number(string key, Setting<double> current, Interval allowed, string doc) =>
        Read<double>(key, current, node => node is TomlNumber number
            ? allowed.Contains(number.Value) ? number.Value : WrongValue<double>(node, $"{key} {Words.Within(allowed)}")
            : WrongValue<double>(node, $"{key} = a number"));

    /// <inheritdoc/>
    public Setting<IReadOnlyList<double>> Numbers(string key, Setting<IReadOnlyList<double>> current, string doc) =>
        Read(key, current, node => node switch
        {
            TomlNumber number => [number.Value],
            TomlArray array when array.Items.TrueForAll(i => i is TomlNumber) => array.Items.ConvertAll(i => ((TomlNumber)i).Value),
            _ => Wrong<IReadOnlyList<double>>(node, $"{key} = a number or a list of numbers"),
        });

    /// <inheritdoc/>
    public Setting<MissingCodes> Codes(string key, Setting<MissingCodes> current, string doc) => Read(key, current, node =>
    {
        List<TomlNode> items = node is TomlArray array ? array.Items : [node];
        return items.TrueForAll(i => i is TomlNumber || (i is TomlText text && !string.IsNullOrWhiteSpace(text.Value)))
            ? new MissingCodes([.. items.OfType<TomlNumber>().Select(n => n.Value)], [.. items.OfType<TomlText>().Select(t => t.Value)])
            : Wrong<MissingCodes>(node, $"{key} = a number, a text, or a list of numbers and texts");
    });

    /// <inheritdoc/>
    public Setting<double> Quantity(string key, Setting<double> current, Sign sign, Dimension dimension, string doc) =>
        Read(key, current, node => Quantity(node, key, sign, dimension));

    /// <inheritdoc/>
    public Setting<IReadOnlyList<double>> Quantities(string key, Setting<IReadOnlyList<double>> current, Dimension dimension, string doc) =>
        Read<IReadOnlyList<double>>(key, current, node =>
        {
            List<TomlNode> items = node is TomlArray array ? array.Items : [node];
            var values = items.ConvertAll(item => Quantity(item, key, Sign.Any, dimension));
            return values.TrueForAll(v => v.HasValue) ? values.ConvertAll(v => v!.Value) : null;
        });

    /// <inheritdoc/>
    public Setting<double> FluidDensity(string key, Setting<double> current, string doc) => Read<double>(key, current, node =>
    {
        if (node is not TomlText text) return NoUnit(node, key, [Dimension.Density, Dimension.PressureGradient]);
        if (!QuantityText.TryParseFluidDensity(text.Value, out var si, out _, out var problem)) return Problem(node, key, problem!);
        return si > 0 ? si : WrongValue<double>(node, $"{key} above zero");
    });

    /// <inheritdoc/>
    public Setting<T> Choice<T>(string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, string doc)
    {
        if (Find(key) is not { } node) return current;
        var list = words.Select(w => w.Word).ToList();
        var index = node is TomlText word ? list.IndexOf(word.Value) : -1;
        if (index >= 0) return new Setting<T>(words[index].Value, Source(node));
        _wrong.Add(_path, key, _owner);
        var (found, hint) = node is TomlText text ? ($"\"{Words.Short(text.Value)}\"", NearestName.Hint(text.Value, list)) : (node.Kind, "");
        _diagnostics.Error(node.Position, $"found {found}, expected {key} = one of {Words.Quoted(list)}{hint}");
        return current;
    }

    /// <inheritdoc/>
    public Setting<T> ChoiceOrQuantity<T>(
        string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, Dimension dimension, Func<double, T> make, Func<T, double?> quantity, string doc)
    {
        if (Find(key) is not TomlText text || text.Value.Length == 0 || !Words.StartsNumber(text.Value)) return Choice(key, current, words, doc);
        if (Quantity(text, key, Sign.Positive, dimension) is { } si) return new Setting<T>(make(si), Source(text));
        _wrong.Add(_path, key, _owner);
        return current;
    }

    /// <inheritdoc/>
    public Setting<Law> Law(string key, Setting<Law> current, Property predicts, string doc) =>
        Read(key, current, node => LawReader.Read(node, key, predicts, _diagnostics));

    /// <inheritdoc/>
    public Setting<ShallowDensity> ShallowDensity(string key, Setting<ShallowDensity> current, string doc) =>
        Read(key, current, node => ShallowDensityReader.Read(node, key, _diagnostics));

    /// <inheritdoc/>
    public T Table<T>(string key, T current, Func<ISection, T, T> bind, string doc)
    {
        if (Find(key) is not { } node) return current;
        if (node is not TomlTable table)
        {
            _diagnostics.Error(node.Position, $"found {node.Kind}, expected a table [{Join(key)}]");
            return current;
        }

        return Bind(table, $"[{Join(key)}]", current, bind);
    }

    /// <inheritdoc/>
    public IReadOnlyList<T> Tables<T>(string key, IReadOnlyList<T> current, Func<ISection, T, T> bind, T empty, string doc, string? shorthand = null)
    {
        if (Find(key) is not { } node) return current;
        var list = new List<T>();
        foreach (var item in node is TomlArray array ? array.Items : [node])
        {
            var table = item as TomlTable;
            if (item is TomlText text && shorthand is not null)
            {
                table = new TomlTable(text.Position);
                table.Add(shorthand, text.Position, text);
            }

            if (table is not null)
            {
                list.Add(Bind(table, shorthand is null ? $"[[{Join(key)}]]" : key, empty, bind));
                continue;
            }

            _wrong.Add(_path, key, _owner);
            _diagnostics.Error(item.Position, $"found {item.Kind}, expected {(shorthand is null ? $"[[{Join(key)}]]" : $"{key} = a {shorthand} name, a table, or a list of tables")}");
        }

        return list;
    }

    private T Bind<T>(TomlTable table, string path, T current, Func<ISection, T, T> bind)
    {
        var section = new ReadingSection(table, path, _diagnostics, _wrong, _kind, _owner, []);
        var bound = bind(section, current);
        section.ReportUnknown();
        return bound;
    }

    private double? Quantity(TomlNode node, string key, Sign sign, Dimension dimension)
    {
        if (node is not TomlText text) return NoUnit(node, key, [dimension]);
        if (!QuantityText.TryParse(text.Value, [dimension], out var si, out _, out var problem)) return Problem(node, key, problem!);
        return sign switch
        {
            Sign.Positive when si <= 0 => WrongValue<double>(node, $"{key} above zero"),
            Sign.NotNegative when si < 0 => WrongValue<double>(node, $"{key} not below zero"),
            _ => si,
        };
    }

    private TomlNode? Find(string key)
    {
        if (!_known.Contains(key)) _known.Add(key);
        return _table.Items.TryGetValue(key, out var item) ? item.Value : null;
    }

    private Setting<T> Read<T>(string key, Setting<T> current, Func<TomlNode, T?> read)
        where T : class
    {
        if (Find(key) is not { } node) return current;
        if (read(node) is { } value) return new Setting<T>(value, Source(node));
        _wrong.Add(_path, key, _owner);
        return current;
    }

    private Setting<T> Read<T>(string key, Setting<T> current, Func<TomlNode, T?> read)
        where T : struct
    {
        if (Find(key) is not { } node) return current;
        if (read(node) is { } value) return new Setting<T>(value, Source(node));
        _wrong.Add(_path, key, _owner);
        return current;
    }

    private SettingSource Source(TomlNode node) => new(_kind, node.Position, _owner);

    private string Join(string key) => _path.Length == 0 ? key : $"{_path.Trim('[', ']')}.{key}";

    private T? Wrong<T>(TomlNode node, string expected)
        where T : class
    {
        _diagnostics.Error(node.Position, $"found {node.Kind}, expected {expected}");
        return null;
    }

    private T? WrongValue<T>(TomlNode node, string expected)
        where T : struct
    {
        Wrong<object>(node, expected);
        return null;
    }

    private double? NoUnit(TomlNode node, string key, ReadOnlySpan<Dimension> dimensions)
    {
        _diagnostics.Error(node.Position, $"found {node.Kind}, expected {key} = a quantity in quotes with a unit ({Units.Symbols(dimensions)})");
        return null;
    }

    private double? Problem(TomlNode node, string key, string problem)
    {
        _diagnostics.Error(node.Position, $"{key}: {problem}");
        return null;
    }
}
