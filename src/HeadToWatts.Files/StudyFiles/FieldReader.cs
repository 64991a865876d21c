using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Turns the texts of a document into values, gathering problems and assumptions on the way.</summary>
internal sealed class FieldReader(List<Problem> problems)
{
    private readonly List<string> _assumptions = [];

    internal List<Problem> Problems { get; } = problems;

    internal IReadOnlyList<string> Assumptions => _assumptions;

    /// <summary>A quantity that must be there.</summary>
    internal double Quantity(string? text, Dimension dimension, string where, double lowest, double highest) =>
        InRange(QuantityText.Read(text, dimension, null, where), text, dimension, where, lowest, highest) ?? lowest;

    /// <summary>A quantity that may be left out.</summary>
    internal double? Optional(string? text, Dimension dimension, string where, double lowest, double highest) =>
        string.IsNullOrWhiteSpace(text) ? null : InRange(QuantityText.Read(text, dimension, null, where), text, dimension, where, lowest, highest);

    /// <summary>A quantity with a stated default, which is reported when it is used.</summary>
    internal double Assumed(string? text, Dimension dimension, string where, double lowest, double highest, string defaultText, string what)
    {
        if (Optional(text, dimension, where, lowest, highest) is { } given)
            return given;
        if (string.IsNullOrWhiteSpace(text))
            _assumptions.Add($"{what} is not given; {defaultText} is assumed.");
        return QuantityText.Read(defaultText, dimension, null, where).Value;
    }

    /// <summary>A pure number that may be left out.</summary>
    internal double? Number(string? text, string where, double lowest, double highest)
    {
        if (string.IsNullOrWhiteSpace(text))
            return null;
        if (double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && value >= lowest && value <= highest)
            return value;
        Problems.Add(new Problem(where, text, double.IsFinite(value) && value != 0 ? "it lies outside what is possible here" : "it is not a number", $"a number from {lowest.ToString(CultureInfo.InvariantCulture)} to {highest.ToString(CultureInfo.InvariantCulture)}"));
        return null;
    }

    /// <summary>A whole number that may be left out.</summary>
    internal int? Whole(string? text, string where, int lowest, int highest)
    {
        if (string.IsNullOrWhiteSpace(text))
            return null;
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var value) && value >= lowest && value <= highest)
            return value;
        Problems.Add(new Problem(where, text, "a whole number is wanted here", $"{lowest} to {highest}"));
        return null;
    }

    /// <summary>One of a list of names.</summary>
    internal T? Named<T>(string? text, string where, Func<string, T?> find, IEnumerable<string> names)
        where T : class
    {
        if (!string.IsNullOrWhiteSpace(text) && find(text.Trim()) is { } found)
            return found;
        var all = names.ToList();
        var nearest = text is null ? null : NearestName.Of(text, all);
        Problems.Add(new Problem(
            where,
            text ?? "",
            string.IsNullOrWhiteSpace(text) ? "nothing is entered" : nearest is null ? "this name is not known" : $"this name is not known; perhaps '{nearest}' was meant",
            string.Join(", ", all)));
        return null;
    }

    /// <summary>States what was assumed.</summary>
    internal void Assume(string sentence) => _assumptions.Add(sentence);

    internal void Refuse(string where, string? read, string why, string accepted = "") => Problems.Add(new Problem(where, read ?? "", why, accepted));

    private double? InRange(Checked<double> read, string? text, Dimension dimension, string where, double lowest, double highest)
    {
        if (!read.TryGet(Problems, out var value))
            return null;
        if (value >= lowest && value <= highest)
            return value;
        var unit = UnitTable.Of(dimension)[0];
        Problems.Add(new Problem(where, text ?? "", "it lies outside what is possible here", $"{UnitDisplay.In(lowest, unit)} to {UnitDisplay.In(highest, unit)} {unit.Symbol}"));
        return null;
    }
}
