using System.CommandLine;
using System.CommandLine.Completions;
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

    /// <summary>What the listed methods give.</summary>
    public readonly Option<string?> For = new("--for")
    {
        Description = $"List what gives a property: {string.Join(", ", MethodsAction.Results)}",
        HelpName = "PROPERTY",
    };

    /// <summary>The rock the listed methods are made for.</summary>
    public readonly Option<string?> Rock = new("--rock")
    {
        Description = $"List what is made for a rock: {string.Join(", ", MethodsAction.Rocks)}",
        HelpName = "ROCK",
    };

    /// <summary>Declares the command.</summary>
    public MethodsCommand(Terminal terminal)
        : base("methods", "List the method catalogue, or show one method: formula, units, range, source")
    {
        Id.CompletionSources.Add(_ => MethodCatalogue.All.Select(l => new CompletionItem(l.Id)));
        For.CompletionSources.Add(_ => MethodsAction.Results.Select(w => new CompletionItem(w)));
        Rock.CompletionSources.Add(_ => MethodsAction.Rocks.Select(w => new CompletionItem(w)));
        Add(Id);
        Add(For);
        Add(Rock);
        SetAction(parsed => MethodsAction.Run(terminal, parsed.GetValue(Id), parsed.GetValue(For), parsed.GetValue(Rock)));
    }
}
