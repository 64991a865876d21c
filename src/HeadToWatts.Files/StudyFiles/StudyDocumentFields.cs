using HeadToWatts.Files.FlowFiles.Recipes;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>The fields of a study file by name; docs/study.schema.json says the same to editors.</summary>
internal static class StudyDocumentFields
{
    internal static StudyDocument Read(JsonObjectReader r) => new()
    {
        Name = r.Text("name"),
        Place = r.Text("place"),
        Client = r.Text("client"),
        Author = r.Text("author"),
        Date = r.Text("date"),
        Revision = r.Text("revision"),
        Notes = r.Text("notes"),
        Units = r.Text("units"),
        Alternatives = r.Array("alternatives", Alternative) ?? [],
    };

    private static AlternativeDocument Alternative(JsonObjectReader r) => new()
    {
        Name = r.Text("name"),
        Site = r.Object("site", Site) ?? new SiteDocument(),
        Flow = r.Object("flow", Flow) ?? new FlowDocument(),
        Head = r.Object("head", Head) ?? new HeadDocument(),
        Waterway = r.Object("waterway", Waterway) ?? new WaterwayDocument(),
        Turbine = r.Object("turbine", Turbine) ?? new TurbineDocument(),
        Losses = r.Object("losses", Losses) ?? new LossesDocument(),
        Money = r.Object("money", MoneyFields.Read),
        Pumping = r.Object("pumping", PumpingDocument.Fields),
    };

    private static SiteDocument Site(JsonObjectReader r) => new()
    {
        Latitude = r.Text("latitude"),
        Elevation = r.Text("elevation"),
        WaterTemperature = r.Text("waterTemperature"),
        GridFrequency = r.Text("gridFrequency"),
    };

    private static FlowDocument Flow(JsonObjectReader r) => new()
    {
        Source = r.Text("source"),
        Curve = r.Array("curve", row => new CurveRowDocument { Exceeded = row.Text("exceeded"), Flow = row.Text("flow") }),
        RowsAreFor = r.Text("rowsAreFor"),
        BeyondLastRow = r.Text("beyondLastRow"),
        Record = r.Object("record", Record),
        MonthlyMeans = r.Texts("monthlyMeans"),
        Schedule = r.Array("schedule", d => new DeliveryRowDocument { Days = d.Text("days"), Flow = d.Text("flow") }),
        Measurement = r.Object("measurement", MeasurementDocument.Fields),
        AreaRatio = r.Object("areaRatio", a => new AreaRatioDocument { GaugeArea = a.Text("gaugeArea"), SiteArea = a.Text("siteArea"), Exponent = a.Text("exponent") }),
        Neighbour = r.Object("neighbour", Record),
        PlottingPosition = r.Text("plottingPosition"),
        Years = r.Text("years"),
        Season = r.Text("season"),
        LossToSite = r.Text("lossToSite"),
        ReservedFlow = r.Text("reservedFlow"),
        ReservedByMonth = r.Texts("reservedByMonth"),
        PriorDeliveries = r.Text("priorDeliveries"),
        Turnouts = r.Array("turnouts", t => new TurnoutDocument { Name = t.Text("name"), Flow = t.Text("flow"), Season = t.Text("season") }),
        WaterRight = r.Object("waterRight", w => new WaterRightDocument { Rate = w.Text("rate"), Season = w.Text("season") }),
        DesignFlow = r.Text("designFlow"),
    };

    private static RecordDocument Record(JsonObjectReader r) => new()
    {
        File = r.Text("file"),
        Unit = r.Text("unit"),
        DateOrder = r.Text("dateOrder"),
        Column = r.Text("column"),
        FirstDay = r.Text("firstDay"),
        Days = r.Text("days"),
        Recipe = r.Object("recipe", RecipeFile.Fields),
        Policies = r.Object("policies", PolicyBuilder.Fields),
        Rating = r.Object("rating", RatingDocument.Fields),
        Found = r.Texts("found"),
    };

    private static HeadDocument Head(JsonObjectReader r) => new()
    {
        Gross = r.Text("gross"),
        Headwater = r.Text("headwater"),
        Tailwater = r.Text("tailwater"),
        HeadwaterByMonth = r.Texts("headwaterByMonth"),
        TailwaterByMonth = r.Texts("tailwaterByMonth"),
        HeadwaterRating = r.Array("headwaterRating", LevelRow),
        TailwaterRating = r.Array("tailwaterRating", LevelRow),
        HeadwaterCrest = r.Object("headwaterCrest", c => new CrestDocument { Elevation = c.Text("elevation"), Length = c.Text("length"), Coefficient = c.NumberText("coefficient") }),
        UpstreamPressure = r.Object("upstreamPressure", Pressure),
        DownstreamPressure = r.Object("downstreamPressure", Pressure),
        Measured = r.Object("measured", m => new MeasuredHeadDocument { Gauge = m.Text("gauge"), GaugeHeight = m.Text("gaugeHeight"), Steps = m.Texts("steps"), Error = m.Text("error") }),
        Error = r.Text("error"),
        Canal = r.Object("canal", CanalDocument.Fields),
    };

