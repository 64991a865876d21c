namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>What happens to the flow between the gauge and the site: a share seeps away and a constant loss is taken off.</summary>
public sealed record ReachLoss
{
    /// <summary>A loss.</summary>
    /// <param name="seepageRatio">Share of the flow that seeps away, 0 to 1.</param>
    /// <param name="lossM3PerS">Loss that does not change with the flow, m3/s; zero or more.</param>
    public ReachLoss(double seepageRatio, double lossM3PerS = 0)
    {
        SeepageRatio = seepageRatio is >= 0 and < 1 ? seepageRatio : throw new ArgumentOutOfRangeException(nameof(seepageRatio), seepageRatio, "The share that seeps away lies from 0 to below 1.");
        LossM3PerS = lossM3PerS >= 0 && double.IsFinite(lossM3PerS) ? lossM3PerS : throw new ArgumentOutOfRangeException(nameof(lossM3PerS), lossM3PerS, "A loss is zero or more.");
    }

    /// <summary>No loss.</summary>
    public static ReachLoss None { get; } = new(0);

    /// <summary>Share of the flow that seeps away.</summary>
    public double SeepageRatio { get; }

    /// <summary>Loss that does not change with the flow, m3/s.</summary>
    public double LossM3PerS { get; }

    /// <summary>Flow at the site, m3/s.</summary>
    /// <param name="gaugeFlowM3PerS">Flow at the gauge, m3/s; NaN where missing.</param>
    public double SiteFlowM3PerS(double gaugeFlowM3PerS) =>
        double.IsNaN(gaugeFlowM3PerS) ? double.NaN : Math.Max(0, (gaugeFlowM3PerS * (1 - SeepageRatio)) - LossM3PerS);

    /// <summary>The record at the site. Negative flows of the gauge, which count as no flow, become none.</summary>
    /// <param name="gauge">Record at the gauge.</param>
    public DailyRecord At(DailyRecord gauge)
    {
        ArgumentNullException.ThrowIfNull(gauge);
        if (this == None)
            return gauge;
        var flows = new double[gauge.DayCount];
        for (var i = 0; i < flows.Length; i++)
            flows[i] = SiteFlowM3PerS(gauge.Flows[i]);
        return new DailyRecord(gauge.FirstDay, flows, $"{gauge.Description}; less {Describe()} between gauge and site") { Quality = gauge.Quality };
    }

    /// <summary>The curve at the site, with a point where the flow gives out.</summary>
    /// <param name="gauge">Curve at the gauge.</param>
    public FlowDurationCurve At(FlowDurationCurve gauge)
    {
        ArgumentNullException.ThrowIfNull(gauge);
        if (this == None)
            return gauge;
        var driesUp = LossM3PerS / (1 - SeepageRatio);
        var points = new List<CurvePoint>(gauge.Points.Count + 1);
        for (var i = 0; i < gauge.Points.Count; i++)
        {
            var point = gauge.Points[i];
            if (i > 0 && gauge.Points[i - 1] is var before && before.FlowM3PerS > driesUp && point.FlowM3PerS < driesUp)
            {
                var share = (before.FlowM3PerS - driesUp) / (before.FlowM3PerS - point.FlowM3PerS);
                points.Add(new CurvePoint(before.Exceedance + (share * (point.Exceedance - before.Exceedance)), 0));
            }

            points.Add(point with { FlowM3PerS = SiteFlowM3PerS(point.FlowM3PerS) });
        }

        return new FlowDurationCurve([.. points.Select(p => p.Exceedance)], [.. points.Select(p => p.FlowM3PerS)], points, gauge.EndRule);
    }

    /// <summary>The loss in words.</summary>
    public string Describe() => (SeepageRatio, LossM3PerS) switch
    {
        (0, 0) => "no loss",
        (_, 0) => $"{ReservedRule.Percent(SeepageRatio)} seepage",
        (0, _) => $"a loss of {ReservedRule.Flow(LossM3PerS)}",
        _ => $"{ReservedRule.Percent(SeepageRatio)} seepage and a loss of {ReservedRule.Flow(LossM3PerS)}",
    };
}
