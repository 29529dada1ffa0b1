using DepthStress.Core.Catalogue;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Logs;
using DepthStress.Core.Pressure;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>The signs a quantity may have.</summary>
internal enum Sign
{
    Any,
    NotNegative,
    Positive,
}

/// <summary>
/// One table of the well file, seen key by key. Each key is declared once, in a binding; a reading section gives the key's
/// value, a describing one collects the schema, a recording one writes the resolved value. All give back the current
/// setting where the key says nothing.
/// </summary>
internal interface ISection
{
    /// <summary>Where the table stands.</summary>
    SourcePosition Position { get; }

    /// <summary>The same table, its settings owned by a zone or lithology rule.</summary>
    ISection OwnedBy(SettingKind kind, string owner);

    /// <summary>Who decided a key of the table; not set where it says nothing.</summary>
    SettingSource SourceOf(string key);

    /// <summary>A text.</summary>
    Setting<string> Text(string key, Setting<string> current, string doc);

    /// <summary>A list of texts.</summary>
    Setting<IReadOnlyList<string>> Texts(string key, Setting<IReadOnlyList<string>> current, string doc);

    /// <summary>True or false.</summary>
    Setting<bool> Flag(string key, Setting<bool> current, string doc);

    /// <summary>A pure number.</summary>
    Setting<double> Number(string key, Setting<double> current, Interval allowed, string doc);

    /// <summary>A list of pure numbers; one number is a list of one.</summary>
    Setting<IReadOnlyList<double>> Numbers(string key, Setting<IReadOnlyList<double>> current, string doc);

    /// <summary>Numbers and texts that mean missing; one stands for a list of one.</summary>
    Setting<MissingCodes> Codes(string key, Setting<MissingCodes> current, string doc);

    /// <summary>A quantity with a unit, in SI.</summary>
    Setting<double> Quantity(string key, Setting<double> current, Sign sign, Dimension dimension, string doc);

    /// <summary>A list of quantities with units, in SI; one quantity is a list of one.</summary>
    Setting<IReadOnlyList<double>> Quantities(string key, Setting<IReadOnlyList<double>> current, Dimension dimension, string doc);

    /// <summary>A fluid density or the pressure gradient of such a fluid, in kg/m3.</summary>
    Setting<double> FluidDensity(string key, Setting<double> current, string doc);

    /// <summary>One of some words.</summary>
    Setting<T> Choice<T>(string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, string doc);

    /// <summary>One of some words, or a positive quantity.</summary>
    Setting<T> ChoiceOrQuantity<T>(
        string key, Setting<T> current, IReadOnlyList<(string Word, T Value)> words, Dimension dimension, Func<double, T> make, Func<T, double?> quantity, string doc);

    /// <summary>A law from the catalogue, a constant, or a law of the user's own.</summary>
    Setting<Law> Law(string key, Setting<Law> current, Property predicts, string doc);

    /// <summary>What is assumed for density above the log.</summary>
    Setting<ShallowDensity> ShallowDensity(string key, Setting<ShallowDensity> current, string doc);

    /// <summary>A table inside this one.</summary>
    T Table<T>(string key, T current, Func<ISection, T, T> bind, string doc);

    /// <summary>A list of tables inside this one; with a shorthand key, a text stands for a table with just that key.</summary>
    IReadOnlyList<T> Tables<T>(string key, IReadOnlyList<T> current, Func<ISection, T, T> bind, T empty, string doc, string? shorthand = null);
}
