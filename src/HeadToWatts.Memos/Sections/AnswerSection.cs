using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Memos.Sections;

/// <summary>The answer in five lines, and what is least sure about it.</summary>
internal static class AnswerSection
{
    // Unknowns of every scheme, named when the study's own cautions are fewer than three.
    private static readonly (string Id, string Title, string Text)[] Standing =
    [
        ("head", "Head at several flows", "both water levels measured at low, middle and full flow"),
        ("bypass", "The bypass", "whether the whole flow can pass by itself when the machine trips"),
        ("consents", "Consents and grid", "what the owner, the water right and the utility allow"),
    ];

    public static void Write(MemoContext memo)
    {
        var body = memo.Body;
        var result = memo.Result;
        var show = memo.Show;
        body.Section("The answer", "answer");
        if (!memo.GivesEnergy)
        {
            body.Say("With the figures given, this site would make no energy. The cautions say why; what was put in stands in " + RichText.See("inputs") + ".", ParagraphKind.Lead);
        }
        else
        {
            body.Add(Headline(memo));
            body.Add(new ListBlock([Power(memo), Energy(memo), Water(memo), Machine(memo), NextStep(memo)], ["1.", "2.", "3.", "4.", "5."], []));
        }

        // On the first page whatever follows, for it says what the answer is not.
        body.Say(RichText.Of(StandingCautions.Statement), ParagraphKind.Note);
        if (memo.Result.Money is { } money)
            body.Say(RichText.Bold("Whether it pays: " + char.ToLowerInvariant(money.Answer.Headline[0]) + money.Answer.Headline[1..] + ". ") + money.Answer.Text + " More in " + RichText.See("money") + ".");
        body.Say(RichText.Bold("The three biggest unknowns"), keepWithNext: true);
        body.Add(ListBlock.Bullets([.. Unknowns(memo)]));
    }

    private static KeyFiguresBlock Headline(MemoContext memo)
    {
        var result = memo.Result;
        var show = memo.Show;
        var annual = result.Energy.Annual;
        var power = Split(UnitDisplay.Power(annual.MeterPowerKw));
        var (energy, energyUnit) = UnitDisplay.EnergyParts(annual.AnnualEnergyKwh);
        return new KeyFiguresBlock(
        [
            new("Power at the meter", power.Value, power.Unit, $"at full flow, with {Machines(memo)}"),
            new("Energy in a mean year", energy, energyUnit, DryYear(memo) is { } dry ? $"{dry} in a dry year" : "dry year not known: see below"),
            new("Net head", UnitDisplay.In(result.Head.NetHeadAtDesignM, show.LengthUnit), show.LengthUnit.Symbol, $"of {show.Length(result.Head.GrossHeadM)} gross, at {show.Flow(result.Flow.DesignFlowM3PerS)}"),
            new("Plant factor", UnitDisplay.Number(annual.PlantFactor * 100), "%", $"{UnitDisplay.Number(annual.RunningHours)} h a year running"),
        ]);
    }

    private static RichText Power(MemoContext memo)
    {
        var annual = memo.Result.Energy.Annual;
        return RichText.Bold("Power. ") + $"{UnitDisplay.Power(annual.MeterPowerKw)} at the meter at full flow; {UnitDisplay.Power(annual.InstalledPowerKw)} installed, at the generator.";
    }

    private static RichText Energy(MemoContext memo)
    {
        var annual = memo.Result.Energy.Annual;
        var text = RichText.Bold("Energy. ") + $"{UnitDisplay.Energy(annual.AnnualEnergyKwh)} in a mean year, a plant factor of {UnitDisplay.Percent(annual.PlantFactor)}.";
        if (memo.Result.Energy.WithHeadError is { } range)
            text += $" The head's error alone makes it {UnitDisplay.Energy(range.LowKwh)} to {UnitDisplay.Energy(range.HighKwh)}.";
        if (memo.Result.Input.Flow.Origin is { } origin)
            return text + $" The flow behind it was {origin.Reason}: confidence {origin.Grade}.";
        if (memo.Result.Energy.Days is not { } days)
            return text + " A duration curve alone does not say what a dry year gives.";
        return DryYear(memo) is { } dry
            ? text + $" {dry} in a dry year: so much or more in nine years out of ten."
            : text + $" The record holds {MemoContext.Count(days.WholeYearsKwh.Count, "whole year", "whole years")}, fewer than the ten it takes to speak of a dry year, and its mean is not a long-term mean.";
    }

