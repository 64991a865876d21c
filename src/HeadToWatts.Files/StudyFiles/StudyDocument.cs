using HeadToWatts.Files.FlowFiles.Recipes;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>
/// A study as it is written and edited: every quantity is the author's own text with its unit. Screens edit it, files hold it;
/// <see cref="StudyBuilder"/> turns it into an input or lists what is wrong.
/// </summary>
public sealed class StudyDocument
{
    /// <summary>The number of the format written today.</summary>
    public const int CurrentFormat = 1;

    /// <summary>Format of the file.</summary>
    public int Format { get; set; } = CurrentFormat;

    /// <summary>Name of the study.</summary>
    public string? Name { get; set; }

    /// <summary>Where the site is.</summary>
    public string? Place { get; set; }

    /// <summary>For whom.</summary>
    public string? Client { get; set; }

    /// <summary>By whom.</summary>
    public string? Author { get; set; }

    /// <summary>Date of the memo.</summary>
    public string? Date { get; set; }

    /// <summary>Revision mark.</summary>
    public string? Revision { get; set; }

    /// <summary>Remarks to be printed.</summary>
    public string? Notes { get; set; }

    /// <summary>"US" or "SI": how results are shown.</summary>
    public string? Units { get; set; }

    /// <summary>One or more alternatives.</summary>
    public List<AlternativeDocument> Alternatives { get; set; } = [];
}

/// <summary>One complete way of using the site.</summary>
public sealed class AlternativeDocument
{
    /// <summary>Name.</summary>
    public string? Name { get; set; }

    /// <summary>Place and water.</summary>
    public SiteDocument Site { get; set; } = new();

    /// <summary>Flow.</summary>
    public FlowDocument Flow { get; set; } = new();

    /// <summary>Head.</summary>
    public HeadDocument Head { get; set; } = new();

    /// <summary>Waterway.</summary>
    public WaterwayDocument Waterway { get; set; } = new();

    /// <summary>Turbine.</summary>
    public TurbineDocument Turbine { get; set; } = new();

    /// <summary>From the shaft to the meter.</summary>
    public LossesDocument Losses { get; set; } = new();

    /// <summary>Costs and income; none when money is left out.</summary>
    public MoneyDocument? Money { get; set; }

    /// <summary>The pumping set against the generation; none when left out.</summary>
    public PumpingDocument? Pumping { get; set; }
}

/// <summary>Place and water.</summary>
public sealed class SiteDocument
{
    /// <summary>Latitude, an angle.</summary>
    public string? Latitude { get; set; }

    /// <summary>Elevation above the sea, a length.</summary>
    public string? Elevation { get; set; }

    /// <summary>Water temperature.</summary>
    public string? WaterTemperature { get; set; }

    /// <summary>Grid frequency: 50 Hz or 60 Hz.</summary>
    public string? GridFrequency { get; set; }
}

/// <summary>The flow and what may be used of it.</summary>
public sealed class FlowDocument
{
    /// <summary>Where the figures come from.</summary>
    public string? Source { get; set; }

    /// <summary>Rows of percent of time exceeded and flow; none when there is a record.</summary>
    public List<CurveRowDocument>? Curve { get; set; }

    /// <summary>"year" or "season": what the percentages of the rows count.</summary>
    public string? RowsAreFor { get; set; }

    /// <summary>"hold" or "dry": the flow beyond the last row.</summary>
    public string? BeyondLastRow { get; set; }

    /// <summary>A daily record; none when rows are given.</summary>
    public RecordDocument? Record { get; set; }

    /// <summary>Twelve mean flows, January first, in place of a record or rows.</summary>
    public List<string?>? MonthlyMeans { get; set; }

    /// <summary>A delivery schedule in place of a record or rows.</summary>
    public List<DeliveryRowDocument>? Schedule { get; set; }

    /// <summary>One measurement of the flow in place of a record or rows.</summary>
    public MeasurementDocument? Measurement { get; set; }

    /// <summary>Carries the record from a gauge to the site by drainage area.</summary>
    public AreaRatioDocument? AreaRatio { get; set; }

    /// <summary>A longer record nearby, by which the record at the site is extended.</summary>
    public RecordDocument? Neighbour { get; set; }

    /// <summary>Name of the plotting position.</summary>
    public string? PlottingPosition { get; set; }

    /// <summary>"calendar" or "water": where the years of a record begin.</summary>
    public string? Years { get; set; }

