using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.DailyCsv;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.SubDaily;
using MathNet.Numerics.Statistics;

namespace HeadToWatts.Files.Tests.FlowFiles;

/// <summary>
/// Real records against an independent reading (numpy 1.24: counts, and numpy.quantile(method="weibull") of the valid days).
/// Its figures are printed to four decimals, which is the floor of the comparison.
/// </summary>
public sealed class RealRecordTests
{
    [SkippableTheory]
    [InlineData("USGS-04161820", "usgs_04161820.rdb", "usgs-rdb", null)]
    [InlineData("USGS-04208504", "usgs_04208504.rdb", "usgs-rdb", null)]
    [InlineData("USGS-04213000", "usgs_04213000.rdb", "usgs-rdb", null)]
    [InlineData("USGS-04214500", "usgs_04214500.rdb", "usgs-rdb", null)]
    [InlineData("WSC-02GA047", "wsc_02GA047_export.csv", "wsc-daily", null)]
    [InlineData("USBR-MILI_QT", "usbr_MILI.csv", "reclamation-daily", null)]
    [InlineData("USBR-HEII_QD", "usbr_HEII.csv", "reclamation-daily", "heii_qd")]
    [InlineData("USBR-RIR_QD", "usbr_RIR_QD_daily_tab.txt", "reclamation-daily", null)]
    public void Counts_means_and_quantiles_meet_the_oracle(string id, string name, string format, string? column)
    {
        var oracle = ReferenceFlows.Oracle(id);
        using var stream = File.OpenRead(ReferenceFlows.PathOf(name));
        var file = FlowFileReader.Read(name, stream, new FlowFileOptions(Column: column)).Value;
        var (record, report) = (file.Record!, file.Report);

        Assert.Equal(format, file.Format);
        Assert.Equal(oracle.Number("rows"), report.Rows);
        Assert.Equal(oracle.Number("missing_value_rows"), report.MissingValueRows);
        Assert.Equal(oracle.Number("absent_days"), report.AbsentDays);
        Assert.Equal(oracle["unit"] == "cfs" ? UnitTable.CubicFootPerSecond : UnitTable.CubicMetrePerSecond, report.Unit);
        Meets(oracle, record, report.Unit);
    }

    // Computed inflow, with negatives. The oracle leaves out every value at or below -999; five of this column's values lie
    // there (-1487.94 and others) and are data, not marks, so that they are left out here only to compare.
    [SkippableFact]
    public void Computed_inflow_meets_the_oracle_but_for_five_values_it_takes_for_marks()
    {
        using var stream = File.OpenRead(ReferenceFlows.PathOf("usbr_HEII.csv"));
        var file = FlowFileReader.Read("heii.csv", stream, new FlowFileOptions(Column: "heni_qu", AcceptNegatives: true)).Value;
        var oracle = ReferenceFlows.Oracle("USBR-HENI_QU");
        Assert.Equal(oracle.Number("negatives") + 5, file.Report.Negatives);
        Assert.Equal(oracle.Number("valid") + 5, file.Report.Valid);

        var limit = UnitTable.CubicFootPerSecond.ToHeld(-999);
        var without = file.Record!.Flows.ToArray().Select(q => q <= limit ? double.NaN : q);
        Meets(oracle, new DailyRecord(file.Record.FirstDay, [.. without], ""), file.Report.Unit);
    }

    // The oracle's own rule, told to the reader: every value at or below -999 is missing. Then all its figures are met, negatives and all.
    [SkippableFact]
    public void Computed_inflow_meets_the_oracle_in_full_by_a_recipe_that_says_which_values_are_missing()
    {
        using var stream = File.OpenRead(ReferenceFlows.PathOf("usbr_HEII.csv"));
        var recipe = new ReadingRecipe { HeaderRows = 1, DateColumns = ["DateTime"], DateOrder = RecipeDateOrder.MonthDayYear, ValueColumn = "heni_qu", Unit = UnitTable.CubicFootPerSecond, MissingMarks = ["<= -999"] };
        var file = FlowFileReader.Read("heii.csv", stream, new FlowFileOptions(Recipe: recipe, Policies: new RecordPolicies(Negatives: NegativePolicy.Kept))).Value;
        var oracle = ReferenceFlows.Oracle("USBR-HENI_QU");
        Assert.Equal(oracle.Number("rows"), file.Report.Rows);
        Assert.Equal(oracle.Number("missing_value_rows"), file.Report.MissingValueRows);
        Assert.Equal(oracle.Number("negatives"), file.Report.Negatives);
        Meets(oracle, file.Record!, file.Report.Unit);

        // The curve counts a negative flow as none; the quantiles of the days themselves go below zero.
        var valid = file.Record!.Flows.ToArray().Where(q => !double.IsNaN(q)).Select(UnitTable.CubicFootPerSecond.FromHeld).ToArray();
        foreach (var percent in new[] { 1, 2, 5, 10, 20, 25, 30, 40, 50, 60, 70, 75, 80, 90, 95, 99 })
        {
            var expected = oracle.Number($"Q{percent}");
            Assert.Equal(expected, Statistics.QuantileCustom(valid, 1 - (percent / 100.0), QuantileDefinition.Weibull), Math.Max(1e-6 * Math.Abs(expected), 0.5001e-4));
        }
    }

