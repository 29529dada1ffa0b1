using System.CommandLine;
using System.CommandLine.Parsing;
using DepthStress.Core.Diagnostics;

namespace DepthStress.Cli.Commands;

/// <summary>Looks at file names on the command line before anything is opened.</summary>
internal static class Names
{
    /// <summary>The names given for an argument.</summary>
    public static IReadOnlyList<string> Of(CommandResult result, Argument argument) =>
        result.GetResult(argument)?.Tokens.Select(t => t.Value).ToList() ?? [];

    /// <summary>Refuses empty names, and names that are options mistyped.</summary>
    public static void Check(CommandResult result, Argument argument)
    {
        foreach (var name in Of(result, argument))
        {
            if (string.IsNullOrWhiteSpace(name))
            {
                result.AddError($"found an empty {argument.Name}, expected the name of a file");
            }
            else if (name[0] == '-')
            {
                var options = result.Command.Options.Select(o => o.Name).ToList();
                result.AddError($"found the unknown option {name}, expected one of {string.Join(", ", options)}, or ./{name} for a file of that name{NearestName.Hint(name, options)}");
            }
        }
    }
}
