using System.CommandLine;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Cli;

/// <summary>record FLOWFILE: say what a flow file holds.</summary>
internal static class RecordCommand
{
    private static readonly double[] Exceedances = [0.01, 0.05, 0.10, 0.25, 0.30, 0.50, 0.75, 0.90, 0.95, 0.99];

    internal static Command Make(Terminal terminal)
    {
        var file = new Argument<string>("FLOWFILE") { Description = "A flow file, or - for standard input." };
        var unit = new Option<string?>("--unit") { Description = "Unit of the flows, where the file does not say it.", HelpName = "UNIT" };
        var order = new Option<string?>("--dates") { Description = "month-day or day-month, where the file does not decide it.", HelpName = "ORDER" };
        var column = new Option<string?>("--column") { Description = "The column with the flows, where there are several.", HelpName = "NAME" };
        var command = new Command("record", "Say what is in a flow file.") { file, unit, order, column };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(file)!, new RecordDocument { File = parsed.GetValue(file), Unit = parsed.GetValue(unit), DateOrder = parsed.GetValue(order), Column = parsed.GetValue(column) }));
        return command;
    }

    private static int Run(Terminal terminal, string path, RecordDocument about)
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
        var reading = FlowFileReader.Read(path == "-" ? "(standard input)" : Path.GetFileName(path), stream, options);
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

        return CommandLine.Done;
    }
}
