using HeadToWatts.FlowRecords;

namespace HeadToWatts.EnergyYield;

/// <summary>The flow-duration curve together with what must be left in the stream or delivered first: what the plant may use, and when.</summary>
public sealed class FlowSupply
{
    private readonly double[] _exceedance;
    private readonly double[] _arriving;
    private readonly double[] _usable;

    /// <summary>Lays the allocation over the curve; the curve gets a point wherever the allocation changes its rule.</summary>
    /// <param name="curve">Flow arriving over the year.</param>
    /// <param name="allocation">Prior deliveries and reserved flow.</param>
    public FlowSupply(FlowDurationCurve curve, WaterAllocation allocation)
    {
        ArgumentNullException.ThrowIfNull(curve);
        ArgumentNullException.ThrowIfNull(allocation);
        Curve = curve;
        Allocation = allocation;
        var kinks = allocation.FlowBreakpointsM3PerS;
        var p = new List<double>();
        var q = new List<double>();
        var exceedances = curve.ExceedanceSpan;
        var flows = curve.FlowSpan;
        for (var i = 0; i < flows.Length; i++)
        {
            if (i > 0)
            {
                foreach (var kink in kinks.OrderDescending())
                {
                    if (kink < flows[i - 1] && kink > flows[i])
                    {
                        p.Add(exceedances[i - 1] + ((flows[i - 1] - kink) / (flows[i - 1] - flows[i]) * (exceedances[i] - exceedances[i - 1])));
                        q.Add(kink);
                    }
                }
            }

            p.Add(exceedances[i]);
            q.Add(flows[i]);
        }

        _exceedance = [.. p];
        _arriving = [.. q];
        _usable = new double[q.Count];
        for (var i = 0; i < _usable.Length; i++)
            _usable[i] = allocation.Split(_arriving[i]).UsableM3PerS;
    }

    /// <summary>Flow arriving over the year.</summary>
    public FlowDurationCurve Curve { get; }

    /// <summary>Prior deliveries and reserved flow.</summary>
    public WaterAllocation Allocation { get; }

    /// <summary>Exceedance of each point, ascending, 0 to 1.</summary>
    public ReadOnlySpan<double> Exceedance => _exceedance;

    /// <summary>Flow arriving at each point, m3/s.</summary>
    public ReadOnlySpan<double> ArrivingM3PerS => _arriving;

    /// <summary>Flow the plant may use at each point, m3/s; never rising.</summary>
    public ReadOnlySpan<double> UsableM3PerS => _usable;

    /// <summary>The usable flow exceeded for a share of the year, m3/s.</summary>
    /// <param name="exceedance">Share of the year, 0 to 1.</param>
    public double UsableAtM3PerS(double exceedance) => Allocation.Split(Curve.FlowAt(exceedance)).UsableM3PerS;

    /// <summary>Share of the year in which the usable flow is at least this, 0 to 1.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s; above 0.</param>
    public double ShareAtLeast(double usableFlowM3PerS)
    {
        var share = 0.0;
        for (var i = 0; i + 1 < _usable.Length; i++)
        {
            if (_usable[i] < usableFlowM3PerS)
                break;
            share = _exceedance[i];
            if (_usable[i + 1] >= usableFlowM3PerS)
            {
                share = _exceedance[i + 1];
            }
            else if (_usable[i] > _usable[i + 1])
            {
                share = _exceedance[i] + ((_usable[i] - usableFlowM3PerS) / (_usable[i] - _usable[i + 1]) * (_exceedance[i + 1] - _exceedance[i]));
            }
        }

        return share;
    }

    /// <summary>
    /// The usable flow at the middle of equal shares of the year, m3/s: quick sums for comparing many plants. The figures that
    /// are reported come from <see cref="YearIntegral"/>.
    /// </summary>
    /// <param name="shares">Number of equal shares.</param>
    public double[] MiddlesM3PerS(int shares)
    {
        var middles = new double[shares];
        var at = 0;
        for (var i = 0; i < shares; i++)
        {
            var p = (i + 0.5) / shares;
            while (at + 2 < _exceedance.Length && _exceedance[at + 1] < p)
                at++;
            var width = _exceedance[at + 1] - _exceedance[at];
            var t = width > 0 ? (p - _exceedance[at]) / width : 0;
            middles[i] = _usable[at] + (Math.Clamp(t, 0, 1) * (_usable[at + 1] - _usable[at]));
        }

        return middles;
    }
}
