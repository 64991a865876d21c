using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Sharp-crested rectangular weir narrower than its channel, by Francis. The nappe is ventilated and the approach slow.</summary>
public sealed class ContractedRectangularWeir : PrimaryDevice
{
    // 3.33 ft^(1/2)/s.
    private const double FrancisCoefficient = 3.33;

    /// <summary>The method. Above a third of the crest length the side contractions run into each other.</summary>
    internal static readonly Method Francis = new(
        "francis-weir", "Contracted rectangular weir, Francis", "Q = 1.838 (L - 0.1 n h) h^{3/2}", DeviceSources.Francis, "3.33 in feet",
        [new InputRange("h", "head", "m", 0.06, double.PositiveInfinity), new InputRange("h/L", "head over crest length", "1", 0, 1.0 / 3)]);

    /// <summary>A weir.</summary>
    /// <param name="crestLengthM">Length of the crest L, m; above 0.</param>
    /// <param name="contractions">How many ends are contracted n: 2 for a notch, 1 with one side at the wall, 0 for none, two more for each pier.</param>
    public ContractedRectangularWeir(double crestLengthM, int contractions = 2)
    {
        CrestLengthM = Require(crestLengthM, nameof(crestLengthM), "The length of a crest is above 0.");
        ArgumentOutOfRangeException.ThrowIfNegative(contractions);
        Contractions = contractions;
    }

    /// <inheritdoc/>
    public override string KindId => "contracted-weir";

    /// <inheritdoc/>
    public override Method Method => Francis;

    /// <summary>Length of the crest L, m.</summary>
    public double CrestLengthM { get; }

    /// <summary>How many ends are contracted.</summary>
    public int Contractions { get; }

    /// <inheritdoc/>
    public override double LowestHeadM => 0.06;

    /// <inheritdoc/>
    public override double HighestHeadM => CrestLengthM / 3;

    /// <summary>The nappe must fall free: water below may not reach the crest.</summary>
    public override double SubmergenceLimitRatio => 0;

    /// <inheritdoc/>
    public override string Describe() =>
        $"contracted rectangular weir, crest {CrestLengthM.ToString("0.###", CultureInfo.InvariantCulture)} m long, {Contractions.ToString(CultureInfo.InvariantCulture)} end contractions";

    /// <inheritdoc/>
    public override MethodUse UsedBetween(double lowestM, double highestM) =>
        Francis.Used(new InputSpan("h", lowestM, highestM), new InputSpan("h/L", lowestM / CrestLengthM, highestM / CrestLengthM));

    /// <inheritdoc/>
    protected override double FreeFlowM3PerS(double headM) =>
        FrancisCoefficient * Feet.RootFoot * Math.Max(0, CrestLengthM - (0.1 * Contractions * headM)) * Math.Pow(headM, 1.5);
}
