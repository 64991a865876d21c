using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Transfer;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the record of a site that has none of its own: from monthly means, a delivery schedule, a gauge of another drainage area, a neighbour.</summary>
internal static class TransferBuilder
{
    private const double LargestFlowM3PerS = 20_000;

    /// <summary>A record of one typical year from twelve means.</summary>
    internal static TransferredRecord? Means(FlowDocument d, string path, FieldReader read)
    {
        var months = d.MonthlyMeans!;
        if (months.Count != 12)
        {
            read.Refuse(path + ".monthlyMeans", $"{months.Count} flows", "twelve means are wanted, January first");
            return null;
        }

        var before = read.Problems.Count;
        var flows = months.Select((text, i) => read.Quantity(text, Dimension.Flow, $"{path}.monthlyMeans[{i}]", 0, LargestFlowM3PerS)).ToList();
        return read.Problems.Count == before && MonthlyMeans.OfTypicalYear(flows, d.Source ?? "", path + ".monthlyMeans").TryGet(read.Problems, out var made) ? made : null;
    }

    /// <summary>A record of one year from a plan of deliveries.</summary>
    internal static TransferredRecord? Schedule(FlowDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var spans = new List<DeliverySpan>();
        for (var i = 0; i < d.Schedule!.Count; i++)
        {
            var row = d.Schedule[i];
            var where = $"{path}.schedule[{i}]";
            var flow = read.Quantity(row.Flow, Dimension.Flow, where + ".flow", 0, LargestFlowM3PerS);
            if (string.IsNullOrWhiteSpace(row.Days))
                read.Refuse(where + ".days", row.Days, "nothing is entered", "days as in Apr 15 to May 31");
            else if (OperatingSeason.Parse(row.Days, where + ".days").TryGet(read.Problems, out var days) && Span(days) is var span)
            {
                if (span is { } one)
                    spans.Add(new DeliverySpan(one.From, one.To, flow));
                else
                    read.Refuse(where + ".days", row.Days, "these are several spans of days", "one span a line");
            }
        }

        return read.Problems.Count == before && DeliverySchedule.ToRecord(spans, d.Source ?? "", path + ".schedule").TryGet(read.Problems, out var made) ? made : null;
    }

    /// <summary>The record carried to the site by drainage area or extended by a neighbour; null where neither is asked for or cannot be done.</summary>
    internal static TransferredRecord? Carry(FlowDocument d, DailyRecord record, string path, FieldReader read, IFlowFileSource files)
    {
        if (d.AreaRatio is not null && d.Neighbour is not null)
        {
            read.Refuse(path + ".areaRatio", "", "the record is carried by drainage area and extended by a neighbour as well", "one of the two: areaRatio for a gauge elsewhere, neighbour for a short record at the site");
            return null;
        }

        if (d.AreaRatio is { } areas)
            return ByArea(areas, record, path + ".areaRatio", read);
        if (d.Neighbour is not { } neighbour || FlowBuilder.Record(neighbour, path + ".neighbour", read, files) is not { } gauge)
            return null;
        return MoveOne.Extend(record, gauge, path + ".neighbour").TryGet(read.Problems, out var made) ? made : null;
    }

    private static TransferredRecord? ByArea(AreaRatioDocument d, DailyRecord record, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        var gauge = read.Quantity(d.GaugeArea, Dimension.Area, path + ".gaugeArea", 1e3, 1e13);
        var site = read.Quantity(d.SiteArea, Dimension.Area, path + ".siteArea", 1e3, 1e13);
        var exponent = read.Number(d.Exponent, path + ".exponent", 0.1, 1.5);
        if (string.IsNullOrWhiteSpace(d.Exponent))
            read.Assume("The exponent of the ratio of drainage areas is not given; 1 is assumed: the same flow from each unit of area.");
        return read.Problems.Count > before ? null : DrainageAreaRatio.Transfer(record, gauge / 1e6, site / 1e6, exponent ?? 1);
    }

    // The one span of days of a season, which may run over the new year; null when there are several.
    private static (MonthDay From, MonthDay To)? Span(OperatingSeason season)
    {
        var first = new DateOnly(2001, 1, 1);
        bool Runs(int i) => season.Runs(first.AddDays(((i % 365) + 365) % 365));
        if (season.IsWholeYear)
            return (new MonthDay(1, 1), new MonthDay(12, 31));
        var starts = Enumerable.Range(0, 365).Where(i => Runs(i) && !Runs(i - 1)).ToList();
        if (starts.Count != 1)
            return null;
        var end = starts[0];
        while (Runs(end + 1))
            end++;
        var (from, to) = (first.AddDays(starts[0]), first.AddDays(end % 365));
        return (new MonthDay(from.Month, from.Day), new MonthDay(to.Month, to.Day));
    }
}
