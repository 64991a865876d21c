using HeadToWatts.Basis;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Statistics;

namespace HeadToWatts.EnergyYield;

/// <summary>Energy of one month of the year, from the days of a record.</summary>
/// <param name="Month">1 to 12.</param>
/// <param name="MeanEnergyKwh">Mean power of the month's days times the hours of the month, kWh.</param>
/// <param name="MeanFlowM3PerS">Mean flow of the month's days, m3/s.</param>
/// <param name="Days">Days of the record in the month that have a flow or lie outside the season; with none the month is not known and its energy stands at zero.</param>
public sealed record MonthEnergy(int Month, double MeanEnergyKwh, double MeanFlowM3PerS, int Days);

/// <summary>Energy of one year of a record.</summary>
/// <param name="Year">Calendar year, or the water or climate year by its name.</param>
/// <param name="EnergyKwh">Energy of the days that have a flow, kWh.</param>
/// <param name="Days">Days of the year that have a flow or lie outside the season.</param>
/// <param name="IsWhole">True when these are at least 95 percent of the year's days.</param>
public sealed record YearEnergy(int Year, double EnergyKwh, int Days, bool IsWhole);

/// <summary>The plant run on every day of a record: months and years. Days without a flow are left out, not read as zero.</summary>
/// <param name="Months">Twelve months.</param>
/// <param name="Years">The record's years in order.</param>
/// <param name="MeanOfDaysKwh">Mean power of the season's days, over the season's share of 8760 h, kWh a year: the sum over the days that the duration curve must equal.</param>
/// <param name="LongestStandstillDays">Longest run of successive days inside the season without power, days; a day without a flow ends no run and adds nothing.</param>
/// <param name="StandstillFrom">First day of that run; null when the plant never stands.</param>
public sealed record DailyRun(
    IReadOnlyList<MonthEnergy> Months,
    IReadOnlyList<YearEnergy> Years,
    double MeanOfDaysKwh,
    int LongestStandstillDays,
    DateOnly? StandstillFrom)
{
    /// <summary>Energy of each day of the record at the meter, kWh; NaN for a day without a flow in the season.</summary>
    public IReadOnlyList<double> EnergyOfDaysKwh { get; init; } = [];

    /// <summary>Where the years begin.</summary>
    public YearKind YearKind { get; init; } = YearKind.Calendar;

    private static readonly int[] DaysOfMonth = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

    /// <summary>Starts of units in a year, all units together, counted from day to day; starts within a day are not seen.</summary>
    public double UnitStartsPerYear { get; init; }

    /// <summary>Sum of the twelve months, kWh a year.</summary>
    public double SumOfMonthsKwh => Months.Sum(m => m.MeanEnergyKwh);

    /// <summary>The whole years' energies, lowest first, kWh.</summary>
    public IReadOnlyList<double> WholeYearsKwh => [.. Years.Where(y => y.IsWhole).Select(y => y.EnergyKwh).Order()];

    /// <summary>
    /// Energy reached or exceeded in nine years out of ten, kWh, by the Weibull position among the whole years; null with fewer than ten of them.
    /// </summary>
    public double? DryYearKwh => WholeYearsKwh.Count < 10 ? null : ReachedIn(0.9);

    /// <summary>Energy reached or exceeded in half of the whole years, kWh; null with fewer than three of them.</summary>
    public double? MedianYearKwh => WholeYearsKwh.Count < 3 ? null : ReachedIn(0.5);

    // Weibull: the year of rank r among n (lowest first) is reached or exceeded with 1 - r/(n + 1).
    private double ReachedIn(double shareOfYears)
    {
        var years = WholeYearsKwh;
        var rank = Math.Clamp(((1 - shareOfYears) * (years.Count + 1)) - 1, 0, years.Count - 1);
        var low = (int)Math.Floor(rank);
        return years[low] + ((rank - low) * (years[Math.Min(low + 1, years.Count - 1)] - years[low]));
    }

    /// <summary>Runs the plant over a record.</summary>
    /// <param name="plant">The plant.</param>
    /// <param name="record">Daily flows arriving.</param>
    /// <param name="season">Days on which the plant may run; on others the flow counts as zero, as in the curve.</param>
    /// <param name="allocation">Prior deliveries and reserved flow.</param>
    public static DailyRun Over(PlantCurve plant, DailyRecord record, OperatingSeason season, WaterAllocation allocation)
    {
        ArgumentNullException.ThrowIfNull(plant);
        ArgumentNullException.ThrowIfNull(allocation);
        return Over([.. Enumerable.Repeat(plant, 12)], record, season, [.. Enumerable.Repeat(allocation, 12)]);
    }

    /// <summary>Runs the plant over a record where each month has its own head or its own allocation.</summary>
    /// <param name="plants">The plant in each month, January first.</param>
    /// <param name="record">Daily flows arriving.</param>
    /// <param name="season">Days on which the plant may run.</param>
    /// <param name="allocations">Prior deliveries and reserved flow in each month, January first.</param>
    /// <param name="yearKind">Where years begin.</param>
    public static DailyRun Over(IReadOnlyList<PlantCurve> plants, DailyRecord record, OperatingSeason season, IReadOnlyList<WaterAllocation> allocations, YearKind yearKind = YearKind.Calendar)
    {
        ArgumentNullException.ThrowIfNull(plants);
        ArgumentNullException.ThrowIfNull(record);
        ArgumentNullException.ThrowIfNull(season);
        ArgumentNullException.ThrowIfNull(allocations);
        var availability = plants[0].Design.Train.Availability;
        var powerSum = new double[12];
        var flowSum = new double[12];
        var days = new int[12];
        var years = new List<YearEnergy>();
        // Records repeat their flows; each distinct flow is worked out once for the months that share plant and allocation.
        var known = new Dictionary<double, (double PowerKw, int Units)>[12];
        for (var m = 0; m < 12; m++)
        {
            var like = Enumerable.Range(0, m).FirstOrDefault(k => ReferenceEquals(plants[k], plants[m]) && allocations[k] == allocations[m], m);
            known[m] = like == m ? [] : known[like];
        }

        var flows = record.Flows;
        var energies = new double[flows.Length];
        var day = record.FirstDay;
        var (year, yearKwh, yearDays) = (FlowRecords.Statistics.Years.Of(day, yearKind), 0.0, 0);
        var next = FlowRecords.Statistics.Years.FirstDayOf(year + 1, yearKind);
        var seasonSum = 0.0;
        var seasonDays = 0;
        int run = 0, longest = 0;
        int running = 0, starts = 0, counted = 0;
        DateOnly runFrom = day, longestFrom = day;
        for (var i = 0; i < flows.Length; i++, day = day.AddDays(1))
        {
            if (day == next)
            {
                CloseYear();
                (year, yearKwh, yearDays) = (year + 1, 0, 0);
                next = FlowRecords.Statistics.Years.FirstDayOf(year + 1, yearKind);
            }

            // Outside the season the plant stands whatever was measured, so such a day is known even where the record has a gap;
            // computed inflows below zero count as no flow, as in the curve.
            var runs = season.Runs(day);
            if (runs && double.IsNaN(flows[i]))
            {
                energies[i] = double.NaN;
                continue;
            }

            var arriving = runs ? Math.Max(0, flows[i]) : 0;
            var month = day.Month - 1;
            if (!known[month].TryGetValue(arriving, out var found))
            {
                var point = plants[month].At(allocations[month].Split(arriving).UsableM3PerS);
                found = (point.MeterPowerKw * availability, point.UnitsRunning);
                known[month].Add(arriving, found);
            }

            var powerKw = found.PowerKw;
            starts += Math.Max(0, found.Units - running);
            running = found.Units;
            counted++;

            if (runs)
            {
                seasonSum += powerKw;
                seasonDays++;
                if (powerKw > 0)
                    run = 0;
                else if (++run == 1)
                    runFrom = day;
                if (run > longest)
                    (longest, longestFrom) = (run, runFrom);
            }
            else
            {
                run = 0;
            }

            powerSum[month] += powerKw;
            flowSum[month] += arriving;
            days[month]++;
            energies[i] = powerKw * 24;
            yearKwh += powerKw * 24;
            yearDays++;
        }

        CloseYear();
        var months = new MonthEnergy[12];
        for (var m = 0; m < 12; m++)
        {
            var n = days[m];
            months[m] = new MonthEnergy(m + 1, n == 0 ? 0 : powerSum[m] / n * 24 * DaysOfMonth[m], n == 0 ? 0 : flowSum[m] / n, n);
        }

        var meanOfDaysKwh = seasonDays == 0 ? 0 : seasonSum / seasonDays * season.ShareOfYear * PhysicalConstants.HoursPerYear;
        return new DailyRun(months, years, meanOfDaysKwh, longest, longest > 0 ? longestFrom : null)
        {
            EnergyOfDaysKwh = energies,
            YearKind = yearKind,
            UnitStartsPerYear = counted == 0 ? 0 : starts * 365.0 / counted,
        };

        void CloseYear() =>
            years.Add(new YearEnergy(year, yearKwh, yearDays, yearDays >= 0.95 * FlowRecords.Statistics.Years.DaysOf(year, yearKind)));
    }
}
