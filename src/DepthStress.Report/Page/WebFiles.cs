using System.Security.Cryptography;
using System.Text;
using System.Text.RegularExpressions;

namespace DepthStress.Report.Page;

/// <summary>The page's own files, as they lie in Web/, embedded at build and put together here.</summary>
internal static partial class WebFiles
{
    /// <summary>The modules of the script; a module stands after those it imports from.</summary>
    private static readonly string[] Modules = ["numbers", "store", "view", "layout", "paint", "curves", "marks", "scene", "reading", "polygon", "input", "tables", "main"];

    private static readonly string[] Sheets = ["page", "viewer", "print"];

    /// <summary>The page with its places for content in double braces.</summary>
    public static string Frame { get; } = Read("page.html");

    /// <summary>The style sheet.</summary>
    public static string Style { get; } = string.Concat(Sheets.Select(s => Read($"style.{s}.css")));

    /// <summary>The modules as one: their imports and the word export fall away.</summary>
    public static string Script { get; } = string.Concat(Modules.Select(m => Joined(Read($"script.{m}.js"))));

    /// <summary>The hash of a script or style for the security policy.</summary>
    public static string Hash(string text) => $"'sha256-{Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(text)))}'";

    private static string Joined(string module) => Linking().Replace(module, "");

    /// <summary>An import, over one line or several, and the word before what a module exports.</summary>
    [GeneratedRegex("^import [^;]*;\n|^export ", RegexOptions.Multiline | RegexOptions.ExplicitCapture)]
    private static partial Regex Linking();

    private static string Read(string name)
    {
        using var stream = typeof(WebFiles).Assembly.GetManifestResourceStream($"Web.{name}")
            ?? throw new InvalidOperationException($"found no embedded file \"{name}\", expected it in the program");
        using var reader = new StreamReader(stream, Encoding.UTF8);
        return reader.ReadToEnd().ReplaceLineEndings("\n");
    }
}
