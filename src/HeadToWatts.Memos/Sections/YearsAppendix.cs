using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>The energy of each day and each year of the record.</summary>
internal static class YearsAppendix
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Energy.Days is not { Years.Count: > 0 } days || !memo.GivesEnergy)
            return;
        var body = memo.Body;
        body.Appendix("Energy year by year", "years");
        body.Say("The plant run on every day of the record. Days without a flow are left out, so a year that is not whole shows too little; it is not counted among the dry years.");
        if (Figures.EnergyCalendar(memo) is { } calendar)
            body.Figure("fig-energy-calendar", calendar, "Every day of the record: its energy as a share of the best day's.");
        body.Table("tab-years", days.YearKind == FlowRecords.Statistics.YearKind.Water ? "Energy by water year, from 1 October, named by the year it ends in." : "Energy by calendar year.",
            [new("Year", ColumnAlign.Right), new("Days with a flow", ColumnAlign.Right), new("Energy, MWh", ColumnAlign.Right), new("Whole year", ColumnAlign.Middle)],
            [.. days.Years.Select(y => new TableRow([y.Year.ToString(CultureInfo.InvariantCulture), MemoContext.Count(y.Days), UnitDisplay.Number(y.EnergyKwh / 1000, 4), y.IsWhole ? "yes" : "no"]))]);
    }
}
