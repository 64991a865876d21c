using System.Globalization;
using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;
using HeadToWatts.Memos.Content;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Memos.Sections;

/// <summary>What every section reads from and writes to.</summary>
internal sealed class MemoContext(StudyResult result, UnitDisplay show)
{
    public StudyResult Result { get; } = result;

    public UnitDisplay Show { get; } = show;

    public MemoBuilder Body { get; } = new();

    public IReadOnlyList<Caution> Cautions { get; } = CautionRules.For(result, show);

    /// <summary>Every method behind a figure of the memo, those of the record's summary among them.</summary>
    public IReadOnlyList<MethodUse> Methods { get; } = MethodUse.Union([.. result.MethodsUsed, .. result.Summary?.Uses ?? []]);

    public bool GivesEnergy => Result.Energy.Annual.AnnualEnergyKwh > 0;

    public static string OrElse(string text, string otherwise) => string.IsNullOrWhiteSpace(text) ? otherwise : text.Trim();

    /// <summary>A whole number with thousands apart.</summary>
    public static string Count(int number) => number.ToString("#,##0", CultureInfo.InvariantCulture).Replace(',', '\u202f');

    public static string Count(int number, string one, string many) => Count(number) + " " + (number == 1 ? one : many);

    public static string Percent(double ratio) => UnitDisplay.Percent(ratio);

    /// <summary>A ratio in percent with one decimal, for columns that are compared line by line.</summary>
    public static string PercentColumn(double ratio) => (ratio * 100).ToString("0.0", CultureInfo.InvariantCulture);

    /// <summary>A ratio in percent, whole, for columns.</summary>
    public static string WholePercent(double ratio) => (ratio * 100).ToString("0", CultureInfo.InvariantCulture);

    public string Flow(double flowM3PerS) => UnitDisplay.In(flowM3PerS, Show.FlowUnit);

    public string Length(double lengthM) => UnitDisplay.In(lengthM, Show.LengthUnit);

    /// <summary>A water level with a decimal more than a head needs, so that a small head does not vanish between two high levels.</summary>
    public string Level(double elevationM) => LevelNumber(elevationM) + " " + Show.LengthUnit.Symbol;

    public string LevelNumber(double elevationM) =>
        Show.LengthUnit.FromHeld(elevationM).ToString(Show.System == UnitSystem.US ? "0.0" : "0.00", CultureInfo.InvariantCulture).Replace('-', '−');

    public string Velocity(double velocityMPerS) => UnitDisplay.In(velocityMPerS, Show.VelocityUnit);

    /// <summary>Name and unit of a column, as "Flow, cfs".</summary>
    public static RichText Head(string name, UnitOfMeasure unit) => RichText.Of(name + ", " + unit.Symbol);

    public static string Capital(string text) => text.Length == 0 ? text : char.ToUpperInvariant(text[0]) + text[1..];

    /// <summary>A sentence that begins with a capital and ends with a full stop.</summary>
    public static string Sentence(string text)
    {
        text = text.Trim();
        if (text.Length == 0)
            return text;
        text = char.ToUpperInvariant(text[0]) + text[1..];
        return text[^1] is '.' or '!' or '?' ? text : text + ".";
    }
}
