namespace HeadToWatts.Economics.Costs;

/// <summary>A class of cost, so that what is missing is seen.</summary>
/// <param name="Id">Key: lower-case words with hyphens.</param>
/// <param name="Name">Name.</param>
/// <param name="Holds">What belongs to it.</param>
public sealed record CostClass(string Id, string Name, string Holds);

/// <summary>Every class of cost, in the order in which a plant is built.</summary>
public static class CostClasses
{
    /// <summary>Permits, land, studies.</summary>
    public static CostClass Permits { get; } = new("permits", "Permits and land", "studies, permits, legal work, land and easements");

    /// <summary>Civil works.</summary>
    public static CostClass Civil { get; } = new("civil", "Civil works", "intake, rack, bypass, powerhouse, tailrace, access");

    /// <summary>Pipe and gates.</summary>
    public static CostClass Pipe { get; } = new("pipe", "Pipe and gates", "pipe, fittings, trench, valves and gates");

    /// <summary>Turbine and generator.</summary>
    public static CostClass Machine { get; } = new("machine", "Turbine and generator", "turbine, drive, generator, governor or load control");

    /// <summary>Electrical works and controls.</summary>
    public static CostClass Electrical { get; } = new("electrical", "Electrical and controls", "switchgear, protection, controls, transformer");

    /// <summary>Connection to the grid.</summary>
    public static CostClass Grid { get; } = new("grid", "Interconnection", "line, metering, the utility's study and upgrades");

    /// <summary>Everything else.</summary>
    public static CostClass Other { get; } = new("other", "Other", "what fits nowhere else");

    /// <summary>The classes.</summary>
    public static IReadOnlyList<CostClass> All { get; } = [Permits, Civil, Pipe, Machine, Electrical, Grid, Other];

    /// <summary>The class of a name or key; null when it is not known.</summary>
    public static CostClass? Find(string text) =>
        All.FirstOrDefault(c => c.Id.Equals(text, StringComparison.OrdinalIgnoreCase) || c.Name.Equals(text, StringComparison.OrdinalIgnoreCase));
}
