using HeadToWatts.Pumping;

namespace HeadToWatts.Studies.Results;

/// <summary>Pumping beside generation.</summary>
/// <param name="Pumping">What the plants take.</param>
/// <param name="GeneratedByMonthKwh">Generated in each month, January first, kWh; null without a daily record, since a curve knows no months.</param>
/// <param name="GeneratedKwh">Generated in a mean year, kWh.</param>
/// <param name="SuctionAvailableM">Suction head of each plant in the order given, m; null where the lift is not given.</param>
public sealed record PumpingSide(PumpingResult Pumping, IReadOnlyList<double>? GeneratedByMonthKwh, double GeneratedKwh, IReadOnlyList<double?> SuctionAvailableM)
{
    /// <summary>Generated less pumped in a month, kWh; null without months.</summary>
    /// <param name="month">1 to 12.</param>
    public double? NetKwh(int month) => GeneratedByMonthKwh is { } months ? months[month - 1] - Pumping.ElectricByMonthKwh[month - 1] : null;

    /// <summary>Electricity of pumping that generation of the same month covers, kWh; null without months.</summary>
    public double? CoveredInTheMonthKwh => GeneratedByMonthKwh is { } months ? months.Zip(Pumping.ElectricByMonthKwh, Math.Min).Sum() : null;
}
