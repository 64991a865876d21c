using System.Text.RegularExpressions;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Web.Sessions;

/// <summary>Turns the place of a problem in a study file into the words that stand beside the field on the screen.</summary>
public static partial class FieldNames
{
    private static readonly Dictionary<string, string> Words = new(StringComparer.Ordinal)
    {
        ["name"] = "name", ["units"] = "units", ["alternatives"] = "alternatives", ["study"] = "study",
        ["site"] = "site", ["latitude"] = "latitude", ["elevation"] = "elevation", ["waterTemperature"] = "water temperature", ["gridFrequency"] = "grid frequency",
        ["flow"] = "flow", ["curve"] = "row", ["exceeded"] = "percent exceeded", ["rowsAreFor"] = "what the percentages count", ["beyondLastRow"] = "beyond the last row",
        ["record"] = "daily record", ["file"] = "file", ["unit"] = "unit", ["dateOrder"] = "order of day and month", ["column"] = "column", ["firstDay"] = "first day", ["days"] = "days",
        ["plottingPosition"] = "plotting position", ["measurement"] = "measurement", ["kind"] = "kind", ["volume"] = "volume", ["times"] = "time", ["reach"] = "length of the reach", ["areas"] = "area", ["verticals"] = "vertical", ["distance"] = "distance", ["depth"] = "depth", ["velocity"] = "velocity", ["rating"] = "rating", ["rows"] = "row", ["monthlyMeans"] = "monthly mean, month", ["schedule"] = "delivery", ["areaRatio"] = "drainage areas", ["gaugeArea"] = "area of the gauge", ["siteArea"] = "area of the site", ["exponent"] = "exponent", ["neighbour"] = "neighbouring record", ["years"] = "years", ["season"] = "season", ["reservedFlow"] = "reserved flow", ["priorDeliveries"] = "prior deliveries", ["reservedByMonth"] = "reserved flow, month", ["lossToSite"] = "loss between gauge and site", ["turnouts"] = "turnout", ["waterRight"] = "water right", ["rate"] = "rate", ["designFlow"] = "design flow",
        ["pumping"] = "pumping", ["plants"] = "pump", ["energy"] = "runs on", ["volumeByMonth"] = "volume, month", ["hoursByMonth"] = "hours, month", ["totalHead"] = "total head", ["lift"] = "lift", ["drawdown"] = "drawdown", ["pipe"] = "pipe", ["testPower"] = "power of the test", ["testFuelPerHour"] = "fuel of the test", ["suctionLift"] = "suction lift", ["suctionLoss"] = "suction loss", ["requiredSuctionHead"] = "required suction head",
        ["head"] = "head", ["gross"] = "gross head", ["headwater"] = "headwater level", ["tailwater"] = "tailwater level",
        ["headwaterByMonth"] = "headwater, month", ["tailwaterByMonth"] = "tailwater, month", ["headwaterRating"] = "headwater, row", ["tailwaterRating"] = "tailwater, row", ["level"] = "level",
        ["canal"] = "canal", ["upstream"] = "above the drop", ["downstream"] = "below the drop", ["shape"] = "shape", ["width"] = "width", ["sideSlope"] = "side slope", ["diameter"] = "diameter", ["points"] = "point", ["slope"] = "bed slope", ["alpha"] = "α", ["bed"] = "bed", ["bank"] = "bank", ["basin"] = "basin", ["floor"] = "floor", ["setsLevels"] = "levels from the canal", ["otherDrops"] = "other drop", ["bypass"] = "bypass", ["headwaterCrest"] = "headwater crest", ["upstreamPressure"] = "upstream pressure", ["downstreamPressure"] = "downstream pressure", ["gaugeElevation"] = "gauge elevation", ["pressure"] = "pressure",
        ["pressureByMonth"] = "month", ["measured"] = "measured head", ["gauge"] = "gauge", ["gaugeHeight"] = "gauge above the tailwater", ["steps"] = "step", ["error"] = "error", ["coefficient"] = "coefficient",
        ["waterway"] = "waterway", ["friction"] = "friction formula", ["kineticEnergyCoefficient"] = "kinetic energy coefficient", ["elements"] = "pipe",
        ["length"] = "length", ["insideDiameter"] = "inside diameter", ["material"] = "material", ["roughness"] = "roughness", ["hazenWilliamsC"] = "Hazen-Williams C", ["manningN"] = "Manning n",
        ["fittings"] = "fitting", ["fitting"] = "kind", ["k"] = "K", ["count"] = "how many", ["wallThickness"] = "wall thickness", ["pressureRating"] = "pressure rating", ["endElevation"] = "elevation at its lower end",
        ["stop"] = "stop", ["closingTime"] = "closing time", ["law"] = "what falls evenly", ["runawayFlow"] = "flow at runaway", ["runawayTime"] = "time to runaway", ["restraint"] = "how the pipes are held", ["pressureLimit"] = "limit before the machine",
        ["turbine"] = "turbine", ["type"] = "type", ["efficiencyTable"] = "efficiency row", ["efficiency"] = "efficiency", ["leastFlow"] = "least flow",
        ["unitSizes"] = "unit", ["share"] = "share", ["loadSplit"] = "load split", ["hillChart"] = "chart, head", ["testedDiameter"] = "tested diameter",
        ["runnerDiameter"] = "runner diameter", ["awayFromRatedHead"] = "away from the rated head", ["leastHead"] = "least head", ["runnerHeight"] = "runner above the tailwater", ["pump"] = "pump", ["speed"] = "speed",
        ["losses"] = "from shaft to meter", ["drive"] = "gear or belt", ["generator"] = "generator", ["transformer"] = "transformer", ["line"] = "line", ["generatorDetail"] = "generator", ["transformerDetail"] = "transformer", ["lineDetail"] = "line", ["powerFactor"] = "power factor",
        ["noLoadLoss"] = "no-load loss", ["loadLoss"] = "load loss", ["whenStanding"] = "while the plant stands",
        ["voltage"] = "voltage", ["phases"] = "phases", ["conductor"] = "conductor", ["metal"] = "metal", ["temperature"] = "temperature", ["ownUse"] = "own use", ["availability"] = "availability",
        ["money"] = "money", ["currency"] = "currency", ["priceYear"] = "price year", ["terms"] = "terms", ["discountRate"] = "discount rate", ["inflation"] = "inflation", ["life"] = "years of operation", ["price"] = "price of energy", ["priceEscalation"] = "change of the price",
        ["degradation"] = "energy lost by wear", ["costs"] = "item", ["class"] = "class", ["quantity"] = "quantity", ["unitPrice"] = "price of one", ["contingency"] = "contingency", ["engineering"] = "engineering", ["constructionYears"] = "years of construction", ["constructionInterest"] = "interest while building",
        ["running"] = "running cost", ["yearly"] = "amount a year", ["perKwh"] = "amount for each kWh", ["escalation"] = "yearly change", ["replacements"] = "replacement", ["amount"] = "amount", ["everyYears"] = "years between", ["credits"] = "credit", ["grants"] = "grants", ["salvage"] = "worth at the end",
        ["loan"] = "loan", ["indexes"] = "price index", ["fromYear"] = "earlier year", ["ratio"] = "ratio", ["interest"] = "interest", ["tax"] = "tax", ["depreciable"] = "share written off", ["depreciation"] = "schedule",
    };

