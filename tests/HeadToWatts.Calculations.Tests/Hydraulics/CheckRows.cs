namespace HeadToWatts.Calculations.Tests.Hydraulics;

/// <summary>Short ways to the rows of a method's check-value files, and to spans of values.</summary>
internal static class CheckRows
{
    /// <summary>The rows of one file of a method; fails when there is none.</summary>
    public static IReadOnlyList<CheckRow> Of(string methodId, string file)
    {
        var rows = CheckValueFile.OfMethod(methodId).Single(f => Path.GetFileNameWithoutExtension(f.Path) == file).Rows;
        Assert.NotEmpty(rows);
        return rows;
    }

    /// <summary>The rows of all files of a method that have the column.</summary>
    public static IReadOnlyList<CheckRow> With(string methodId, string column)
    {
        CheckRow[] rows = [.. CheckValueFile.OfMethod(methodId).SelectMany(f => f.Rows).Where(r => r.Has(column))];
        Assert.NotEmpty(rows);
        return rows;
    }

    /// <summary>Values from one end to the other, evenly spaced in their logarithm.</summary>
    public static IEnumerable<double> LogSpan(double from, double to, int count) =>
        Enumerable.Range(0, count).Select(i => i == count - 1 ? to : from * Math.Pow(to / from, i / (count - 1.0)));

    public static double Rad(double degrees) => degrees * Math.PI / 180;
}
