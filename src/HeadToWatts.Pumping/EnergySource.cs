namespace HeadToWatts.Pumping;

/// <summary>What a pumping plant runs on, with what a good plant gets out of a unit of it.</summary>
/// <param name="Id">Key as study files write it.</param>
/// <param name="Name">Name.</param>
/// <param name="Unit">Unit in which it is bought.</param>
/// <param name="WaterKwhPerUnit">Water energy that a good plant lifts with one unit, kWh; the criterion.</param>
public sealed record EnergySource(string Id, string Name, string Unit, double WaterKwhPerUnit)
{
    /// <summary>True for electricity, which generation can be set against.</summary>
    public bool IsElectric => Id == "electric";
}

/// <summary>The energy sources, with the Nebraska criteria: 75 percent for the pump, and the engine's or motor's share.</summary>
public static class EnergySources
{
    /// <summary>Kilowatts of a horsepower of 550 ft lbf/s.</summary>
    public const double KwPerHorsepower = 0.745699871582270;

    /// <summary>All of them: water horsepower-hours per unit as the criteria print them.</summary>
    public static IReadOnlyList<EnergySource> All { get; } =
    [
        new("electric", "Electricity", "kWh", 0.885 * KwPerHorsepower),
        new("diesel", "Diesel", "gal", 12.5 * KwPerHorsepower),
        new("gasoline", "Gasoline", "gal", 8.66 * KwPerHorsepower),
        new("propane", "Propane", "gal", 6.89 * KwPerHorsepower),
        new("natural-gas", "Natural gas", "mcf", 61.7 * KwPerHorsepower),
    ];

    /// <summary>Finds a source by its key; null when there is none.</summary>
    /// <param name="id">Key.</param>
    public static EnergySource? Find(string id) => All.FirstOrDefault(s => string.Equals(s.Id, id, StringComparison.OrdinalIgnoreCase));
}
