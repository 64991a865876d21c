using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords;

/// <summary>
/// How a ranked flow is given its exceedance. For the family p = (m - a)/(n + 1 - 2a), with m = 1 the largest of n flows;
/// California's is p = m/n.
/// </summary>
public sealed class PlottingPosition
{
    private readonly bool _isCalifornia;

    internal PlottingPosition(string id, string name, Method method, double coefficient, bool isCalifornia = false)
    {
        Id = id;
        Name = name;
        Method = method;
        Coefficient = coefficient;
        _isCalifornia = isCalifornia;
    }

    /// <summary>Key as study files write it.</summary>
    public string Id { get; }

    /// <summary>Name in the trade.</summary>
    public string Name { get; }

    /// <summary>The method with its source.</summary>
    public Method Method { get; }

    /// <summary>a of the family; 0 for California's, which is outside it.</summary>
    public double Coefficient { get; }

    /// <summary>Exceedance of a ranked flow, 0 to 1.</summary>
    /// <param name="rank">m, 1 for the largest flow.</param>
    /// <param name="count">n, how many flows are ranked.</param>
    /// <exception cref="ArgumentOutOfRangeException">The rank is not within 1 to n.</exception>
    public double Exceedance(int rank, int count)
    {
        if (rank < 1 || rank > count)
            throw new ArgumentOutOfRangeException(nameof(rank), rank, "A rank lies within 1 and the count.");
        return _isCalifornia
            ? (double)rank / count
            : (rank - Coefficient) / (count + 1 - (2 * Coefficient));
    }

    /// <inheritdoc/>
    public override string ToString() => Name;
}
