using System.Globalization;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Parshall flume of 1 to 8 ft or 10 to 50 ft throat, free flow. Other sizes have tables of their own and are refused.</summary>
public sealed class ParshallFlume : PrimaryDevice
{
    // The greatest head grows with the throat; it must stand before the methods that name it.
    private static readonly InputRange OfSize = new("h_a/h_{max}", "head over the greatest of its size", "1", 0, 1);

    /// <summary>1 to 8 ft. The exponent holds the throat's width: 4 W^1.026 Ha^1.522 is not this rating.</summary>
    internal static readonly Method Medium = new(
        "parshall-1-8-ft", "Parshall flume, throat 1 to 8 ft", "Q = 4 W h_a^{1.522 W^{0.026}} (feet)", DeviceSources.Parshall, "",
        [new InputRange("W", "throat width", "m", Feet.FootM, 8 * Feet.FootM), new InputRange("h_a", "head", "m", 0.1 * Feet.FootM, 2.5 * Feet.FootM), OfSize]);

    /// <summary>10 to 50 ft.</summary>
    internal static readonly Method Large = new(
        "parshall-10-50-ft", "Parshall flume, throat 10 to 50 ft", "Q = (3.6875 W + 2.5) h_a^{1.6} (feet)", DeviceSources.LargeFlumes, "",
        [new InputRange("W", "throat width", "m", 10 * Feet.FootM, 50 * Feet.FootM), new InputRange("h_a", "head", "m", 0.3 * Feet.FootM, 6 * Feet.FootM), OfSize]);

    private readonly double _throatFt;
    private readonly double _exponent;

    /// <summary>A flume.</summary>
    /// <param name="throatWidthM">Width of the throat W, m: 0.3048 to 2.4384 (1 to 8 ft) or 3.048 to 15.24 (10 to 50 ft).</param>
    /// <exception cref="ArgumentOutOfRangeException">Another width.</exception>
    public ParshallFlume(double throatWidthM)
    {
        _throatFt = throatWidthM / Feet.FootM;
        // A width typed in centimetres may miss the end by half of one.
        if (!(_throatFt is >= 0.98 and <= 8.02 or >= 9.98 and <= 50.02))
            throw new ArgumentOutOfRangeException(nameof(throatWidthM), throatWidthM, "The throat is 1 to 8 ft or 10 to 50 ft wide.");
        ThroatWidthM = throatWidthM;
        _exponent = 1.522 * Math.Pow(_throatFt, 0.026);
    }

    /// <inheritdoc/>
    public override string KindId => "parshall-flume";

    /// <inheritdoc/>
    public override Method Method => IsLarge ? Large : Medium;

    /// <summary>Width of the throat W, m.</summary>
    public double ThroatWidthM { get; }

    /// <summary>Lowest head, m: from memory, by size.</summary>
    public override double LowestHeadM => Feet.FootM * (_throatFt switch
    {
        < 1.5 => 0.1,
        < 3.5 => 0.15,
        < 5.5 => 0.2,
        < 9 => 0.25,
        < 11 => 0.3,
        < 13 => 0.33,
        < 17 => 0.38,
        _ => 0.5,
    });

    /// <summary>Highest head, m: from memory, by size.</summary>
    public override double HighestHeadM => Feet.FootM * (_throatFt switch
    {
        < 9 => 2.5,
        < 11 => 3.5,
        < 13 => 4.5,
        < 17 => 5.5,
        _ => 6,
    });

    /// <summary>0.7 for 1 to 8 ft, 0.8 for 10 to 50 ft.</summary>
    public override double SubmergenceLimitRatio => IsLarge ? 0.8 : 0.7;

    private bool IsLarge => _throatFt > 9;

    /// <inheritdoc/>
    public override string Describe() =>
        $"Parshall flume, throat {ThroatWidthM.ToString("0.###", CultureInfo.InvariantCulture)} m ({_throatFt.ToString("0.##", CultureInfo.InvariantCulture)} ft)";

    /// <inheritdoc/>
    public override MethodUse UsedBetween(double lowestM, double highestM) => Method.Used(new InputSpan("W", ThroatWidthM, ThroatWidthM), new InputSpan("h_a", lowestM, highestM), new InputSpan("h_a/h_{max}", lowestM / HighestHeadM, highestM / HighestHeadM));

    /// <inheritdoc/>
    protected override double FreeFlowM3PerS(double headM)
    {
        var headFt = headM / Feet.FootM;
        return Feet.CubicFootM3 * (IsLarge
            ? ((3.6875 * _throatFt) + 2.5) * Math.Pow(headFt, 1.6)
            : 4 * _throatFt * Math.Pow(headFt, _exponent));
    }
}
