using System.CommandLine;
using HeadToWatts.Files;
using HeadToWatts.Files.Exports;
using HeadToWatts.Memos;
using HeadToWatts.Studies;

namespace HeadToWatts.Cli;

/// <summary>assess STUDY: run a study and write what is asked for.</summary>
internal static class AssessCommand
{
    internal static Command Make(Terminal terminal)
    {
        var study = new Argument<string>("STUDY") { Description = "A study file, or - for standard input." };
        var json = new Option<string?>("--json") { Description = "Write the results as JSON to FILE, or - for standard output.", HelpName = "FILE" };
        var memo = new Option<string?>("--memo") { Description = "Write the memo to FILE.pdf.", HelpName = "FILE.pdf" };
        var tables = new Option<string?>("--tables") { Description = "Write the tables as CSV into FOLDER.", HelpName = "FOLDER" };
        var which = new Option<string?>("--alternative") { Description = "The alternative for the memo and the tables; the first when left out.", HelpName = "NAME" };
        var command = new Command("assess", "Run a study.") { study, json, memo, tables, which };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(study)!, parsed.GetValue(json), parsed.GetValue(memo), parsed.GetValue(tables), parsed.GetValue(which)));
        return command;
    }

    private static int Run(Terminal terminal, string path, string? json, string? memo, string? tables, string? which)
    {
        if (terminal.Study(path) is not { } input)
            return CommandLine.Refused;
        var results = Study.RunAll(input);
        var chosen = which is null ? results[0] : results.FirstOrDefault(r => r.Input.Name == which);
        if (chosen is null)
        {
            terminal.Error.WriteLine($"{path}: alternatives: {which}: there is no such alternative (accepted: {string.Join(", ", results.Select(r => r.Input.Name))})");
            return CommandLine.Refused;
        }

        var written = true;
        if (json == "-")
            terminal.Output.Write(ResultsJson.Write(results));
        else if (json is not null)
            written &= terminal.Write(json, p => WholeFile.Write(p, ResultsJson.Write(results)));
        if (memo is not null)
            written &= terminal.Write(memo, p => WholeFile.Write(p, Memo.Make(chosen, chosen.Show())));
        if (tables is not null)
        {
            written &= terminal.Write(tables, p =>
            {
                Directory.CreateDirectory(p);
                foreach (var table in ResultTables.Of(chosen))
                    WholeFile.Write(Path.Combine(p, table.FileName), table.Text);
            });
        }

        if (json != "-")
        {
            foreach (var result in results)
                Summary.Write(terminal.Output, result);
        }

        return written ? CommandLine.Done : CommandLine.Refused;
    }
}
