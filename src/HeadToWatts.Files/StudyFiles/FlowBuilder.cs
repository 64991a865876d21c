using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Quality;
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

        var hasRows = d.Curve is { Count: > 0 };
        if (hasRows == d.Record is not null)
        {
            read.Refuse(path, "", hasRows ? "rows of a curve and a record are both given" : "no flow is given", "either curve (rows of exceeded and flow) or record");
            return null;
        }

        var curve = hasRows ? Curve(d, path, read) : null;
        var record = d.Record is { } r ? Record(r, path + ".record", read, files) : null;
        if (record is not null && record.ValidDaysIn(season) == 0)
            read.Refuse(path + ".season", d.Season, "no day of the record falls into the season with a flow", "a season that the record covers");
        var forSeason = RowsAreForSeason(d, path, season, hasRows, read);
        var (reserved, stated) = Reserved(d.ReservedFlow, path + ".reservedFlow", read);
        var monthly = ByMonth(d, path, record is not null || !hasRows, read);
        var prior = read.Optional(d.PriorDeliveries, Dimension.Flow, path + ".priorDeliveries", 0, LargestFlowM3PerS) ?? 0;
        double? design = IsSuggest(d.DesignFlow) ? null : read.Optional(d.DesignFlow, Dimension.Flow, path + ".designFlow", 1e-5, LargestFlowM3PerS);
        if (read.Problems.Count > before)
            return null;
        var byMonth = monthly?.Select(r => new WaterAllocation(r, prior)).ToList();
        var allocation = byMonth is null ? new WaterAllocation(reserved, prior) : byMonth[MiddleMonth(season) - 1];
        return new FlowInput(curve, forSeason, record, position, season, allocation, stated || monthly is not null || !string.IsNullOrWhiteSpace(d.PriorDeliveries), design, d.Source ?? "") { AllocationByMonth = byMonth };
    }

    // The middle one of the months in which the plant may run; July for a plant that runs all year.
    private static int MiddleMonth(OperatingSeason season)
    {
        var months = Enumerable.Range(1, 12).Where(season.RunsInMonth).ToList();
        return months.Count is 0 or 12 ? 7 : months[months.Count / 2];
    }

    private static List<ReservedFlow>? ByMonth(FlowDocument d, string path, bool hasRecord, FieldReader read)
    {
        if (d.ReservedByMonth is not { Count: > 0 } months)
            return null;
        if (!string.IsNullOrWhiteSpace(d.ReservedFlow))
            read.Refuse(path + ".reservedByMonth", d.ReservedFlow, "reserved flow is given for the year and by month", "one of the two");
        if (!hasRecord)
            read.Refuse(path + ".reservedByMonth", "", "rows of a curve know no months", "a daily record, or one reserved flow for the year");
        if (months.Count != 12)
        {
            read.Refuse(path + ".reservedByMonth", $"{months.Count} flows", "twelve flows are wanted, January first");
            return null;
        }

        return [.. months.Select((text, i) =>
        {
            var where = $"{path}.reservedByMonth[{i}]";
            if (string.IsNullOrWhiteSpace(text))
                read.Refuse(where, text, "nothing is entered", "a flow, a percent of the flow arriving, or none");
            return Reserved(text, where, read).Reserved;
        })];
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

    private static DailyRecord? Record(RecordDocument d, string path, FieldReader read, IFlowFileSource files)
    {
        if (!string.IsNullOrWhiteSpace(d.File) == !string.IsNullOrWhiteSpace(d.Days))
        {
            read.Refuse(path, d.File, "a record is either a file or days, not both and not neither", "file, or unit, firstDay and days");
            return null;
        }

        if (!string.IsNullOrWhiteSpace(d.File))
            return files.Read(d, path + ".file").TryGet(read.Problems, out var fromFile) ? fromFile : null;
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

    private static (ReservedFlow Reserved, bool IsStated) Reserved(string? text, string where, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(text))
            return (ReservedFlow.None, false);
        if (text.Trim().Equals("none", StringComparison.OrdinalIgnoreCase))
            return (ReservedFlow.None, true);
        if (text.Contains('%', StringComparison.Ordinal))
            return (ReservedFlow.PercentOfFlow(read.Optional(text, Dimension.Ratio, where, 0, 1) ?? 0), true);
        return (ReservedFlow.Constant(read.Optional(text, Dimension.Flow, where, 0, LargestFlowM3PerS) ?? 0), true);
    }
}
