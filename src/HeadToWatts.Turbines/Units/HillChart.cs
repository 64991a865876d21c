using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines.Units;

/// <summary>Efficiencies at one head.</summary>
/// <param name="HeadM">Net head, m.</param>
/// <param name="Points">Flow of the unit over its full flow at the rated head (which may pass 1), and efficiency.</param>
public sealed record HillChartHead(double HeadM, IReadOnlyList<EfficiencyPoint> Points);

/// <summary>
/// A manufacturer's efficiencies over flow and head. Inside the chart they are interpolated along straight lines: along the flow at
/// each head, and between heads at the same share of the way from the least to the greatest flow. Outside its heads the chart says
/// nothing and the unit is taken to stand.
/// </summary>
public sealed class HillChart : HeadBehaviour
{
    private readonly double[] _heads;
    private readonly double[][] _ratios;
    private readonly double[][] _efficiencies;

    private HillChart(IReadOnlyList<HillChartHead> heads)
    {
        Heads = heads;
        _heads = [.. heads.Select(h => h.HeadM)];
        _ratios = [.. heads.Select(h => h.Points.Select(p => p.FlowRatio).ToArray())];
        _efficiencies = [.. heads.Select(h => h.Points.Select(p => p.Efficiency).ToArray())];
    }

    /// <summary>The method.</summary>
    public static Method Method { get; } = new(
        "hill-chart", "Interpolation in a manufacturer's chart of flow, head and efficiency", "η(Q, H) = (1 − t) η_i(s) + t η_{i+1}(s)",
        Source.CommonPractice("hill-chart", "Straight lines between the points of a hill chart"), "s: share of the way from the least to the greatest flow; t: share of the way between two heads", []);

    /// <summary>The heads, rising, each with its efficiencies.</summary>
    public IReadOnlyList<HillChartHead> Heads { get; }

    /// <summary>Lowest head of the chart, m.</summary>
    public double LowestHeadM => _heads[0];

    /// <summary>Highest head of the chart, m.</summary>
    public double HighestHeadM => _heads[^1];

    /// <inheritdoc/>
    public override MethodUse Use => Method.Used();

    /// <summary>Makes a chart, or lists every problem: fewer than two heads, a head given twice, fewer than two rows at a head, numbers out of range.</summary>
    /// <param name="heads">Heads in any order, each with rows in any order.</param>
    /// <param name="where">The field the chart came from.</param>
    public static Checked<HillChart> From(IReadOnlyList<HillChartHead> heads, string where)
    {
        ArgumentNullException.ThrowIfNull(heads);
        var problems = new List<Problem>();
        if (heads.Count < 2)
            problems.Add(new Problem(where, Text(heads.Count) + " heads", "a hill chart needs two heads or more", "rows of efficiency at two heads or more"));
        for (var i = 0; i < heads.Count; i++)
        {
            var at = string.Create(CultureInfo.InvariantCulture, $"{where}[{i}]");
            var head = heads[i];
            if (!(head.HeadM > 0) || double.IsInfinity(head.HeadM))
                problems.Add(new Problem(at + ".head", Text(head.HeadM), "a head is a positive number"));
            else if (heads.Take(i).Any(h => h.HeadM == head.HeadM))
                problems.Add(new Problem(at + ".head", Text(head.HeadM), "this head stands here twice", "each head once"));
            if (head.Points.Count < 2)
                problems.Add(new Problem(at + ".rows", Text(head.Points.Count) + " rows", "each head needs two rows or more"));
            for (var j = 0; j < head.Points.Count; j++)
            {
                var point = head.Points[j];
                if (!(point.FlowRatio > 0 && point.FlowRatio <= 1.5))
                    problems.Add(new Problem(string.Create(CultureInfo.InvariantCulture, $"{at}.rows[{j}].flow"), Text(point.FlowRatio), "the flow lies outside what is possible here", "above 0 and up to 150 %"));
                if (!(point.Efficiency is >= 0 and <= 1))
                    problems.Add(new Problem(string.Create(CultureInfo.InvariantCulture, $"{at}.rows[{j}].efficiency"), Text(point.Efficiency), "the efficiency lies outside what is possible", "0 to 100 %"));
                if (head.Points.Take(j).Any(p => p.FlowRatio == point.FlowRatio))
                    problems.Add(new Problem(string.Create(CultureInfo.InvariantCulture, $"{at}.rows[{j}].flow"), Text(point.FlowRatio), "this flow stands here twice", "each flow once"));
            }
        }

        return problems.Count > 0
            ? Checked.Refused<HillChart>(problems)
            : Checked.Of(new HillChart([.. heads.OrderBy(h => h.HeadM).Select(h => h with { Points = [.. h.Points.OrderBy(p => p.FlowRatio)] })]));
    }

