using System.Text.Json;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Files.Exports;

/// <summary>What the study found of the machines, as JSON.</summary>
internal static class MachineJson
{
    internal static void Electrical(Utf8JsonWriter json, StudyResult r)
    {
        if (r.Energy.Electrical is not { } found)
        {
            json.WriteNull("electrical");
            return;
        }

        json.WriteStartObject("electrical");
        json.WriteNumber("drivenKw", found.AtBest.DrivenKw);
        json.WriteNumber("generatedKw", found.AtBest.GeneratedKw);
        json.WriteNumber("sentKw", found.AtBest.SentKw);
        json.WriteNumber("transformedKw", found.AtBest.TransformedKw);
        json.WriteNumber("meterKw", found.AtBest.MeterKw);
        json.WriteNumber("powerFactor", found.Train.PowerFactor);
        var rated = found.Train.Rated;
        Number(json, "generatorRatingKw", rated?.Generator?.RatedPowerKw);
        Number(json, "generatorEfficiency", rated?.Generator?.FullLoadEfficiency);
        Number(json, "generatorLoadRatio", found.GeneratorLoadRatio);
        Number(json, "transformerKva", rated?.Transformer?.RatingKva);
        Number(json, "noLoadLossKw", rated?.Transformer?.NoLoadLossKw);
        Number(json, "loadLossKw", rated?.Transformer?.LoadLossKw);
        Number(json, "lineResistanceOhm", found.Train.Line?.ResistanceOhm);
        Number(json, "lineCurrentA", found.LineCurrentA);
        Number(json, "lineLossShare", found.LineLossShare);
        Number(json, "voltageRiseRatio", found.VoltageRiseRatio);
        json.WriteEndObject();
    }

    internal static void Sheet(Utf8JsonWriter json, MachineSheet? sheet)
    {
        Number(json, "speedRpm", sheet?.Candidate.Speed?.RunnerSpeedRpm);
        Number(json, "runawayRpm", sheet?.Candidate.Speed?.RunawayRpm);
        if (sheet?.Candidate.Speed is { } speed)
            json.WriteBoolean("isDirect", speed.IsDirect);
        Number(json, "meterPowerKw", sheet?.Candidate.MeterPowerKw);
        Number(json, "runnerDiameterM", sheet?.Geometry?.DiameterM ?? sheet?.Candidate.Speed?.RunnerDiameterM);
        Number(json, "thomaSigma", sheet?.Setting?.ThomaSigma);
        Number(json, "highestSettingM", sheet?.Setting?.HighestM);
        json.WriteStartArray("against");
        foreach (var sentence in sheet?.Against ?? [])
            json.WriteStringValue(sentence);
        json.WriteEndArray();
    }

    internal static void Pump(Utf8JsonWriter json, StudyResult r)
    {
        if (r.Turbine.Pump is not { } band)
        {
            json.WriteNull("pumpAsTurbine");
            return;
        }

        json.WriteStartObject("pumpAsTurbine");
        json.WriteBoolean("isPumpToLookFor", band.Pump is null);
        json.WriteNumber("pumpEfficiency", band.PumpEfficiency);
        json.WriteStartArray("estimates");
        foreach (var e in band.Estimates)
        {
            json.WriteStartObject();
            json.WriteString("by", e.Correlation.Name);
            json.WriteNumber("flowM3PerS", e.FlowM3PerS);
            json.WriteNumber("headM", e.HeadM);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    internal static void Split(Utf8JsonWriter json, StudyResult r)
    {
        if (r.Turbine.Split is not { } split)
        {
            json.WriteNull("loadSplit");
            return;
        }

        json.WriteStartObject("loadSplit");
        json.WriteString("used", r.Turbine.Units.Split == Turbines.Units.LoadSplit.Best ? "best" : "in turn");
        json.WriteNumber("inTurnKwh", split.InTurnKwh);
        json.WriteNumber("bestKwh", split.BestKwh);
        json.WriteStartArray("rows");
        foreach (var row in split.Rows)
        {
            json.WriteStartObject();
            json.WriteNumber("flowM3PerS", row.FlowM3PerS);
            Flows("inTurnM3PerS", row.InTurnM3PerS);
            json.WriteNumber("inTurnEfficiency", row.InTurnEfficiency);
            Flows("bestM3PerS", row.BestM3PerS);
            json.WriteNumber("bestEfficiency", row.BestEfficiency);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteEndObject();

        void Flows(string name, IReadOnlyList<double> flows)
        {
            json.WriteStartArray(name);
            foreach (var flow in flows)
                json.WriteNumberValue(flow);
            json.WriteEndArray();
        }
    }

    internal static void Number(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number && double.IsFinite(number))
            json.WriteNumber(name, number);
        else
            json.WriteNull(name);
    }
}
