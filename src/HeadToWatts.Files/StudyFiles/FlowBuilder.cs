using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.FlowRecords.Statistics;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the flow of an alternative.</summary>
internal static class FlowBuilder
{
    private const double LargestFlowM3PerS = 20_000;

    internal static FlowInput? Build(FlowDocument d, string path, FieldReader read, IFlowFileSource files)
    {
        var before = read.Problems.Count;
        var season = OperatingSeason.WholeYear;
        if (!string.IsNullOrWhiteSpace(d.Season) && OperatingSeason.Parse(d.Season, path + ".season").TryGet(read.Problems, out var parsed))
            season = parsed;

        var position = PlottingPositions.Default;
        if (!string.IsNullOrWhiteSpace(d.PlottingPosition))
            position = read.Named(d.PlottingPosition, path + ".plottingPosition", PlottingPositions.Find, PlottingPositions.All.Select(p => p.Name)) ?? position;

        var years = YearKind.Calendar;
        switch (d.Years?.Trim().ToUpperInvariant())
        {
            case null or "" or "CALENDAR":
                break;
            case "WATER":
                years = YearKind.Water;
                break;
            default:
                read.Refuse(path + ".years", d.Years, "these years are not known", "calendar (from 1 January) or water (from 1 October)");
                break;
        }

        var hasRows = d.Curve is { Count: > 0 };
        string[] given = [.. new[] { (hasRows, "curve"), (d.Record is not null, "record"), (d.MonthlyMeans is { Count: > 0 }, "monthlyMeans"), (d.Schedule is { Count: > 0 }, "schedule"), (d.Measurement is not null, "measurement") }.Where(g => g.Item1).Select(g => g.Item2)];
        if (given.Length != 1)
        {
            read.Refuse(path, "", given.Length > 1 ? $"the flow is given more than once: {string.Join(" and ", given)}" : "no flow is given", "one of curve (rows of exceeded and flow), record, monthlyMeans, schedule, measurement");
            return null;
        }

        var measured = d.Measurement is null ? null : MeasurementBuilder.Measure(d.Measurement, path + ".measurement", read);
        var curve = hasRows ? Curve(d, path, read) : measured is null ? null : MeasurementBuilder.Curve(measured);
        var made = d.MonthlyMeans is { Count: > 0 } ? TransferBuilder.Means(d, path, read) : d.Schedule is { Count: > 0 } ? TransferBuilder.Schedule(d, path, read) : null;
        var record = d.Record is { } r ? Record(r, path + ".record", read, files) : made?.Record;
        if (d.Record is not null && record is not null && TransferBuilder.Carry(d, record, path, read, files) is { } carried)
        {
            made = carried;
            record = new DailyRecord(carried.Record.FirstDay, carried.Record.Flows.ToArray(), carried.Record.Description) { Quality = record.Quality };
        }
        else if (d.Record is null && (d.AreaRatio is not null || d.Neighbour is not null))
        {
            read.Refuse(path + (d.AreaRatio is not null ? ".areaRatio" : ".neighbour"), "", "only a daily record can be carried to the site", "a record");
        }

        if (record is not null && record.ValidDaysIn(season) == 0)
            read.Refuse(path + ".season", d.Season, "no day of the record falls into the season with a flow", "a season that the record covers");
        var forSeason = RowsAreForSeason(d, path, season, hasRows, read);
        double? design = IsSuggest(d.DesignFlow) ? null : read.Optional(d.DesignFlow, Dimension.Flow, path + ".designFlow", 1e-5, LargestFlowM3PerS);
        var loss = WaterRulesBuilder.Loss(d.LossToSite, path + ".lossToSite", read);
        var atSite = record is null ? null : loss.At(record);
        var yearCurve = curve is null || (forSeason && season.ShareOfYear < 1) ? null : loss.At(curve);
        var rules = WaterRulesBuilder.Build(d, path, new FlowStatistics(atSite, yearCurve, position), loss, read);
        var days = rules is null ? season : rules.SeasonWithin(season);
        if (days is null)
            read.Refuse(path + ".waterRight.season", d.WaterRight!.Season, "the right has no day within the season of operation", season.Describe());
        else if (curve is not null && rules?.Right is not null && !days.Equals(season))
            read.Refuse(path + ".waterRight.season", d.WaterRight!.Season, "rows of a curve know no days, so the right's days cannot be told from the rest", "a daily record, or rows and a season that count the days of the right only");
        var byMonth = rules is null || days is null ? null : ByMonth(rules, days, d.ReservedByMonth is { Count: > 0 }, record is not null, path, read);
        if (read.Problems.Count > before)
            return null;
        var allocation = rules!.ForMonth(MiddleMonth(days!));
        var stated = !string.IsNullOrWhiteSpace(d.ReservedFlow) || d.ReservedByMonth is { Count: > 0 } || rules.Deliveries.Count > 0 || !string.IsNullOrWhiteSpace(d.PriorDeliveries);
        return new FlowInput(curve is null ? null : loss.At(curve), forSeason, atSite, position, days!, allocation, stated, design, d.Source ?? "") { AllocationByMonth = byMonth, Rules = rules, YearKind = years, Origin = measured is not null ? MeasurementBuilder.Origin(d.Measurement!, measured) : made is null ? null : FlowOrigin.Of(made), Findings = Findings(d.Record, atSite) };
    }

