using HeadToWatts.Basis.Units;

namespace HeadToWatts.Drawings.Layout;

/// <summary>Numbers as labels print them.</summary>
internal static class Wording
{
    /// <summary>A quantity without trailing zeros: "66 in" where the three digits of a result would make it "66.0 in".</summary>
    public static string Trimmed(string quantity)
    {
        var space = quantity.LastIndexOf(' ');
        var number = space < 0 ? quantity : quantity[..space];
        return number.Contains('.', StringComparison.Ordinal) ? number.TrimEnd('0').TrimEnd('.') + quantity[number.Length..] : quantity;
    }

    /// <summary>A share of the time in percent; a third digit would be read for precision it does not have.</summary>
    public static string Share(double ratio) => UnitDisplay.Number(ratio * 100, 2) + " %";
}
