using HeadToWatts.Files.FlowFiles;

namespace HeadToWatts.Files.Tests.FlowFiles;

/// <summary>Quirks of the agencies' files, on rows of invented stations.</summary>
public sealed class AgencyFormatTests
{
    private const string RdbHead = "# Data for the following 1 site(s)\n#    USGS 09999999 INVENTED CANAL NEAR NOWHERE\nagency_cd\tsite_no\tdatetime\t1_00060_00003\t1_00060_00003_cd\n5s\t15s\t20d\t14n\t10s\n";

    [Fact]
    public void Rdb_words_are_missing_dry_is_zero_and_stray_tabs_do_no_harm()
    {
        var file = FlowFileReader.ReadText("a.rdb", RdbHead
            + "USGS\t09999999\t2020-01-01\t5.0\tA\t\t\nUSGS\t09999999\t2020-01-02\tIce\tP\nUSGS\t09999999\t2020-01-03\tDry\tA\nUSGS\t09999999\t2020-01-04\t***\nUSGS\t09999999\t2020-01-05\t\t\nUSGS\t09999999\t2020-01-06\t2\tA:e\n", FlowFileOptions.Default).Value;
        Assert.Equal((6, 3, 1), (file.Report.Days, file.Report.Valid, file.Report.Zeros));
        Assert.Equal("USGS 09999999 INVENTED CANAL NEAR NOWHERE", file.Record!.Description);
        Assert.Contains(file.Report.Assumptions, a => a.StartsWith("Dry means no flow", StringComparison.Ordinal));
    }

    [Fact]
    public void Rdb_blocks_of_one_site_are_joined_and_of_two_sites_asked_about()
    {
        const string Block = "agency_cd\tsite_no\tdatetime\t2_00060_00003\t2_00060_00003_cd\n5s\t15s\t20d\t14n\t10s\n";
        var head = RdbHead + "USGS\t09999999\t2020-01-01\t5.0\tA\n" + Block;
        Assert.Equal(2, FlowFileReader.ReadText("a.rdb", head + "USGS\t09999999\t2020-01-02\t6.0\tA\n", FlowFileOptions.Default).Value.Report.Valid);

        var two = head + "USGS\t08888888\t2020-01-02\t6.0\tA\n";
        Assert.Contains("several sites", Assert.Single(FlowFileReader.ReadText("a.rdb", two, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
        Assert.Equal(new DateOnly(2020, 1, 2), FlowFileReader.ReadText("a.rdb", two, new FlowFileOptions(Column: "08888888")).Value.Record!.FirstDay);
    }

    [Theory]
    [InlineData("agency_cd\tsite_no\tdatetime\t1_00060\t1_00060_cd\n", "without their time-zone codes")]
    [InlineData("agency_cd\tsite_no\tdatetime\t1_00065_00003\t1_00065_00003_cd\n", "stage")]
    [InlineData("agency_cd\tsite_no\tdatetime\t1_00060_00003\t1_cd\t2_00060_00003\n", "several columns")]
    [InlineData("agency_cd\tsite_no\twhen\t1_00060_00003\n", "lacks")]
    public void Rdb_without_one_column_of_daily_mean_flow_is_refused_with_the_reason(string header, string why)
    {
        var problem = Assert.Single(FlowFileReader.ReadText("a.rdb", header + "5s\t15s\t20d\t14n\t10s\n", FlowFileOptions.Default).Problems);
        Assert.Contains(why, problem.Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Canadian_level_rows_are_passed_over_and_level_alone_is_refused()
    {
        const string Head = "\uFEFF\uFEFFDaily Discharge (m3/s) (PARAM = 1) and Daily Water Level (m) (PARAM = 2)\r\n ID,PARAM,Date,Value,SYM\r\n";
        var file = FlowFileReader.ReadText("w.csv", Head + "99XX001,1,2020/01/01,5.0,B\r\n99XX001,1,2020/01/02,,\r\n99XX001,1,2020/01/03,4,\r\n99XX001,2,2020/01/01,1.1,\r\n", FlowFileOptions.Default).Value;
        Assert.Equal((3, 3, 2), (file.Report.Rows, file.Report.Days, file.Report.Valid));
        Assert.Equal([new MarkCount("B", 1)], file.Report.Codes);
        Assert.Contains("no row of flow", Assert.Single(FlowFileReader.ReadText("w.csv", Head + "99XX001,2,2020/01/01,1.1,\r\n", FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Reclamation_columns_that_are_no_flow_are_not_read_as_one()
    {
        const string Text = "DateTime,abcd_gd,abcd_qd\n1/31/2020,3.1,50\n2/1/2020,3.2,998877\n2/2/2020,3.2,52\n";
        var file = FlowFileReader.ReadText("r.csv", Text, FlowFileOptions.Default).Value;
        Assert.Equal(("abcd_qd", 2, 1), (file.Report.Column, file.Report.Valid, file.Report.MissingValueRows));
        Assert.Contains("not a flow", Assert.Single(FlowFileReader.ReadText("r.csv", Text, new FlowFileOptions(Column: "abcd_gd")).Problems).Why, StringComparison.Ordinal);
    }
}
