using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Benchmarks;

/// <summary>The canal drop with thirty years of daily flows, made by repeating and scaling its own.</summary>
internal static class BenchmarkStudies
{
    internal static StudyInput ThirtyYears()
    {
        var input = StudyBuilder.Build(DemoSites.All[0].Load(), NoFlowFiles.Instance).Value;
        var alternative = input.Alternatives[0];
        var days = alternative.Flow.Record!.Flows.ToArray();
        var flows = new double[(30 * 365) + 7];
        for (var i = 0; i < flows.Length; i++)
            flows[i] = days[i % days.Length] * (1 + (0.01 * (i / days.Length)) + (1e-6 * i));
        var record = new DailyRecord(new DateOnly(1991, 1, 1), flows, "thirty years");
        return input with { Alternatives = [alternative with { Flow = alternative.Flow with { Record = record } }] };
    }
}
