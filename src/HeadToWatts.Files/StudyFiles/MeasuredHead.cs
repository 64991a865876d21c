using HeadToWatts.Basis.Quantities;
using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Water;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Turns a measurement on site into a gross head with its error.</summary>
internal static class MeasuredHead
{
    internal static HeadInput? Build(MeasuredHeadDocument d, string path, SiteConditions site, FieldReader read)
    {
        var before = read.Problems.Count;
        var hasSteps = d.Steps is { Count: > 0 };
        if (hasSteps == !string.IsNullOrWhiteSpace(d.Gauge))
        {
            read.Refuse(path, d.Gauge, "a head is measured by a gauge or by steps, not both and not neither", "gauge with gaugeHeight, or steps");
            return null;
        }

        return hasSteps ? Steps(d, path, read, before) : Gauge(d, path, site, read, before);
    }

    // A gauge at the foot of a full pipe at rest: H = p/gamma plus the gauge's height above the tailwater.
    private static HeadInput? Gauge(MeasuredHeadDocument d, string path, SiteConditions site, FieldReader read, int before)
    {
        var pressurePa = read.Quantity(d.Gauge, Dimension.Pressure, path + ".gauge", 500, 3e7);
        var heightM = read.Optional(d.GaugeHeight, Dimension.Length, path + ".gaugeHeight", -50, 50) ?? 0;
        var errorPa = read.Optional(d.Error, Dimension.Pressure, path + ".error", 0, 1e7) ?? 0;
        var headM = (pressurePa / site.SpecificWeightNPerM3) + heightM;
        return Finish(d, path, read, before, headM, errorPa / site.SpecificWeightNPerM3, $"gauge {d.Gauge} with the pipe full and at rest, over γ, plus {d.GaugeHeight ?? "0"} from tailwater to gauge");
    }

    // Steps with level and staff: errors of single steps add as the root of their number.
    private static HeadInput? Steps(MeasuredHeadDocument d, string path, FieldReader read, int before)
    {
        var steps = d.Steps!.Select((s, i) => read.Quantity(s, Dimension.Length, $"{path}.steps[{i}]", -20, 50)).ToList();
        var errorM = read.Optional(d.Error, Dimension.Length, path + ".error", 0, 5) ?? 0;
        return Finish(d, path, read, before, steps.Sum(), errorM * Math.Sqrt(steps.Count), string.Join(" + ", d.Steps!) + ", by level and staff");
    }

    private static HeadInput? Finish(MeasuredHeadDocument d, string path, FieldReader read, int before, double headM, double errorM, string words)
    {
        if (read.Problems.Count == before && headM is < 0.05 or > 2500)
            read.Refuse(path, d.Gauge, $"it makes a gross head of {UnitDisplay.Number(headM)} m", "0.05 m to 2500 m");
        if (read.Problems.Count > before)
            return null;
        return new HeadInput(GrossHead.FromMetres(headM), headM, 0, false) { ErrorM = errorM, Measurement = words };
    }
}
