using HeadToWatts.Turbines.Units;

namespace HeadToWatts.EnergyYield;

/// <summary>
/// Power at the meter as a function of the usable flow. Units come in one after another as the flow rises; where one more unit,
/// or more flow through the pipe, would give less power than before, the flow taken stays where the power was highest and the
/// rest passes by (decision 0007). Power therefore never falls as the usable flow rises.
/// </summary>
public sealed class PlantCurve
{
    private readonly double[] _from;
    private readonly double[] _heldFlow;
    private readonly double _gammaKnPerM3;
    private readonly bool _isConstant;
    private readonly PlantCurve? _inTurn;

    /// <summary>Works out where the plant follows the flow and where it holds.</summary>
    /// <param name="design">The plant.</param>
    public PlantCurve(PlantDesign design)
    {
        ArgumentNullException.ThrowIfNull(design);
        _gammaKnPerM3 = design.Site.SpecificWeightNPerM3 / 1000;
        _isConstant = design.Train.IsConstant;
        Design = _isConstant ? design : design with { Train = design.Train.RatedFor(BestUnitShaftKw(design), design.Units.UnitCount) };
        if (design.Units.Split == LoadSplit.Best && design.MovingHead is null)
            _inTurn = new PlantCurve(Design with { Units = design.Units.With(LoadSplit.InTurn) });
        if (design.MovingHead is not null)
        {
            _from = [0];
            _heldFlow = [double.NaN];
            var points = BreakpointsM3PerS.Where(q => q > 0).Select(At).ToList();
            var highest = points.MaxBy(p => p.MeterPowerKw);
            BestFlowM3PerS = highest.TurbineFlowM3PerS;
            BestPowerKw = highest.MeterPowerKw;
            BestUsableFlowM3PerS = highest.UsableFlowM3PerS;
            return;
        }

        var from = new List<double>();
        var held = new List<double>();
        var best = new Best(0, 0);
        var edges = Edges(design.Units);
        Add(0, 0);
        for (var i = 0; i + 1 < edges.Count; i++)
            best = Piece(edges[i], edges[i + 1], best, Add);

        // Beyond the design flow nothing more is taken.
        Add(edges[^1], best.FlowM3PerS);
        BestFlowM3PerS = best.FlowM3PerS;
        BestPowerKw = best.PowerKw;
        BestUsableFlowM3PerS = best.FlowM3PerS;
        _from = [.. from];
        _heldFlow = [.. held];

        void Add(double fromFlow, double heldFlow)
        {
            if (from.Count > 0 && fromFlow <= from[^1])
            {
                held[^1] = heldFlow;
                return;
            }

            if (held.Count > 0 && (held[^1].Equals(heldFlow) || (double.IsNaN(held[^1]) && double.IsNaN(heldFlow))))
                return;
            from.Add(fromFlow);
            held.Add(heldFlow);
        }
    }

    /// <summary>The plant.</summary>
    public PlantDesign Design { get; }

    /// <summary>The turbine flow of highest power, m3/s: the design flow, or less when the pipe loses more than the flow brings.</summary>
    public double BestFlowM3PerS { get; }

    /// <summary>The highest power at the meter, kW.</summary>
    public double BestPowerKw { get; }

    /// <summary>The usable flow of highest power, m3/s; where the head moves with the flow it may lie below or above the design flow.</summary>
    public double BestUsableFlowM3PerS { get; }

    /// <summary>True when each usable flow has a gross head of its own, so that power may fall as the flow rises.</summary>
    public bool HeadMoves => Design.MovingHead is not null;

    /// <summary>Usable flows at which the behaviour changes, ascending, m3/s.</summary>
    public IReadOnlyList<double> BreakpointsM3PerS
    {
        get
        {
            var all = new SortedSet<double>(Edges(Design.Units));
            foreach (var flow in _from)
                all.Add(flow);
            foreach (var flow in Design.MovingHead?.BreakpointsM3PerS() ?? [])
                all.Add(flow);
            return [.. all];
        }
    }

