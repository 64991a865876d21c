using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Reserved;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Studies.Workings;

internal static class FlowWorkings
{
    internal static IEnumerable<Working> Of(StudyResult result, UnitDisplay show)
    {
        var flow = result.Flow;
        var input = result.Input.Flow;
        if (input.Record is { } record)
        {
            yield return new Working(
                "duration-curve", StudyStage.Flow, "Flow-duration curve", input.PlottingPosition.Method.Formula,
                $"n = {record.ValidCount.ToString(CultureInfo.InvariantCulture)} days with a flow, {record.FirstDay:yyyy-MM-dd} to {record.LastDay:yyyy-MM-dd}; {record.MissingCount} days without a flow left out; season {input.Season.Describe()}",
                $"mean {show.Flow(flow.MeanFlowM3PerS)}",
                "Days outside the season count as no flow. The plotting position places flows on the chart; energy is summed over the days themselves, each with an equal share of the season.",
                [input.PlottingPosition.Method, FlowRecordMethods.DurationCurve]);
        }
        else if (input.TypedCurve is { } typed)
        {
            var end = typed.EndRule == BeyondLastRow.Hold ? "the last flow holds to 100 %" : "beyond the last row it is dry";
            yield return new Working(
                "duration-curve", StudyStage.Flow, "Flow-duration curve", "Q_{mean} = ∫ Q(p) dp",
                $"{typed.Rows.Count} rows, straight between them; above the first row the first flow holds, and {end}"
                    + (input.RowsAreForSeason && input.Season.ShareOfYear < 1 ? $"; rows count the season ({input.Season.Describe()}, {UnitDisplay.Percent(input.Season.ShareOfYear)} of the year), dry for the rest" : ""),
                $"mean {show.Flow(flow.MeanFlowM3PerS)}", "", [FlowRecordMethods.DurationCurve]);
        }

        if (input.Origin is { } origin)
        {
            yield return new Working(
                "flow-origin", StudyStage.Flow, "Flow carried to the site", origin.Uses.Count > 0 ? origin.Uses[0].Method.Formula : "Q(t) as stated",
                string.Join("; ", origin.Notes), $"mean {show.Flow(flow.MeanFlowM3PerS)}", $"The flow was {origin.Reason}. Confidence: {origin.Grade}.", [.. origin.Uses.Select(u => u.Method)]);
        }

        var split = input.Allocation.Split(flow.MeanFlowM3PerS);
        yield return new Working(
            "usable-flow", StudyStage.Flow, "Flow the plant may use", input.Allocation.RightRateM3PerS is null ? "Q_{use} = Q − Q_{prior} − Q_{res}" : "Q_{use} = min(Q − Q_{prior} − Q_{res}, Q_{right})",
            $"at the mean flow: {show.Flow(flow.MeanFlowM3PerS)} − {show.Flow(split.PriorM3PerS)} − {show.Flow(split.ReservedM3PerS)}",
            show.Flow(split.UsableM3PerS),
            string.Join(" ", Notes(input, show)),
            [.. input.Rules?.Uses.Select(u => u.Method) ?? []]);

        if (flow.DesignFlowIsSuggested)
        {
            yield return new Working(
                "design-flow", StudyStage.Flow, "Design flow, suggested", "ΔE/ΔP ≥ 0.30 × 8760 h",
                DesignFlowWords.Reason(result, show), show.Flow(flow.DesignFlowM3PerS),
                $"Reached {UnitDisplay.Percent(flow.DesignFlowExceedance)} of the year. Cost is not weighed; decision 0006.", []);
        }
        else
        {
            yield return new Working(
                "design-flow", StudyStage.Flow, "Design flow, as given", "Q_d", "given by the author",
                show.Flow(flow.DesignFlowM3PerS), $"Reached {UnitDisplay.Percent(flow.DesignFlowExceedance)} of the year. This project would suggest {show.Flow(flow.Scan.SuggestedM3PerS)}.", []);
        }
    }

    private static IEnumerable<string> Notes(FlowInput input, UnitDisplay show)
    {
        yield return $"Reserved: {WaterWords.Reserved(input, show)}.";
        if (WaterWords.Deliveries(input, show) is { Count: > 0 } deliveries)
            yield return $"First: {string.Join("; ", deliveries)}.";
        if (input.Rules?.Right is not null)
            yield return $"Water right: {WaterWords.Right(input, show)}. What lies beyond it stays in the stream and counts as reserved.";
        if (input.Rules is { Seepage: var loss } && loss != ReachLoss.None)
            yield return $"Lost between gauge and site before all else: {WaterWords.Loss(loss, show)}.";
        yield return "Taken off before the turbine's limit, never after.";
        if (input.AllocationByMonth is not null)
            yield return "Chart and exceedance table show the season's middle month; the energy counts each month's own.";
    }
}
