namespace HeadToWatts.Hydraulics.Transients;

/// <summary>Head and flow at every point of the grid, and what they went through.</summary>
internal sealed class PipeLine
{
    private readonly TransientCase _case;
    private readonly TransientGrid _grid;
    private readonly int[] _first;
    private readonly double[] _impedance;
    private readonly double[] _resistance;
    private readonly double[] _stations;
    private readonly double[] _centres;
    private readonly double[] _steady;
    private readonly double[] _highest;
    private readonly double[] _lowest;
    private double[] _heads;
    private double[] _flows;
    private double[] _nextHeads;
    private double[] _nextFlows;

    internal PipeLine(TransientCase transient, TransientGrid grid)
    {
        (_case, _grid) = (transient, grid);
        var pipes = transient.Pipes;
        var count = grid.ReachCount + pipes.Count;
        _first = new int[pipes.Count];
        _impedance = new double[pipes.Count];
        _resistance = new double[pipes.Count];
        (_stations, _centres, _steady) = (new double[count], new double[count], new double[count]);
        (_heads, _flows, _nextHeads, _nextFlows) = (new double[count], new double[count], new double[count], new double[count]);
        var place = 0;
        double stationM = 0, headM = transient.HeadwaterM;
        for (var p = 0; p < pipes.Count; p++)
        {
            var pipe = pipes[p];
            var reaches = grid.Reaches[p];
            _first[p] = place;
            _impedance[p] = grid.WaveSpeedsMPerS[p] / (transient.GravityMPerS2 * pipe.AreaM2);
            _resistance[p] = pipe.SteadyLossM / (reaches * transient.FlowM3PerS * transient.FlowM3PerS);
            for (var i = 0; i <= reaches; i++, place++)
            {
                var share = (double)i / reaches;
                _stations[place] = stationM + (share * pipe.LengthM);
                _centres[place] = pipe.StartCentreM + (share * (pipe.EndCentreM - pipe.StartCentreM));
                _steady[place] = _heads[place] = headM - (share * pipe.SteadyLossM);
                _flows[place] = transient.FlowM3PerS;
            }

            stationM += pipe.LengthM;
            headM -= pipe.SteadyLossM;
        }

        _highest = [.. _heads];
        _lowest = [.. _heads];
        Watch(0, 0);
    }

    internal ColumnSeparation? Separation { get; private set; }

    internal (double HeadM, double FlowM3PerS) AtMachine => (_heads[^1], _flows[^1]);

    /// <summary>One time step. The flow at the machine is given, or follows from head and a valve constant C in Q = C (ΔH)^(1/2).</summary>
    internal void Advance(double timeS, double? flowM3PerS, double valve)
    {
        for (var p = 0; p < _first.Length; p++)
            Inside(p);
        for (var p = 0; p < _first.Length; p++)
            UpperEnd(p);
        Machine(flowM3PerS, valve);
        (_heads, _nextHeads) = (_nextHeads, _heads);
        (_flows, _nextFlows) = (_nextFlows, _flows);
        Keep(timeS);
    }

    internal IReadOnlyList<TransientNode> Nodes()
    {
        var nodes = new List<TransientNode>(_heads.Length);
        for (var p = 0; p < _first.Length; p++)
        {
            for (var i = _first[p]; i <= _first[p] + _grid.Reaches[p]; i++)
                nodes.Add(new TransientNode(p, _stations[i], _centres[i], _steady[i], _highest[i], _lowest[i]));
        }

        return nodes;
    }

    private void Inside(int p)
    {
        double b = _impedance[p], r = _resistance[p];
        var from = _first[p];
        var count = _grid.Reaches[p] + 1;
        ReadOnlySpan<double> h = _heads.AsSpan(from, count), q = _flows.AsSpan(from, count);
        Span<double> nextH = _nextHeads.AsSpan(from, count), nextQ = _nextFlows.AsSpan(from, count);
        for (var i = 1; i < count - 1; i++)
        {
            var plus = h[i - 1] + (q[i - 1] * (b - (r * Math.Abs(q[i - 1]))));
            var minus = h[i + 1] - (q[i + 1] * (b - (r * Math.Abs(q[i + 1]))));
            nextH[i] = 0.5 * (plus + minus);
            nextQ[i] = 0.5 * (plus - minus) / b;
        }
    }

    // The reservoir before the first pipe, the joint with the pipe before it for the others.
    private void UpperEnd(int p)
    {
        var i = _first[p];
        var b = _impedance[p];
        var minus = _heads[i + 1] - (_flows[i + 1] * (b - (_resistance[p] * Math.Abs(_flows[i + 1]))));
        if (p == 0)
        {
            _nextHeads[i] = _case.HeadwaterM;
            _nextFlows[i] = (_case.HeadwaterM - minus) / b;
            return;
        }

        var above = _impedance[p - 1];
        var plus = Arriving(p - 1);
        var head = ((plus * b) + (minus * above)) / (above + b);
        _nextHeads[i - 1] = _nextHeads[i] = head;
        _nextFlows[i - 1] = _nextFlows[i] = (plus - minus) / (above + b);
    }

    private double Arriving(int p)
    {
        var last = _first[p] + _grid.Reaches[p] - 1;
        return _heads[last] + (_flows[last] * (_impedance[p] - (_resistance[p] * Math.Abs(_flows[last]))));
    }

    private void Machine(double? flowM3PerS, double valve)
    {
        var b = _impedance[^1];
        var plus = Arriving(_first.Length - 1);
        double flow;
        if (flowM3PerS is { } given)
        {
            flow = given;
        }
        else
        {
            // Q^2 = C^2 (C_P - B Q - H_t), with the sign of the head left over.
            var square = valve * valve;
            var half = 0.5 * b * square;
            var over = plus - _case.TailwaterM;
            flow = over >= 0 ? Math.Sqrt((half * half) + (square * over)) - half : half - Math.Sqrt((half * half) - (square * over));
        }

        _nextFlows[^1] = flow;
        _nextHeads[^1] = plus - (b * flow);
    }

    private void Keep(double timeS)
    {
        var heads = _heads;
        var deepest = double.PositiveInfinity;
        for (var i = 0; i < heads.Length; i++)
        {
            var h = heads[i];
            _highest[i] = Math.Max(_highest[i], h);
            _lowest[i] = Math.Min(_lowest[i], h);
            deepest = Math.Min(deepest, h - _centres[i]);
        }

        if (deepest < _case.SeparationHeadM && Separation is null)
            Watch(timeS, 0);
    }

    private void Watch(double timeS, int from)
    {
        for (var i = from; i < _heads.Length && Separation is null; i++)
        {
            if (_heads[i] - _centres[i] < _case.SeparationHeadM)
                Separation = new ColumnSeparation(timeS, _stations[i]);
        }
    }
}
