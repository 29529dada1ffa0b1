using System.CommandLine;
using DepthStress.Cli.Actions;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress compare A B</c>.</summary>
internal sealed class CompareCommand : Command
{
    /// <summary>The first result folder.</summary>
    public readonly Argument<string> First = new("A") { Description = "A result folder of \"run\"" };

    /// <summary>The second result folder.</summary>
    public readonly Argument<string> Second = new("B") { Description = "Another one; changes are told from A to B" };

    /// <summary>The picture.</summary>
    public readonly Option<string?> Out = new("--out") { Description = "Draw both stress profiles and their difference into this file", HelpName = "FILE.svg" };

    /// <summary>Declares the command.</summary>
    public CompareCommand(Terminal terminal)
        : base("compare", "Show what changed between two result folders: setup, inputs, methods, findings, stress by zone and layer")
    {
        Add(First);
        Add(Second);
        Add(Out);
        Validators.Add(result =>
        {
            Names.Check(result, First);
            Names.Check(result, Second);
            if (result.GetValue(Out) is { } path && !path.EndsWith(".svg", StringComparison.OrdinalIgnoreCase))
                result.AddError($"found --out {path}, expected a name that ends with .svg");
        });
        SetAction(parsed => CompareAction.Run(terminal, parsed.GetRequiredValue(First), parsed.GetRequiredValue(Second), parsed.GetValue(Out)));
    }
}
