using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>More than plants in service show.</summary>
internal sealed class HighEfficiency() : CautionRule("high-efficiency", StudyStage.Energy, Severity.Weigh, "Optimistic chain of efficiencies", CautionSources.Practice)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var train = result.Input.Train;
        var behind = result.Energy.Electrical is { } electrical
            ? electrical.AtBest.MeterKw / (electrical.AtBest.DrivenKw / train.DriveEfficiency)
            : train.DriveEfficiency * train.GeneratorEfficiency * train.TransformerEfficiency * train.LineEfficiency;
        var overall = result.Turbine.Efficiency.Peak * behind;
        return overall <= 0.90
            ? null
            : $"Turbine to meter is {UnitDisplay.Percent(overall)} at best. Canal plants in service show 75 to 90 % from net head to output.";
    }
}
