using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.Statistics;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>What a reserved flow may refer to, of a record or of a typed curve that counts the year; each reckoned when first asked for.</summary>
internal sealed class FlowStatistics(DailyRecord? record, FlowDurationCurve? yearCurve, PlottingPosition position)
{
    private readonly Lazy<double?> _mean = new(() => record is null ? yearCurve?.MeanFlowM3PerS : LowFlow.MeanAnnualM3PerS(record, RecordYears.Of(record, YearKind.Calendar)));
    private readonly Lazy<double?> _q95 = new(() => record is null ? yearCurve?.FlowAt(0.95) : LowFlow.Q95M3PerS(record, position));
    private readonly Lazy<LowFlowResult?> _sevenQTen = new(() => record is null ? null : LowFlow.SevenQTen(record));

    internal bool HasRecord { get; } = record is not null;

    /// <summary>Mean annual flow, m3/s.</summary>
    internal double? MeanAnnualM3PerS => _mean.Value;

    /// <summary>Q95, m3/s.</summary>
    internal double? Q95M3PerS => _q95.Value;

    /// <summary>7Q10.</summary>
    internal LowFlowResult? SevenQTen => _sevenQTen.Value;
}