    /// <summary>How the plant runs on a usable flow.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public PlantPoint At(double usableFlowM3PerS)
    {
        var grossHeadM = Design.GrossHeadM(usableFlowM3PerS);
        var taken = Design.MovingHead is null ? FlowTakenM3PerS(usableFlowM3PerS) : MovingDispatch.FlowTakenM3PerS(this, usableFlowM3PerS, grossHeadM);
        var point = taken > 0 ? Follow(taken, grossHeadM) with { UsableFlowM3PerS = usableFlowM3PerS } : Standing(usableFlowM3PerS, grossHeadM);

        // The search for the best split goes in steps, and its pieces have more than one top: it is never let fall below one after another.
        return _inTurn is { } simple && simple.At(usableFlowM3PerS) is var other && other.MeterPowerKw > point.MeterPowerKw ? other : point;
    }

    /// <summary>Of a usable flow, what the plant would take, m3/s.</summary>
    /// <param name="usableFlowM3PerS">Usable flow, m3/s.</param>
    public double FlowTakenM3PerS(double usableFlowM3PerS)
    {
        if (Design.MovingHead is { } moving)
            return MovingDispatch.FlowTakenM3PerS(this, usableFlowM3PerS, moving.GrossHeadM(usableFlowM3PerS));
        var lo = 0;
        var hi = _from.Length - 1;
        while (lo < hi)
        {
            var mid = (lo + hi + 1) / 2;

            // A piece begins just above its lower end: at that flow itself the units still run as in the piece below.
            if (_from[mid] < usableFlowM3PerS)
                lo = mid;
            else
                hi = mid - 1;
        }

        var held = _heldFlow[lo];
        return double.IsNaN(held) ? usableFlowM3PerS : held;
    }

    private static List<double> Edges(UnitSet units)
    {
        var edges = new List<double> { 0 };
        foreach (var flow in units.FlowBreakpointsM3PerS)
        {
            if (flow > edges[^1] && flow < units.DesignFlowM3PerS * (1 - 1e-12))
                edges.Add(flow);
        }

        edges.Add(units.DesignFlowM3PerS);
        return edges;
    }

    // Inside a piece the units running do not change and efficiency is linear, so power rises to one top at most.
    private Best Piece(double a, double b, Best best, Action<double, double> add)
    {
        var start = a + (1e-10 * (b - a));

        // A flow within rounding of full units is still passed by those units (UnitSet), so the next piece begins a hair above.
        var above = a > 0 ? a + (2e-12 * Design.Units.UnitDesignFlowM3PerS) : 0;
        if (PowerKw(start) >= best.PowerKw && PowerKw(b) > PowerKw(b - (1e-6 * (b - a))) && PowerKw(b) > best.PowerKw)
        {
            add(above, double.NaN);
            return new Best(b, PowerKw(b));
        }

        var top = Top(start, b);
        if (PowerKw(top) <= best.PowerKw)
        {
            add(a, best.FlowM3PerS);
            return best;
        }

        if (PowerKw(start) < best.PowerKw)
        {
            add(a, best.FlowM3PerS);
            add(Crossing(start, top, best.PowerKw), double.NaN);
        }
        else
        {
            add(above, double.NaN);
        }

        if (top < b)
            add(top, top);
        return new Best(top, PowerKw(top));
    }

    private double Top(double a, double b)
    {
        if (PowerKw(b) > PowerKw(b - (1e-6 * (b - a))))
            return b;
        const double golden = 0.6180339887498949;
        var x1 = b - (golden * (b - a));
        var x2 = a + (golden * (b - a));
        var f1 = PowerKw(x1);
        var f2 = PowerKw(x2);
        while (b - a > 1e-9 * b)
        {
            if (f1 < f2)
            {
                a = x1;
                (x1, f1) = (x2, f2);
                x2 = a + (golden * (b - a));
                f2 = PowerKw(x2);
            }
            else
            {
                b = x2;
                (x2, f2) = (x1, f1);
                x1 = b - (golden * (b - a));
                f1 = PowerKw(x1);
            }
        }

        return (a + b) / 2;
    }

    private double Crossing(double a, double b, double powerKw)
    {
        for (var i = 0; i < 60 && b - a > 1e-15 * b; i++)
        {
            var mid = (a + b) / 2;
            if (PowerKw(mid) < powerKw)
                a = mid;
            else
                b = mid;
        }

        return b;
    }

