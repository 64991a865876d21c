namespace HeadToWatts.FlowRecords;

/// <summary>One point of a flow-duration curve.</summary>
/// <param name="Exceedance">Share of the time p in which the flow is reached or exceeded, 0 to 1.</param>
/// <param name="FlowM3PerS">Flow Q, m3/s.</param>
public readonly record struct CurvePoint(double Exceedance, double FlowM3PerS);

/// <summary>What a curve does beyond its last row. Before its first row the first flow always holds: a curve is never drawn on upwards.</summary>
public enum BeyondLastRow
{
    /// <summary>The last flow holds to 100 % of the time.</summary>
    Hold,

    /// <summary>There is no flow after the last row.</summary>
    Dry,
}

/// <summary>Where a row of a curve was written and how, for the problem that names it.</summary>
/// <param name="Where">File and row, or field.</param>
/// <param name="Read">The row as written.</param>
public readonly record struct CurveRowOrigin(string Where, string Read);