    /// <summary>True when the chart says something at this head.</summary>
    /// <param name="netHeadM">Net head, m.</param>
    public bool Covers(double netHeadM) => netHeadM >= LowestHeadM * (1 - 1e-9) && netHeadM <= HighestHeadM * (1 + 1e-9);

    /// <summary>Efficiency at a flow and a head, 0 to 1; null outside the chart.</summary>
    /// <param name="flowRatio">Flow of the unit over its full flow at the rated head.</param>
    /// <param name="netHeadM">Net head, m.</param>
    public double? At(double flowRatio, double netHeadM)
    {
        if (!Covers(netHeadM))
            return null;
        var (i, t) = Between(netHeadM);
        var least = Mix(t, _ratios[i][0], _ratios[i + 1][0]);
        var most = Mix(t, _ratios[i][^1], _ratios[i + 1][^1]);
        if (flowRatio < least * (1 - 1e-9) || flowRatio > most * (1 + 1e-9))
            return null;
        var share = Math.Clamp((flowRatio - least) / (most - least), 0, 1);
        return Mix(t, OnHead(i, share), OnHead(i + 1, share));
    }

    /// <summary>The efficiencies at one head as a curve over the flow ratio, from the chart's least flow to full flow; null outside the chart's heads.</summary>
    /// <param name="netHeadM">Net head, m.</param>
    public EfficiencyCurve? CurveAt(double netHeadM)
    {
        if (!Covers(netHeadM))
            return null;
        var (i, t) = Between(netHeadM);
        var least = Mix(t, _ratios[i][0], _ratios[i + 1][0]);
        var most = Mix(t, _ratios[i][^1], _ratios[i + 1][^1]);
        var shares = _ratios[i].Select(r => (r - _ratios[i][0]) / (_ratios[i][^1] - _ratios[i][0]))
            .Concat(_ratios[i + 1].Select(r => (r - _ratios[i + 1][0]) / (_ratios[i + 1][^1] - _ratios[i + 1][0])))
            .Append(Math.Clamp((1 - least) / (most - least), 0, 1)).Order().ToList();
        var rows = new List<(double, double)>();
        foreach (var share in shares)
        {
            var ratio = Math.Min(1, least + (share * (most - least)));
            if (rows.Count == 0 || ratio > rows[^1].Item1 + 1e-9)
                rows.Add((ratio, Mix(t, OnHead(i, share), OnHead(i + 1, share))));
        }

        // Where the chart ends before full flow its last efficiency is held; the capacity at that head keeps the unit from going there.
        if (rows[^1].Item1 < 1)
            rows.Add((1, rows[^1].Item2));
        var made = EfficiencyCurve.FromTable(rows, "hill chart");
        return made.IsGood ? made.Value : null;
    }

    /// <inheritdoc/>
    public override double CapacityRatio(double netHeadM)
    {
        if (!Covers(netHeadM))
            return 0;
        var (i, t) = Between(netHeadM);
        return Math.Min(1, Mix(t, _ratios[i][^1], _ratios[i + 1][^1]));
    }

    /// <inheritdoc/>
    public override double Efficiency(double openingRatio, double ratedEfficiency, double netHeadM) => At(openingRatio * CapacityRatio(netHeadM), netHeadM) ?? 0;

    /// <inheritdoc/>
    public override HeadBehaviour Lowered(double lessEfficiency) =>
        new HillChart([.. Heads.Select(h => h with { Points = [.. h.Points.Select(p => p with { Efficiency = Math.Max(0, p.Efficiency - lessEfficiency) })] })]);

    private static double Mix(double t, double a, double b) => a + (t * (b - a));

    private static string Text(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    private (int Index, double Share) Between(double netHeadM)
    {
        var i = 0;
        while (i + 2 < _heads.Length && netHeadM > _heads[i + 1])
            i++;
        return (i, Math.Clamp((netHeadM - _heads[i]) / (_heads[i + 1] - _heads[i]), 0, 1));
    }

    // Efficiency at one of the chart's heads, at a share of the way between its least and greatest flow.
    private double OnHead(int head, double share)
    {
        var ratios = _ratios[head];
        var ratio = ratios[0] + (share * (ratios[^1] - ratios[0]));
        var k = 0;
        while (k + 2 < ratios.Length && ratio > ratios[k + 1])
            k++;
        return Mix(Math.Clamp((ratio - ratios[k]) / (ratios[k + 1] - ratios[k]), 0, 1), _efficiencies[head][k], _efficiencies[head][k + 1]);
    }
}
