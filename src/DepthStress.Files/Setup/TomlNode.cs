using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Setup;

/// <summary>A value of a TOML document with its place.</summary>
internal abstract record TomlNode(SourcePosition Position)
{
    /// <summary>What the value is, for messages.</summary>
    public abstract string Kind { get; }
}

/// <summary>A string.</summary>
internal sealed record TomlText(string Value, SourcePosition Position) : TomlNode(Position)
{
    public override string Kind => $"the text \"{Words.Short(Value)}\"";
}

/// <summary>A number without a unit.</summary>
internal sealed record TomlNumber(double Value, string Spelling, SourcePosition Position) : TomlNode(Position)
{
    public override string Kind => $"the bare number {Words.Short(Spelling)}";
}

/// <summary>True or false.</summary>
internal sealed record TomlFlag(bool Value, SourcePosition Position) : TomlNode(Position)
{
    public override string Kind => Value ? "true" : "false";
}

/// <summary>A date or time, which no key takes.</summary>
internal sealed record TomlDate(SourcePosition Position) : TomlNode(Position)
{
    public override string Kind => "a date";
}

/// <summary>An array of values or tables.</summary>
internal sealed record TomlArray(List<TomlNode> Items, SourcePosition Position) : TomlNode(Position)
{
    public override string Kind => "a list";
}

/// <summary>A table, in the order of its keys.</summary>
internal sealed record TomlTable(SourcePosition Position) : TomlNode(Position)
{
    private readonly Dictionary<string, (SourcePosition Key, TomlNode Value)> _items = new(StringComparer.Ordinal);

    /// <summary>The keys with their places and values.</summary>
    public IReadOnlyDictionary<string, (SourcePosition Key, TomlNode Value)> Items => _items;

    public override string Kind => "a table";

    /// <summary>Adds a key, or keeps the first value of one that is there.</summary>
    public void Add(string key, SourcePosition position, TomlNode value) => _items.TryAdd(key, (position, value));
}
