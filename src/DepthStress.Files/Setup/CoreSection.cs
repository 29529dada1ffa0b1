using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Quantities;
using DepthStress.Files.Reading;

namespace DepthStress.Files.Setup;

/// <summary>The [core] section.</summary>
public sealed record CoreSection
{
    /// <summary>The tables of plugs, relative to the well file.</summary>
    public Setting<IReadOnlyList<string>> Files { get; init; }

    /// <summary>What is added to core depths, m.</summary>
    public Setting<double> DepthShift { get; init; }

    /// <summary>How far a better shift is looked for either way, m.</summary>
    public Setting<double> DepthShiftLimit { get; init; }

    /// <summary>Declares the keys.</summary>
    internal static CoreSection Bind(ISection s, CoreSection c) => c with
    {
        Files = s.Texts("files", c.Files, "tables of core plugs (CSV), relative to the well file"),
        DepthShift = s.Quantity("depth_shift", c.DepthShift, Sign.Any, Dimension.Length, "what is added to core depths to give log depths"),
        DepthShiftLimit = s.Quantity("depth_shift_limit", c.DepthShiftLimit, Sign.Positive, Dimension.Length, "how far either way a better shift is looked for; it is reported, not applied"),
    };

    /// <summary>Reads the plugs.</summary>
    internal CoreData Read(CsvOptions csv, string folder, List<InputFile> inputs, DiagnosticBag diagnostics)
    {
        if (!Files.IsSet)
        {
            foreach (var lonely in new[] { DepthShift, DepthShiftLimit }.Where(k => k.IsSet))
                diagnostics.Error(lonely.Source.Position, "[core] files is not set; expected the names of the tables of plugs");
            return new CoreData();
        }

        return new CoreData
        {
            Plugs = [.. Files.Value.SelectMany(name => CoreFile.Read(Path.GetFullPath(name, folder), name, csv, inputs, diagnostics))],
            DepthShift = DepthShift,
            DepthShiftLimit = DepthShiftLimit,
        };
    }
}
