using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Hydraulics.Water;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the energy grade at a pressure gauge.</summary>
internal static class PressureBuilder
{
    private const double LowestPa = -90_000;
    private const double HighestPa = 3e7;

    internal static PressureLevel? Build(PressureDocument d, string path, SiteConditions site, FieldReader read)
    {
        var before = read.Problems.Count;
        var elevation = read.Quantity(d.GaugeElevation, Dimension.Length, path + ".gaugeElevation", -430, 9000);
        var diameter = read.Optional(d.InsideDiameter, Dimension.Length, path + ".insideDiameter", 0.005, 20);
        var ways = (string.IsNullOrWhiteSpace(d.Pressure) ? 0 : 1) + (d.PressureByMonth is { Count: > 0 } ? 1 : 0) + (d.PressureRating is { Count: > 0 } ? 1 : 0);
        if (ways > 1)
            read.Refuse(path, d.Pressure, "the pressure is given in more than one way", "one of: pressure, pressureByMonth, pressureRating");
        if (d.PressureByMonth is { Count: > 0 and not 12 } wrong)
            read.Refuse(path + ".pressureByMonth", $"{wrong.Count} pressures", "twelve pressures are wanted, January first");
        if (read.Problems.Count > before)
            return null;

        LevelRule? rule;
        if (d.PressureByMonth is { Count: 12 } months)
            rule = new MonthlyLevel([.. months.Select((m, i) => HeadM(m, $"{path}.pressureByMonth[{i}]"))]);
        else if (d.PressureRating is { Count: > 0 } rows)
            rule = Rating(rows);
        else
            rule = new ConstantLevel(HeadM(d.Pressure, path + ".pressure"));
        return read.Problems.Count > before || rule is null ? null : new PressureLevel(elevation, rule, diameter, site.GravityMPerS2);

        double HeadM(string? text, string where) => read.Quantity(text, Dimension.Pressure, where, LowestPa, HighestPa) / site.SpecificWeightNPerM3;

        RatedLevel? Rating(List<PressureRowDocument> rows)
        {
            var points = rows.Select((r, i) => new LevelPoint(
                read.Quantity(r.Flow, Dimension.Flow, $"{path}.pressureRating[{i}].flow", 0, 20_000),
                HeadM(r.Pressure, $"{path}.pressureRating[{i}].pressure"))).ToList();
            if (read.Problems.Count > before)
                return null;
            if (points.Count < 2)
                read.Refuse(path + ".pressureRating", "one row", "a rating needs at least two rows");
            for (var i = 1; i < points.Count; i++)
            {
                if (points[i].FlowM3PerS <= points[i - 1].FlowM3PerS)
                    read.Refuse($"{path}.pressureRating[{i}].flow", rows[i].Flow, "flows must rise from row to row");
            }

            return read.Problems.Count > before ? null : new RatedLevel(points);
        }
    }
}
