using System.Globalization;
using HeadToWatts.Basis.Units;
using HeadToWatts.Turbines;
using HeadToWatts.Turbines.Units;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds what goes beyond type and number of a turbine: unequal units, their split, a hill chart, the head away from the rated one.</summary>
internal static class MachineBuilder
{
    private const int MostUnits = 12;

    internal static IReadOnlyList<UnitSize>? UnitSizes(TurbineDocument d, TurbineType? type, string path, FieldReader read)
    {
        if (d.UnitSizes is not { Count: > 0 } rows)
            return null;
        var before = read.Problems.Count;
        if (!FlowBuilder.IsSuggest(d.Units))
            read.Refuse(path + ".units", d.Units, "the units are given one by one as well", "either units or unitSizes");
        if (rows.Count > MostUnits)
            read.Refuse(path + ".unitSizes", string.Create(CultureInfo.InvariantCulture, $"{rows.Count} units"), "that is more units than are reckoned with", "1 to 12");
        if (type is null && rows.Any(r => string.IsNullOrWhiteSpace(r.LeastFlow)) && string.IsNullOrWhiteSpace(d.LeastFlow))
            read.Refuse(path + ".type", d.Type, "without a type the least flow of a unit is not known; name the type, or give each unit's least flow", string.Join(", ", TurbineTypes.All.Select(t => t.Name)));
        var least = read.Optional(d.LeastFlow, Dimension.Ratio, path + ".leastFlow", 0, 1) ?? type?.LeastFlowRatio ?? 0;
        var sizes = rows.Select((r, i) => new UnitSize(
            read.Quantity(r.Share, Dimension.Ratio, $"{path}.unitSizes[{i}].share", 0.01, 1),
            read.Optional(r.LeastFlow, Dimension.Ratio, $"{path}.unitSizes[{i}].leastFlow", 0, 1) ?? least)).ToList();
        if (read.Problems.Count > before)
            return null;
        var sum = sizes.Sum(s => s.ShareRatio);

        // Thirds are written as 33.3 %; what is missing to the whole is spread over all.
        if (Math.Abs(sum - 1) > 0.005)
        {
            read.Refuse(path + ".unitSizes", UnitDisplay.Percent(sum), "the shares of the units do not add up to the whole", "100 % together");
            return null;
        }

        return [.. sizes.Select(s => s with { ShareRatio = s.ShareRatio / sum })];
    }

    internal static LoadSplit Split(TurbineDocument d, string path, FieldReader read)
    {
        switch (d.LoadSplit?.Trim().ToUpperInvariant())
        {
            case null or "" or "IN TURN":
                return LoadSplit.InTurn;
            case "BEST":
                return LoadSplit.Best;
            default:
                read.Refuse(path + ".loadSplit", d.LoadSplit, "this way of sharing the flow is not known", "in turn, best");
                return LoadSplit.InTurn;
        }
    }

    internal static HillChart? HillChart(TurbineDocument d, TurbineType? type, string path, FieldReader read)
    {
        if (d.HillChart is not { Count: > 0 } heads)
            return null;
        if (d.EfficiencyTable is { Count: > 0 })
            read.Refuse(path + ".hillChart", string.Create(CultureInfo.InvariantCulture, $"{heads.Count} heads"), "the efficiency is given as a table as well", "either efficiencyTable or hillChart");
        if (type is null)
            read.Refuse(path + ".type", d.Type, "a manufacturer's chart belongs to one type; name it", string.Join(", ", TurbineTypes.All.Select(t => t.Name)));
        var before = read.Problems.Count;
        var made = heads.Select((h, i) => new HillChartHead(
            read.Quantity(h.Head, Dimension.Length, $"{path}.hillChart[{i}].head", 0.1, 2000),
            [.. (h.Rows ?? []).Select((r, j) => new EfficiencyPoint(
                read.Quantity(r.Flow, Dimension.Ratio, $"{path}.hillChart[{i}].rows[{j}].flow", 0.001, 1.5),
                read.Quantity(r.Efficiency, Dimension.Ratio, $"{path}.hillChart[{i}].rows[{j}].efficiency", 0, 1)))])).ToList();
        return read.Problems.Count == before && Turbines.Units.HillChart.From(made, path + ".hillChart").TryGet(read.Problems, out var chart) ? chart : null;
    }

    internal static double? TestedDiameterM(TurbineDocument d, TurbineType? type, string path, FieldReader read)
    {
        if (string.IsNullOrWhiteSpace(d.TestedDiameter))
            return null;
        if (d.EfficiencyTable is not { Count: > 0 })
            read.Refuse(path + ".testedDiameter", d.TestedDiameter, "the size a test was made at belongs to a manufacturer's table of efficiency over flow", "together with efficiencyTable");
        if (type is { CavitationTable: null })
            read.Refuse(path + ".testedDiameter", d.TestedDiameter, $"the step-up after Moody holds for runners under pressure, and a {type.Name} is none", "Francis, Kaplan, propeller");
        return read.Optional(d.TestedDiameter, Dimension.Length, path + ".testedDiameter", 0.02, 15);
    }

    internal static bool FollowsHead(TurbineDocument d, string path, FieldReader read)
    {
        switch (d.AwayFromRatedHead?.Trim().ToUpperInvariant())
        {
            case null or "" or "HELD":
                return false;
            case "FOLLOW":
                return true;
            default:
                read.Refuse(path + ".awayFromRatedHead", d.AwayFromRatedHead, "say whether capacity and efficiency follow the head", "held, follow");
                return false;
        }
    }

    internal static bool IsShare(string? text) => text is not null && text.Contains('%', StringComparison.Ordinal);
}
