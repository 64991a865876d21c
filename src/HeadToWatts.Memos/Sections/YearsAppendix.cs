using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;

namespace HeadToWatts.Memos.Sections;

/// <summary>The energy of each calendar year of the record.</summary>
internal static class YearsAppendix
{
    public static void Write(MemoContext memo)
    {
        if (memo.Result.Energy.Days is not { Years.Count: > 0 } days || !memo.GivesEnergy)
            return;
        var body = memo.Body;
        body.Appendix("Energy year by year", "years");
        body.Say("The plant run on every day of the record. Days without a flow are left out, so a year that is not whole shows too little; it is not counted among the dry years.");
        body.Table("tab-years", "Energy by calendar year.",
            [new("Year", ColumnAlign.Right), new("Days with a flow", ColumnAlign.Right), new("Energy, MWh", ColumnAlign.Right), new("Whole year", ColumnAlign.Middle)],
            [.. days.Years.Select(y => new TableRow([y.Year.ToString(CultureInfo.InvariantCulture), MemoContext.Count(y.Days), UnitDisplay.Number(y.EnergyKwh / 1000, 4), y.IsWhole ? "yes" : "no"]))]);
    }
}
