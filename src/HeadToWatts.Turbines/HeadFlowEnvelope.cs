namespace HeadToWatts.Turbines;

/// <summary>A corner of a head-flow envelope.</summary>
/// <param name="FlowM3PerS">Full flow of one unit, m3/s.</param>
/// <param name="HeadM">Net head, m.</param>
public readonly record struct EnvelopeVertex(double FlowM3PerS, double HeadM);

/// <summary>
/// The heads and flows a turbine type is usually built for: a polygon whose sides are straight on paper with logarithmic scales of
/// flow and head. A point on a side counts as inside.
/// </summary>
public sealed class HeadFlowEnvelope
{
    // A site within a billionth of a decade of a side is on it.
    private const double OnTheSideDecades = 1e-9;

    private readonly double[] _x;
    private readonly double[] _y;

    private HeadFlowEnvelope(EnvelopeVertex[] vertices)
    {
        Vertices = Array.AsReadOnly(vertices);
        _x = [.. vertices.Select(v => Math.Log10(v.FlowM3PerS))];
        _y = [.. vertices.Select(v => Math.Log10(v.HeadM))];
    }

    /// <summary>The corners in order, each joined to the next and the last to the first.</summary>
    public IReadOnlyList<EnvelopeVertex> Vertices { get; }

    /// <summary>Makes an envelope.</summary>
    /// <param name="vertices">At least three corners in order around a simple polygon; flows in m3/s and heads in m, above zero.</param>
    /// <exception cref="ArgumentException">Fewer than three corners, or no area between them.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A flow or head that is not a positive number.</exception>
    public static HeadFlowEnvelope FromVertices(params IReadOnlyList<EnvelopeVertex> vertices)
    {
        ArgumentNullException.ThrowIfNull(vertices);
        if (vertices.Count < 3)
            throw new ArgumentException("An envelope has at least three corners.", nameof(vertices));
        foreach (var vertex in vertices)
        {
            RequirePositive(vertex.FlowM3PerS, nameof(vertices));
            RequirePositive(vertex.HeadM, nameof(vertices));
        }

        var envelope = new HeadFlowEnvelope([.. vertices]);
        if (envelope.AreaSquareDecades() < 1e-6)
            throw new ArgumentException("The corners enclose no area.", nameof(vertices));
        return envelope;
    }

    /// <summary>True when a unit of this full flow (m3/s) at this net head (m) lies in the envelope or on its side.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Flow or head is not a positive number.</exception>
    public bool Contains(double flowM3PerS, double headM)
    {
        RequirePositive(flowM3PerS, nameof(flowM3PerS));
        RequirePositive(headM, nameof(headM));
        var x = Math.Log10(flowM3PerS);
        var y = Math.Log10(headM);
        return IsWithin(x, y) || Nearest(x, y).Decades <= OnTheSideDecades;
    }

    /// <summary>How a unit lies to the envelope.</summary>
    /// <param name="unitFlowM3PerS">Full flow of one unit, m3/s.</param>
    /// <param name="netHeadM">Net head, m.</param>
    /// <exception cref="ArgumentOutOfRangeException">Flow or head is not a positive number.</exception>
    public EnvelopeFit Fit(double unitFlowM3PerS, double netHeadM)
    {
        RequirePositive(unitFlowM3PerS, nameof(unitFlowM3PerS));
        RequirePositive(netHeadM, nameof(netHeadM));
        var x = Math.Log10(unitFlowM3PerS);
        var y = Math.Log10(netHeadM);
        var (nearX, nearY, decades) = Nearest(x, y);
        var inside = decades <= OnTheSideDecades || IsWithin(x, y);
        var heads = Crossings(_x, _y, x);
        var flows = Crossings(_y, _x, y);
        return new EnvelopeFit(
            inside,
            inside ? 0 : decades,
            Power(heads?.Lowest),
            Power(heads?.Highest),
            Power(flows?.Lowest),
            Power(flows?.Highest),
            new EnvelopeVertex(Math.Pow(10, nearX), Math.Pow(10, nearY)));

        static double? Power(double? exponent) => exponent is { } e ? Math.Pow(10, e) : null;
    }

