namespace HeadToWatts.Memos.Sections;

/// <summary>
/// Rounds the parts of a whole so that the printed parts add up to the printed whole: a reader adds the column, and a table that
/// is off by one looks wrong even when it is right.
/// </summary>
internal static class RoundToSum
{
    /// <summary>The parts in multiples of a step, the odd steps given to those nearest to the next one.</summary>
    /// <param name="parts">The parts, zero or more.</param>
    /// <param name="step">The step of rounding.</param>
    public static double[] Of(IReadOnlyList<double> parts, double step)
    {
        var whole = (long)Math.Round(parts.Sum() / step, MidpointRounding.AwayFromZero);
        var floors = parts.Select(p => (long)Math.Floor(p / step)).ToArray();
        var left = whole - floors.Sum();
        foreach (var i in Enumerable.Range(0, parts.Count).OrderByDescending(i => parts[i] / step - floors[i]).ThenBy(i => i))
        {
            if (left <= 0)
                break;
            floors[i]++;
            left--;
        }

        return [.. floors.Select(f => f * step)];
    }

    /// <summary>The step that leaves so many digits in the whole.</summary>
    public static double StepFor(double whole, int digits) => whole <= 0 ? 1 : Math.Pow(10, Math.Floor(Math.Log10(whole)) + 1 - digits);
}
