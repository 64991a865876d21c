using System.Globalization;
using HeadToWatts.Basis.Sources;
using HeadToWatts.FlowRecords.Ratings;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>A device read by a gauge: stage less the stage of its crest is the head.</summary>
/// <param name="device">The device.</param>
/// <param name="crestStageM">Stage at the crest or flume floor, m.</param>
public sealed class DeviceRating(PrimaryDevice device, double crestStageM) : StageRating
{
    /// <summary>The device.</summary>
    public PrimaryDevice Device { get; } = device ?? throw new ArgumentNullException(nameof(device));

    /// <summary>Stage at the crest or flume floor, m.</summary>
    public double CrestStageM { get; } = double.IsFinite(crestStageM) ? crestStageM : throw new ArgumentOutOfRangeException(nameof(crestStageM), crestStageM, "The stage at the crest is a number.");

    /// <inheritdoc/>
    public override Method Method => Device.Method;

    /// <summary>Lowest stage of the range, m. A stage at or below the crest reads as no flow.</summary>
    public override double LowestStageM => CrestStageM + Device.LowestHeadM;

    /// <inheritdoc/>
    public override double HighestStageM => CrestStageM + Device.HighestHeadM;

    /// <inheritdoc/>
    public override string Describe() => $"{Device.Describe()}, crest at stage {CrestStageM.ToString("0.###", CultureInfo.InvariantCulture)} m";

    /// <inheritdoc/>
    protected override double FlowAt(double stageM) => Device.At(stageM - CrestStageM, null, OutsideRating.Extend).FlowM3PerS;
}
