using System.Text.Json;
using HeadToWatts.Files.Exports;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>Setting and pump in the study file, sheets in the results.</summary>
public class MachineTests
{
    private const string Plain = "\"turbine\": { \"type\": \"suggest\", \"units\": \"suggest\" }";

    [Fact]
    public void Setting_and_pump_are_read_in_their_units()
    {
        var turbine = Samples.Input(Samples.With(Plain, "\"turbine\": { \"type\": \"pump as turbine\", \"runnerHeight\": \"-3 ft\", \"pump\": { \"flow\": \"2000 gpm\", \"head\": \"40 ft\", \"efficiency\": \"80 %\", \"speed\": \"1750 rpm\" } }")).Alternatives[0].Turbine;
        Assert.Equal(-0.9144, turbine.RunnerHeightM!.Value, 1e-9);
        Assert.Equal(0.126180, turbine.Pump!.FlowM3PerS, 1e-6);
        Assert.Equal((12.192, 0.8, 1750.0), (turbine.Pump.HeadM, turbine.Pump.Efficiency, turbine.Pump.SpeedRpm));
    }

    [Fact]
    public void What_is_missing_of_a_pump_is_reported_with_its_place()
    {
        var problems = Samples.Problems(Samples.With(Plain, "\"turbine\": { \"runnerHeight\": \"high\", \"pump\": { \"flow\": \"2000 gpm\", \"efficiency\": \"180 %\" } }"));
        Assert.Equal(["pump.efficiency", "pump.head", "pump.speed", "runnerHeight"], problems.Select(p => p.Where["alternatives[0].turbine.".Length..]).Order());
    }

    [Fact]
    public void The_results_set_every_machine_beside_the_others()
    {
        using var json = JsonDocument.Parse(ResultsJson.Write(Study.RunAll(Samples.Input(Samples.Good))));
        var alternative = json.RootElement.GetProperty("alternatives")[0];
        var turbines = alternative.GetProperty("turbines").EnumerateArray().ToList();
        Assert.Equal(9, turbines.Count);
        Assert.All(turbines, t => Assert.True(t.GetProperty("speedRpm").GetDouble() > 0 && t.GetProperty("against").GetArrayLength() > 0));
        Assert.Equal(3, turbines.Count(t => t.GetProperty("highestSettingM").ValueKind == JsonValueKind.Number));
        Assert.Equal(8, turbines.Count(t => t.GetProperty("runnerDiameterM").ValueKind == JsonValueKind.Number));
        Assert.Equal(5, alternative.GetProperty("pumpAsTurbine").GetProperty("estimates").GetArrayLength());
    }
}
