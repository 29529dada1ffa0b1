using DepthStress.Core.Diagnostics;

namespace DepthStress.Files.Setup;

/// <summary>
/// The keys that are there but whose value was refused. What is then missing has been reported where it stands: to say as well
/// that the key "is not set" would be wrong.
/// </summary>
internal sealed class WrongKeys
{
    private readonly List<(string Key, string? Owner)> _keys = [];

    /// <summary>Remembers a key whose value was refused.</summary>
    /// <param name="section">The section as messages write it, such as <c>[zones.moduli]</c>.</param>
    /// <param name="key">The key.</param>
    /// <param name="owner">The zone or lithology whose override it is, or null.</param>
    public void Add(string section, string key, string? owner) => _keys.Add((Label(section, key), owner));

    /// <summary>True when one of these keys of a section was refused.</summary>
    public bool Has(string section, params ReadOnlySpan<string> keys)
    {
        foreach (var key in keys)
        {
            var label = Label(section, key);
            if (_keys.Exists(k => k.Key == label)) return true;
        }

        return false;
    }

    /// <summary>True when a message says no more than that a refused key is not set.</summary>
    public bool Explains(Diagnostic diagnostic) => _keys.Exists(k =>
        diagnostic.Text.StartsWith(k.Key + " is not set", StringComparison.Ordinal)
        && (k.Owner is null || diagnostic.Text.Contains($"\"{k.Owner}\"", StringComparison.Ordinal)));

    /// <summary>Inside zones and lithology rules, messages name a section as they do outside.</summary>
    private static string Label(string section, string key)
    {
        var dot = section.LastIndexOf('.');
        return dot < 0 ? $"{section} {key}" : $"[{section[(dot + 1)..].TrimEnd(']')}] {key}";
    }
}
