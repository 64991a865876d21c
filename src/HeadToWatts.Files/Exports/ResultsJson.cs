using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using HeadToWatts.Basis.Units;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Cautions;

namespace HeadToWatts.Files.Exports;

/// <summary>Writes results as JSON in SI, the unit in every name. docs/results.md lists the fields.</summary>
public static class ResultsJson
{
    /// <summary>The number of this format.</summary>
    public const int Format = 1;

    private static readonly JsonWriterOptions Options = new() { Indented = true, NewLine = "\n", Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>The results of every alternative of a study.</summary>
    /// <param name="results">At least one result.</param>
    public static string Write(IReadOnlyList<StudyResult> results)
    {
        ArgumentNullException.ThrowIfNull(results);
        using var stream = new MemoryStream();
        using (var json = new Utf8JsonWriter(stream, Options))
        {
            json.WriteStartObject();
            json.WriteNumber("format", Format);
            json.WriteString("study", results[0].Header.Name);
            json.WriteString("status", StandingCautions.Status);
            json.WriteStartArray("alternatives");
            foreach (var result in results)
                Alternative(json, result);
            json.WriteEndArray();
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(stream.ToArray()) + "\n";
    }

    private static void Alternative(Utf8JsonWriter json, StudyResult r)
    {
        var annual = r.Energy.Annual;
        json.WriteStartObject();
        json.WriteString("name", r.Input.Name);
        json.WriteNumber("grossHeadM", r.Head.GrossHeadM);
        json.WriteNumber("designFlowM3PerS", r.Flow.DesignFlowM3PerS);
        json.WriteBoolean("designFlowIsSuggested", r.Flow.DesignFlowIsSuggested);
        json.WriteNumber("designFlowExceedance", r.Flow.DesignFlowExceedance);
        json.WriteNumber("meanFlowM3PerS", r.Flow.MeanFlowM3PerS);
        json.WriteNumber("meanUsableFlowM3PerS", r.Flow.MeanUsableFlowM3PerS);
        json.WriteNumber("netHeadAtDesignM", r.Head.NetHeadAtDesignM);
        json.WriteNumber("headLossAtDesignM", r.Waterway.AtDesign.TotalLossM);
        json.WriteNumber("headLossShareOfGross", r.Waterway.LossShareOfGrossHead);
        json.WriteNumber("velocityMPerS", r.Waterway.HighestVelocityMPerS);
        json.WriteNumber("velocityLimitMPerS", r.Waterway.VelocityLimitMPerS);
        json.WriteNumber("installedPowerKw", annual.InstalledPowerKw);
        json.WriteNumber("meterPowerKw", annual.MeterPowerKw);
        json.WriteNumber("annualEnergyKwh", annual.AnnualEnergyKwh);
        Nullable(json, "dryYearEnergyKwh", r.Energy.Days?.DryYearKwh);
        json.WriteNumber("plantFactor", annual.PlantFactor);
        json.WriteNumber("runningHours", annual.RunningHours);
        json.WriteNumber("fullLoadHours", annual.FullLoadHours);
        json.WriteString("turbineType", r.Turbine.Chosen.Type.Id);
        json.WriteNumber("turbineUnits", r.Turbine.Chosen.UnitCount);
        json.WriteBoolean("turbineIsSuggested", r.Turbine.TypeIsSuggested);
        json.WriteBoolean("turbineInsideEnvelope", r.Turbine.Chosen.Fit.IsInside);
        json.WriteNumber("specificWeightNPerM3", r.Site.SpecificWeightNPerM3);
        json.WriteNumber("gravityMPerS2", r.Site.GravityMPerS2);
        FlowJson.Write(json, r);
        CanalJson.Write(json, r);
        Water(json, r);
        Steps(json, r);
        MachineJson.Electrical(json, r);
        MachineJson.Pump(json, r);
        json.WriteNumber("threePointsLowerKwh", r.Energy.ThreePointsLowerKwh);
        Nullable(json, "unitStartsPerYear", r.Energy.Days?.UnitStartsPerYear);
        Nullable(json, "stepUpPoints", r.Turbine.StepUp?.PeakChange * 100);
        MachineJson.Split(json, r);
        PumpingJson.Write(json, r);
        MoneyJson.Write(json, r);
        Elements(json, r);
        StopJson.Write(json, r.Waterway.Stop);
        json.WriteStartArray("netHeads");
        foreach (var p in r.Head.AtShares)
        {
            json.WriteStartObject();
            json.WriteNumber("shareOfDesignFlow", p.ShareOfDesignFlow);
            json.WriteNumber("flowM3PerS", p.FlowM3PerS);
            json.WriteNumber("headLossM", p.LossM);
            json.WriteNumber("netHeadM", p.NetHeadM);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("months");
        foreach (var m in r.Energy.Days?.Months ?? [])
        {
            json.WriteStartObject();
            json.WriteNumber("month", m.Month);
            json.WriteNumber("energyKwh", m.MeanEnergyKwh);
            json.WriteNumber("meanFlowM3PerS", m.MeanFlowM3PerS);
            json.WriteEndObject();
        }

        json.WriteEndArray();
        json.WriteStartArray("turbines");
        foreach (var c in r.Turbine.Ranking)
        {
            json.WriteStartObject();
            json.WriteString("type", c.Type.Id);
            json.WriteNumber("units", c.UnitCount);
            json.WriteBoolean("insideEnvelope", c.Fit.IsInside);
            json.WriteNumber("decadesOutside", c.Fit.DecadesOutside);
            json.WriteNumber("annualEnergyKwh", c.AnnualEnergyKwh);
            json.WriteNumber("leastFlowM3PerS", c.LeastFlowM3PerS);
            Nullable(json, "specificSpeedKwM", c.Speed?.SpecificSpeedKwM);
            MachineJson.Sheet(json, r.Turbine.Sheets.FirstOrDefault(s => s.Candidate.Type.Id == c.Type.Id));
            json.WriteEndObject();
        }

        json.WriteEndArray();
        CautionList(json, r);
        json.WriteEndObject();
    }

    private static void Water(Utf8JsonWriter json, StudyResult r)
    {
        var w = r.Energy.Annual.Water;
        json.WriteStartObject("water");
        json.WriteNumber("arrivingM3", w.ArrivingM3);
        json.WriteNumber("priorM3", w.PriorM3);
        json.WriteNumber("reservedM3", w.ReservedM3);
        json.WriteNumber("turbinedM3", w.TurbinedM3);
        json.WriteNumber("belowLeastM3", w.BelowLeastM3);
        json.WriteNumber("outOfServiceM3", w.OutOfServiceM3);
        json.WriteNumber("spilledM3", w.SpilledM3);
        json.WriteEndObject();
    }

    private static void Steps(Utf8JsonWriter json, StudyResult r)
    {
        json.WriteNumber("grossEnergyKwh", r.Energy.Annual.Staircase.GrossKwh);
        json.WriteStartArray("energySteps");
        foreach (var s in r.Energy.Annual.Staircase.Steps)
        {
            json.WriteStartObject();
            json.WriteString("step", s.Name);
            json.WriteNumber("lossKwh", s.LossKwh);
            json.WriteNumber("leftKwh", s.LeftKwh);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void Elements(Utf8JsonWriter json, StudyResult r)
    {
        json.WriteStartArray("waterway");
        foreach (var e in r.Waterway.AtDesign.Elements)
        {
            json.WriteStartObject();
            json.WriteString("name", e.Element.Name);
            json.WriteNumber("lengthM", e.Element.LengthM);
            json.WriteNumber("insideDiameterM", e.Element.InsideDiameterM);
            json.WriteNumber("velocityMPerS", e.VelocityMPerS);
            json.WriteNumber("reynolds", e.Reynolds);
            json.WriteNumber("darcyFrictionFactor", e.DarcyFrictionFactor);
            json.WriteNumber("frictionLossM", e.FrictionLossM);
            json.WriteNumber("localLossM", e.LocalLossM);
            json.WriteStartArray("fittings");
            foreach (var f in e.Fittings)
            {
                json.WriteStartObject();
                json.WriteString("name", f.Fitting.Name);
                json.WriteNumber("lossCoefficient", f.Fitting.LossCoefficient);
                json.WriteNumber("count", f.Fitting.Count);
                json.WriteNumber("lossM", f.LossM);
                json.WriteEndObject();
            }

            json.WriteEndArray();
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void CautionList(Utf8JsonWriter json, StudyResult r)
    {
        json.WriteStartArray("cautions");
        foreach (var c in CautionRules.For(r, r.Show(UnitSystem.SI)))
        {
            json.WriteStartObject();
            json.WriteString("id", c.Id);
            json.WriteString("stage", c.Stage.ToString());
            json.WriteString("severity", c.Severity.ToString());
            json.WriteString("text", c.Text);
            json.WriteString("authority", c.Authority.ToString());
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private static void Nullable(Utf8JsonWriter json, string name, double? value)
    {
        if (value is { } number && double.IsFinite(number))
            json.WriteNumber(name, number);
        else
            json.WriteNull(name);
    }
}
