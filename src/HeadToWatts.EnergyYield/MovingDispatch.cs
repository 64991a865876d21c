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
        var capacity = plant.Design.CapacityM3PerS(grossHeadM);
        var most = Math.Min(usableFlowM3PerS, capacity);
        double bestFlow = 0, bestKw = 0, from = 0, share = 0;
        for (var running = 1; running <= units.UnitCount && from < most; running++)
        {
            share = running == units.UnitCount ? 1 : share + units.Sizes[running - 1].ShareRatio;
            var to = share * capacity;
            Try(Top(Math.Max(from, 1e-9 * to), Math.Min(to, most)));
            from = to;
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
