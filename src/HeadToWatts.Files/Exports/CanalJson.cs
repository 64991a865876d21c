using System.Text.Json;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Exports;

/// <summary>The canal and its drop as JSON.</summary>
internal static class CanalJson
{
    internal static void Write(Utf8JsonWriter json, StudyResult r)
    {
        if (r.Canal is not { } canal)
        {
            json.WriteNull("canal");
            return;
        }

        json.WriteStartObject("canal");
        json.WriteStartArray("flows");
        foreach (var at in canal.AtFlows)
        {
            json.WriteStartObject();
            json.WriteNumber("flowM3PerS", at.FlowM3PerS);
            Side(json, "above", at.Upstream);
            Side(json, "below", at.Downstream);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        Number(json, "fallOfEnergyM", canal.FallOfEnergyM);
        json.WriteNumber("drawdownLengthM", canal.DrawdownLengthM);
        if (canal.Basin is { } basin)
        {
            json.WriteStartObject("basin");
            json.WriteNumber("entryDepthM", basin.EntryDepthM);
            json.WriteNumber("entryFroudeNumber", basin.EntryFroudeNumber);
            json.WriteNumber("neededDepthM", basin.NeededDepthM);
            json.WriteNumber("availableDepthM", basin.AvailableDepthM);
            json.WriteNumber("neededLengthM", basin.NeededLengthM);
            json.WriteNumber("availableLengthM", basin.AvailableLengthM);
            json.WriteBoolean("holdsTheJump", basin.HoldsTheJump);
            json.WriteEndObject();
        }
        else
        {
            json.WriteNull("basin");
        }

        json.WriteEndObject();
    }

    private static void Side(Utf8JsonWriter json, string name, CanalFlowResult at)
    {
        json.WriteStartObject(name);
        Number(json, "normalDepthM", at.NormalDepthM);
        Number(json, "criticalDepthM", at.CriticalDepthM);
        Number(json, "velocityMPerS", at.VelocityMPerS);
        Number(json, "froudeNumber", at.FroudeNumber);
        Number(json, "specificEnergyM", at.SpecificEnergyM);
        json.WriteEndObject();
    }

    private static void Number(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number)
            json.WriteNumber(name, number);
        else
            json.WriteNull(name);
    }
}
