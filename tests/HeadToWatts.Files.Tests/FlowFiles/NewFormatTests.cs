using System.Globalization;
using System.Text;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.Tests.FlowFiles;

/// <summary>Formats by their published structure, on rows of invented stations.</summary>
public sealed class NewFormatTests
{
    internal const string Nrfa = "file,timestamp,2024-01-01T00:00:00\ndatabase,id,nrfa\nstation,id,99001\nstation,name,Inventwater at Nowhere\nstation,gridReference,AA000000\ndataType,id,gdf\ndataType,name,Gauged Daily Flow\ndataType,parameter,Flow\ndataType,units,m3/s\ndataType,period,day (0900-0900)\ndataType,measurementType,Mean\ndata,first,2000-01-01\ndata,last,2000-01-04\n2000-01-01,25.3\n2000-01-02,\n2000-01-03,24.1,E\n2000-01-04,23.9\n";

    internal const string Grdc = "# Title:                 GRDC STATION DATA FILE\n# Field delimiter:       ;\n# missing values are indicated by -999.000\n#\n# GRDC-No.:              9999999\n# River:                 INVENTED RIVER\n# Station:               NOWHERE\n# Unit of measure:                  m3/s\n# Data lines: 4\n# DATA\nYYYY-MM-DD;hh:mm; Value\n1999-12-30;--:--;   2480.000\n1999-12-31;--:--;   -999.000\n2000-01-01;--:--;   2510.500\n2000-01-02;--:--;      0.000\n";

    internal const string France = "{\n\"count\":3,\"first\":\"x\",\"next\":null,\"data\":[\n{\"code_station\":\"X0000001\",\"date_obs_elab\":\"2020-02-28\",\"resultat_obs_elab\":1250.0,\"libelle_statut\":\"Donnée validée\",\"libelle_qualification\":\"Bonne\",\"grandeur_hydro_elab\":\"QmJ\"},\n{\"code_station\":\"X0000001\",\"date_obs_elab\":\"2020-02-29\",\"resultat_obs_elab\":null,\"libelle_statut\":\"Donnée brute\",\"grandeur_hydro_elab\":\"QmJ\"},\n{\"code_station\":\"X0000001\",\"date_obs_elab\":\"2020-03-01\",\"resultat_obs_elab\":990,\"libelle_statut\":\"Donnée brute\",\"grandeur_hydro_elab\":\"QmJ\"}\n]}\n";

    internal const string InstantHead = "#    USGS 09999999 INVENTED CANAL NEAR NOWHERE\nagency_cd\tsite_no\tdatetime\ttz_cd\t1_00060\t1_00060_cd\n5s\t15s\t20d\t6s\t14n\t10s\n";

    [Fact]
    public void British_files_name_their_unit_and_period_and_flags_are_counted()
    {
        var file = FlowFileReader.ReadText("n.csv", Nrfa, FlowFileOptions.Default).Value;
        Assert.Equal(("nrfa-daily", "NRFA 99001 Inventwater at Nowhere"), (file.Format, file.Record!.Description));
        Assert.Equal([25.3, double.NaN, 24.1, 23.9], file.Record.Flows.ToArray());
        Assert.Equal(1, file.Report.Quality!.EstimatedDays);
        Assert.Contains(file.Report.Assumptions, a => a.Contains("0900-0900", StringComparison.Ordinal));
        Assert.Null(file.Report.Quality.Find(QualityKind.OtherExtent));
    }

