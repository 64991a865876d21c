namespace HeadToWatts.FlowRecords.Reserved;

/// <summary>Water that others take before the plant.</summary>
public sealed record Delivery
{
    /// <summary>A delivery that changes by month.</summary>
    /// <param name="name">Whose, or which turnout.</param>
    /// <param name="flowsM3PerS">Twelve flows from January on, m3/s, zero or more.</param>
    public Delivery(string name, IReadOnlyList<double> flowsM3PerS)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(flowsM3PerS);
        if (flowsM3PerS.Count != 12)
            throw new ArgumentException("A delivery by month has twelve flows.", nameof(flowsM3PerS));
        foreach (var flow in flowsM3PerS)
        {
            if (!(flow >= 0 && double.IsFinite(flow)))
                throw new ArgumentOutOfRangeException(nameof(flowsM3PerS), flow, "A delivery is zero or more.");
        }

        Name = name;
        FlowsM3PerS = [.. flowsM3PerS];
    }

    /// <summary>A delivery that is the same all year.</summary>
    /// <param name="name">Whose, or which turnout.</param>
    /// <param name="flowM3PerS">Flow, m3/s, zero or more.</param>
    public Delivery(string name, double flowM3PerS)
        : this(name, [.. Enumerable.Repeat(flowM3PerS, 12)])
    {
    }

    /// <summary>Whose, or which turnout.</summary>
    public string Name { get; }

    /// <summary>The flows from January on, m3/s.</summary>
    public IReadOnlyList<double> FlowsM3PerS { get; }
}
