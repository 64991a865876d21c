using System.Globalization;
using System.Text;
using HeadToWatts.Basis.Sources;
using HeadToWatts.Economics;
using HeadToWatts.EnergyYield;
using HeadToWatts.FlowRecords;
using HeadToWatts.Hydraulics;
using HeadToWatts.Hydraulics.Pipes;
using HeadToWatts.Pumping;
using HeadToWatts.Studies.Cautions;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.HouseRules;

/// <summary>Writes docs/methods.md from the catalogues.</summary>
internal static class MethodsPage
{
    public static string Write()
    {
        var page = new StringBuilder();
        page.Append("""
            # Methods and their sources

            This page is generated from the catalogues in the code; a test fails when it is stale. Do not edit it by hand: run the tests of
            `tests/HeadToWatts.Calculations.Tests` with the environment variable `HEADTOWATTS_WRITE_DOCS=1`.

            Every method is held by tests to values from outside the project; they stand under `tests/CheckValues/<key>/`. A range is the one the
            source states; a study that leaves it says so in a caution.


            """.ReplaceLineEndings("\n"));
        Methods(page, "Flow records", FlowRecordMethods.All);
        Methods(page, "Hydraulics", HydraulicsMethods.All);
        Methods(page, "Turbines", TurbineMethods.All);
        Methods(page, "Energy", EnergyMethods.All);
        Methods(page, "Pumping", PumpingMethods.All);
        Methods(page, "Economics", EconomicsMethods.All);
        Types(page);
        Materials(page);
        Cautions(page);
        return page.ToString().TrimEnd('\n') + "\n";
    }

    private static void Methods(StringBuilder page, string stage, IReadOnlyList<Method> methods)
    {
        if (methods.Count == 0)
            return;
        Line(page, $"## {stage}");
        Line(page);
        foreach (var method in methods)
        {
            Line(page, $"### {method.Name}");
            Line(page);
            Line(page, $"{Formula(method.Formula)}");
            Line(page);
            Line(page, $"- Key: `{method.Id}`; check values: {string.Join(", ", CheckValueFile.OfMethod(method.Id).Select(f => $"`{Path.GetFileNameWithoutExtension(f.Path)}` ({f.Head["kind"]})"))}");
            Line(page, $"- Source: {Escape(method.Source.ToString())}{(method.Locator.Length > 0 ? $" ({Escape(method.Locator)})" : "")}");
            foreach (var range in method.Ranges)
                Line(page, $"- Range of {Escape(range.Name)} {Formula(range.Symbol)}: {Limits(range)}");
            Line(page);
        }
    }

    private static void Types(StringBuilder page)
    {
        Line(page, "## Turbine types");
        Line(page);
        Line(page, "Efficiencies and envelopes are typical of small machines, not of any maker's. What was taken from where:");
        Line(page);
        foreach (var type in TurbineTypes.All)
        {
            Line(page, $"### {char.ToUpperInvariant(type.Name[0])}{type.Name[1..]}");
            Line(page);
            Line(page, $"{Escape(type.Uses)} {Escape(type.Limits)}");
            Line(page);
            Line(page, $"Highest efficiency {Number(type.Efficiency.Peak)} at {Number(type.Efficiency.PeakAtFlowRatio)} of full flow; least flow {Number(type.LeastFlowRatio)} of full flow; specific speed {Number(type.SpecificSpeed.LowestKwM)} to {Number(type.SpecificSpeed.HighestKwM)} (rpm, kW, m); runaway {Number(type.Runaway.Lowest)} to {Number(type.Runaway.Highest)} times rated speed.");
            Line(page);
            foreach (var source in type.Sources)
                Line(page, $"- {Words(source.Figure)}: {Escape(source.Source.ToString())}{(source.Note.Length > 0 ? $" {Escape(source.Note)}" : "")}");
            Line(page);
        }
    }

    private static void Materials(StringBuilder page)
    {
        Line(page, "## Pipe materials");
        Line(page);
        Line(page, "| material | roughness, new, mm | aged, mm | Hazen-Williams C | Manning n | source of the roughness |");
        Line(page, "|---|---|---|---|---|---|");
        foreach (var m in PipeMaterials.All)
            Line(page, $"| {Escape(m.Name)} | {Number(m.RoughnessM * 1000)} | {Number(m.RoughnessAgedM * 1000)} | {Number(m.HazenWilliamsCoefficient)} | {Number(m.ManningCoefficient)} | {Escape(m.Source.ToString())}{(m.Locator.Length > 0 ? $" ({Escape(m.Locator)})" : "")} |");
        Line(page);
    }

    private static void Cautions(StringBuilder page)
    {
        Line(page, "## Cautions and who says so");
        Line(page);
        Line(page, "| caution | key | stage | weight | authority |");
        Line(page, "|---|---|---|---|---|");
        foreach (var rule in CautionRules.All)
            Line(page, $"| {Escape(rule.Title)} | `{rule.Id}` | {rule.Stage.ToString().ToLowerInvariant()} | {Words(rule.Severity)} | {Escape(rule.Authority.ToString())} |");
        Line(page);
        Line(page, "## Standing cautions");
        Line(page);
        Line(page, $"**{StandingCautions.Status}.** {Escape(StandingCautions.Statement)}");
        Line(page);
        Line(page, "| hazard or permit | authority |");
        Line(page, "|---|---|");
        foreach (var caution in StandingCautions.Hazards.Concat(StandingCautions.Permits))
            Line(page, $"| {Escape(caution.Title)} | {Escape(caution.Authority)} |");
        Line(page);
    }

    private static string Formula(string formula) => string.Concat(FormulaText.Parse(formula).Select(run => run.Style switch
    {
        FormulaStyle.Italic => $"<i>{run.Text}</i>",
        FormulaStyle.Subscript => $"<sub>{Escape(run.Text)}</sub>",
        FormulaStyle.Superscript => $"<sup>{Escape(run.Text)}</sup>",
        _ => Escape(run.Text),
    }));

    private static string Limits(InputRange range)
    {
        var unit = range.Unit == "1" ? "" : " " + range.Unit;
        return (double.IsInfinity(range.Lowest), double.IsInfinity(range.Highest)) switch
        {
            (false, false) => $"{Number(range.Lowest)} to {Number(range.Highest)}{unit}",
            (false, true) => $"from {Number(range.Lowest)}{unit} up",
            (true, false) => $"up to {Number(range.Highest)}{unit}",
            _ => "any",
        };
    }

    private static string Words(Enum value) => string.Concat(value.ToString().Select((c, i) => char.IsUpper(c) && i > 0 ? " " + char.ToLowerInvariant(c) : char.ToLowerInvariant(c).ToString()));

    private static string Number(double value) => value.ToString("0.######", CultureInfo.InvariantCulture) is var plain && Math.Abs(value) is >= 1e7 or (> 0 and < 1e-5) ? value.ToString("0.###E+0", CultureInfo.InvariantCulture) : plain;

    private static string Escape(string text) => text.Replace("&", "&amp;", StringComparison.Ordinal).Replace("<", "&lt;", StringComparison.Ordinal).Replace("|", "\\|", StringComparison.Ordinal).Replace("*", "\\*", StringComparison.Ordinal).Replace("_", "\\_", StringComparison.Ordinal);

    private static void Line(StringBuilder page, string text = "") => page.Append(text.TrimEnd()).Append('\n');
}
