using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Transfer;

/// <summary>Flow carried from a gauge to a site of another drainage area.</summary>
public static class DrainageAreaRatio
{
    /// <summary>The method. Outside the range of ratios the two basins may not run alike.</summary>
    internal static readonly Method Method = new(
        "drainage-area-ratio", "Drainage-area ratio", "Q_u = Q_g (A_u/A_g)^φ", FlowRecordSources.Hortness, "ratios 0.5 to 1.5",
        [new InputRange("A_u/A_g", "drainage area of the site over that of the gauge", "1", 0.5, 1.5), new InputRange("φ", "exponent", "1", 0.7, 1)]);

    /// <summary>True when the ratio lies in the published range of 0.5 to 1.5.</summary>
    /// <param name="ratio">Drainage area of the site over that of the gauge.</param>
    public static bool IsWithinPublishedRange(double ratio) => ratio is >= 0.5 and <= 1.5;

    /// <summary>Carries a record to the site.</summary>
    /// <param name="gauge">Record at the gauge.</param>
    /// <param name="gaugeAreaKm2">Drainage area of the gauge, km2; above 0.</param>
    /// <param name="siteAreaKm2">Drainage area of the site, km2; above 0.</param>
    /// <param name="exponent">φ; 1 takes the flow per area as equal; above 0 and up to 1.5.</param>
    public static TransferredRecord Transfer(DailyRecord gauge, double gaugeAreaKm2, double siteAreaKm2, double exponent = 1)
    {
        ArgumentNullException.ThrowIfNull(gauge);
        Require(gaugeAreaKm2, nameof(gaugeAreaKm2));
        Require(siteAreaKm2, nameof(siteAreaKm2));
        if (!(exponent is > 0 and <= 1.5))
            throw new ArgumentOutOfRangeException(nameof(exponent), exponent, "The exponent lies above 0 and up to 1.5.");
        var ratio = siteAreaKm2 / gaugeAreaKm2;
        var factor = Math.Pow(ratio, exponent);
        var flows = new double[gauge.DayCount];
        for (var i = 0; i < flows.Length; i++)
            flows[i] = gauge.Flows[i] * factor;
        var notes = new List<string> { $"every flow multiplied by {Text(factor)}: ({Text(siteAreaKm2)}/{Text(gaugeAreaKm2)})^{Text(exponent)}" };
        if (!IsWithinPublishedRange(ratio))
            notes.Add($"the ratio of areas {Text(ratio)} lies outside the published range of 0.5 to 1.5");
        return new TransferredRecord(
            new DailyRecord(gauge.FirstDay, flows, $"{gauge.Description}; by drainage-area ratio {Text(ratio)}"),
            FlowConfidence.Low,
            "carried from a gauge by drainage area; nothing was measured at the site",
            notes,
            [Method.Used(new InputSpan("A_u/A_g", ratio, ratio), new InputSpan("φ", exponent, exponent))]);
    }

    private static void Require(double areaKm2, string name)
    {
        if (!(areaKm2 > 0 && double.IsFinite(areaKm2)))
            throw new ArgumentOutOfRangeException(name, areaKm2, "A drainage area is above 0.");
    }

    private static string Text(double value) => value.ToString("0.####", CultureInfo.InvariantCulture);
}
