using System.Text.Json;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Files.Exports;

/// <summary>What happens when the unit trips, as JSON.</summary>
internal static class StopJson
{
    internal static void Write(Utf8JsonWriter json, StopResult? stop)
    {
        if (stop is null)
        {
            json.WriteNull("stop");
            return;
        }

        var run = stop.Run;
        json.WriteStartObject("stop");
        json.WriteNumber("closureTimeS", run.Stop.ClosureTimeS);
        json.WriteNumber("runawayFlowRatio", run.Stop.RunawayFlowRatio);
        json.WriteNumber("runawayTimeS", run.Stop.RunawayTimeS);
        json.WriteNumber("returnTimeS", stop.ReturnTimeS);
        json.WriteNumber("reaches", run.Grid.ReachCount);
        json.WriteNumber("timeStepS", run.Grid.TimeStepS);
        json.WriteNumber("waveSpeedChangeRatio", run.Grid.WaveSpeedChangeRatio);
        json.WriteNumber("highestMachineHeadM", run.HighestMachineHeadM);
        json.WriteNumber("highestAtS", run.HighestAtS);
        json.WriteNumber("riseOverStaticM", run.RiseOverStaticM);
        json.WriteNumber("lowestPressureHeadM", run.LowestPressure.LowestPressureHeadM);
        json.WriteNumber("lowestPressureStationM", run.LowestPressure.StationM);
        MachineJson.Number(json, "separationTimeS", run.Separation?.TimeS);
        MachineJson.Number(json, "separationStationM", run.Separation?.StationM);
        MachineJson.Number(json, "limitPa", stop.Limit?.LimitPa);
        MachineJson.Number(json, "michaudClosingTimeS", stop.Limit?.MichaudTimeS);
        MachineJson.Number(json, "allieviClosingTimeS", stop.Limit?.AllieviTimeS);
        json.WriteStartArray("pipes");
        foreach (var p in stop.Pipes)
        {
            json.WriteStartObject();
            json.WriteString("name", p.Element.Name);
            json.WriteNumber("waveSpeedMPerS", p.WaveSpeedMPerS);
            json.WriteNumber("highestPressurePa", p.HighestPressurePa);
            json.WriteNumber("lowestPressurePa", p.LowestPressurePa);
            MachineJson.Number(json, "ratingPa", p.Element.PressureRatingPa);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }
}