    private static PressureDocument Pressure(JsonObjectReader r) => new()
    {
        GaugeElevation = r.Text("gaugeElevation"),
        Pressure = r.Text("pressure"),
        PressureByMonth = r.Texts("pressureByMonth"),
        PressureRating = r.Array("pressureRating", row => new PressureRowDocument { Flow = row.Text("flow"), Pressure = row.Text("pressure") }),
        InsideDiameter = r.Text("insideDiameter"),
    };

    private static LevelRowDocument LevelRow(JsonObjectReader r) => new() { Flow = r.Text("flow"), Level = r.Text("level") };

    internal static WaterwayDocument Waterway(JsonObjectReader r) => new()
    {
        Friction = r.Text("friction"),
        KineticEnergyCoefficient = r.NumberText("kineticEnergyCoefficient"),
        Elements = r.Array("elements", Element) ?? [],
        Stop = r.Object("stop", s => new StopDocument { ClosingTime = s.Text("closingTime"), Law = s.Text("law"), RunawayFlow = s.Text("runawayFlow"), RunawayTime = s.Text("runawayTime"), Restraint = s.Text("restraint"), PressureLimit = s.Text("pressureLimit") }),
    };

    private static ElementDocument Element(JsonObjectReader r) => new()
    {
        Name = r.Text("name"),
        Length = r.Text("length"),
        InsideDiameter = r.Text("insideDiameter"),
        Material = r.Text("material"),
        Roughness = r.Text("roughness"),
        HazenWilliamsC = r.NumberText("hazenWilliamsC"),
        ManningN = r.NumberText("manningN"),
        Fittings = r.Array("fittings", f => new FittingDocument { Fitting = f.Text("fitting"), K = f.NumberText("k"), Count = f.NumberText("count") }),
        WallThickness = r.Text("wallThickness"),
        PressureRating = r.Text("pressureRating"),
        EndElevation = r.Text("endElevation"),
    };

    private static TurbineDocument Turbine(JsonObjectReader r) => new()
    {
        Type = r.Text("type"),
        Units = r.NumberText("units"),
        EfficiencyTable = r.Array("efficiencyTable", row => new EfficiencyRowDocument { Flow = row.Text("flow"), Efficiency = row.Text("efficiency") }),
        LeastFlow = r.Text("leastFlow"),
        UnitSizes = r.Array("unitSizes", u => new UnitDocument { Share = u.Text("share"), LeastFlow = u.Text("leastFlow") }),
        LoadSplit = r.Text("loadSplit"),
        HillChart = r.Array("hillChart", h => new HillHeadDocument { Head = h.Text("head"), Rows = h.Array("rows", row => new EfficiencyRowDocument { Flow = row.Text("flow"), Efficiency = row.Text("efficiency") }) }),
        TestedDiameter = r.Text("testedDiameter"),
        RunnerDiameter = r.Text("runnerDiameter"),
        AwayFromRatedHead = r.Text("awayFromRatedHead"),
        LeastHead = r.Text("leastHead"),
        RunnerHeight = r.Text("runnerHeight"),
        Pump = r.Object("pump", p => new PumpDocument { Flow = p.Text("flow"), Head = p.Text("head"), Efficiency = p.Text("efficiency"), Speed = p.Text("speed") }),
    };

    private static LossesDocument Losses(JsonObjectReader r) => new()
    {
        Drive = r.Text("drive"),
        Generator = r.Text("generator"),
        Transformer = r.Text("transformer"),
        Line = r.Text("line"),
        GeneratorDetail = r.Object("generatorDetail", g => new GeneratorDocument { Kind = g.Text("kind"), Rating = g.Text("rating"), Efficiency = g.Text("efficiency") }),
        TransformerDetail = r.Object("transformerDetail", t => new TransformerDocument { Rating = t.Text("rating"), NoLoadLoss = t.Text("noLoadLoss"), LoadLoss = t.Text("loadLoss"), WhenStanding = t.Text("whenStanding") }),
        LineDetail = r.Object("lineDetail", l => new LineDocument { Length = l.Text("length"), Voltage = l.Text("voltage"), Phases = l.NumberText("phases"), Conductor = l.Text("conductor"), Metal = l.Text("metal"), Temperature = l.Text("temperature") }),
        PowerFactor = r.NumberText("powerFactor"),
        OwnUse = r.Text("ownUse"),
        Availability = r.Text("availability"),
    };
}