    // The agency's own time-weighted mean of this day stands in its table of daily means.
    [SkippableFact]
    public void Five_minute_values_give_the_daily_mean_that_the_agency_computed()
    {
        var published = File.ReadLines(ReferenceFlows.PathOf("usbr_site68_LindCoulee_wasteway.csv")).Single(l => l.StartsWith("2004-12-19", StringComparison.Ordinal)).Split(',')[1];
        using var stream = File.OpenRead(ReferenceFlows.PathOf("usbr_site68_onefullday.txt"));
        var options = new FlowFileOptions(UnitTable.CubicMetrePerSecond, SubDaily: new SubDailySettings(0.9, TimeSpan.FromHours(12)));
        var file = FlowFileReader.Read("onefullday.txt", stream, options).Value;
        Assert.Equal((new DateOnly(2004, 12, 19), 1), (file.Record!.FirstDay, file.Record.DayCount));
        Assert.Equal(double.Parse(published, CultureInfo.InvariantCulture), file.Record.Flows[0], 1e-6 * file.Record.Flows[0]);
        Assert.Equal(2, file.Report.Quality!.Find(QualityKind.PartialDay)!.Count);
    }

    [SkippableFact]
    public void Comments_and_noon_stamps_do_not_hide_daily_means()
    {
        using var stream = File.OpenRead(ReferenceFlows.PathOf("usbr_site68_LindCoulee_wasteway.csv"));
        var report = FlowFileReader.Read("lind.csv", stream, new FlowFileOptions(UnitTable.CubicFootPerSecond)).Value.Report;
        // 2 January to 19 December of a leap year.
        Assert.Equal((353, 353, 353), (report.Rows, report.Days, report.Valid));
    }

    [SkippableFact]
    public void Every_real_file_of_days_reads_the_same_after_it_is_written()
    {
        foreach (var (name, column) in new[] { ("usgs_04214500.rdb", (string?)null), ("wsc_02GA047_export.csv", null), ("usbr_MILI.csv", null), ("usbr_HEII.csv", "heii_qd") })
        {
            using var stream = File.OpenRead(ReferenceFlows.PathOf(name));
            var file = FlowFileReader.Read(name, stream, new FlowFileOptions(Column: column)).Value;
            var again = FlowFileReader.ReadText(name, DailyCsvWriter.Write(file.Record!, file.Report.Unit), FlowFileOptions.Default).Value.Record!;
            Assert.Equal(file.Record!.FirstDay, again.FirstDay);
            Assert.Equal(file.Record.Flows.ToArray(), again.Flows.ToArray());
        }
    }

