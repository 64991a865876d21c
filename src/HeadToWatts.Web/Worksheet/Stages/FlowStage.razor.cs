using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.Web.Fields;
using Microsoft.AspNetCore.Components.Forms;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>The flow: rows, a record, and what comes off before the plant.</summary>
public sealed partial class FlowStage
{
    private const long LargestFlowFileBytes = 64L * 1024 * 1024;
    private static readonly Choice[] Positions = [.. PlottingPositions.All.Select(p => new Choice(p.Id, p.Name))];
    private static readonly Choice[] Beyond = [new("hold", "last flow holds"), new("dry", "no flow")];
    private static readonly Choice[] RowsFor = [new("", "the year"), new("year", "the whole year"), new("season", "the season only")];
    private const string FlowFileKinds = ".csv,.txt,.tsv,.rdb,.json,.dat,.day,.mon,.prn,.asc,.cmd,text/*,application/json";
    private static readonly Choice[] GivenAs = [new("rows", "percent exceeded"), new("means", "monthly means"), new("plan", "a delivery schedule")];
    private static readonly Choice[] YearKinds = [new("calendar", "1 January"), new("water", "1 October")];
    private static readonly Choice[] FileUnits = [new("", "as the file says"), .. UnitTable.Of(Dimension.Flow).Select(u => new Choice(u.Symbol, u.Symbol))];
    private static readonly Choice[] DateOrders = [new("", "as the file shows"), new("month-day", "month first"), new("day-month", "day first")];

    private IReadOnlyList<Problem> _problems = [];
    private IReadOnlyList<string> _report = [];
    private string _problemTitle = "";
    private string _fileUnit = "";
    private string _fileOrder = "";
    private string? _fileColumn;
    private bool _busy;
    private CancellationTokenSource? _reading;

    private string PositionFormula => FormulaPlain((PlottingPositions.Find(Doc.Flow.PlottingPosition ?? "") ?? PlottingPositions.Default).Method.Formula);

    /// <inheritdoc/>
    public ValueTask DisposeAsync()
    {
        _reading?.Cancel();
        _reading?.Dispose();
        return ValueTask.CompletedTask;
    }

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

    private string Given => Doc.Flow.MonthlyMeans is not null ? "means" : Doc.Flow.Schedule is not null ? "plan" : "rows";

    // What is known goes over into the new way of giving the flow, as far as it can.
    private Task ChangeGiven(string given) => Edit(() =>
    {
        var unit = Show.FlowUnit;
        var mean = Result is null ? null : FieldText.Round(unit.FromHeld(Result.Flow.MeanFlowM3PerS), 3) + " " + unit.Symbol;
        Doc.Flow.MonthlyMeans = given == "means" ? [.. Enumerable.Repeat(mean, 12)] : null;
        Doc.Flow.Schedule = given == "plan" ? [new DeliveryRowDocument { Days = "Apr 15 to Oct 15", Flow = mean }] : null;
        Doc.Flow.Curve = given == "rows" ? [new CurveRowDocument { Exceeded = "0 %", Flow = mean }, new CurveRowDocument { Exceeded = "100 %", Flow = mean }] : null;
        Doc.Flow.RowsAreFor = Doc.Flow.BeyondLastRow = null;
    });

    private void Stop() => _reading?.Cancel();

    private Task OpenAsync(InputFileChangeEventArgs chosen) => OpenAsync(chosen, TakeAsync);

    private Task OpenNeighbourAsync(InputFileChangeEventArgs chosen) => OpenAsync(chosen, TakeNeighbourAsync);

    private async Task TakeNeighbourAsync(string name, FlowFile flow)
    {
        if (flow.Record is { } record)
            await Edit(() => Doc.Flow.Neighbour = RecordText.Write(record, flow.Report.Unit));
        else
            (_problemTitle, _problems) = ($"{name} was not taken; the study is as it was", [new Problem(name, "a flow-duration curve", "a neighbour must be a daily record, so that days in common can be found", "a record of days")]);
    }

    private async Task OpenAsync(InputFileChangeEventArgs chosen, Func<string, FlowFile, Task> take)
    {
        var file = chosen.File;
        await ReadingAsync(file.Name, take, async cancel =>
        {
            if (file.Size > LargestFlowFileBytes)
                return Checked.Refused<FlowFile>(new Problem(file.Name, $"{file.Size / 1048576.0:0.0} MB", "a flow file is at most 64 MB", "a shorter record"));
            await using var stream = file.OpenReadStream(LargestFlowFileBytes, cancel);
            return await FlowFileReader.ReadAsync(file.Name, stream, Options(), cancel);
        });
    }

    private async Task ReadingAsync(string name, Func<string, FlowFile, Task> take, Func<CancellationToken, Task<Checked<FlowFile>>> read)
    {
        (_busy, _problems, _report) = (true, [], []);
        _reading?.Dispose();
        _reading = new CancellationTokenSource();
        StateHasChanged();
        try
        {
            var reading = await read(_reading.Token);
            if (reading.TryGet(out var flow))
            {
                _report = flow.Report.Lines();
                await take(name, flow);
            }
            else
            {
                (_problemTitle, _problems) = ($"{name} was not taken; the study is as it was", reading.Problems);
            }
        }
        catch (OperationCanceledException)
        {
            _report = ["Stopped; the study is as it was."];
        }
        catch (Exception e) when (e is IOException or InvalidOperationException or ArgumentException or Microsoft.JSInterop.JSException)
        {
            (_problemTitle, _problems) = ($"{name} was not taken; the study is as it was", [new Problem(name, "", "it could not be read: " + e.Message)]);
        }
        finally
        {
            _busy = false;
        }
    }

    private FlowFileOptions Options() => new(
        Unit: _fileUnit.Length > 0 ? UnitTable.Find(Dimension.Flow, _fileUnit) : null,
        Order: _fileOrder switch { "month-day" => DateOrder.MonthFirst, "day-month" => DateOrder.DayFirst, _ => null },
        Column: string.IsNullOrWhiteSpace(_fileColumn) ? null : _fileColumn.Trim());

    private Task TakeAsync(string name, FlowFile flow) => Edit(() =>
    {
        var unit = flow.Report.Unit;
        if (flow.Record is { } record)
        {
            Doc.Flow.Record = RecordText.Write(record, unit);
            Doc.Flow.Curve = null;
            Doc.Flow.MonthlyMeans = null;
            Doc.Flow.Schedule = null;
            Doc.Flow.RowsAreFor = Doc.Flow.BeyondLastRow = null;
        }
        else if (flow.Curve is { } curve)
        {
            Doc.Flow.Record = Doc.Flow.Neighbour = null;
            Doc.Flow.AreaRatio = null;
            Doc.Flow.MonthlyMeans = null;
            Doc.Flow.Schedule = null;
            Doc.Flow.PlottingPosition = null;
            Doc.Flow.Curve = CurveRows.Write(curve.Rows, unit);
        }

        Doc.Flow.Source = flow.Report.Description.Length > 0 ? $"{flow.Report.Description} ({name})" : name;
    });
}
