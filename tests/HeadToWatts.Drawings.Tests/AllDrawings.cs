using System.Collections.Concurrent;
using HeadToWatts.Basis.Units;
using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Tests;

/// <summary>Every drawing of every scenario at every size, in both families of units.</summary>
public static class AllDrawings
{
    public static readonly IReadOnlyDictionary<string, DrawingSize> Sizes = new Dictionary<string, DrawingSize>
    {
        ["wide"] = DrawingSize.Wide,
        ["half"] = DrawingSize.Half,
        ["phone"] = DrawingSize.Phone,
        ["memo"] = DrawingSize.MemoPage,
    };

    private static readonly ConcurrentDictionary<(string, string, UnitSystem), IReadOnlyList<(string Name, Drawing Drawing)>> Drawn = new();

    /// <summary>Drawn once and kept, since many rules look at the same drawings.</summary>
    public static IReadOnlyList<(string Name, Drawing Drawing)> Of(string scenario, string size, UnitSystem units) =>
        Drawn.GetOrAdd((scenario, size, units), k => Draw(k.Item1, k.Item2, k.Item3));

    public static IReadOnlyList<(string Name, Drawing Drawing)> Draw(string scenario, string size, UnitSystem units)
    {
        var result = Scenarios.Get(scenario);
        var show = result.Show(units);
        var s = Sizes[size];
        var all = new List<(string, Drawing?)>
        {
            ("section", SchemeSection.Draw(result, show, s)),
            ("section at half flow", SchemeSection.Draw(result, show, s, result.Flow.DesignFlowM3PerS / 2)),
            ("section standing", SchemeSection.Draw(result, show, s, 0)),
            ("flow duration", FlowDurationChart.Draw(result, show, s)),
            ("envelope", EnvelopeChart.Draw(result, show, s)),
            ("power", PowerChart.Draw(result, show, s)),
            ("design flow", DesignFlowChart.Draw(result, show, s)),
            ("months", MonthsChart.Draw(result, s)),
            ("pump band", PumpBandChart.Draw(Scenarios.AsPump(result), show, s)),
            ("efficiency", EfficiencyChart.Draw(result, show, s)),
            ("split", SplitChart.Draw(result, show, s)),
            ("heads of a stop", StopHeadsChart.Draw(Scenarios.WithStop(result), show, s)),
            ("time of a stop", StopTimeChart.Draw(Scenarios.WithStop(result), show, s)),
            ("staircase", EnergyStaircaseChart.Draw(result, s)),
            ("levels", LevelsChart.Draw(result, show, s)),
            ("canal drop", CanalDropDrawing.Draw(Scenarios.WithCanal(result), show, s)),
            ("gaps", GapTimeline.Draw(result, s with { Height = 110 })),
            ("pumping", PumpingMonthsChart.Draw([.. Enumerable.Range(1, 12).Select(m => new PumpingMonth(m, m * 900, m is > 4 and < 10 ? 15_000 : 0))], s)),
            ("hydrograph", HydrographChart.Draw(result, show, s)),
            ("calendar of flow", DayCalendar.DrawFlow(result, s)),
            ("calendar of energy", DayCalendar.DrawEnergy(result, s)),
            ("curves of years", CurvesChart.DrawYears(result, show, s)),
            ("curves of July", CurvesChart.DrawMonth(result, show, s, 7)),
            ("cash flow", CashFlowChart.Draw(Scenarios.WithMoney(result), s)),
            ("cost build-up", CostBuildUpChart.Draw(Scenarios.WithMoney(result), s)),
            ("sensitivity", SensitivityBarsChart.Draw(Scenarios.WithMoney(result), s)),
            ("losses", LossShareChart.Draw(result, show, s)),
        };
        return [.. all.Where(d => d.Item2 is not null).Select(d => (d.Item1, d.Item2!))];
    }

    public static TheoryData<string, string, UnitSystem> Cases()
    {
        var data = new TheoryData<string, string, UnitSystem>();
        foreach (var scenario in Scenarios.Names)
        {
            foreach (var size in Sizes.Keys)
            {
                data.Add(scenario, size, UnitSystem.US);
                data.Add(scenario, size, UnitSystem.SI);
            }
        }

        return data;
    }
}
