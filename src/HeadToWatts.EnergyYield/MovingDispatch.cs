namespace HeadToWatts.EnergyYield;

/// <summary>
/// What a plant takes of a usable flow when the gross head belongs to that flow: of sharing the whole flow and of running fewer
/// units full, whatever gives most power (decision 0007, with the head of the moment).
/// </summary>
internal static class MovingDispatch
{
    internal static double FlowTakenM3PerS(PlantCurve plant, double usableFlowM3PerS, double grossHeadM)
    {
        var units = plant.Design.Units;
        var unitFlow = units.DesignFlowM3PerS / units.UnitCount;
        var most = Math.Min(usableFlowM3PerS, units.DesignFlowM3PerS);
        double bestFlow = 0, bestKw = 0;
        for (var running = 1; running <= units.UnitCount; running++)
        {
            var from = (running - 1) * unitFlow;
            if (from >= most)
                break;
            Try(Top(Math.Max(from, 1e-9 * unitFlow), Math.Min(running * unitFlow, most)));
        }

        return bestFlow;

        void Try(double flow)
        {
            var kw = PowerKw(flow);
            if (kw > bestKw)
                (bestFlow, bestKw) = (flow, kw);
        }

        double PowerKw(double flow) => plant.Follow(flow, grossHeadM).MeterPowerKw;

        // The top of one piece: its end, unless losses grow faster than the flow.
        double Top(double a, double b)
        {
            if (PowerKw(b) >= PowerKw(b - (1e-6 * (b - a))))
                return b;
            const double golden = 0.6180339887498949;
            while (b - a > 1e-9 * b)
            {
                var x1 = b - (golden * (b - a));
                var x2 = a + (golden * (b - a));
                if (PowerKw(x1) < PowerKw(x2))
                    a = x1;
                else
                    b = x2;
            }

            return (a + b) / 2;
        }
    }
}
