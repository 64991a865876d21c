using System.Text.Json;
using HeadToWatts.Files.Exports;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>The stop in the study file and in the results.</summary>
public class StopTests
{
    private const string Place = "\"waterway\": {";

    [Fact]
    public void A_stop_is_read_in_its_units_and_its_pressures_are_written()
    {
        var input = Samples.Input(Samples.With(Place, Place + " \"stop\": { \"closingTime\": \"0.1 min\", \"law\": \"flow\", \"runawayFlow\": \"60 %\", \"restraint\": \"expansion joints\", \"pressureLimit\": \"100 psi\" },"));
        var stop = input.Alternatives[0].Waterway.Stop!;
        Assert.Equal((6.0, StopLaw.FlowFallsEvenly, 0.6, PipeRestraint.ExpansionJoints), (stop.ClosureTimeS, stop.Law, stop.RunawayFlowRatio!.Value, stop.Restraint));
        Assert.Equal(689_475.7, stop.PressureLimitPa!.Value, 0.1);
        using var json = JsonDocument.Parse(ResultsJson.Write(Study.RunAll(input)));
        var written = json.RootElement.GetProperty("alternatives")[0].GetProperty("stop");
        Assert.Equal(6, written.GetProperty("closureTimeS").GetDouble());
        Assert.True(written.GetProperty("highestMachineHeadM").GetDouble() > 0);
        Assert.All(written.GetProperty("pipes").EnumerateArray(), p => Assert.True(p.GetProperty("highestPressurePa").GetDouble() > p.GetProperty("lowestPressurePa").GetDouble()));
    }

    [Fact]
    public void What_is_wrong_with_a_stop_is_reported_together_with_its_place()
    {
        var problems = Samples.Problems(Samples.With(Place, Place + " \"stop\": { \"law\": \"valve\", \"runawayFlow\": \"900 %\", \"restraint\": \"held\" },"));
        Assert.Equal(["closingTime", "law", "restraint", "runawayFlow"], problems.Select(p => p.Where["alternatives[0].waterway.stop.".Length..]).Order());
    }

    [Fact]
    public void Without_a_stop_none_is_run()
    {
        var result = Study.RunAll(Samples.Input(Samples.Good))[0];
        Assert.Null(result.Waterway.Stop);
    }
}
