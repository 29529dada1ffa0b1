using System.CommandLine;
using DepthStress.Cli.Actions;
using DepthStress.Core.Model;

namespace DepthStress.Cli.Commands;

/// <summary><c>depthstress methods [ID]</c>.</summary>
internal sealed class MethodsCommand : Command
{
    /// <summary>The method to show.</summary>
    public readonly Argument<string?> Id = new("ID")
    {
        Description = "A method to show whole; without it all are listed",
        HelpName = "ID",
        Arity = ArgumentArity.ZeroOrOne,
    };

    /// <summary>Declares the command.</summary>
    public MethodsCommand(Terminal terminal)
        : base("methods", "List the method catalogue, or show one method: formula, units, range, source")
    {
        Id.CompletionSources.Add(_ => MethodCatalogue.All.Select(l => new System.CommandLine.Completions.CompletionItem(l.Id)));
        Add(Id);
        SetAction(parsed => MethodsAction.Run(terminal, parsed.GetValue(Id)));
    }
}
