using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Transfer;

/// <summary>The line of a maintenance-of-variance extension, on natural logarithms.</summary>
/// <param name="ConcurrentDays">Days on which both have a flow above zero.</param>
/// <param name="ZeroDaysLeftOut">Days in common left out because one of the two has no flow, which has no logarithm.</param>
/// <param name="MeanGaugeLog">Mean logarithm at the gauge m_x.</param>
/// <param name="MeanSiteLog">Mean logarithm at the site m_y.</param>
/// <param name="SlopeRatio">s_y/s_x.</param>
/// <param name="CorrelationCoefficient">Correlation of the logarithms r.</param>
public sealed record MoveOneFit(int ConcurrentDays, int ZeroDaysLeftOut, double MeanGaugeLog, double MeanSiteLog, double SlopeRatio, double CorrelationCoefficient)
{
    /// <summary>Flow at the site for a flow at the gauge, m3/s; no flow where the gauge has none.</summary>
    /// <param name="gaugeFlowM3PerS">Flow at the gauge, m3/s; NaN where missing.</param>
    public double SiteFlowM3PerS(double gaugeFlowM3PerS) => gaugeFlowM3PerS switch
    {
        > 0 => Math.Exp(MeanSiteLog + (SlopeRatio * (Math.Log(gaugeFlowM3PerS) - MeanGaugeLog))),
        double.NaN => double.NaN,
        _ => 0,
    };
}

/// <summary>
/// MOVE.1: a short record at the site extended by a longer one nearby, with the mean and the variance of the logarithms of the
/// days in common kept. A regression would give every dry day too wet and every wet day too dry.
/// </summary>
public static class MoveOne
{
    /// <summary>Fewest days in common that are taken.</summary>
    public const int LeastConcurrentDays = 10;

    /// <summary>The method.</summary>
    internal static readonly Method Method = new(
        "move-1", "Maintenance of variance extension, type 1 (MOVE.1)", "y = m_y + (s_y/s_x)(x - m_x), x = ln Q_{gauge}", FlowRecordSources.Hirsch, "",
        [new InputRange("n", "days in common", "1", 30, double.PositiveInfinity), new InputRange("r", "correlation of the logarithms", "1", 0.8, 1)]);

    /// <summary>Fits the line, or says why not.</summary>
    /// <param name="site">Short record at the site.</param>
    /// <param name="gauge">Record of the neighbour.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<MoveOneFit> Fit(DailyRecord site, DailyRecord gauge, string where)
    {
        ArgumentNullException.ThrowIfNull(site);
        ArgumentNullException.ThrowIfNull(gauge);
        ArgumentNullException.ThrowIfNull(where);
        var xs = new List<double>();
        var ys = new List<double>();
        var zeros = 0;
        var offset = gauge.FirstDay.DayNumber - site.FirstDay.DayNumber;
        for (var i = Math.Max(0, offset); i < site.DayCount && i - offset < gauge.DayCount; i++)
        {
            var (y, x) = (site.Flows[i], gauge.Flows[i - offset]);
            if (double.IsNaN(x) || double.IsNaN(y))
                continue;
            if (x <= 0 || y <= 0)
            {
                zeros++;
                continue;
            }

            xs.Add(Math.Log(x));
            ys.Add(Math.Log(y));
        }

        var n = xs.Count;
        if (n < LeastConcurrentDays)
        {
            return Checked.Refused<MoveOneFit>(new Problem(
                where, $"{Text(n)} days in common", $"the two records need at least {Text(LeastConcurrentDays)} days in common on which both have water", "records that overlap"));
        }

        double mx = xs.Sum() / n, my = ys.Sum() / n, sxx = 0, syy = 0, sxy = 0;
        for (var i = 0; i < n; i++)
        {
            var (dx, dy) = (xs[i] - mx, ys[i] - my);
            sxx += dx * dx;
            syy += dy * dy;
            sxy += dx * dy;
        }

        if (sxx <= 1e-24 * n || syy <= 1e-24 * n)
            return Checked.Refused<MoveOneFit>(new Problem(where, $"{Text(n)} days in common", "the flow of one of the two does not change on them", "days of low and of high flow"));
        var r = sxy / Math.Sqrt(sxx * syy);
        return r > 0
            ? Checked.Of(new MoveOneFit(n, zeros, mx, my, Math.Sqrt(syy / sxx), r))
            : Checked.Refused<MoveOneFit>(new Problem(where, $"correlation {r.ToString("0.##", CultureInfo.InvariantCulture)}", "the two do not rise and fall together", "a neighbour whose flow moves with the site's"));
    }

    /// <summary>The site's record over the days of both: measured where it was, estimated where only the gauge has a flow.</summary>
    /// <param name="site">Short record at the site.</param>
    /// <param name="gauge">Record of the neighbour.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<TransferredRecord> Extend(DailyRecord site, DailyRecord gauge, string where) =>
        Fit(site, gauge, where).Then(fit => Extended(site, gauge, fit));

    private static TransferredRecord Extended(DailyRecord site, DailyRecord gauge, MoveOneFit fit)
    {
        var first = site.FirstDay < gauge.FirstDay ? site.FirstDay : gauge.FirstDay;
        var last = site.LastDay > gauge.LastDay ? site.LastDay : gauge.LastDay;
        var flows = new double[last.DayNumber - first.DayNumber + 1];
        int measured = 0, estimated = 0, dry = 0;
        for (var i = 0; i < flows.Length; i++)
        {
            var own = At(site, first.DayNumber + i);
            if (!double.IsNaN(own))
            {
                flows[i] = own;
                measured++;
                continue;
            }

            flows[i] = fit.SiteFlowM3PerS(At(gauge, first.DayNumber + i));
            if (!double.IsNaN(flows[i]))
                estimated++;
            if (flows[i] == 0)
                dry++;
        }

        var notes = new List<string>
        {
            $"{Text(measured)} days measured at the site, {Text(estimated)} estimated from {gauge.Description}",
            $"fitted on {Text(fit.ConcurrentDays)} days in common, correlation of logarithms {fit.CorrelationCoefficient.ToString("0.###", CultureInfo.InvariantCulture)}",
        };
        if (fit.ZeroDaysLeftOut > 0)
            notes.Add($"{Text(fit.ZeroDaysLeftOut)} days in common without flow at one of the two left out of the fit");
        if (dry > 0)
            notes.Add($"{Text(dry)} days estimated as dry because the gauge was dry");
        var isClose = fit.CorrelationCoefficient >= 0.8 && fit.ConcurrentDays >= 30;
        return new TransferredRecord(
            new DailyRecord(first, flows, $"{site.Description}; extended by MOVE.1 from {gauge.Description}"),
            isClose ? FlowConfidence.Fair : FlowConfidence.Low,
            isClose ? "extended from a neighbouring gauge that moves with the site" : "extended from a neighbouring gauge on few days in common or a weak correlation",
            notes,
            [Method.Used(new InputSpan("n", fit.ConcurrentDays, fit.ConcurrentDays), new InputSpan("r", fit.CorrelationCoefficient, fit.CorrelationCoefficient))]);
    }

    private static double At(DailyRecord record, int dayNumber)
    {
        var i = dayNumber - record.FirstDay.DayNumber;
        return i >= 0 && i < record.DayCount ? record.Flows[i] : double.NaN;
    }

    private static string Text(int count) => count.ToString(CultureInfo.InvariantCulture);
}
