using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Sharp-crested trapezoidal weir with sides of 1 horizontal to 4 vertical (Cipolletti), which make up for the end contractions.</summary>
public sealed class CipollettiWeir : PrimaryDevice
{
    private const double CoefficientInFeet = 3.367;

    /// <summary>The method. Above a third of the crest length the sides no longer make up for the contractions.</summary>
    internal static readonly Method Cipolletti = new(
        "cipolletti-weir", "Cipolletti weir", "Q = 1.859 L h^{3/2}", DeviceSources.WaterMeasurementManual, "ch. 7; 3.367 in feet",
        [new InputRange("h", "head", "m", 0.06, double.PositiveInfinity), new InputRange("h/L", "head over crest length", "1", 0, 1.0 / 3)]);

    /// <summary>A weir.</summary>
    /// <param name="crestLengthM">Length of the crest L, m; above 0.</param>
    public CipollettiWeir(double crestLengthM) => CrestLengthM = Require(crestLengthM, nameof(crestLengthM), "The length of a crest is above 0.");

    /// <inheritdoc/>
    public override string KindId => "cipolletti-weir";

    /// <inheritdoc/>
    public override Method Method => Cipolletti;

    /// <summary>Length of the crest L, m.</summary>
    public double CrestLengthM { get; }

    /// <inheritdoc/>
    public override double LowestHeadM => 0.06;

    /// <inheritdoc/>
    public override double HighestHeadM => CrestLengthM / 3;

    /// <summary>The nappe must fall free: water below may not reach the crest.</summary>
    public override double SubmergenceLimitRatio => 0;

    /// <inheritdoc/>
    public override string Describe() => $"Cipolletti weir, crest {CrestLengthM.ToString("0.###", CultureInfo.InvariantCulture)} m long";

    /// <inheritdoc/>
    public override MethodUse UsedBetween(double lowestM, double highestM) =>
        Cipolletti.Used(new InputSpan("h", lowestM, highestM), new InputSpan("h/L", lowestM / CrestLengthM, highestM / CrestLengthM));

    /// <inheritdoc/>
    protected override double FreeFlowM3PerS(double headM) => CoefficientInFeet * Feet.RootFoot * CrestLengthM * Math.Pow(headM, 1.5);
}
