using System.Globalization;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Hydraulics.Canals;

/// <summary>A fall used by a plant on a canal.</summary>
/// <param name="Name">Name of the plant or drop.</param>
/// <param name="HeadwaterElevationM">Level above it, m.</param>
/// <param name="TailwaterElevationM">Level below it, m.</param>
public sealed record CanalDrop(string Name, double HeadwaterElevationM, double TailwaterElevationM)
{
    /// <summary>Head of the drop, m.</summary>
    public double HeadM => HeadwaterElevationM - TailwaterElevationM;
}

/// <summary>Drops in series on one canal: they share the flow, and each metre of fall belongs to one of them only.</summary>
public sealed class DropSeries
{
    private DropSeries(IReadOnlyList<CanalDrop> drops) => Drops = drops;

    /// <summary>The drops from the highest down.</summary>
    public IReadOnlyList<CanalDrop> Drops { get; }

    /// <summary>Sum of the heads, m.</summary>
    public double TotalHeadM => Drops.Sum(d => d.HeadM);

    /// <summary>Makes a series, or says which drops count the same fall.</summary>
    /// <param name="drops">The drops in any order.</param>
    /// <param name="where">Field they come from.</param>
    public static Checked<DropSeries> Of(IReadOnlyList<CanalDrop> drops, string where)
    {
        ArgumentNullException.ThrowIfNull(drops);
        ArgumentNullException.ThrowIfNull(where);
        var problems = new List<Problem>();
        foreach (var drop in drops)
        {
            if (!double.IsFinite(drop.HeadM))
                problems.Add(new Problem($"{where} {drop.Name}", Levels(drop), "a level is not a number", "two levels"));
            else if (drop.HeadM <= 0)
                problems.Add(new Problem($"{where} {drop.Name}", Levels(drop), "the level above the drop is not higher than the level below it", "the higher level first"));
        }

        if (problems.Count > 0)
            return Checked.Refused<DropSeries>(problems);
        CanalDrop[] ordered = [.. drops.OrderByDescending(d => d.HeadwaterElevationM).ThenByDescending(d => d.TailwaterElevationM)];
        // Each drop against every lower one: a long fall may cover several short ones.
        for (var i = 0; i < ordered.Length; i++)
        {
            for (var j = i + 1; j < ordered.Length; j++)
            {
                var sharedM = Math.Min(ordered[i].HeadwaterElevationM, ordered[j].HeadwaterElevationM)
                    - Math.Max(ordered[i].TailwaterElevationM, ordered[j].TailwaterElevationM);
                if (sharedM > 1e-9)
                    problems.Add(new Problem($"{where} {ordered[j].Name}", Levels(ordered[j]), $"{Text(sharedM)} m of the fall is also counted in {ordered[i].Name} ({Levels(ordered[i])})", "drops in series share the flow and never the head"));
            }
        }

        return problems.Count > 0 ? Checked.Refused<DropSeries>(problems) : Checked.Of(new DropSeries(ordered));
    }

    private static string Levels(CanalDrop drop) => $"{Text(drop.HeadwaterElevationM)} to {Text(drop.TailwaterElevationM)} m";

    private static string Text(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
