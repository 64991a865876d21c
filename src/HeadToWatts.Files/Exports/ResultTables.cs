using System.Globalization;
using CsvHelper;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Exports;

/// <summary>One table of results as CSV text.</summary>
/// <param name="FileName">Name of the file.</param>
/// <param name="Text">The CSV: comma, point, a header row with the unit in each name, SI.</param>
public sealed record ResultTable(string FileName, string Text);

/// <summary>The tables of a study for spreadsheets, in SI.</summary>
public static class ResultTables
{
    /// <summary>Every table of one result.</summary>
    /// <param name="result">The result.</param>
    public static IReadOnlyList<ResultTable> Of(StudyResult result)
    {
        ArgumentNullException.ThrowIfNull(result);
        var tables = new List<ResultTable>
        {
            Duration(result),
            Power(result),
            Losses(result),
            Table("design-flow.csv", ["designFlowM3PerS", "exceedance", "installedPowerKw", "annualEnergyKwh", "plantFactor"],
                result.Flow.Scan.Points.Select(p => new object?[] { p.DesignFlowM3PerS, p.Exceedance, p.InstalledPowerKw, p.AnnualEnergyKwh, p.PlantFactor })),
            Table("turbines.csv", ["type", "units", "insideEnvelope", "annualEnergyKwh", "leastFlowM3PerS", "peakEfficiency"],
                result.Turbine.Ranking.Select(c => new object?[] { c.Type.Id, c.UnitCount, c.Fit.IsInside, c.AnnualEnergyKwh, c.LeastFlowM3PerS, c.PeakEfficiency })),
            Table("energy-steps.csv", ["step", "lossKwh", "leftKwh"],
                result.Energy.Annual.Staircase.Steps.Select(s => new object?[] { s.Name, s.LossKwh, s.LeftKwh })),
        };
        if (result.Energy.Days is { } days)
        {
            tables.Add(Table("months.csv", ["month", "energyKwh", "meanFlowM3PerS", "days"], days.Months.Select(m => new object?[] { m.Month, m.MeanEnergyKwh, m.MeanFlowM3PerS, m.Days })));
            tables.Add(Table("years.csv", ["year", "energyKwh", "days", "isWhole"], days.Years.Select(y => new object?[] { y.Year, y.EnergyKwh, y.Days, y.IsWhole })));
        }

        return tables;
    }

    private static ResultTable Duration(StudyResult r)
    {
        var supply = r.Flow.Supply;
        var rows = new List<object?[]>();
        for (var i = 0; i < supply.Exceedance.Length; i++)
            rows.Add([supply.Exceedance[i], supply.ArrivingM3PerS[i], supply.UsableM3PerS[i], r.Energy.Plant.At(supply.UsableM3PerS[i]).TurbineFlowM3PerS]);
        return Table("duration-curve.csv", ["exceedance", "flowM3PerS", "usableFlowM3PerS", "turbineFlowM3PerS"], rows);
    }

    private static ResultTable Power(StudyResult r) =>
        Table("power-curve.csv", ["usableFlowM3PerS", "turbineFlowM3PerS", "unitsRunning", "netHeadM", "turbineEfficiency", "meterPowerKw"],
            r.Energy.Curve.Select(p => new object?[] { p.UsableFlowM3PerS, p.TurbineFlowM3PerS, p.UnitsRunning, p.NetHeadM, p.TurbineEfficiency, p.MeterPowerKw }));

    private static ResultTable Losses(StudyResult r) =>
        Table("losses.csv", ["element", "what", "lossM", "shareOfGrossHead"], r.Waterway.AtDesign.Elements.SelectMany(e =>
            new[] { new object?[] { e.Element.Name, "friction", e.FrictionLossM, e.FrictionLossM / r.Head.GrossHeadM } }
                .Concat(e.Fittings.Select(f => new object?[] { e.Element.Name, f.Fitting.Name, f.LossM, f.LossM / r.Head.GrossHeadM }))));

    private static ResultTable Table(string fileName, string[] header, IEnumerable<object?[]> rows)
    {
        using var text = new StringWriter(CultureInfo.InvariantCulture) { NewLine = "\n" };
        using (var csv = CsvWriter.Create(text, CsvWriterOptions.Default with { NewLine = "\n", FormatProvider = CultureInfo.InvariantCulture }, leaveOpen: true))
        {
            csv.WriteHeader(header);
            foreach (var row in rows)
            {
                foreach (var cell in row)
                    csv.WriteField(cell switch { double d => d.ToString("R", CultureInfo.InvariantCulture), bool b => b ? "true" : "false", _ => Convert.ToString(cell, CultureInfo.InvariantCulture) ?? "" });
                csv.EndRecord();
            }
        }

        return new ResultTable(fileName, text.ToString());
    }
}
