using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords.Quality;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>What daily and sub-daily rows have in common: negatives, estimated values, order, repeats.</summary>
internal static class RowOrder
{
    /// <summary>Applies the policies about single values.</summary>
    /// <returns>How many estimated values were left out.</returns>
    public static int Values(PlacedRow[] rows, RecordRows about, Func<PlacedRow, string> text)
    {
        var policies = about.Options.Chosen;
        var done = policies.Negatives switch
        {
            NegativePolicy.Zeroed => "set to zero",
            NegativePolicy.KeptOut => "kept out",
            NegativePolicy.Kept => "kept; the duration curve counts them as no flow",
            _ => "refused",
        };
        var leftOut = 0;
        for (var i = 0; i < rows.Length; i++)
        {
            var row = rows[i];
            if (!policies.KeepEstimated && (row.Marks & DayMarks.Estimated) != 0 && !double.IsNaN(row.Value))
            {
                leftOut++;
                rows[i] = row = row with { Value = double.NaN };
            }

            // A level below the zero of its gauge is as good as any other.
            if (!(row.Value < 0) || about.Options.Stage is not null)
                continue;
            if (about.Findings.Count(QualityKind.Negative, done))
                about.Findings.Example(QualityKind.Negative, row.FileRow, text(row));
            if (policies.Negatives == NegativePolicy.Zeroed)
                rows[i] = row with { Value = 0 };
            else if (policies.Negatives == NegativePolicy.KeptOut)
                rows[i] = row with { Value = double.NaN };
            else if (policies.Negatives == NegativePolicy.Refused)
                about.Problems.Row(row.FileRow, text(row), "the flow is negative", "zero or more; a computed inflow only with a choice about its negatives: zeroed, kept out, or kept");
        }

        return leftOut;
    }

    /// <summary>Sorts by day or instant; the order of the file decides among equals.</summary>
    /// <returns>How many rows stood before an earlier one.</returns>
    public static int Sort(PlacedRow[] rows, RecordRows about, Func<PlacedRow, string> text)
    {
        var late = 0;
        var latest = long.MinValue;
        foreach (var row in rows)
        {
            if (row.At < latest)
            {
                late++;
                if (about.Findings.Count(QualityKind.OutOfOrder, "put in order"))
                    about.Findings.Example(QualityKind.OutOfOrder, row.FileRow, text(row));
            }

            latest = Math.Max(latest, row.At);
        }

        if (late > 0)
            Array.Sort(rows, (a, b) => a.At != b.At ? a.At.CompareTo(b.At) : a.FileRow.CompareTo(b.FileRow));
        return late;
    }

    /// <summary>Leaves one row for each day or instant. Two flows for one are settled by the policy or a problem; the same flow twice, or a flow and a blank, are not.</summary>
    /// <returns>How many rows remain, at the front.</returns>
    public static int Repeats(PlacedRow[] rows, RecordRows about, string what, Func<PlacedRow, string> text, out int repeats)
    {
        var policy = about.Options.Chosen.Repeats;
        var done = policy switch { RepeatPolicy.First => "the first holds", RepeatPolicy.Last => "the last holds", _ => "refused" };
        var kept = 0;
        repeats = 0;
        foreach (var row in rows)
        {
            if (kept == 0 || rows[kept - 1].At != row.At)
            {
                rows[kept++] = row;
                continue;
            }

            repeats++;
            var before = rows[kept - 1];
            var differs = !double.IsNaN(before.Value) && !double.IsNaN(row.Value) && row.Value != before.Value;
            var kind = differs ? QualityKind.RepeatedDifferent : QualityKind.RepeatedSame;
            if (about.Findings.Count(kind, differs ? done : "counted once"))
                about.Findings.Example(kind, row.FileRow, text(row));
            if (differs && policy == RepeatPolicy.Refused)
            {
                about.Problems.Row(row.FileRow, text(row),
                    $"row {before.FileRow.ToString(CultureInfo.InvariantCulture)} gives another flow for the same {what}, {before.Value.ToString("R", CultureInfo.InvariantCulture)}", $"one flow a {what}, or a choice that the first or the last holds");
            }

            if (double.IsNaN(before.Value) || (differs && policy == RepeatPolicy.Last))
                rows[kept - 1] = row;
        }

        return kept;
    }

    public static double Held(UnitOfMeasure unit, double value) => double.IsNaN(value) ? double.NaN : unit.ToHeld(value);
}