    /// <summary>Days of operation, as in "Apr 15 to Oct 15" or "all year".</summary>
    public string? Season { get; set; }

    /// <summary>Loss between the gauge and the site: a percent of the flow, a flow, or both.</summary>
    public string? LossToSite { get; set; }

    /// <summary>Reserved flow: a flow, a percent of the flow with or without a floor, a level of Tennant's, a share of Q95 or 7Q10, or "none".</summary>
    public string? ReservedFlow { get; set; }

    /// <summary>Twelve reserved flows, January first, each as <see cref="ReservedFlow"/>, in place of one.</summary>
    public List<string?>? ReservedByMonth { get; set; }

    /// <summary>Prior deliveries: a flow.</summary>
    public string? PriorDeliveries { get; set; }

    /// <summary>Turnouts above the site, each with its flow and its months.</summary>
    public List<TurnoutDocument>? Turnouts { get; set; }

    /// <summary>The plant's right to water.</summary>
    public WaterRightDocument? WaterRight { get; set; }

    /// <summary>Design flow of all units together, or "suggest".</summary>
    public string? DesignFlow { get; set; }
}

/// <summary>A line of a delivery schedule.</summary>
public sealed class DeliveryRowDocument
{
    /// <summary>The days, as in "Apr 15 to May 31".</summary>
    public string? Days { get; set; }

    /// <summary>Flow on these days.</summary>
    public string? Flow { get; set; }
}

/// <summary>A flow measured once, with a bucket, with floats, or by velocity and area.</summary>
public sealed class MeasurementDocument
{
    /// <summary>"bucket", "float" or "velocity-area".</summary>
    public string? Kind { get; set; }

    /// <summary>Volume of the bucket.</summary>
    public string? Volume { get; set; }

    /// <summary>Times of the fillings or of the floats.</summary>
    public List<string?>? Times { get; set; }

    /// <summary>Distance the floats travel.</summary>
    public string? Reach { get; set; }

    /// <summary>Areas of sections along the reach.</summary>
    public List<string?>? Areas { get; set; }

    /// <summary>Mean velocity over that of the float; 0.85 when left out.</summary>
    public string? Coefficient { get; set; }

    /// <summary>Verticals across the water.</summary>
    public List<VerticalDocument>? Verticals { get; set; }

    internal static MeasurementDocument Fields(JsonObjectReader r) => new()
    {
        Kind = r.Text("kind"),
        Volume = r.Text("volume"),
        Times = r.Texts("times"),
        Reach = r.Text("reach"),
        Areas = r.Texts("areas"),
        Coefficient = r.NumberText("coefficient"),
        Verticals = r.Array("verticals", v => new VerticalDocument { Distance = v.Text("distance"), Depth = v.Text("depth"), Velocity = v.Text("velocity") }),
    };
}

/// <summary>Depth and velocity at one place across the water.</summary>
public sealed class VerticalDocument
{
    /// <summary>Distance from one bank.</summary>
    public string? Distance { get; set; }

    /// <summary>Depth.</summary>
    public string? Depth { get; set; }

    /// <summary>Mean velocity in the vertical.</summary>
    public string? Velocity { get; set; }
}

/// <summary>Drainage areas of a gauge and of the site.</summary>
public sealed class AreaRatioDocument
{
    /// <summary>Drainage area of the gauge.</summary>
    public string? GaugeArea { get; set; }

    /// <summary>Drainage area of the site.</summary>
    public string? SiteArea { get; set; }

    /// <summary>Exponent of the ratio of areas; 1 when left out.</summary>
    public string? Exponent { get; set; }
}

/// <summary>A turnout above the site, or another delivery that comes before the plant.</summary>
public sealed class TurnoutDocument
{
    /// <summary>Whose, or which turnout.</summary>
    public string? Name { get; set; }

    /// <summary>Flow.</summary>
    public string? Flow { get; set; }

    /// <summary>Days on which it is taken, as in "Apr 1 to Sep 30"; all year when left out.</summary>
    public string? Season { get; set; }
}

/// <summary>The plant's right to water.</summary>
public sealed class WaterRightDocument
{
    /// <summary>The most the plant may take, a flow; no limit when left out.</summary>
    public string? Rate { get; set; }

    /// <summary>Days on which it may take it; all year when left out.</summary>
    public string? Season { get; set; }
}

/// <summary>A row of a duration curve.</summary>
public sealed class CurveRowDocument
{
    /// <summary>Percent of time exceeded.</summary>
    public string? Exceeded { get; set; }

