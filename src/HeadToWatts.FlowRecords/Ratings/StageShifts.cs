using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.FlowRecords.Ratings;

/// <summary>A shift that holds from a day on.</summary>
/// <param name="From">First day.</param>
/// <param name="ShiftM">Figure added to the stage before the rating is read, m.</param>
public readonly record struct StageShift(DateOnly From, double ShiftM);

/// <summary>Shifts of a rating: each holds from its day until the next; before the first there is none.</summary>
public sealed class StageShifts
{
    private readonly StageShift[] _shifts;

    private StageShifts(StageShift[] shifts) => _shifts = shifts;

    /// <summary>No shift.</summary>
    public static StageShifts None { get; } = new([]);

    /// <summary>The shifts by day.</summary>
    public IReadOnlyList<StageShift> Shifts => _shifts;

    /// <summary>Makes a list of shifts, or lists what is wrong with it.</summary>
    /// <param name="shifts">Shifts in any order.</param>
    /// <param name="where">Field or file they come from.</param>
    public static Checked<StageShifts> Of(IReadOnlyList<StageShift> shifts, string where)
    {
        ArgumentNullException.ThrowIfNull(shifts);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        StageShift[] ordered = [.. shifts.OrderBy(s => s.From)];
        for (var i = 0; i < ordered.Length; i++)
        {
            var day = ordered[i].From.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);
            var read = day + " " + ordered[i].ShiftM.ToString("0.####", CultureInfo.InvariantCulture) + " m";
            if (!double.IsFinite(ordered[i].ShiftM))
                problems.Add(new Problem(where, read, "the shift is not a number", "a day and a shift"));
            if (i > 0 && ordered[i].From == ordered[i - 1].From)
                problems.Add(new Problem(where, read, "the day has two shifts", "one shift for each day"));
        }

        return problems.Count > 0 ? Checked.Refused<StageShifts>(problems) : Checked.Of(new StageShifts(ordered));
    }

    /// <summary>The shift on a day, m.</summary>
    /// <param name="day">The day.</param>
    public double OnM(DateOnly day)
    {
        var shiftM = 0.0;
        foreach (var shift in _shifts)
        {
            if (shift.From > day)
                break;
            shiftM = shift.ShiftM;
        }

        return shiftM;
    }
}
