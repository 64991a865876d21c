using System.Globalization;
using HeadToWatts.Basis;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>A broad level crest over which the flow passes the critical depth. Where the approach is known its velocity head is added.</summary>
public sealed class BroadCrestedWeir : PrimaryDevice
{
    // Of the head above, the water below may take two thirds before it is felt: the depth at the crest is then critical still.
    private const double ModularLimit = 2.0 / 3;

    /// <summary>The method. Below the range friction on the crest counts, above it the flow curves and the coefficient grows.</summary>
    internal static readonly Method BroadCrest = new(
        "broad-crested-weir", "Broad-crested weir", "Q = C_d (2/3)^{3/2} g^{1/2} L H^{3/2}, H = h + V^2/2g", DeviceSources.Bos, "ch. 4",
        [
            new InputRange("h/B", "head over length of the crest along the flow", "1", 0.08, 0.5),
            new InputRange("C_d", "discharge coefficient", "1", 0.8, 1),
        ]);

    /// <summary>A weir.</summary>
    /// <param name="crestLengthM">Length of the crest across the flow L, m; above 0.</param>
    /// <param name="crestBreadthM">Length of the crest along the flow B, m; above 0.</param>
    /// <param name="dischargeCoefficient">C_d; about 0.85 for a square upstream edge, 0.95 for a rounded one; above 0 and up to 1.2.</param>
    /// <param name="approach">Channel upstream; null when the head is taken in still water.</param>
    public BroadCrestedWeir(double crestLengthM, double crestBreadthM, double dischargeCoefficient, ApproachChannel? approach = null)
    {
        CrestLengthM = Require(crestLengthM, nameof(crestLengthM), "The length of a crest is above 0.");
        CrestBreadthM = Require(crestBreadthM, nameof(crestBreadthM), "The breadth of a crest is above 0.");
        DischargeCoefficient = dischargeCoefficient is > 0 and <= 1.2 ? dischargeCoefficient : throw new ArgumentOutOfRangeException(nameof(dischargeCoefficient), dischargeCoefficient, "The discharge coefficient lies above 0 and up to 1.2.");
        Approach = approach;
        if (approach is not null && approach.WidthM < crestLengthM)
            throw new ArgumentOutOfRangeException(nameof(approach), approach.WidthM, "The channel upstream is not narrower than the crest.");
    }

    /// <inheritdoc/>
    public override string KindId => "broad-crested-weir";

    /// <inheritdoc/>
    public override Method Method => BroadCrest;

    /// <summary>Length of the crest across the flow L, m.</summary>
    public double CrestLengthM { get; }

    /// <summary>Length of the crest along the flow B, m.</summary>
    public double CrestBreadthM { get; }

    /// <summary>C_d.</summary>
    public double DischargeCoefficient { get; }

    /// <summary>Channel upstream; null when the head is taken in still water.</summary>
    public ApproachChannel? Approach { get; }

    /// <inheritdoc/>
    public override double LowestHeadM => 0.08 * CrestBreadthM;

    /// <inheritdoc/>
    public override double HighestHeadM => 0.5 * CrestBreadthM;

    /// <inheritdoc/>
    public override double SubmergenceLimitRatio => ModularLimit;

    /// <inheritdoc/>
    public override string Describe() => $"broad-crested weir, crest {CrestLengthM.ToString("0.###", CultureInfo.InvariantCulture)} m across and {CrestBreadthM.ToString("0.###", CultureInfo.InvariantCulture)} m along the flow";

    /// <inheritdoc/>
    public override MethodUse UsedBetween(double lowestM, double highestM) => BroadCrest.Used(
        new InputSpan("h/B", lowestM / CrestBreadthM, highestM / CrestBreadthM), new InputSpan("C_d", DischargeCoefficient, DischargeCoefficient));

    /// <inheritdoc/>
    protected override double FreeFlowM3PerS(double headM) =>
        Approach is null ? Still(headM) : Approach.FlowM3PerS(headM, Still);

    private double Still(double headM) =>
        DischargeCoefficient * Math.Pow(2.0 / 3, 1.5) * Math.Sqrt(PhysicalConstants.StandardGravityMPerS2) * CrestLengthM * Math.Pow(headM, 1.5);
}

/// <summary>The channel upstream of a weir, for the velocity with which the water arrives.</summary>
public sealed record ApproachChannel
{
    /// <summary>A rectangular channel.</summary>
    /// <param name="widthM">Its width, m; above 0.</param>
    /// <param name="crestHeightM">Height of the crest over its floor, m; 0 or more.</param>
    public ApproachChannel(double widthM, double crestHeightM)
    {
        WidthM = PrimaryDevice.Require(widthM, nameof(widthM), "The width of a channel is above 0.");
        CrestHeightM = crestHeightM >= 0 && double.IsFinite(crestHeightM) ? crestHeightM : throw new ArgumentOutOfRangeException(nameof(crestHeightM), crestHeightM, "The height of a crest is 0 or more.");
    }

    /// <summary>Width, m.</summary>
    public double WidthM { get; }

    /// <summary>Height of the crest over the floor, m.</summary>
    public double CrestHeightM { get; }

    /// <summary>The flow at a measured head, when a formula gives it at the total head.</summary>
    internal double FlowM3PerS(double headM, Func<double, double> atTotalHead)
    {
        var areaM2 = WidthM * (headM + CrestHeightM);
        var flow = atTotalHead(headM);
        // Each round adds a smaller piece; the approach is slow, so that it settles within a few.
        for (var i = 0; i < 100; i++)
        {
            var velocity = flow / areaM2;
            var next = atTotalHead(headM + (velocity * velocity / (2 * PhysicalConstants.StandardGravityMPerS2)));
            if (Math.Abs(next - flow) <= 1e-14 * next)
                return next;
            flow = next;
        }

        return flow;
    }
}
