using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Units;

/// <summary>
/// A unit held at its speed by the grid while the head moves. Its capacity goes with the root of the head; its efficiency falls
/// with the square of how far its speed is off for that head, down to nothing at runaway (decision 0013).
/// </summary>
public sealed class HeldSpeed : HeadBehaviour
{
    /// <summary>Least head over rated head below which a unit is shut off, when nothing else is given (common practice, no source).</summary>
    public const double UsualLeastHeadRatio = 0.65;

    private readonly double _ratedHeadM;
    private readonly double _perSpeed;
    private readonly double _leastHeadM;

    /// <summary>Makes the behaviour of a unit.</summary>
    /// <param name="ratedHeadM">Net head for which the unit is rated, m, above 0.</param>
    /// <param name="runawayRatio">Runaway over rated speed, above 1.</param>
    /// <param name="leastHeadM">Net head below which it is shut off, m.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number outside its range.</exception>
    public HeldSpeed(double ratedHeadM, double runawayRatio, double leastHeadM)
    {
        if (!(ratedHeadM > 0) || double.IsInfinity(ratedHeadM))
            throw new ArgumentOutOfRangeException(nameof(ratedHeadM), ratedHeadM, "A rated head is a positive number.");
        if (!(runawayRatio > 1) || double.IsInfinity(runawayRatio))
            throw new ArgumentOutOfRangeException(nameof(runawayRatio), runawayRatio, "Runaway is faster than the rated speed.");
        if (!(leastHeadM >= 0) || double.IsInfinity(leastHeadM))
            throw new ArgumentOutOfRangeException(nameof(leastHeadM), leastHeadM, "A least head is not negative.");
        (_ratedHeadM, _perSpeed, _leastHeadM) = (ratedHeadM, 1 / (runawayRatio - 1), leastHeadM);
    }

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "held-speed", "Efficiency and capacity away from the rated head", "Q/Q_r = (H/H_r)^{1/2}, η/η_r = 1 − (((H_r/H)^{1/2} − 1)/(R − 1))^2",
        Source.Decision("0013", "Head away from the rated head"), "R is the runaway ratio", [new InputRange("H/H_r", "head over rated head", "1", 0.5, 1.5)]);

    /// <summary>Net head for which the unit is rated, m.</summary>
    public double RatedHeadM => _ratedHeadM;

    /// <summary>Net head below which it is shut off, m.</summary>
    public double LeastHeadM => _leastHeadM;

    /// <inheritdoc/>
    public override MethodUse Use => Method.Used();

    /// <inheritdoc/>
    public override double CapacityRatio(double netHeadM) => netHeadM >= _ratedHeadM ? 1 : netHeadM > 0 ? Math.Sqrt(netHeadM / _ratedHeadM) : 0;

    /// <summary>Efficiency over that at the rated head, 0 to 1.</summary>
    /// <param name="netHeadM">Net head, m.</param>
    public double EfficiencyFactor(double netHeadM)
    {
        if (!(netHeadM > 0) || netHeadM < _leastHeadM)
            return 0;
        var off = (Math.Sqrt(_ratedHeadM / netHeadM) - 1) * _perSpeed;
        return Math.Max(0, 1 - (off * off));
    }

    /// <inheritdoc/>
    public override double Efficiency(double openingRatio, double ratedEfficiency, double netHeadM) => ratedEfficiency * EfficiencyFactor(netHeadM);

    /// <inheritdoc/>
    public override HeadBehaviour Lowered(double lessEfficiency) => this;
}