    private static void RequirePositive(double value, string name)
    {
        if (!(value > 0) || double.IsInfinity(value))
            throw new ArgumentOutOfRangeException(name, value, "Flow and head on a logarithmic scale are positive numbers.");
    }

    // Winding number: signed crossings of the upward and downward sides left of the point.
    private bool IsWithin(double x, double y)
    {
        var winding = 0;
        for (int i = 0, j = _x.Length - 1; i < _x.Length; j = i++)
        {
            var side = ((_x[i] - _x[j]) * (y - _y[j])) - ((x - _x[j]) * (_y[i] - _y[j]));
            if (_y[j] <= y)
                winding += _y[i] > y && side > 0 ? 1 : 0;
            else
                winding -= _y[i] <= y && side < 0 ? 1 : 0;
        }

        return winding != 0;
    }

    private (double X, double Y, double Decades) Nearest(double x, double y)
    {
        var best = (X: 0.0, Y: 0.0, Decades: double.PositiveInfinity);
        for (int i = 0, j = _x.Length - 1; i < _x.Length; j = i++)
        {
            var dx = _x[i] - _x[j];
            var dy = _y[i] - _y[j];
            var along = Math.Clamp((((x - _x[j]) * dx) + ((y - _y[j]) * dy)) / ((dx * dx) + (dy * dy)), 0, 1);
            var px = _x[j] + (along * dx);
            var py = _y[j] + (along * dy);
            var decades = Math.Sqrt(((x - px) * (x - px)) + ((y - py) * (y - py)));
            if (decades < best.Decades)
                best = (px, py, decades);
        }

        return best;
    }

    // Lowest and highest ordinate of the outline where its abscissa equals "at"; null where the outline has none.
    private static (double Lowest, double Highest)? Crossings(double[] abscissas, double[] ordinates, double at)
    {
        var lowest = double.PositiveInfinity;
        var highest = double.NegativeInfinity;
        for (int i = 0, j = abscissas.Length - 1; i < abscissas.Length; j = i++)
        {
            var (a, b) = (abscissas[j], abscissas[i]);
            if (at < Math.Min(a, b) - OnTheSideDecades || at > Math.Max(a, b) + OnTheSideDecades)
                continue;
            if (a == b)
            {
                Take(ordinates[j]);
                Take(ordinates[i]);
            }
            else
            {
                Take(ordinates[j] + (Math.Clamp((at - a) / (b - a), 0, 1) * (ordinates[i] - ordinates[j])));
            }
        }

        return lowest <= highest ? (lowest, highest) : null;

        void Take(double ordinate)
        {
            lowest = Math.Min(lowest, ordinate);
            highest = Math.Max(highest, ordinate);
        }
    }

    private double AreaSquareDecades()
    {
        var twice = 0.0;
        for (int i = 0, j = _x.Length - 1; i < _x.Length; j = i++)
            twice += (_x[j] * _y[i]) - (_x[i] * _y[j]);
        return Math.Abs(twice) / 2;
    }
}

/// <summary>How a unit lies to a head-flow envelope, with the numbers to say it in words.</summary>
/// <param name="IsInside">True inside the envelope or on its side.</param>
/// <param name="DecadesOutside">Distance to the envelope in powers of ten of flow and head together; 0 inside.</param>
/// <param name="LowestHeadAtFlowM">Least net head of the envelope at this flow, m; null when no head is right at this flow.</param>
/// <param name="HighestHeadAtFlowM">Greatest net head of the envelope at this flow, m; null when no head is right at this flow.</param>
/// <param name="LowestFlowAtHeadM3PerS">Least full flow of the envelope at this head, m3/s; null when no flow is right at this head.</param>
/// <param name="HighestFlowAtHeadM3PerS">Greatest full flow of the envelope at this head, m3/s; null when no flow is right at this head.</param>
/// <param name="NearestPoint">The point of the outline nearest to the unit on logarithmic paper.</param>
public sealed record EnvelopeFit(
    bool IsInside,
    double DecadesOutside,
    double? LowestHeadAtFlowM,
    double? HighestHeadAtFlowM,
    double? LowestFlowAtHeadM3PerS,
    double? HighestFlowAtHeadM3PerS,
    EnvelopeVertex NearestPoint);