    [Fact]
    public void British_files_cut_at_a_line_or_of_rain_are_told()
    {
        var cut = FlowFileReader.ReadText("n.csv", Nrfa[..Nrfa.LastIndexOf("2000-01-04", StringComparison.Ordinal)], FlowFileOptions.Default).Value;
        Assert.Contains("2000-01-04", cut.Report.Quality!.Find(QualityKind.OtherExtent)!.Examples[0].Text, StringComparison.Ordinal);
        var rain = Nrfa.Replace("gdf", "cdr", StringComparison.Ordinal).Replace("Gauged Daily Flow", "Catchment Daily Rainfall", StringComparison.Ordinal).Replace("m3/s", "mm", StringComparison.Ordinal);
        Assert.Contains("not a flow", Assert.Single(FlowFileReader.ReadText("n.csv", rain, FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void Runoff_centre_files_have_their_mark_and_count_their_rows()
    {
        var file = FlowFileReader.ReadText("g.txt", Grdc, FlowFileOptions.Default).Value;
        Assert.Equal(("grdc-daily", "GRDC 9999999 INVENTED RIVER at NOWHERE"), (file.Format, file.Record!.Description));
        Assert.Equal([2480, double.NaN, 2510.5, 0], file.Record.Flows.ToArray());
        Assert.Equal(UnitTable.CubicMetrePerSecond, file.Report.Unit);
        var cut = FlowFileReader.ReadText("g.txt", Grdc[..Grdc.LastIndexOf("2000-01-02", StringComparison.Ordinal)], FlowFileOptions.Default).Value;
        Assert.NotNull(cut.Report.Quality!.Find(QualityKind.OtherExtent));
        Assert.Contains("monthly", Assert.Single(FlowFileReader.ReadText("g.txt", Grdc.Replace("1999-12-30", "1999-12-00", StringComparison.Ordinal), FlowFileOptions.Default).Problems).Why, StringComparison.Ordinal);
    }

    [Fact]
    public void A_runoff_centre_file_in_Western_letters_is_read_and_said_so()
    {
        using var stream = new MemoryStream(Encoding.Latin1.GetBytes(Grdc.Replace("NOWHERE", "KÖLN", StringComparison.Ordinal)));
        var file = FlowFileReader.Read("g.txt", stream, FlowFileOptions.Default).Value;
        Assert.EndsWith("KÖLN", file.Record!.Description, StringComparison.Ordinal);
        Assert.Contains(file.Report.Assumptions, a => a.Contains("8859-1", StringComparison.Ordinal));
    }

    [Fact]
    public void French_days_are_litres_per_second()
    {
        var file = FlowFileReader.ReadText("f.json", France, FlowFileOptions.Default).Value;
        Assert.Equal("france-json", file.Format);
        Assert.Equal([1.25, double.NaN, 0.99], file.Record!.Flows.ToArray());
        Assert.Equal(2, file.Report.Quality!.ProvisionalDays);
    }

    [Theory]
    [InlineData("\"count\":3", "\"count\":40", null)]
    [InlineData("QmJ", "HIXnJ", "not a flow")]
    [InlineData("QmJ", "QmM", "monthly")]
    [InlineData("]}\n", "", "cut off")]
    [InlineData("\"data\"", "\"date\"", "no list")]
    public void French_answers_that_are_pages_levels_or_cut_are_told(string old, string replacement, string? why)
    {
        var text = France.Replace(old, replacement, StringComparison.Ordinal);
        var read = FlowFileReader.ReadText("f.json", why == "cut off" ? text.TrimEnd() : text, FlowFileOptions.Default);
        if (why is null)
            Assert.Contains("40", read.Value.Report.Quality!.Find(QualityKind.OtherExtent)!.Examples[0].Text, StringComparison.Ordinal);
        else
            Assert.Contains(read.Problems, p => p.Why.Contains(why, StringComparison.Ordinal));
    }

    // By hand: flow rises by one each hour of real time, so that its mean over a day of 24 hours of standard time is that at noon,
    // whatever the clock does. The night to 1 November 2020 has the hour from 1:00 to 2:00 twice.
    [Fact]
    public void Instantaneous_flows_go_by_their_zone_codes_through_the_hour_that_occurs_twice()
    {
        var rows = new StringBuilder(InstantHead);
        var start = new DateTime(2020, 10, 31, 5, 0, 0, DateTimeKind.Unspecified);
        for (var quarter = 0; quarter <= 3 * 96; quarter++)
        {
            var utc = start.AddMinutes(15 * quarter);
            var summer = utc < new DateTime(2020, 11, 1, 6, 0, 0, DateTimeKind.Unspecified);
            rows.Append(CultureInfo.InvariantCulture, $"USGS\t09999999\t{utc.AddHours(summer ? -4 : -5):yyyy-MM-dd HH:mm}\t{(summer ? "EDT" : "EST")}\t{quarter / 4.0}\tP\n");
        }

        var file = FlowFileReader.ReadText("i.rdb", rows.ToString(), FlowFileOptions.Default).Value;
        Assert.Equal(new DateOnly(2020, 10, 31), file.Record!.FirstDay);
        var cfs = file.Record.Flows.ToArray().Select(UnitTable.CubicFootPerSecond.FromHeld).ToArray();
        Assert.Equal(12, cfs[0], 9);
        Assert.Equal(36, cfs[1], 9);
        Assert.Equal(60, cfs[2], 9);
        Assert.Equal(0, file.Report.Duplicates + file.Report.OutOfOrder);
        Assert.Equal((TimeSpan.FromMinutes(15), 3), (file.Report.Quality!.Step, file.Report.Quality.ProvisionalDays));
        Assert.Contains(file.Report.Assumptions, a => a.Contains("UTC-05:00, standard time", StringComparison.Ordinal));
    }

    [Fact]
    public void An_unknown_zone_code_is_refused_with_the_known_ones()
    {
        var problem = Assert.Single(FlowFileReader.ReadText("i.rdb", InstantHead + "USGS\t09999999\t2020-10-31 00:00\tXYZ\t5\tP\nUSGS\t09999999\t2020-10-31 00:15\tEDT\t5\tP\n", FlowFileOptions.Default).Problems);
        Assert.Contains("EST", problem.Accepted, StringComparison.Ordinal);
    }
}
