using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords;
using HeadToWatts.Web.Fields;
using HeadToWatts.Web.Sessions;
using Microsoft.AspNetCore.Components;
using Microsoft.JSInterop;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>The rows of a flow-duration curve.</summary>
public sealed partial class CurveRows
{
    private const long LargestPasteBytes = 1024 * 1024;
    private IReadOnlyList<Problem> _problems = [];
    private DotNetObjectReference<CurveRows>? _self;

    /// <summary>The study.</summary>
    [Parameter, EditorRequired] public StudySession Session { get; set; } = default!;

    private List<CurveRowDocument> Rows => Session.Alternative.Flow.Curve ??= [];

    /// <summary>Rows as a study writes them.</summary>
    /// <param name="rows">The rows.</param>
    /// <param name="unit">Unit of the flows.</param>
    internal static List<CurveRowDocument> Write(IReadOnlyList<CurvePoint> rows, UnitOfMeasure unit) =>
    [
        .. rows.Select(r => new CurveRowDocument
        {
            Exceeded = Math.Round(r.Exceedance * 100, 9).ToString("0.#########", CultureInfo.InvariantCulture) + " %",
            Flow = Math.Round(unit.FromHeld(r.FlowM3PerS), 9).ToString("G10", CultureInfo.InvariantCulture) + " " + unit.Symbol,
        }),
    ];

    /// <summary>Told by the browser what was pasted.</summary>
    /// <param name="pasted">The text, as a stream: a long table does not fit one message.</param>
    [JSInvokable]
    public async Task PastedAsync(IJSStreamReference pasted)
    {
        ArgumentNullException.ThrowIfNull(pasted);
        try
        {
            await using var stream = await pasted.OpenReadStreamAsync(LargestPasteBytes);
            using var reader = new StreamReader(stream);
            Take(FlowFileReader.ReadText("pasted rows", await reader.ReadToEndAsync(), new FlowFileOptions(Unit: Session.Show.FlowUnit)), out var change);
            if (change is not null)
                await Session.EditAsync(change);
        }
        catch (Exception e) when (e is IOException or ArgumentException or JSException)
        {
            _problems = [new Problem("pasted rows", "", "they could not be read: " + e.Message)];
        }
        finally
        {
            await pasted.DisposeAsync();
        }

        StateHasChanged();
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        if (_self is null)
            return;
        try
        {
            await Js.InvokeVoidAsync("headToWatts.stopReceiving", "curve-rows");
        }
        catch (JSDisconnectedException)
        {
            // The page is gone, and what listened there with it.
        }

        _self.Dispose();
    }

    /// <inheritdoc/>
    protected override async Task OnAfterRenderAsync(bool firstRender)
    {
        if (!firstRender)
            return;
        _self = DotNetObjectReference.Create(this);
        await Js.InvokeVoidAsync("headToWatts.receivePaste", "curve-rows", _self);
    }

    private void Take(Checked<FlowFile> reading, out Action? change)
    {
        change = null;
        _problems = reading.Problems;
        if (!reading.TryGet(out var flow))
            return;
        var document = Session.Alternative.Flow;
        if (flow.Curve is { } curve)
        {
            change = () => document.Curve = Write(curve.Rows, flow.Report.Unit);
        }
        else if (flow.Record is { } record)
        {
            change = () =>
            {
                document.Record = RecordText.Write(record, flow.Report.Unit);
                document.Curve = null;
                document.RowsAreFor = document.BeyondLastRow = null;
            };
        }
    }

    private Task Add() => Session.EditAsync(() => Rows.Add(new CurveRowDocument()));

    // Rows of one curve are written in one unit. A number typed in the unit shown turns the other rows into that unit too.
    private Task ChangeFlow(CurveRowDocument row, string? text) => Session.EditAsync(() =>
    {
        row.Flow = text;
        var shown = Session.Show.FlowUnit;
        if (text is null || !text.EndsWith(" " + shown.Symbol, StringComparison.Ordinal))
            return;
        foreach (var other in Rows.Where(r => !ReferenceEquals(r, row) && r.Flow is { } flow && !flow.EndsWith(shown.Symbol, StringComparison.Ordinal)))
        {
            if (QuantityText.Read(other.Flow, Dimension.Flow, null, "").TryGet(out var held))
                other.Flow = FieldText.Round(shown.FromHeld(held), 6) + " " + shown.Symbol;
        }
    });
}
