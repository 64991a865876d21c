using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds a canal with its drop, or lists every problem of it.</summary>
internal static class CanalBuilder
{
    private const double LowestM = -430;
    private const double HighestM = 9000;

    internal static CanalInput? Build(CanalDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var upstream = Side(d.Upstream, path + ".upstream", read);
        var downstream = Side(d.Downstream, path + ".downstream", read);
        var basin = d.Basin is null ? null : new BasinMeasures(
            read.Quantity(d.Basin.Width, Dimension.Length, path + ".basin.width", 0.1, 500),
            read.Quantity(d.Basin.Length, Dimension.Length, path + ".basin.length", 0.1, 500),
            read.Quantity(d.Basin.Floor, Dimension.Length, path + ".basin.floor", LowestM, HighestM));
        var (head, tail) = d.SetsLevels?.Trim().ToUpperInvariant() switch
        {
            null or "" or "NONE" => (false, false),
            "TAILWATER" => (false, true),
            "BOTH" => (true, true),
            _ => (false, (bool?)null),
        };
        if (tail is null)
            read.Refuse(path + ".setsLevels", d.SetsLevels, "this choice is not known", "none, tailwater, both");
        var others = (d.OtherDrops ?? []).Select((o, i) => new CanalDrop(
            string.IsNullOrWhiteSpace(o.Name) ? $"drop {i + 1}" : o.Name.Trim(),
            read.Quantity(o.Headwater, Dimension.Length, $"{path}.otherDrops[{i}].headwater", LowestM, HighestM),
            read.Quantity(o.Tailwater, Dimension.Length, $"{path}.otherDrops[{i}].tailwater", LowestM, HighestM))).ToList();
        if (upstream is { } u && downstream is { } w && u.BedElevationM < w.BedElevationM)
            read.Refuse(path + ".downstream.bed", d.Downstream.Bed, "the bed below the drop lies higher than the bed above it", "a lower bed");
        return read.Problems.Count > before ? null : new CanalInput(upstream!, downstream!, basin, head, tail ?? false, others, d.Bypass?.Trim() ?? "");
    }

    /// <summary>Refuses a fall that another drop on the canal counts as well.</summary>
    internal static void RefuseDoubleCount(HeadInput head, string path, FieldReader read)
    {
        if (head.Canal is not { Others.Count: > 0 } canal)
            return;
        DropSeries.Of([.. canal.Others, new CanalDrop("this plant", head.HeadwaterM, head.TailwaterM)], path + ".otherDrops").TryGet(read.Problems, out _);
    }

    private static CanalSide? Side(CanalSideDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var section = Section(d, path, read);
        var n = Needed(d.ManningN, path + ".manningN", 0.005, 0.3, read);
        var slope = Needed(d.Slope, path + ".slope", 1e-7, 0.3, read);
        var alpha = read.Number(d.Alpha, path + ".alpha", 1, 2) ?? 1;
        var bed = read.Quantity(d.Bed, Dimension.Length, path + ".bed", LowestM, HighestM);
        var bank = read.Optional(d.Bank, Dimension.Length, path + ".bank", LowestM, HighestM);
        if (bank <= bed + 0.05)
            read.Refuse(path + ".bank", d.Bank, "the bank does not lie above the bed", "a higher level");
        return read.Problems.Count > before ? null : new CanalSide(new CanalFlow(section!, n, slope, alpha), bed, bank);
    }

    private static CanalSection? Section(CanalSideDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        switch (d.Shape?.Trim().ToLowerInvariant())
        {
            case "rectangular":
                var width = read.Quantity(d.Width, Dimension.Length, path + ".width", 0.05, 500);
                return read.Problems.Count > before ? null : new RectangularSection(width);
            case "trapezoidal":
                var bed = read.Quantity(d.Width, Dimension.Length, path + ".width", 0.05, 500);
                var sides = Needed(d.SideSlope, path + ".sideSlope", 0, 10, read);
                return read.Problems.Count > before ? null : new TrapezoidalSection(bed, sides);
            case "circular":
                var diameter = read.Quantity(d.Diameter, Dimension.Length, path + ".diameter", 0.1, 30);
                return read.Problems.Count > before ? null : new CircularSection(diameter);
            case "natural":
                var points = (d.Points ?? []).Select((p, i) => new SurveyPoint(
                    read.Quantity(p.Distance, Dimension.Length, $"{path}.points[{i}].distance", -1e4, 1e4),
                    read.Quantity(p.Elevation, Dimension.Length, $"{path}.points[{i}].elevation", LowestM, HighestM))).ToList();
                return read.Problems.Count == before && NaturalSection.FromPoints(points, path + ".points").TryGet(read.Problems, out var natural) ? natural : null;
            default:
                read.Named<CanalSectionKind>(d.Shape, path + ".shape", _ => null, CanalSectionKinds.All.Select(k => k.Id));
                return null;
        }
    }

    private static double Needed(string? text, string where, double lowest, double highest, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(text))
            read.Refuse(where, text, "nothing is entered", "a number");
        return read.Number(text, where, lowest, highest) ?? lowest;
    }
}
