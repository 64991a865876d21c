using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Sharp-crested weir over the whole width of a rectangular channel, by Rehbock. The nappe is ventilated.</summary>
public sealed class SuppressedRectangularWeir : PrimaryDevice
{
    /// <summary>The method. Outside the range the coefficient is not supported by the tests.</summary>
    internal static readonly Method Rehbock = new(
        "rehbock-weir", "Suppressed rectangular weir, Rehbock", "Q = (2/3)(2g)^{1/2} (0.602 + 0.0832 h/P) b (h + 0.00125 m)^{3/2}", DeviceSources.Rehbock, "",
        [new InputRange("h", "head", "m", 0.03, 0.75), new InputRange("h/P", "head over crest height", "1", 0, 1)]);

    /// <summary>A weir.</summary>
    /// <param name="widthM">Width of channel and crest b, m; above 0.</param>
    /// <param name="crestHeightM">Height of the crest over the floor upstream P, m; above 0.</param>
    public SuppressedRectangularWeir(double widthM, double crestHeightM)
    {
        WidthM = Require(widthM, nameof(widthM), "The width of a weir is above 0.");
        CrestHeightM = Require(crestHeightM, nameof(crestHeightM), "The height of a crest is above 0.");
    }

    /// <inheritdoc/>
    public override string KindId => "suppressed-weir";

    /// <inheritdoc/>
    public override Method Method => Rehbock;

    /// <summary>Width of channel and crest b, m.</summary>
    public double WidthM { get; }

    /// <summary>Height of the crest over the floor upstream P, m.</summary>
    public double CrestHeightM { get; }

    /// <inheritdoc/>
    public override double LowestHeadM => 0.03;

    /// <inheritdoc/>
    public override double HighestHeadM => Math.Min(0.75, CrestHeightM);

    /// <summary>The nappe must fall free: water below may not reach the crest.</summary>
    public override double SubmergenceLimitRatio => 0;

    /// <inheritdoc/>
    public override string Describe() =>
        $"suppressed rectangular weir {WidthM.ToString("0.###", CultureInfo.InvariantCulture)} m wide, crest {CrestHeightM.ToString("0.###", CultureInfo.InvariantCulture)} m high";

    /// <inheritdoc/>
    public override MethodUse UsedBetween(double lowestM, double highestM) =>
        Rehbock.Used(new InputSpan("h", lowestM, highestM), new InputSpan("h/P", lowestM / CrestHeightM, highestM / CrestHeightM));

    /// <inheritdoc/>
    protected override double FreeFlowM3PerS(double headM) =>
        2.0 / 3 * RootTwoGravity * (0.602 + (0.0832 * headM / CrestHeightM)) * WidthM * Math.Pow(headM + 0.00125, 1.5);
}
