namespace DepthStress.Core.Diagnostics;

/// <summary>Who decided a setting's value.</summary>
public enum SettingKind
{
    /// <summary>Nobody: there is no value.</summary>
    NotSet,

    /// <summary>The program's default, listed as such in the results.</summary>
    Default,

    /// <summary>The well file.</summary>
    WellFile,

    /// <summary>An override inside a zone of the well file.</summary>
    Zone,

    /// <summary>An override inside a lithology rule of the well file.</summary>
    Lithology,

    /// <summary>An estimate from observations.</summary>
    Calibrated,
}

/// <summary>Where a setting's value came from.</summary>
/// <param name="Kind">Who decided.</param>
/// <param name="Position">Where in the well file, if it was there.</param>
/// <param name="Owner">The zone's or lithology rule's name, if one owns the override.</param>
public sealed record SettingSource(SettingKind Kind, SourcePosition Position, string? Owner = null)
{
    /// <summary>No value was given.</summary>
    public static SettingSource NotSet { get; } = new(SettingKind.NotSet, SourcePosition.None);

    /// <summary>The program's default.</summary>
    public static SettingSource Default { get; } = new(SettingKind.Default, SourcePosition.None);
}

/// <summary>A value that knows who decided it, so that nothing is silently defaulted.</summary>
/// <typeparam name="T">The value's type.</typeparam>
public readonly record struct Setting<T>
{
    private readonly SettingSource? _source;

    /// <summary>Makes a setting.</summary>
    public Setting(T value, SettingSource source)
    {
        Value = value;
        _source = source;
    }

    /// <summary>The value; meaningful only when <see cref="IsSet"/>.</summary>
    public T Value { get; }

    /// <summary>Where the value came from.</summary>
    public SettingSource Source => _source ?? SettingSource.NotSet;

    /// <summary>True when there is a value.</summary>
    public bool IsSet => Source.Kind != SettingKind.NotSet;

    /// <summary>This setting where somebody decided it, else the one below it.</summary>
    public Setting<T> Over(Setting<T> below) =>
        Source.Kind is SettingKind.NotSet or SettingKind.Default && below.IsSet ? below : this;
}

/// <summary>Makes settings that come from the program itself.</summary>
public static class Setting
{
    /// <summary>A default value, reported as such.</summary>
    public static Setting<T> Default<T>(T value) => new(value, SettingSource.Default);
}
