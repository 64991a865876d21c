using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Units;
using HeadToWatts.Files.FlowFiles;
using HeadToWatts.Files.FlowFiles.Recipes;
using HeadToWatts.Files.StudyFiles;
using HeadToWatts.FlowRecords.Quality;
using HeadToWatts.Web.Fields;
using HeadToWatts.Web.Sessions;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;

namespace HeadToWatts.Web.Worksheet.Stages;

/// <summary>A flow file on its way into the study. The study changes only when the file is taken.</summary>
public sealed partial class FlowFileInputs
{
    private const long LargestFlowFileBytes = 64L * 1024 * 1024;
    private const string Kinds = ".csv,.txt,.tsv,.rdb,.json,.dat,.day,.mon,.prn,.asc,.cmd,text/*,application/json";
    private static readonly Choice[] Values = [new("flow", "flows"), new("level", "water levels, to be rated")];
    private static readonly Choice[] FlowUnits = [new("", "as the file says"), .. UnitTable.Of(Dimension.Flow).Select(u => new Choice(u.Symbol, u.Symbol))];
    private static readonly Choice[] LevelUnits = [new("", "as the file says"), .. UnitTable.Of(Dimension.Length).Select(u => new Choice(u.Symbol, u.Symbol))];
    private static readonly Choice[] DateOrders = [new("", "as the file shows"), new("month-day", "month first"), new("day-month", "day first")];

    private IReadOnlyList<Problem> _problems = [];
    private IReadOnlyList<Problem> _ratingProblems = [];
    private IReadOnlyList<RecipeEvidence> _evidence = [];
    private IReadOnlyList<RecipeQuestion> _questions = [];
    private HashSet<string> _quality = [];
    private FlowFileSource? _source;
    private FlowFile? _file;
    private RecipeDocument? _recipe;
    private RecipeDocument? _shownWide;
    private RatingDocument? _rating;
    private PolicyDocument _policies = new();
    private CancellationTokenSource? _reading;
    private string _name = "";
    private string _note = "";
    private string _doing = "";
    private string _unit = "";
    private string _order = "";
    private string? _column;
    private double _share;
    private bool _busy;
    private bool _isTaken;

    /// <summary>The study.</summary>
    [Parameter, EditorRequired] public StudySession Session { get; set; } = default!;

    /// <summary>Identity in the page; unique there.</summary>
    [Parameter] public string Id { get; set; } = "file";

    /// <summary>What is opened, as "Open a flow file".</summary>
    [Parameter] public string Title { get; set; } = "Open a flow file";

    /// <summary>What may be opened, in words.</summary>
    [Parameter] public string Says { get; set; } = "of daily flows, of values within the day, of water levels, or of a flow-duration curve: CSV or text, up to 64 MB";

    /// <summary>A recipe kept in the study, tried on a file that is not recognised.</summary>
    [Parameter] public RecipeDocument? KeptRecipe { get; set; }

    /// <summary>Shows something over the whole width of the page, or takes it away again.</summary>
    [Parameter] public EventCallback<RenderFragment?> OnWide { get; set; }

    /// <summary>Takes what was read into the study.</summary>
    [Parameter, EditorRequired] public Func<TakenFile, Task> Take { get; set; } = default!;

    /// <inheritdoc/>
    public ValueTask DisposeAsync()
    {
        _reading?.Cancel();
        _reading?.Dispose();
        return ValueTask.CompletedTask;
    }

    private static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

    private static string Share(int days, RecordQuality quality) => UnitDisplay.Percent(quality.Days == 0 ? 0 : (double)days / quality.Days);

    private void Stop() => _reading?.Cancel();

    private void Close() => (_file, _source, _recipe, _problems, _note) = (null, null, null, [], "");

    private void CloseRecipe() => _recipe = null;

    private void ChangeValues(string values)
    {
        _rating = values == "level" ? new RatingDocument { Kind = "table", Rows = [new(), new()] } : null;
        _unit = "";
        _ratingProblems = [];
    }

    private void RatingChanged() => _ratingProblems = _rating is null ? [] : RatingBuilder.Build(_rating, "rating").Problems;

    private async Task OpenAsync(InputFileChangeEventArgs chosen)
    {
        var file = chosen.File;
        (_name, _source, _file, _recipe, _problems, _note, _isTaken) = (file.Name, null, null, null, [], "", false);
        _policies = new PolicyDocument();
        if (file.Size > LargestFlowFileBytes)
        {
            _problems = [new Problem(file.Name, $"{file.Size / 1048576.0:0.0} MB", "a flow file is at most 64 MB", "a shorter record")];
            return;
        }

        await WorkAsync("Bringing it in,", async cancel =>
        {
            await using var stream = file.OpenReadStream(LargestFlowFileBytes, cancel);
            var held = await FlowFileSource.HoldAsync(file.Name, stream, new Progress<long>(bytes => ShowShare(file.Size == 0 ? 1 : (double)bytes / file.Size)), cancel);
            if (held.TryGet(out var source))
                _source = source;
            else
                _problems = held.Problems;
        });
        if (_source is not null)
            await ReadAsync();
    }

