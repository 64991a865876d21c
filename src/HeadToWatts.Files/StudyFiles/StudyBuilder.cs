using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Turns a study document into an input, or lists every problem by field, as in "alternatives[0].head.gross".</summary>
public static class StudyBuilder
{
    /// <summary>Builds the input of every alternative.</summary>
    /// <param name="document">The document.</param>
    /// <param name="files">Where named flow files are found.</param>
    public static Checked<StudyInput> Build(StudyDocument document, IFlowFileSource files)
    {
        ArgumentNullException.ThrowIfNull(document);
        ArgumentNullException.ThrowIfNull(files);
        var problems = new List<Problem>();
        var header = Header(document, problems);
        if (document.Alternatives.Count == 0)
            problems.Add(new Problem("alternatives", "", "a study needs at least one alternative", "[ { ... } ]"));
        var names = new HashSet<string>(StringComparer.Ordinal);
        var alternatives = new List<AlternativeInput>();
        for (var i = 0; i < document.Alternatives.Count; i++)
        {
            var path = $"alternatives[{i}]";
            if (!names.Add(document.Alternatives[i].Name ?? ""))
                problems.Add(new Problem(path + ".name", document.Alternatives[i].Name ?? "", "another alternative has this name already"));
            alternatives.Add(Alternative(document.Alternatives[i], path, new FieldReader(problems), files));
        }

        return problems.Count == 0 ? Checked.Of(new StudyInput(header, alternatives)) : Checked.Refused<StudyInput>(problems);
    }

    private static StudyHeader Header(StudyDocument d, List<Problem> problems)
    {
        if (string.IsNullOrWhiteSpace(d.Name))
            problems.Add(new Problem("name", "", "the study needs a name"));
        var units = d.Units?.Trim().ToUpperInvariant() switch
        {
            "US" => UnitSystem.US,
            "SI" => UnitSystem.SI,
            _ => (UnitSystem?)null,
        };
        if (units is null)
            problems.Add(new Problem("units", d.Units ?? "", "say in which units results are shown", "US or SI"));
        return new StudyHeader(d.Name ?? "", d.Place ?? "", d.Client ?? "", d.Author ?? "", d.Date ?? "", d.Revision ?? "", d.Notes ?? "", units ?? UnitSystem.SI);
    }

    private static AlternativeInput Alternative(AlternativeDocument d, string path, FieldReader read, IFlowFileSource files)
    {
        var before = read.Problems.Count;
        var site = new SiteInput(
            read.Assumed(d.Site.Latitude, Dimension.Angle, path + ".site.latitude", -Math.PI / 2, Math.PI / 2, "45 deg", "The latitude"),
            read.Assumed(d.Site.Elevation, Dimension.Length, path + ".site.elevation", -430, 5000, "0 m", "The elevation"),
            read.Assumed(d.Site.WaterTemperature, Dimension.Temperature, path + ".site.waterTemperature", 0, 40, "10 degC", "The water temperature"),
            read.Assumed(d.Site.GridFrequency, Dimension.Frequency, path + ".site.gridFrequency", 45, 65, "60 Hz", "The grid frequency"));
        var flow = FlowBuilder.Build(d.Flow, path + ".flow", read, files);
        var head = HeadBuilder.Build(d.Head, path + ".head", site, read);
        var waterway = WaterwayBuilder.Build(d.Waterway, path + ".waterway", read);
        var turbine = TurbineBuilder.Build(d.Turbine, path + ".turbine", read);
        var train = TrainBuilder.Build(d.Losses, path + ".losses", read);
        var pumping = PumpingBuilder.Build(d.Pumping, path + ".pumping", site, read);
        var money = MoneyBuilder.Build(d.Money, path + ".money", read);

        // With a problem anywhere the value is thrown away by the caller; the placeholders only keep the types whole.
        return new AlternativeInput(
            string.IsNullOrWhiteSpace(d.Name) ? "as described" : d.Name,
            site,
            flow!,
            head ?? new HeadInput(GrossHead.FromMetres(1), 1, 0, false),
            waterway,
            turbine,
            train,
            read.Problems.Count == before ? [.. read.Assumptions, .. MonthsWithoutRecord(head, flow)] : [])
        {
            Money = money,
            Pumping = pumping,
        };
    }

    private static IEnumerable<string> MonthsWithoutRecord(HeadInput? head, FlowInput? flow)
    {
        if (head is { MovesWithMonth: true } && flow is { Record: null })
            yield return "Levels are given by month, but rows of a curve know no months; the level of the season's middle month is used throughout. A daily record would use each month's own.";
    }
}
