using HeadToWatts.Basis.Units;
using HeadToWatts.Files.Demonstrations;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Files.Tests.StudyFiles;

public class RecordTests
{
    [Fact]
    public void Days_put_into_a_study_read_back_as_the_same_record()
    {
        double[] cfs = [3.5, 0, double.NaN, 120, 0.001];
        var unit = UnitTable.CubicFootPerSecond;
        var document = RecordText.Write(new DailyRecord(new DateOnly(2020, 2, 27), [.. cfs.Select(unit.ToHeld)], ""), unit);
        Assert.Equal("3.5 0 - 120 0.001", document.Days);
        var text = Samples.With("\"curve\": [", "\"record\": { \"unit\": \"cfs\", \"firstDay\": \"2020-02-27\", \"days\": \"" + document.Days + "\" }, \"curveX\": [");
        text = System.Text.RegularExpressions.Regex.Replace(text, "\"curveX\": \\[[^\\]]*\\],", "");
        var record = Samples.Input(text).Alternatives[0].Flow.Record!;
        Assert.Equal(new DateOnly(2020, 3, 2), record.LastDay);
        Assert.Equal(1, record.MissingCount);
        Assert.Equal(unit.ToHeld(120), record.Flows[3], 12);
    }

    [Fact]
    public void A_named_file_is_read_beside_the_study_and_nowhere_else()
    {
        var folder = Repository.Path("sitedata", "larkspur-drop");
        var good = FolderFlowFiles.In(folder).Read(new RecordDocument { File = "flow.csv" }, "record.file");
        // 2011-01-01 to 2022-12-31 is 12 years with 3 leap days.
        Assert.Equal((12 * 365) + 3, good.Value.DayCount);
        Assert.Equal(13, good.Value.MissingCount);
        Assert.False(FolderFlowFiles.In(folder).Read(new RecordDocument { File = "../../README.md" }, "record.file").IsGood);
        Assert.False(FolderFlowFiles.In(folder).Read(new RecordDocument { File = "absent.csv" }, "record.file").IsGood);
    }

    [Fact]
    public void Every_demonstration_site_builds_on_its_own()
    {
        foreach (var site in DemoSites.All)
            Assert.Empty(StudyBuilder.Build(site.Load(), NoFlowFiles.Instance).Problems);
    }

    [Fact]
    public void Reserved_flow_by_month_is_taken_off_month_by_month()
    {
        var site = DemoSites.All[0].Load();
        site.Alternatives[0].Flow.ReservedFlow = null;
        double Energy(IEnumerable<string> months)
        {
            site.Alternatives[0].Flow.ReservedByMonth = [.. months];
            var result = HeadToWatts.Studies.Study.RunAll(StudyBuilder.Build(site, NoFlowFiles.Instance).Value)[0];
            Assert.Equal(0, result.Energy.Annual.Water.ClosureError, 9);
            return result.Energy.Annual.AnnualEnergyKwh;
        }

        var none = Energy(Enumerable.Repeat("none", 12));
        var july = Energy(Enumerable.Range(1, 12).Select(m => m == 7 ? "60 cfs" : "none"));
        var january = Energy(Enumerable.Range(1, 12).Select(m => m == 1 ? "60 cfs" : "none"));
        var all = Energy(Enumerable.Repeat("60 cfs", 12));
        // The canal is dry in January, so reserving there costs nothing; July costs some, the whole year more. Months by
        // themselves weigh by their length, not by their days with a flow: thirteen days are blank, worth 0.2 percent.
        Assert.InRange(january / none, 0.997, 1.003);
        Assert.True(july < january * 0.99);
        Assert.True(all < july);
        // July's cost is July's alone: the run day by day loses it in that month and no other.
        site.Alternatives[0].Flow.ReservedByMonth = [.. Enumerable.Range(1, 12).Select(m => m == 7 ? "60 cfs" : "none")];
        var days = HeadToWatts.Studies.Study.RunAll(StudyBuilder.Build(site, NoFlowFiles.Instance).Value)[0].Energy.Days!;
        site.Alternatives[0].Flow.ReservedByMonth = [.. Enumerable.Repeat("none", 12)];
        var free = HeadToWatts.Studies.Study.RunAll(StudyBuilder.Build(site, NoFlowFiles.Instance).Value)[0].Energy.Days!;
        for (var m = 0; m < 12; m++)
            Assert.Equal(m == 6, days.Months[m].MeanEnergyKwh < free.Months[m].MeanEnergyKwh * 0.999);
    }

    [Fact]
    public void Reserved_flow_by_month_needs_a_record()
    {
        var months = string.Join(", ", Enumerable.Repeat("\"1 cfs\"", 12));
        Assert.Contains(Samples.Problems(Samples.With("\"reservedFlow\": \"2 cfs\"", "\"reservedByMonth\": [" + months + "]")), p => p.Why.Contains("know no months", StringComparison.Ordinal));
    }
}
