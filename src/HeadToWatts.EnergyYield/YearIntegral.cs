using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.EnergyYield;

/// <summary>
/// A year's means over the whole duration curve. The curve is cut wherever the plant changes its behaviour, so that in each
/// panel power is a smooth function of a flow that is linear in time; panels are integrated by Gauss-Legendre rules, halved
/// until two successive values agree to 1e-9 of the plant's full power.
/// </summary>
/// <param name="TurbineFlowM3PerS">Mean flow through the turbines while fit to run, m3/s.</param>
/// <param name="GrossPowerKw">Mean of gamma Q H_gross of the turbined water, kW.</param>
/// <param name="HydraulicPowerKw">Mean of gamma Q H_net, kW.</param>
/// <param name="ShaftPowerKw">Mean power at the shaft, kW.</param>
/// <param name="MeterPowerKw">Mean power at the meter, kW.</param>
/// <param name="RunningShare">Share of the year in which water goes through a turbine, 0 to 1.</param>
/// <param name="BelowLeastM3PerS">Mean usable flow left while the plant stands, m3/s.</param>
/// <param name="UsableM3PerS">Mean usable flow, m3/s.</param>
/// <param name="Panels">Panels integrated.</param>
public sealed record YearIntegral(
    double TurbineFlowM3PerS,
    double GrossPowerKw,
    double HydraulicPowerKw,
    double ShaftPowerKw,
    double MeterPowerKw,
    double RunningShare,
    double BelowLeastM3PerS,
    double UsableM3PerS,
    int Panels)
{
    /// <summary>Means after each step from the shaft to the meter; null where the steps keep constant ratios.</summary>
    public TrainMeans? Train { get; init; }

    private const double Agreement = 1e-9;

    private static readonly double[] Nodes2 = [-0.5773502691896257, 0.5773502691896257];
    private static readonly double[] Weights2 = [1, 1];
    private static readonly double[] Nodes5 = [-0.9061798459386640, -0.5384693101056831, 0, 0.5384693101056831, 0.9061798459386640];
    private static readonly double[] Weights5 = [0.2369268850561891, 0.4786286704993665, 0.5688888888888889, 0.4786286704993665, 0.2369268850561891];

    /// <summary>Integrates a plant over a year of flows.</summary>
    /// <param name="plant">The plant.</param>
    /// <param name="supply">The flows.</param>
    public static YearIntegral Over(PlantCurve plant, FlowSupply supply)
    {
        ArgumentNullException.ThrowIfNull(plant);
        ArgumentNullException.ThrowIfNull(supply);
        var sums = new Sums(plant);
        var edges = plant.BreakpointsM3PerS;
        var p = supply.Exceedance;
        var u = supply.UsableM3PerS;
        for (var i = 0; i + 1 < p.Length; i++)
        {
            var width = p[i + 1] - p[i];
            if (width <= 0)
                continue;
            var (high, low) = (u[i], u[i + 1]);
            if (high <= low)
            {
                sums.Constant(low, width);
                continue;
            }

            // Cut at the edges that lie strictly inside, from the high flow down.
            var from = high;
            for (var e = LastBelow(edges, high); e >= 0 && edges[e] > low; e--)
            {
                sums.Panel(from, edges[e], width * (from - edges[e]) / (high - low));
                from = edges[e];
            }

            sums.Panel(from, low, width * (from - low) / (high - low));
        }

        return sums.Done();
    }

    /// <summary>Adds the integrals of parts of the year, such as months, each dry outside its part.</summary>
    /// <param name="parts">The parts.</param>
    public static YearIntegral Sum(IReadOnlyList<YearIntegral> parts)
    {
        ArgumentNullException.ThrowIfNull(parts);
        return new YearIntegral(
            parts.Sum(p => p.TurbineFlowM3PerS),
            parts.Sum(p => p.GrossPowerKw),
            parts.Sum(p => p.HydraulicPowerKw),
            parts.Sum(p => p.ShaftPowerKw),
            parts.Sum(p => p.MeterPowerKw),
            parts.Sum(p => p.RunningShare),
            parts.Sum(p => p.BelowLeastM3PerS),
            parts.Sum(p => p.UsableM3PerS),
            parts.Sum(p => p.Panels)) { Train = TrainMeans.Sum(parts.Select(p => p.Train)) };
    }

    private static int LastBelow(IReadOnlyList<double> edges, double flow)
    {
        var lo = 0;
        var hi = edges.Count;
        while (lo < hi)
        {
            var mid = (lo + hi) / 2;
            if (edges[mid] < flow)
                lo = mid + 1;
            else
                hi = mid;
        }

        return lo - 1;
    }

    private sealed class Sums(PlantCurve plant)
    {
        private readonly double _gammaKn = plant.Design.Site.SpecificWeightNPerM3 / 1000;
        private readonly double _tolerance = Agreement * Math.Max(plant.BestPowerKw, 1e-12);
        private double _turbine;
        private double _gross;
        private double _hydraulic;
        private double _shaft;
        private double _meter;
        private double _running;
        private double _below;
        private double _usable;
        private int _panels;
        private TrainPower _train;
        private double _standing;

        public void Constant(double usable, double width) => Add(plant.At(usable), width);

        public void Panel(double high, double low, double width)
        {
            if (width <= 0)
                return;
            _panels++;
            var middle = plant.At((high + low) / 2);

            // Held: everything but the passing water is constant over the panel.
            if (!plant.HeadMoves && (!middle.IsRunning || middle.TurbineFlowM3PerS < low || middle.TurbineFlowM3PerS > high))
            {
                Add(middle, width);
                return;
            }

            if (high - low < 0.003 * high)
            {
                Add(high, low, width, Nodes2, Weights2);
                return;
            }

            Refine(high, low, width, Mean(high, low), 0);
        }

        public YearIntegral Done() =>
            new(_turbine, _gross, _hydraulic, _shaft, _meter, _running, _below, _usable, _panels)
            {
                Train = plant.Design.Train.IsConstant ? null : new TrainMeans(_train.DrivenKw, _train.GeneratedKw, _train.SentKw, _train.TransformedKw, _train.MeterKw, _standing),
            };

        private double Mean(double high, double low)
        {
            var sum = 0.0;
            for (var i = 0; i < Nodes5.Length; i++)
                sum += Weights5[i] / 2 * plant.At(((high + low) / 2) + (Nodes5[i] * (high - low) / 2)).MeterPowerKw;
            return sum;
        }

        private void Refine(double high, double low, double width, double mean, int depth)
        {
            var middle = (high + low) / 2;
            var upper = Mean(high, middle);
            var lower = Mean(middle, low);
            if (Math.Abs(((upper + lower) / 2) - mean) * width <= _tolerance * Math.Max(width, 1e-3) || depth >= 24)
            {
                Add(high, middle, width / 2, Nodes5, Weights5);
                Add(middle, low, width / 2, Nodes5, Weights5);
                return;
            }

            Refine(high, middle, width / 2, upper, depth + 1);
            Refine(middle, low, width / 2, lower, depth + 1);
        }

        private void Add(double high, double low, double width, double[] nodes, double[] weights)
        {
            for (var i = 0; i < nodes.Length; i++)
                Add(plant.At(((high + low) / 2) + (nodes[i] * (high - low) / 2)), width * weights[i] / 2);
        }

        private void Add(in PlantPoint point, double width)
        {
            _usable += width * point.UsableFlowM3PerS;
            if (!point.IsRunning)
            {
                _below += width * point.UsableFlowM3PerS;
                _meter += width * point.MeterPowerKw;
                _standing -= width * point.MeterPowerKw;
                return;
            }

            _running += width;
            _turbine += width * point.TurbineFlowM3PerS;
            _gross += width * _gammaKn * point.TurbineFlowM3PerS * point.GrossHeadM;
            _hydraulic += width * _gammaKn * point.TurbineFlowM3PerS * point.NetHeadM;
            _shaft += width * point.ShaftPowerKw;
            _meter += width * point.MeterPowerKw;
            if (plant.Design.Train is not { IsConstant: false } train)
                return;
            var power = train.At(point.ShaftPowerKw, point.RunningShare, point.LoadSpread);
            _train = new TrainPower(
                _train.DrivenKw + (width * power.DrivenKw),
                _train.GeneratedKw + (width * power.GeneratedKw),
                _train.SentKw + (width * power.SentKw),
                _train.TransformedKw + (width * power.TransformedKw),
                _train.MeterKw + (width * power.MeterKw));
        }
    }
}
