using HeadToWatts.Basis.Units;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Cli;

/// <summary>The answer of a study in a few lines, aligned for a terminal and plain enough for a pipe.</summary>
internal static class Summary
{
    internal static void Write(TextWriter output, StudyResult r)
    {
        var show = r.Show();
        var annual = r.Energy.Annual;
        output.WriteLine($"{r.Header.Name}: {r.Input.Name}");
        Line("power at the meter", UnitDisplay.Power(annual.MeterPowerKw), $"installed {UnitDisplay.Power(annual.InstalledPowerKw)}");
        Line("energy in a mean year", UnitDisplay.Energy(annual.AnnualEnergyKwh), r.Energy.Days?.DryYearKwh is { } dry ? $"{UnitDisplay.Energy(dry)} in a dry year" : "");
        Line("three points less", UnitDisplay.Energy(r.Energy.ThreePointsLowerKwh), "with the turbine's efficiency lower by so much at every load");
        Line("plant factor", UnitDisplay.Percent(annual.PlantFactor), $"{UnitDisplay.Number(annual.FullLoadHours)} full-load hours, {UnitDisplay.Number(annual.RunningHours)} h running");
        if (r.Input.Flow.Origin is { } origin)
            output.WriteLine($"  flow not measured      {origin.Grade,12}   {origin.Reason}");
        if (r.Summary?.SevenQTen is { } low)
            Line("7Q10", show.Flow(low.FlowM3PerS), $"Q95 {show.Flow(r.Summary.Q95M3PerS ?? 0)}, mean annual flow {show.Flow(r.Summary.MeanAnnualM3PerS ?? 0)}");
        Line("design flow", show.Flow(r.Flow.DesignFlowM3PerS), $"{(r.Flow.DesignFlowIsSuggested ? "suggested" : "given")}, reached {UnitDisplay.Percent(r.Flow.DesignFlowExceedance)} of the year");
        Line("net head", show.Length(r.Head.NetHeadAtDesignM), $"of {show.Length(r.Head.GrossHeadM)} gross");
        if (r.Canal is { FallOfEnergyM: { } fall } canal)
            Line("canal, energy falls", show.Length(fall), canal.Basin is null ? "" : canal.Basin.HoldsTheJump ? "the basin holds the jump of the full flow" : "the basin does NOT hold the jump of the full flow");
        Line("velocity", show.Velocity(r.Waterway.HighestVelocityMPerS), $"limit {show.Velocity(r.Waterway.VelocityLimitMPerS)}");
        Line("turbine", $"{r.Turbine.Chosen.Type.Name} x {r.Turbine.Chosen.UnitCount}", r.Turbine.Chosen.Fit.IsInside ? "inside its envelope" : "OUTSIDE its envelope");
        if (r.Pumping is { } pumping)
            Line("pumping a year", UnitDisplay.Energy(pumping.Pumping.ElectricKwh), pumping.CoveredInTheMonthKwh is { } covered ? $"{UnitDisplay.Energy(covered)} of it generated in the same month" : "months not known without a daily record");
        if (r.Money is { } money)
        {
            Line("net present value", MoneyText.Amount(money.Measures.NetPresentValueAmount, money.Basis), MoneyText.Terms(money.Flow.Plan));
            Line("capital cost", MoneyText.Amount(money.Costs.TotalAmount, money.Basis), money.Measures.PaybackYears is { } years ? $"paid back after {MoneyText.Years(years)}" : "not paid back");
            Line("rate of return", MoneyText.Rate(money.Measures.Rate), money.Measures.Rate.Statement);
            output.WriteLine($"  {money.Answer.Headline}. {money.Answer.Text}");
        }

        foreach (var caution in CautionRules.For(r, show))
        {
            var mark = caution.Severity switch { Severity.SettleFirst => "settle first", Severity.Weigh => "weigh", _ => "note" };
            output.WriteLine($"  [{mark}] {caution.Title}. {caution.Text}");
        }

        output.WriteLine($"  {StandingCautions.Status}. Local codes govern; licensed professionals must check what is built on it.");

        void Line(string name, string value, string note) =>
            output.WriteLine($"  {name,-22} {value,12}" + (note.Length > 0 ? "   " + note : ""));
    }
}
