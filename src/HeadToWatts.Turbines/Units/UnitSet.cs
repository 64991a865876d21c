namespace HeadToWatts.Turbines.Units;

/// <summary>What the units do at one flow.</summary>
/// <param name="Running">Number of units running.</param>
/// <param name="FlowPerUnitM3PerS">Flow through each running unit, m3/s.</param>
/// <param name="TurbineFlowM3PerS">Flow through all units, m3/s.</param>
/// <param name="Efficiency">Efficiency of each running turbine, 0 to 1; 0 when none runs.</param>
public readonly record struct UnitLoad(int Running, double FlowPerUnitM3PerS, double TurbineFlowM3PerS, double Efficiency)
{
    /// <summary>Full flow of the running units over that of all units, 0 to 1.</summary>
    public double RunningShare { get; init; }

    /// <summary>Mean square of the units' loads over the square of their mean, weighted by size over all units; 1/RunningShare when those that run share alike.</summary>
    public double LoadSpread { get; init; }
}

/// <summary>
/// Equal units brought in one after another as flow rises. As many run as are needed to pass the flow, and they share it equally;
/// where that share is below the least flow of a unit, one fewer runs at full flow and the rest is passed by.
/// </summary>
public sealed class UnitSet
{
    // Keeps j units at exactly j times the unit flow when the division comes out a rounding above j.
    private const double CountSlack = 1e-12;

    /// <summary>Makes a set of equal units.</summary>
    /// <param name="type">Turbine type.</param>
    /// <param name="efficiency">Efficiency of one unit: the type's own, or a manufacturer's table.</param>
    /// <param name="leastFlowRatio">Least flow of a unit against its full flow, 0 to 1.</param>
    /// <param name="unitCount">Number of units, at least 1.</param>
    /// <param name="designFlowM3PerS">Full flow of all units together, m3/s, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">A number outside its range.</exception>
    public UnitSet(TurbineType type, EfficiencyCurve efficiency, double leastFlowRatio, int unitCount, double designFlowM3PerS)
    {
        ArgumentNullException.ThrowIfNull(type);
        ArgumentNullException.ThrowIfNull(efficiency);
        ArgumentOutOfRangeException.ThrowIfLessThan(unitCount, 1);
        if (leastFlowRatio is not (>= 0 and <= 1))
            throw new ArgumentOutOfRangeException(nameof(leastFlowRatio), leastFlowRatio, "The least flow ratio lies between 0 and 1.");
        if (!(designFlowM3PerS > 0) || double.IsInfinity(designFlowM3PerS))
            throw new ArgumentOutOfRangeException(nameof(designFlowM3PerS), designFlowM3PerS, "The design flow is a positive number.");
        Type = type;
        Efficiency = efficiency;
        LeastFlowRatio = leastFlowRatio;
        UnitCount = unitCount;
        DesignFlowM3PerS = designFlowM3PerS;
        UnitDesignFlowM3PerS = designFlowM3PerS / unitCount;
        LeastFlowM3PerS = leastFlowRatio * UnitDesignFlowM3PerS;
        FlowBreakpointsM3PerS = Breakpoints();
    }

    /// <summary>Turbine type.</summary>
    public TurbineType Type { get; }

    /// <summary>Efficiency of one unit.</summary>
    public EfficiencyCurve Efficiency { get; }

    /// <summary>Least flow of a unit against its full flow, 0 to 1.</summary>
    public double LeastFlowRatio { get; }

    /// <summary>Number of units.</summary>
    public int UnitCount { get; }

    /// <summary>Full flow of all units together, m3/s.</summary>
    public double DesignFlowM3PerS { get; }

    /// <summary>Full flow of one unit, m3/s.</summary>
    public double UnitDesignFlowM3PerS { get; }

    /// <summary>Least flow of one unit, m3/s; below it nothing runs.</summary>
    public double LeastFlowM3PerS { get; }

    /// <summary>
    /// Every flow up to the design flow at which the load kinks or jumps, rising, in m3/s: where units start, where they are full,
    /// and where a straight piece of the efficiency curve ends. Between two of them turbine flow and efficiency are straight lines.
    /// </summary>
    public IReadOnlyList<double> FlowBreakpointsM3PerS { get; }

    /// <summary>What the units do with a usable flow (m3/s, after reserved flow).</summary>
    public UnitLoad LoadAt(double usableFlowM3PerS)
    {
        if (!(usableFlowM3PerS > 0) || usableFlowM3PerS < LeastFlowM3PerS)
            return default;
        var flow = Math.Min(usableFlowM3PerS, DesignFlowM3PerS);
        var running = Math.Clamp((int)Math.Ceiling((flow / UnitDesignFlowM3PerS) - CountSlack), 1, UnitCount);
        var share = Math.Min(flow / running, UnitDesignFlowM3PerS);
        if (share < LeastFlowM3PerS && running > 1)
        {
            running--;
            share = UnitDesignFlowM3PerS;
        }

        return new UnitLoad(running, share, Math.Min(share * running, flow), Efficiency.At(share / UnitDesignFlowM3PerS))
        {
            RunningShare = (double)running / UnitCount,
            LoadSpread = (double)UnitCount / running,
        };
    }

    private List<double> Breakpoints()
    {
        var flows = new SortedSet<double>();
        for (var running = 1; running <= UnitCount; running++)
        {
            var full = running == UnitCount ? DesignFlowM3PerS : running * UnitDesignFlowM3PerS;
            var start = Math.Max((running - 1) * UnitDesignFlowM3PerS, running * LeastFlowM3PerS);
            flows.Add(start);
            flows.Add(full);
            foreach (var point in Efficiency.Points)
            {
                var flow = point.FlowRatio * UnitDesignFlowM3PerS * running;
                if (flow > start && flow < full)
                    flows.Add(flow);
            }
        }

        flows.Remove(0);
        return Apart(flows);
    }

    // The same breakpoint reached by two routes differs by rounding; it is kept once.
    private List<double> Apart(SortedSet<double> flows)
    {
        var apart = new List<double>(flows.Count);
        foreach (var flow in flows)
        {
            if (apart.Count == 0 || flow - apart[^1] > 1e-12 * DesignFlowM3PerS)
                apart.Add(flow);
        }

        return apart;
    }
}