    // What was found when the file was read: of this reading, or as the study kept it beside the days.
    private static IReadOnlyList<string> Findings(RecordDocument? d, DailyRecord? record) => d switch
    {
        { Found: { Count: > 0 } found } => [.. found.Where(f => !string.IsNullOrWhiteSpace(f)).Select(f => f!)],
        { File: not null } when record?.Quality is { } quality => quality.Lines(),
        _ => [],
    };

    // Rules that change between the months of operation need days that have a month.
    private static List<WaterAllocation>? ByMonth(WaterRules rules, OperatingSeason season, bool isByMonth, bool hasRecord, string path, FieldReader read)
    {
        var months = Enumerable.Range(1, 12).Select(rules.ForMonth).ToList();
        var changes = Enumerable.Range(1, 12).Where(season.RunsInMonth).Select(m => months[m - 1]).Distinct().Count() > 1;
        if ((changes || isByMonth) && !hasRecord)
        {
            var where = isByMonth ? ".reservedByMonth" : rules.Reserved.IsSameAllYear ? ".turnouts" : ".reservedFlow";
            read.Refuse(path + where, "", "this changes from month to month, and rows of a curve know no months", "a daily record, or one figure for all months of operation");
            return null;
        }

        return changes || isByMonth ? months : null;
    }

    // The middle one of the months in which the plant may run; July for a plant that runs all year.
    private static int MiddleMonth(OperatingSeason season)
    {
        var months = Enumerable.Range(1, 12).Where(season.RunsInMonth).ToList();
        return months.Count is 0 or 12 ? 7 : months[months.Count / 2];
    }

    internal static bool IsSuggest(string? text) =>
        string.IsNullOrWhiteSpace(text) || text.Trim().Equals("suggest", StringComparison.OrdinalIgnoreCase);