    /// <summary>The place in words, as "waterway, pipe 1, inside diameter". A place that is not a field stays as it is.</summary>
    /// <param name="where">Place of the problem.</param>
    public static string Of(string where)
    {
        ArgumentNullException.ThrowIfNull(where);
        var path = AlternativePrefix().Replace(where, "");
        if (path.Length == 0 || !PathPattern().IsMatch(path))
            return where;
        var words = new List<string>();
        foreach (var part in path.Split('.'))
        {
            var open = part.IndexOf('[', StringComparison.Ordinal);
            var name = open < 0 ? part : part[..open];
            if (!Words.TryGetValue(name, out var word))
                return where;
            words.Add(open < 0 ? word : $"{word} {int.Parse(part[(open + 1)..^1], System.Globalization.CultureInfo.InvariantCulture) + 1}");
        }

        return string.Join(", ", words);
    }

    /// <summary>A problem as a sentence: where, what was read, why, what is accepted.</summary>
    /// <param name="problem">The problem.</param>
    public static string Sentence(Problem problem)
    {
        ArgumentNullException.ThrowIfNull(problem);
        var read = problem.Read.Length == 0 ? "" : problem.Read[0] is '"' or '{' or '[' ? $" {problem.Read}:" : $" “{problem.Read}”:";
        var where = Of(problem.Where);
        if (where != problem.Where)
            where = char.ToUpperInvariant(where[0]) + where[1..];
        var accepted = problem.Accepted.Length == 0 ? "" : $" Accepted: {problem.Accepted}.";
        return $"{where}:{read} {problem.Why}.{accepted}";
    }

    [GeneratedRegex(@"^alternatives\[\d+\]\.?")]
    private static partial Regex AlternativePrefix();

    [GeneratedRegex(@"^[A-Za-z]+(\[\d+\])?(\.[A-Za-z]+(\[\d+\])?)*$")]
    private static partial Regex PathPattern();
}
