using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Hydraulics.Waterways;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;
using HeadToWatts.Turbines;

namespace HeadToWatts.Studies;

/// <summary>Runs the stop of a study's plant at its design flow.</summary>
internal static class PlantStop
{
    private const double ShareOfRating = 0.9;

    internal static StopResult? Of(AlternativeInput input, SiteConditions site, WaterwayLosses losses, IReadOnlyList<EnergySection> lines, SurgeResult? surge, TurbineType type)
    {
        if (input.Waterway.Stop is not { } stop || surge is null || losses.Elements.Any(e => e.Element.LengthM <= 0))
            return null;
        var gamma = site.SpecificWeightNPerM3;
        TransientPipe[] pipes = [.. losses.Elements.Select((e, i) => new TransientPipe(
            e.Element.Name, e.Element.LengthM, e.Element.AreaM2, surge.Elements[i].WaveSpeedMPerS,
            e.FrictionLossM + e.Fittings.Where(f => f.Fitting.Place != FittingPlace.Exit).Sum(f => f.LossM),
            lines[(2 * i) + 1].CentreElevationM, lines[(2 * i) + 2].CentreElevationM))];
        var transient = new TransientCase(
            pipes, losses.FlowM3PerS, input.Head.HeadwaterM, input.Head.TailwaterM, site.GravityMPerS2, (site.Water.VapourPressurePa - site.AtmosphericPressurePa) / gamma);
        if (!transient.IsSound)
            return null;
        var ratio = stop.RunawayFlowRatio ?? RunawayFlows.UsualRatio(type);
        var manoeuvre = new StopManoeuvre(stop.ClosureTimeS, stop.Law, 0, ratio, stop.RunawayTimeS ?? RunawayFlows.UsualTimeS);
        var run = TransientRun.Of(transient, manoeuvre);
        StopInPipe[] extremes = [.. surge.Elements.Select((e, i) => new StopInPipe(
            e.Element, e.WaveSpeedMPerS, e.StaticPressurePa,
            gamma * run.Nodes.Where(n => n.PipeIndex == i).Max(n => n.HighestPressureHeadM),
            gamma * run.Nodes.Where(n => n.PipeIndex == i).Min(n => n.LowestPressureHeadM)))];
        var limit = Limit(stop, transient, losses.Elements[^1].Element, gamma);
        List<MethodUse> uses = [Characteristics.Method.Used()];
        if (limit?.MichaudTimeS is not null)
            uses.AddRange([Michaud.Method.Used(), AllieviClosure.Method.Used()]);
        return new StopResult(stop, run, extremes, limit, stop.RunawayFlowRatio is null, uses);
    }

    private static StopLimit? Limit(StopInput stop, TransientCase transient, PipeElement last, double gammaNPerM3)
    {
        if ((stop.PressureLimitPa ?? ShareOfRating * last.PressureRatingPa) is not { } limitPa)
            return null;
        var limitHeadM = transient.Pipes[^1].EndCentreM + (limitPa / gammaNPerM3);
        var riseM = limitHeadM - transient.HeadwaterM;
        double? michaudS = null, allieviS = null;
        if (riseM > 0)
        {
            // Both hold for closings slower than the wave's return; a faster one gives Joukowsky's rise, which may already keep the limit.
            var returnS = 2 * transient.TravelTimeS;
            michaudS = Math.Max(2 * transient.MomentumM2PerS / (transient.GravityMPerS2 * riseM), returnS);
            allieviS = Math.Max(AllieviClosure.TimeS(transient.MomentumM2PerS, transient.HeadwaterM - transient.TailwaterM, riseM, transient.GravityMPerS2), returnS);
        }

        return new StopLimit(limitPa, stop.PressureLimitPa is not null, limitHeadM, riseM, michaudS, allieviS);
    }
}
