namespace HeadToWatts.Files.StudyFiles;

/// <summary>The pumping set against the generation; every quantity a text.</summary>
public sealed class PumpingDocument
{
    /// <summary>Wells, relifts, boosters.</summary>
    public List<PumpingPlantDocument> Plants { get; set; } = [];

    internal static PumpingDocument Fields(JsonObjectReader r) => new() { Plants = r.Array("plants", PumpingPlantDocument.Fields) ?? [] };
}

/// <summary>A pumping plant.</summary>
public sealed class PumpingPlantDocument
{
    /// <summary>Name.</summary>
    public string? Name { get; set; }

    /// <summary>"electric", "diesel", "gasoline", "propane" or "natural-gas".</summary>
    public string? Energy { get; set; }

    /// <summary>Flow while it runs.</summary>
    public string? Flow { get; set; }

    /// <summary>Twelve volumes lifted, January first.</summary>
    public List<string?>? VolumeByMonth { get; set; }

    /// <summary>Twelve running times, January first, in place of volumes.</summary>
    public List<string?>? HoursByMonth { get; set; }

    /// <summary>Total dynamic head, in place of its parts.</summary>
    public string? TotalHead { get; set; }

    /// <summary>Static lift.</summary>
    public string? Lift { get; set; }

    /// <summary>Drawdown while pumping.</summary>
    public string? Drawdown { get; set; }

    /// <summary>Pressure wanted at the outlet.</summary>
    public string? Pressure { get; set; }

    /// <summary>The pipe, as a waterway.</summary>
    public WaterwayDocument? Pipe { get; set; }

    /// <summary>Overall plant efficiency; for an engine its rating against the criterion.</summary>
    public string? Efficiency { get; set; }

    /// <summary>Electric power or units of fuel an hour of a pump test, in place of the efficiency.</summary>
    public string? TestPower { get; set; }

    /// <summary>Units of fuel an hour of a pump test, in place of the efficiency.</summary>
    public string? TestFuelPerHour { get; set; }

    /// <summary>Price of a unit of its energy, a number.</summary>
    public string? Price { get; set; }

    /// <summary>Height of the pump over the water it draws from.</summary>
    public string? SuctionLift { get; set; }

    /// <summary>Head lost in the suction pipe.</summary>
    public string? SuctionLoss { get; set; }

    /// <summary>Suction head the maker requires.</summary>
    public string? RequiredSuctionHead { get; set; }

    internal static PumpingPlantDocument Fields(JsonObjectReader r) => new()
    {
        Name = r.Text("name"),
        Energy = r.Text("energy"),
        Flow = r.Text("flow"),
        VolumeByMonth = r.Texts("volumeByMonth"),
        HoursByMonth = r.Texts("hoursByMonth"),
        TotalHead = r.Text("totalHead"),
        Lift = r.Text("lift"),
        Drawdown = r.Text("drawdown"),
        Pressure = r.Text("pressure"),
        Pipe = r.Object("pipe", StudyDocumentFields.Waterway),
        Efficiency = r.Text("efficiency"),
        TestPower = r.Text("testPower"),
        TestFuelPerHour = r.NumberText("testFuelPerHour"),
        Price = r.NumberText("price"),
        SuctionLift = r.Text("suctionLift"),
        SuctionLoss = r.Text("suctionLoss"),
        RequiredSuctionHead = r.Text("requiredSuctionHead"),
    };
}
