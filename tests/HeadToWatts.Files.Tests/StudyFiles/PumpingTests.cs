using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>Pumping from the study file to the months beside the generation.</summary>
public class PumpingTests
{
    private const string Turbine = "\"turbine\": { \"type\": \"suggest\", \"units\": \"suggest\" },";
    private const string Hours = "[\"0 h\", \"0 h\", \"0 h\", \"100 h\", \"400 h\", \"600 h\", \"700 h\", \"700 h\", \"300 h\", \"0 h\", \"0 h\", \"0 h\"]";

    [Fact]
    public void A_well_takes_weight_times_lift_over_its_efficiency()
    {
        var side = Run($"{{ \"name\": \"Well 1\", \"flow\": \"100 L/s\", \"totalHead\": \"40 m\", \"hoursByMonth\": {Hours}, \"efficiency\": \"60 %\", \"price\": 0.1 }}");
        // 9.8 kN/m3 x 0.1 m3/s x 40 m / 0.6 = 65.4 kW (4.7 parts in a thousand either way for water and gravity here); 2800 h a year.
        Assert.Equal(65.4, side.Pumping.Plants[0].DemandKw, 0.3);
        Assert.Equal(side.Pumping.Plants[0].DemandKw * 2800, side.Pumping.ElectricKwh, 1e-6);
        Assert.Equal(0.1 * side.Pumping.ElectricKwh, side.Pumping.Plants[0].AnnualCostAmount!.Value, 1e-6);
        Assert.Null(side.GeneratedByMonthKwh);
    }

    [Fact]
    public void The_head_of_a_pump_is_lift_drawdown_pressure_and_what_its_pipe_loses()
    {
        const string pipe = "\"elements\": [ { \"name\": \"main\", \"length\": \"500 m\", \"insideDiameter\": \"250 mm\", \"material\": \"PVC\" } ]";
        var side = Run($"{{ \"flow\": \"60 L/s\", \"lift\": \"20 m\", \"drawdown\": \"3 m\", \"pressure\": \"200 kPa\", \"pipe\": {{ {pipe} }}, \"hoursByMonth\": {Hours}, \"efficiency\": \"60 %\" }}");
        var head = side.Pumping.Plants[0].Plant.Head;
        Assert.Equal(23, head.StaticM + head.DrawdownM, 1e-9);
        Assert.Equal(20.4, head.PressureM, 0.05);
        // Colebrook-White, 1.22 m/s in smooth PVC at 10 degrees: f about 0.0148, 2.26 m.
        Assert.Equal(2.26, head.PipeLossM, 0.08);
    }

    [Fact]
    public void A_pump_test_gives_the_efficiency()
    {
        var side = Run($"{{ \"flow\": \"100 L/s\", \"totalHead\": \"40 m\", \"hoursByMonth\": {Hours}, \"testPower\": \"80 kW\" }}");
        Assert.Equal(39.2 / 80, side.Pumping.Plants[0].Plant.PlantEfficiency, 0.002);
        Assert.Equal(80, side.Pumping.Plants[0].DemandKw, 1e-9);
    }

    [Fact]
    public void With_a_record_the_months_stand_beside_each_other_and_add_up()
    {
        var site = DemoSites.All.Select(s => s.Load()).First(d => d.Alternatives[0].Flow.Record is not null);
        site.Alternatives[0].Pumping = new PumpingDocument { Plants = [new() { Flow = "50 L/s", Lift = "30 m", VolumeByMonth = [.. Enumerable.Range(1, 12).Select(m => m is >= 5 and <= 9 ? "60000 m3" : "0 m3")], Efficiency = "65 %" }] };
        var result = Study.RunAll(StudyBuilder.Build(site, NoFlowFiles.Instance).Value)[0];
        var side = result.Pumping!;
        Assert.Equal(side.GeneratedByMonthKwh!.Sum() - side.Pumping.ElectricKwh, Enumerable.Range(1, 12).Sum(m => side.NetKwh(m)!.Value), 1e-6);
        Assert.InRange(side.CoveredInTheMonthKwh!.Value, 0, side.Pumping.ElectricKwh);
        Assert.Contains(result.MethodsUsed, u => u.Method.Id == "pumping-performance");
        Assert.NotEmpty(HeadToWatts.Files.Exports.ResultsJson.Write([result]));
    }

    [Fact]
    public void Every_problem_of_a_pump_is_reported_together()
    {
        var problems = Samples.Problems(Samples.With(Turbine, Turbine + " \"pumping\": { \"plants\": [ { \"energy\": \"steam\", \"flow\": \"1 m\", \"totalHead\": \"40 m\", \"lift\": \"3 m\", \"hoursByMonth\": [\"3 h\"] } ] },"));
        Assert.Equal(
            ["energy", "flow", "hoursByMonth", "totalHead"],
            problems.Select(p => p.Where["alternatives[0].pumping.plants[0].".Length..]).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_poor_pump_and_a_pump_set_too_high_are_cautioned()
    {
        var text = Plant($"{{ \"name\": \"Old well\", \"flow\": \"100 L/s\", \"totalHead\": \"40 m\", \"hoursByMonth\": {Hours}, \"efficiency\": \"40 %\", \"suctionLift\": \"8 m\", \"requiredSuctionHead\": \"4 m\" }}");
        var result = Study.RunAll(Samples.Input(text))[0];
        var ids = HeadToWatts.Studies.Cautions.CautionRules.For(result, result.Show()).Select(c => c.Id).ToList();
        Assert.Contains("pump-below-criterion", ids);
        Assert.Contains("suction-too-low", ids);
    }

    private static string Plant(string plant) => Samples.With(Turbine, Turbine + $" \"pumping\": {{ \"plants\": [ {plant} ] }},");

    private static HeadToWatts.Studies.Results.PumpingSide Run(string plant) => Study.RunAll(Samples.Input(Plant(plant)))[0].Pumping!;
}
