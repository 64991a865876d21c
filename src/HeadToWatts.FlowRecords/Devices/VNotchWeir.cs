using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Sharp-crested V-notch, fully contracted.</summary>
public sealed class VNotchWeir : PrimaryDevice
{
    /// <summary>Usual discharge coefficient of a notch of 90 degrees.</summary>
    public const double UsualDischargeCoefficient = 0.585;

    private const double LowestHead = 0.06;
    private const double HighestHead = 0.38;

    /// <summary>The method.</summary>
    internal static readonly Method VNotch = new(
        "v-notch-weir", "V-notch weir", "Q = (8/15) C_d (2g)^{1/2} tan(θ/2) h^{5/2}", DeviceSources.Shen, "C_d 0.585 for 90 degrees",
        [new InputRange("h", "head", "m", LowestHead, HighestHead), new InputRange("θ", "angle of the notch", "rad", 25 * Math.PI / 180, 100 * Math.PI / 180)]);

    /// <summary>A notch.</summary>
    /// <param name="angleRad">Angle between its sides θ, rad; above 0 and below π. 90 degrees is π/2.</param>
    /// <param name="dischargeCoefficient">C_d; above 0 and below 1.</param>
    public VNotchWeir(double angleRad, double dischargeCoefficient = UsualDischargeCoefficient)
    {
        AngleRad = angleRad is > 0 and < Math.PI ? angleRad : throw new ArgumentOutOfRangeException(nameof(angleRad), angleRad, "The angle of a notch lies between 0 and 180 degrees.");
        DischargeCoefficient = dischargeCoefficient is > 0 and < 1 ? dischargeCoefficient : throw new ArgumentOutOfRangeException(nameof(dischargeCoefficient), dischargeCoefficient, "The discharge coefficient lies between 0 and 1.");
    }

    /// <inheritdoc/>
    public override string KindId => "v-notch-weir";

    /// <inheritdoc/>
    public override Method Method => VNotch;

    /// <summary>Angle between the sides θ, rad.</summary>
    public double AngleRad { get; }

    /// <summary>C_d.</summary>
    public double DischargeCoefficient { get; }

    /// <inheritdoc/>
    public override double LowestHeadM => LowestHead;

    /// <inheritdoc/>
    public override double HighestHeadM => HighestHead;

    /// <summary>The nappe must fall free: water below may not reach the notch.</summary>
    public override double SubmergenceLimitRatio => 0;

    /// <inheritdoc/>
    public override string Describe() => $"V-notch weir of {(AngleRad * 180 / Math.PI).ToString("0.#", CultureInfo.InvariantCulture)} degrees";

    /// <inheritdoc/>
    public override MethodUse UsedBetween(double lowestM, double highestM) => VNotch.Used(new InputSpan("h", lowestM, highestM), new InputSpan("θ", AngleRad, AngleRad));

    /// <inheritdoc/>
    protected override double FreeFlowM3PerS(double headM) =>
        8.0 / 15 * DischargeCoefficient * RootTwoGravity * Math.Tan(AngleRad / 2) * headM * headM * Math.Sqrt(headM);
}