    /// <summary>Flow.</summary>
    public string? Flow { get; set; }
}

/// <summary>A daily record: a file beside the study, or the days themselves.</summary>
public sealed class RecordDocument
{
    /// <summary>Name of a flow file beside the study file.</summary>
    public string? File { get; set; }

    /// <summary>Unit of the flows, where the file does not say it; the unit of the days when they stand here.</summary>
    public string? Unit { get; set; }

    /// <summary>"day-month" or "month-day", where the file does not decide it.</summary>
    public string? DateOrder { get; set; }

    /// <summary>Name of the column with the flows, where there are several.</summary>
    public string? Column { get; set; }

    /// <summary>First day, yyyy-mm-dd, when the days stand here.</summary>
    public string? FirstDay { get; set; }

    /// <summary>Flows of successive days, apart by spaces, "-" for a day without a flow.</summary>
    public string? Days { get; set; }

    /// <summary>How the file is read, where it is of no known format.</summary>
    public RecipeDocument? Recipe { get; set; }

    /// <summary>What is done about gaps, negatives, estimated values and repeats.</summary>
    public PolicyDocument? Policies { get; set; }

    /// <summary>How the water levels of the file become flows; none when it holds flows.</summary>
    public RatingDocument? Rating { get; set; }

    /// <summary>What was found when the file behind the days was read, line by line.</summary>
    public List<string?>? Found { get; set; }
}

/// <summary>The fall: gross head, or the two levels.</summary>
public sealed class HeadDocument
{
    /// <summary>Gross head.</summary>
    public string? Gross { get; set; }

    /// <summary>Headwater level.</summary>
    public string? Headwater { get; set; }

    /// <summary>Tailwater level.</summary>
    public string? Tailwater { get; set; }

    /// <summary>Twelve headwater levels, January first, in place of one.</summary>
    public List<string?>? HeadwaterByMonth { get; set; }

    /// <summary>Twelve tailwater levels, January first, in place of one.</summary>
    public List<string?>? TailwaterByMonth { get; set; }

    /// <summary>Headwater level against the flow passing the site, in place of one.</summary>
    public List<LevelRowDocument>? HeadwaterRating { get; set; }

    /// <summary>Tailwater level against the flow passing the site, in place of one.</summary>
    public List<LevelRowDocument>? TailwaterRating { get; set; }

    /// <summary>A weir crest that sets the headwater, in place of one level.</summary>
    public CrestDocument? HeadwaterCrest { get; set; }

    /// <summary>Pressure in the pipe above the machine, in place of a headwater level.</summary>
    public PressureDocument? UpstreamPressure { get; set; }

    /// <summary>Pressure that must remain in the pipe below the machine, in place of a tailwater level.</summary>
    public PressureDocument? DownstreamPressure { get; set; }

    /// <summary>A head measured on site, in place of the gross head.</summary>
    public MeasuredHeadDocument? Measured { get; set; }

    /// <summary>Error of the head, a length.</summary>
    public string? Error { get; set; }

    /// <summary>The canal above and below a drop.</summary>
    public CanalDocument? Canal { get; set; }
}

/// <summary>Pressure at a gauge on a pipe.</summary>
public sealed class PressureDocument
{
    /// <summary>Elevation of the gauge.</summary>
    public string? GaugeElevation { get; set; }

    /// <summary>Pressure.</summary>
    public string? Pressure { get; set; }

    /// <summary>Twelve pressures, January first, in place of one.</summary>
    public List<string?>? PressureByMonth { get; set; }

    /// <summary>Pressure against the flow in the pipe, in place of one.</summary>
    public List<PressureRowDocument>? PressureRating { get; set; }

    /// <summary>Inside diameter of the pipe at the gauge, for the velocity head.</summary>
    public string? InsideDiameter { get; set; }
}

/// <summary>A row of pressure against flow.</summary>
public sealed class PressureRowDocument
{
    /// <summary>Flow in the pipe.</summary>
    public string? Flow { get; set; }

    /// <summary>Pressure at that flow.</summary>
    public string? Pressure { get; set; }
}

/// <summary>A head measured on site: a gauge at the foot of a full pipe at rest, or steps of level and staff.</summary>
public sealed class MeasuredHeadDocument
{
    /// <summary>Pressure at the gauge with the pipe full and the water at rest.</summary>
    public string? Gauge { get; set; }

    /// <summary>Height of the gauge above the tailwater.</summary>
    public string? GaugeHeight { get; set; }

