using System.Globalization;
using System.Text.Json;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.Exports;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.Exports;

public class ExportTests
{
    private static readonly IReadOnlyList<StudyResult> Larkspur = Study.RunAll(StudyBuilder.Build(DemoSites.All[0].Load(), NoFlowFiles.Instance).Value);

    [Fact]
    public void Results_hold_the_study_in_SI_with_units_in_the_names()
    {
        using var json = JsonDocument.Parse(ResultsJson.Write(Larkspur));
        var first = json.RootElement.GetProperty("alternatives")[0];
        // 4308.7 ft - 4290.2 ft = 18.5 ft = 5.6388 m; 140 cfs = 3.96436 m3/s; V = 4Q/(pi D^2) with D = 1.6764 m.
        Assert.Equal(5.6388, first.GetProperty("grossHeadM").GetDouble(), 9);
        Assert.Equal(140 * 0.028316846592 * 4 / (Math.PI * 1.6764 * 1.6764), first.GetProperty("velocityMPerS").GetDouble(), 9);
        Assert.Equal("kaplan", first.GetProperty("turbineType").GetString());
        var power = first.GetProperty("meterPowerKw").GetDouble();
        Assert.InRange(power / (9.8 * 3.96436 * first.GetProperty("netHeadAtDesignM").GetDouble()), 0.6, 0.9);
        Assert.Equal(first.GetProperty("annualEnergyKwh").GetDouble(), first.GetProperty("installedPowerKw").GetDouble() * first.GetProperty("fullLoadHours").GetDouble(), 3);
    }

    [Fact]
    public void The_water_and_the_energy_in_the_results_add_up()
    {
        using var json = JsonDocument.Parse(ResultsJson.Write(Larkspur));
        var first = json.RootElement.GetProperty("alternatives")[0];
        var water = first.GetProperty("water");
        var parts = water.EnumerateObject().Where(p => p.Name != "arrivingM3").Sum(p => p.Value.GetDouble());
        Assert.Equal(1, parts / water.GetProperty("arrivingM3").GetDouble(), 9);
        var lost = first.GetProperty("energySteps").EnumerateArray().Sum(s => s.GetProperty("lossKwh").GetDouble());
        Assert.Equal(1, (first.GetProperty("annualEnergyKwh").GetDouble() + lost) / first.GetProperty("grossEnergyKwh").GetDouble(), 9);
    }

    [Fact]
    public void The_days_and_the_duration_curve_give_the_same_energy()
    {
        var energy = Larkspur[0].Energy;
        Assert.Equal(1, energy.Days!.MeanOfDaysKwh / energy.Annual.AnnualEnergyKwh, 9);
        // Twelve whole years; the median lies between the lowest and the highest, the dry year below it.
        Assert.Equal(12, energy.Days.WholeYearsKwh.Count);
        Assert.InRange(energy.Days.DryYearKwh!.Value, energy.Days.WholeYearsKwh[0], energy.Days.MedianYearKwh!.Value);
    }

    [Fact]
    public void Every_field_of_the_results_is_documented()
    {
        using var json = JsonDocument.Parse(ResultsJson.Write(Larkspur));
        var documented = File.ReadAllText(Repository.Path("docs", "results.md"));
        foreach (var property in json.RootElement.GetProperty("alternatives")[0].EnumerateObject().Where(p => p.Name != "name"))
            Assert.Contains($"`{property.Name}`", documented, StringComparison.Ordinal);
    }

    [Fact]
    public void Tables_have_a_header_and_numbers_with_a_point_whatever_the_culture()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            var tables = ResultTables.Of(Larkspur[0]);
            Assert.Contains(tables, t => t.FileName == "months.csv");
            var losses = tables.Single(t => t.FileName == "losses.csv").Text.Split('\n');
            Assert.Equal("element,what,lossM,shareOfGrossHead", losses[0]);
            // Friction and each of the five kinds of fitting of the one pipe.
            Assert.Equal(6, losses.Length - 2);
            var sum = losses[1..^1].Sum(l => double.Parse(l[(l[..l.LastIndexOf(',')].LastIndexOf(',') + 1)..l.LastIndexOf(',')], CultureInfo.InvariantCulture));
            Assert.Equal(Larkspur[0].Waterway.AtDesign.TotalLossM, sum, 12);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void The_same_study_gives_the_same_text() =>
        Assert.Equal(ResultsJson.Write(Larkspur), ResultsJson.Write(Study.RunAll(StudyBuilder.Build(DemoSites.All[0].Load(), NoFlowFiles.Instance).Value)));
}
