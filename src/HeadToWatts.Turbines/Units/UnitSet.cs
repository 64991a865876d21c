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
/// Units brought in one after another as flow rises. As many run as are needed to pass the flow, and they share it in proportion to
/// their size; where that share is below the least flow of one of them, one fewer runs at full flow and the rest is passed by. Units may be of
/// unequal size, and the flow may be split so that the turbines give most power instead.
/// </summary>
public sealed class UnitSet
{
    // Keeps j units at exactly j times the unit flow when the division comes out a rounding above j.
    private const double CountSlack = 1e-12;

    private readonly double[] _capacity = [];
    private readonly double[] _upTo = [];
    private readonly BestSplit? _best;

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
        Sizes = [.. Enumerable.Repeat(new UnitSize(1.0 / unitCount, leastFlowRatio), unitCount)];
        FlowBreakpointsM3PerS = Breakpoints();
    }

    /// <summary>Makes a set of units of any size, all of one type and one efficiency curve.</summary>
    /// <param name="type">Turbine type.</param>
    /// <param name="efficiency">Efficiency of each unit over its own flow ratio.</param>
    /// <param name="sizes">The units in the order in which they come in; their shares add up to 1.</param>
    /// <param name="designFlowM3PerS">Full flow of all units together, m3/s, above 0.</param>
    /// <param name="split">How they share the flow.</param>
    /// <exception cref="ArgumentException">No unit, or shares that do not add up.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number outside its range.</exception>
    public UnitSet(TurbineType type, EfficiencyCurve efficiency, IReadOnlyList<UnitSize> sizes, double designFlowM3PerS, LoadSplit split)
        : this(type, efficiency, (sizes ?? throw new ArgumentNullException(nameof(sizes))).Count == 0 ? throw new ArgumentException("A set has at least one unit.", nameof(sizes)) : sizes[0].LeastFlowRatio, sizes.Count, designFlowM3PerS)
    {
        foreach (var size in sizes)
        {
            if (!(size.ShareRatio is > 0 and <= 1) || size.LeastFlowRatio is not (>= 0 and <= 1))
                throw new ArgumentOutOfRangeException(nameof(sizes), size, "Shares lie above 0 and up to 1, least flows from 0 to 1.");
        }

        if (Math.Abs(sizes.Sum(s => s.ShareRatio) - 1) > 1e-9)
            throw new ArgumentException("The shares of the units add up to 1.", nameof(sizes));
        Sizes = [.. sizes];
        Split = split;
        if (IsPlain)
            return;
        _capacity = [.. sizes.Select(s => s.ShareRatio * designFlowM3PerS)];
        _upTo = new double[_capacity.Length];
        var sum = 0.0;
        for (var i = 0; i < _capacity.Length; i++)
            _upTo[i] = sum += _capacity[i];
        _upTo[^1] = designFlowM3PerS;
        double[] least = [.. sizes.Select((s, i) => s.LeastFlowRatio * _capacity[i])];
        LeastFlowM3PerS = split == LoadSplit.Best ? least.Min() : least[0];
        if (split == LoadSplit.Best && sizes.Count > 1)
            _best = new BestSplit(_capacity, least, efficiency, designFlowM3PerS);
        FlowBreakpointsM3PerS = BreakpointsOfAny();
    }

    /// <summary>The units in the order in which they come in.</summary>
    public IReadOnlyList<UnitSize> Sizes { get; } = [];

    /// <summary>How the units share the flow.</summary>
    public LoadSplit Split { get; }

    /// <summary>True for equal units that come in one after another: those that run are loaded alike.</summary>
    public bool IsPlain => Split == LoadSplit.InTurn && Sizes.All(s => s == Sizes[0]);

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
        if (_capacity.Length == 0)
            return Alike(usableFlowM3PerS);
        if (_best is null || !(usableFlowM3PerS > 0))
            return InTurnAt(usableFlowM3PerS);
        Span<double> flows = stackalloc double[_capacity.Length];
        return Best(usableFlowM3PerS, flows) ? Of(flows) : default;
    }

    /// <summary>What the units would do with a usable flow (m3/s) if they came in one after another, however they are set to share it.</summary>
    public UnitLoad InTurnAt(double usableFlowM3PerS)
    {
        if (_capacity.Length == 0)
            return Alike(usableFlowM3PerS);
        Span<double> flows = stackalloc double[_capacity.Length];
        return InTurn(usableFlowM3PerS, flows) ? Of(flows) : default;
    }

    /// <summary>Flow of each unit on a usable flow, m3/s, in the order of <see cref="Sizes"/>.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    /// <param name="split">How they share it.</param>
    public IReadOnlyList<double> UnitFlowsM3PerS(double usableFlowM3PerS, LoadSplit split)
    {
        var flows = new double[UnitCount];
        if (_capacity.Length == 0)
        {
            var load = Alike(usableFlowM3PerS);
            flows.AsSpan(0, load.Running).Fill(load.FlowPerUnitM3PerS);
        }
        else if (split == LoadSplit.InTurn || _best is null || !(usableFlowM3PerS > 0))
        {
            InTurn(usableFlowM3PerS, flows);
        }
        else
        {
            Best(usableFlowM3PerS, flows);
        }

        return flows;
    }

    /// <summary>The same units sharing the flow another way.</summary>
    /// <param name="split">How they share it.</param>
    public UnitSet With(LoadSplit split) => split == Split ? this : new UnitSet(Type, Efficiency, Sizes, DesignFlowM3PerS, split);

    /// <summary>The same units with another efficiency curve.</summary>
    /// <param name="efficiency">Efficiency of each unit.</param>
    public UnitSet With(EfficiencyCurve efficiency) => IsPlain
        ? new UnitSet(Type, efficiency, LeastFlowRatio, UnitCount, DesignFlowM3PerS)
        : new UnitSet(Type, efficiency, Sizes, DesignFlowM3PerS, Split);

    // The search goes in steps; where one after another happens to be better between two of them, it is that.
    private bool Best(double usableFlowM3PerS, Span<double> flows)
    {
        var isFound = _best!.TryAt(Math.Min(usableFlowM3PerS, DesignFlowM3PerS), flows);
        Span<double> simple = stackalloc double[flows.Length];
        if (!InTurn(usableFlowM3PerS, simple) || (isFound && Worth(flows) >= Worth(simple)))
            return isFound;
        simple.CopyTo(flows);
        return true;
    }

    private double Worth(ReadOnlySpan<double> flows)
    {
        var sum = 0.0;
        for (var i = 0; i < flows.Length; i++)
            sum += flows[i] > 0 ? flows[i] * Efficiency.At(flows[i] / _capacity[i]) : 0;
        return sum;
    }

    private bool InTurn(double usableFlowM3PerS, Span<double> flows)
    {
        flows.Clear();
        if (!(usableFlowM3PerS > 0))
            return false;
        var flow = Math.Min(usableFlowM3PerS, DesignFlowM3PerS);
        var running = 1;
        while (running < _upTo.Length && flow > _upTo[running - 1] * (1 + CountSlack))
            running++;
        var ratio = Math.Min(1, flow / _upTo[running - 1]);
        for (var i = 0; i < running; i++)
        {
            if (ratio >= Sizes[i].LeastFlowRatio)
                continue;
            if (running == 1)
                return false;
            (running, ratio) = (running - 1, 1);
            break;
        }

        for (var i = 0; i < running; i++)
            flows[i] = ratio * _capacity[i];
        return true;
    }

    private UnitLoad Of(ReadOnlySpan<double> flows)
    {
        var full = Efficiency.At(1);
        var running = 0;
        double flow = 0, worth = 0, share = 0, load = 0, square = 0;
        for (var i = 0; i < flows.Length; i++)
        {
            if (flows[i] <= 0)
                continue;
            running++;
            var efficiency = Efficiency.At(flows[i] / _capacity[i]);
            flow += flows[i];
            worth += flows[i] * efficiency;
            share += Sizes[i].ShareRatio;
            var y = full > 0 ? flows[i] * efficiency / (_capacity[i] * full) : 1;
            load += Sizes[i].ShareRatio * y;
            square += Sizes[i].ShareRatio * y * y;
        }

        return running == 0 ? default : new UnitLoad(running, flow / running, Math.Min(flow, DesignFlowM3PerS), worth / flow)
        {
            RunningShare = Math.Min(1, share),
            LoadSpread = load > 0 ? square / (load * load) : 1 / share,
        };
    }

    private List<double> BreakpointsOfAny()
    {
        var flows = new SortedSet<double>(_best?.BreakpointsM3PerS ?? []);
        for (var i = 0; i < _upTo.Length; i++)
        {
            var from = i == 0 ? 0 : _upTo[i - 1];
            flows.Add(_upTo[i]);
            foreach (var ratio in Efficiency.Points.Select(p => p.FlowRatio).Concat(Sizes.Take(i + 1).Select(s => s.LeastFlowRatio)))
            {
                if (ratio * _upTo[i] > from && ratio < 1)
                    flows.Add(ratio * _upTo[i]);
            }
        }

        flows.Add(LeastFlowM3PerS);
        flows.Remove(0);
        return Apart(flows);
    }

    private UnitLoad Alike(double usableFlowM3PerS)
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
