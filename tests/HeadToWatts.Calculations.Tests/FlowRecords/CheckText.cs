using System.Globalization;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

/// <summary>Lists written into one cell of a check-value file.</summary>
internal static class CheckText
{
    public static double[] Numbers(this CheckRow row, string column) =>
        [.. row.Text(column).Split(';').Select(t => double.Parse(t, NumberStyles.Float, CultureInfo.InvariantCulture))];

    public static IReadOnlyList<CheckRow> Rows(string methodId)
    {
        CheckRow[] rows = [.. CheckValueFile.OfMethod(methodId).SelectMany(f => f.Rows)];
        Assert.NotEmpty(rows);
        return rows;
    }
}
