using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies;

/// <summary>The year as one part, or as twelve where head or reserved flow change with the month.</summary>
/// <param name="Parts">The parts.</param>
/// <param name="Representative">The plant for drawing and for the design point.</param>
/// <param name="PlantOfMonth">The plant in each month, January first.</param>
/// <param name="AllocationOfMonth">The allocation in each month, January first.</param>
internal sealed record YearOfParts(IReadOnlyList<YearPart> Parts, PlantCurve Representative, IReadOnlyList<PlantCurve> PlantOfMonth, IReadOnlyList<WaterAllocation> AllocationOfMonth)
{
    internal static YearOfParts Make(AlternativeInput input, PlantDesign design, FlowSupply supply)
    {
        var flow = input.Flow;
        var allocations = Enumerable.Range(1, 12).Select(flow.AllocationIn).ToList();
        var monthly = input.Head.MovesWithMonth || allocations.Distinct().Count() > 1;
        if (!monthly || flow.Record is null)
        {
            var plant = Plant(input, design, allocations[0], RatedHead.MiddleMonth(flow));
            return new YearOfParts([new YearPart(plant, supply)], plant, [.. Enumerable.Repeat(plant, 12)], allocations);
        }

        var plants = Enumerable.Range(1, 12).Select(m => Plant(input, design, allocations[m - 1], m)).ToList();
        var parts = new List<YearPart>();
        for (var month = 1; month <= 12; month++)
        {
            var days = MonthOf(flow, month);
            if (days is not null)
                parts.Add(new YearPart(plants[month - 1], new FlowSupply(days, allocations[month - 1])));
        }

        return new YearOfParts(parts, plants[RatedHead.MiddleMonth(flow) - 1], plants, allocations);
    }

    private static PlantCurve Plant(AlternativeInput input, PlantDesign design, WaterAllocation allocation, int month) =>
        new(input.Head.Moves ? design with { MovingHead = new MovingHead(input.Head.Headwater, input.Head.Tailwater, allocation, month) } : design);

    // The days of one month that fall into the season, ranked by themselves and given the month's share of the year.
    private static FlowDurationCurve? MonthOf(FlowInput flow, int month)
    {
        var spans = new List<(MonthDay From, MonthDay To)>();
        var last = month switch { 2 => 29, 4 or 6 or 9 or 11 => 30, _ => 31 };
        for (var day = 1; day <= last; day++)
        {
            if (!flow.Season.Runs(month, day))
                continue;
            if (spans.Count > 0 && spans[^1].To.Day == day - 1)
                spans[^1] = (spans[^1].From, new MonthDay(month, day));
            else
                spans.Add((new MonthDay(month, day), new MonthDay(month, day)));
        }

        if (spans.Count == 0)
            return null;
        var season = OperatingSeason.Spans(spans);
        return flow.Record!.ValidDaysIn(season) == 0 ? null : FlowDurationCurve.OfDays(flow.Record, season);
    }
}
