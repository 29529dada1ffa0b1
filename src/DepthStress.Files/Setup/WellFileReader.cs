using System.Security.Cryptography;
using System.Text;
using DepthStress.Core.Calibration;
using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;

namespace DepthStress.Files.Setup;

/// <summary>Reads a well file: syntax, keys, values, and whether they go together; every problem in one run.</summary>
public static class WellFileReader
{
    private const int MostBytes = 16 << 20;

    /// <summary>Reads a well file and the survey it names.</summary>
    /// <param name="path">The path as the user gave it.</param>
    /// <param name="diagnostics">Gets every problem.</param>
    /// <returns>
    /// The well file, or null when its text cannot be read at all. When there are errors among the diagnostics it serves only to
    /// look for further problems.
    /// </returns>
    public static WellFile? Read(string path, DiagnosticBag diagnostics)
    {
        ArgumentNullException.ThrowIfNull(path);
        ArgumentNullException.ThrowIfNull(diagnostics);
        var name = Path.GetFileName(path);
        if (ReadText(path, name, diagnostics) is not var (text, hash) || TomlTree.Parse(text, name, diagnostics) is not { } root) return null;
        var wrong = new WrongKeys();
        var section = new ReadingSection(root, "", diagnostics, wrong);
        var sections = Bindings.All(section, new WellFileSections());
        section.ReportUnknown();

        var full = Path.GetFullPath(path);
        var inputs = new List<InputFile> { new(name, hash) };
        var checks = new DiagnosticBag();
        var setup = SetupAssembly.Assemble(sections, name, Path.GetDirectoryName(full)!, inputs, wrong, checks);
        SetupCheck.Report(setup, checks);
        CalibrationCheck.Report(sections.Calibration, setup, checks);
        foreach (var check in checks.Items.Where(c => !wrong.Explains(c))) diagnostics.Add(check);
        return new WellFile(full, name, sections, setup, inputs);
    }

    private static bool LooksLikeLog(string name, string text) =>
        text.StartsWith('~') || Path.GetExtension(name).ToUpperInvariant() is ".LAS" or ".CSV";

    private static (string Text, string Hash)? ReadText(string path, string name, DiagnosticBag diagnostics)
    {
        var position = new SourcePosition(name);
        try
        {
            if (Directory.Exists(path))
            {
                diagnostics.Error(position, "found a folder, expected a well file");
                return null;
            }

            if (new FileInfo(path).Length > MostBytes)
            {
                diagnostics.Error(position, "found more than 16 MiB, expected a well file; is it a log file? then start with the command init");
                return null;
            }

            var bytes = File.ReadAllBytes(path);
            var text = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true).GetString(bytes).TrimStart('\uFEFF');
            if (LooksLikeLog(name, text))
            {
                diagnostics.Error(position, $"found a log file, expected a well file (TOML); to write one for these logs: depthstress init {name}");
                return null;
            }

            return (text, Convert.ToHexStringLower(SHA256.HashData(bytes)));
        }
        catch (DecoderFallbackException)
        {
            diagnostics.Error(position, "found bytes that are not UTF-8, expected a well file as UTF-8 text");
        }
        catch (FileNotFoundException)
        {
            diagnostics.Error(position, "found no such file, expected a well file");
        }
        catch (DirectoryNotFoundException)
        {
            diagnostics.Error(position, "found no such folder, expected a well file");
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            diagnostics.Error(position, $"cannot be read: {e.Message}");
        }

        return null;
    }
}
