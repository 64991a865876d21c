using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.FlowRecords.OneOff;
using HeadToWatts.FlowRecords.Transfer;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds a flow measured once: a curve of that flow all year, marked as no record.</summary>
internal static class MeasurementBuilder
{
    /// <summary>The measurement; null with problems reported when it cannot be used.</summary>
    internal static FlowMeasurement? Measure(MeasurementDocument d, string path, FieldReader read)
    {
        var before = read.Problems.Count;
        switch (d.Kind?.Trim().ToLowerInvariant())
        {
            case "bucket":
                var volume = read.Quantity(d.Volume, Dimension.Volume, path + ".volume", 1e-4, 100);
                var fillings = List(d.Times, Dimension.Duration, path + ".times", 0.1, 3600, read);
                return read.Problems.Count == before && BucketAndStopwatch.Measure(volume, fillings, path + ".times").TryGet(read.Problems, out var bucket) ? bucket : null;
            case "float":
                var reach = read.Quantity(d.Reach, Dimension.Length, path + ".reach", 0.5, 1000);
                var times = List(d.Times, Dimension.Duration, path + ".times", 0.5, 3600, read);
                var areas = List(d.Areas, Dimension.Area, path + ".areas", 1e-3, 1e4, read);
                var coefficient = read.Number(d.Coefficient, path + ".coefficient", 0.3, 1);
                if (string.IsNullOrWhiteSpace(d.Coefficient))
                    read.Assume($"The coefficient of the float is not given; {FloatMethod.UsualCoefficient.ToString(System.Globalization.CultureInfo.InvariantCulture)} is assumed.");
                return read.Problems.Count == before && FloatMethod.Measure(reach, times, areas, coefficient ?? FloatMethod.UsualCoefficient, path).TryGet(read.Problems, out var floats) ? floats : null;
            case "velocity-area":
                var verticals = (d.Verticals ?? []).Select((v, i) => new Vertical(
                    read.Quantity(v.Distance, Dimension.Length, $"{path}.verticals[{i}].distance", -1e3, 1e4),
                    read.Quantity(v.Depth, Dimension.Length, $"{path}.verticals[{i}].depth", 0, 100),
                    read.Quantity(v.Velocity, Dimension.Velocity, $"{path}.verticals[{i}].velocity", -10, 20))).ToList();
                return read.Problems.Count == before && VelocityArea.Measure(verticals, path + ".verticals").TryGet(read.Problems, out var area) ? area.Measurement : null;
            default:
                read.Named<OneOffKind>(d.Kind, path + ".kind", _ => null, OneOffMethods.All.Select(k => k.Id));
                return null;
        }
    }

    /// <summary>The curve of that flow on every day of the year.</summary>
    internal static FlowDurationCurve Curve(FlowMeasurement measured) =>
        FlowDurationCurve.FromRows([new CurvePoint(0, measured.FlowM3PerS), new CurvePoint(1, measured.FlowM3PerS)], BeyondLastRow.Hold, "measurement").Value;

    /// <summary>What the study says of it.</summary>
    internal static FlowOrigin Origin(MeasurementDocument d, FlowMeasurement measured)
    {
        var name = OneOffMethods.All.First(k => k.Id.Equals(d.Kind!.Trim(), StringComparison.OrdinalIgnoreCase)).Name;
        return new FlowOrigin(
            FlowConfidence.Plan,
            $"measured once ({char.ToLowerInvariant(name[0])}{name[1..]}), which says nothing of other days",
            [$"within {UnitDisplay.Percent(measured.UncertaintyRatio)} either way at about 95 % confidence, made of {string.Join(", ", measured.Parts.Select(p => $"{p.Name} {UnitDisplay.Percent(p.Ratio)}"))}", .. measured.Notes],
            measured.Uses);
    }

    private static List<double> List(List<string?>? texts, Dimension dimension, string path, double lowest, double highest, FieldReader read)
    {
        if (texts is not { Count: > 0 })
        {
            read.Refuse(path, "", "nothing is entered", "one or more");
            return [];
        }

        return [.. texts.Select((t, i) => read.Quantity(t, dimension, $"{path}[{i}]", lowest, highest))];
    }
}
