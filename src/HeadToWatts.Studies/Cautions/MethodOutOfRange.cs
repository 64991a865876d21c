using HeadToWatts.Basis.Units;

namespace HeadToWatts.Studies.Cautions;

/// <summary>A formula beyond its stated range.</summary>
internal sealed class MethodOutOfRange() : CautionRule("method-out-of-range", StudyStage.Waterway, Severity.Weigh, "Method used outside its range", CautionSources.MethodRange)
{
    public override string? Say(StudyResult result, UnitDisplay show)
    {
        var outside = result.MethodsUsed.SelectMany(u => u.OutOfRange().Select(o => (u.Method, o.Range, o.Span))).ToList();
        if (outside.Count == 0)
            return null;
        return string.Join(" ", outside.Select(o =>
            $"{o.Method.Name} is stated for {o.Range.Name} {Limits(o.Range)}; here it ran from {UnitDisplay.Number(o.Span.Lowest)} to {UnitDisplay.Number(o.Span.Highest)}{Unit(o.Range.Unit)}."));

        static string Unit(string unit) => unit == "1" ? "" : " " + unit;
        static string Limits(Basis.Sources.InputRange r) => double.IsInfinity(r.Highest)
            ? $"from {UnitDisplay.Number(r.Lowest)}{Unit(r.Unit)} up"
            : double.IsInfinity(r.Lowest)
                ? $"up to {UnitDisplay.Number(r.Highest)}{Unit(r.Unit)}"
                : $"{UnitDisplay.Number(r.Lowest)} to {UnitDisplay.Number(r.Highest)}{Unit(r.Unit)}";
    }
}
