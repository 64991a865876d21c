using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Studies.Worth;

namespace HeadToWatts.Web.Worksheet;

/// <summary>Picks the figures of the running answer from a result.</summary>
public static class AnswerFigures
{
    /// <summary>Key of the figure that counts cautions.</summary>
    public const string CautionsKey = "cautions";

    /// <summary>The figures, in the order in which they stand.</summary>
    /// <param name="result">The study.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    /// <param name="cautions">The cautions of the study.</param>
    public static IReadOnlyList<AnswerFigure> Of(StudyResult result, UnitDisplay show, IReadOnlyList<Caution> cautions)
    {
        ArgumentNullException.ThrowIfNull(result);
        ArgumentNullException.ThrowIfNull(show);
        ArgumentNullException.ThrowIfNull(cautions);
        return [Power(result), Energy(result), PlantFactor(result), NetHead(result, show), Velocity(result, show), Turbine(result), .. Money(result), Cautions(cautions)];
    }

    /// <summary>The same places with nothing in them yet, for a study that cannot be worked out so far.</summary>
    public static IReadOnlyList<AnswerFigure> Empty { get; } =
    [
        new("power", "Power at the meter", "–", "", ""),
        new("energy", "Energy in a mean year", "–", "", ""),
        new("plant-factor", "Plant factor", "–", "", "", OnPhone: false),
        new("net-head", "Net head", "–", "", ""),
        new("velocity", "Velocity", "–", "", "", OnPhone: false),
        new("turbine", "Turbine", "–", "", "", OnPhone: false),
        new(CautionsKey, "Cautions", "–", "", ""),
    ];

    private static AnswerFigure Power(StudyResult result)
    {
        var annual = result.Energy.Annual;
        var (value, unit) = Split(UnitDisplay.Power(annual.MeterPowerKw));
        var waterKw = result.Site.SpecificWeightNPerM3 / 1000 * result.Energy.Plant.At(result.Energy.Plant.BestFlowM3PerS).TurbineFlowM3PerS * result.Head.GrossHeadM;
        return new AnswerFigure("power", "Power at the meter", value, unit, $"from {UnitDisplay.Power(waterKw)} of water power", Exact(annual.MeterPowerKw, "kW"));
    }

    private static AnswerFigure Energy(StudyResult result)
    {
        var kwh = result.Energy.Annual.AnnualEnergyKwh;
        var (value, unit) = UnitDisplay.EnergyParts(kwh);
        var note = result.Input.Flow.Origin is { } origin ? $"flow not measured: {origin.Grade}" : result.Energy.Days switch
        {
            { DryYearKwh: { } dry } => $"{UnitDisplay.Energy(dry)} in a dry year",
            { } => "dry year needs 10 years",
            null => "dry year needs a record",
        };
        return new AnswerFigure("energy", "Energy in a mean year", value, unit, note, Exact(kwh, "kWh"));
    }

    private static AnswerFigure PlantFactor(StudyResult result)
    {
        var annual = result.Energy.Annual;
        return new AnswerFigure("plant-factor", "Plant factor", UnitDisplay.Number(annual.PlantFactor * 100, 2), "%", $"{UnitDisplay.Number(annual.FullLoadHours)} full-load hours", Exact(annual.PlantFactor, ""), OnPhone: false);
    }

    private static AnswerFigure NetHead(StudyResult result, UnitDisplay show)
    {
        var (value, unit) = Split(show.Length(result.Head.NetHeadAtDesignM));
        return new AnswerFigure("net-head", "Net head", value, unit, $"of {show.Length(result.Head.GrossHeadM)} gross", Exact(result.Head.NetHeadAtDesignM, "m"));
    }

    private static AnswerFigure Velocity(StudyResult result, UnitDisplay show)
    {
        if (result.Waterway.AtDesign.Elements.MaxBy(e => e.VelocityMPerS) is not { } fastest)
            return new AnswerFigure("velocity", "Velocity", "–", "", "no pipe", OnPhone: false);
        var (value, unit) = Split(show.Velocity(fastest.VelocityMPerS));
        var material = fastest.Element.Material;
        var usual = $"usual {UnitDisplay.In(material.UsualVelocityLowMPerS, show.VelocityUnit, 2)} to {UnitDisplay.In(material.UsualVelocityHighMPerS, show.VelocityUnit, 2)}";
        return new AnswerFigure("velocity", "Velocity", value, unit, usual, Exact(fastest.VelocityMPerS, "m/s"), OnPhone: false);
    }

    private static AnswerFigure Turbine(StudyResult result)
    {
        var chosen = result.Turbine.Chosen;
        return new AnswerFigure("turbine", "Turbine", ShortName(chosen.Type.Name), "× " + chosen.UnitCount.ToString(CultureInfo.InvariantCulture), chosen.Fit.IsInside ? "inside its envelope" : "outside its envelope", OnPhone: false);
    }

    // Only where costs and income are entered: most studies begin without.
    private static IEnumerable<AnswerFigure> Money(StudyResult result)
    {
        if (result.Money is not { HasCosts: true, HasPrice: true } money)
            yield break;
        var npv = money.Measures.NetPresentValueAmount;
        var note = money.Measures.PaybackYears is { } years ? $"paid back after {MoneyText.Years(years)}" : "never paid back";
        yield return new AnswerFigure("npv", "Net present value", UnitDisplay.Number(npv), money.Basis.Currency, note, Exact(npv, money.Basis.ToString()), OnPhone: false);
    }

    private static AnswerFigure Cautions(IReadOnlyList<Caution> cautions)
    {
        var first = cautions.Count(c => c.Severity == Severity.SettleFirst);
        var note = (cautions.Count, first) switch
        {
            (0, _) => "none beyond the standing ones",
            (_, 0) => "none to settle first",
            _ => $"{first} to settle first",
        };
        return new AnswerFigure(CautionsKey, "Cautions", cautions.Count.ToString(CultureInfo.InvariantCulture), "", note, IsCaution: true);
    }

    /// <summary>The name without what stands after a comma or in brackets, for tight places.</summary>
    public static string ShortName(string name)
    {
        ArgumentNullException.ThrowIfNull(name);
        var end = name.IndexOfAny([',', '(']);
        return end > 0 ? name[..end].Trim() : name;
    }

    /// <summary>A shown quantity as number and unit.</summary>
    public static (string Value, string Unit) Split(string shown)
    {
        ArgumentNullException.ThrowIfNull(shown);
        var at = shown.LastIndexOf(' ');
        return at < 0 ? (shown, "") : (shown[..at], shown[(at + 1)..]);
    }

    private static string Exact(double value, string unit) => (value.ToString("0.######", CultureInfo.InvariantCulture) + " " + unit).Trim();
}
