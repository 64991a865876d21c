using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Memos.Sections;

/// <summary>What was assumed, and what was not checked.</summary>
internal static class LimitsSection
{
    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var result = memo.Result;
        body.Section("Assumptions and limits", "limits");
        body.Add(new CalloutBlock(CalloutKind.Caution, StandingCautions.Status, StandingCautions.Statement, RichText.Empty));
        body.Part("Assumed", "assumed");
        var train = result.Input.Train;
        body.Add(ListBlock.Bullets(
        [
            "Past flows stand for future ones. Nothing is said of a changing climate, of new rights upstream or of changed operation of the canal.",
            result.Input.Head.Moves
                ? "Water levels follow the flow or the month by the ratings given; outside a rating they are held at its end."
                : "Headwater and tailwater levels hold at every flow.",
            $"{(train.IsConstant ? "Constant efficiencies behind the shaft" : "Behind the shaft")}: {ElectricalPart.Given(memo)}; own use {MemoContext.Percent(train.OwnUseRatio)} and {UnitDisplay.Power(train.OwnUseKw)}.",
            $"The plant is fit to run {MemoContext.Percent(train.Availability)} of the time, evenly over the flows.",
            $"Units {(result.Turbine.Units.Sizes.All(s => s == result.Turbine.Units.Sizes[0]) ? "are equal and " : "")}{(result.Turbine.Units.Split == LoadSplit.Best ? "share the flow for most power" : "come in one after another")}; the plant follows the flow without storage.",
            "The year has 365 days and 8760 hours.",
            result.Turbine.EfficiencyIsMakers ? "The manufacturer's efficiencies hold at site." : "The machine bought has the typical efficiency of its type.",
        ]));
        body.Part("Not checked", "not-checked");
        body.Add(ListBlock.Bullets(
        [
            "The site itself: nobody's visit, survey or measurement stands behind this memo unless the author says so.",
            "Soundness of drops, walls, basins, embankments and buildings; ground and foundations.",
            "Capacity of bypass and spillway, and their action when a unit trips.",
            "Pipe wall, supports, anchors, air valves; surge beyond the screening; cavitation and the setting of the machine.",
            "Capacity of the grid at the point of connection, and protection.",
            "Water right, ownership, easements, permits, fish and habitat.",
            "Sediment, weed and ice.",
        ]));
        body.Say("Not in this memo: costs, income, financing, and pumping.");
        var missing = Missing(memo);
        if (missing.Count > 0)
            body.Say(RichText.Of("Some names contain letters that the typeface of this memo lacks. They are printed as question marks; their numbers in Unicode: " + string.Join(", ", missing.Select(c => "U+" + char.ConvertToUtf32(c, 0).ToString("X4", System.Globalization.CultureInfo.InvariantCulture))) + "."), ParagraphKind.Note);
    }

    // Only what the author wrote can hold such letters.
    private static List<string> Missing(MemoContext memo)
    {
        var header = memo.Result.Header;
        var input = memo.Result.Input;
        var texts = new[] { header.Name, header.Place, header.Client, header.Author, header.Date, header.Revision, header.Notes, input.Name, input.Flow.SourceDescription, input.Flow.Record?.Description ?? "" }
            .Concat(input.Waterway.Elements.SelectMany(e => e.Fittings.Select(f => f.Name).Prepend(e.Name)));
        return [.. texts.SelectMany(Layout.Type.Letters.Missing).Select(r => r.ToString()).Distinct().Order(StringComparer.Ordinal)];
    }
}