    private static void Meets(IReadOnlyDictionary<string, string> oracle, DailyRecord record, UnitOfMeasure unit)
    {
        Assert.Equal(oracle["first"], record.FirstDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));
        Assert.Equal(oracle["last"], record.LastDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));
        Assert.Equal(oracle.Number("calendar_days"), record.DayCount);
        Assert.Equal(oracle.Number("valid"), record.ValidCount);
        Assert.Equal(oracle.Number("negatives"), record.NegativeCount);
        Assert.Equal(oracle.Number("zeros"), record.ZeroCount);
        Near("mean", record.MeanM3PerS);
        Near("min", record.SmallestM3PerS);
        Near("max", record.LargestM3PerS);
        var curve = FlowDurationCurve.FromRecord(record, PlottingPositions.Weibull, OperatingSeason.WholeYear);
        foreach (var percent in new[] { 1, 2, 5, 10, 20, 25, 30, 40, 50, 60, 70, 75, 80, 90, 95, 99 })
            Near($"Q{percent}", curve.FlowAt(percent / 100.0));

        void Near(string column, double actualM3PerS)
        {
            // The curve counts a negative flow as none.
            var expected = column[0] == 'Q' ? Math.Max(0, oracle.Number(column)) : oracle.Number(column);
            var actual = unit.FromHeld(actualM3PerS);
            Assert.True(Math.Abs(actual - expected) <= Math.Max(1e-6 * Math.Abs(expected), 0.5001e-4), $"{oracle["id"]} {column}: expected {expected}, got {actual}");
        }
    }

    [SkippableFact]
    public void Ice_and_equipment_marks_are_missing_and_codes_are_counted()
    {
        using var stream = File.OpenRead(ReferenceFlows.PathOf("usgs_04214500.rdb"));
        var report = FlowFileReader.Read("usgs.rdb", stream, FlowFileOptions.Default).Value.Report;
        Assert.Equal([("Eqp", 1), ("Ice", 63)], report.MissingMarks.Where(m => m.Mark != "(blank)").Select(m => (m.Mark, m.Count)).Order());
        Assert.Equal(1827, report.MissingMarks.Single(m => m.Mark == "(blank)").Count);
        Assert.Contains(report.Codes, c => c.Mark == "A:e");
        Assert.Equal("USGS 04214500 BUFFALO CREEK AT GARDENVILLE NY", report.Description);
    }

    [SkippableFact]
    public void Leading_rows_of_a_missing_mark_are_not_part_of_the_period()
    {
        using var stream = File.OpenRead(ReferenceFlows.PathOf("usbr_RIR_QD_daily_tab.txt"));
        var report = FlowFileReader.Read("rir.txt", stream, FlowFileOptions.Default).Value.Report;
        Assert.Equal(834, report.RowsOutsidePeriod);
        Assert.Contains(report.Assumptions, a => a.Contains("-999 means a missing value", StringComparison.Ordinal));
    }

    [SkippableFact]
    public void A_file_of_several_flows_asks_for_the_column_and_computed_inflow_shows_its_negatives()
    {
        using var one = File.OpenRead(ReferenceFlows.PathOf("usbr_HEII.csv"));
        var which = Assert.Single(FlowFileReader.Read("heii.csv", one, FlowFileOptions.Default).Problems);
        Assert.Contains("heii_qd", which.Read, StringComparison.Ordinal);

        using var two = File.OpenRead(ReferenceFlows.PathOf("usbr_HEII.csv"));
        var negatives = FlowFileReader.Read("heii.csv", two, new FlowFileOptions(Column: "heni_qu")).Problems;
        Assert.Equal(51, negatives.Count);
        Assert.Equal("4,359 more problems", negatives[^1].Read);
    }

    [SkippableFact]
    public void A_real_file_cut_off_or_with_damaged_bytes_is_read_or_refused_and_never_breaks()
    {
        foreach (var name in new[] { "usgs_04214500.rdb", "wsc_02GA047_export.csv", "usbr_HEII.csv", "usbr_RIR_QD_daily_tab.txt" })
        {
            var bytes = File.ReadAllBytes(ReferenceFlows.PathOf(name));
            var random = new Random(name.Length);
            for (var round = 0; round < 6; round++)
            {
                var damaged = bytes[..random.Next(bytes.Length)];
                for (var hit = 0; hit < 20 && damaged.Length > 0; hit++)
                    damaged[random.Next(damaged.Length)] = (byte)random.Next(256);
                using var stream = new MemoryStream(damaged);
                Damage.Survives(FlowFileReader.Read(name, stream, new FlowFileOptions(Column: name.Contains("HEII", StringComparison.Ordinal) ? "2" : null)));
            }
        }
    }

    [SkippableFact]
    public void Times_of_day_in_any_spelling_do_not_hide_a_daily_record()
    {
        using var stream = File.OpenRead(ReferenceFlows.PathOf("quirk_mmddyyyy_hhmm_AMPM.txt"));
        var report = FlowFileReader.Read("ampm.txt", stream, FlowFileOptions.Default).Value.Report;
        Assert.Equal((new DateOnly(1927, 10, 1), 9, 9), (report.FirstDay!.Value, report.Days, report.Valid));
        Assert.Contains(report.Assumptions, a => a.StartsWith("dates are month/day/year", StringComparison.Ordinal));
    }

    // Loggers, ratings and records of several values a day are no daily flows: refused with a reason, never half read.
    [SkippableFact]
    public void Other_files_are_refused_with_a_reason()
    {
        foreach (var name in new[]
        {
            "quirk_StevensLogger.txt", "quirk_csv_mmddyyyy.txt", "quirk_mixedsamples.txt", "quirk_mmddyy.csv",
            "usbr_BICW_rating.txt", "usbr_ETCW_canal_rating.txt", "usbr_Site56_canal_hourly_TOACI1.dat",
        })
        {
            using var stream = File.OpenRead(ReferenceFlows.PathOf(name));
            var read = FlowFileReader.Read(name, stream, new FlowFileOptions(Unit: UnitTable.CubicFootPerSecond));
            Assert.False(read.IsGood, name);
            Assert.All(read.Problems, p => Assert.StartsWith(name, p.Where, StringComparison.Ordinal));
        }
    }
}
