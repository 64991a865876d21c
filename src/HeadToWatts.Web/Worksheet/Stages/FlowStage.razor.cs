using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.Web.Fields;
using Microsoft.AspNetCore.Components;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>The flow: rows, a record, and what comes off before the plant.</summary>
public sealed partial class FlowStage
{
    private static readonly Choice[] Positions = [.. PlottingPositions.All.Select(p => new Choice(p.Id, p.Name))];
    private static readonly Choice[] Beyond = [new("hold", "last flow holds"), new("dry", "no flow")];
    private static readonly Choice[] RowsFor = [new("", "the year"), new("year", "the whole year"), new("season", "the season only")];
    private static readonly Choice[] GivenAs = [new("rows", "percent exceeded"), new("means", "monthly means"), new("plan", "a delivery schedule"), new("once", "one measurement")];
    private static readonly Choice[] YearKinds = [new("calendar", "1 January"), new("water", "1 October")];


    private RenderFragment? _wide;

    private void ShowWide(RenderFragment? wide) => _wide = wide;

    private string PositionFormula => FormulaPlain((PlottingPositions.Find(Doc.Flow.PlottingPosition ?? "") ?? PlottingPositions.Default).Method.Formula);

    private static bool Same(string? text, string word) => string.Equals(text?.Trim(), word, StringComparison.OrdinalIgnoreCase);

    private static string FormulaPlain(string formula) => Basis.Sources.FormulaText.Plain(formula);

    // The rows that take the record's place are the record's own curve, so that the result stays.
    private Task RemoveRecord() => Edit(() =>
    {
        var unit = Show.FlowUnit;
        var curve = Result?.Flow.Curve;
        double[] percents = [0, 5, 10, 20, 30, 40, 50, 60, 70, 80, 90, 95, 100];
        Doc.Flow.Record = Doc.Flow.Neighbour = null;
        Doc.Flow.AreaRatio = null;
        Doc.Flow.PlottingPosition = Doc.Flow.Years = null;
        Doc.Flow.RowsAreFor = "year";
        Doc.Flow.Curve = curve is null
            ? []
            : [.. percents.Select(p => new CurveRowDocument { Exceeded = FieldText.Round(p) + " %", Flow = FieldText.Round(unit.FromHeld(curve.FlowAt(p / 100)), 4) + " " + unit.Symbol })];
    });

    private string Given => Doc.Flow.MonthlyMeans is not null ? "means" : Doc.Flow.Schedule is not null ? "plan" : Doc.Flow.Measurement is not null ? "once" : "rows";

    // What is known goes over into the new way of giving the flow, as far as it can.
    private Task ChangeGiven(string given) => Edit(() =>
    {
        var unit = Show.FlowUnit;
        var mean = Result is null ? null : FieldText.Round(unit.FromHeld(Result.Flow.MeanFlowM3PerS), 3) + " " + unit.Symbol;
        Doc.Flow.MonthlyMeans = given == "means" ? [.. Enumerable.Repeat(mean, 12)] : null;
        Doc.Flow.Schedule = given == "plan" ? [new DeliveryRowDocument { Days = "Apr 15 to Oct 15", Flow = mean }] : null;
        Doc.Flow.Measurement = given == "once" ? new MeasurementDocument { Kind = "bucket" } : null;
        Doc.Flow.Curve = given == "rows" ? [new CurveRowDocument { Exceeded = "0 %", Flow = mean }, new CurveRowDocument { Exceeded = "100 %", Flow = mean }] : null;
        Doc.Flow.RowsAreFor = Doc.Flow.BeyondLastRow = null;
    });

    private Task TakeNeighbourAsync(TakenFile taken) => taken.File.Record is { } record
        ? Edit(() => Doc.Flow.Neighbour = RecordText.Write(record, FlowUnitOf(taken)))
        : Task.CompletedTask;

    // A file of levels has become flows in m3/s.
    private static UnitOfMeasure FlowUnitOf(TakenFile taken) =>
        taken.File.Report.Unit.Dimension == Dimension.Flow ? taken.File.Report.Unit : UnitTable.CubicMetrePerSecond;

    private Task TakeAsync(TakenFile taken) => TakeAsync(taken.Name, taken.File, taken);

    private Task TakeAsync(string name, FlowFile flow, TakenFile taken) => Edit(() =>
    {
        var unit = FlowUnitOf(taken);
        if (flow.Record is { } record)
        {
            Doc.Flow.Record = RecordText.Write(record, unit);
            Doc.Flow.Record.Recipe = taken.Recipe;
            Doc.Flow.Record.Found = record.Quality is { } quality ? [.. quality.Lines()] : null;
            Doc.Flow.Curve = null;
            Doc.Flow.MonthlyMeans = null;
            Doc.Flow.Measurement = null;
            Doc.Flow.Schedule = null;
            Doc.Flow.RowsAreFor = Doc.Flow.BeyondLastRow = null;
        }
        else if (flow.Curve is { } curve)
        {
            Doc.Flow.Record = Doc.Flow.Neighbour = null;
            Doc.Flow.AreaRatio = null;
            Doc.Flow.MonthlyMeans = null;
            Doc.Flow.Measurement = null;
            Doc.Flow.Schedule = null;
            Doc.Flow.PlottingPosition = null;
            Doc.Flow.Curve = CurveRows.Write(curve.Rows, unit);
        }

        Doc.Flow.Source = flow.Report.Description.Length > 0 ? $"{flow.Report.Description} ({name})" : name;
    });
}
