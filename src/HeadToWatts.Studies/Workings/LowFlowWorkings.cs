using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Workings;

internal static class LowFlowWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        if (result.Summary?.SevenQTen is not { } low)
            yield break;
        var least = low.Minima.MinBy(m => m.FlowM3PerS)!;
        yield return new Working(
            "low-flow", StudyStage.Flow, "7Q10", "log Q = μ + K(g) σ",
            $"the lowest mean of {low.Days} successive days in each of {low.Minima.Count} whole years from 1 April; the lowest of all, {show.Flow(least.FlowM3PerS)}, from {least.FirstDay:yyyy-MM-dd}",
            show.Flow(low.FlowM3PerS),
            $"Returns once in {UnitDisplay.Number(low.ReturnPeriodYears)} years on average. {(low.YearsLeftOut > 0 ? $"{low.YearsLeftOut} years without enough days are left out. " : "")}A statistic of this record only.",
            [.. low.Uses.Select(u => u.Method)]);
    }
}
