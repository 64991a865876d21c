using HeadToWatts.Basis.Units;
using HeadToWatts.Pumping;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A pump whose water may boil on its way in.</summary>
internal sealed class SuctionTooLow() : CautionRule("suction-too-low", StudyStage.Pumping, Severity.SettleFirst, "A pump may cavitate", PumpingMethods.SuctionHead.Source)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        if (result.Pumping is not { } side || result.Input.Pumping is not { } input)
            return null;
        var found = input.Plants.Zip(side.SuctionAvailableM).Where(p => p.Second is { } has && p.First.RequiredSuctionM is { } needs && has < needs).ToList();
        return found.Count == 0 ? null : string.Join(" ", found.Select(p => $"{p.First.Plant.Name} has a suction head of {show.Length(p.Second!.Value)} where its maker requires {show.Length(p.First.RequiredSuctionM!.Value)}.")) + " Set it lower or widen its suction pipe.";
    }
}
