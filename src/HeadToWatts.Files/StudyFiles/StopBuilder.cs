using HeadToWatts.Basis.Units;
using HeadToWatts.Hydraulics.Surge;
using HeadToWatts.Hydraulics.Transients;
using HeadToWatts.Studies.Inputs;

namespace HeadToWatts.Files.StudyFiles;

/// <summary>Builds the stop of a plant.</summary>
internal static class StopBuilder
{
    private static readonly (string Name, object Value)[] Laws = [("opening", StopLaw.OpeningFallsEvenly), ("flow", StopLaw.FlowFallsEvenly)];

    private static readonly (string Name, object Value)[] Restraints =
        [("anchored throughout", PipeRestraint.AnchoredThroughout), ("anchored upstream", PipeRestraint.AnchoredUpstream), ("expansion joints", PipeRestraint.ExpansionJoints)];

    internal static StopInput? Build(StopDocument? d, string path, FieldReader read)
    {
        if (d is null)
            return null;
        var before = read.Problems.Count;
        var closing = read.Quantity(d.ClosingTime, Dimension.Duration, path + ".closingTime", 0, 3600);
        var law = Choose(d.Law, path + ".law", Laws, read);
        var flow = read.Optional(d.RunawayFlow, Dimension.Ratio, path + ".runawayFlow", 0.1, 2.5);
        var time = read.Optional(d.RunawayTime, Dimension.Duration, path + ".runawayTime", 0, 600);
        var restraint = Choose(d.Restraint, path + ".restraint", Restraints, read);
        var limit = read.Optional(d.PressureLimit, Dimension.Pressure, path + ".pressureLimit", 1000, 1e8);
        return read.Problems.Count > before ? null : new StopInput(closing, (StopLaw)law, flow, time, (PipeRestraint)restraint, limit);
    }

    // The first is taken when nothing is said.
    private static object Choose(string? text, string where, (string Name, object Value)[] names, FieldReader read) =>
        string.IsNullOrWhiteSpace(text)
            ? names[0].Value
            : read.Named(text, where, t => names.FirstOrDefault(n => string.Equals(n.Name, t, StringComparison.OrdinalIgnoreCase)).Value, names.Select(n => n.Name)) ?? names[0].Value;
}