    private static RichText Water(MemoContext memo)
    {
        var result = memo.Result;
        return RichText.Bold("Water and head. ") + $"Design flow {memo.Show.Flow(result.Flow.DesignFlowM3PerS)}, reached {UnitDisplay.Percent(result.Flow.DesignFlowExceedance)} of the year"
            + (result.Flow.DesignFlowIsSuggested ? " (suggested)" : " (as given)")
            + $"; net head {memo.Show.Length(result.Head.NetHeadAtDesignM)} of {memo.Show.Length(result.Head.GrossHeadM)} gross.";
    }

    private static RichText Machine(MemoContext memo)
    {
        var turbine = memo.Result.Turbine;
        var inside = turbine.Chosen.Fit.IsInside ? "inside the range such machines are built for" : "outside the range such machines are usually built for";
        return RichText.Bold("Turbine. ") + MemoContext.Sentence($"{Machines(memo)}{(turbine.TypeIsSuggested ? ", suggested" : ", as given")}: {inside}. Usual place: {char.ToLowerInvariant(turbine.Chosen.Type.Uses[0])}{turbine.Chosen.Type.Uses[1..]}");
    }

    private static RichText NextStep(MemoContext memo)
    {
        var first = memo.Cautions.Where(c => c.Severity == Severity.SettleFirst).Select(c => c.Title).ToArray();
        var text = first.Length > 0
            ? $"Settle first what the cautions name: {string.Join("; ", first.Select(t => char.ToLowerInvariant(t[0]) + t[1..]))}. Then run this again."
            : "Measure both water levels at several flows, show the bypass, and ask the owner, the water-rights office and the utility. If nothing stops it there, commission a feasibility study.";
        return RichText.Bold("Next step. ") + text;
    }

    private static IEnumerable<RichText> Unknowns(MemoContext memo)
    {
        var own = memo.Cautions
            .Where(c => c.Severity != Severity.Note)
            .Select(c => RichText.Bold(c.Title + ". ") + MemoContext.Sentence(FirstSentence(c.Text)));
        var standing = Standing.Select(s => RichText.Bold(s.Title + ": ") + s.Text + ".");
        return own.Concat(standing).Take(3);
    }

    internal static string Machines(MemoContext memo)
    {
        var chosen = memo.Result.Turbine.Units;
        var name = memo.Result.Turbine.Chosen.Type.Name;
        return chosen.UnitCount == 1 ? $"one {Lower(name)} unit" : $"{chosen.UnitCount} {Lower(name)} units";
    }

    // Machines named after people keep their capital.
    private static string Lower(string name) => name is "Pelton" or "Turgo" or "Francis" or "Kaplan" || name.StartsWith("Archimedes", StringComparison.Ordinal) ? name : char.ToLowerInvariant(name[0]) + name[1..];

    private static string? DryYear(MemoContext memo) => memo.Result.Energy.Days?.DryYearKwh is { } dry ? UnitDisplay.Energy(dry) : null;

    // The first sentence, and the second where the first is too short to say anything.
    private static string FirstSentence(string text)
    {
        const int enough = 60;
        var end = text.IndexOf(". ", StringComparison.Ordinal);
        if (end >= 0 && end < enough)
            end = text.IndexOf(". ", end + 1, StringComparison.Ordinal);
        return end < 0 ? text : text[..(end + 1)];
    }

    private static (string Value, string Unit) Split(string text)
    {
        var at = text.LastIndexOf(' ');
        return (text[..at], text[(at + 1)..]);
    }
}
