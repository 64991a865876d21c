using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Studies;

namespace HeadToWatts.Drawings;

public static partial class CurvesChart
{
    /// <summary>All days, operating season, median, dry and wet year; null without a daily record.</summary>
    public static Drawing? DrawYears(StudyResult result, UnitDisplay show, DrawingSize size)
    {
        ArgumentNullException.ThrowIfNull(result);
        return result.Summary is { Curves.Count: > 0 } summary
            ? Draw(new CurvesInput([.. summary.Curves.Select(c => new ComparedCurve(c.Name, c.Curve))], summary.BetweenYearsBand, result.Flow.DesignFlowM3PerS), show, size)
            : null;
    }

    /// <summary>One month against all days; null where the record has no day of the month.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units.</param>
    /// <param name="size">Size.</param>
    /// <param name="month">1 to 12.</param>
    public static Drawing? DrawMonth(StudyResult result, UnitDisplay show, DrawingSize size, int month)
    {
        ArgumentNullException.ThrowIfNull(result);
        if (result.Summary is not { AllDays: { } all } summary || summary.Months.FirstOrDefault(m => m.Month == month) is not { } own)
            return null;
        var name = System.Globalization.CultureInfo.InvariantCulture.DateTimeFormat.GetMonthName(month);
        return Draw(new CurvesInput([new(name, own.Curve), new("all days", all)], [], result.Flow.DesignFlowM3PerS), show, size);
    }
}
