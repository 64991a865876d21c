using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Studies;
using HeadToWatts.Web.Sessions;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>The stages of the worksheet, in the order in which water becomes a memo.</summary>
public static class StageDefinitions
{
    /// <summary>The stages.</summary>
    public static IReadOnlyList<StageDefinition> All { get; } =
    [
        new("flow", "Flow", typeof(FlowStage), StudyStage.Flow, (s, r) => $"mean {s.Show.Flow(r.Flow.MeanFlowM3PerS)}", ["flow"]),
        new("head", "Head", typeof(HeadStage), StudyStage.Head, (s, r) => $"{s.Show.Length(r.Head.GrossHeadM)} gross", ["head", "site"]),
        new("waterway", "Waterway", typeof(WaterwayStage), StudyStage.Waterway, (s, r) => $"{s.Show.Length(r.Waterway.AtDesign.TotalLossM)} lost, {UnitDisplay.Percent(r.Waterway.LossShareOfGrossHead)}", ["waterway"]),
        new("turbine", "Turbine", typeof(TurbineStage), StudyStage.Turbine, (_, r) => $"{AnswerFigures.ShortName(r.Turbine.Chosen.Type.Name)}, {Count(r.Turbine.Chosen.UnitCount)}", ["turbine", "site.gridFrequency"]),
        new("energy", "Energy", typeof(EnergyStage), StudyStage.Energy, (_, r) => $"{UnitDisplay.Energy(r.Energy.Annual.AnnualEnergyKwh)} a year", ["losses", "flow.designFlow"]),
        new("pumping", "Pumping", typeof(PumpingStage), StudyStage.Pumping, (_, r) => r.Pumping is { } p ? $"{UnitDisplay.Energy(p.Pumping.ElectricKwh)} a year" : "not entered", ["pumping"]),
        new("money", "Money", typeof(MoneyStage), StudyStage.Money, (_, r) => r.Money is { } m ? m.Answer.Headline.ToLowerInvariant() : "not entered", ["money"]),
        new("cautions", "Cautions", typeof(CautionsStage), null, (s, _) => s.Cautions.Count == 0 ? "none but the standing" : $"{s.Cautions.Count} to read", []),
        new("memo", "Memo", typeof(MemoStage), null, (_, _) => "to take away", []),
    ];

    /// <summary>The stage with this key, or the first.</summary>
    /// <param name="key">Key from the address.</param>
    public static StageDefinition Find(string? key) => All.FirstOrDefault(s => string.Equals(s.Key, key, StringComparison.OrdinalIgnoreCase)) ?? All[0];

    /// <summary>The stage that holds the field of a problem; what belongs to none is in the heading, on the memo's page.</summary>
    /// <param name="problem">The problem.</param>
    public static StageDefinition Of(Problem problem)
    {
        ArgumentNullException.ThrowIfNull(problem);
        return All.SelectMany(s => s.Fields.Select(f => (Stage: s, Field: StudySession.Prefix + f)))
            .Where(x => problem.Where == x.Field || problem.Where.StartsWith(x.Field + ".", StringComparison.Ordinal) || problem.Where.StartsWith(x.Field + "[", StringComparison.Ordinal))
            .OrderByDescending(x => x.Field.Length)
            .Select(x => x.Stage)
            .FirstOrDefault() ?? All[^1];
    }

    private static string Count(int units) => units == 1 ? "one unit" : $"{units} units";
}