    /// <summary>Heights read step by step with level and staff.</summary>
    public List<string?>? Steps { get; set; }

    /// <summary>Error of the gauge (a pressure) or of one step (a length).</summary>
    public string? Error { get; set; }
}

/// <summary>A row of a level rating.</summary>
public sealed class LevelRowDocument
{
    /// <summary>Flow passing the site.</summary>
    public string? Flow { get; set; }

    /// <summary>Level at that flow.</summary>
    public string? Level { get; set; }
}

/// <summary>A weir crest.</summary>
public sealed class CrestDocument
{
    /// <summary>Elevation of the crest.</summary>
    public string? Elevation { get; set; }

    /// <summary>Length of the crest.</summary>
    public string? Length { get; set; }

    /// <summary>C in Q = C L h^(3/2), SI.</summary>
    public string? Coefficient { get; set; }
}

/// <summary>The waterway.</summary>
public sealed class WaterwayDocument
{
    /// <summary>Name of the friction formula.</summary>
    public string? Friction { get; set; }

    /// <summary>Kinetic energy coefficient alpha, 1 to 1.3.</summary>
    public string? KineticEnergyCoefficient { get; set; }

    /// <summary>Pipe elements in order from the headwater; none when the machine stands at the drop.</summary>
    public List<ElementDocument> Elements { get; set; } = [];

    /// <summary>How the plant stops when the unit trips; null when no transient is to be run.</summary>
    public StopDocument? Stop { get; set; }
}

/// <summary>A pipe element.</summary>
public sealed class ElementDocument
{
    /// <summary>Name.</summary>
    public string? Name { get; set; }

    /// <summary>Length.</summary>
    public string? Length { get; set; }

    /// <summary>Inside diameter.</summary>
    public string? InsideDiameter { get; set; }

    /// <summary>Material.</summary>
    public string? Material { get; set; }

    /// <summary>Roughness, when it is not the material's usual one.</summary>
    public string? Roughness { get; set; }

    /// <summary>Hazen-Williams C, when it is not the material's usual one.</summary>
    public string? HazenWilliamsC { get; set; }

    /// <summary>Manning n, when it is not the material's usual one.</summary>
    public string? ManningN { get; set; }

    /// <summary>Fittings and other local losses.</summary>
    public List<FittingDocument>? Fittings { get; set; }

    /// <summary>Wall thickness.</summary>
    public string? WallThickness { get; set; }

    /// <summary>Pressure rating of the pipe.</summary>
    public string? PressureRating { get; set; }

    /// <summary>Elevation of the centre line at the lower end.</summary>
    public string? EndElevation { get; set; }
}

/// <summary>A local loss.</summary>
public sealed class FittingDocument
{
    /// <summary>Name of a known fitting, or one's own words together with K.</summary>
    public string? Fitting { get; set; }

    /// <summary>Loss coefficient K, when it is not the fitting's usual one.</summary>
    public string? K { get; set; }

    /// <summary>How many.</summary>
    public string? Count { get; set; }
}

/// <summary>The turbine.</summary>
public sealed class TurbineDocument
{
    /// <summary>Type, or "suggest".</summary>
    public string? Type { get; set; }

    /// <summary>Number of units, or "suggest".</summary>
    public string? Units { get; set; }

    /// <summary>A manufacturer's table of efficiency over flow.</summary>
    public List<EfficiencyRowDocument>? EfficiencyTable { get; set; }

    /// <summary>Least flow of a unit in percent of its design flow.</summary>
    public string? LeastFlow { get; set; }

    /// <summary>The units one by one, in the order in which they come in, in place of a number of equal ones.</summary>
    public List<UnitDocument>? UnitSizes { get; set; }

    /// <summary>"in turn" or "best": how several units share the flow.</summary>
    public string? LoadSplit { get; set; }

    /// <summary>A manufacturer's chart of efficiency over flow and head, in place of a table over flow.</summary>
    public List<HillHeadDocument>? HillChart { get; set; }

    /// <summary>Diameter of the runner on which the efficiencies were measured.</summary>
    public string? TestedDiameter { get; set; }

    /// <summary>Diameter of the runner here.</summary>
    public string? RunnerDiameter { get; set; }

    /// <summary>"held" or "follow": capacity and efficiency away from the rated head.</summary>
    public string? AwayFromRatedHead { get; set; }

    /// <summary>Net head below which a unit is shut off: a length, or a percent of the rated head.</summary>
    public string? LeastHead { get; set; }

