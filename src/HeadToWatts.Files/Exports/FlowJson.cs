using System.Globalization;
using System.Text.Json;
using HeadToWatts.Basis.Units;
using HeadToWatts.Studies;

namespace HeadToWatts.Files.Exports;

/// <summary>Where the flow comes from and what comes off it, as JSON.</summary>
internal static class FlowJson
{
    internal static void Write(Utf8JsonWriter json, StudyResult r)
    {
        var flow = r.Input.Flow;
        var show = UnitDisplay.For(UnitSystem.SI, r.Flow.DesignFlowM3PerS);
        json.WriteStartObject("flow");
        json.WriteString("confidence", flow.Origin?.Grade);
        json.WriteString("origin", flow.Origin?.Reason);
        List(json, "originNotes", flow.Origin?.Notes ?? []);
        List(json, "found", flow.Findings);
        json.WriteString("reserved", WaterWords.Reserved(flow, show));
        List(json, "deliveredFirst", WaterWords.Deliveries(flow, show));
        Number(json, "waterRightM3PerS", flow.Rules?.Right?.RateM3PerS);
        json.WriteNumber("seepageRatio", flow.Rules?.Seepage.SeepageRatio ?? 0);
        json.WriteNumber("lossToSiteM3PerS", flow.Rules?.Seepage.LossM3PerS ?? 0);
        if (r.Summary is { } summary)
        {
            json.WriteStartObject("record");
            json.WriteString("firstDay", summary.Record.FirstDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));
            json.WriteString("lastDay", summary.Record.LastDay.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));
            json.WriteNumber("validDays", summary.Record.ValidCount);
            json.WriteNumber("missingDays", summary.Record.MissingCount);
            json.WriteString("years", summary.Years.Kind.ToString());
            json.WriteNumber("wholeYears", summary.Years.Whole.Count);
            Number(json, "meanAnnualM3PerS", summary.MeanAnnualM3PerS);
            Number(json, "q95M3PerS", summary.Q95M3PerS);
            Number(json, "sevenQTenM3PerS", summary.SevenQTen?.FlowM3PerS);
            Year(json, "dryYear", summary.Classes?.Dry.Year);
            Year(json, "medianYear", summary.Classes?.Median.Year);
            Year(json, "wetYear", summary.Classes?.Wet.Year);
            json.WriteStartArray("monthFlows");
            foreach (var month in summary.Months)
            {
                json.WriteStartObject();
                json.WriteNumber("month", month.Month);
                json.WriteNumber("days", month.Days);
                json.WriteNumber("exceeded90M3PerS", month.Curve.FlowAt(0.9));
                json.WriteNumber("exceeded50M3PerS", month.Curve.FlowAt(0.5));
                json.WriteNumber("exceeded10M3PerS", month.Curve.FlowAt(0.1));
                json.WriteEndObject();
            }

            json.WriteEndArray();
            json.WriteEndObject();
        }
        else
        {
            json.WriteNull("record");
        }

        json.WriteEndObject();
    }

    private static void List(Utf8JsonWriter json, string name, IEnumerable<string> texts)
    {
        json.WriteStartArray(name);
        foreach (var text in texts)
            json.WriteStringValue(text);
        json.WriteEndArray();
    }

    private static void Number(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number)
            json.WriteNumber(name, number);
        else
            json.WriteNull(name);
    }

    private static void Year(Utf8JsonWriter json, string name, int? year)
    {
        if (year is { } number)
            json.WriteNumber(name, number);
        else
            json.WriteNull(name);
    }
}
