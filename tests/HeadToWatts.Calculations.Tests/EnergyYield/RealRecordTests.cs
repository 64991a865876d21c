using System.Globalization;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.EnergyYield;

/// <summary>
/// Real flow records and what an independent program (numpy) made of them: net head 5 m, efficiency 0.80, 9.81 kN/m3, the
/// record's own Q30 as the machine's full flow, off below 30 % of it. The records lie beside the repository and are not part of it.
/// </summary>
public class RealRecordTests
{
    private const double CfsInM3PerS = 0.028316846592;

    [SkippableTheory]
    [InlineData("USGS-04161820", "usgs_04161820.rdb")]
    [InlineData("USGS-04208504", "usgs_04208504.rdb")]
    [InlineData("USGS-04213000", "usgs_04213000.rdb")]
    [InlineData("USGS-04214500", "usgs_04214500.rdb")]
    public void Energy_of_a_gauged_river_meets_the_independent_figure(string id, string file)
    {
        var folder = Path.GetFullPath(Path.Combine(CheckValueFile.Root(), "..", "shared", "reference", "flow"));
        Skip.IfNot(File.Exists(Path.Combine(folder, file)), "the flow records are not beside the repository");
        var row = Assert.Single(CheckValueFile.Read(Path.Combine(folder, "oracle.csv")).Rows, r => r.Text("id") == id);
        var days = UsgsDays(Path.Combine(folder, file));
        Assert.Equal(row["valid"], days.Count);

        var fullFlow = row["Qmax_used_Q30"] * CfsInM3PerS;
        var plant = Plants.Flat(5, fullFlow, 0.8, leastFlowRatio: 0.3, site: Plants.Site(1000, 9.81));
        var mean = days.Average(d => plant.At(d.Flow).MeterPowerKw);
        Assert.Equal(row["mean_kW_H5m_eta0.80_Qmin30pct"], mean, 1e-4);
        Assert.Equal(row["MWh_per_8760h"], mean * 8.760, 1e-3);

        // The duration curve of the same days, within the ends of the plotting position (see DailyRunTests).
        var first = days.Min(d => d.Day);
        var flows = Enumerable.Repeat(double.NaN, days.Max(d => d.Day).DayNumber - first.DayNumber + 1).ToArray();
        foreach (var (day, flow) in days)
            flows[day.DayNumber - first.DayNumber] = flow;
        var curve = FlowDurationCurve.FromRecord(new DailyRecord(first, flows, id), PlottingPositions.Weibull, OperatingSeason.WholeYear);
        var annual = AnnualEnergy.Of(plant, Plants.Supply(curve));
        Assert.InRange(annual.Integral.MeterPowerKw, days.Count * mean / (days.Count + 1), ((days.Count * mean) + plant.BestPowerKw) / (days.Count + 1));
        Assert.Equal(row["Q30"] * CfsInM3PerS, curve.FlowAt(0.3), 1e-6);
    }

    private static List<(DateOnly Day, double Flow)> UsgsDays(string path)
    {
        var rows = File.ReadLines(path).Where(l => !l.StartsWith('#')).Select(l => l.Split('\t')).ToList();
        var at = Array.FindIndex(rows[0], c => c.EndsWith("_00060_00003", StringComparison.Ordinal));
        var days = new List<(DateOnly, double)>();
        foreach (var row in rows.Skip(2))
        {
            if (row.Length > at && double.TryParse(row[at], NumberStyles.Float, CultureInfo.InvariantCulture, out var cfs))
                days.Add((DateOnly.ParseExact(row[2], "yyyy-MM-dd", CultureInfo.InvariantCulture), cfs * CfsInM3PerS));
        }

        return days;
    }
}
