using System.Text.Json;
using HeadToWatts.Files.Exports;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>Unequal units, their split, charts over head, and sizes in the study file.</summary>
public class UnitTests
{
    private const string Plain = "\"turbine\": { \"type\": \"suggest\", \"units\": \"suggest\" }";

    [Fact]
    public void Units_one_by_one_are_read_and_their_thirds_made_whole()
    {
        var turbine = Samples.Input(Samples.With(Plain, "\"turbine\": { \"type\": \"francis\", \"loadSplit\": \"best\", \"unitSizes\": [ { \"share\": \"33.3 %\", \"leastFlow\": \"30 %\" }, { \"share\": \"66.6 %\" } ] }")).Alternatives[0].Turbine;
        Assert.Equal(LoadSplit.Best, turbine.Split);
        Assert.Equal(1, turbine.UnitSizes!.Sum(s => s.ShareRatio), 1e-12);
        Assert.Equal(1.0 / 3, turbine.UnitSizes![0].ShareRatio, 1e-9);
        Assert.Equal([0.3, 0.4], turbine.UnitSizes.Select(s => Math.Round(s.LeastFlowRatio, 9)));
    }

    [Fact]
    public void A_chart_and_the_head_away_from_the_rated_one_are_read()
    {
        var turbine = Samples.Input(Samples.With(Plain, """
            "turbine": { "type": "kaplan", "awayFromRatedHead": "follow", "leastHead": "70 %",
              "hillChart": [ { "head": "40 ft", "rows": [ { "flow": "40 %", "efficiency": "80 %" }, { "flow": "90 %", "efficiency": "86 %" } ] }, { "head": "70 ft", "rows": [ { "flow": "45 %", "efficiency": "78 %" }, { "flow": "105 %", "efficiency": "88 %" } ] } ] }
            """)).Alternatives[0].Turbine;
        Assert.True(turbine.FollowsHead);
        Assert.Equal(0.7, turbine.LeastHeadRatio!.Value, 1e-12);
        Assert.Equal((12.192, 21.336), (Math.Round(turbine.HillChart!.LowestHeadM, 6), Math.Round(turbine.HillChart.HighestHeadM, 6)));
    }

    [Fact]
    public void Mistakes_about_units_charts_and_sizes_are_reported_together()
    {
        var problems = Samples.Problems(Samples.With(Plain, """
            "turbine": { "type": "pelton", "units": 2, "loadSplit": "clever", "awayFromRatedHead": "maybe", "leastHead": "140 %", "testedDiameter": "12 in",
              "unitSizes": [ { "share": "60 %" }, { "share": "much" } ],
              "hillChart": [ { "head": "40 ft", "rows": [ { "flow": "40 %", "efficiency": "80 %" } ] } ] }
            """));
        string[] places = ["units", "loadSplit", "awayFromRatedHead", "leastHead", "testedDiameter", "testedDiameter", "unitSizes[1].share", "hillChart", "hillChart[0].rows"];
        Assert.Equal(places.Order(StringComparer.Ordinal), problems.Select(p => p.Where["alternatives[0].turbine.".Length..]).Order(StringComparer.Ordinal));
        Assert.Contains(Samples.Problems(Samples.With(Plain, "\"turbine\": { \"type\": \"kaplan\", \"unitSizes\": [ { \"share\": \"60 %\" }, { \"share\": \"30 %\" } ] }")), p => p.Read == "90.0 %");
    }

    [Fact]
    public void A_table_measured_on_a_small_runner_is_stepped_up()
    {
        const string table = "\"efficiencyTable\": [ { \"flow\": \"40 %\", \"efficiency\": \"70 %\" }, { \"flow\": \"100 %\", \"efficiency\": \"88 %\" } ]";
        var plain = Study.RunAll(Samples.Input(Samples.With(Plain, $"\"turbine\": {{ \"type\": \"kaplan\", {table} }}")))[0];
        var raised = Study.RunAll(Samples.Input(Samples.With(Plain, $"\"turbine\": {{ \"type\": \"kaplan\", {table}, \"testedDiameter\": \"300 mm\", \"runnerDiameter\": \"600 mm\" }}")))[0];
        // Worked by hand: 0.12 × (300/600)^0.2 = 0.10447, so 1.553 points.
        Assert.Equal(0.01553, raised.Turbine.StepUp!.PeakChange, 1e-5);
        Assert.Null(plain.Turbine.StepUp);
        Assert.True(raised.Energy.Annual.AnnualEnergyKwh > plain.Energy.Annual.AnnualEnergyKwh);
        Assert.True(plain.Energy.ThreePointsLowerKwh < plain.Energy.Annual.AnnualEnergyKwh);
    }

    [Fact]
    public void A_study_with_units_one_by_one_reads_the_same_after_writing_and_tells_its_split()
    {
        var text = Samples.With(Plain, "\"turbine\": { \"type\": \"francis\", \"loadSplit\": \"best\", \"unitSizes\": [ { \"share\": \"35 %\" }, { \"share\": \"65 %\" } ] }");
        var document = StudyFileReader.Parse("sample.json", text).Value;
        Assert.Equal(StudyFileWriter.Write(document), StudyFileWriter.Write(StudyFileReader.Parse("again.json", StudyFileWriter.Write(document)).Value));
        var results = Study.RunAll(Samples.Input(text));
        using var json = JsonDocument.Parse(ResultsJson.Write(results));
        var split = json.RootElement.GetProperty("alternatives")[0].GetProperty("loadSplit");
        Assert.Equal("best", split.GetProperty("used").GetString());
        Assert.True(split.GetProperty("bestKwh").GetDouble() >= split.GetProperty("inTurnKwh").GetDouble());
        Assert.Equal(10, split.GetProperty("rows").GetArrayLength());
    }
}
