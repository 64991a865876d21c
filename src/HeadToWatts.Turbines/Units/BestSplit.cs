namespace HeadToWatts.Turbines.Units;

/// <summary>
/// The split of a flow among units that gives most power at a common head: found on 240 equal steps of the flow by dynamic
/// programming over the units (the greatest sum of flow times efficiency), and between two steps by the better of going
/// from the one to the other, filling up the lower and easing off the upper.
/// </summary>
internal sealed class BestSplit
{
    private const int Steps = 240;
    private readonly double[] _capacity;
    private readonly double[] _least;
    private readonly EfficiencyCurve _curve;
    private readonly double _step;

    // _flows[j * n + i]: flow of unit i at j steps; all zero where no split passes exactly that flow.
    private readonly double[] _flows;
    private readonly bool[] _isFound = new bool[Steps + 1];

    internal BestSplit(double[] capacityM3PerS, double[] leastM3PerS, EfficiencyCurve curve, double designFlowM3PerS)
    {
        (_capacity, _least, _curve, _step) = (capacityM3PerS, leastM3PerS, curve, designFlowM3PerS / Steps);
        var n = capacityM3PerS.Length;
        _flows = new double[(Steps + 1) * n];
        Search(n);
    }

    internal IEnumerable<double> BreakpointsM3PerS => Enumerable.Range(1, Steps - 1).Select(j => j * _step);

    /// <summary>Fills in the best split of a flow; false where none is known.</summary>
    internal bool TryAt(double flowM3PerS, Span<double> best)
    {
        var n = _capacity.Length;
        var at = Math.Min(flowM3PerS / _step, Steps);
        var j = Math.Min((int)at, Steps - 1);
        var t = at - j;
        var lower = _flows.AsSpan(j * n, n);
        var upper = _flows.AsSpan((j + 1) * n, n);
        Span<double> trial = stackalloc double[n];
        var most = -1.0;
        if (_isFound[j] && _isFound[j + 1] && SameUnits(lower, upper))
        {
            for (var i = 0; i < n; i++)
                trial[i] = lower[i] + (t * (upper[i] - lower[i]));
            Keep(trial, best, ref most);
        }

        if (_isFound[j] && FillUp(lower, flowM3PerS, trial))
            Keep(trial, best, ref most);
        if (_isFound[j + 1] && EaseOff(upper, flowM3PerS, trial))
            Keep(trial, best, ref most);
        return most >= 0;
    }

    private static bool SameUnits(ReadOnlySpan<double> a, ReadOnlySpan<double> b)
    {
        for (var i = 0; i < a.Length; i++)
        {
            if (a[i] > 0 != b[i] > 0)
                return false;
        }

        return true;
    }

    private void Keep(ReadOnlySpan<double> trial, Span<double> best, ref double most)
    {
        var sum = 0.0;
        for (var i = 0; i < trial.Length; i++)
            sum += Worth(i, trial[i]);
        if (sum <= most)
            return;
        most = sum;
        trial.CopyTo(best);
    }

    // What is left over goes to the units that run, in proportion to the room they have.
    private bool FillUp(ReadOnlySpan<double> from, double flow, Span<double> trial)
    {
        double sum = 0, room = 0;
        for (var i = 0; i < from.Length; i++)
        {
            sum += from[i];
            room += from[i] > 0 ? _capacity[i] - from[i] : 0;
        }

        var more = flow - sum;
        if (sum <= 0 || more > room * (1 + 1e-12))
            return false;
        var share = room > 0 ? Math.Min(1, more / room) : 0;
        for (var i = 0; i < from.Length; i++)
            trial[i] = from[i] > 0 ? from[i] + (share * (_capacity[i] - from[i])) : 0;
        return true;
    }

    private bool EaseOff(ReadOnlySpan<double> from, double flow, Span<double> trial)
    {
        double sum = 0, room = 0;
        for (var i = 0; i < from.Length; i++)
        {
            sum += from[i];
            room += from[i] > 0 ? from[i] - _least[i] : 0;
        }

        var less = sum - flow;
        if (less < 0)
            return FillUp(from, flow, trial);
        if (sum <= 0 || less > room * (1 + 1e-12))
            return false;
        var share = room > 0 ? Math.Min(1, less / room) : 0;
        for (var i = 0; i < from.Length; i++)
            trial[i] = from[i] > 0 ? from[i] - (share * (from[i] - _least[i])) : 0;
        return true;
    }

    private double Worth(int unit, double flow) => flow > 0 ? flow * _curve.At(flow / _capacity[unit]) : 0;

    private void Search(int n)
    {
        const double impossible = double.NegativeInfinity;
        var sum = new double[Steps + 1];
        var next = new double[Steps + 1];
        var taken = new int[n, Steps + 1];
        Array.Fill(sum, impossible);
        sum[0] = 0;
        for (var k = 0; k < n; k++)
        {
            // A unit whose full flow lies between two steps may stand at the step above it, held to what it takes.
            var most = Math.Min(Steps, (int)Math.Ceiling((_capacity[k] / _step) - 1e-9));
            var least = Math.Max(1, (int)Math.Ceiling((_least[k] / _step) - 1e-9));
            var worth = new double[most + 1];
            for (var a = least; a <= most; a++)
                worth[a] = Worth(k, Math.Min(a * _step, _capacity[k]));
            for (var j = 0; j <= Steps; j++)
            {
                var (best, with) = (sum[j], 0);
                for (var a = least; a <= Math.Min(most, j); a++)
                {
                    var total = sum[j - a] + worth[a];
                    if (total > best)
                        (best, with) = (total, a);
                }

                next[j] = best;
                taken[k, j] = with;
            }

            (sum, next) = (next, sum);
        }

        for (var j = 1; j <= Steps; j++)
        {
            _isFound[j] = sum[j] > impossible;
            if (!_isFound[j])
                continue;
            var left = j;
            for (var k = n - 1; k >= 0; k--)
            {
                var a = taken[k, left];
                _flows[(j * n) + k] = Math.Min(a * _step, _capacity[k]);
                left -= a;
            }
        }
    }
}