    private static FlowDurationCurve? Curve(FlowDocument d, string path, FieldReader read)
    {
        var rows = new List<CurvePoint>();
        var systems = new HashSet<UnitOfMeasure>();
        var before = read.Problems.Count;
        for (var i = 0; i < d.Curve!.Count; i++)
        {
            var row = d.Curve[i];
            var where = $"{path}.curve[{i}]";
            var exceeded = read.Quantity(row.Exceeded, Dimension.Ratio, where + ".exceeded", 0, 1);
            var flow = read.Quantity(row.Flow, Dimension.Flow, where + ".flow", 0, LargestFlowM3PerS);
            rows.Add(new CurvePoint(exceeded, flow));
            if (UnitOf(row.Flow) is { } unit)
                systems.Add(unit);
        }

        if (systems.Count > 1)
            read.Refuse(path + ".curve", string.Join(" and ", systems.Select(u => u.Symbol)), "the rows mix units of flow; one of them is likely a slip", "one unit for all rows");
        if (read.Problems.Count > before)
            return null;

        var beyond = BeyondLastRow.Hold;
        switch (d.BeyondLastRow?.Trim().ToUpperInvariant())
        {
            case null or "" or "HOLD":
                break;
            case "DRY":
                beyond = BeyondLastRow.Dry;
                break;
            default:
                read.Refuse(path + ".beyondLastRow", d.BeyondLastRow, "this rule is not known", "hold or dry");
                break;
        }

        return FlowDurationCurve.FromRows(rows, beyond, path + ".curve").TryGet(read.Problems, out var curve) ? curve : null;
    }

    private static UnitOfMeasure? UnitOf(string? text)
    {
        if (text is null)
            return null;
        var at = text.TakeWhile(c => char.IsDigit(c) || c is '.' or ' ' or ',' or '+' or '-' or 'e' or 'E').Count();
        return UnitTable.Find(Dimension.Flow, text[at..].Trim());
    }

    internal static DailyRecord? Record(RecordDocument d, string path, FieldReader read, IFlowFileSource files)
    {
        if (!string.IsNullOrWhiteSpace(d.File) == !string.IsNullOrWhiteSpace(d.Days))
        {
            read.Refuse(path, d.File, "a record is either a file or days, not both and not neither", "file, or unit, firstDay and days");
            return null;
        }

        if (!string.IsNullOrWhiteSpace(d.File))
            return files.Read(d, path + ".file").TryGet(read.Problems, out var fromFile) ? fromFile : null;
        if (d.Rating is not null)
        {
            read.Refuse(path + ".rating", d.Rating.Kind, "the days of a study are flows already", "a rating for a file of water levels only");
            return null;
        }

        var count = read.Problems.Count;
        var policies = PolicyBuilder.Policies(d.Policies, path + ".policies", read.Problems);
        if (!RecordText.Read(d, path).TryGet(read.Problems, out var record) || read.Problems.Count > count)
            return null;
        return policies == RecordPolicies.Default ? record : TextPolicies(record, policies, path, read);
    }

    // The days of a study carry no marks; only the policy about gaps can touch them.
    private static DailyRecord? TextPolicies(DailyRecord record, RecordPolicies policies, string path, FieldReader read)
    {
        if (!GapPolicies.Apply(record, policies, path + ".policies.gaps").TryGet(read.Problems, out var done))
            return null;
        var quality = new RecordQuality
        {
            FirstDay = record.FirstDay,
            LastDay = record.LastDay,
            Rows = record.DayCount,
            Days = record.DayCount,
            MissingDays = record.MissingCount,
            LongestGapDays = SeriesChecks.LongestGap(record.Flows),
            ZeroDays = record.ZeroCount,
            FilledDays = done.FilledDays,
            Policies = policies,
            Done = done.Done,
        };
        return new DailyRecord(done.Record.FirstDay, done.Record.Flows.ToArray(), record.Description) { Quality = quality };
    }

    private static bool RowsAreForSeason(FlowDocument d, string path, OperatingSeason season, bool hasRows, FieldReader read)
    {
        switch (d.RowsAreFor?.Trim().ToUpperInvariant())
        {
            case "SEASON":
                return true;
            case "YEAR":
                return false;
            case null or "":
                if (hasRows && !season.IsWholeYear)
                    read.Refuse(path + ".rowsAreFor", "", "with a season, say whether the percentages count the season's days or the whole year's", "season or year");
                return false;
            default:
                read.Refuse(path + ".rowsAreFor", d.RowsAreFor, "this is not known", "season or year");
                return false;
        }
    }
}
