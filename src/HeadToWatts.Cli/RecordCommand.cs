using System.CommandLine;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.DailyCsv;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Cli;

/// <summary>record FLOWFILE: say what a flow file holds, or propose how to read it.</summary>
internal static class RecordCommand
{
    private static readonly double[] Exceedances = [0.01, 0.05, 0.10, 0.25, 0.30, 0.50, 0.75, 0.90, 0.95, 0.99];

    internal static Command Make(Terminal terminal)
    {
        var file = new Argument<string>("FLOWFILE") { Description = "A flow file, or - for standard input." };
        var unit = new Option<string?>("--unit") { Description = "Unit of the flows, where the file does not say it.", HelpName = "UNIT" };
        var order = new Option<string?>("--dates") { Description = "month-day or day-month, where the file does not decide it.", HelpName = "ORDER" };
        var column = new Option<string?>("--column") { Description = "The column with the flows, where there are several.", HelpName = "NAME" };
        var recipe = new Option<string?>("--recipe") { Description = "A reading recipe, for a file of no known format.", HelpName = "FILE.json" };
        var rating = new Option<string?>("--rating") { Description = "A rating, for a file of water levels; as flow.record.rating of a study file.", HelpName = "FILE.json" };
        var propose = new Option<bool>("--propose") { Description = "Write a proposed recipe to standard output; its evidence and open questions to standard error." };
        var gaps = new Option<string?>("--gaps") { Description = "left out, interpolated up to N days, or whole years only.", HelpName = "CHOICE" };
        var years = new Option<string?>("--year-starts") { Description = "Month in which a whole year begins.", HelpName = "MONTH" };
        var negatives = new Option<string?>("--negatives") { Description = "refused, zeroed, kept out, or kept.", HelpName = "CHOICE" };
        var estimated = new Option<string?>("--estimated") { Description = "kept or left out.", HelpName = "CHOICE" };
        var repeats = new Option<string?>("--repeats") { Description = "refused, first or last: two different flows for one day or time.", HelpName = "CHOICE" };
        var share = new Option<string?>("--day-share") { Description = "Share of a day over which the flow must be known.", HelpName = "PERCENT" };
        var step = new Option<string?>("--longest-step") { Description = "Longest time between two values that is bridged.", HelpName = "TIME" };
        var write = new Option<string?>("--write") { Description = "Write the daily record, after all choices, as a table of dates and flows.", HelpName = "FILE.csv" };
        var command = new Command("record", "Say what is in a flow file.") { file, unit, order, column, recipe, rating, propose, gaps, years, negatives, estimated, repeats, share, step, write };
        command.SetAction((parsed, cancellation) =>
        {
            var path = parsed.GetValue(file)!;
            if (parsed.GetValue(propose))
                return Task.FromResult(Propose(terminal, path, cancellation));
            var about = new RecordDocument
            {
                File = path,
                Unit = parsed.GetValue(unit),
                DateOrder = parsed.GetValue(order),
                Column = parsed.GetValue(column),
                Policies = new PolicyDocument
                {
                    Gaps = parsed.GetValue(gaps),
                    YearStarts = parsed.GetValue(years),
                    Negatives = parsed.GetValue(negatives),
                    Estimated = parsed.GetValue(estimated),
                    Repeats = parsed.GetValue(repeats),
                    DayShare = parsed.GetValue(share),
                    LongestStep = parsed.GetValue(step),
                },
            };
            if (parsed.GetValue(rating) is { } ratingPath && (about.Rating = Rating(terminal, ratingPath)) is null)
                return Task.FromResult(CommandLine.Refused);
            if (parsed.GetValue(recipe) is not { } recipePath)
                return Task.FromResult(Run(terminal, path, about, parsed.GetValue(write), cancellation));
            if (Recipe(terminal, recipePath) is not { } document)
                return Task.FromResult(CommandLine.Refused);
            about.Recipe = document;
            return Task.FromResult(Run(terminal, path, about, parsed.GetValue(write), cancellation));
        });
        return command;
    }

    private static RatingDocument? Rating(Terminal terminal, string path)
    {
        using var stream = terminal.Open(path);
        if (stream is null)
            return null;
        using var reader = new StreamReader(stream);
        var document = RatingDocument.Parse(Path.GetFileName(path), reader.ReadToEnd());
        if (document.IsGood)
            return document.Value;
        foreach (var problem in document.Problems)
            terminal.Error.WriteLine(problem);
        return null;
    }

    private static RecipeDocument? Recipe(Terminal terminal, string path)
    {
        using var stream = terminal.Open(path);
        if (stream is null)
            return null;
        using var reader = new StreamReader(stream);
        var document = RecipeFile.Parse(Path.GetFileName(path), reader.ReadToEnd());
        if (document.IsGood)
            return document.Value;
        foreach (var problem in document.Problems)
            terminal.Error.WriteLine(problem);
        return null;
    }

    private static int Propose(Terminal terminal, string path, CancellationToken cancellation)
    {
        using var stream = terminal.Open(path);
        if (stream is null)
            return CommandLine.Refused;
        var held = FlowFileSource.Hold(Name(path), stream);
        if (!held.TryGet(out var source))
        {
            foreach (var problem in held.Problems)
                terminal.Error.WriteLine(problem);
            return CommandLine.Refused;
        }

        var proposal = RecipeProposer.Propose(source, cancellation);
        terminal.Output.Write(RecipeFile.Write(RecipeDocument.From(proposal.Recipe)));
        foreach (var evidence in proposal.Evidence)
            terminal.Error.WriteLine($"{evidence.Field}: {evidence.Text}");
        foreach (var question in proposal.Questions)
            terminal.Error.WriteLine($"{question.Field}: question: {question.Text}{(question.Choices.Count > 0 ? $" ({string.Join(", ", question.Choices)})" : "")}");
        return proposal.IsDecided ? CommandLine.Done : CommandLine.Refused;
    }

    private static string Name(string path) => path == "-" ? "(standard input)" : Path.GetFileName(path);

    private static int Run(Terminal terminal, string path, RecordDocument about, string? writePath, CancellationToken cancellation)
    {
        var problems = new List<Problem>();
        if (!FolderFlowFiles.TryOptions(about, "option", problems, out var options))
        {
            terminal.Tell(path, problems);
            return CommandLine.Refused;
        }

        using var stream = terminal.Open(path);
        if (stream is null)
            return CommandLine.Refused;
        var reading = FlowFileReader.Read(Name(path), stream, options, cancellation);
        if (!reading.IsGood)
        {
            foreach (var problem in reading.Problems)
                terminal.Error.WriteLine(problem);
            return CommandLine.Refused;
        }

        var flow = reading.Value;
        foreach (var line in flow.Report.Lines())
            terminal.Output.WriteLine(line);
        var curve = flow.Curve ?? (flow.Record!.NegativeCount == 0 ? FlowDurationCurve.FromRecord(flow.Record, PlottingPositions.Default, OperatingSeason.WholeYear) : null);
        if (curve is not null)
        {
            terminal.Output.WriteLine("Percent of time exceeded, flow:");
            foreach (var p in Exceedances)
                terminal.Output.WriteLine($"  {UnitDisplay.Number(p * 100, 2),4} %  {UnitDisplay.In(curve.FlowAt(p), flow.Report.Unit),10} {flow.Report.Unit.Symbol}");
        }

        if (writePath is null || flow.Record is null)
            return CommandLine.Done;
        return terminal.Write(writePath, p => WholeFile.Write(p, DailyCsvWriter.Write(flow.Record, flow.Report.Unit))) ? CommandLine.Done : CommandLine.Refused;
    }
}
