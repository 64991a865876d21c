namespace HeadToWatts.FlowRecords;

/// <summary>Ranks the days of a record and plots them.</summary>
internal static class RecordCurve
{
    public static FlowDurationCurve Build(DailyRecord record, PlottingPosition position, OperatingSeason season) =>
        Plotted(Ranked(record, season), position).ForSeasonShare(season.ShareOfYear);

    /// <summary>The curve of flows in any order, over their own time.</summary>
    public static FlowDurationCurve OfFlows(double[] flows, PlottingPosition position)
    {
        double[] ranked = [.. flows];
        Array.Sort(ranked);
        Array.Reverse(ranked);
        return Plotted(ranked, position);
    }

    private static FlowDurationCurve Plotted(double[] ranked, PlottingPosition position)
    {
        var n = ranked.Length;
        var exceedances = new List<double>();
        var kept = new List<double>();
        for (var first = 0; first < n;)
        {
            var last = first;
            while (last + 1 < n && ranked[last + 1] == ranked[first])
                last++;
            Point(position.Exceedance(first + 1, n), ranked[first]);
            if (last > first)
                Point(position.Exceedance(last + 1, n), ranked[first]);
            first = last + 1;
        }

        var rows = new CurvePoint[kept.Count];
        for (var i = 0; i < rows.Length; i++)
            rows[i] = new CurvePoint(exceedances[i], kept[i]);

        if (exceedances[0] > 0)
        {
            exceedances.Insert(0, 0);
            kept.Insert(0, ranked[0]);
        }

        if (exceedances[^1] < 1)
            Point(1, ranked[^1]);
        return new FlowDurationCurve([.. exceedances], [.. kept], rows, BeyondLastRow.Hold);

        void Point(double exceedance, double flowM3PerS)
        {
            exceedances.Add(exceedance);
            kept.Add(flowM3PerS);
        }
    }

    /// <summary>Every day of the season holds an equal share of it: steps in place of lines.</summary>
    public static FlowDurationCurve Steps(DailyRecord record, OperatingSeason season)
    {
        var ranked = Ranked(record, season);
        var n = ranked.Length;
        var exceedances = new List<double>();
        var kept = new List<double>();
        for (var first = 0; first < n;)
        {
            var last = first;
            while (last + 1 < n && ranked[last + 1] == ranked[first])
                last++;
            exceedances.Add((double)first / n);
            kept.Add(ranked[first]);
            exceedances.Add((double)(last + 1) / n);
            kept.Add(ranked[first]);
            first = last + 1;
        }

        var rows = new CurvePoint[kept.Count];
        for (var i = 0; i < rows.Length; i++)
            rows[i] = new CurvePoint(exceedances[i], kept[i]);
        return new FlowDurationCurve([.. exceedances], [.. kept], rows, BeyondLastRow.Hold).ForSeasonShare(season.ShareOfYear);
    }

    // The valid days of the season, largest flow first.
    private static double[] Ranked(DailyRecord record, OperatingSeason season)
    {
        var flows = record.Flows;
        var ranked = new double[record.ValidCount];
        var n = 0;
        for (var i = 0; i < flows.Length; i++)
        {
            if (!double.IsNaN(flows[i]) && season.Runs(record.MonthOf(i), record.DayOfMonthOf(i)))
                ranked[n++] = Math.Max(0, flows[i]);
        }

        if (n == 0)
            throw new ArgumentException("The record has no valid day in the season.", nameof(record));
        Array.Resize(ref ranked, n);
        Array.Sort(ranked);
        Array.Reverse(ranked);
        return ranked;
    }
}
