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
}
