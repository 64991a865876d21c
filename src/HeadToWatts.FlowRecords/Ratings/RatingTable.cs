using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Ratings;

/// <summary>How a rating table is read between its rows.</summary>
public enum RatingInterpolation
{
    /// <summary>Straight lines of flow against stage.</summary>
    Linear,

    /// <summary>Straight lines of the logarithm of flow against that of stage less offset; a piece that starts at no flow, or at the offset, is a straight line of the plain figures.</summary>
    LogLog,
}

/// <summary>A row of a rating table.</summary>
/// <param name="StageM">Stage, m.</param>
/// <param name="FlowM3PerS">Flow, m3/s.</param>
public readonly record struct RatingRow(double StageM, double FlowM3PerS);

/// <summary>A table of flow against stage.</summary>
public sealed class RatingTable : StageRating
{
    private readonly double[] _stages;
    private readonly double[] _flows;

    private RatingTable(IReadOnlyList<RatingRow> rows, RatingInterpolation interpolation, double offsetM)
    {
        Rows = rows;
        Interpolation = interpolation;
        OffsetM = offsetM;
        _stages = [.. rows.Select(r => r.StageM)];
        _flows = [.. rows.Select(r => r.FlowM3PerS)];
    }

    /// <inheritdoc/>
    public override Method Method => Interpolation == RatingInterpolation.LogLog ? RatingMethods.TableLogLog : RatingMethods.TableLinear;

    /// <summary>The rows, stage rising.</summary>
    public IReadOnlyList<RatingRow> Rows { get; }

    /// <summary>How it is read between its rows.</summary>
    public RatingInterpolation Interpolation { get; }

    /// <summary>Stage taken off before the logarithm, m: about the stage of no flow. Without effect on straight lines.</summary>
    public double OffsetM { get; }

    /// <inheritdoc/>
    public override double LowestStageM => _stages[0];

    /// <inheritdoc/>
    public override double HighestStageM => _stages[^1];

    /// <summary>Makes a table from rows in any order, or lists what is wrong with them.</summary>
    /// <param name="rows">Two or more rows; flow never falls as stage rises.</param>
    /// <param name="interpolation">How it is read between its rows.</param>
    /// <param name="offsetM">Stage taken off before the logarithm, m.</param>
    /// <param name="where">Field or file they come from.</param>
    public static Checked<RatingTable> FromRows(IReadOnlyList<RatingRow> rows, RatingInterpolation interpolation, double offsetM, string where)
    {
        ArgumentNullException.ThrowIfNull(rows);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        if (rows.Count < 2)
            problems.Add(new Problem(where, $"{Text(rows.Count)} row{(rows.Count == 1 ? "" : "s")}", "a rating table needs at least two rows", "two or more rows of stage and flow"));
        if (!double.IsFinite(offsetM))
            problems.Add(new Problem(where, Text(offsetM), "the offset is not a number", "a stage"));
        var usable = new List<int>();
        for (var i = 0; i < rows.Count; i++)
        {
            var (stageM, flowM3PerS) = rows[i];
            if (!double.IsFinite(stageM) || !double.IsFinite(flowM3PerS))
                Add(i, "a figure is not a number", "a stage and a flow");
            else if (flowM3PerS < 0)
                Add(i, "the flow is negative", "a flow of zero or more");
            else if (interpolation == RatingInterpolation.LogLog && stageM < offsetM)
                Add(i, $"the stage lies below the offset of {Text(offsetM)} m, where it has no logarithm", "stages at or above the offset");
            else
                usable.Add(i);
        }

        usable.Sort((a, b) => rows[a].StageM != rows[b].StageM ? rows[a].StageM.CompareTo(rows[b].StageM) : a.CompareTo(b));
        var kept = new List<RatingRow>(usable.Count);
        foreach (var i in usable)
        {
            if (kept.Count == 0)
            {
                kept.Add(rows[i]);
                continue;
            }

            var before = kept[^1];
            if (rows[i].StageM == before.StageM && rows[i].FlowM3PerS != before.FlowM3PerS)
                Add(i, $"stage {Text(before.StageM)} m is given twice with different flows", "one flow for each stage");
            else if (rows[i].FlowM3PerS < before.FlowM3PerS)
                Add(i, $"the flow falls as the stage rises from {Text(before.StageM)} m", "flows that stay or rise with the stage");
            else if (rows[i].StageM != before.StageM)
                kept.Add(rows[i]);
        }

        if (problems.Count == 0 && kept.Count < 2)
            problems.Add(new Problem(where, $"{Text(rows.Count)} rows", "all rows have the same stage", "two or more different stages"));
        return problems.Count > 0 ? Checked.Refused<RatingTable>(problems) : Checked.Of(new RatingTable(kept, interpolation, offsetM));

        void Add(int row, string why, string accepted) =>
            problems.Add(new Problem($"{where} row {Text(row + 1)}", $"{Text(rows[row].StageM)} m, {Text(rows[row].FlowM3PerS)} m3/s", why, accepted));
    }

    /// <inheritdoc/>
    public override string Describe() =>
        $"rating table of {Text(Rows.Count)} rows, {Text(LowestStageM)} to {Text(HighestStageM)} m, {(Interpolation == RatingInterpolation.LogLog ? "log-log" : "linear")} between rows";

    /// <inheritdoc/>
    protected override double FlowAt(double stageM)
    {
        // The piece that holds the stage; the first or last piece is carried on outside.
        var i = Array.BinarySearch(_stages, stageM);
        if (i >= 0)
            return _flows[i];
        i = Math.Clamp(~i, 1, _stages.Length - 1);
        var (h1, h2, q1, q2) = (_stages[i - 1], _stages[i], _flows[i - 1], _flows[i]);
        if (Interpolation == RatingInterpolation.LogLog && q1 > 0 && h1 > OffsetM)
        {
            if (stageM <= OffsetM)
                return 0;
            var exponent = Math.Log(q2 / q1) / Math.Log((h2 - OffsetM) / (h1 - OffsetM));
            return q1 * Math.Pow((stageM - OffsetM) / (h1 - OffsetM), exponent);
        }

        return Math.Max(0, q1 + ((q2 - q1) * (stageM - h1) / (h2 - h1)));
    }

    private static string Text(double value) => value.ToString("0.######", CultureInfo.InvariantCulture);
}
