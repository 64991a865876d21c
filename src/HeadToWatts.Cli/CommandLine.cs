using System.CommandLine;

namespace HeadToWatts.Cli;

/// <summary>The commands and what they exit with: 0 done, 1 input refused, 2 wrong usage.</summary>
public static class CommandLine
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>The input was refused; every problem is on standard error, one a line.</summary>
    public const int Refused = 1;

    /// <summary>The command was called wrongly.</summary>
    public const int WrongUsage = 2;

    /// <summary>Runs one command.</summary>
    /// <param name="args">Arguments.</param>
    /// <param name="output">Standard output.</param>
    /// <param name="error">Standard error.</param>
    /// <param name="openInput">Opens standard input, for "-".</param>
    public static int Run(string[] args, TextWriter output, TextWriter error, Func<Stream> openInput)
    {
        ArgumentNullException.ThrowIfNull(output);
        ArgumentNullException.ThrowIfNull(error);
        var console = new Terminal(output, error, openInput);
        var root = new RootCommand("HeadToWatts: is falling water on a canal, a pipe or a creek worth turning into power?")
        {
            AssessCommand.Make(console),
            CheckCommand.Make(console),
            RecordCommand.Make(console),
        };
        var parsed = root.Parse(args);
        if (parsed.Errors.Count > 0)
        {
            foreach (var problem in parsed.Errors)
                error.WriteLine(problem.Message);
            error.WriteLine("Try --help.");
            return WrongUsage;
        }

        if (args.Length == 0)
        {
            root.Parse(["--help"]).Invoke(new InvocationConfiguration { Output = error, Error = error });
            return WrongUsage;
        }

        return parsed.Invoke(new InvocationConfiguration { Output = output, Error = error });
    }
}
