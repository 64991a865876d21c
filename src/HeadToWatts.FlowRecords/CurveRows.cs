using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords;

/// <summary>Turns given rows into a curve, or lists all that is wrong with them.</summary>
internal static class CurveRows
{
    public static Checked<FlowDurationCurve> Build(
        IReadOnlyList<CurvePoint> rows, BeyondLastRow beyond, string where, IReadOnlyList<CurveRowOrigin>? origins)
    {
        var problems = new List<Problem>();
        if (rows.Count < 2)
        {
            problems.Add(new Problem(where, $"{Text(rows.Count)} row{(rows.Count == 1 ? "" : "s")}", "a flow-duration curve needs at least two rows",
                "two or more rows of percent of time exceeded and flow"));
        }

        var usable = new List<int>(rows.Count);
        for (var i = 0; i < rows.Count; i++)
        {
            var (exceedance, flowM3PerS) = rows[i];
            var before = problems.Count;
            if (!double.IsFinite(exceedance))
                Add(i, "the percent of time exceeded is not a number", "0 to 100 percent");
            else if (exceedance is < 0 or > 1)
                Add(i, $"{Text(exceedance * 100)} percent of the time is outside 0 to 100", "0 to 100 percent");
            if (!double.IsFinite(flowM3PerS))
                Add(i, "the flow is not a number", "a flow of zero or more");
            else if (flowM3PerS < 0)
                Add(i, "the flow is negative", "a flow of zero or more");
            if (problems.Count == before)
                usable.Add(i);
        }

        // A table may run from 100 percent down; only the order of its flows matters.
        usable.Sort((a, b) => rows[a].Exceedance != rows[b].Exceedance ? rows[a].Exceedance.CompareTo(rows[b].Exceedance) : a.CompareTo(b));
        for (var k = 1; k < usable.Count; k++)
        {
            var (one, two) = (rows[usable[k - 1]], rows[usable[k]]);
            if (one.Exceedance == two.Exceedance && one.FlowM3PerS != two.FlowM3PerS)
                Add(usable[k], $"{Text(two.Exceedance * 100)} percent is given twice with different flows, here and in {Where(usable[k - 1])}", "one flow for each percent");
            else if (two.FlowM3PerS > one.FlowM3PerS)
                Add(usable[k], $"the flow rises from {Text(one.Exceedance * 100)} to {Text(two.Exceedance * 100)} percent of the time exceeded (the other is {Where(usable[k - 1])})", "flows that stay or fall as the percent rises");
        }

        if (problems.Count == 0 && rows.All(r => r.Exceedance == rows[0].Exceedance))
            problems.Add(new Problem(where, $"{Text(rows.Count)} rows", "all rows have the same percent of time exceeded", "two or more different percents"));
        if (problems.Count > 0)
            return Checked.Refused<FlowDurationCurve>(problems);

        var exceedances = new List<double>(rows.Count + 3);
        var flows = new List<double>(rows.Count + 3);
        foreach (var i in usable)
        {
            var (exceedance, flowM3PerS) = rows[i];
            if (exceedances.Count == 0 && exceedance > 0)
                Point(0, flowM3PerS);
            if (exceedances.Count == 0 || exceedance != exceedances[^1])
                Point(exceedance, flowM3PerS);
        }

        if (exceedances[^1] < 1)
        {
            if (beyond == BeyondLastRow.Dry && flows[^1] > 0)
                Point(exceedances[^1], 0);
            Point(1, flows[^1]);
        }

        return Checked.Of(new FlowDurationCurve([.. exceedances], [.. flows], [.. rows], beyond));

        void Point(double exceedance, double flowM3PerS)
        {
            exceedances.Add(exceedance);
            flows.Add(flowM3PerS);
        }

        void Add(int row, string why, string accepted) =>
            problems.Add(new Problem(Where(row), Read(row), why, accepted));

        string Where(int row) => origins is not null && row < origins.Count ? origins[row].Where : $"{where} row {Text(row + 1)}";

        string Read(int row) => origins is not null && row < origins.Count
            ? origins[row].Read
            : $"{Text(rows[row].Exceedance * 100)} %, {Text(rows[row].FlowM3PerS)} m3/s";
    }

    private static string Text(double value) => value.ToString("0.######", CultureInfo.InvariantCulture);
}