    private async Task ReadAsync(bool keepOpen = false)
    {
        if (_source is not { } source || Options() is not { } options)
            return;
        var wasTaken = _isTaken;
        (_problems, _note) = ([], "");
        if (!keepOpen)
            _file = null;
        await WorkAsync("Reading it,", async cancel =>
        {
            var progress = new Progress<double>(ShowShare);
            var reading = await Task.Run(() => FlowFileReader.Read(source, options, progress, cancel), cancel);
            if (!reading.IsGood && _recipe is null && Kept() is { } kept)
            {
                var again = await Task.Run(() => FlowFileReader.Read(source, options with { Recipe = kept }, progress, cancel), cancel);
                if (again.IsGood)
                {
                    reading = again;
                    _recipe = KeptRecipe;
                }
            }

            if (reading.TryGet(out var file))
            {
                (_file, _isTaken) = (file, false);
                _quality = file.Report.Quality is { } quality ? [.. quality.Lines()] : [];
            }
            else
            {
                _problems = reading.Problems;
            }
        });
        if (_file is { } found && _problems.Count == 0 && (wasTaken || !NeedsALook(found)))
            await TakeAsync();
    }

    // A record without gaps, marks or oddities asks for no choice.
    private static bool NeedsALook(FlowFile file) =>
        file.Report.Quality is { } quality && (quality.Findings.Count > 0 || quality.MissingDays > 0 || quality.EstimatedDays > 0 || quality.IceDays > 0 || quality.ProvisionalDays > 0);

    private async Task TakeAsync()
    {
        if (_file is not { } file)
            return;
        await Take(new TakenFile(_name, file, _recipe, _policies));
        _isTaken = true;
    }

    private async Task WorkAsync(string doing, Func<CancellationToken, Task> work)
    {
        (_busy, _share, _doing) = (true, 0, doing);
        _reading?.Dispose();
        _reading = new CancellationTokenSource();
        StateHasChanged();
        try
        {
            await work(_reading.Token);
        }
        catch (OperationCanceledException)
        {
            (_note, _source, _file) = ("Stopped; the study is as it was.", null, null);
        }
        catch (Exception e) when (e is IOException or InvalidOperationException or ArgumentException or Microsoft.JSInterop.JSException)
        {
            (_problems, _source) = ([new Problem(_name, "", "it could not be read: " + e.Message)], null);
        }
        finally
        {
            _busy = false;
        }
    }

    // Told from another thread and often: the screen is redrawn for whole percents only.
    private void ShowShare(double share) => _ = InvokeAsync(() =>
    {
        if (Math.Floor(share * 100) <= Math.Floor(_share * 100))
            return;
        _share = Math.Min(1, share);
        StateHasChanged();
    });

    private void Propose()
    {
        if (_source is not { } source)
            return;
        var proposal = RecipeProposer.Propose(source);
        _recipe = RecipeDocument.From(proposal.Recipe);
        (_evidence, _questions) = (proposal.Evidence, proposal.Questions);
    }

    private ReadingRecipe? Kept() => KeptRecipe is null ? null : RecipeBuilder.Build(KeptRecipe, "recipe").TryGet(out var recipe) ? recipe : null;

    private FlowFileOptions? Options()
    {
        var problems = new List<Problem>();
        ReadingRecipe? recipe = null;
        StageReading? stage = null;
        if (_recipe is not null)
            RecipeBuilder.Build(_recipe, "recipe").TryGet(problems, out recipe);
        if (_rating is not null)
            RatingBuilder.Build(_rating, "rating").TryGet(problems, out stage);
        var policies = PolicyBuilder.Policies(_policies, "policies", problems);
        var subDaily = PolicyBuilder.SubDaily(_policies, "policies", problems);
        _problems = problems;
        return problems.Count > 0 ? null : new FlowFileOptions(
            Unit: _unit.Length > 0 ? UnitTable.Find(_rating is null ? Dimension.Flow : Dimension.Length, _unit) : null,
            Order: _order switch { "month-day" => DateOrder.MonthFirst, "day-month" => DateOrder.DayFirst, _ => null },
            Column: string.IsNullOrWhiteSpace(_column) ? null : _column.Trim(),
            Policies: policies,
            SubDaily: subDaily,
            Recipe: recipe,
            Stage: stage);
    }
}

/// <summary>A flow file that the user takes.</summary>
/// <param name="Name">Its name.</param>
/// <param name="File">What was read.</param>
/// <param name="Recipe">How it was read, where it is of no known format.</param>
/// <param name="Policies">What was done about gaps and marks.</param>
public sealed record TakenFile(string Name, FlowFile File, RecipeDocument? Recipe, PolicyDocument Policies);
