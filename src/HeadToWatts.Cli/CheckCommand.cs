using System.CommandLine;

namespace HeadToWatts.Cli;

/// <summary>check STUDY: say what is wrong with a study, and nothing else.</summary>
internal static class CheckCommand
{
    internal static Command Make(Terminal terminal)
    {
        var study = new Argument<string>("STUDY") { Description = "A study file, or - for standard input." };
        var command = new Command("check", "List the problems of a study file.") { study };
        command.SetAction(parsed =>
        {
            if (terminal.Study(parsed.GetValue(study)!) is null)
                return CommandLine.Refused;
            terminal.Output.WriteLine("no problems");
            return CommandLine.Done;
        });
        return command;
    }
}
