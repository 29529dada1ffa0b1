using DepthStress.Core.Diagnostics;
using DepthStress.Files.Setup;

namespace DepthStress.Tests.WellFiles;

/// <summary>A small sound well file, and what the reader says of spoiled ones.</summary>
internal static class WellText
{
    public const string Sound = """
        [well]
        name = "Testwell 1"
        datum = "rotary table"
        datum_elevation = "30 m"
        ground_elevation = "25 m"
        water_table_depth = "10 m"

        [logs]
        files = ["logs.csv"]

        [survey]
        vertical = true

        [moduli]
        static_youngs = "lacy-1997-combined"
        static_poisson = "equal-to-dynamic"

        [biot]
        coefficient = 0.8

        [overburden]
        above_log = "2.0 g/cm3"

        [pore_pressure]
        method = "hydrostatic"
        fluid_density = "1.03 g/cm3"

        """;

    public const string Logs = """
        DEPT[m],DTC[us/ft],DTS[us/ft],RHOB[g/cm3],GR[gAPI]
        1000.0,90,160,2.40,60
        1000.5,91,161,2.41,61
        1001.0,92,162,2.42,62
        1001.5,90,163,2.43,63
        1002.0,91,160,2.40,64

        """;

    /// <summary>The sound file with one piece exchanged.</summary>
    public static string With(string old, string replacement) => Sound.Exchange(old, replacement);

    /// <summary>A text with one piece exchanged; the piece must be there once.</summary>
    public static string Exchange(this string text, string old, string replacement)
    {
        Assert.Equal(2, text.Split(old).Length);
        return text.Replace(old, replacement, StringComparison.Ordinal);
    }

    public static (WellFile? Well, string[] Messages) Read(string text, params (string Name, string Text)[] others)
    {
        using var folder = new TestFolder();
        var path = folder.Write("well.toml", text);
        foreach (var (name, content) in others) folder.Write(name, content);
        var diagnostics = new DiagnosticBag();
        var well = WellFileReader.Read(path, diagnostics);
        return (well, [.. diagnostics.Items.Select(d => d.ToString())]);
    }

    /// <summary>Every message about a text, in order.</summary>
    public static string[] Messages(string text, params (string Name, string Text)[] others) => Read(text, others).Messages;

    public static WellFile Sections(string text)
    {
        var (well, messages) = Read(text);
        Assert.Empty(messages);
        return well!;
    }
}
