using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Transfer;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Tests.StudyFiles;

/// <summary>Sites without a record of their own, from the study file to the result.</summary>
public class TransferTests
{
    private const double Cfs = 0.028316846592;
    private const string Curve = """
        "curve": [
                  { "exceeded": "10 %", "flow": "40 cfs" },
                  { "exceeded": "50 %", "flow": "20 cfs" },
                  { "exceeded": "95 %", "flow": "5 cfs" }
                ],
        """;

    [Fact]
    public void Monthly_means_become_a_year_of_steps_with_low_confidence()
    {
        var flow = Samples.Input(Samples.With(Curve, $"\"monthlyMeans\": [{string.Join(", ", Enumerable.Range(1, 12).Select(m => $"\"{m} cfs\""))}],")).Alternatives[0].Flow;
        Assert.Equal(FlowConfidence.Low, flow.Origin!.Confidence);
        // By hand: sum of month x days over 365, with 28 days of February: 31 x (1+3+5+7+8+10+12) + 30 x (4+6+9+11) + 28 x 2 = 2382; 2382/365.
        Assert.Equal(2382.0 / 365 * Cfs, flow.Record!.MeanM3PerS, 1e-9);
    }

    [Fact]
    public void A_delivery_schedule_has_its_flow_on_its_days_and_none_on_others()
    {
        var flow = Samples.Input(Samples.With(Curve, "\"schedule\": [ { \"days\": \"Apr 15 to May 31\", \"flow\": \"30 cfs\" }, { \"days\": \"Nov 20 to Jan 10\", \"flow\": \"4 cfs\" } ],")).Alternatives[0].Flow;
        Assert.Equal(FlowConfidence.Plan, flow.Origin!.Confidence);
        Assert.Equal(47, flow.Record!.Flows.ToArray().Count(q => Math.Abs(q - (30 * Cfs)) < 1e-12));
        Assert.Equal(52, flow.Record.Flows.ToArray().Count(q => Math.Abs(q - (4 * Cfs)) < 1e-12));
        Assert.Equal(365 - 47 - 52, flow.Record.ZeroCount);
    }

    [Theory]
    [InlineData("\"schedule\": [ { \"days\": \"Apr 1 to May 31\", \"flow\": \"30 cfs\" }, { \"days\": \"May 20 to Jun 10\", \"flow\": \"4 cfs\" } ],", "also in line 1")]
    [InlineData("\"schedule\": [ { \"days\": \"Apr, Jun\", \"flow\": \"30 cfs\" } ],", "several spans")]
    [InlineData("\"schedule\": [ { \"flow\": \"30 cfs\" } ],", "nothing is entered")]
    [InlineData("\"monthlyMeans\": [ \"3 cfs\" ],", "twelve means")]
    [InlineData("\"monthlyMeans\": [ \"3 cfs\" ], \"schedule\": [ { \"days\": \"Apr\", \"flow\": \"30 cfs\" } ],", "more than once: monthlyMeans and schedule")]
    public void What_is_wrong_with_a_plan_is_said(string text, string why) =>
        Assert.Contains(Samples.Problems(Samples.With(Curve, text)), p => p.Why.Contains(why, StringComparison.Ordinal));

    [Fact]
    public void A_curve_cannot_be_carried_by_area() =>
        Assert.Contains(
            Samples.Problems(Samples.With(Curve, Curve + " \"areaRatio\": { \"gaugeArea\": \"80 km2\", \"siteArea\": \"60 km2\" },")),
            p => p.Why.Contains("only a daily record", StringComparison.Ordinal));

    [Fact]
    public void A_record_is_carried_by_the_ratio_of_areas()
    {
        var site = WithRecord();
        var own = Build(site).Flow.Record!;
        site.Alternatives[0].Flow.AreaRatio = new AreaRatioDocument { GaugeArea = "100 mi2", SiteArea = "60 mi2", Exponent = "0.8" };
        var flow = Build(site).Flow;
        // Hortness 2006: Q_u = Q_g (A_u/A_g)^phi.
        Assert.Equal(Math.Pow(0.6, 0.8), flow.Record!.MeanM3PerS / own.MeanM3PerS, 1e-12);
        Assert.Equal(FlowConfidence.Low, flow.Origin!.Confidence);
        Assert.Contains(Study.RunAll(StudyBuilder.Build(site, NoFlowFiles.Instance).Value)[0].MethodsUsed, u => u.Method.Id == "drainage-area-ratio");
    }

    [Fact]
    public void A_short_record_is_extended_by_its_neighbour_and_keeps_its_own_days()
    {
        var site = WithRecord();
        var whole = Build(site).Flow.Record!;
        var flows = whole.Flows.ToArray();
        // The neighbour flows three times as much every day; the site itself was measured for the last four years only.
        var neighbour = new DailyRecord(whole.FirstDay, [.. flows.Select(q => 3 * q)], "upstream");
        var cut = whole.DayCount - (4 * 365);
        var own = new DailyRecord(whole.FirstDay.AddDays(cut), flows[cut..], "site");
        site.Alternatives[0].Flow.Record = RecordText.Write(own, HeadToWatts.Basis.Units.UnitTable.CubicMetrePerSecond);
        site.Alternatives[0].Flow.Neighbour = RecordText.Write(neighbour, HeadToWatts.Basis.Units.UnitTable.CubicMetrePerSecond);
        var flow = Build(site).Flow;
        Assert.Equal(whole.DayCount, flow.Record!.DayCount);
        Assert.Equal(whole.MeanM3PerS, flow.Record.MeanM3PerS, 1e-6);
        Assert.Contains("days measured at the site", flow.Origin!.Notes[0], StringComparison.Ordinal);
    }

    private static StudyDocument WithRecord() => DemoSites.All.Select(s => s.Load()).First(d => d.Alternatives[0].Flow.Record is not null);

    private static HeadToWatts.Studies.Inputs.AlternativeInput Build(StudyDocument site) => StudyBuilder.Build(site, NoFlowFiles.Instance).Value.Alternatives[0];
}
