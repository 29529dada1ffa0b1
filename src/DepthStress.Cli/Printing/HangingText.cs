namespace DepthStress.Cli.Printing;

/// <summary>Writes text that stays within the terminal: a head, then words that wrap under a fixed column.</summary>
internal static class HangingText
{
    /// <summary>A space where no line breaks; written as a plain space.</summary>
    public const char Tie = '\u00a0';

    private const int LeastWidth = 40;

    /// <summary>Writes a head, pads it to the column, and wraps the text there; a head that is too long gets a line of its own.</summary>
    /// <param name="terminal">Where to, and how wide it is.</param>
    /// <param name="head">What stands left, once.</param>
    /// <param name="column">Where the text begins, on every line.</param>
    /// <param name="text">Words; single spaces between them are where lines break.</param>
    public static void Write(Terminal terminal, string head, int column, string text)
    {
        var width = Math.Max(LeastWidth, terminal.Width - 1);
        if (column > width / 2) column = width / 3;
        var line = head;
        if (head.Length >= column && head.Length > 0)
        {
            terminal.Output.WriteLine(head);
            line = "";
        }

        line = line.PadRight(column);
        var empty = true;
        foreach (var word in text.Split(' '))
        {
            if (!empty && line.Length + 1 + word.Length > width)
            {
                terminal.Output.WriteLine(line.TrimEnd().Replace(Tie, ' '));
                line = new string(' ', column);
                empty = true;
            }

            line += empty ? word : $" {word}";
            empty = false;
        }

        terminal.Output.WriteLine(line.TrimEnd().Replace(Tie, ' '));
    }
}
