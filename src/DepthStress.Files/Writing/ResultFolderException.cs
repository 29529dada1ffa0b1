namespace DepthStress.Files.Writing;

/// <summary>A result folder cannot be written; the message says what was found and what was expected.</summary>
public sealed class ResultFolderException : IOException
{
    /// <summary>Without a message.</summary>
    public ResultFolderException()
    {
    }

    /// <summary>With a message.</summary>
    public ResultFolderException(string message)
        : base(message)
    {
    }

    /// <summary>With a message and its cause.</summary>
    public ResultFolderException(string message, Exception inner)
        : base(message, inner)
    {
    }

    /// <summary>Runs a step on files; what the system refuses becomes one exception with the given expectation.</summary>
    internal static void Guard(string path, string expected, Action step)
    {
        try
        {
            step();
        }
        catch (Exception e) when (e is (IOException and not ResultFolderException) or UnauthorizedAccessException or NotSupportedException)
        {
            throw new ResultFolderException($"found that \"{path}\" cannot be written ({e.Message}), expected {expected}", e);
        }
    }
}