    private PlantPoint Standing(double usableFlowM3PerS, double grossHeadM) =>
        new(usableFlowM3PerS, 0, 0, grossHeadM, 0, 0, -Design.Train.StandingDrawKw) { GrossHeadM = grossHeadM };

    // Machines are rated for a unit's highest power at the rated head, however the flow is split; where the pipe takes more than the flow brings, that is below full flow.
    private static double BestUnitShaftKw(PlantDesign design)
    {
        const int steps = 20;
        var best = 0.0;
        for (var i = 1; i <= steps; i++)
        {
            var flow = design.Units.DesignFlowM3PerS * i / steps;
            best = Math.Max(best, flow * design.NetHeadM(flow) * design.Units.InTurnAt(flow).Efficiency);
        }

        return best * design.Site.SpecificWeightNPerM3 / 1000 / design.Units.UnitCount;
    }

    private double PowerKw(double flowM3PerS) => Follow(flowM3PerS, Design.GrossHead.Metres).MeterPowerKw;

    // The units' own answer to a flow, whether or not taking it is wise.
    internal PlantPoint Follow(double flowM3PerS, double grossHeadM)
    {
        if (Design.HeadBehaviour is { } behaviour)
            return Away(flowM3PerS, grossHeadM, behaviour);
        var point = Loaded(flowM3PerS, grossHeadM, Design.Units.LoadAt(flowM3PerS));
        return Design.Units.Split == LoadSplit.Best ? Better(point, Loaded(flowM3PerS, grossHeadM, Design.Units.InTurnAt(flowM3PerS))) : point;
    }

    private static PlantPoint Better(in PlantPoint a, in PlantPoint b) => b.IsRunning && (!a.IsRunning || b.MeterPowerKw > a.MeterPowerKw) ? b : a;

    // Away from the rated head every unit passes less; what a unit is opened to is its flow over what it can pass there.
    private PlantPoint Away(double flowM3PerS, double grossHeadM, HeadBehaviour behaviour)
    {
        var capacity = behaviour.CapacityRatio(grossHeadM - Design.LossM(Math.Min(flowM3PerS, Design.Units.DesignFlowM3PerS)));
        if (capacity <= 0)
            return Standing(flowM3PerS, grossHeadM);
        var point = Of(Design.Units.LoadAt(flowM3PerS / capacity));
        return Design.Units.Split == LoadSplit.Best ? Better(point, Of(Design.Units.InTurnAt(flowM3PerS / capacity))) : point;

        PlantPoint Of(UnitLoad load)
        {
            if (load.Running == 0)
                return Standing(flowM3PerS, grossHeadM);
            var passed = load.TurbineFlowM3PerS * capacity;
            var opening = load.TurbineFlowM3PerS / (load.RunningShare * Design.Units.DesignFlowM3PerS);
            var efficiency = behaviour.Efficiency(Math.Min(1, opening), load.Efficiency, grossHeadM - Design.LossM(passed));
            return efficiency <= 0
                ? Standing(flowM3PerS, grossHeadM)
                : Loaded(flowM3PerS, grossHeadM, load with { TurbineFlowM3PerS = passed, FlowPerUnitM3PerS = load.FlowPerUnitM3PerS * capacity, Efficiency = efficiency });
        }
    }

    private PlantPoint Loaded(double flowM3PerS, double grossHeadM, in UnitLoad load)
    {
        if (load.Running == 0)
            return Standing(flowM3PerS, grossHeadM);
        var netHeadM = grossHeadM - Design.LossM(load.TurbineFlowM3PerS);
        var shaftKw = _gammaKnPerM3 * load.TurbineFlowM3PerS * netHeadM * load.Efficiency;
        var meterKw = _isConstant ? Design.Train.MeterPowerKw(shaftKw) : Design.Train.At(shaftKw, load.RunningShare, load.LoadSpread).MeterKw;
        return new PlantPoint(flowM3PerS, load.TurbineFlowM3PerS, load.Running, netHeadM, load.Efficiency, shaftKw, meterKw) { GrossHeadM = grossHeadM, RunningShare = load.RunningShare, LoadSpread = load.LoadSpread };
    }

    private readonly record struct Best(double FlowM3PerS, double PowerKw);
}
