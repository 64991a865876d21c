using System.Text.Json;
using HeadToWatts.EnergyYield.Electrical;
using HeadToWatts.Files.Exports;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>What lies between the shaft and the meter, as one efficiency or in detail.</summary>
public class TrainTests
{
    private const string Simple = "\"generator\": \"92 %\", \"transformer\": \"99 %\", \"line\": \"99 %\"";

    private const string Detailed = """
        "generatorDetail": { "kind": "induction", "rating": "75 kW", "efficiency": "93 %" },
              "transformerDetail": { "rating": "100 kVA", "noLoadLoss": "210 W", "loadLoss": "1.4 %", "whenStanding": "off" },
              "lineDetail": { "length": "0.5 mi", "voltage": "12.47 kV", "phases": 3, "conductor": "1/0 awg", "metal": "aluminum", "temperature": "40 degC" },
              "powerFactor": 0.9
        """;

    [Fact]
    public void Machines_in_detail_are_read_in_their_units()
    {
        var train = Samples.Input(Samples.With(Simple, Detailed)).Alternatives[0].Train;
        Assert.Equal(new GeneratorMachine(GeneratorKind.Induction, 75, 0.93), train.Generator);
        Assert.Equal((100.0, 0.21, false), (train.Transformer!.RatingKva, train.Transformer.NoLoadLoss.LossKw, train.Transformer.StaysLive));
        Assert.Equal(0.014, train.Transformer.LoadLoss.RatingShare, 1e-12);
        Assert.Equal(804.672, train.Line!.LengthM, 1e-9);
        Assert.Equal((12_470.0, 3, "1/0 AWG", "aluminium", 40.0), (train.Line.VoltageV, train.Line.Phases, train.Line.Size.Name, train.Line.Metal.Name, train.Line.TemperatureDegC));
        Assert.Equal(0.9, train.PowerFactor);
        Assert.False(train.IsConstant);
    }

    [Fact]
    public void What_is_left_out_in_detail_is_assumed_and_said()
    {
        var input = Samples.Input(Samples.With(Simple, "\"generatorDetail\": {}, \"transformerDetail\": {}, \"lineDetail\": { \"length\": \"100 m\", \"voltage\": \"400 V\", \"conductor\": \"95 mm2\" }")).Alternatives[0];
        Assert.Equal(GeneratorKind.Synchronous, input.Train.Generator!.Kind);
        Assert.Null(input.Train.Generator.RatedPowerKw);
        Assert.True(input.Train.Transformer!.StaysLive);
        Assert.Equal(0.95, input.Train.PowerFactor);
        foreach (var word in new[] { "power factor", "no-load loss", "load loss", "aluminium", "temperature of the line" })
            Assert.Contains(input.Assumptions, a => a.Contains(word, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_mistake_is_reported_with_its_place()
    {
        var problems = Samples.Problems(Samples.With(Simple, """
            "generator": "92 %", "generatorDetail": { "kind": "dynamo", "rating": "75 ft" },
            "transformerDetail": { "whenStanding": "perhaps", "noLoadLoss": "40 %" },
            "lineDetail": { "length": "100 m", "voltage": "400 psi", "phases": 2, "conductor": "97 mm2", "metal": "gold" },
            "powerFactor": 1.2
            """));
        string[] places = ["generator", "generatorDetail.kind", "generatorDetail.rating", "transformerDetail.whenStanding", "transformerDetail.noLoadLoss", "lineDetail.voltage", "lineDetail.phases", "lineDetail.conductor", "lineDetail.metal", "powerFactor"];
        Assert.Equal(places.Order(), problems.Select(p => p.Where["alternatives[0].losses.".Length..]).Order());
        Assert.All(problems, p => Assert.True(p.Why.Length > 0));
    }

    [Fact]
    public void A_detailed_study_file_reads_the_same_after_writing()
    {
        var document = StudyFileReader.Parse("sample.json", Samples.With(Simple, Detailed)).Value;
        var again = StudyFileReader.Parse("again.json", StudyFileWriter.Write(document)).Value;
        Assert.Equal(StudyFileWriter.Write(document), StudyFileWriter.Write(again));
        Assert.Equal("0.5 mi", again.Alternatives[0].Losses.LineDetail!.Length);
    }

    [Fact]
    public void The_results_carry_the_powers_step_by_step()
    {
        var results = Study.RunAll(Samples.Input(Samples.With(Simple, Detailed)));
        using var json = JsonDocument.Parse(ResultsJson.Write(results));
        var electrical = json.RootElement.GetProperty("alternatives")[0].GetProperty("electrical");
        double[] powers = [.. new[] { "drivenKw", "generatedKw", "sentKw", "transformedKw", "meterKw" }.Select(n => electrical.GetProperty(n).GetDouble())];
        Assert.Equal(powers.OrderDescending(), powers);
        Assert.Equal(results[0].Energy.Annual.MeterPowerKw, powers[^1], 1e-9);
        Assert.Equal(75, electrical.GetProperty("generatorRatingKw").GetDouble());

        using var plain = JsonDocument.Parse(ResultsJson.Write(Study.RunAll(Samples.Input(Samples.Good))));
        Assert.Equal(JsonValueKind.Null, plain.RootElement.GetProperty("alternatives")[0].GetProperty("electrical").ValueKind);
    }
}