    /// <summary>Height of the runner above the lowest tailwater, a length; negative below it.</summary>
    public string? RunnerHeight { get; set; }

    /// <summary>Best point of the pump that is to run as turbine.</summary>
    public PumpDocument? Pump { get; set; }
}

/// <summary>One of several units.</summary>
public sealed class UnitDocument
{
    /// <summary>Its full flow in percent of that of all units.</summary>
    public string? Share { get; set; }

    /// <summary>Its least flow in percent of its own full flow.</summary>
    public string? LeastFlow { get; set; }
}

/// <summary>Efficiencies at one head of a manufacturer's chart.</summary>
public sealed class HillHeadDocument
{
    /// <summary>Net head.</summary>
    public string? Head { get; set; }

    /// <summary>Efficiencies over the flow of the unit, in percent of its full flow at the rated head.</summary>
    public List<EfficiencyRowDocument>? Rows { get; set; }
}

/// <summary>A pump's best point from its catalogue.</summary>
public sealed class PumpDocument
{
    /// <summary>Flow.</summary>
    public string? Flow { get; set; }

    /// <summary>Head.</summary>
    public string? Head { get; set; }

    /// <summary>Efficiency there.</summary>
    public string? Efficiency { get; set; }

    /// <summary>Speed.</summary>
    public string? Speed { get; set; }
}

/// <summary>A row of a manufacturer's table.</summary>
public sealed class EfficiencyRowDocument
{
    /// <summary>Flow of the unit in percent of its design flow.</summary>
    public string? Flow { get; set; }

    /// <summary>Turbine efficiency in percent.</summary>
    public string? Efficiency { get; set; }
}

/// <summary>From the shaft to the meter.</summary>
public sealed class LossesDocument
{
    /// <summary>Efficiency of gear or belt.</summary>
    public string? Drive { get; set; }

    /// <summary>Efficiency of the generator.</summary>
    public string? Generator { get; set; }

    /// <summary>Efficiency of the transformer.</summary>
    public string? Transformer { get; set; }

    /// <summary>Efficiency of the line.</summary>
    public string? Line { get; set; }

    /// <summary>The generators in detail, in place of <see cref="Generator"/>.</summary>
    public GeneratorDocument? GeneratorDetail { get; set; }

    /// <summary>The transformer in detail, in place of <see cref="Transformer"/>.</summary>
    public TransformerDocument? TransformerDetail { get; set; }

    /// <summary>The line in detail, in place of <see cref="Line"/>.</summary>
    public LineDocument? LineDetail { get; set; }

    /// <summary>Power factor in transformer and line.</summary>
    public string? PowerFactor { get; set; }

    /// <summary>Own use: a percent of the output or a power.</summary>
    public string? OwnUse { get; set; }

    /// <summary>Availability.</summary>
    public string? Availability { get; set; }
}

/// <summary>The generators in detail; each unit has one.</summary>
public sealed class GeneratorDocument
{
    /// <summary>"synchronous" or "induction".</summary>
    public string? Kind { get; set; }

    /// <summary>Rated output of one generator, a power.</summary>
    public string? Rating { get; set; }

    /// <summary>Efficiency at rated output.</summary>
    public string? Efficiency { get; set; }
}

/// <summary>The transformer in detail.</summary>
public sealed class TransformerDocument
{
    /// <summary>Rating, an apparent power.</summary>
    public string? Rating { get; set; }

    /// <summary>No-load loss: a power, or a percent of the rating.</summary>
    public string? NoLoadLoss { get; set; }

    /// <summary>Load loss at the rating: a power, or a percent of the rating.</summary>
    public string? LoadLoss { get; set; }

    /// <summary>"live" or "off" while the plant stands.</summary>
    public string? WhenStanding { get; set; }
}

/// <summary>The line in detail.</summary>
public sealed class LineDocument
{
    /// <summary>Length of the run, one way.</summary>
    public string? Length { get; set; }

    /// <summary>Voltage at the meter.</summary>
    public string? Voltage { get; set; }

    /// <summary>3 or 1.</summary>
    public string? Phases { get; set; }

    /// <summary>Size of a conductor, as in "4/0 AWG" or "95 mm2".</summary>
    public string? Conductor { get; set; }

    /// <summary>"aluminium" or "copper".</summary>
    public string? Metal { get; set; }

    /// <summary>Temperature of the conductor in use.</summary>
    public string? Temperature { get; set; }
}
