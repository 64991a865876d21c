using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the head of an alternative.</summary>
internal static class HeadBuilder
{
    private const double LowestLevelM = -430;
    private const double HighestLevelM = 9000;

    internal static HeadInput? Build(HeadDocument d, string path, SiteInput place, FieldReader read)
    {
        var before = read.Problems.Count;
        var canal = d.Canal is null ? null : CanalBuilder.Build(d.Canal, path + ".canal", read);
        if (read.Problems.Count > before || Fall(d, canal, path, place, read) is not { } head)
            return null;
        head = head with { Canal = canal };
        CanalBuilder.RefuseDoubleCount(head, path + ".canal", read);
        return head;
    }

    private static HeadInput? Fall(HeadDocument d, CanalInput? canal, string path, SiteInput place, FieldReader read)
    {
        var before = read.Problems.Count;
        var site = SiteConditions.At(place.LatitudeRad, place.ElevationM, place.WaterTemperatureDegC);
        var head = Ways(d.Headwater, d.HeadwaterByMonth, d.HeadwaterRating, d.HeadwaterCrest, d.UpstreamPressure);
        var tail = Ways(d.Tailwater, d.TailwaterByMonth, d.TailwaterRating, null, d.DownstreamPressure);
        if (canal is { SetsHeadwater: true })
            head++;
        if (canal is { SetsTailwater: true })
            tail++;
        var error = read.Optional(d.Error, Dimension.Length, path + ".error", 0, 100) ?? 0;
        var direct = (string.IsNullOrWhiteSpace(d.Gross) ? 0 : 1) + (d.Measured is null ? 0 : 1);
        if (direct + (head + tail > 0 ? 1 : 0) > 1)
        {
            read.Refuse(path, d.Gross, "gross head and levels are both given, or in two ways; they could disagree", "either gross, or measured, or headwater and tailwater");
            return null;
        }

        if (d.Measured is { } measured)
            return MeasuredHead.Build(measured, path + ".measured", site, read);
        if (head + tail == 0)
        {
            var gross = read.Quantity(d.Gross, Dimension.Length, path + ".gross", 0.05, 2500);
            return read.Problems.Count > before ? null : new HeadInput(GrossHead.FromMetres(gross), gross, 0, false) { ErrorM = error };
        }

        var headwater = d.UpstreamPressure is { } up && head == 1
            ? PressureBuilder.Build(up, path + ".upstreamPressure", site, read)
            : canal is { SetsHeadwater: true } && head == 1 ? canal.Upstream.NormalLevels()
            : Level(d.Headwater, d.HeadwaterByMonth, d.HeadwaterRating, d.HeadwaterCrest, head, path + ".headwater", true, read);
        var tailwater = d.DownstreamPressure is { } down && tail == 1
            ? PressureBuilder.Build(down, path + ".downstreamPressure", site, read)
            : canal is { SetsTailwater: true } && tail == 1 ? canal.Downstream.NormalLevels()
            : Level(d.Tailwater, d.TailwaterByMonth, d.TailwaterRating, null, tail, path + ".tailwater", false, read);
        if (read.Problems.Count > before || headwater is null || tailwater is null)
            return null;
        return Both(d, path, headwater, tailwater, read) is { } both ? both with { ErrorM = error } : null;
    }

    private static HeadInput? Both(HeadDocument d, string path, LevelRule headwater, LevelRule tailwater, FieldReader read)
    {
        // At rest (no flow) and in each month there must be a fall; what high water does to it is the study's to find.
        var falls = Enumerable.Range(1, 12).Select(m => headwater.LevelM(0, m) - tailwater.LevelM(0, m)).ToList();
        if (falls.Max() is < 0.05 or > 2500)
        {
            read.Refuse(path + ".tailwater", d.Tailwater, $"headwater less tailwater is {UnitDisplay.Number(falls.Max())} m", "a fall of 0.05 m to 2500 m");
            return null;
        }

        var first = headwater.LevelM(0, 1);
        return new HeadInput(GrossHead.FromMetres(falls.Max()), first, first - falls.Max(), true)
        {
            HeadwaterRule = headwater is ConstantLevel ? null : headwater,
            TailwaterRule = tailwater is ConstantLevel ? null : tailwater,
        };
    }

    private static int Ways(string? one, List<string?>? months, List<LevelRowDocument>? rating, CrestDocument? crest, PressureDocument? pressure) =>
        (string.IsNullOrWhiteSpace(one) ? 0 : 1) + (months is { Count: > 0 } ? 1 : 0) + (rating is { Count: > 0 } ? 1 : 0) + (crest is null ? 0 : 1) + (pressure is null ? 0 : 1);

    private static LevelRule? Level(string? one, List<string?>? months, List<LevelRowDocument>? rating, CrestDocument? crest, int ways, string path, bool mayFall, FieldReader read)
    {
        if (ways > 1)
        {
            read.Refuse(path, one, "the level is given in more than one way", "one of: a level, twelve levels by month, a rating, a crest, a pressure, the canal");
            return null;
        }

        if (months is { Count: > 0 })
        {
            if (months.Count != 12)
            {
                read.Refuse(path + "ByMonth", $"{months.Count} levels", "twelve levels are wanted, January first");
                return null;
            }

            return new MonthlyLevel([.. months.Select((m, i) => read.Quantity(m, Dimension.Length, $"{path}ByMonth[{i}]", LowestLevelM, HighestLevelM))]);
        }

        if (rating is { Count: > 0 })
            return Rating(rating, path + "Rating", mayFall, read);
        if (crest is not null)
        {
            var before = read.Problems.Count;
            var elevation = read.Quantity(crest.Elevation, Dimension.Length, path + "Crest.elevation", LowestLevelM, HighestLevelM);
            var length = read.Quantity(crest.Length, Dimension.Length, path + "Crest.length", 0.05, 5000);
            var coefficient = read.Number(crest.Coefficient, path + "Crest.coefficient", 1, 2.5) ?? 1.7;
            return read.Problems.Count > before ? null : new WeirCrestLevel(elevation, length, coefficient);
        }

        return new ConstantLevel(read.Quantity(one, Dimension.Length, path, LowestLevelM, HighestLevelM));
    }

    private static RatedLevel? Rating(List<LevelRowDocument> rows, string path, bool mayFall, FieldReader read)
    {
        var before = read.Problems.Count;
        var points = rows.Select((r, i) => new LevelPoint(
            read.Quantity(r.Flow, Dimension.Flow, $"{path}[{i}].flow", 0, 20_000),
            read.Quantity(r.Level, Dimension.Length, $"{path}[{i}].level", LowestLevelM, HighestLevelM))).ToList();
        if (read.Problems.Count > before)
            return null;
        if (points.Count < 2)
            read.Refuse(path, "one row", "a rating needs at least two rows");
        for (var i = 1; i < points.Count; i++)
        {
            if (points[i].FlowM3PerS <= points[i - 1].FlowM3PerS)
                read.Refuse($"{path}[{i}].flow", rows[i].Flow, "flows must rise from row to row");
            if (!mayFall && points[i].LevelM < points[i - 1].LevelM)
                read.Refuse($"{path}[{i}].level", rows[i].Level, "a tailwater does not fall as the flow rises");
        }

        return read.Problems.Count > before ? null : new RatedLevel(points);
    }
}
