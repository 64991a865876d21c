using HeadToWatts.Basis.Quantities;
using HeadToWatts.EnergyYield;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies;

/// <summary>Where levels move, the head for which the machine is chosen: that of the design flow, in the middle month of the season.</summary>
internal static class RatedHead
{
    private const double LeastHeadM = 0.05;

    /// <summary>The head before the design flow is known: at the given design flow, or at the flow exceeded 30 percent of the year.</summary>
    internal static AlternativeInput Settle(AlternativeInput input)
    {
        if (!input.Head.Moves)
            return input;
        if (input.Flow.DesignFlowM3PerS is { } given)
            return At(input, given);
        var supply = new FlowSupply(input.Flow.EnergyCurve(), input.Flow.Allocation);
        return At(input, supply.UsableAtM3PerS(DesignFlowScan.LeastShareOfLastKw));
    }

    /// <summary>The head at a usable flow.</summary>
    internal static AlternativeInput At(AlternativeInput input, double usableFlowM3PerS)
    {
        var month = MiddleMonth(input.Flow);
        var moving = new MovingHead(input.Head.Headwater, input.Head.Tailwater, input.Flow.Allocation, month);
        var headwater = moving.HeadwaterM(usableFlowM3PerS);
        var tailwater = moving.TailwaterM(usableFlowM3PerS);
        // A drowned fall still needs a head to speak of; the year's integral uses the true one.
        var gross = GrossHead.FromMetres(Math.Max(headwater - tailwater, LeastHeadM));
        return input with { Head = input.Head with { Gross = gross, HeadwaterM = headwater, TailwaterM = headwater - gross.Metres } };
    }

    /// <summary>The middle one of the months in which the plant may run.</summary>
    internal static int MiddleMonth(FlowInput flow)
    {
        var months = Enumerable.Range(1, 12).Where(flow.Season.RunsInMonth).ToList();
        return months.Count is 0 or 12 ? 7 : months[months.Count / 2];
    }
}
